//! Size of the disc, its lit part, and how bright that is per area.

use crate::body::Body;
use crate::quantity::{ARCSEC_PER_RAD, AU_KM, angle_of_sine_rad, cos};

/// Equatorial radius of a body.
///
/// Planets and Moon: B. A. Archinal et al. 2018, Celest. Mech. Dyn. Astr. 130, 22 (IAU working group report for 2015);
/// Sun: nominal radius of IAU 2015 resolution B3.
pub const fn equatorial_radius_km(body: Body) -> f64 {
    match body {
        Body::Sun => 695_700.0,
        Body::Moon => 1_737.4,
        Body::Mercury => 2_440.53,
        Body::Venus => 6_051.8,
        Body::Mars => 3_396.19,
        Body::Jupiter => 71_492.0,
        Body::Saturn => 60_268.0,
        Body::Uranus => 25_559.0,
        Body::Neptune => 24_764.0,
    }
}

/// Lit share of the disc, 0 to 1: half of one plus the cosine of the phase angle.
pub fn illuminated_fraction(phase_angle_deg: f64) -> f64 {
    // The square of the cosine of the half angle keeps its digits near a new disc.
    cos((0.5 * phase_angle_deg).to_radians()).powi(2)
}

/// The disc of a body as seen from some distance.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Disc {
    /// Equatorial diameter.
    pub angular_diameter_arcsec: f64,
}

impl Disc {
    /// The disc of a body whose centre is so far away.
    pub fn of(body: Body, distance_au: f64) -> Self {
        let sine = equatorial_radius_km(body) / (distance_au * AU_KM);
        Self {
            angular_diameter_arcsec: 2.0 * angle_of_sine_rad(sine) * ARCSEC_PER_RAD,
        }
    }

    /// Lit area in the sky: the lit share of a circle of the equatorial diameter.
    ///
    /// Flattening is not allowed for (Saturn's disc is 10 % smaller, Jupiter's 6 %), nor are Saturn's rings.
    pub fn lit_area_arcsec2(&self, illuminated_fraction: f64) -> f64 {
        let radius_arcsec = 0.5 * self.angular_diameter_arcsec;
        illuminated_fraction * std::f64::consts::PI * radius_arcsec * radius_arcsec
    }
}

/// Mean surface brightness of an area that sends the light of a magnitude; none for an area of zero.
pub fn surface_brightness_mag_arcsec2(magnitude: f64, lit_area_arcsec2: f64) -> Option<f64> {
    let brightness = magnitude + 2.5 * lit_area_arcsec2.log10();
    brightness.is_finite().then_some(brightness)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn published_diameters_at_one_au() {
        // Semidiameters at unit distance, Explanatory Supplement to the Astronomical Almanac 1992 (from memory): Venus
        // 8.34", Jupiter 98.57". The Sun's 959.63" there belongs to an older radius; IAU 2015 gives 959.23".
        let semidiameter = |body| 0.5 * Disc::of(body, 1.0).angular_diameter_arcsec;
        assert!((semidiameter(Body::Venus) - 8.34).abs() < 0.01);
        assert!((semidiameter(Body::Jupiter) - 98.57).abs() < 0.01);
        assert!((semidiameter(Body::Sun) - 959.23).abs() < 0.01);
    }

    #[test]
    fn illuminated_fraction_of_a_published_example() {
        // Meeus, Astronomical Algorithms, ex. 41.a: Venus, r 0.724604, delta 0.910947, R 0.983824: k = 0.647.
        let (r, delta, earth) = (0.724_604_f64, 0.910_947_f64, 0.983_824_f64);
        let cos_phase = (r * r + delta * delta - earth * earth) / (2.0 * r * delta);
        assert!((illuminated_fraction(cos_phase.acos().to_degrees()) - 0.647).abs() < 5e-4);
        assert_eq!(illuminated_fraction(0.0), 1.0);
        assert!(illuminated_fraction(180.0) < 1e-30);
    }

    #[test]
    fn venus_at_greatest_extent_of_circular_orbits() {
        // E. Halley's problem: 38.8" and 26.58 % lit at 0.43036 au.
        let disc = Disc::of(Body::Venus, 0.430_36);
        assert!((disc.angular_diameter_arcsec - 38.8).abs() < 0.05);
        assert!(
            (disc.lit_area_arcsec2(0.265_8) - 314.0).abs() < 1.0,
            "{}",
            disc.lit_area_arcsec2(0.265_8)
        );
    }

    #[test]
    fn nothing_lit_has_no_surface_brightness() {
        assert_eq!(surface_brightness_mag_arcsec2(-4.0, 0.0), None);
        assert!(
            (surface_brightness_mag_arcsec2(-26.74, 2.89e6).unwrap_or(0.0) + 10.59).abs() < 0.01
        );
    }
}
