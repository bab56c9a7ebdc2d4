//! What the element around the pictures has to say: labels, where to look, how far, and the caution.

use crate::body::Body;

/// System of units for distances.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub enum Units {
    /// Kilometres.
    #[default]
    Metric,
    /// Statute miles.
    Imperial,
}

/// Kilometres in a statute mile; exact by definition.
const KM_PER_MILE: f64 = 1.609_344;

impl Units {
    /// A distance in this system's unit.
    pub fn from_km(self, distance_km: f64) -> f64 {
        match self {
            Units::Metric => distance_km,
            Units::Imperial => distance_km / KM_PER_MILE,
        }
    }
}

/// Which end of the night is told of.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum NightEdge {
    /// After sunset.
    Evening,
    /// Before sunrise.
    Morning,
}

/// Where the body stands from a place when the Sun is six degrees below the horizon.
#[derive(Debug, Clone, PartialEq)]
pub enum Outlook {
    /// Above the horizon: whole degrees as written, and one of sixteen compass points, clockwise from north.
    Up {
        /// Altitude in degrees, as written.
        altitude: String,
        /// 0 is north, 4 is east.
        compass_point: usize,
    },
    /// Below the horizon.
    Down,
    /// The Sun does not pass that depression on this date.
    NoTwilight,
}

/// Labels of the element's parts, by the id of the part.
pub type Label = (&'static str, String);

/// The element's phrases, in one language.
pub trait PageWords {
    /// Labels that do not depend on the date, as pairs of part and text.
    fn labels(&self) -> Vec<Label>;
    /// Heading of the place's disclosure, with the city of a rough place, or the coordinates, or nothing known.
    fn place_heading(&self, spot: &SpotName) -> String;
    /// Where to look.
    fn outlook(&self, body: Body, spot: &SpotName, edge: NightEdge, outlook: &Outlook) -> String;
    /// Distance and light time: millions of the unit or thousands for the Moon, minutes or seconds, as written.
    fn distance(&self, body: Body, distance: &DistanceTold, units: Units) -> String;
    /// How the disc leans: at which altitude and on which side.
    fn lean(&self, body: Body, edge: NightEdge) -> String;
    /// The caution for a body close to the Sun; the angle as written.
    fn caution(&self, body: Body, elongation: &str) -> String;
    /// The device gave no position.
    fn locate_refused(&self) -> &'static str;
}

/// How a place is called.
#[derive(Debug, Clone, PartialEq, Eq)]
pub enum SpotName {
    /// No place is known.
    Unknown,
    /// Principal city of the time zone.
    Rough(String),
    /// Latitude and longitude as written, with their letters.
    Exact(String),
}

/// A distance and its light time as written.
#[derive(Debug, Clone, PartialEq, Eq)]
pub enum DistanceTold {
    /// Millions of kilometres or miles, and minutes.
    Millions {
        /// Millions of the unit.
        distance: String,
        /// Minutes of light.
        minutes: String,
    },
    /// Kilometres or miles, and seconds.
    Whole {
        /// The unit itself.
        distance: String,
        /// Seconds of light.
        seconds: String,
    },
}
