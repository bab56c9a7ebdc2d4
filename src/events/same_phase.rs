//! When the Moon shows a planet's shape.

use super::errors::{direction_deg, of_root_days};
use super::kind::Kind::{self, *};
use super::piece::Piece;
use super::search::Found;
use crate::body::Body;
use crate::quantity::{hypotenuse, sin};

pub(super) const KINDS: [Kind; 1] = [SamePhase];

/// An eighth of a lunation; near full Moon two instants may lie closer, which the search for pairs finds.
const STEP_DAYS: f64 = 4.0;

pub(super) fn find(piece: &Piece<'_>) {
    for body in piece.planets_with_moon() {
        let found = piece.paired_roots(STEP_DAYS, &|moment| {
            moment.illuminated_fraction(Body::Moon) - moment.illuminated_fraction(body)
        });
        for found in found {
            let error_days =
                of_root_days(&with_true_slope(piece, &found), error(piece, body, &found));
            piece.record(SamePhase, body, found.days, error_days, &|moment, event| {
                event.other = Some(Body::Moon);
                let values = &mut event.values;
                values.separation_deg = Some(moment.separation_deg(body, Body::Moon));
                values.other_illuminated_fraction = Some(moment.illuminated_fraction(Body::Moon));
                values.is_waxing = Some(moment.seen(body).is_waxing());
                values.is_other_waxing = Some(moment.seen(Body::Moon).is_waxing());
            });
        }
    }
}

/// The rate of the Moon's lit fraction at the instant itself; between the samples it changes too much.
///
/// The lit fraction is half of one plus the cosine of the phase angle, whose cosine is that of the distance from full
/// Moon along the path, 12.2 degrees a day, times that of the Moon's ecliptic latitude.
fn with_true_slope(piece: &Piece<'_>, found: &Found) -> Found {
    let moment = piece.at(found.days);
    let sin_phase_angle = sin(moment.seen(Body::Moon).phase_angle_deg().to_radians());
    let sin_latitude = sin(moment.ecliptic_latitude_deg(Body::Moon).to_radians());
    let sin_along = (sin_phase_angle.powi(2) - sin_latitude.powi(2))
        .max(1e-6)
        .sqrt();
    Found {
        steepness: 0.5 * sin_along * 12.2_f64.to_radians(),
        ..*found
    }
}

fn error(piece: &Piece<'_>, body: Body, found: &Found) -> f64 {
    let moment = piece.at(found.days);
    let of = |body: Body| {
        let phase_angle_deg = moment.seen(body).phase_angle_deg();
        0.5 * sin(phase_angle_deg.to_radians()) * direction_deg(body).to_radians()
    };
    hypotenuse(of(Body::Moon), of(body))
}
