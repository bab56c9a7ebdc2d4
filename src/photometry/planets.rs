//! Magnitudes of the planets that need little but distance and phase.
//!
//! Source of all: A. Mallama and J. L. Hilton 2018, Astronomy and Computing 25, 10 (arXiv:1808.01973), with the limits
//! and coefficients of the authors' own program. The laws reproduce the authors' numbers to 0.001 mag; nature departs
//! from them by some hundredths, Mercury and Venus near conjunction by up to a tenth.

use super::{Illumination, Magnitude, polynomial};
use crate::quantity::sin_cos;

/// Mercury, eq. 2; observed at phase angles from 2 to 170 degrees.
pub fn mercury(light: &Illumination) -> Magnitude {
    const LAW: [f64; 7] = [
        -0.613,
        6.328_0e-2,
        -1.633_6e-3,
        3.364_4e-5,
        -3.426_5e-7,
        1.689_3e-9,
        -3.033_4e-12,
    ];
    let i_deg = light.phase_angle_deg;
    Magnitude::observed_if(
        (2.0..=170.0).contains(&i_deg),
        light.distance_magnitudes() + polynomial(&LAW, i_deg),
    )
}

/// From this phase angle on Venus follows the second branch; the step is 0.007 mag.
const VENUS_SEAM_DEG: f64 = 163.7;

/// Venus, eq. 3 and, for the thin crescent whose clouds scatter sunlight forward, eq. 4; observed from 2 to 179 degrees.
pub fn venus(light: &Illumination) -> Magnitude {
    let i_deg = light.phase_angle_deg;
    let law = if i_deg < VENUS_SEAM_DEG {
        polynomial(&[-4.384, -1.044e-3, 3.687e-4, -2.814e-6, 8.938e-9], i_deg)
    } else {
        polynomial(&[236.058_28, -2.819_14, 8.390_34e-3], i_deg)
    };
    Magnitude::observed_if(
        (2.0..=179.0).contains(&i_deg),
        light.distance_magnitudes() + law,
    )
}

/// Jupiter, eq. 8 up to a phase angle of 12 degrees (all views from the Earth) and eq. 9 up to 130.
pub fn jupiter(light: &Illumination) -> Magnitude {
    let i_deg = light.phase_angle_deg;
    let law = if i_deg <= 12.0 {
        polynomial(&[-9.395, -3.7e-4, 6.16e-4], i_deg)
    } else {
        let share = polynomial(&[1.0, -1.507, -0.363, -0.062, 2.809, -1.876], i_deg / 180.0);
        -9.428 - 2.5 * share.log10()
    };
    Magnitude::observed_if(i_deg <= 130.0, light.distance_magnitudes() + law)
}

/// Polar over equatorial radius of Uranus (24,973 over 25,559 km; B. A. Archinal et al. 2018, Celest. Mech. 130, 22).
const URANUS_AXIS_RATIO: f64 = 24_973.0 / 25_559.0;
/// North pole of Uranus, unit vector on ICRS axes (as the authors of the law take it).
pub(super) const URANUS_NORTH_POLE: [f64; 3] = [-0.211_999_58, -0.941_559_16, -0.261_768_09];

/// Above these phase angles the laws of Uranus and Neptune gain a term that steps by 0.02 mag.
///
/// The authors mean it for spacecraft and put the limits at 3.1 and 1.9 degrees, a little below the largest angles seen
/// from the Earth (3.19 and 1.95). Here they lie just above, so that no curve jumps around quadrature.
const URANUS_FROM_EARTH_DEG: f64 = 3.2;
const NEPTUNE_FROM_EARTH_DEG: f64 = 2.0;

/// Uranus, eq. 13 and 14, from the planetocentric latitudes under which Sun and observer stand; observed to 154 degrees.
pub fn uranus(
    light: &Illumination,
    sun_latitude_deg: f64,
    observer_latitude_deg: f64,
) -> Magnitude {
    let graphic_deg = |centric_deg: f64| {
        let (sin, cos) = sin_cos(centric_deg.to_radians());
        sin.atan2(URANUS_AXIS_RATIO.powi(2) * cos)
            .abs()
            .to_degrees()
    };
    let latitude_deg = 0.5 * (graphic_deg(sun_latitude_deg) + graphic_deg(observer_latitude_deg));
    let i_deg = light.phase_angle_deg;
    let phase = if i_deg > URANUS_FROM_EARTH_DEG {
        polynomial(&[0.0, 6.587e-3, 1.045e-4], i_deg)
    } else {
        0.0
    };
    let law = -7.110 - 8.4e-4 * latitude_deg + phase;
    Magnitude::observed_if(i_deg <= 154.0, light.distance_magnitudes() + law)
}

/// Neptune, eq. 16 and 17; `year` with its fraction. It brightened from 1980 to 2000 and is constant before and after.
///
/// The phase law for views from elsewhere was observed after 2000 only; before, there is no value.
pub fn neptune(light: &Illumination, year: f64) -> Magnitude {
    let brightening = (-6.89 - 0.005_4 * (year - 1980.0)).clamp(-7.0, -6.89);
    let i_deg = light.phase_angle_deg;
    let phase = if i_deg <= NEPTUNE_FROM_EARTH_DEG {
        0.0
    } else if year >= 2000.0 {
        polynomial(&[0.0, 7.944e-3, 9.617e-5], i_deg)
    } else {
        return Magnitude::Undefined;
    };
    Magnitude::Observed(light.distance_magnitudes() + brightening + phase)
}

#[cfg(test)]
mod tests {
    use super::*;

    fn at_unit_distance(phase_angle_deg: f64) -> Illumination {
        Illumination {
            sun_distance_au: 1.0,
            distance_au: 1.0,
            phase_angle_deg,
        }
    }

    fn step(law: impl Fn(&Illumination) -> Magnitude, seam_deg: f64) -> f64 {
        let side = |offset_deg: f64| law(&at_unit_distance(seam_deg + offset_deg)).value_or_nan();
        side(1e-9) - side(-1e-9)
    }

    #[test]
    fn seams_between_branches_are_as_small_as_the_paper_leaves_them() {
        assert!(
            (step(venus, VENUS_SEAM_DEG) - 0.007).abs() < 0.001,
            "{}",
            step(venus, VENUS_SEAM_DEG)
        );
        // A phase angle of 12 degrees is never seen from the Earth.
        assert!(step(jupiter, 12.0).abs() < 0.02, "{}", step(jupiter, 12.0));
        assert!(step(|light| uranus(light, 0.0, 0.0), URANUS_FROM_EARTH_DEG).abs() < 0.03);
        assert!(step(|light| neptune(light, 2010.0), NEPTUNE_FROM_EARTH_DEG).abs() < 0.02);
    }

    #[test]
    fn neptune_brightens_without_a_jump() {
        let at = |year: f64| neptune(&at_unit_distance(1.0), year).value_or_nan();
        assert_eq!(at(1950.0), -6.89);
        assert_eq!(at(2020.0), -7.0);
        assert!((at(1980.0 + 1e-6) - at(1980.0 - 1e-6)).abs() < 1e-6);
        assert_eq!(
            neptune(&at_unit_distance(5.0), 1990.0),
            Magnitude::Undefined
        );
    }

    #[test]
    fn values_outside_the_observed_range_say_so() {
        assert!(matches!(
            mercury(&at_unit_distance(90.0)),
            Magnitude::Observed(_)
        ));
        assert!(matches!(
            mercury(&at_unit_distance(175.0)),
            Magnitude::Extrapolated(_)
        ));
        assert!(matches!(
            venus(&at_unit_distance(1.0)),
            Magnitude::Extrapolated(_)
        ));
        assert!(matches!(
            jupiter(&at_unit_distance(147.0)),
            Magnitude::Extrapolated(_)
        ));
        assert!(matches!(
            uranus(&at_unit_distance(160.0), 0.0, 0.0),
            Magnitude::Extrapolated(_)
        ));
    }

    #[test]
    fn every_phase_angle_gives_a_finite_value_or_none() {
        for tenths in 0..=1800 {
            let light = at_unit_distance(f64::from(tenths) * 0.1);
            for magnitude in [
                mercury(&light),
                venus(&light),
                jupiter(&light),
                uranus(&light, 90.0, -90.0),
                neptune(&light, 1700.0),
            ] {
                assert!(
                    magnitude.value().is_none_or(f64::is_finite),
                    "{light:?} {magnitude:?}"
                );
            }
        }
    }
}
