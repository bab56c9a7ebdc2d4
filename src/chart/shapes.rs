//! Outlines: lit part of a disc, half rings, rounded handles. Plain geometry in the picture's plane.

use super::pen::Point;
use crate::quantity::{cos, sin};
use std::f64::consts::{FRAC_PI_2, PI, TAU};

/// Points on half an outline; 24 keep a disc of 300 px within a quarter of a pixel.
const HALF_STEPS: usize = 24;

/// Direction in the picture of a position angle, counted from north through east, when `up_deg` is the position
/// angle that points up. East of north is to the left, as seen looking out at the sky.
pub(super) fn direction(position_angle_deg: f64, up_deg: f64) -> Point {
    let angle = (position_angle_deg - up_deg).to_radians();
    (-sin(angle), -cos(angle))
}

/// Outline of the lit part of a unit disc whose middle of the lit limb lies towards `towards`.
///
/// The terminator is half an ellipse of semi-axis |1 - 2 k|, k being the lit fraction.
pub(super) fn lit_part(lit_fraction: f64, towards: Point) -> Vec<Point> {
    let bulge = 1.0 - 2.0 * lit_fraction.clamp(0.0, 1.0);
    let (ux, uy) = towards;
    let place = |along: f64, across: f64| (along * ux - across * uy, along * uy + across * ux);
    let angle = |step: usize| -FRAC_PI_2 + PI * step as f64 / HALF_STEPS as f64;
    let limb = (0..=HALF_STEPS).map(|step| place(cos(angle(step)), sin(angle(step))));
    let terminator = (1..HALF_STEPS)
        .rev()
        .map(|step| place(bulge * cos(angle(step)), sin(angle(step))));
    limb.chain(terminator).collect()
}

/// Unit circle as a polygon.
pub(super) fn circle() -> Vec<Point> {
    let steps = 2 * HALF_STEPS;
    (0..steps)
        .map(|step| TAU * step as f64 / steps as f64)
        .map(|angle| (cos(angle), sin(angle)))
        .collect()
}

/// Which half of a ring system: the one behind the globe or the one in front.
#[derive(Clone, Copy)]
pub(super) enum RingHalf {
    Far,
    Near,
}

/// Half of a flat ring between two radii, seen under `opening_deg` (latitude of the observer above the ring's north
/// side), its north pole towards `pole` in the picture.
pub(super) fn half_ring(
    inner: f64,
    outer: f64,
    opening_deg: f64,
    pole: Point,
    half: RingHalf,
) -> Vec<Point> {
    // Seen from the north the near half lies on the side away from the pole.
    let depth = match half {
        RingHalf::Far => sin(opening_deg.to_radians()),
        RingHalf::Near => -sin(opening_deg.to_radians()),
    };
    let place = |radius: f64, angle: f64| {
        let (along, across) = (radius * depth * sin(angle), radius * cos(angle));
        (
            along * pole.0 - across * pole.1,
            along * pole.1 + across * pole.0,
        )
    };
    let angle = |step: usize| PI * step as f64 / HALF_STEPS as f64;
    let outside = (0..=HALF_STEPS).map(|step| place(outer, angle(step)));
    let inside = (0..=HALF_STEPS).rev().map(|step| place(inner, angle(step)));
    outside.chain(inside).collect()
}

/// Presses points together along `axis` by `factor`, as a flattened globe asks for.
pub(super) fn flatten(points: &mut [Point], axis: Point, factor: f64) {
    for point in points {
        let along = point.0 * axis.0 + point.1 * axis.1;
        point.0 -= along * (1.0 - factor) * axis.0;
        point.1 -= along * (1.0 - factor) * axis.1;
    }
}

/// Points scaled and moved.
pub(super) fn placed(points: &[Point], centre: Point, scale: f64) -> Vec<Point> {
    points
        .iter()
        .map(|point| (centre.0 + scale * point.0, centre.1 + scale * point.1))
        .collect()
}

/// A handle: a rectangle with round ends.
pub(super) fn pill((x0, y0): Point, (x1, y1): Point) -> Vec<Point> {
    let radius = (y1 - y0) / 2.0;
    let middle = (y0 + y1) / 2.0;
    let steps = HALF_STEPS / 2;
    let angle = |step: usize| PI * step as f64 / steps as f64;
    let right = (0..=steps).map(|s| {
        (
            x1 - radius + radius * sin(angle(s)),
            middle - radius * cos(angle(s)),
        )
    });
    let left = (0..=steps).map(|s| {
        (
            x0 + radius - radius * sin(angle(s)),
            middle + radius * cos(angle(s)),
        )
    });
    right.chain(left).collect()
}

/// The part of a large circle's inside that lies within a rectangle, for a circle that rises from below: its highest
/// point is `apex`.
pub(super) fn rising_limb(
    apex: Point,
    radius: f64,
    (x0, x1): (f64, f64),
    bottom: f64,
) -> Vec<Point> {
    const STEPS: usize = 32;
    let top = (0..=STEPS).map(|step| {
        let x = x0 + (x1 - x0) * step as f64 / STEPS as f64;
        let across = (x - apex.0).abs().min(radius);
        // r - sqrt(r^2 - x^2), written so that a large radius loses no digits.
        let sink = across * across / (radius + (radius * radius - across * across).sqrt());
        (x, (apex.1 + sink).min(bottom))
    });
    top.chain([(x1, bottom), (x0, bottom)]).collect()
}
