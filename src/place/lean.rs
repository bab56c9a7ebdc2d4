//! How a body leans over the horizon: the angle between the celestial pole and the zenith, seen low in the sky.

use super::Place;
use crate::quantity::{angle_of_sine_rad, cos, sin, sin_cos};
use std::f64::consts::FRAC_PI_2;

/// Side of the sky.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum SkySide {
    /// Climbing, before the meridian.
    Rising,
    /// Sinking, after the meridian.
    Setting,
}

/// Altitude at which the lean is taken: two hand widths above the horizon, where a low planet is looked at.
const LOW_ALTITUDE_DEG: f64 = 10.0;

/// Position angle of the zenith (the parallactic angle), degrees, for a body that stands 10 degrees high.
///
/// Where the body never crosses that altitude, at the nearest point of its daily path, which is on the meridian.
/// Spherical triangle pole-zenith-body: `cos q = (sin phi - sin a sin delta) / (cos a cos delta)`.
pub fn lean_deg(place: &Place, declination_deg: f64, side: SkySide) -> f64 {
    let (sin_phi, cos_phi) = sin_cos(place.latitude_deg().to_radians());
    let (sin_delta, cos_delta) = sin_cos(declination_deg.to_radians());
    let (sin_a, _) = sin_cos(LOW_ALTITUDE_DEG.to_radians());
    // Hour angle at which the altitude is reached; held on the meridian where it never is.
    let cos_hour = (sin_a - sin_phi * sin_delta) / (cos_phi * cos_delta).max(1e-9);
    let hour = FRAC_PI_2 - angle_of_sine_rad(cos_hour.clamp(-1.0, 1.0));
    let hour = match side {
        SkySide::Rising => -hour,
        SkySide::Setting => hour,
    };
    // The two components of the direction to the zenith, along east and north on the sky.
    let east = cos_phi * sin(hour);
    let north = sin_phi * cos_delta - cos_phi * sin_delta * cos(hour);
    if east.abs() + north.abs() < 1e-12 {
        return 0.0;
    }
    east.atan2(north).to_degrees()
}

#[cfg(test)]
mod tests {
    use super::*;

    fn place(latitude_deg: f64) -> Place {
        Place::new(latitude_deg, 0.0, 0.0).expect("a valid latitude")
    }

    #[test]
    fn on_the_equator_a_setting_star_of_the_equator_leans_a_quarter_turn() {
        // The celestial equator passes overhead there, so the pole lies flat: north is to the right of a setting star.
        let lean = lean_deg(&place(0.0), 0.0, SkySide::Setting);
        assert!((lean - 90.0).abs() < 1e-9, "{lean}");
        assert!((lean_deg(&place(0.0), 0.0, SkySide::Rising) + 90.0).abs() < 1e-9);
    }

    #[test]
    fn it_agrees_with_the_spherical_triangle() {
        // cos q = (sin phi - sin a sin delta) / (cos a cos delta), worked for phi 50, delta -20, a 10.
        let (phi, delta, a) = (
            50_f64.to_radians(),
            (-20_f64).to_radians(),
            10_f64.to_radians(),
        );
        let q = ((phi.sin() - a.sin() * delta.sin()) / (a.cos() * delta.cos()))
            .acos()
            .to_degrees();
        assert!((lean_deg(&place(50.0), -20.0, SkySide::Setting) - q).abs() < 1e-9);
        assert!((lean_deg(&place(50.0), -20.0, SkySide::Rising) + q).abs() < 1e-9);
    }

    #[test]
    fn hemispheres_mirror_and_poles_are_finite() {
        let north = lean_deg(&place(40.0), 10.0, SkySide::Setting);
        let south = lean_deg(&place(-40.0), -10.0, SkySide::Setting);
        assert!((north + south - 180.0).abs() < 1e-9, "{north} and {south}");
        for latitude_deg in [-90.0, 90.0] {
            for declination_deg in [-90.0, -30.0, 0.0, 30.0, 90.0] {
                assert!(
                    lean_deg(&place(latitude_deg), declination_deg, SkySide::Rising).is_finite()
                );
            }
        }
    }
}
