//! What families ask of the sky, each quantity worked out once per instant.

use std::cell::{OnceCell, RefCell};
use std::rc::Rc;

use crate::body::Body;
use crate::ephemeris::{Earth, Observation};
use crate::frames::{OfDate, Spherical, mean_ecliptic_of_date, separation_deg};
use crate::photometry::{Disc, MarsRotation, Seen, illuminated_fraction, magnitude};
use crate::quantity::wrap_half_turn_degrees;
use crate::time::{Tt, Utc};

use super::civil::utc_of;

/// Walks step by multiples of this, counted from J2000.0, so that families share what they sample.
pub(super) const GRID_DAYS: f64 = 2.0;

/// Step that suits what happens to a body in its round: a twentieth of the time between its events at least, for the
/// Moon a seventh of its round.
pub(super) fn step_days(body: Body) -> f64 {
    match body {
        Body::Mercury | Body::Moon => 2.0 * GRID_DAYS,
        _ => 4.0 * GRID_DAYS,
    }
}

/// The sky at one instant, geocentric and apparent.
pub(super) struct Moment {
    earth: Earth,
    of_date: OnceCell<OfDate>,
    seen: [OnceCell<Observation>; Body::ALL.len()],
}

impl Moment {
    pub(super) fn at(tt_days: f64) -> Self {
        Self {
            earth: Earth::at(Tt::from_days_since_j2000(tt_days)),
            of_date: OnceCell::new(),
            seen: Default::default(),
        }
    }

    pub(super) fn earth(&self) -> &Earth {
        &self.earth
    }

    /// Civil time.
    pub(super) fn utc(&self) -> Utc {
        utc_of(self.earth.tt())
    }

    /// True equator and equinox.
    pub(super) fn of_date(&self) -> &OfDate {
        self.of_date.get_or_init(|| OfDate::at(self.earth.tt()))
    }

    pub(super) fn seen(&self, body: Body) -> &Observation {
        self.seen[body as usize].get_or_init(|| Observation::of(body, &self.earth))
    }

    /// Apparent ecliptic longitude minus the Sun's, -180 to 180. Nutation is in both and cancels.
    pub(super) fn longitude_from_sun_deg(&self, body: Body) -> f64 {
        let ecliptic = mean_ecliptic_of_date(self.earth.tt());
        let longitude_deg =
            |direction: [f64; 3]| Spherical::of(ecliptic.apply(direction)).longitude_deg;
        wrap_half_turn_degrees(
            longitude_deg(self.seen(body).direction) - longitude_deg(self.earth.sun_direction()),
        )
    }

    /// Apparent ecliptic latitude.
    pub(super) fn ecliptic_latitude_deg(&self, body: Body) -> f64 {
        let ecliptic = mean_ecliptic_of_date(self.earth.tt());
        Spherical::of(ecliptic.apply(self.seen(body).direction)).latitude_deg
    }

    /// Apparent right ascension, true equator and equinox of date.
    pub(super) fn right_ascension_deg(&self, body: Body) -> f64 {
        Spherical::of(self.of_date().equator().apply(self.seen(body).direction)).longitude_deg
    }

    /// Apparent angle from the Sun's centre.
    pub(super) fn elongation_deg(&self, body: Body) -> f64 {
        self.seen(body).elongation_deg(self.earth.sun_direction())
    }

    /// Apparent angle between two bodies.
    pub(super) fn separation_deg(&self, a: Body, b: Body) -> f64 {
        separation_deg(self.seen(a).direction, self.seen(b).direction)
    }

    /// Square of that angle: smooth also where the bodies meet, and for even motion a parabola.
    pub(super) fn separation_square_deg2(&self, a: Body, b: Body) -> f64 {
        self.separation_deg(a, b).powi(2)
    }

    pub(super) fn illuminated_fraction(&self, body: Body) -> f64 {
        illuminated_fraction(self.seen(body).phase_angle_deg())
    }

    pub(super) fn disc(&self, body: Body) -> Disc {
        Disc::of(body, self.seen(body).distance_au())
    }

    pub(super) fn lit_area_arcsec2(&self, body: Body) -> f64 {
        self.disc(body)
            .lit_area_arcsec2(self.illuminated_fraction(body))
    }

    /// Visual magnitude, for Mars averaged over its rotation; NaN where the law has no value.
    pub(super) fn magnitude(&self, body: Body) -> f64 {
        magnitude(
            &Seen::new(self.seen(body), &self.earth, self.utc()),
            MarsRotation::Averaged,
        )
        .value_or_nan()
    }
}

/// Moments of one stretch of time; those on the grid are kept.
pub(super) struct Sky {
    first: i64,
    kept: RefCell<Vec<Option<Rc<Moment>>>>,
}

impl Sky {
    /// A sky that keeps the grid between two instants, days TT.
    pub(super) fn new(from_days: f64, to_days: f64) -> Self {
        let first = (from_days / GRID_DAYS).floor() as i64;
        let count = ((to_days - from_days) / GRID_DAYS).max(0.0) as usize + 2;
        Self {
            first,
            kept: RefCell::new(vec![None; count]),
        }
    }

    /// The moment at a number of days from J2000.0 TT.
    pub(super) fn at(&self, tt_days: f64) -> Rc<Moment> {
        let cell = tt_days / GRID_DAYS;
        let index = if cell.fract() == 0.0 {
            usize::try_from(cell as i64 - self.first).ok()
        } else {
            None
        };
        let mut kept = self.kept.borrow_mut();
        match index.and_then(|index| kept.get_mut(index)) {
            Some(place) => place
                .get_or_insert_with(|| Rc::new(Moment::at(tt_days)))
                .clone(),
            None => Rc::new(Moment::at(tt_days)),
        }
    }
}
