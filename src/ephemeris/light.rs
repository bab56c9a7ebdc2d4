//! What happens to light on its way: bending by the Sun and aberration.

use crate::quantity::{AU_KM, LIGHT_DAYS_PER_AU, add_scaled, cross, dot, norm, scaled, unit};

/// Twice the Sun's gravitational length, 2 GM / c^2, in au.
const TWICE_GRAVITATIONAL_LENGTH_AU: f64 = 1.974_125_743_36e-8;
/// Nominal solar radius (IAU 2015 resolution B3) in au.
pub(super) const SUN_RADIUS_AU: f64 = 695_700.0 / AU_KM;

/// The direction in which a body is seen once the Sun has bent its light: 1.75 arcsec at the limb.
///
/// `direction` is the unit vector from the Earth to the body, `from_sun` the body's and `earth` the Earth's
/// heliocentric position. Source: the first-order formula of general relativity as in S. A. Klioner 2003, AJ 125,
/// 1580. Light from behind the Sun's disc does not arrive; there the bending shrinks to zero at the centre so that
/// nothing jumps.
pub(super) fn bent(direction: [f64; 3], from_sun: [f64; 3], earth: [f64; 3]) -> [f64; 3] {
    let earth_distance_au = norm(earth);
    let sun_to_earth = scaled(1.0 / earth_distance_au, earth);
    let sun_to_body = unit(from_sun);
    // Zero where the Sun stands exactly between both; the cross product below is zero there too.
    let alignment = (1.0 + dot(sun_to_body, sun_to_earth)).max(1e-12);
    let mut strength = TWICE_GRAVITATIONAL_LENGTH_AU / earth_distance_au / alignment;
    let closest_au = earth_distance_au * norm(cross(direction, sun_to_earth));
    let is_beyond_the_sun = dot(sun_to_body, sun_to_earth) < 0.0;
    if is_beyond_the_sun && closest_au < SUN_RADIUS_AU {
        strength *= (closest_au / SUN_RADIUS_AU).powi(2);
    }
    unit(add_scaled(
        direction,
        strength,
        cross(direction, cross(sun_to_earth, sun_to_body)),
    ))
}

/// The direction as a moving observer sees it. `velocity` is in au per day.
///
/// Vector sum of light and motion; relativity would add 0.0005 arcsec.
pub(crate) fn aberrated(direction: [f64; 3], velocity_au_per_day: [f64; 3]) -> [f64; 3] {
    unit(add_scaled(
        direction,
        LIGHT_DAYS_PER_AU,
        velocity_au_per_day,
    ))
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::quantity::{ARCSEC_PER_RAD, angle_between_rad};

    /// A body beyond the Sun, seen from 1 au at an angle from the Sun's centre.
    fn bending_arcsec(elongation_rad: f64) -> f64 {
        let earth = [1.0, 0.0, 0.0];
        let direction = [-elongation_rad.cos(), elongation_rad.sin(), 0.0];
        let body = add_scaled(earth, 1000.0, direction);
        let seen = bent(direction, body, earth);
        // Positive when pushed away from the Sun.
        let pushed_rad = angle_between_rad(seen, [-1.0, 0.0, 0.0]) - elongation_rad;
        pushed_rad * ARCSEC_PER_RAD
    }

    #[test]
    fn bending_has_its_known_size() {
        // 1.75 arcsec at the limb, 0.0041 at 90 degrees, for a very distant source.
        assert!(
            (bending_arcsec(SUN_RADIUS_AU) - 1.75).abs() < 0.02,
            "{}",
            bending_arcsec(SUN_RADIUS_AU)
        );
        assert!((bending_arcsec(std::f64::consts::FRAC_PI_2) - 0.004_07).abs() < 1e-4);
    }

    #[test]
    fn bending_against_erfa() {
        // ERFA 2.0.1 through pyerfa 2.0.1.5, ldsun with p = q as in its own test, radians.
        let direction = unit([-0.763_276_255, -0.608_633_767, -0.216_735_543]);
        let to_earth = unit([-0.973_644_023, -0.209_254_23, -0.090_711_66]);
        let earth = scaled(0.999_809_214, to_earth);
        let seen = bent(direction, scaled(1e9, direction), earth);
        let expected = [
            -0.763_276_258_310_179_4,
            -0.608_633_763_715_260_1,
            -0.216_735_541_999_482_3,
        ];
        for axis in 0..3 {
            assert!((seen[axis] - expected[axis]).abs() < 1e-14, "{seen:?}");
        }
    }

    #[test]
    fn bending_is_continuous_at_the_limb_and_dies_at_the_centre() {
        let step =
            bending_arcsec(SUN_RADIUS_AU * 1.000_01) - bending_arcsec(SUN_RADIUS_AU * 0.999_99);
        assert!(step.abs() < 1e-3, "{step}");
        assert!(bending_arcsec(SUN_RADIUS_AU * 0.01).abs() < 0.02);
        let centre = bent([-1.0, 0.0, 0.0], [-1000.0, 0.0, 0.0], [1.0, 0.0, 0.0]);
        assert_eq!(centre, [-1.0, 0.0, 0.0]);
    }

    #[test]
    fn aberration_of_the_earths_speed() {
        // 30 km/s sideways: 20.6 arcsec.
        let seen = aberrated([1.0, 0.0, 0.0], [0.0, 30.0 * 86_400.0 / AU_KM, 0.0]);
        assert!((seen[1] * ARCSEC_PER_RAD - 20.64).abs() < 0.01);
    }
}
