//! Magnitudes of the Moon and the Sun.

use super::{Illumination, Magnitude};
use crate::quantity::AU_KM;

/// Distance to which the law of the Moon refers.
const MOON_MEAN_DISTANCE_AU: f64 = 384_400.0 / AU_KM;
/// Beyond it the law is far too bright.
const MOON_LARGEST_PHASE_ANGLE_DEG: f64 = 150.0;

/// The Moon: C. W. Allen 1973, Astrophysical Quantities, 3rd ed., section 66, as several papers quote it.
///
/// Good to about 0.1 mag; no value beyond a phase angle of 150 degrees. Neither the surge within some degrees of full
/// Moon (up to 0.3 mag) nor eclipses are in the law.
pub fn moon(light: &Illumination) -> Magnitude {
    let i_deg = light.phase_angle_deg;
    if i_deg > MOON_LARGEST_PHASE_ANGLE_DEG {
        return Magnitude::Undefined;
    }
    let relative = light.distance_au / MOON_MEAN_DISTANCE_AU * light.sun_distance_au;
    Magnitude::Observed(-12.73 + 0.026 * i_deg + 4e-9 * i_deg.powi(4) + 5.0 * relative.log10())
}

/// Magnitude of the Sun at 1 au; published values lie within 0.02 of it.
const SUN_MAGNITUDE_AT_1_AU: f64 = -26.74;

/// The Sun, dimmed by the square of its distance.
pub fn sun(distance_au: f64) -> Magnitude {
    Magnitude::Observed(SUN_MAGNITUDE_AT_1_AU + 5.0 * distance_au.log10())
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_law_follows_allens_table() {
        // Allen 1973: magnitudes below the full Moon by phase angle; the law departs by 0.11 at most, near 140.
        for (phase_angle_deg, fainter) in [
            (10.0, 0.23),
            (30.0, 0.79),
            (60.0, 1.62),
            (90.0, 2.63),
            (120.0, 3.93),
            (140.0, 5.07),
            (150.0, 5.9),
        ] {
            let light = Illumination {
                sun_distance_au: 1.0,
                distance_au: MOON_MEAN_DISTANCE_AU,
                phase_angle_deg,
            };
            let difference = moon(&light).value_or_nan() + 12.73 - fainter;
            assert!(difference.abs() < 0.12, "{phase_angle_deg}: {difference}");
        }
    }

    #[test]
    fn a_thin_crescent_has_no_value() {
        let light = Illumination {
            sun_distance_au: 1.0,
            distance_au: 0.0026,
            phase_angle_deg: 151.0,
        };
        assert_eq!(moon(&light), Magnitude::Undefined);
    }

    #[test]
    fn the_sun_dims_with_distance() {
        assert_eq!(sun(1.0).value(), Some(-26.74));
        assert!((sun(10.0).value_or_nan() + 21.74).abs() < 1e-12);
    }
}
