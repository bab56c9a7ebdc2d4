//! Names beside things: the first place around them that is free.

use super::super::ink::Failed;
use super::super::pen::{Align, Face, Pen, Point};
use super::super::theme::{Colour, Theme};
use super::layout::Bounds;
use crate::quantity::{hypotenuse, sin_cos};
use std::f64::consts::TAU;

/// Directions that are tried, alternating to both sides of the wanted one.
const DIRECTIONS: usize = 16;

/// Where a name that must be there is tried, in this order: how much farther away, and whether orbits are kept free.
pub(super) const ANYWHERE: [(f64, bool); 8] = [
    (0.0, true),
    (10.0, true),
    (22.0, true),
    (0.0, false),
    (12.0, false),
    (26.0, false),
    (44.0, false),
    (70.0, false),
];

/// Where a name that would mislead farther away is tried.
pub(super) const CLOSE: [(f64, bool); 2] = [(0.0, true), (0.0, false)];

/// The sign of a turning point.
pub(super) fn sign(
    pen: &mut Pen<'_>,
    (x, y): Point,
    ground: Colour,
    theme: &Theme,
) -> Result<(), Failed> {
    let outline = |r: f64| [(x, y - r), (x + r, y), (x, y + r), (x - r, y)];
    pen.area(&outline(6.0), ground)?;
    pen.area(&outline(4.5), theme.ink)
}

/// Room in which names are set: its edges, and points of thin lines that a name had better not cross.
pub(super) struct Room<'a> {
    pub(super) bounds: Bounds,
    pub(super) orbits: [&'a [Point]; 2],
}

impl Room<'_> {
    fn holds(&self, [left, top, right, bottom]: Bounds) -> bool {
        left >= self.bounds[0] + 2.0
            && right <= self.bounds[2] - 2.0
            && top >= self.bounds[1] + 1.0
            && bottom <= self.bounds[3] - 1.0
    }

    fn is_off_orbits(&self, [left, top, right, bottom]: Bounds) -> bool {
        // Half the distance between two points of the largest path.
        const AIR: f64 = 5.0;
        !self
            .orbits
            .iter()
            .flat_map(|path| path.iter())
            .any(|&(x, y)| {
                (left - AIR..right + AIR).contains(&x) && (top - AIR..bottom + AIR).contains(&y)
            })
    }
}

/// Writes a text beside `at`, at least `clear` away from it, as near to the direction `towards` as is free: off the
/// orbits where it can be, else across them. Where no place is free nothing is
/// written.
pub(super) fn beside(
    pen: &mut Pen<'_>,
    text: &str,
    face: Face,
    (at, clear): (Point, f64),
    towards: Point,
    room: &Room<'_>,
    places: &[(f64, bool)],
) -> Result<(), Failed> {
    let (half_width, half_height) = (
        pen.text_width(text, face)? / 2.0,
        Pen::text_height(face) / 2.0,
    );
    let start = towards.1.atan2(towards.0);
    for &(farther, off_orbits) in places {
        for index in 0..DIRECTIONS {
            let turn = index.div_ceil(2) as f64 * TAU / DIRECTIONS as f64;
            let (sin, cos) = sin_cos(start + if index % 2 == 0 { turn } else { -turn });
            let away = clear + farther + half_width * cos.abs() + half_height * sin.abs();
            let (x, y) = (at.0 + away * cos, at.1 + away * sin);
            let bounds = [
                x - half_width,
                y - half_height,
                x + half_width,
                y + half_height,
            ];
            let suits = room.holds(bounds) && (!off_orbits || room.is_off_orbits(bounds));
            if suits && pen.text(text, (x, y), Align::Middle, face)? {
                // Rounding to whole units may bring two texts a little nearer than they were measured.
                pen.keep_clear([
                    bounds[0] - 1.5,
                    bounds[1] - 1.0,
                    bounds[2] + 1.5,
                    bounds[3] + 1.0,
                ]);
                return Ok(());
            }
        }
    }
    Ok(())
}

/// Keeps texts off a straight line.
pub(super) fn keep_off_line(pen: &mut Pen<'_>, from: Point, to: Point) {
    const HALF: f64 = 3.0;
    let length = hypotenuse(to.0 - from.0, to.1 - from.1);
    let pieces = (length / (2.0 * HALF)).ceil().max(1.0) as usize;
    for index in 0..=pieces {
        let share = index as f64 / pieces as f64;
        keep_off_disc(
            pen,
            (
                from.0 + share * (to.0 - from.0),
                from.1 + share * (to.1 - from.1),
            ),
            HALF,
        );
    }
}

/// Keeps texts off a round thing.
pub(super) fn keep_off_disc(pen: &mut Pen<'_>, (x, y): Point, radius: f64) {
    pen.keep_clear([x - radius, y - radius, x + radius, y + radius]);
}
