//! Nearest to the Earth, and the Moon farthest from it.

use super::errors::of_extremum_days;
use super::kind::Kind::{self, *};
use super::piece::{Piece, nothing};
use super::sky::{Moment, step_days};
use crate::body::Body;

pub(super) const KINDS: [Kind; 3] = [ClosestApproach, MoonPerigee, MoonApogee];

/// Relative error of the distance of a planet and of the Moon (7 km).
const PLANET_ERROR: f64 = 4e-6;
const MOON_ERROR: f64 = 1.8e-5;

pub(super) fn find(piece: &Piece<'_>) {
    for body in piece.planets(ClosestApproach) {
        for found in piece.minima(step_days(body), 0.0, &distance_of(body)) {
            let error_days = of_extremum_days(&found, body, PLANET_ERROR * found.value);
            piece.record(ClosestApproach, body, found.days, error_days, &nothing);
        }
    }
    if !piece.query().names(Body::Moon) {
        return;
    }
    if piece.query().wants(MoonPerigee) {
        for found in piece.minima(step_days(Body::Moon), 0.0, &distance_of(Body::Moon)) {
            let error_days = of_extremum_days(&found, Body::Moon, MOON_ERROR * found.value);
            piece.record(MoonPerigee, Body::Moon, found.days, error_days, &nothing);
        }
    }
    if piece.query().wants(MoonApogee) {
        for found in piece.maxima(step_days(Body::Moon), 0.0, &distance_of(Body::Moon)) {
            let error_days = of_extremum_days(&found, Body::Moon, MOON_ERROR * found.value);
            piece.record(MoonApogee, Body::Moon, found.days, error_days, &nothing);
        }
    }
}

fn distance_of(body: Body) -> impl Fn(&Moment) -> f64 {
    move |moment| moment.seen(body).distance_au()
}
