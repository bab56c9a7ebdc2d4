//! Two bodies seen from a place at one instant.

use super::event::Contact;
use super::sky::Moment;
use crate::body::Body;
use crate::frames::{Horizontal, Spherical, position_angle_deg, separation_deg};
use crate::place::{Place, topocentric};
use crate::quantity::{AU_KM, sin_cos, wrap_degrees};

/// Equatorial radius of the Earth; where an observer really stands matters 0.05 arcsec to the Moon's size.
const EARTH_RADIUS_KM: f64 = 6_378.0;

/// A place at one instant.
pub(super) struct View {
    pub(super) moment: Moment,
    place: Place,
}

impl View {
    pub(super) fn new(place: &Place, tt_days: f64) -> Self {
        Self {
            moment: Moment::at(tt_days),
            place: *place,
        }
    }

    pub(super) fn horizontal(&self, body: Body) -> Horizontal {
        let earth = self.moment.earth();
        topocentric(
            self.moment.seen(body),
            earth,
            self.moment.of_date(),
            self.moment.utc(),
            &self.place,
        )
    }

    pub(super) fn separation_deg(&self, a: Body, b: Body) -> f64 {
        separation_deg(
            direction(&self.horizontal(a)),
            direction(&self.horizontal(b)),
        )
    }

    /// Distance of a body's centre from the place.
    pub(super) fn distance_au(&self, body: Body) -> f64 {
        let distance_au = self.moment.seen(body).distance_au();
        let radius_au = EARTH_RADIUS_KM / AU_KM;
        let (sin, cos) = sin_cos(self.horizontal(body).altitude_deg.to_radians());
        (distance_au * distance_au - (radius_au * cos).powi(2)).sqrt() - radius_au * sin
    }

    /// What is told of an instant at which `planet` touches `host`.
    pub(super) fn contact(&self, name: &'static str, planet: Body, host: Body) -> Contact {
        let (planet, host) = (self.horizontal(planet), self.horizontal(host));
        // The angle at the host's centre from the zenith, turned by that of the zenith from north. Azimuths run against
        // position angles: from north through east means to the right here, to the left in the sky.
        let from_zenith_deg = -position_angle_deg(direction(&host), direction(&planet));
        Contact {
            name,
            utc: self.moment.utc(),
            position_angle_deg: wrap_degrees(from_zenith_deg + host.parallactic_angle_deg),
            altitude_deg: Some(planet.altitude_deg),
            sun_altitude_deg: Some(self.horizontal(Body::Sun).altitude_deg),
        }
    }
}

fn direction(horizontal: &Horizontal) -> [f64; 3] {
    Spherical {
        longitude_deg: horizontal.azimuth_deg,
        latitude_deg: horizontal.altitude_deg,
    }
    .direction()
}
