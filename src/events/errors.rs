//! How wrong the positions may be, and what that does to an instant.
//!
//! Sizes are those that 99 of 100 comparisons with the reference stay below, as `cargo widget accuracy` prints them.

use super::search::Found;
use crate::body::Body;
use crate::quantity::hypotenuse;

/// Error of an apparent direction.
pub(super) fn direction_deg(body: Body) -> f64 {
    let arcsec = match body {
        Body::Sun => 0.18,
        Body::Moon => 0.95,
        Body::Mercury => 0.35,
        Body::Venus | Body::Mars => 0.77,
        Body::Jupiter | Body::Saturn | Body::Uranus => 0.52,
        Body::Neptune => 0.4,
    };
    arcsec / 3600.0
}

/// Error of an angle between two bodies.
pub(super) fn between_deg(a: Body, b: Body) -> f64 {
    hypotenuse(direction_deg(a), direction_deg(b))
}

/// Error of a root, days: the error of the quantity over its slope.
pub(super) fn of_root_days(found: &Found, error: f64) -> f64 {
    error / found.steepness.abs()
}

/// Time in which the error of a body's place changes by its own size: neglected terms of its series have periods from
/// its month or year down to some of its fractions, which the factor 2 pi shortens.
fn changes_in_days(body: Body) -> f64 {
    match body {
        Body::Moon => 2.0,
        Body::Mercury => 8.0,
        Body::Sun | Body::Venus | Body::Mars => 20.0,
        Body::Jupiter | Body::Saturn | Body::Uranus | Body::Neptune => 100.0,
    }
}

/// Error of an extremum, days: a constant error moves nothing, a changing one shifts it by its rate over the curvature.
pub(super) fn of_extremum_days(found: &Found, body: Body, error: f64) -> f64 {
    error / changes_in_days(body) / found.steepness.abs()
}

/// Error of a least separation, days, from the square of the angle that was searched: the error along the track over
/// the speed, which is the root of half the curvature.
pub(super) fn of_closest_days(found: &Found, error_deg: f64) -> f64 {
    error_deg / (0.5 * found.steepness.abs()).sqrt()
}
