//! The Earth, from which everything is seen.

use super::light::aberrated;
use crate::frames::mean_ecliptic_of_date;
use crate::quantity::{AU_KM, add_scaled, scaled, sin_cos, unit};
use crate::series::{MoonOfDate, SeriesBody, heliocentric, moon_of_date, moon_of_date_roughly};
use crate::time::Tt;

/// Mass of the Earth over that of the Moon (JPL DE440; R. S. Park et al. 2021, AJ 161, 105).
const EARTH_OVER_MOON_MASS: f64 = 81.300_568_2;

/// The Earth's centre at one instant. Heliocentric, ICRS axes.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Earth {
    pub(super) tt: Tt,
    pub(super) position_au: [f64; 3],
    pub(super) velocity_au_per_day: [f64; 3],
}

impl Earth {
    /// The Earth at an instant.
    ///
    /// The velocity is that of the Earth-Moon barycentre: it serves the aberration, which the Earth's own circle
    /// about the barycentre changes by 0.009 arcsec at most.
    pub fn at(tt: Tt) -> Self {
        let barycentre = heliocentric(SeriesBody::EarthMoonBarycentre, tt);
        let (moon_au, _) = geocentric(moon_of_date_roughly(tt), tt);
        Self {
            tt,
            position_au: add_scaled(
                barycentre.position_au,
                -1.0 / (1.0 + EARTH_OVER_MOON_MASS),
                moon_au,
            ),
            velocity_au_per_day: barycentre.velocity_au_per_day,
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

/// Geometric geocentric position of the Moon in au and its rate in au per day, ICRS axes.
pub(super) fn moon_geocentric(tt: Tt) -> ([f64; 3], [f64; 3]) {
    geocentric(moon_of_date(tt), tt)
}

/// The axes of date turn by 50 arcsec a year, which the rate leaves out.
fn geocentric(moon: MoonOfDate, tt: Tt) -> ([f64; 3], [f64; 3]) {
    let (sin_longitude, cos_longitude) = sin_cos(moon.longitude_rad);
    let (sin_latitude, cos_latitude) = sin_cos(moon.latitude_rad);
    let distance_au = moon.distance_km / AU_KM;
    let along = distance_au * cos_latitude * moon.longitude_rad_per_day;
    let up = distance_au * moon.latitude_rad_per_day;
    let away = moon.distance_km_per_day / AU_KM;
    let outward = away * cos_latitude - up * sin_latitude;
    let axes = mean_ecliptic_of_date(tt);
    (
        axes.apply_back(scaled(
            distance_au,
            [
                cos_latitude * cos_longitude,
                cos_latitude * sin_longitude,
                sin_latitude,
            ],
        )),
        axes.apply_back([
            outward * cos_longitude - along * sin_longitude,
            outward * sin_longitude + along * cos_longitude,
            away * sin_latitude + up * cos_latitude,
        ]),
    )
}
