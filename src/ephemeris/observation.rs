//! One body as its light shows it from the Earth's centre.

use super::earth::{Earth, moon_geocentric};
use super::light::{aberrated, bent};
use crate::body::Body;
use crate::quantity::{
    KM_S_PER_AU_DAY, LIGHT_DAYS_PER_AU, SECONDS_PER_DAY, add_scaled, angle_between_rad,
    angle_of_sine_rad, dot, norm, scaled, unit,
};
use crate::series::{SeriesBody, heliocentric};

/// The Sun's gravity, au^3 per day^2: the square of Gauss's constant.
const SUN_GRAVITY: f64 = 0.017_202_098_95 * 0.017_202_098_95;

/// Where a body was when the light that now arrives left it, and how it moved. ICRS axes.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Observation {
    /// The body observed.
    pub body: Body,
    /// From the Sun's centre to the body; null vector for the Sun.
    pub from_sun_au: [f64; 3],
    /// From the Earth's centre now to the body then, before bending and aberration; for the Moon, with which the Earth
    /// moves along, its geocentric position a light time ago.
    pub from_earth_au: [f64; 3],
    /// Apparent direction, a unit vector.
    pub direction: [f64; 3],
    /// Rate of `from_sun_au`.
    from_sun_au_per_day: [f64; 3],
    /// Rate of `from_earth_au`.
    from_earth_au_per_day: [f64; 3],
}

impl Observation {
    /// A body seen from the Earth.
    ///
    /// Accuracy: see `cargo widget accuracy`; span as of the series. The Moon's direction is its geocentric position
    /// a light time ago, which costs 0.0008 arcsec.
    pub fn of(body: Body, earth: &Earth) -> Self {
        match body {
            Body::Sun => Self::sun(earth),
            Body::Moon => Self::moon(earth),
            Body::Mercury => Self::planet(body, SeriesBody::Mercury, earth),
            Body::Venus => Self::planet(body, SeriesBody::Venus, earth),
            Body::Mars => Self::planet(body, SeriesBody::Mars, earth),
            Body::Jupiter => Self::planet(body, SeriesBody::Jupiter, earth),
            Body::Saturn => Self::planet(body, SeriesBody::Saturn, earth),
            Body::Uranus => Self::planet(body, SeriesBody::Uranus, earth),
            Body::Neptune => Self::planet(body, SeriesBody::Neptune, earth),
        }
    }

    fn sun(earth: &Earth) -> Self {
        Self {
            body: Body::Sun,
            from_sun_au: [0.0; 3],
            from_earth_au: scaled(-1.0, earth.position_au),
            direction: earth.sun_direction(),
            from_sun_au_per_day: [0.0; 3],
            from_earth_au_per_day: scaled(-1.0, earth.velocity_au_per_day),
        }
    }

    fn moon(earth: &Earth) -> Self {
        // Over the 1.3 seconds of the light's way the path is straight to a few millimetres.
        let (now_au, velocity) = moon_geocentric(earth.tt);
        let light_days = LIGHT_DAYS_PER_AU * norm(now_au);
        let from_earth_au = add_scaled(now_au, -light_days, velocity);
        let earth_then_au = add_scaled(earth.position_au, -light_days, earth.velocity_au_per_day);
        Self {
            body: Body::Moon,
            from_sun_au: add_scaled(earth_then_au, 1.0, from_earth_au),
            from_earth_au,
            direction: unit(from_earth_au),
            from_sun_au_per_day: add_scaled(earth.velocity_au_per_day, 1.0, velocity),
            from_earth_au_per_day: velocity,
        }
    }

    /// One evaluation of the series at the instant of observation, carried back over the light time with velocity and
    /// the Sun's pull. What is neglected is of the third order in the light time: below 1e-10 au.
    fn planet(body: Body, series_body: SeriesBody, earth: &Earth) -> Self {
        let now = heliocentric(series_body, earth.tt);
        let pull = scaled(
            -SUN_GRAVITY / norm(now.position_au).powi(3),
            now.position_au,
        );
        let position_before = |days: f64| {
            add_scaled(
                add_scaled(now.position_au, -days, now.velocity_au_per_day),
                0.5 * days * days,
                pull,
            )
        };
        let mut from_sun_au = now.position_au;
        let mut light_days = 0.0;
        // Each pass leaves the planet's speed over that of light, at most 1/6000, of the error: three reach 1e-12.
        for _ in 0..3 {
            light_days = LIGHT_DAYS_PER_AU * norm(add_scaled(from_sun_au, -1.0, earth.position_au));
            from_sun_au = position_before(light_days);
        }
        let from_earth_au = add_scaled(from_sun_au, -1.0, earth.position_au);
        let velocity = add_scaled(now.velocity_au_per_day, -light_days, pull);
        let bent = bent(unit(from_earth_au), from_sun_au, earth.position_au);
        Self {
            body,
            from_sun_au,
            from_earth_au,
            direction: aberrated(bent, earth.velocity_au_per_day),
            from_sun_au_per_day: velocity,
            from_earth_au_per_day: add_scaled(velocity, -1.0, earth.velocity_au_per_day),
        }
    }

    /// Distance from the Earth's centre that the light has travelled.
    pub fn distance_au(&self) -> f64 {
        norm(self.from_earth_au)
    }

    /// Distance from the Sun when the light left; 0 for the Sun.
    pub fn sun_distance_au(&self) -> f64 {
        norm(self.from_sun_au)
    }

    /// Time that the light took.
    pub fn light_time_seconds(&self) -> f64 {
        self.distance_au() * LIGHT_DAYS_PER_AU * SECONDS_PER_DAY
    }

    /// Angle Sun-body-Earth, 0 to 180; meaningless for the Sun.
    pub fn phase_angle_deg(&self) -> f64 {
        angle_between_rad(self.from_sun_au, self.from_earth_au).to_degrees()
    }

    /// Whether the phase angle shrinks and the lit fraction grows.
    pub fn is_waxing(&self) -> bool {
        let (sun, earth) = (self.from_sun_au, self.from_earth_au);
        let (sun_square, earth_square) = (dot(sun, sun), dot(earth, earth));
        // Sign of the rate of cos(phase angle) = sun . earth / (|sun| |earth|).
        let product_rate =
            dot(self.from_sun_au_per_day, earth) + dot(sun, self.from_earth_au_per_day);
        let length_rate = dot(sun, self.from_sun_au_per_day) / sun_square
            + dot(earth, self.from_earth_au_per_day) / earth_square;
        product_rate > dot(sun, earth) * length_rate
    }

    /// Apparent angle from the Sun's centre, 0 to 180.
    pub fn elongation_deg(&self, sun_direction: [f64; 3]) -> f64 {
        angle_between_rad(self.direction, sun_direction).to_degrees()
    }

    /// Speed around the Sun; for the Moon around the Earth; 0 for the Sun.
    pub fn orbital_speed_km_s(&self) -> f64 {
        let velocity = if self.body == Body::Moon {
            self.from_earth_au_per_day
        } else {
            self.from_sun_au_per_day
        };
        norm(velocity) * KM_S_PER_AU_DAY
    }

    /// Latitudes above a body's equator at which the Earth and the Sun stand, for a north pole on ICRS axes.
    pub(crate) fn earth_and_sun_latitude_deg(&self, pole: [f64; 3]) -> (f64, f64) {
        let latitude_deg =
            |to_body: [f64; 3]| angle_of_sine_rad(-dot(pole, unit(to_body))).to_degrees();
        (
            latitude_deg(self.from_earth_au),
            latitude_deg(self.from_sun_au),
        )
    }
}
