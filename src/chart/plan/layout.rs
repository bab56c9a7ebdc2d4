//! Where map, disc and dates of the plan stand, from its size alone.

use super::super::handle;
use super::super::pen::Point;

const EDGE: f64 = 8.0;
const GAP: f64 = 8.0;
/// From this width on the disc stands beside the map.
const WIDE: f64 = 600.0;
/// Largest map.
const MOST_MAP: f64 = 480.0;
/// Height of the disc's panel under the map.
const LOW_PANEL: f64 = 134.0;
/// Room between the outer orbit and the edge of the map: half a planet and its arc.
const MAP_AIR: f64 = 22.0;
/// Grip, line of dates with its signs, two lines of labels, the name of the nearest turning point.
const LANE: f64 = handle::HEIGHT + 82.0;
/// Smallest map that still tells near from far.
const LEAST_MAP: f64 = 200.0;

/// Left, top, right and bottom.
pub(super) type Bounds = [f64; 4];

fn panel_width(width: f64) -> f64 {
    (0.3 * width).clamp(200.0, 300.0)
}

fn is_wide(width: f64) -> bool {
    width >= WIDE
}

/// Height of the map that suits a width.
fn map_height(width: f64) -> f64 {
    let room = width - 2.0 * EDGE;
    if is_wide(width) {
        (room - GAP - panel_width(width)).min(MOST_MAP)
    } else {
        room.min(MOST_MAP)
    }
}

/// Height that is not the map's own.
fn fixed(width: f64) -> f64 {
    let panel = if is_wide(width) { 0.0 } else { GAP + LOW_PANEL };
    GAP + panel + GAP + LANE
}

/// Height that suits a width.
pub(in crate::chart) fn preferred_height(width_css: f64) -> f64 {
    (fixed(width_css) + map_height(width_css)).round()
}

/// Smallest height that still holds every part.
pub(in crate::chart) fn least_height(width_css: f64) -> f64 {
    fixed(width_css) + LEAST_MAP
}

/// Left and right end of the date scale.
pub(in crate::chart) fn lane_edges(width_css: f64) -> (f64, f64) {
    (EDGE, width_css - EDGE)
}

pub(super) struct Layout {
    pub(super) wide: bool,
    pub(super) map: Bounds,
    pub(super) centre: Point,
    /// Where the farthest point of both orbits may lie.
    pub(super) reach: f64,
    pub(super) panel: Bounds,
    pub(super) handle_top: f64,
    /// The line of dates.
    pub(super) line_y: f64,
    pub(super) labels_y: f64,
    pub(super) name_y: f64,
    pub(super) left: f64,
    pub(super) right: f64,
}

impl Layout {
    pub(super) fn new(width: f64, height: f64) -> Layout {
        let wide = is_wide(width);
        let (left, right) = lane_edges(width);
        let map_height = height - fixed(width);
        let map_right = if wide {
            right - GAP - panel_width(width)
        } else {
            right
        };
        let map = [left, GAP, map_right, GAP + map_height];
        let panel = if wide {
            [map_right + GAP, GAP, right, map[3]]
        } else {
            [left, map[3] + GAP, right, map[3] + GAP + LOW_PANEL]
        };
        let handle_top = panel[3] + GAP;
        let line_y = handle_top + handle::HEIGHT + 14.0;
        Layout {
            wide,
            map,
            centre: ((map[0] + map[2]) / 2.0, (map[1] + map[3]) / 2.0),
            reach: (map_right - left).min(map_height) / 2.0 - MAP_AIR,
            panel,
            handle_top,
            line_y,
            labels_y: line_y + 18.0,
            name_y: line_y + 54.0,
            left,
            right,
        }
    }
}
