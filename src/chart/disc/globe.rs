//! One globe: its lit part, its limb, Saturn's flattening and rings.

use super::super::ink::Failed;
use super::super::pen::{Pen, Point};
use super::super::shapes::{RingHalf, circle, flatten, half_ring, lit_part, placed};
use super::super::theme::Colour;
use super::model::{Disc, RING_EDGE};
use crate::quantity::{hypotenuse, sin_cos};

/// Colours and line of a globe.
pub(in crate::chart) struct Look {
    pub(in crate::chart) lit: Colour,
    pub(in crate::chart) night: Colour,
    pub(in crate::chart) limb: Colour,
    pub(in crate::chart) ring: Colour,
    pub(in crate::chart) line: f64,
}

/// Saturn's rings in equatorial radii (60,268 km): C and B from 74,500 to 117,580 km, A from 122,170 to 136,780 km.
const RINGS: [(f64, f64); 2] = [
    (74_500.0 / 60_268.0, 117_580.0 / 60_268.0),
    (122_170.0 / 60_268.0, RING_EDGE),
];

/// Polar over equatorial radius of Saturn: 54,364 km over 60,268 km.
const SATURN_POLAR: f64 = 54_364.0 / 60_268.0;

/// A globe in its phase, with Saturn's rings.
pub(in crate::chart) fn globe(
    disc: &Disc,
    pen: &mut Pen<'_>,
    at: Point,
    scale: f64,
    look: &Look,
) -> Result<(), Failed> {
    let radius = disc.radius_arcsec * scale;
    let mut lit = lit_part(disc.lit_fraction, disc.towards_sun);
    let Some(ring) = disc.ring else {
        pen.disc(at, radius, look.night)?;
        pen.area(&placed(&lit, at, radius), look.lit)?;
        return pen.ring(at, radius, look.line, look.limb);
    };
    let rings = |pen: &mut Pen<'_>, half: RingHalf| {
        RINGS.iter().try_for_each(|&(inner, outer)| {
            pen.area(
                &placed(
                    &half_ring(inner, outer, ring.opening_deg, ring.pole, half),
                    at,
                    radius,
                ),
                look.ring,
            )
        })
    };
    rings(pen, RingHalf::Far)?;
    let (sin, cos) = sin_cos(ring.opening_deg.to_radians());
    let apparent_polar = hypotenuse(sin, SATURN_POLAR * cos);
    let mut outline = circle();
    flatten(&mut outline, ring.pole, apparent_polar);
    flatten(&mut lit, ring.pole, apparent_polar);
    let mut outline = placed(&outline, at, radius);
    pen.area(&outline, look.night)?;
    pen.area(&placed(&lit, at, radius), look.lit)?;
    outline.extend_from_within(..1);
    pen.line(&outline, look.line, look.limb)?;
    rings(pen, RingHalf::Near)
}
