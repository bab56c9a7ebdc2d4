//! The kinds of events: names, definitions, and which body can have them.

use std::str::FromStr;

use super::definitions::KINDS;
use super::definitions::Who::{self, InnerPlanets, MoonWithPlanets, OuterPlanets, Planets};
use crate::body::Body;
use crate::error::{Code, Error, listed, quoted};

/// What happens. [`Kind::definition`] says when exactly.
#[derive(Debug, Clone, Copy, PartialEq, Eq, PartialOrd, Ord)]
pub enum Kind {
    /// Mercury or Venus passes between Earth and Sun.
    InferiorConjunction,
    /// Mercury or Venus passes beyond the Sun.
    SuperiorConjunction,
    /// An outer planet passes beyond the Sun.
    Conjunction,
    /// An outer planet stands opposite the Sun.
    Opposition,
    /// An outer planet stands 90 degrees east of the Sun.
    QuadratureEast,
    /// An outer planet stands 90 degrees west of the Sun.
    QuadratureWest,
    /// Largest angle from the Sun in the evening sky.
    GreatestElongationEast,
    /// Largest angle from the Sun in the morning sky.
    GreatestElongationWest,
    /// Largest lit area in the sky.
    GreatestIlluminatedExtent,
    /// Smallest magnitude.
    GreatestBrightness,
    /// Half of the disc is lit.
    HalfPhase,
    /// The planet stops and turns westward among the stars.
    StationRetrograde,
    /// The planet stops and turns eastward among the stars.
    StationDirect,
    /// Least distance from the Earth.
    ClosestApproach,
    /// Least distance from the Sun.
    Perihelion,
    /// Largest distance from the Sun.
    Aphelion,
    /// New Moon.
    NewMoon,
    /// First quarter of the Moon.
    FirstQuarter,
    /// Full Moon.
    FullMoon,
    /// Last quarter of the Moon.
    LastQuarter,
    /// The Moon is nearest to the Earth.
    MoonPerigee,
    /// The Moon is farthest from the Earth.
    MoonApogee,
    /// The Moon passes a planet in right ascension.
    MoonConjunction,
    /// The Moon stands closest to a planet in the sky.
    MoonClosest,
    /// The Moon covers a planet, seen from somewhere.
    Occultation,
    /// The Moon shows the same lit share as a planet.
    SamePhase,
    /// One planet passes another in right ascension.
    PlanetConjunction,
    /// Two planets stand closest in the sky.
    PlanetClosest,
    /// Mercury or Venus crosses the Sun's disc.
    Transit,
    /// Mercury or Venus narrowly misses the Sun's disc.
    TransitNearMiss,
}

impl Kind {
    /// Every kind.
    pub fn all() -> impl Iterator<Item = Kind> {
        KINDS.iter().map(|row| row.0)
    }

    fn row(self) -> &'static (Kind, &'static str, Who, &'static str) {
        &KINDS[self as usize]
    }

    /// The name in the module's contract: lower case, English, with hyphens.
    pub fn name(self) -> &'static str {
        self.row().1
    }

    /// When it happens, for people.
    pub fn definition(self) -> &'static str {
        self.row().3
    }

    /// Whether the kind can happen to a body.
    pub fn is_possible_for(self, body: Body) -> bool {
        let is_planet = Body::PLANETS.contains(&body);
        match self.row().2 {
            InnerPlanets => body.is_inner_planet(),
            OuterPlanets => is_planet && !body.is_inner_planet(),
            Planets => is_planet,
            Who::Moon => body == Body::Moon,
            MoonWithPlanets => is_planet || body == Body::Moon,
        }
    }

    /// Why the kind cannot happen to a body for which it is not possible.
    pub(super) fn why_not(self, body: Body) -> &'static str {
        match self.row().2 {
            _ if body == Body::Sun => {
                "The Sun has no events of its own; what happens to a planet or the Moon at the Sun is listed with that body."
            }
            InnerPlanets if body == Body::Moon => "It belongs to Mercury and Venus.",
            InnerPlanets => {
                "Only Mercury and Venus, whose orbits lie inside the Earth's, come between Earth and Sun and show all phases."
            }
            OuterPlanets if body == Body::Moon => {
                "It belongs to the outer planets; the Moon has its phases instead."
            }
            OuterPlanets => {
                "Mercury and Venus never leave the Sun's side of the sky; they have inferior and superior conjunctions."
            }
            Planets => "It belongs to the planets.",
            Who::Moon => "It belongs to the Moon.",
            MoonWithPlanets => "It belongs to a planet and the Moon.",
        }
    }
}

impl FromStr for Kind {
    type Err = Error;

    fn from_str(text: &str) -> Result<Self, Error> {
        let wanted = text.trim();
        if let Some(row) = KINDS.iter().find(|row| row.1.eq_ignore_ascii_case(wanted)) {
            return Ok(row.0);
        }
        let message = format!(
            "There is no kind of event {} here; choose among {}.",
            quoted(wanted),
            listed(KINDS.iter().map(|row| row.1))
        );
        Err(Error::new(Code::BadOption, message))
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_table_follows_the_order_of_the_kinds() {
        for (index, row) in KINDS.iter().enumerate() {
            assert_eq!(row.0 as usize, index, "{}", row.1);
            assert_eq!(row.1.parse(), Ok(row.0));
        }
    }
}
