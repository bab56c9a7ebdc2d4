//! The solar system seen from above: where Earth and a planet stand around the Sun, and the paths that they follow.
//!
//! Everything is geometric, at one instant, without light time: on a drawing the difference cannot be seen.

use super::{Earth, check_span};
use crate::body::Body;
use crate::error::{Code, Error};
use crate::frames::{Matrix, mean_ecliptic_of_date};
use crate::quantity::DAYS_PER_JULIAN_YEAR;
use crate::series::{
    SeriesBody, State, VALID_FROM_YEAR, VALID_TO_YEAR, heliocentric, heliocentric_position_au,
};
use crate::time::{Tt, Utc};
use std::f64::consts::TAU;

/// A place on the ecliptic of J2000.0 as seen from its north side, in au from the Sun: x towards the equinox of
/// J2000.0, y a quarter turn on in the sense in which the planets go around. The height above the plane is left out.
///
/// Axes that stand still keep an orbit closed, though a revolution may last 165 years.
pub type PlanPointAu = [f64; 2];

/// Earth and a planet on the plan at one instant.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct PlanPositions {
    /// The Earth's centre.
    pub earth_au: PlanPointAu,
    /// The planet.
    pub planet_au: PlanPointAu,
}

/// Who goes around the Sun on the plan.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Traveller {
    /// The Earth.
    Earth,
    /// A planet from Mercury to Neptune.
    Planet(Body),
}

/// Points of a drawn orbit; chords of so many stay within 0.001 of the radius even for Mercury.
const ORBIT_POINTS: usize = 120;
/// A direction is met when it is this near: 0.0006 degrees, on a drawing nothing.
const MET_RAD: f64 = 1e-5;
const MOST_STEPS: usize = 12;

impl Traveller {
    fn series_body(self) -> Result<SeriesBody, Error> {
        Ok(match self {
            Traveller::Earth => SeriesBody::EarthMoonBarycentre,
            Traveller::Planet(Body::Mercury) => SeriesBody::Mercury,
            Traveller::Planet(Body::Venus) => SeriesBody::Venus,
            Traveller::Planet(Body::Mars) => SeriesBody::Mars,
            Traveller::Planet(Body::Jupiter) => SeriesBody::Jupiter,
            Traveller::Planet(Body::Saturn) => SeriesBody::Saturn,
            Traveller::Planet(Body::Uranus) => SeriesBody::Uranus,
            Traveller::Planet(Body::Neptune) => SeriesBody::Neptune,
            Traveller::Planet(Body::Sun | Body::Moon) => {
                return Err(Error::new(
                    Code::BadOption,
                    "The plan shows what goes around the Sun beside the Earth; choose a planet from mercury to neptune.",
                ));
            }
        })
    }
}

/// Where Earth and a planet stand around the Sun.
///
/// Accuracy: that of the series, far finer than a drawing.
///
/// # Errors
/// `bad-option` for Sun and Moon, `bad-instant` and `out-of-span` for the instant.
pub fn plan_positions(body: Body, utc: Utc) -> Result<PlanPositions, Error> {
    let planet = Traveller::Planet(body).series_body()?;
    check_span(utc)?;
    let (plane, tt) = (plane(), utc.to_tt());
    Ok(PlanPositions {
        earth_au: seen_from_north(&plane, Earth::at(tt).position_au()),
        planet_au: seen_from_north(&plane, heliocentric_position_au(planet, tt)),
    })
}

/// The path of one revolution about an instant, as points at even times; the last joins the first.
///
/// Near the ends of the years that are answered the revolution is the one that still lies within them.
///
/// # Errors
/// As [`plan_positions`].
pub fn plan_orbit(traveller: Traveller, utc: Utc) -> Result<Vec<PlanPointAu>, Error> {
    let body = traveller.series_body()?;
    check_span(utc)?;
    let plane = plane();
    let now = heliocentric(body, utc.to_tt());
    let period_days = revolution_days(&now);
    let (first_days, last_days) = valid_days();
    let from_days = (utc.days_since_j2000() - period_days / 2.0)
        .min(last_days - period_days)
        .max(first_days);
    Ok((0..ORBIT_POINTS)
        .map(|index| from_days + period_days * index as f64 / ORBIT_POINTS as f64)
        .map(|days| heliocentric_position_au(body, Utc::from_days_since_j2000(days).to_tt()))
        .map(|position_au| seen_from_north(&plane, position_au))
        .collect())
}

/// The instant near another at which a traveller stands in a direction from the Sun: at most about half a revolution
/// away. The direction is counted as on the plan, from x towards y.
///
/// # Errors
/// As [`plan_positions`]; `bad-option` for a direction that is not finite.
pub fn plan_passage(traveller: Traveller, near: Utc, direction_rad: f64) -> Result<Utc, Error> {
    let body = traveller.series_body()?;
    check_span(near)?;
    if !direction_rad.is_finite() {
        return Err(Error::new(
            Code::BadOption,
            "The direction must be a finite angle.",
        ));
    }
    let plane = plane();
    let (first_days, last_days) = valid_days();
    let mut days = near.days_since_j2000();
    for _ in 0..MOST_STEPS {
        let state = heliocentric(body, Utc::from_days_since_j2000(days).to_tt());
        let [x, y] = seen_from_north(&plane, state.position_au);
        let [x_rate, y_rate] = seen_from_north(&plane, state.velocity_au_per_day);
        let rate_rad_per_day = (x * y_rate - y * x_rate) / (x * x + y * y);
        let ahead_rad = wrapped_rad(direction_rad - y.atan2(x));
        days = (days + ahead_rad / rate_rad_per_day)
            .min(last_days)
            .max(first_days);
        if ahead_rad.abs() < MET_RAD {
            break;
        }
    }
    Ok(Utc::from_days_since_j2000(days))
}

fn plane() -> Matrix {
    mean_ecliptic_of_date(Tt::from_days_since_j2000(0.0))
}

fn seen_from_north(plane: &Matrix, vector: [f64; 3]) -> PlanPointAu {
    let [x, y, _] = plane.apply(vector);
    [x, y]
}

/// The period of the ellipse that a state belongs to: Kepler's third law with the semi-major axis from distance and
/// speed, in Gauss's units.
fn revolution_days(state: &State) -> f64 {
    const GAUSS: f64 = 0.017_202_098_95;
    let square = |v: [f64; 3]| v.iter().map(|x| x * x).sum::<f64>();
    let distance_au = square(state.position_au).sqrt();
    let per_axis = 2.0 / distance_au - square(state.velocity_au_per_day) / (GAUSS * GAUSS);
    TAU / GAUSS / (per_axis * per_axis.sqrt())
}

fn valid_days() -> (f64, f64) {
    // The inverse of `Utc::julian_year`, by which the span is checked.
    let days = |year: i32| f64::from(year - 2000) * DAYS_PER_JULIAN_YEAR - 0.5;
    (days(VALID_FROM_YEAR), days(VALID_TO_YEAR))
}

fn wrapped_rad(angle_rad: f64) -> f64 {
    angle_rad - TAU * (angle_rad / TAU).round()
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::quantity::hypotenuse;

    fn at(text: &str) -> Utc {
        Utc::parse(text).expect("a valid date")
    }

    fn distance(a: PlanPointAu, b: PlanPointAu) -> f64 {
        hypotenuse(a[0] - b[0], a[1] - b[1])
    }

    #[test]
    fn the_earth_stands_where_its_seasons_say() {
        // March equinox 2026-03-20T14:46 UTC (US Naval Observatory): the Sun is seen towards x, so the Earth is at -x.
        // In 26 years precession has moved the equinox of date by 0.37 degrees, 0.0064 au.
        let [x, y] = plan_positions(Body::Venus, at("2026-03-20T14:46:00Z"))
            .expect("within the span")
            .earth_au;
        assert!((x + 0.996).abs() < 0.001 && y.abs() < 0.007, "{x} {y}");
    }

    #[test]
    fn orbits_have_their_published_eccentricities() {
        // a (1 - e) and a (1 + e) of J2000.0 elements: Mercury 0.3075 and 0.4667, Mars 1.381 and 1.666 (Standish,
        // Keplerian elements for approximate positions, JPL). Seen from above, inclined ones are shorter by up to 0.8 %.
        for (body, nearest_au, farthest_au) in
            [(Body::Mercury, 0.3075, 0.4667), (Body::Mars, 1.381, 1.666)]
        {
            let orbit =
                plan_orbit(Traveller::Planet(body), at("2026-11-24")).expect("within the span");
            let radii = || orbit.iter().map(|&point| distance(point, [0.0; 2]));
            let (least, most) = (radii().fold(9.0, f64::min), radii().fold(0.0, f64::max));
            assert!((least / nearest_au - 1.0).abs() < 0.009, "{body}: {least}");
            assert!((most / farthest_au - 1.0).abs() < 0.009, "{body}: {most}");
        }
    }

    #[test]
    fn a_planet_stands_on_its_orbit_and_is_found_there_again() {
        for body in Body::PLANETS {
            for text in ["1601-01-01", "1800-06-01", "2026-11-24", "2299-01-01"] {
                let (utc, traveller) = (at(text), Traveller::Planet(body));
                let here = plan_positions(body, utc)
                    .expect("within the span")
                    .planet_au;
                let orbit = plan_orbit(traveller, utc).expect("within the span");
                let gap = orbit
                    .iter()
                    .map(|&point| distance(point, here))
                    .fold(f64::INFINITY, f64::min);
                let radius = distance(here, [0.0; 2]);
                assert!(gap < 0.045 * radius, "{body} {text}: {gap} au off its path");
                let met = plan_passage(traveller, utc.plus_days(20.0), here[1].atan2(here[0]))
                    .expect("within the span");
                let there = plan_positions(body, met)
                    .expect("within the span")
                    .planet_au;
                let turned = (there[1].atan2(there[0]) - here[1].atan2(here[0])).abs();
                assert!(wrapped_rad(turned).abs() < 1e-4, "{body} {text}: {turned}");
            }
        }
    }

    #[test]
    fn what_cannot_be_drawn_is_refused() {
        let code = |outcome: Result<PlanPositions, Error>| outcome.map_err(|error| error.code());
        assert_eq!(
            code(plan_positions(Body::Moon, at("2026-11-24"))),
            Err(Code::BadOption)
        );
        assert_eq!(
            code(plan_positions(Body::Mars, Utc::from_days_since_j2000(1e9))),
            Err(Code::OutOfSpan)
        );
        let lost = plan_passage(Traveller::Earth, at("2026-11-24"), f64::NAN);
        assert_eq!(lost.map_err(|error| error.code()), Err(Code::BadOption));
    }
}
