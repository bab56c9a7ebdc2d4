//! The curves of the four strips, their scales and their marked highlights.

use super::super::ink::Failed;
use super::super::pen::{Align, Pen, Point, plain};
use super::super::theme::{Colour, Theme};
use super::captions::{diamond, square};
use super::layout::{Layout, Strip};
use super::model::TradeoffModel;
use super::scales::Curve;

/// Distance of the nodes of a curve in CSS pixels.
const NODE_CSS: f64 = 3.0;

/// The strips by their place in the picture.
pub(super) const AREA: usize = 2;
pub(super) const LIGHT: usize = 3;

struct Look {
    line: Colour,
    tint: Option<Colour>,
    width: f64,
}

/// The lit share wears the colour of light and the diameter that of size; the lit area wears both.
fn look(index: usize, theme: &Theme) -> Look {
    match index {
        0 => Look {
            line: theme.light,
            tint: Some(theme.light_tint),
            width: 2.0,
        },
        1 => Look {
            line: theme.size,
            tint: Some(theme.size_tint),
            width: 2.0,
        },
        AREA => Look {
            line: theme.size,
            tint: Some(theme.light_tint),
            width: 2.0,
        },
        _ => Look {
            line: theme.ink,
            tint: None,
            width: 2.75,
        },
    }
}

pub(super) fn draw(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let nodes = nodes(model, layout);
    for (index, (strip, curve)) in layout.strips.iter().zip(model.curves.iter()).enumerate() {
        let look = look(index, theme);
        let runs = runs(&nodes, strip, curve);
        if let Some(tint) = look.tint {
            for run in &runs {
                let (Some(first), Some(last)) = (run.first(), run.last()) else {
                    continue;
                };
                let mut outline = run.clone();
                outline.extend([(last.0, strip.bottom), (first.0, strip.bottom)]);
                pen.area(&outline, tint)?;
            }
        }
        if index == LIGHT {
            flat_tops(model, pen, layout, theme)?;
        }
        scale(pen, layout, strip, curve, theme)?;
        for run in &runs {
            pen.line(run, look.width, look.line)?;
        }
    }
    marks(model, pen, layout, theme)
}

/// Indices of the samples that become nodes, with their places.
fn nodes(model: &TradeoffModel, layout: &Layout) -> Vec<(usize, f64)> {
    let most = ((layout.plot_right - layout.plot_left) / NODE_CSS) as usize;
    let stride = model.days.len().div_ceil(most.max(1)).max(1);
    let last = model.days.len().saturating_sub(1);
    let chosen = (0..model.days.len()).filter(|index| index % stride == 0 || *index == last);
    chosen
        .map(|index| {
            (
                index,
                model
                    .span
                    .x_of(model.days[index], layout.plot_left, layout.plot_right),
            )
        })
        .collect()
}

/// The curve cut where it has no value.
fn runs(nodes: &[(usize, f64)], strip: &Strip, curve: &Curve) -> Vec<Vec<Point>> {
    let mut runs: Vec<Vec<Point>> = vec![Vec::new()];
    for &(index, x) in nodes {
        match curve.values.get(index).filter(|value| value.is_finite()) {
            Some(&value) => {
                if let Some(run) = runs.last_mut() {
                    run.push((x, strip.y_of(curve.share(value))));
                }
            }
            None => runs.push(Vec::new()),
        }
    }
    runs.retain(|run| run.len() > 1);
    runs
}

fn scale(
    pen: &mut Pen<'_>,
    layout: &Layout,
    strip: &Strip,
    curve: &Curve,
    theme: &Theme,
) -> Result<(), Failed> {
    let face = plain(11.0, theme.muted);
    pen.level(
        layout.plot_left,
        layout.plot_right,
        strip.bottom - 1.0,
        theme.limb,
    )?;
    for (value, label) in &curve.ticks {
        let y = strip.y_of(curve.share(*value));
        if y < strip.bottom - 2.0 {
            pen.level(layout.plot_left, layout.plot_right, y, theme.grid)?;
        }
        let room = layout.plot_left - 6.0;
        let face = pen.fit(label, face, room - 1.0)?;
        pen.text(label, (room, y.min(strip.bottom - 5.0)), Align::Right, face)?;
    }
    Ok(())
}

/// The days within 0.1 mag of a peak, as a band behind the curve and a bar above it.
fn flat_tops(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let (strip, curve) = (&layout.strips[LIGHT], &model.curves[LIGHT]);
    for mark in &model.peaks {
        let x_of = |day: f64| model.span.x_of(day, layout.plot_left, layout.plot_right);
        let (from, to) = (
            x_of(mark.peak.flat_from.days_since_j2000()),
            x_of(mark.peak.flat_to.days_since_j2000()),
        );
        let y = strip.y_of(curve.share(mark.peak.magnitude)) - 6.0;
        pen.block((from, y), (to, strip.bottom - 1.0), theme.light_tint)?;
        pen.block((from, y - 1.0), (to, y + 1.0), theme.light)?;
        for (end, utc) in [(from, mark.peak.flat_from), (to, mark.peak.flat_to)] {
            // A bar that runs on beyond the span has no end here.
            if !model.span.holds(utc.days_since_j2000()) {
                continue;
            }
            pen.upright(end, y - 3.0, y + 4.0, 1.5, theme.light)?;
        }
    }
    Ok(())
}

fn marks(
    model: &TradeoffModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let x_of = |day: f64| model.span.x_of(day, layout.plot_left, layout.plot_right);
    for mark in &model.extents {
        let (strip, curve) = (&layout.strips[AREA], &model.curves[AREA]);
        square(
            pen,
            (x_of(mark.day), strip.y_of(curve.share(mark.area))),
            theme,
        )?;
    }
    for mark in &model.peaks {
        let (strip, curve) = (&layout.strips[LIGHT], &model.curves[LIGHT]);
        let at = (
            x_of(mark.peak.utc.days_since_j2000()),
            strip.y_of(curve.share(mark.peak.magnitude)),
        );
        diamond(pen, at, theme)?;
    }
    Ok(())
}
