//! The line of dates with its turning points, the nearest one named, and the grip of the chosen date.

use super::super::axis::Scale;
use super::super::handle;
use super::super::ink::Failed;
use super::super::pen::{Align, Pen, plain};
use super::super::theme::Theme;
use super::labels::sign;
use super::layout::Layout;
use super::model::PlanModel;

pub(super) fn draw(
    model: &PlanModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    width: f64,
    theme: &Theme,
) -> Result<(), Failed> {
    let (left, right, y) = (layout.left, layout.right, layout.line_y);
    let scale = Scale {
        span: model.span,
        left,
        right,
        bands: &[(y, y + 7.0)],
        labels_y: layout.labels_y,
        grid: theme.limb,
    };
    pen.level(left, right, y, theme.limb)?;
    model.axis.draw(pen, &scale, plain(12.0, theme.muted))?;
    let x_of = |day: f64| model.span.x_of(day, left, right);
    let x = x_of(model.chosen.disc.day);
    pen.upright(
        x,
        layout.handle_top + handle::HEIGHT,
        y + 7.0,
        1.5,
        theme.chosen,
    )?;
    for mark in &model.marks {
        sign(
            pen,
            (x_of(mark.day).min(right - 6.0).max(left + 6.0), y),
            theme.background,
            theme,
        )?;
    }
    if let Some(mark) = model.nearest_mark() {
        let face = pen.fit(&mark.dated, plain(12.0, theme.ink), right - left - 20.0)?;
        let length = 18.0 + pen.text_width(&mark.dated, face)?;
        let begin = (x_of(mark.day) - length / 2.0)
            .min(right - length)
            .max(left);
        sign(pen, (begin + 6.0, layout.name_y), theme.background, theme)?;
        let text_at = (begin + 16.0, layout.name_y);
        pen.text(&mark.dated, text_at, Align::Left, face)?;
    }
    handle::draw(pen, x, layout.handle_top, width, &model.chosen.date, theme)
}
