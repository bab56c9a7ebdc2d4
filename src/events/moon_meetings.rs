//! The Moon beside a planet, and over it.

use super::errors::{between_deg, of_closest_days, of_root_days};
use super::event::Event;
use super::kind::Kind::{self, *};
use super::occultation::{is_possible, seen_from};
use super::piece::Piece;
use super::sky::Moment;
use crate::body::Body;
use crate::quantity::wrap_half_turn_degrees;

pub(super) const KINDS: [Kind; 3] = [MoonConjunction, MoonClosest, Occultation];

/// The Moon gains 130 degrees on a planet at most in this time.
const STEP_DAYS: f64 = 8.0;

pub(super) fn find(piece: &Piece<'_>) {
    for body in piece.planets_with_moon() {
        let add = |moment: &Moment, event: &mut Event| {
            event.other = Some(Body::Moon);
            event.values.separation_deg = Some(moment.separation_deg(body, Body::Moon));
            event.values.other_illuminated_fraction = Some(moment.illuminated_fraction(Body::Moon));
            event.values.is_other_waxing = Some(moment.seen(Body::Moon).is_waxing());
        };
        let error_deg = between_deg(body, Body::Moon);
        if piece.query().wants(MoonConjunction) {
            for found in piece.roots(STEP_DAYS, 0.0, &|moment| {
                wrap_half_turn_degrees(
                    moment.right_ascension_deg(Body::Moon) - moment.right_ascension_deg(body),
                )
            }) {
                let error_days = of_root_days(&found, error_deg);
                piece.record(MoonConjunction, body, found.days, error_days, &add);
            }
        }
        if !piece.query().wants(MoonClosest) && !piece.query().wants(Occultation) {
            continue;
        }
        for found in piece.minima(STEP_DAYS, 0.0, &|moment| {
            moment.separation_square_deg2(body, Body::Moon)
        }) {
            let error_days = of_closest_days(&found, error_deg);
            piece.record(MoonClosest, body, found.days, error_days, &add);
            if is_possible(&piece.at(found.days), body) {
                piece.record(
                    Occultation,
                    body,
                    found.days,
                    error_days,
                    &|moment, event| {
                        add(moment, event);
                        event.local = piece
                            .query()
                            .place
                            .map(|place| seen_from(&place, body, found.days));
                    },
                );
            }
        }
    }
}
