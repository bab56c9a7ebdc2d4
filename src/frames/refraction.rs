//! Lift of the stars by the air, at 1010 hPa and 10 degrees Celsius.
//!
//! Real refraction at the horizon scatters by several arcminutes; these are means.

use crate::quantity::sin_cos;

/// Refraction at an apparent (lifted) altitude, degrees.
///
/// G. G. Bennett 1982, Journal of Navigation 35, 255; good to 0.07 arcmin above the horizon. Below it the value at the
/// horizon holds, and it is never negative.
pub fn refraction_from_apparent_altitude_deg(apparent_altitude_deg: f64) -> f64 {
    let altitude_deg = apparent_altitude_deg.clamp(0.0, 90.0);
    let arcmin = cotangent(altitude_deg + 7.31 / (altitude_deg + 4.4));
    arcmin.max(0.0) / 60.0
}

/// The formula for true altitudes is used from here on upwards.
const LOWEST_TRUE_ALTITUDE_DEG: f64 = -1.0;
/// Further down nothing is seen; the lift fades to zero at this altitude so that no curve jumps.
const NO_LIFT_ALTITUDE_DEG: f64 = -5.0;

/// Refraction at a true (airless) altitude, degrees.
///
/// T. Saemundsson 1986, Sky & Telescope 72, 70; agrees with Bennett's formula to 0.1 arcmin. Below a true altitude of
/// -1 degree, where nothing is seen, it fades to zero at -5 degrees.
pub fn refraction_from_true_altitude_deg(true_altitude_deg: f64) -> f64 {
    let altitude_deg = true_altitude_deg.clamp(LOWEST_TRUE_ALTITUDE_DEG, 90.0);
    let arcmin = 1.02 * cotangent(altitude_deg + 10.3 / (altitude_deg + 5.11));
    let fade = (true_altitude_deg - NO_LIFT_ALTITUDE_DEG)
        / (LOWEST_TRUE_ALTITUDE_DEG - NO_LIFT_ALTITUDE_DEG);
    arcmin.max(0.0) / 60.0 * fade.clamp(0.0, 1.0)
}

fn cotangent(angle_deg: f64) -> f64 {
    let (sin, cos) = sin_cos(angle_deg.to_radians());
    cos / sin
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn published_example() {
        // Meeus, Astronomical Algorithms, ex. 16.a: apparent altitude 0.5 degrees lifts by 28.754', the true altitude
        // 33.246' by 24.618'.
        assert!((refraction_from_apparent_altitude_deg(0.5) * 60.0 - 28.754).abs() < 0.001);
        assert!((refraction_from_true_altitude_deg(33.246 / 60.0) * 60.0 - 24.618).abs() < 0.001);
    }

    #[test]
    fn lifted_altitude_rises_with_the_true_one() {
        let lifted = |true_deg: f64| true_deg + refraction_from_true_altitude_deg(true_deg);
        let mut altitude_deg = -90.0;
        while altitude_deg < 90.0 {
            assert!(
                lifted(altitude_deg + 0.01) > lifted(altitude_deg),
                "{altitude_deg}"
            );
            altitude_deg += 0.01;
        }
        assert_eq!(refraction_from_true_altitude_deg(-30.0), 0.0);
        assert_eq!(refraction_from_true_altitude_deg(90.0), 0.0);
    }

    #[test]
    fn both_formulas_agree_above_the_horizon() {
        for tenths in 5..890 {
            let true_deg = f64::from(tenths) * 0.1;
            let lift_deg = refraction_from_true_altitude_deg(true_deg);
            let back_deg = refraction_from_apparent_altitude_deg(true_deg + lift_deg);
            assert!(
                (lift_deg - back_deg).abs() * 60.0 < 0.15,
                "{true_deg}: {lift_deg} {back_deg}"
            );
        }
    }
}
