//! The Earth, from which everything is seen.

use super::light::aberrated;
use crate::frames::mean_ecliptic_of_date;
use crate::quantity::{AU_KM, add_scaled, scaled, sin_cos, unit};
use crate::series::{SeriesBody, heliocentric, moon_of_date};
use crate::time::Tt;

/// Mass of the Earth over that of the Moon (JPL DE440; R. S. Park et al. 2021, AJ 161, 105).
const EARTH_OVER_MOON_MASS: f64 = 81.300_568_2;

/// The Earth's centre at one instant, and the Moon beside it. Heliocentric, ICRS axes.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Earth {
    pub(super) tt: Tt,
    pub(super) position_au: [f64; 3],
    pub(super) velocity_au_per_day: [f64; 3],
    /// Geometric geocentric position of the Moon.
    pub(super) moon_au: [f64; 3],
}

impl Earth {
    /// The Earth at an instant.
    ///
    /// The velocity is that of the Earth-Moon barycentre: it serves the aberration, which the Earth's own circle
    /// about the barycentre changes by 0.009 arcsec at most.
    pub fn at(tt: Tt) -> Self {
        let barycentre = heliocentric(SeriesBody::EarthMoonBarycentre, tt);
        let moon_au = moon_geocentric_au(tt);
        Self {
            tt,
            position_au: add_scaled(
                barycentre.position_au,
                -1.0 / (1.0 + EARTH_OVER_MOON_MASS),
                moon_au,
            ),
            velocity_au_per_day: barycentre.velocity_au_per_day,
            moon_au,
        }
    }

    /// Instant of this position.
    pub fn tt(&self) -> Tt {
        self.tt
    }

    /// Heliocentric position.
    pub fn position_au(&self) -> [f64; 3] {
        self.position_au
    }

    /// Heliocentric velocity of the Earth-Moon barycentre, which departs from the Earth's own by 0.012 km/s at most.
    pub fn velocity_au_per_day(&self) -> [f64; 3] {
        self.velocity_au_per_day
    }

    /// Apparent direction of the Sun's centre, a unit vector on ICRS axes.
    pub fn sun_direction(&self) -> [f64; 3] {
        aberrated(
            unit(scaled(-1.0, self.position_au)),
            self.velocity_au_per_day,
        )
    }
}

/// Geometric geocentric position of the Moon, ICRS axes.
pub(super) fn moon_geocentric_au(tt: Tt) -> [f64; 3] {
    let moon = moon_of_date(tt);
    let (sin_longitude, cos_longitude) = sin_cos(moon.longitude_rad);
    let (sin_latitude, cos_latitude) = sin_cos(moon.latitude_rad);
    let direction = [
        cos_latitude * cos_longitude,
        cos_latitude * sin_longitude,
        sin_latitude,
    ];
    mean_ecliptic_of_date(tt).apply_back(scaled(moon.distance_km / AU_KM, direction))
}
