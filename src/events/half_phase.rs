//! Mercury and Venus half lit.

use super::errors::of_root_days;
use super::kind::Kind::{self, *};
use super::piece::{Piece, nothing};

pub(super) const KINDS: [Kind; 1] = [HalfPhase];

/// Seen from here the planets turn faster than they move: 99 of 100 angles are closer.
const PHASE_ANGLE_ERROR_DEG: f64 = 0.6 / 3600.0;

/// Half phases of Mercury are 36 days apart at least.
const STEP_DAYS: f64 = 8.0;

pub(super) fn find(piece: &Piece<'_>) {
    for body in piece.planets(HalfPhase) {
        for found in piece.roots(STEP_DAYS, 0.0, &|moment| {
            moment.seen(body).phase_angle_deg() - 90.0
        }) {
            let error_days = of_root_days(&found, PHASE_ANGLE_ERROR_DEG);
            piece.record(HalfPhase, body, found.days, error_days, &nothing);
        }
    }
}
