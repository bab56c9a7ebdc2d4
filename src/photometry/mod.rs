//! How bright a body is, how large its disc, how much of it is lit, and what the air takes away.

mod disc;
mod extinction;
mod mars;
mod moon;
mod of_observation;
mod planets;
mod saturn;

pub use disc::{Disc, equatorial_radius_km, illuminated_fraction, surface_brightness_mag_arcsec2};
pub use extinction::{DEFAULT_EXTINCTION_MAG_PER_AIRMASS, airmass, dimmed_magnitude};
pub use mars::{MarsAspect, MarsRotation, mars, mars_aspect};
pub use moon::{moon, sun};
pub use of_observation::{Seen, magnitude, surface_magnitude};
pub use planets::{jupiter, mercury, neptune, uranus, venus};
pub use saturn::{SATURN_NORTH_POLE, SaturnLatitudes, saturn, saturn_globe};

/// What the laws of planetary brightness depend on in the first place.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Illumination {
    /// Sun to body.
    pub sun_distance_au: f64,
    /// Observer to body.
    pub distance_au: f64,
    /// Angle Sun-body-observer, 0 to 180.
    pub phase_angle_deg: f64,
}

impl Illumination {
    /// Magnitudes by which distance dims: 5 log10(r * delta).
    fn distance_magnitudes(&self) -> f64 {
        5.0 * (self.sun_distance_au * self.distance_au).log10()
    }
}

/// A visual magnitude (V, outside the air) and how far its law was observed.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Magnitude {
    /// Within the range in which the body was observed.
    Observed(f64),
    /// The law's value outside that range.
    Extrapolated(f64),
    /// The published law has no value here.
    Undefined,
}

impl Magnitude {
    /// Observed when `within` holds, else extrapolated.
    fn observed_if(within: bool, value: f64) -> Self {
        if within {
            Magnitude::Observed(value)
        } else {
            Magnitude::Extrapolated(value)
        }
    }

    /// The value, if there is one.
    pub fn value(self) -> Option<f64> {
        match self {
            Magnitude::Observed(value) | Magnitude::Extrapolated(value) => Some(value),
            Magnitude::Undefined => None,
        }
    }

    /// The value, or NaN: for columns of numbers.
    pub fn value_or_nan(self) -> f64 {
        self.value().unwrap_or(f64::NAN)
    }
}

/// Value of a polynomial, coefficients by rising power.
fn polynomial(coefficients: &[f64], x: f64) -> f64 {
    coefficients
        .iter()
        .rev()
        .fold(0.0, |sum, coefficient| sum * x + coefficient)
}
