//! How a planet's rounds follow each other.

use super::apparitions::planet;
use super::kind::Kind::{InferiorConjunction, Opposition};
use super::query::{Query, events, search};
use crate::body::Body;
use crate::error::Error;
use crate::quantity::power;
use crate::time::Utc;

/// Facts about the rounds of a planet as seen from the Earth.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Rhythm {
    /// Mean time between two inferior conjunctions, or two oppositions.
    pub mean_synodic_period_days: f64,
    /// Shortest such time among those that end in the span; none when none ends there.
    pub shortest_synodic_period_days: Option<f64>,
    /// Longest such time among those that end in the span.
    pub longest_synodic_period_days: Option<f64>,
    /// Turns around the Sun that the planet makes in one mean synodic period; the Earth makes one less or one more.
    pub orbits_per_synodic_period: f64,
    /// Mean speed along the planet's orbit.
    pub orbital_speed_km_s: f64,
    /// The same in statute miles per second.
    pub orbital_speed_mi_s: f64,
    /// Mean speed along the Earth's orbit.
    pub earth_orbital_speed_km_s: f64,
    /// The same in statute miles per second.
    pub earth_orbital_speed_mi_s: f64,
    /// Venus only: by how many days the fifth inferior conjunction after the first in the span misses the same date
    /// eight years on; negative when it comes earlier in the year.
    pub eight_year_drift_days: Option<f64>,
}

/// Mean turn around the Sun, days: P. Bretagnon and G. Francou 1988 (VSOP87), A&A 202, 309, from the mean longitudes.
fn orbital_period_days(body: Body) -> f64 {
    match body {
        Body::Mercury => 87.969_26,
        Body::Venus => 224.700_80,
        Body::Mars => 686.979_85,
        Body::Jupiter => 4_332.589,
        Body::Saturn => 10_759.23,
        Body::Uranus => 30_688.48,
        Body::Neptune => 60_182.3,
        Body::Sun | Body::Moon => EARTH_PERIOD_DAYS,
    }
}

const EARTH_PERIOD_DAYS: f64 = 365.256_36;
/// Mean orbital speed of the Earth: a circle of one astronomical unit in that time.
const EARTH_SPEED_KM_S: f64 = 29.784_7;
/// Kilometres in a statute mile (exact).
const KM_PER_MILE: f64 = 1.609_344;
/// Five rounds of Venus come close to eight years, of 365.2422 days.
const VENUS_ROUNDS: usize = 5;
const EIGHT_YEARS_DAYS: f64 = 8.0 * 365.242_2;
/// A little more than the longest round of any planet, and more than five rounds of Venus.
const LONGEST_ROUND_DAYS: f64 = 830.0;
const FIVE_ROUNDS_OF_VENUS_DAYS: f64 = 2_950.0;

/// The rhythm of a planet, with what actually happens between two instants.
///
/// # Errors
/// `unknown-body` for Sun and Moon, `bad-instant` and `out-of-span` for either instant, `bad-step` when the end is
/// before the start.
pub fn rhythm(body: Body, from: Utc, to: Utc) -> Result<Rhythm, Error> {
    planet(body)?;
    let kind = if body.is_inner_planet() {
        InferiorConjunction
    } else {
        Opposition
    };
    let inside = events(&Query::of(body, &[kind], from, to))?;
    let (mut shortest, mut longest) = (None, None);
    let before = search(&Query::of(
        body,
        &[kind],
        from.plus_days(-LONGEST_ROUND_DAYS),
        from,
    ));
    let mut previous = before.last().map(|event| event.utc);
    for event in &inside {
        if let Some(previous) = previous {
            let days = event.utc.days_since_j2000() - previous.days_since_j2000();
            shortest = Some(shortest.map_or(days, |least: f64| least.min(days)));
            longest = Some(longest.map_or(days, |most: f64| most.max(days)));
        }
        previous = Some(event.utc);
    }
    let eight_year_drift_days = match (body, inside.first()) {
        (Body::Venus, Some(first)) => {
            let end = first.utc.plus_days(FIVE_ROUNDS_OF_VENUS_DAYS);
            search(&Query::of(body, &[kind], first.utc.plus_days(-1.0), end))
                .get(VENUS_ROUNDS)
                .map(|fifth| {
                    fifth.utc.days_since_j2000() - first.utc.days_since_j2000() - EIGHT_YEARS_DAYS
                })
        }
        _ => None,
    };
    let period_days = orbital_period_days(body);
    let mean_synodic_period_days = 1.0 / (1.0 / period_days - 1.0 / EARTH_PERIOD_DAYS).abs();
    // Kepler's third law: the speed falls with the cube root of the period.
    let orbital_speed_km_s = EARTH_SPEED_KM_S * power(period_days / EARTH_PERIOD_DAYS, -1.0 / 3.0);
    Ok(Rhythm {
        mean_synodic_period_days,
        shortest_synodic_period_days: shortest,
        longest_synodic_period_days: longest,
        orbits_per_synodic_period: mean_synodic_period_days / period_days,
        orbital_speed_km_s,
        orbital_speed_mi_s: orbital_speed_km_s / KM_PER_MILE,
        earth_orbital_speed_km_s: EARTH_SPEED_KM_S,
        earth_orbital_speed_mi_s: EARTH_SPEED_KM_S / KM_PER_MILE,
        eight_year_drift_days,
    })
}
