//! The laws applied to what was observed.

use super::mars::{MarsRotation, mars, mars_aspect};
use super::moon::{moon, sun};
use super::planets::{URANUS_NORTH_POLE, jupiter, mercury, neptune, uranus, venus};
use super::saturn::{SaturnLatitudes, saturn, saturn_globe};
use super::{Illumination, Magnitude};
use crate::body::Body;
use crate::ephemeris::{Earth, Observation};
use crate::time::{Tt, Utc};

/// A body observed at an instant: what the laws need.
#[derive(Debug, Clone, Copy)]
pub struct Seen<'a> {
    /// The body as its light shows it.
    pub observation: &'a Observation,
    /// Instant of observation.
    pub tt: Tt,
    /// The same in civil time: Neptune's law asks for the year.
    pub utc: Utc,
}

impl<'a> Seen<'a> {
    /// An observation made from the Earth at a civil instant.
    pub fn new(observation: &'a Observation, earth: &Earth, utc: Utc) -> Self {
        Self {
            observation,
            tt: earth.tt(),
            utc,
        }
    }

    fn illumination(&self) -> Illumination {
        Illumination {
            sun_distance_au: self.observation.sun_distance_au(),
            distance_au: self.observation.distance_au(),
            phase_angle_deg: self.observation.phase_angle_deg(),
        }
    }
}

/// Visual magnitude outside the air, geocentric; Saturn with its rings.
pub fn magnitude(seen: &Seen<'_>, rotation: MarsRotation) -> Magnitude {
    let light = seen.illumination();
    match seen.observation.body {
        Body::Sun => sun(light.distance_au),
        Body::Moon => moon(&light),
        Body::Mercury => mercury(&light),
        Body::Venus => venus(&light),
        Body::Mars => mars(&light, &mars_aspect(seen.observation, seen.tt), rotation),
        Body::Jupiter => jupiter(&light),
        Body::Saturn => saturn(&light, &SaturnLatitudes::of(seen.observation)),
        Body::Uranus => {
            let (earth_deg, sun_deg) = seen
                .observation
                .earth_and_sun_latitude_deg(URANUS_NORTH_POLE);
            uranus(&light, sun_deg, earth_deg)
        }
        Body::Neptune => neptune(&light, seen.utc.julian_year()),
    }
}

/// Magnitude of what the lit area of the disc sends: for Saturn its globe alone, else the whole body's `magnitude`.
pub fn surface_magnitude(seen: &Seen<'_>, magnitude: Magnitude) -> Magnitude {
    match seen.observation.body {
        Body::Saturn => saturn_globe(&seen.illumination()),
        _ => magnitude,
    }
}
