//! Names of the marked highlights, in the lines above the curves.

use super::super::ink::Failed;
use super::super::pen::{Align, Face, Pen, Point, bold, plain};
use super::super::theme::Theme;
use super::curves::{AREA, LIGHT};
use super::layout::{Layout, Strip};
use super::model::TradeoffModel;

/// The sign of a greatest brightness.
pub(super) fn diamond(pen: &mut Pen<'_>, (x, y): Point, theme: &Theme) -> Result<(), Failed> {
    let outline = |r: f64| [(x, y - r), (x + r, y), (x, y + r), (x - r, y)];
    pen.area(&outline(6.5), theme.panel)?;
    pen.area(&outline(5.0), theme.ink)
}

/// The sign of a greatest lit area.
pub(super) fn square(pen: &mut Pen<'_>, (x, y): Point, theme: &Theme) -> Result<(), Failed> {
    pen.block((x - 4.5, y - 4.5), (x + 4.5, y + 4.5), theme.panel)?;
    pen.block((x - 3.5, y - 3.5), (x + 3.5, y + 3.5), theme.size)
}

/// A label above a curve, with the sign that it explains.
struct Caption<'a> {
    long: &'a str,
    short: &'a str,
    /// Stands beside the label where there is room, else in the next line.
    addition: &'a str,
    sign: fn(&mut Pen<'_>, Point, &Theme) -> Result<(), Failed>,
}

pub(super) fn draw(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let day = model.chosen.day;
    let x_of = |day: f64| model.span.x_of(day, layout.plot_left, layout.plot_right);
    let left = brighter(model, pen, layout, theme)?;
    let nearest = |days: &mut dyn Iterator<Item = f64>| {
        let distance = |a: f64| (a - day).abs();
        days.enumerate()
            .min_by(|a, b| distance(a.1).total_cmp(&distance(b.1)))
            .map(|(index, _)| index)
    };
    let extent = nearest(&mut model.extents.iter().map(|mark| mark.day))
        .and_then(|index| model.extents.get(index));
    if let Some(mark) = extent {
        let caption = Caption {
            long: &mark.label,
            short: &mark.short_label,
            addition: "",
            sign: square,
        };
        put(
            pen,
            &caption,
            x_of(mark.day),
            &layout.strips[AREA],
            (layout.plot_left, layout.plot_right),
            theme,
        )?;
    }
    let peak = nearest(
        &mut model
            .peaks
            .iter()
            .map(|mark| mark.peak.utc.days_since_j2000()),
    )
    .and_then(|index| model.peaks.get(index));
    if let Some(mark) = peak {
        let caption = Caption {
            long: &mark.label,
            short: &mark.short_label,
            addition: &mark.flatness,
            sign: diamond,
        };
        let x = x_of(mark.peak.utc.days_since_j2000());
        put(
            pen,
            &caption,
            x,
            &layout.strips[LIGHT],
            (left, layout.plot_right),
            theme,
        )?;
    }
    Ok(())
}

/// Says beside the magnitude axis which way is brighter; gives the left end of the room that is left.
fn brighter(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<f64, Failed> {
    let face = plain(11.0, theme.muted);
    let y = layout.strips[LIGHT].panel_top + 8.0;
    let width = pen.text_width(model.brighter, face)?;
    let left = (layout.plot_left - 18.0 - width).max(4.0);
    let arrow = left + width + 7.0;
    let end = arrow + 5.0;
    if end > layout.plot_left {
        pen.block((layout.plot_left, y - 8.0), (end, y + 8.0), theme.panel)?;
    }
    pen.text(model.brighter, (left, y), Align::Left, face)?;
    pen.line(&[(arrow, y + 5.0), (arrow, y - 5.0)], 1.5, theme.muted)?;
    pen.line(
        &[
            (arrow - 3.5, y - 1.5),
            (arrow, y - 5.0),
            (arrow + 3.5, y - 1.5),
        ],
        1.5,
        theme.muted,
    )?;
    Ok(layout.plot_left.max(end + 2.0))
}

fn put(
    pen: &mut Pen<'_>,
    caption: &Caption<'_>,
    x: f64,
    strip: &Strip,
    (left, right): (f64, f64),
    theme: &Theme,
) -> Result<(), Failed> {
    const SIGN: f64 = 14.0;
    const AIR: f64 = 10.0;
    let (face, quiet) = (bold(12.0, theme.ink), plain(12.0, theme.muted));
    let room = right - left - 8.0;
    let mut text = caption.long;
    let mut width = pen.text_width(text, face)?;
    if SIGN + width > room {
        text = caption.short;
        width = pen.text_width(text, face)?;
    }
    let added = if caption.addition.is_empty() {
        0.0
    } else {
        pen.text_width(caption.addition, quiet)? + AIR
    };
    let one_line = SIGN + width + added <= room && strip.curve_top - strip.panel_top < 30.0;
    let y = strip.panel_top + 9.0;
    let total = (SIGN + width + if one_line { added } else { 0.0 }).min(room);
    let start = (x - total / 2.0).min(right - 4.0 - total).max(left + 4.0);
    behind(pen, (start, y), total, theme)?;
    (caption.sign)(pen, (start + 6.0, y), theme)?;
    let face = pen.fit(text, face, room - SIGN)?;
    pen.text(text, (start + SIGN, y), Align::Left, face)?;
    if added == 0.0 {
        return Ok(());
    }
    if one_line {
        pen.text(
            caption.addition,
            (start + SIGN + width + AIR, y),
            Align::Left,
            quiet,
        )?;
        return Ok(());
    }
    let quiet: Face = pen.fit(caption.addition, quiet, room)?;
    let width = pen.text_width(caption.addition, quiet)?;
    let start = (x - width / 2.0).min(right - 4.0 - width).max(left + 4.0);
    behind(pen, (start, y + 16.0), width, theme)?;
    pen.text(caption.addition, (start, y + 16.0), Align::Left, quiet)?;
    Ok(())
}

/// Clears the ground of a caption, so that the line of the chosen date does not run through its letters.
fn behind(pen: &mut Pen<'_>, (x, y): Point, width: f64, theme: &Theme) -> Result<(), Failed> {
    pen.block((x - 2.0, y - 8.0), (x + width + 2.0, y + 8.0), theme.panel)
}
