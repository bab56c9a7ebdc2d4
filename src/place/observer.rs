//! A validated place and what the body looks like from there.

use crate::ephemeris::{Earth, Observation};
use crate::error::{Code, Error};
use crate::frames::{Horizontal, OfDate, greenwich_apparent_sidereal_time_rad, horizontal};
use crate::quantity::{
    AU_KM, LIGHT_DAYS_PER_AU, add_scaled, scaled, sin_cos, unit, wrap_half_turn_degrees,
};
use crate::time::Utc;

/// A point on or near the Earth's surface: geodetic coordinates on the WGS84 ellipsoid.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Place {
    latitude_deg: f64,
    longitude_deg: f64,
    height_m: f64,
}

impl Place {
    /// A place from geodetic latitude (north positive), longitude (east positive) and height above the ellipsoid.
    ///
    /// # Errors
    /// `bad-place` unless the latitude is within 90 degrees, the longitude within 360 and the height from -500 to
    /// 9000 m.
    pub fn new(latitude_deg: f64, longitude_deg: f64, height_m: f64) -> Result<Self, Error> {
        if !(-90.0..=90.0).contains(&latitude_deg) {
            return Err(Error::new(
                Code::BadPlace,
                "The latitude must be from -90 to 90 degrees, north positive.",
            ));
        }
        if !(-360.0..=360.0).contains(&longitude_deg) {
            return Err(Error::new(
                Code::BadPlace,
                "The longitude must be from -360 to 360 degrees, east positive.",
            ));
        }
        if !(-500.0..=9000.0).contains(&height_m) {
            return Err(Error::new(
                Code::BadPlace,
                "The height must be from -500 to 9000 metres.",
            ));
        }
        // 180 stays 180: it is how people write the date line.
        let longitude_deg = if longitude_deg.abs() <= 180.0 {
            longitude_deg
        } else {
            wrap_half_turn_degrees(longitude_deg)
        };
        Ok(Self {
            latitude_deg,
            longitude_deg,
            height_m,
        })
    }

    /// Geodetic latitude, north positive.
    pub fn latitude_deg(&self) -> f64 {
        self.latitude_deg
    }

    /// Longitude from -180 to 180, east positive.
    pub fn longitude_deg(&self) -> f64 {
        self.longitude_deg
    }

    /// Height above the ellipsoid.
    pub fn height_m(&self) -> f64 {
        self.height_m
    }

    /// Distances from the Earth's axis and from the plane of the equator.
    fn distances_from_axis_and_equator_km(&self) -> (f64, f64) {
        // WGS84: equatorial radius and flattening.
        const EQUATORIAL_KM: f64 = 6_378.137;
        const FLATTENING: f64 = 1.0 / 298.257_223_563;
        let (sin, cos) = sin_cos(self.latitude_deg.to_radians());
        let polar_square = (1.0 - FLATTENING).powi(2);
        let curvature_km = EQUATORIAL_KM / (cos * cos + polar_square * sin * sin).sqrt();
        let height_km = self.height_m / 1000.0;
        (
            (curvature_km + height_km) * cos,
            (polar_square * curvature_km + height_km) * sin,
        )
    }
}

/// Angular speed of the Earth, radians per day of UT1 (IERS Conventions 2010).
const EARTH_TURN_RAD_PER_DAY: f64 = std::f64::consts::TAU * 1.002_737_811_911;

/// The body seen from a place, without refraction.
///
/// Parallax and the aberration by the Earth's turning (0.3 arcsec) are in it, polar motion (0.3 arcsec) is not.
pub fn topocentric(
    observation: &Observation,
    earth: &Earth,
    of_date: &OfDate,
    utc: Utc,
    place: &Place,
) -> Horizontal {
    let greenwich_rad = greenwich_apparent_sidereal_time_rad(utc.to_ut1(), earth.tt(), of_date);
    let local_rad = greenwich_rad + place.longitude_deg.to_radians();
    let (sin_time, cos_time) = sin_cos(local_rad);
    let (from_axis_km, from_equator_km) = place.distances_from_axis_and_equator_km();
    let observer_au = scaled(
        1.0 / AU_KM,
        [
            from_axis_km * cos_time,
            from_axis_km * sin_time,
            from_equator_km,
        ],
    );
    let body_au = scaled(
        observation.distance_au(),
        of_date.equator().apply(observation.direction),
    );
    let seen = unit(add_scaled(body_au, -1.0, observer_au));
    let velocity = [
        -EARTH_TURN_RAD_PER_DAY * observer_au[1],
        EARTH_TURN_RAD_PER_DAY * observer_au[0],
        0.0,
    ];
    let direction = add_scaled(seen, LIGHT_DAYS_PER_AU, velocity);
    horizontal(direction, local_rad, place.latitude_deg.to_radians())
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn observer_of_a_published_example() {
        // Meeus, Astronomical Algorithms, ex. 11.a (from memory): Palomar, +33 21 22, 1706 m: rho sin(phi') 0.546861,
        // rho cos(phi') 0.836339 in equatorial radii (IAU 1976 ellipsoid, which differs by 3 m).
        let place = Place::new(33.356_111, -116.8625, 1706.0).expect("a valid place");
        let (from_axis_km, from_equator_km) = place.distances_from_axis_and_equator_km();
        assert!(
            (from_axis_km / 6_378.14 - 0.836_339).abs() < 2e-6,
            "{}",
            from_axis_km / 6_378.14
        );
        assert!(
            (from_equator_km / 6_378.14 - 0.546_861).abs() < 2e-6,
            "{}",
            from_equator_km / 6_378.14
        );
    }

    #[test]
    fn places_outside_the_earth_are_refused() {
        for (latitude_deg, longitude_deg, height_m) in [
            (90.1, 0.0, 0.0),
            (f64::NAN, 0.0, 0.0),
            (0.0, 361.0, 0.0),
            (0.0, f64::INFINITY, 0.0),
            (0.0, 0.0, 9001.0),
            (0.0, 0.0, f64::NAN),
        ] {
            let refused =
                Place::new(latitude_deg, longitude_deg, height_m).map_err(|error| error.code());
            assert_eq!(refused, Err(Code::BadPlace));
        }
    }

    #[test]
    fn longitudes_are_brought_into_a_half_turn() {
        let longitude = |deg| Place::new(0.0, deg, 0.0).map(|place| place.longitude_deg());
        assert_eq!(longitude(180.0), Ok(180.0));
        assert_eq!(longitude(-180.0), Ok(-180.0));
        assert_eq!(longitude(270.0), Ok(-90.0));
        assert_eq!(longitude(-360.0), Ok(0.0));
    }
}
