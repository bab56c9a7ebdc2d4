//! The grip of the chosen date: a pill with the date in it, large enough for a finger.

use super::ink::Failed;
use super::pen::{Align, Pen, bold};
use super::shapes::pill;
use super::theme::Theme;

/// Height of the grip in CSS pixels; at least 24 for touch (WCAG 2.2, 2.5.8).
pub(super) const HEIGHT: f64 = 26.0;

/// Draws the grip with its top at `top`, as near above `x` as the width allows.
pub(super) fn draw(
    pen: &mut Pen<'_>,
    x: f64,
    top: f64,
    width: f64,
    date: &str,
    theme: &Theme,
) -> Result<(), Failed> {
    let face = bold(13.0, theme.on_chosen);
    let half = pen.text_width(date, face)? / 2.0 + 24.0;
    // Not `clamp`: its message for bounds in the wrong order brings the formatting of exponents.
    let middle = x
        .min((width - half - 2.0).max(width / 2.0))
        .max((half + 2.0).min(width / 2.0));
    let y = top + HEIGHT / 2.0;
    pen.area(
        &pill((middle - half, top), (middle + half, top + HEIGHT)),
        theme.chosen,
    )?;
    // Arrow heads to both sides say that it slides.
    for side in [-1.0, 1.0] {
        let tip = middle + side * (half - 8.0);
        let back = tip - side * 4.0;
        pen.line(
            &[(back, y - 4.5), (tip, y), (back, y + 4.5)],
            1.75,
            theme.on_chosen,
        )?;
    }
    pen.text(date, (middle, y), Align::Middle, face)?;
    Ok(())
}
