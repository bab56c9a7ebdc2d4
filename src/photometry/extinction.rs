//! What the air takes away.

use crate::quantity::{power, sin};

/// Magnitudes lost straight up on an average clear night at a low site; 0.15 on a mountain, 0.4 in haze.
pub const DEFAULT_EXTINCTION_MAG_PER_AIRMASS: f64 = 0.25;

/// Air in the line of sight in units of that overhead, from an apparent altitude; none below the horizon.
///
/// F. Kasten and A. T. Young 1989, Applied Optics 28, 4735: 0.5 % down to the horizon. Below some 3 degrees real haze
/// decides, not a formula.
pub fn airmass(apparent_altitude_deg: f64) -> Option<f64> {
    (0.0..=90.0).contains(&apparent_altitude_deg).then(|| {
        let altitude_deg = apparent_altitude_deg;
        1.0 / (sin(altitude_deg.to_radians()) + 0.505_72 * power(altitude_deg + 6.079_95, -1.636_4))
    })
}

/// The magnitude after the air; none below the horizon.
pub fn dimmed_magnitude(
    magnitude: f64,
    apparent_altitude_deg: f64,
    extinction_mag_per_airmass: f64,
) -> Option<f64> {
    airmass(apparent_altitude_deg).map(|airmass| magnitude + extinction_mag_per_airmass * airmass)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn airmass_of_the_papers_table() {
        // Kasten and Young 1989, table II (values recomputed from the formula).
        for (altitude_deg, expected) in [
            (90.0, 1.0),
            (60.0, 1.154),
            (30.0, 1.994),
            (10.0, 5.586),
            (0.0, 37.92),
        ] {
            let computed = airmass(altitude_deg).unwrap_or(0.0);
            assert!(
                (computed - expected).abs() < 0.001 * expected,
                "{altitude_deg}: {computed}"
            );
        }
    }

    #[test]
    fn below_the_horizon_nothing_is_left() {
        assert_eq!(airmass(-0.1), None);
        assert_eq!(airmass(f64::NAN), None);
        assert_eq!(
            dimmed_magnitude(-4.0, -5.0, DEFAULT_EXTINCTION_MAG_PER_AIRMASS),
            None
        );
    }

    #[test]
    fn dimming_grows_towards_the_horizon() {
        let at =
            |altitude_deg| dimmed_magnitude(0.0, altitude_deg, DEFAULT_EXTINCTION_MAG_PER_AIRMASS);
        assert!((at(90.0).unwrap_or(0.0) - 0.25).abs() < 0.001);
        assert!(at(10.0) > at(30.0));
    }
}
