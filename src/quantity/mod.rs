//! Units, constants of nature and the small vector algebra that the other modules share.
//!
//! Numbers are plain `f64`; the name of each says its unit. Vectors are `[f64; 3]` on the axes that the name says.

mod trigonometry;

pub(crate) use trigonometry::{cos, sin, sin_cos};

/// Astronomical unit in kilometres (IAU 2012, resolution B2; exact).
pub const AU_KM: f64 = 149_597_870.7;
/// Speed of light in kilometres per second (exact).
pub const LIGHT_SPEED_KM_S: f64 = 299_792.458;
/// SI seconds in a day.
pub const SECONDS_PER_DAY: f64 = 86_400.0;
/// Days that light takes for one astronomical unit.
pub const LIGHT_DAYS_PER_AU: f64 = AU_KM / LIGHT_SPEED_KM_S / SECONDS_PER_DAY;
/// Kilometres per second in one astronomical unit per day.
pub const KM_S_PER_AU_DAY: f64 = AU_KM / SECONDS_PER_DAY;
/// Arcseconds in one radian.
pub const ARCSEC_PER_RAD: f64 = 648_000.0 / std::f64::consts::PI;
/// Days in a Julian year.
pub const DAYS_PER_JULIAN_YEAR: f64 = 365.25;
/// Days in a Julian century.
pub const DAYS_PER_JULIAN_CENTURY: f64 = 36_525.0;

/// The same direction in degrees from 0 up to, but not including, 360.
pub fn wrap_degrees(angle_deg: f64) -> f64 {
    wrap(angle_deg, 360.0)
}

/// The remainder from 0 up to, but not including, `period`.
///
/// `rem_euclid` and `%` divide bit by bit and bring more code than all angles need; this loses one rounding.
pub(crate) fn wrap(value: f64, period: f64) -> f64 {
    let wrapped = value - period * (value / period).floor();
    // Next to a multiple of the period the quotient may round across it.
    if (0.0..period).contains(&wrapped) || wrapped.is_nan() {
        wrapped
    } else {
        0.0
    }
}

/// A positive base to any power, good to 14 digits; `powf` would bring a table of its own.
pub(crate) fn power(base: f64, exponent: f64) -> f64 {
    (exponent * std::f64::consts::LN_10 * base.log10()).exp()
}

/// Angle of a sine, -pi/2 to pi/2; a sine that rounding has put outside -1 to 1 is held there.
pub(crate) fn angle_of_sine_rad(sine: f64) -> f64 {
    sine.atan2((1.0 - sine * sine).max(0.0).sqrt())
}

/// Length of the hypotenuse, for lengths far from overflow.
pub(crate) fn hypotenuse(a: f64, b: f64) -> f64 {
    (a * a + b * b).sqrt()
}

/// The same direction in degrees from -180 up to, but not including, 180.
pub fn wrap_half_turn_degrees(angle_deg: f64) -> f64 {
    wrap_degrees(angle_deg + 180.0) - 180.0
}

/// Scalar product.
pub(crate) fn dot(a: [f64; 3], b: [f64; 3]) -> f64 {
    a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
}

/// Vector product.
pub(crate) fn cross(a: [f64; 3], b: [f64; 3]) -> [f64; 3] {
    [
        a[1] * b[2] - a[2] * b[1],
        a[2] * b[0] - a[0] * b[2],
        a[0] * b[1] - a[1] * b[0],
    ]
}

/// Length.
pub(crate) fn norm(a: [f64; 3]) -> f64 {
    dot(a, a).sqrt()
}

/// `a + factor * b`.
pub(crate) fn add_scaled(a: [f64; 3], factor: f64, b: [f64; 3]) -> [f64; 3] {
    [
        a[0] + factor * b[0],
        a[1] + factor * b[1],
        a[2] + factor * b[2],
    ]
}

/// `factor * a`.
pub(crate) fn scaled(factor: f64, a: [f64; 3]) -> [f64; 3] {
    [factor * a[0], factor * a[1], factor * a[2]]
}

/// The vector of length one along `a`; the null vector stays null.
pub(crate) fn unit(a: [f64; 3]) -> [f64; 3] {
    let length = norm(a);
    if length > 0.0 {
        scaled(1.0 / length, a)
    } else {
        a
    }
}

/// Angle between two vectors, 0 to pi, exact to rounding also near 0 and pi.
///
/// The arc cosine of the scalar product loses half of the digits there; the arc tangent of both products does not.
pub(crate) fn angle_between_rad(a: [f64; 3], b: [f64; 3]) -> f64 {
    norm(cross(a, b)).atan2(dot(a, b))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn wraps_into_the_stated_ranges() {
        assert_eq!(wrap_degrees(-1e-20), 0.0);
        assert_eq!(wrap_degrees(725.0), 5.0);
        assert_eq!(wrap_half_turn_degrees(180.0), -180.0);
        assert_eq!(wrap_half_turn_degrees(-190.0), 170.0);
    }

    #[test]
    fn angle_keeps_its_digits_near_zero_and_half_a_turn() {
        let tiny_rad = 1e-10;
        let close = angle_between_rad([1.0, 0.0, 0.0], [1.0, tiny_rad, 0.0]);
        assert!((close - tiny_rad).abs() < 1e-24, "{close}");
        let opposite = angle_between_rad([1.0, 0.0, 0.0], [-1.0, tiny_rad, 0.0]);
        assert!(
            (std::f64::consts::PI - opposite - tiny_rad).abs() < 1e-15,
            "{opposite}"
        );
    }

    #[test]
    fn light_needs_499_seconds_for_one_au() {
        // 499.004784 s, from the two exact constants (IAU 2012 B2 and the SI metre).
        assert!((LIGHT_DAYS_PER_AU * SECONDS_PER_DAY - 499.004_783_836).abs() < 1e-8);
    }

    #[test]
    fn unit_of_the_null_vector_is_null() {
        assert_eq!(unit([0.0; 3]), [0.0; 3]);
    }
}
