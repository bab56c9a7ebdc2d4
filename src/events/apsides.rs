//! Perihelion and aphelion.

use super::kind::Kind::{self, *};
use super::piece::Piece;
use super::search::{Found, Scan, maxima, minima};
use crate::body::Body;
use crate::quantity::norm;
use crate::series::{SeriesBody, heliocentric_position_au};
use crate::time::Tt;

pub(super) const KINDS: [Kind; 2] = [Perihelion, Aphelion];

/// The time that the series are fitted to, days TT: 1590 to 2310. Competing distances beyond it are not looked at.
const FITTED_DAYS: std::ops::RangeInclusive<f64> = -149_700.0..=113_200.0;
/// Samples on either side of an extremum among which a better one is looked for.
const SAMPLES: i32 = 128;
/// Distances that differ by less count as equal.
const EQUAL_AU: f64 = 1e-9;

pub(super) fn find(piece: &Piece<'_>) {
    for body in Body::PLANETS {
        if !piece.query().names(body) {
            continue;
        }
        let orbit = Orbit::of(body);
        let mut distance_au = |tt_days: f64| orbit.distance_au(tt_days);
        let scan: Scan = piece.scan_for(orbit.step_days);
        if piece.query().wants(Perihelion) {
            for found in minima(&scan, &mut distance_au) {
                record(piece, Perihelion, body, &orbit, &found);
            }
        }
        if piece.query().wants(Aphelion) {
            for found in maxima(&scan, &mut distance_au) {
                record(piece, Aphelion, body, &orbit, &found);
            }
        }
    }
}

fn record(piece: &Piece<'_>, kind: Kind, body: Body, orbit: &Orbit, found: &Found) {
    if !piece.contains(found.days) {
        return;
    }
    let sign = if kind == Perihelion { 1.0 } else { -1.0 };
    let is_secondary = (-SAMPLES..=SAMPLES).any(|index| {
        let days = found.days + f64::from(index) / f64::from(SAMPLES) * 0.25 * orbit.period_days;
        FITTED_DAYS.contains(&days) && sign * (orbit.distance_au(days) - found.value) < -EQUAL_AU
    });
    let error_days = orbit.error_au / orbit.error_changes_in_days / found.steepness.abs();
    piece.record(kind, body, found.days, error_days, &|_, event| {
        event.values.sun_distance_au = Some(found.value);
        event.values.is_secondary = is_secondary;
    });
}

/// A planet's orbit as far as its apsides need it.
struct Orbit {
    body: SeriesBody,
    period_days: f64,
    /// The giants are pulled about by each other over years, the inner planets hardly.
    step_days: f64,
    error_au: f64,
    error_changes_in_days: f64,
}

impl Orbit {
    /// Periods: P. Bretagnon and G. Francou 1988 (VSOP87), A&A 202, 309, rounded; errors: the series' own.
    fn of(body: Body) -> Self {
        let (body, period_days, step_days, error_au, error_changes_in_days) = match body {
            Body::Venus => (SeriesBody::Venus, 224.701, 8.0, 1.3e-6, 30.0),
            Body::Mars => (SeriesBody::Mars, 686.98, 16.0, 2.2e-6, 60.0),
            Body::Jupiter => (SeriesBody::Jupiter, 4_332.59, 32.0, 3e-5, 200.0),
            Body::Saturn => (SeriesBody::Saturn, 10_759.2, 32.0, 1e-4, 300.0),
            Body::Uranus => (SeriesBody::Uranus, 30_688.5, 32.0, 4e-4, 1000.0),
            Body::Neptune => (SeriesBody::Neptune, 60_182.0, 32.0, 9e-4, 1000.0),
            _ => (SeriesBody::Mercury, 87.969, 8.0, 2.2e-6, 14.0),
        };
        Self {
            body,
            period_days,
            step_days,
            error_au,
            error_changes_in_days,
        }
    }

    /// Geometric, at the instant itself.
    fn distance_au(&self, tt_days: f64) -> f64 {
        norm(heliocentric_position_au(
            self.body,
            Tt::from_days_since_j2000(tt_days),
        ))
    }
}
