//! Left of the strips, or above each where the picture is narrow: a small picture of the term, its name and reading,
//! and the sign that leads to the next.

use super::super::ink::Failed;
use super::super::pen::{Align, Pen, Point, bold, plain};
use super::super::shapes::{lit_part, placed};
use super::super::theme::Theme;
use super::layout::{Layout, Strip};
use super::model::{Chosen, TradeoffModel};
use super::scales::Curve;

pub(super) fn draw(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    for (index, (strip, curve)) in layout.strips.iter().zip(model.curves.iter()).enumerate() {
        let (at, radius) = (strip.picture, strip.picture_radius);
        match index {
            0 => phase(pen, at, radius, &model.chosen, theme)?,
            1 => size(pen, at, radius, &model.chosen, theme)?,
            2 => lit_area(pen, at, radius, &model.chosen, theme)?,
            _ => light(pen, at, radius, &model.chosen, theme)?,
        }
        match index {
            0 => times(pen, strip.sign, theme)?,
            1 => equals(pen, strip.sign, theme)?,
            2 => arrow(pen, strip.sign, theme)?,
            _ => {}
        }
        readings(pen, layout, strip, curve, theme)?;
    }
    if layout.wide {
        let y = layout.handle_top + 13.0;
        pen.text(model.heading, (14.0, y), Align::Left, bold(17.0, theme.ink))?;
    }
    Ok(())
}

fn readings(
    pen: &mut Pen<'_>,
    layout: &Layout,
    strip: &Strip,
    curve: &Curve,
    theme: &Theme,
) -> Result<(), Failed> {
    let (x, room) = (strip.text_left, strip.text_right - strip.text_left);
    let name = pen.fit(curve.name, plain(12.0, theme.muted), room)?;
    pen.text(curve.name, (x, strip.name_y), Align::Left, name)?;
    let reading = pen.fit(
        &curve.reading,
        bold(if layout.wide { 19.0 } else { 15.0 }, theme.ink),
        room,
    )?;
    pen.text(&curve.reading, (x, strip.reading_y), Align::Left, reading)?;
    let quiet = plain(11.5, theme.muted);
    let (remark_x, remark_y) = if layout.wide {
        (x, 2.0 * strip.reading_y - strip.name_y)
    } else {
        (
            x + pen.text_width(&curve.reading, reading)? + 9.0,
            strip.reading_y + 1.0,
        )
    };
    let quiet = pen.fit(&curve.remark, quiet, strip.text_right - remark_x)?;
    pen.text(&curve.remark, (remark_x, remark_y), Align::Left, quiet)?;
    Ok(())
}

/// The phase on a disc of fixed size.
fn phase(
    pen: &mut Pen<'_>,
    at: Point,
    radius: f64,
    chosen: &Chosen,
    theme: &Theme,
) -> Result<(), Failed> {
    pen.disc(at, radius, theme.night_side)?;
    lit(pen, at, radius, chosen, theme)?;
    pen.ring(at, radius, 1.0, theme.limb)
}

/// The whole disc to the scale of the span, within the largest as a faint ring.
fn size(
    pen: &mut Pen<'_>,
    at: Point,
    radius: f64,
    chosen: &Chosen,
    theme: &Theme,
) -> Result<(), Failed> {
    pen.ring(at, radius, 1.0, theme.grid)?;
    let radius = radius * chosen.size_share.min(1.0);
    pen.disc(at, radius, theme.size_tint)?;
    pen.ring(at, radius, 1.75, theme.size)
}

/// The lit part to the same scale.
fn lit_area(
    pen: &mut Pen<'_>,
    at: Point,
    radius: f64,
    chosen: &Chosen,
    theme: &Theme,
) -> Result<(), Failed> {
    let radius = radius * chosen.size_share.min(1.0);
    pen.disc(at, radius, theme.panel)?;
    lit(pen, at, radius, chosen, theme)?;
    pen.ring(at, radius, 1.75, theme.size)
}

fn lit(
    pen: &mut Pen<'_>,
    at: Point,
    radius: f64,
    chosen: &Chosen,
    theme: &Theme,
) -> Result<(), Failed> {
    // A body of its own light has no phase: all of it shines.
    let fraction = if chosen.lit_fraction.is_finite() {
        chosen.lit_fraction
    } else {
        1.0
    };
    pen.area(
        &placed(&lit_part(fraction, (chosen.sunward, 0.0)), at, radius),
        theme.sunlit,
    )
}

/// A point of light whose halo covers an area in proportion to the light received; the ring is the span's greatest.
fn light(
    pen: &mut Pen<'_>,
    at: Point,
    radius: f64,
    chosen: &Chosen,
    theme: &Theme,
) -> Result<(), Failed> {
    pen.ring(at, radius, 1.0, theme.grid)?;
    if !chosen.light_share.is_finite() {
        return Ok(());
    }
    let halo = radius * chosen.light_share.min(1.0).sqrt();
    pen.disc(at, halo, theme.glow)?;
    pen.disc(at, 1.5 + 0.2 * halo, theme.ink)
}

const SIGN_HALF: f64 = 4.5;

fn times(pen: &mut Pen<'_>, (x, y): Point, theme: &Theme) -> Result<(), Failed> {
    let half = SIGN_HALF * 0.9;
    pen.line(
        &[(x - half, y - half), (x + half, y + half)],
        1.75,
        theme.ink,
    )?;
    pen.line(
        &[(x - half, y + half), (x + half, y - half)],
        1.75,
        theme.ink,
    )
}

fn equals(pen: &mut Pen<'_>, (x, y): Point, theme: &Theme) -> Result<(), Failed> {
    for offset in [-2.5, 2.5] {
        pen.line(
            &[(x - SIGN_HALF, y + offset), (x + SIGN_HALF, y + offset)],
            1.75,
            theme.ink,
        )?;
    }
    Ok(())
}

fn arrow(pen: &mut Pen<'_>, (x, y): Point, theme: &Theme) -> Result<(), Failed> {
    let half = SIGN_HALF + 0.5;
    pen.line(&[(x, y - half), (x, y + half)], 1.75, theme.ink)?;
    pen.line(
        &[
            (x - 4.0, y + half - 4.0),
            (x, y + half),
            (x + 4.0, y + half - 4.0),
        ],
        1.75,
        theme.ink,
    )
}
