//! Greatest brightness and greatest illuminated extent: the best of each round, and lesser peaks marked so.

use super::errors::of_extremum_days;
use super::kind::Kind::{self, *};
use super::piece::Piece;
use super::search::Found;
use super::sky::{GRID_DAYS, step_days};
use super::sun_line::{is_inferior, lines};
use crate::body::Body;

pub(super) const KINDS: [Kind; 2] = [GreatestIlluminatedExtent, GreatestBrightness];

/// Venus brightens again as a thin crescent, near a phase angle of 170 degrees; the peak is sought below this.
const LARGEST_PHASE_ANGLE_DEG: f64 = 160.0;
/// Outer planets peak near opposition; elsewhere the seasons of Mars make small peaks of their own.
const LEAST_ELONGATION_DEG: f64 = 120.0;
/// Relative error of the lit area.
const AREA_ERROR: f64 = 1e-5;

pub(super) fn find(piece: &Piece<'_>) {
    for body in piece.planets(GreatestIlluminatedExtent) {
        let margin_days = longest_round_days(body);
        let peaks = piece.maxima(peak_step_days(body), margin_days, &|moment| {
            moment.lit_area_arcsec2(body)
        });
        let ends = lines(piece, body, 0.0, margin_days);
        record(
            piece,
            GreatestIlluminatedExtent,
            body,
            &peaks,
            &ends,
            &|better, than| better > than,
        );
    }
    for body in piece.planets(GreatestBrightness) {
        let margin_days = longest_round_days(body);
        let mut peaks = piece.minima(peak_step_days(body), margin_days, &|moment| {
            moment.magnitude(body)
        });
        peaks.retain(|peak| {
            let moment = piece.at(peak.days);
            if body.is_inner_planet() {
                moment.seen(body).phase_angle_deg() < LARGEST_PHASE_ANGLE_DEG
            } else {
                moment.elongation_deg(body) > LEAST_ELONGATION_DEG
            }
        });
        let mut ends = lines(piece, body, 0.0, margin_days);
        if body == Body::Mercury {
            ends.retain(|end| is_inferior(&piece.at(end.days), body));
        }
        record(
            piece,
            GreatestBrightness,
            body,
            &peaks,
            &ends,
            &|better, than| better < than,
        );
    }
}

/// Error of the magnitude that the positions leave; that of the law itself moves the peak by more.
fn magnitude_error(body: Body) -> f64 {
    match body {
        Body::Mercury => 4e-5,
        Body::Venus | Body::Mars => 2e-5,
        _ => 6e-5,
    }
}

/// Mercury's lesser peaks are shallow.
fn peak_step_days(body: Body) -> f64 {
    match body {
        Body::Mercury => GRID_DAYS,
        _ => step_days(body),
    }
}

/// Longest time between two conjunctions that end a round.
fn longest_round_days(body: Body) -> f64 {
    match body {
        Body::Mercury => 135.0,
        Body::Venus => 305.0,
        Body::Mars => 815.0,
        Body::Jupiter => 410.0,
        _ => 390.0,
    }
}

/// Records the peaks; one that another between the same two ends beats is secondary.
fn record(
    piece: &Piece<'_>,
    kind: Kind,
    body: Body,
    peaks: &[Found],
    ends: &[Found],
    is_better: &dyn Fn(f64, f64) -> bool,
) {
    let round_of = |peak: &Found| ends.partition_point(|end| end.days <= peak.days);
    for peak in peaks {
        let round = round_of(peak);
        let is_secondary = peaks
            .iter()
            .any(|other| round_of(other) == round && is_better(other.value, peak.value));
        let error = if kind == GreatestBrightness {
            magnitude_error(body)
        } else {
            AREA_ERROR * peak.value
        };
        let error_days = of_extremum_days(peak, body, error);
        piece.record(kind, body, peak.days, error_days, &|_, event| {
            event.values.is_secondary = is_secondary;
        });
    }
}
