//! Where the strips and their names stand, from the size of the picture alone.

use super::super::handle;
use super::super::pen::Point;

/// From this width the names stand in a gutter at the left; below, in a row above each strip.
const WIDE_FROM: f64 = 620.0;
const AXIS_HEIGHT: f64 = 34.0;
const CAPTION_LINE: f64 = 16.0;
const HEADER_HEIGHT: f64 = 36.0;

/// Height that suits a width.
pub(in crate::chart) fn preferred_height(width_css: f64) -> f64 {
    if width_css < WIDE_FROM {
        560.0
    } else {
        (450.0 + 0.09 * (width_css - WIDE_FROM)).min(540.0).round()
    }
}

/// Smallest height that still holds four strips.
pub(in crate::chart) fn least_height(width_css: f64) -> f64 {
    if width_css < WIDE_FROM { 440.0 } else { 360.0 }
}

/// Left and right end of the date axis.
pub(in crate::chart) fn plot_edges(width_css: f64) -> (f64, f64) {
    if width_css < WIDE_FROM {
        (42.0, width_css - 10.0)
    } else {
        (gutter_width(width_css) + 52.0, width_css - 16.0)
    }
}

fn gutter_width(width_css: f64) -> f64 {
    (0.3 * width_css).clamp(200.0, 300.0)
}

pub(super) struct Layout {
    pub(super) wide: bool,
    pub(super) handle_top: f64,
    pub(super) plot_left: f64,
    pub(super) plot_right: f64,
    pub(super) axis_top: f64,
    pub(super) strips: [Strip; 4],
}

/// One strip and the place of its picture, name and readings.
#[derive(Clone, Copy)]
pub(super) struct Strip {
    pub(super) panel_top: f64,
    pub(super) bottom: f64,
    /// Top of the room for the curve; the caption lines stand between it and `panel_top`.
    pub(super) curve_top: f64,
    pub(super) picture: Point,
    pub(super) picture_radius: f64,
    pub(super) text_left: f64,
    pub(super) text_right: f64,
    pub(super) name_y: f64,
    pub(super) reading_y: f64,
    /// Where the sign to the strip below stands.
    pub(super) sign: Point,
}

impl Strip {
    /// Height of a share of the value range, 0 below and 1 above.
    pub(super) fn y_of(&self, share: f64) -> f64 {
        self.bottom - 1.0 - share * (self.bottom - 1.0 - self.curve_top)
    }
}

impl Layout {
    pub(super) fn new(width: f64, height: f64) -> Layout {
        let (plot_left, plot_right) = plot_edges(width);
        let wide = width >= WIDE_FROM;
        let handle_top = 4.0;
        let strips_top = handle_top + handle::HEIGHT + if wide { 10.0 } else { 8.0 };
        let axis_top = height - AXIS_HEIGHT;
        let flat_lines = if plot_right - plot_left < 500.0 {
            2.0
        } else {
            1.0
        };
        let captions = [0.0, 0.0, CAPTION_LINE, flat_lines * CAPTION_LINE];
        let (gap, header) = if wide {
            (14.0, 0.0)
        } else {
            (16.0, HEADER_HEIGHT)
        };
        let fixed = 3.0 * gap + 4.0 * header + captions.iter().sum::<f64>();
        let room = (axis_top - strips_top - fixed) / 4.0;
        let mut top = strips_top;
        let strips = captions.map(|caption| {
            let panel_top = top + header;
            let curve_top = panel_top + caption + 9.0;
            let bottom = panel_top + caption + room;
            let strip = if wide {
                let radius = ((bottom - panel_top) / 2.0 - 5.0).min(34.0);
                let line = ((bottom - panel_top) / 3.7).min(21.0);
                let middle = (panel_top + bottom) / 2.0;
                Strip {
                    panel_top,
                    bottom,
                    curve_top,
                    picture: (46.0, middle),
                    picture_radius: radius,
                    text_left: 94.0,
                    text_right: plot_left - 48.0,
                    name_y: middle - line,
                    reading_y: middle,
                    sign: (46.0, bottom + gap / 2.0),
                }
            } else {
                Strip {
                    panel_top,
                    bottom,
                    curve_top,
                    picture: (20.0, top + 17.0),
                    picture_radius: 16.0,
                    text_left: 46.0,
                    text_right: width - 6.0,
                    name_y: top + 8.0,
                    reading_y: top + 25.0,
                    sign: (20.0, bottom + gap / 2.0),
                }
            };
            top = bottom + gap;
            strip
        });
        Layout {
            wide,
            handle_top,
            plot_left,
            plot_right,
            axis_top,
            strips,
        }
    }
}
