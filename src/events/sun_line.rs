//! Conjunctions with the Sun, oppositions, quadratures, and the phases of the Moon: angles from the Sun in ecliptic
//! longitude that are multiples of 90 degrees.

use super::errors::{between_deg, of_root_days};
use super::kind::Kind::{self, *};
use super::piece::{Piece, nothing};
use super::search::Found;
use super::sky::Moment;
use crate::body::Body;
use crate::quantity::wrap_half_turn_degrees;

pub(super) const KINDS: [Kind; 10] = [
    InferiorConjunction,
    SuperiorConjunction,
    Conjunction,
    Opposition,
    QuadratureEast,
    QuadratureWest,
    NewMoon,
    FirstQuarter,
    FullMoon,
    LastQuarter,
];

/// The planets' lines with the Sun are weeks apart; the Moon runs a quarter of its round in this time.
const STEP_DAYS: f64 = 8.0;

/// Kinds of the Moon and of the outer planets, and by how much the body is ahead of the Sun then.
const ANGLES: [(Kind, f64); 8] = [
    (NewMoon, 0.0),
    (FirstQuarter, 90.0),
    (FullMoon, 180.0),
    (LastQuarter, 270.0),
    (Conjunction, 0.0),
    (QuadratureEast, 90.0),
    (Opposition, 180.0),
    (QuadratureWest, 270.0),
];

pub(super) fn find(piece: &Piece<'_>) {
    for body in Body::ALL {
        if !piece.query().names(body) {
            continue;
        }
        for (kind, ahead_deg) in ANGLES {
            if kind.is_possible_for(body) && piece.query().wants(kind) {
                for found in lines(piece, body, ahead_deg, 0.0) {
                    record(piece, kind, body, &found);
                }
            }
        }
        let wanted = [InferiorConjunction, SuperiorConjunction]
            .iter()
            .any(|kind| piece.query().wants(*kind));
        if body.is_inner_planet() && wanted {
            for found in lines(piece, body, 0.0, 0.0) {
                let kind = if is_inferior(&piece.at(found.days), body) {
                    InferiorConjunction
                } else {
                    SuperiorConjunction
                };
                record(piece, kind, body, &found);
            }
        }
    }
}

/// Instants, days TT, at which a body is so many degrees ahead of the Sun, up to a margin before and after the piece.
pub(super) fn lines(piece: &Piece<'_>, body: Body, ahead_deg: f64, margin_days: f64) -> Vec<Found> {
    piece.roots(STEP_DAYS, margin_days, &|moment| {
        wrap_half_turn_degrees(moment.longitude_from_sun_deg(body) - ahead_deg)
    })
}

/// Whether the body stands nearer than the Sun.
pub(super) fn is_inferior(moment: &Moment, body: Body) -> bool {
    moment.seen(body).distance_au() < moment.seen(Body::Sun).distance_au()
}

fn record(piece: &Piece<'_>, kind: Kind, body: Body, found: &Found) {
    let error_days = of_root_days(found, between_deg(body, Body::Sun));
    piece.record(kind, body, found.days, error_days, &nothing);
}
