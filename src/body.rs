//! The bodies that the ephemeris knows.

use crate::error::{Code, Error, listed, quoted};
use std::{fmt, str::FromStr};

/// Sun, Moon and the planets except the Earth, by the names the module uses.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash, PartialOrd, Ord)]
pub enum Body {
    /// The Sun.
    Sun,
    /// The Moon.
    Moon,
    /// Mercury.
    Mercury,
    /// Venus.
    Venus,
    /// Mars.
    Mars,
    /// Jupiter.
    Jupiter,
    /// Saturn.
    Saturn,
    /// Uranus.
    Uranus,
    /// Neptune.
    Neptune,
}

impl Body {
    /// Every body, Sun and Moon first.
    pub const ALL: [Body; 9] = [
        Body::Sun,
        Body::Moon,
        Body::Mercury,
        Body::Venus,
        Body::Mars,
        Body::Jupiter,
        Body::Saturn,
        Body::Uranus,
        Body::Neptune,
    ];

    /// The planets, outwards from the Sun.
    pub const PLANETS: [Body; 7] = [
        Body::Mercury,
        Body::Venus,
        Body::Mars,
        Body::Jupiter,
        Body::Saturn,
        Body::Uranus,
        Body::Neptune,
    ];

    /// The name in the module's contract: lower case, English.
    pub const fn name(self) -> &'static str {
        match self {
            Body::Sun => "sun",
            Body::Moon => "moon",
            Body::Mercury => "mercury",
            Body::Venus => "venus",
            Body::Mars => "mars",
            Body::Jupiter => "jupiter",
            Body::Saturn => "saturn",
            Body::Uranus => "uranus",
            Body::Neptune => "neptune",
        }
    }

    /// True for Mercury and Venus, whose orbits lie inside the Earth's.
    pub const fn is_inner_planet(self) -> bool {
        matches!(self, Body::Mercury | Body::Venus)
    }
}

impl fmt::Display for Body {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(self.name())
    }
}

impl FromStr for Body {
    type Err = Error;

    fn from_str(text: &str) -> Result<Self, Error> {
        let wanted = text.trim();
        Body::ALL
            .into_iter()
            .find(|body| body.name().eq_ignore_ascii_case(wanted))
            .ok_or_else(|| {
                Error::new(
                    Code::UnknownBody,
                    format!(
                        "There is no body {} here; choose one of {}.",
                        quoted(wanted),
                        listed(Body::ALL.iter().map(|body| body.name()))
                    ),
                )
            })
    }
}
