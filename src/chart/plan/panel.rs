//! The disc as it is seen from the Earth, inside the outline of the largest one of the span, with its readings.

use super::super::disc::{Look, globe};
use super::super::ink::Failed;
use super::super::pen::{Align, Pen, bold, plain};
use super::super::theme::Theme;
use super::layout::Layout;
use super::model::PlanModel;

/// Largest extent of a disc.
const LARGEST: f64 = 190.0;
const PAD: f64 = 12.0;
/// Distance between lines of text.
const LEADING: f64 = 19.0;

pub(super) fn draw(
    model: &PlanModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let [left, top, right, bottom] = layout.panel;
    let labels = &model.labels;
    let remarks = [
        labels.facing_arc,
        labels.largest_outline,
        if model.projection.is_true() {
            labels.true_distances
        } else {
            labels.shortened_distances
        },
    ];
    let heading = bold(13.0, theme.muted);
    let quiet = plain(11.0, theme.muted);
    let extent;
    let centre;
    // Where lines of text begin, where they are anchored, and how wide they may be.
    let (x, align, room, first_y);
    if layout.wide {
        let texts = 3.0 * LEADING + 66.0;
        extent = (right - left - 4.0 * PAD)
            .min(bottom - top - 40.0 - texts)
            .min(LARGEST);
        centre = ((left + right) / 2.0, (top + 40.0 + bottom - texts) / 2.0);
        (x, align, room) = (centre.0, Align::Middle, right - left - 2.0 * PAD);
        first_y = bottom - texts + 10.0;
        let face = pen.fit(labels.seen_from_earth, heading, room)?;
        pen.text(labels.seen_from_earth, (x, top + 20.0), align, face)?;
    } else {
        extent = (bottom - top - 2.0 * PAD).min(0.36 * (right - left));
        centre = (left + PAD + extent / 2.0, (top + bottom) / 2.0);
        let begin = left + extent + 2.5 * PAD;
        (x, align, room) = (begin, Align::Left, right - begin - PAD / 2.0);
        first_y = top + 37.0;
        let face = pen.fit(labels.seen_from_earth, heading, room)?;
        pen.text(labels.seen_from_earth, (x, top + 15.0), align, face)?;
    }
    let scale = extent / model.largest_extent_arcsec;
    let look = Look {
        lit: theme.sunlit,
        night: theme.night_side,
        limb: theme.ink,
        ring: theme.glow,
        line: 1.5,
    };
    pen.ring(centre, model.largest_radius_arcsec * scale, 1.0, theme.limb)?;
    globe(&model.chosen.disc, pen, centre, scale, &look)?;
    let mut y = first_y;
    for (index, line) in model.chosen.lines.iter().enumerate() {
        let face = if index == 0 {
            bold(16.0, theme.ink)
        } else {
            plain(13.0, theme.ink)
        };
        let face = pen.fit(line, face, room)?;
        pen.text(line, (x, y), align, face)?;
        y += LEADING;
    }
    for remark in remarks {
        let face = pen.fit(remark, quiet, room)?;
        pen.text(remark, (x, y), align, face)?;
        y += 15.0;
    }
    Ok(())
}
