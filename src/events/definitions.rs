//! Names and definitions of the kinds of events, and the bodies that each can happen to.

use super::kind::Kind::{self, *};
use Who::{InnerPlanets, MoonWithPlanets, OuterPlanets, Planets};

/// Bodies that a kind can happen to.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Who {
    InnerPlanets,
    OuterPlanets,
    Planets,
    Moon,
    /// Planets with the Moon, and the Moon with planets.
    MoonWithPlanets,
}

/// Name, bodies and definition of every kind, in the order of [`Kind`].
pub(super) const KINDS: [(Kind, &str, Who, &str); 30] = [
    (
        InferiorConjunction,
        "inferior-conjunction",
        InnerPlanets,
        "The planet has the Sun's apparent ecliptic longitude and stands between Earth and Sun.",
    ),
    (
        SuperiorConjunction,
        "superior-conjunction",
        InnerPlanets,
        "The planet has the Sun's apparent ecliptic longitude and stands beyond the Sun.",
    ),
    (
        Conjunction,
        "conjunction",
        OuterPlanets,
        "The planet has the Sun's apparent ecliptic longitude, beyond the Sun.",
    ),
    (
        Opposition,
        "opposition",
        OuterPlanets,
        "The planet's apparent ecliptic longitude differs from the Sun's by 180 degrees.",
    ),
    (
        QuadratureEast,
        "quadrature-east",
        OuterPlanets,
        "The planet's apparent ecliptic longitude exceeds the Sun's by 90 degrees: an evening body.",
    ),
    (
        QuadratureWest,
        "quadrature-west",
        OuterPlanets,
        "The planet's apparent ecliptic longitude is 90 degrees behind the Sun's: a morning body.",
    ),
    (
        GreatestElongationEast,
        "greatest-elongation-east",
        InnerPlanets,
        "The apparent angle between planet and Sun is largest while the planet follows the Sun: evening.",
    ),
    (
        GreatestElongationWest,
        "greatest-elongation-west",
        InnerPlanets,
        "The apparent angle between planet and Sun is largest while the planet precedes the Sun: morning.",
    ),
    (
        GreatestIlluminatedExtent,
        "greatest-illuminated-extent",
        InnerPlanets,
        "The lit area of the disc, in square arcseconds, is largest between two conjunctions with the Sun: one instant in the evening and one in the morning around each inferior conjunction. Lesser peaks are marked secondary.",
    ),
    (
        GreatestBrightness,
        "greatest-brightness",
        Planets,
        "The visual magnitude is smallest. Venus: between two conjunctions, one instant in the evening and one in the morning around each inferior conjunction. Mercury: between two inferior conjunctions, mostly near the superior one and lost in the Sun's light. Outer planets: near opposition, Mars averaged over its rotation. Phase angles of 160 degrees and more are left out; lesser peaks are marked secondary.",
    ),
    (
        HalfPhase,
        "half-phase",
        InnerPlanets,
        "Half of the disc is lit: the angle Sun-planet-Earth is 90 degrees.",
    ),
    (
        StationRetrograde,
        "station-retrograde",
        Planets,
        "Apparent right ascension, true equator of date, is at a maximum: the planet turns westward.",
    ),
    (
        StationDirect,
        "station-direct",
        Planets,
        "Apparent right ascension, true equator of date, is at a minimum: the planet turns eastward.",
    ),
    (
        ClosestApproach,
        "closest-approach",
        Planets,
        "The distance from the Earth's centre that the light has travelled is least.",
    ),
    (
        Perihelion,
        "perihelion",
        Planets,
        "The distance from the Sun's centre is at a minimum. The pull of the other planets gives the outermost several minima an orbit: those that another within a quarter of an orbit undercuts are marked secondary.",
    ),
    (
        Aphelion,
        "aphelion",
        Planets,
        "The distance from the Sun's centre is at a maximum. Those that another within a quarter of an orbit exceeds are marked secondary.",
    ),
    (
        NewMoon,
        "new-moon",
        Who::Moon,
        "The Moon has the Sun's apparent ecliptic longitude.",
    ),
    (
        FirstQuarter,
        "first-quarter",
        Who::Moon,
        "The Moon's apparent ecliptic longitude exceeds the Sun's by 90 degrees.",
    ),
    (
        FullMoon,
        "full-moon",
        Who::Moon,
        "The Moon's apparent ecliptic longitude differs from the Sun's by 180 degrees.",
    ),
    (
        LastQuarter,
        "last-quarter",
        Who::Moon,
        "The Moon's apparent ecliptic longitude exceeds the Sun's by 270 degrees.",
    ),
    (
        MoonPerigee,
        "moon-perigee",
        Who::Moon,
        "The distance between the centres of Moon and Earth is at a minimum.",
    ),
    (
        MoonApogee,
        "moon-apogee",
        Who::Moon,
        "The distance between the centres of Moon and Earth is at a maximum.",
    ),
    (
        MoonConjunction,
        "moon-conjunction",
        MoonWithPlanets,
        "Moon and planet have the same geocentric apparent right ascension, true equator of date.",
    ),
    (
        MoonClosest,
        "moon-closest",
        MoonWithPlanets,
        "The geocentric apparent angle between the centres of Moon and planet is at a minimum.",
    ),
    (
        Occultation,
        "occultation",
        MoonWithPlanets,
        "Somewhere on Earth the Moon covers the planet: at the least geocentric angle the planet lies within the Moon's semidiameter, its parallax and the planet's semidiameter. With a place: whether it is seen there.",
    ),
    (
        SamePhase,
        "same-phase",
        MoonWithPlanets,
        "The lit fractions of Moon and planet, seen from the Earth's centre, are equal.",
    ),
    (
        PlanetConjunction,
        "planet-conjunction",
        Planets,
        "Two planets have the same geocentric apparent right ascension, true equator of date.",
    ),
    (
        PlanetClosest,
        "planet-closest",
        Planets,
        "The geocentric apparent angle between the centres of two planets is at a minimum below 5 degrees.",
    ),
    (
        Transit,
        "transit",
        InnerPlanets,
        "Seen from the Earth's centre the planet's disc touches the Sun's at inferior conjunction; the instant is that of the least angle between the centres. Grazing: the whole planet is never inside the Sun's disc.",
    ),
    (
        TransitNearMiss,
        "transit-near-miss",
        InnerPlanets,
        "Seen from the Earth's centre the planet passes the Sun without touching its disc, less than 1.25 semidiameters of the Sun from its centre.",
    ),
];
