//! Sine and cosine together, for the angles of this library.
//!
//! The standard library's functions also serve angles of 1e300 and bring six kilobytes of reduction for them; here one
//! division by the quarter turn in two parts does, for sine and cosine at once.

use std::f64::consts::FRAC_2_PI;

/// A quarter turn, pi / 2, cut after 33 bits, so that its multiples up to 2^20 are exact.
const QUARTER: f64 = 1.570_796_326_734_125_6;
/// What the cut leaves.
const QUARTER_REST: f64 = 6.077_100_506_506_192e-11;

/// Coefficients of the Taylor series of (sin x - x) / x^3 and (cos x - 1) / x^2 in powers of x^2.
const SINE: [f64; 8] = taylor(2.0);
const COSINE: [f64; 8] = taylor(1.0);

/// -1 / (first (first + 1)), and from each coefficient to the next by the next two factors of the factorial.
const fn taylor(first: f64) -> [f64; 8] {
    let mut coefficients = [0.0; 8];
    let mut factor = first;
    let mut coefficient = 1.0;
    let mut index = 0;
    while index < coefficients.len() {
        coefficient /= -factor * (factor + 1.0);
        coefficients[index] = coefficient;
        factor += 2.0;
        index += 1;
    }
    coefficients
}

/// Sine and cosine, good to 3e-16 up to a million radians; less precise beyond, and NaN for what is not finite.
pub(crate) fn sin_cos(angle_rad: f64) -> (f64, f64) {
    let quarters = (angle_rad * FRAC_2_PI + 0.5).floor();
    let rest_rad = angle_rad - quarters * QUARTER - quarters * QUARTER_REST;
    let square = rest_rad * rest_rad;
    let sum = |coefficients: &[f64; 8]| {
        coefficients
            .iter()
            .rev()
            .fold(0.0, |sum, coefficient| sum * square + coefficient)
    };
    let sin = rest_rad + rest_rad * square * sum(&SINE);
    let cos = 1.0 + square * sum(&COSINE);
    match quarters as i64 & 3 {
        0 => (sin, cos),
        1 => (cos, -sin),
        2 => (-sin, -cos),
        _ => (-cos, sin),
    }
}

/// Sine; see [`sin_cos`].
pub(crate) fn sin(angle_rad: f64) -> f64 {
    sin_cos(angle_rad).0
}

/// Cosine; see [`sin_cos`].
pub(crate) fn cos(angle_rad: f64) -> f64 {
    sin_cos(angle_rad).1
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn agrees_with_the_standard_library() {
        // Steps that no simple fraction of a turn divides.
        for index in -50_000..50_000 {
            for step in [1e-5, 0.0317, 19.871] {
                let angle_rad = f64::from(index) * step;
                let (sin, cos) = sin_cos(angle_rad);
                let worst = (sin - angle_rad.sin())
                    .abs()
                    .max((cos - angle_rad.cos()).abs());
                assert!(worst < 3e-16, "{angle_rad}: {worst}");
            }
        }
    }

    #[test]
    fn small_angles_keep_their_digits() {
        for angle_rad in [1e-3, 1e-9, 1e-200, -4e-7] {
            assert!((sin(angle_rad) / angle_rad.sin() - 1.0).abs() < 3e-16);
        }
        assert_eq!(sin_cos(0.0), (0.0, 1.0));
    }

    #[test]
    fn no_angle_no_sine() {
        for angle_rad in [f64::NAN, f64::INFINITY, f64::NEG_INFINITY] {
            assert!(sin(angle_rad).is_nan() && cos(angle_rad).is_nan());
        }
    }
}
