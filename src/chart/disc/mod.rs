//! The disc to scale: one row of even dates, and above it the chosen date gliding over the Moon's edge, all to the
//! same scale.
//!
//! Saturn's globe is flattened and its rings stand at their true opening and angle; shadows of the one on the other
//! are not drawn, nor is the flattening of Jupiter, Uranus and Neptune (at most 6 %).

mod globe;
mod layout;
mod model;

pub(super) use globe::{Look, globe};
pub(super) use layout::{lane_edges, least_height, preferred_height};
pub(super) use model::{Disc, breadth, widest_arcsec};
pub use model::{DiscModel, DiscSample};

use super::Viewport;
use super::handle;
use super::ink::Failed;
use super::pen::{Align, Pen, Point, bold, plain};
use super::shapes::rising_limb;
use super::theme::Theme;
use crate::explain::MOON_WIDTH_ARCSEC;
use layout::Layout;

pub(super) fn draw(
    model: &DiscModel,
    pen: &mut Pen<'_>,
    view: &Viewport,
    theme: &Theme,
) -> Result<(), Failed> {
    let layout = Layout::new(view.width_css, view.height_css);
    let scale = layout.disc / model.largest_extent_arcsec;
    let x_of = |day: f64| model.span.x_of(day, layout.left, layout.right);
    let x = x_of(model.chosen.day);

    pen.block(
        (0.0, layout.row_top),
        (view.width_css, layout.row_bottom),
        theme.panel,
    )?;
    let line =
        |pen: &mut Pen<'_>, top: f64, bottom: f64| pen.upright(x, top, bottom, 1.5, theme.chosen);
    moon_edge(model, pen, &layout, scale, view.width_css, theme)?;
    // Through the label at the Moon's edge the line would only hurt, so it rests there.
    line(pen, layout.handle_top + handle::HEIGHT, layout.moon_y)?;
    line(pen, layout.row_top, layout.row_discs_bottom)?;

    let quiet = Look {
        lit: theme.glow,
        night: theme.night_side,
        limb: theme.limb,
        ring: theme.limb,
        line: 1.0,
    };
    for disc in model.row(layout.count) {
        let at = (x_of(disc.day), layout.row_y);
        globe(disc, pen, at, scale, &quiet)?;
        let lines = [
            (&disc.date, bold(12.0, theme.ink)),
            (&disc.lit, plain(11.0, theme.muted)),
            (&disc.size, plain(11.0, theme.muted)),
        ];
        for (index, (text, face)) in lines.into_iter().enumerate() {
            let face = pen.fit(text, face, layout.cell - 4.0)?;
            pen.text(
                text,
                (at.0, layout.labels_y + 15.0 * index as f64),
                Align::Middle,
                face,
            )?;
        }
    }

    let strong = Look {
        lit: theme.sunlit,
        night: theme.night_side,
        limb: theme.ink,
        ring: theme.glow,
        line: 1.5,
    };
    let half = model.chosen.extent_arcsec() * scale / 2.0;
    let at = (
        x.min(layout.right - half).max(layout.left + half),
        layout.stage_y,
    );
    pen.disc(
        at,
        model.chosen.radius_arcsec * scale + 3.0,
        theme.background,
    )?;
    globe(&model.chosen, pen, at, scale, &strong)?;
    stage_readings(model, pen, &layout, at, half, theme)?;
    footer(model, pen, &layout, scale, theme)?;
    handle::draw(
        pen,
        x,
        layout.handle_top,
        view.width_css,
        &model.chosen_date,
        theme,
    )
}

/// The Moon's limb under the chosen disc, to the same scale; absent for bodies of its own size.
fn moon_edge(
    model: &DiscModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    scale: f64,
    width: f64,
    theme: &Theme,
) -> Result<(), Failed> {
    let Some(label) = model.moon_edge else {
        return Ok(());
    };
    let apex = (width / 2.0, layout.moon_y);
    let outline = rising_limb(
        apex,
        MOON_WIDTH_ARCSEC / 2.0 * scale,
        (0.0, width),
        layout.row_top,
    );
    pen.area(&outline, theme.moon)?;
    let face = pen.fit(label, plain(11.0, theme.muted), width - 24.0)?;
    let y = (layout.moon_y + layout.row_top) / 2.0 + 2.0;
    pen.text(label, (apex.0, y), Align::Middle, face)?;
    Ok(())
}

/// The chosen readings on the side of the disc that has more room.
fn stage_readings(
    model: &DiscModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    at: Point,
    half: f64,
    theme: &Theme,
) -> Result<(), Failed> {
    let (left_room, right_room) = (
        at.0 - half - 14.0 - layout.left,
        layout.right - at.0 - half - 14.0,
    );
    let (x, align, room) = if right_room >= left_room.min(170.0) {
        (at.0 + half + 14.0, Align::Left, right_room)
    } else {
        (at.0 - half - 14.0, Align::Right, left_room)
    };
    for (index, text) in model.chosen_lines.iter().enumerate() {
        let face = if index == 0 {
            bold(16.0, theme.ink)
        } else {
            plain(13.0, theme.ink)
        };
        let face = pen.fit(text, face, room)?;
        pen.text(text, (x, at.1 + 19.0 * (index as f64 - 1.0)), align, face)?;
    }
    Ok(())
}

fn footer(
    model: &DiscModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    scale: f64,
    theme: &Theme,
) -> Result<(), Failed> {
    let face = plain(11.0, theme.muted);
    let longest = (0.2 * (layout.right - layout.left)).clamp(48.0, 130.0);
    let y = layout.footer_y;
    let mut after_bar = layout.left;
    if let Some((arcsec, label)) = model
        .bars
        .iter()
        .rev()
        .find(|(arcsec, _)| arcsec * scale <= longest)
    {
        let end = layout.left + arcsec * scale;
        pen.block((layout.left, y - 0.75), (end, y + 0.75), theme.ink)?;
        for x in [layout.left, end] {
            pen.upright(x, y - 5.0, y + 5.0, 1.5, theme.ink)?;
        }
        let face = pen.fit(label, face, layout.right - end - 9.0)?;
        pen.text(label, (end + 9.0, y), Align::Left, face)?;
        after_bar = end + 9.0 + pen.text_width(label, face)?;
    }
    let width = pen.text_width(model.orientation, face)?;
    if after_bar + 16.0 + width <= layout.right {
        pen.text(model.orientation, (layout.right, y), Align::Right, face)?;
    } else {
        pen.text(
            model.orientation,
            (layout.left, y + 16.0),
            Align::Left,
            face,
        )?;
    }
    Ok(())
}
