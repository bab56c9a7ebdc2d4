//! What is told about an event.

use super::kind::Kind;
use crate::body::Body;
use crate::time::Utc;

/// Something that happens at one instant.
#[derive(Debug, Clone, PartialEq)]
pub struct Event {
    /// What happens.
    pub kind: Kind,
    /// To which body; of a pair of planets the one nearer to the Sun, of Moon and planet the planet.
    pub body: Body,
    /// The other body of a pair.
    pub other: Option<Body>,
    /// When, civil time.
    pub utc: Utc,
    /// How far the instant may be off: the ephemeris error over the rate at which the quantity searched for changes,
    /// with the uncertainty of the civil clock. Of a hundred events about one is farther off.
    pub time_uncertainty_seconds: f64,
    /// What belongs to it.
    pub values: Values,
    /// Instants within the event, such as the contacts of a transit, seen from the Earth's centre.
    pub contacts: Vec<Contact>,
    /// How it is seen from the place asked for; transits and occultations only.
    pub local: Option<Local>,
}

/// Figures of an event, geocentric and of `body` unless the name says otherwise; absent where they have no meaning.
#[derive(Debug, Clone, Default, PartialEq)]
pub struct Values {
    /// Distance from the Earth's centre that the light has travelled.
    pub distance_au: Option<f64>,
    /// Geometric distance from the Sun; of perihelion and aphelion.
    pub sun_distance_au: Option<f64>,
    /// Apparent angle from the Sun's centre.
    pub elongation_deg: Option<f64>,
    /// Apparent angle between the two bodies; of a transit between the planet and the Sun's centre.
    pub separation_deg: Option<f64>,
    /// Visual magnitude; of Mars averaged over its rotation.
    pub magnitude: Option<f64>,
    /// Lit share of the disc, 0 to 1.
    pub illuminated_fraction: Option<f64>,
    /// Lit area in the sky.
    pub lit_area_arcsec2: Option<f64>,
    /// Equatorial diameter.
    pub angular_diameter_arcsec: Option<f64>,
    /// Lit share of the other body's disc.
    pub other_illuminated_fraction: Option<f64>,
    /// Transits: least angle between the centres in semidiameters of the Sun, of 959.63 arcsec at 1 au.
    pub separation_sun_radii: Option<f64>,
    /// Transits: semidiameter of the Sun that was used.
    pub sun_semidiameter_arcsec: Option<f64>,
    /// Transits: position angle of the planet at the Sun's centre, from celestial north through east.
    pub position_angle_deg: Option<f64>,
    /// Transits: from the first to the last contact.
    pub duration_minutes: Option<f64>,
    /// A lesser peak of its kind beside a greater one.
    pub is_secondary: bool,
    /// Transits: the whole planet is never inside the Sun's disc.
    pub is_grazing: bool,
    /// Whether the lit share of the body grows.
    pub is_waxing: Option<bool>,
    /// Whether the lit share of the other body grows.
    pub is_other_waxing: Option<bool>,
}

impl Values {
    /// The numbers that are there, by their names in the module's contract.
    pub fn numbers(&self) -> impl Iterator<Item = (&'static str, f64)> {
        [
            ("distanceAu", self.distance_au),
            ("sunDistanceAu", self.sun_distance_au),
            ("elongationDeg", self.elongation_deg),
            ("separationDeg", self.separation_deg),
            ("magnitude", self.magnitude),
            ("illuminatedFraction", self.illuminated_fraction),
            ("litAreaArcsec2", self.lit_area_arcsec2),
            ("angularDiameterArcsec", self.angular_diameter_arcsec),
            ("otherIlluminatedFraction", self.other_illuminated_fraction),
            ("separationSunRadii", self.separation_sun_radii),
            ("sunSemidiameterArcsec", self.sun_semidiameter_arcsec),
            ("positionAngleDeg", self.position_angle_deg),
            ("durationMinutes", self.duration_minutes),
        ]
        .into_iter()
        .filter_map(|(name, value)| value.map(|value| (name, value)))
    }

    /// The yes-or-no facts that are there, by their names in the module's contract.
    pub fn facts(&self) -> impl Iterator<Item = (&'static str, bool)> {
        [
            ("secondary", self.is_secondary.then_some(true)),
            ("grazing", self.is_grazing.then_some(true)),
            ("waxing", self.is_waxing),
            ("otherWaxing", self.is_other_waxing),
        ]
        .into_iter()
        .filter_map(|(name, value)| value.map(|value| (name, value)))
    }
}

/// An instant within an event.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Contact {
    /// `first-contact` to `fourth-contact` of a transit: the discs touch from outside, from inside, from inside, from
    /// outside; `disappearance` and `reappearance` of the planet's centre at the Moon's limb.
    pub name: &'static str,
    /// When, civil time.
    pub utc: Utc,
    /// Direction of the planet at the Sun's centre, or the Moon's, from celestial north through east.
    pub position_angle_deg: f64,
    /// Seen from a place: altitude of the planet without refraction.
    pub altitude_deg: Option<f64>,
    /// Seen from a place: altitude of the Sun's centre without refraction.
    pub sun_altitude_deg: Option<f64>,
}

/// An event seen from a place.
#[derive(Debug, Clone, PartialEq)]
pub struct Local {
    /// Whether any part of it happens above the horizon there.
    pub is_above_horizon: bool,
    /// Its instants there; empty when it does not happen there.
    pub contacts: Vec<Contact>,
}
