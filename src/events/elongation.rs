//! Greatest elongations of Mercury and Venus.

use super::errors::{between_deg, of_extremum_days};
use super::kind::Kind::{self, *};
use super::piece::{Piece, nothing};
use super::sky::step_days;
use crate::body::Body;

pub(super) const KINDS: [Kind; 2] = [GreatestElongationEast, GreatestElongationWest];

pub(super) fn find(piece: &Piece<'_>) {
    for body in Body::PLANETS {
        if !body.is_inner_planet() || !piece.query().names(body) {
            continue;
        }
        for found in piece.maxima(step_days(body), 0.0, &|moment| moment.elongation_deg(body)) {
            let kind = if piece.at(found.days).longitude_from_sun_deg(body) > 0.0 {
                GreatestElongationEast
            } else {
                GreatestElongationWest
            };
            let error_days = of_extremum_days(&found, body, between_deg(body, Body::Sun));
            piece.record(kind, body, found.days, error_days, &nothing);
        }
    }
}
