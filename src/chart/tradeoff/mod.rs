//! Lit share times size gives lit area, which gives brightness: an equation read downwards, four strips on one date
//! axis.

mod captions;
mod curves;
mod gutter;
mod layout;
mod model;
mod scales;

pub(super) use layout::{least_height, plot_edges, preferred_height};
pub use model::TradeoffModel;

use super::Viewport;
use super::axis::Scale;
use super::handle;
use super::ink::Failed;
use super::pen::{Pen, plain};
use super::theme::Theme;
use layout::Layout;

pub(super) fn draw(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    view: &Viewport,
    theme: &Theme,
) -> Result<(), Failed> {
    let layout = Layout::new(view.width_css, view.height_css);
    let (left, right) = (layout.plot_left, layout.plot_right);
    for strip in &layout.strips {
        pen.block((left, strip.panel_top), (right, strip.bottom), theme.panel)?;
    }
    let bands = layout.strips.map(|strip| (strip.panel_top, strip.bottom));
    let axis_face = plain(12.0, theme.muted);
    let scale = Scale {
        span: model.span,
        left,
        right,
        bands: &bands,
        labels_y: layout.axis_top + 11.0,
        grid: theme.grid,
    };
    model.axis.draw(pen, &scale, axis_face)?;
    curves::draw(model, pen, &layout, theme)?;
    chosen_line(model, pen, &layout, theme)?;
    captions::draw(model, pen, &layout, theme)?;
    gutter::draw(model, pen, &layout, theme)?;
    let x = model.span.x_of(model.chosen.day, left, right);
    handle::draw(
        pen,
        x,
        layout.handle_top,
        view.width_css,
        &model.chosen.date,
        theme,
    )
}

/// The chosen date as a line through every strip, with a dot on every curve.
fn chosen_line(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let x = model
        .span
        .x_of(model.chosen.day, layout.plot_left, layout.plot_right);
    if layout.wide {
        pen.upright(
            x,
            layout.handle_top + handle::HEIGHT,
            layout.axis_top,
            1.5,
            theme.chosen,
        )?;
    } else {
        // Between the strips stand the names, so the line rests there.
        for strip in &layout.strips {
            pen.upright(x, strip.panel_top, strip.bottom, 1.5, theme.chosen)?;
        }
    }
    for (strip, curve) in layout.strips.iter().zip(model.curves.iter()) {
        if let Some(value) = curve.chosen {
            let at = (x, strip.y_of(curve.share(value)));
            pen.disc(at, 5.5, theme.panel)?;
            pen.disc(at, 4.0, theme.chosen)?;
        }
    }
    Ok(())
}
