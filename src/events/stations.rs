//! Where a planet turns among the stars.

use super::errors::{direction_deg, of_extremum_days};
use super::kind::Kind::{self, *};
use super::piece::{Piece, nothing};
use super::sky::{Moment, step_days};
use crate::body::Body;
use crate::quantity::wrap_half_turn_degrees;

pub(super) const KINDS: [Kind; 2] = [StationRetrograde, StationDirect];

pub(super) fn find(piece: &Piece<'_>) {
    for body in Body::PLANETS {
        if !piece.query().names(body) {
            continue;
        }
        let place = |moment: &Moment| unwrapped_right_ascension_deg(moment, body);
        if piece.query().wants(StationRetrograde) {
            for found in piece.maxima(step_days(body), 0.0, &place) {
                let error_days = of_extremum_days(&found, body, direction_deg(body));
                piece.record(StationRetrograde, body, found.days, error_days, &nothing);
            }
        }
        if piece.query().wants(StationDirect) {
            for found in piece.minima(step_days(body), 0.0, &place) {
                let error_days = of_extremum_days(&found, body, direction_deg(body));
                piece.record(StationDirect, body, found.days, error_days, &nothing);
            }
        }
    }
}

/// Right ascension counted on through its turns.
///
/// It stays within half a turn of the mean longitude around the Sun, for inner planets of the Sun's own, which runs
/// evenly: P. Bretagnon and G. Francou 1988 (VSOP87), A&A 202, 309, rounded.
fn unwrapped_right_ascension_deg(moment: &Moment, body: Body) -> f64 {
    let (at_j2000_deg, deg_per_day) = match body {
        Body::Mars => (355.43, 0.524_07),
        Body::Jupiter => (34.35, 0.083_13),
        Body::Saturn => (50.08, 0.033_50),
        Body::Uranus => (314.06, 0.011_77),
        Body::Neptune => (304.35, 0.006_02),
        _ => (280.47, 0.985_65),
    };
    let mean_deg = at_j2000_deg + deg_per_day * moment.earth().tt().days_since_j2000();
    mean_deg + wrap_half_turn_degrees(moment.right_ascension_deg(body) - mean_deg)
}
