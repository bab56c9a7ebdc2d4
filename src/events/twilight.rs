//! The instants at which the Sun's centre stands six degrees below the horizon, where civil twilight begins or ends.

use super::search::{Scan, roots};
use crate::body::Body;
use crate::ephemeris::{Earth, Observation};
use crate::frames::OfDate;
use crate::place::{Place, topocentric};
use crate::time::Utc;

/// Geometric altitude of the Sun's centre at the dark end of civil twilight; common practice.
const CIVIL_TWILIGHT_SUN_DEG: f64 = -6.0;
/// The Sun passes the depression at most once within this time after noon, and once before it.
const HALF_NIGHT_DAYS: f64 = 0.75;
const STEP_DAYS: f64 = 0.05;
const TOLERANCE_DAYS: f64 = 1.0 / 86_400.0;

/// End of civil twilight in the evening after a noon; `None` when the Sun does not pass six degrees below the horizon.
///
/// `noon` is noon of the place's clock, UTC. Good to a second or two; places near the pole, where the Sun moves along
/// the horizon, to minutes.
pub fn civil_dusk(place: &Place, noon: Utc) -> Option<Utc> {
    passages(place, noon, noon.plus_days(HALF_NIGHT_DAYS))
        .first()
        .copied()
}

/// Beginning of civil twilight in the morning before a noon; otherwise as [`civil_dusk`].
pub fn civil_dawn(place: &Place, noon: Utc) -> Option<Utc> {
    passages(place, noon.plus_days(-HALF_NIGHT_DAYS), noon)
        .last()
        .copied()
}

fn passages(place: &Place, from: Utc, to: Utc) -> Vec<Utc> {
    let scan = Scan {
        from_days: from.days_since_j2000(),
        to_days: to.days_since_j2000(),
        step_days: STEP_DAYS,
        tolerance_days: TOLERANCE_DAYS,
    };
    let mut above = |days: f64| {
        sun_altitude_deg(place, Utc::from_days_since_j2000(days)) - CIVIL_TWILIGHT_SUN_DEG
    };
    roots(&scan, f64::INFINITY, &mut above)
        .iter()
        .map(|found| Utc::from_days_since_j2000(found.days))
        .collect()
}

fn sun_altitude_deg(place: &Place, utc: Utc) -> f64 {
    let earth = Earth::at(utc.to_tt());
    topocentric(
        &Observation::of(Body::Sun, &earth),
        &earth,
        &OfDate::at(earth.tt()),
        utc,
        place,
    )
    .altitude_deg
}

#[cfg(test)]
mod tests {
    use super::*;

    fn noon(year: i32, month: u8, day: u8) -> Utc {
        Utc::from_civil(year, month, day, 43_200.0).expect("a date")
    }

    #[test]
    fn dawn_comes_before_noon_and_dusk_after_it_at_the_right_depression() {
        let place = Place::new(54.5, -3.1, 0.0).expect("a place");
        let noon = noon(2026, 11, 25);
        for instant in [civil_dawn(&place, noon), civil_dusk(&place, noon)] {
            let instant = instant.expect("a twilight");
            assert!((sun_altitude_deg(&place, instant) + 6.0).abs() < 1e-3);
        }
        assert!(civil_dawn(&place, noon) < Some(noon) && civil_dusk(&place, noon) > Some(noon));
    }

    #[test]
    fn midsummer_far_north_has_no_twilight() {
        let place = Place::new(69.6, 18.9, 0.0).expect("a place");
        assert_eq!(civil_dusk(&place, noon(2026, 6, 21)), None);
        assert_eq!(civil_dawn(&place, noon(2026, 6, 21)), None);
    }
}
