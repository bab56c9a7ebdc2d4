//! Two planets beside each other.

use super::errors::{between_deg, of_closest_days, of_root_days};
use super::event::Event;
use super::kind::Kind::{self, *};
use super::piece::Piece;
use super::sky::Moment;
use crate::body::Body;
use crate::quantity::wrap_half_turn_degrees;

pub(super) const KINDS: [Kind; 2] = [PlanetConjunction, PlanetClosest];

/// Wider pairs are no sight.
const CLOSE_DEG: f64 = 5.0;

/// Mercury passes another planet at one degree a day, or two, but near its stations it may come and go several times
/// within two weeks, as it may beside Venus, which runs nearly as fast.
fn pair_step_days(first: Body) -> f64 {
    match first {
        Body::Mercury => 2.0,
        _ => 8.0,
    }
}

pub(super) fn find(piece: &Piece<'_>) {
    for (index, first) in Body::PLANETS.into_iter().enumerate() {
        for second in Body::PLANETS.into_iter().skip(index + 1) {
            if piece.query().names(first) || piece.query().names(second) {
                find_pair(piece, first, second);
            }
        }
    }
}

fn find_pair(piece: &Piece<'_>, first: Body, second: Body) {
    let add = |moment: &Moment, event: &mut Event| {
        event.other = Some(second);
        event.values.separation_deg = Some(moment.separation_deg(first, second));
    };
    let error_deg = between_deg(first, second);
    if piece.query().wants(PlanetConjunction) {
        let found = piece.paired_roots(pair_step_days(first), &|moment| {
            wrap_half_turn_degrees(
                moment.right_ascension_deg(first) - moment.right_ascension_deg(second),
            )
        });
        for found in found {
            let error_days = of_root_days(&found, error_deg);
            piece.record(PlanetConjunction, first, found.days, error_days, &add);
        }
    }
    if piece.query().wants(PlanetClosest) {
        for found in piece.minima(pair_step_days(first), 0.0, &|moment| {
            moment.separation_square_deg2(first, second)
        }) {
            if found.value < CLOSE_DEG * CLOSE_DEG {
                let error_days = of_closest_days(&found, error_deg);
                piece.record(PlanetClosest, first, found.days, error_days, &add);
            }
        }
    }
}
