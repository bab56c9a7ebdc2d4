//! Where the lanes of the disc picture stand, from its size alone.

use super::super::handle;

const EDGE: f64 = 8.0;
const HANDLE_TOP: f64 = 4.0;
/// Room in the stage above the disc, and from its foot to the row: the Moon's edge rises into the latter.
const STAGE_ABOVE: f64 = 14.0;
const STAGE_BELOW: f64 = 48.0;
const MOON_RISES: f64 = 28.0;
const ROW_AIR: f64 = 10.0;
const LABELS: f64 = 52.0;
/// Largest extent of a body in the picture.
const LARGEST: f64 = 132.0;
/// Smallest extent that still shows a phase.
const SMALLEST: f64 = 36.0;

/// Height that is not the discs' own; the footer takes two lines where one is too narrow.
fn fixed(width_css: f64) -> f64 {
    let footer = if width_css < 560.0 { 44.0 } else { 28.0 };
    HANDLE_TOP + handle::HEIGHT + STAGE_ABOVE + STAGE_BELOW + 2.0 * ROW_AIR + LABELS + footer
}

/// Height that suits a width.
pub(in crate::chart) fn preferred_height(width_css: f64) -> f64 {
    (fixed(width_css) + 2.0 * (cell(width_css) - 8.0).min(LARGEST)).round()
}

/// Smallest height that still holds both lanes.
pub(in crate::chart) fn least_height(width_css: f64) -> f64 {
    fixed(width_css) + 2.0 * SMALLEST
}

/// Left and right end of the date scale.
pub(in crate::chart) fn lane_edges(width_css: f64) -> (f64, f64) {
    (EDGE, width_css - EDGE)
}

/// Dates in the row.
fn count(width_css: f64) -> usize {
    match width_css {
        w if w < 480.0 => 5,
        w if w < 900.0 => 7,
        _ => 9,
    }
}

fn cell(width_css: f64) -> f64 {
    (width_css - 2.0 * EDGE) / count(width_css) as f64
}

pub(super) struct Layout {
    pub(super) count: usize,
    pub(super) cell: f64,
    pub(super) left: f64,
    pub(super) right: f64,
    /// Extent given to the largest body of the span.
    pub(super) disc: f64,
    pub(super) handle_top: f64,
    pub(super) stage_y: f64,
    pub(super) moon_y: f64,
    pub(super) row_top: f64,
    pub(super) row_y: f64,
    pub(super) row_discs_bottom: f64,
    pub(super) labels_y: f64,
    pub(super) row_bottom: f64,
    pub(super) footer_y: f64,
}

impl Layout {
    pub(super) fn new(width: f64, height: f64) -> Layout {
        let (left, right) = lane_edges(width);
        let cell = cell(width);
        let disc = (cell - 8.0).min(LARGEST).min((height - fixed(width)) / 2.0);
        let stage_top = HANDLE_TOP + handle::HEIGHT + STAGE_ABOVE;
        // Height beyond what the discs need goes to the stage.
        let spare = height - fixed(width) - 2.0 * disc;
        let row_top = stage_top + disc + STAGE_BELOW + spare;
        let row_y = row_top + ROW_AIR + disc / 2.0;
        let row_discs_bottom = row_y + disc / 2.0 + ROW_AIR;
        Layout {
            count: count(width),
            cell,
            left,
            right,
            disc,
            handle_top: HANDLE_TOP,
            stage_y: stage_top + (disc + spare) / 2.0,
            moon_y: row_top - MOON_RISES,
            row_top,
            row_y,
            row_discs_bottom,
            labels_y: row_discs_bottom + 8.0,
            row_bottom: row_discs_bottom + LABELS,
            footer_y: row_discs_bottom + LABELS + 14.0,
        }
    }
}
