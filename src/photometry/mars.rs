//! Mars: distance and phase, its spotted turning globe, and its seasons.

use super::{Illumination, Magnitude, polynomial};
use crate::ephemeris::Observation;
use crate::frames::{Matrix, Spherical};
use crate::quantity::{LIGHT_DAYS_PER_AU, scaled, wrap_degrees, wrap_half_turn_degrees};
use crate::time::Tt;

/// Which side of Mars is seen and lit, and its season.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct MarsAspect {
    /// West longitude of the point under the Earth.
    pub sub_earth_longitude_deg: f64,
    /// West longitude of the point under the Sun.
    pub sub_solar_longitude_deg: f64,
    /// Heliocentric ecliptic longitude, equinox of J2000.0.
    pub heliocentric_longitude_deg: f64,
}

/// Whether the turning of the globe enters the magnitude.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum MarsRotation {
    /// As seen at the instant: the swing is up to 0.06 mag within a day.
    AtInstant,
    /// Averaged over a turn, for the question when Mars is brightest.
    Averaged,
}

/// Ecliptic longitude of the northern spring equinox of Mars.
const SPRING_LONGITUDE_DEG: f64 = 85.0;

// Thousandths of a magnitude every 10 degrees, from 0. Source: A. Mallama 2007, Icarus 192, 404, tables 6 and 8, as
// the law's authors use them.
const ROTATION_MILLIMAG: [i8; 36] = [
    36, 45, 38, 23, 15, 11, 0, -12, -18, -36, -44, -59, -60, -55, -43, -41, -41, -36, -36, -18,
    -38, -11, 2, 4, 18, 19, 35, 50, 35, 27, 37, 48, 25, 22, 24, 34,
];
const SEASON_MILLIMAG: [i8; 36] = [
    -29, -17, -14, -6, -18, -20, -14, -30, -8, -40, -24, -37, -36, -32, 10, 10, -1, 44, 25, -4,
    -16, -8, 29, -54, -33, 55, 17, 52, 6, 87, 6, 64, 30, 19, -30, -17,
];

/// Value between the entries of a cyclic table: the polynomial through five of them, from two before the one at or
/// below the angle to two after it. It passes through all entries, so nothing jumps; the authors' own scheme, which
/// gives their test values to 0.0005 mag where straight lines miss one by 0.0016.
fn table_magnitude(table: &[i8; 36], angle_deg: f64) -> f64 {
    let position = wrap_degrees(angle_deg) / 10.0;
    // 0 to 35, since the angle is below 360; NaN becomes 0.
    let index = position as usize % 36;
    let x = position - index as f64;
    let entry = |offset: usize| f64::from(table[(index + 34 + offset) % 36]);
    let [a, b, c, d, e] = [0, 1, 2, 3, 4].map(entry);
    // Central differences around the middle entry, as in Stirling's formula.
    let first = 0.5 * (d - b);
    let second = d - 2.0 * c + b;
    let third = 0.5 * (e - a) - (d - b);
    let fourth = e - 4.0 * d + 6.0 * c - 4.0 * b + a;
    let square = x * x;
    let value = c
        + x * first
        + square / 2.0 * second
        + x * (square - 1.0) / 6.0 * third
        + square * (square - 1.0) / 24.0 * fourth;
    value / 1000.0
}

/// Mars, eq. 6 and 7 of Mallama and Hilton 2018; observed to a phase angle of 120 degrees.
pub fn mars(light: &Illumination, aspect: &MarsAspect, rotation: MarsRotation) -> Magnitude {
    let i_deg = light.phase_angle_deg;
    let phase = if i_deg <= 50.0 {
        polynomial(&[-1.601, 0.022_67, -1.302e-4], i_deg)
    } else {
        polynomial(&[-0.367, -0.025_73, 3.445e-4], i_deg)
    };
    let turned = match rotation {
        MarsRotation::AtInstant => {
            // Middle of the shorter arc between both longitudes.
            let between_deg = wrap_half_turn_degrees(
                aspect.sub_solar_longitude_deg - aspect.sub_earth_longitude_deg,
            );
            table_magnitude(
                &ROTATION_MILLIMAG,
                aspect.sub_earth_longitude_deg + 0.5 * between_deg,
            )
        }
        MarsRotation::Averaged => 0.0,
    };
    let season = table_magnitude(
        &SEASON_MILLIMAG,
        aspect.heliocentric_longitude_deg - SPRING_LONGITUDE_DEG,
    );
    Magnitude::observed_if(
        i_deg <= 120.0,
        light.distance_magnitudes() + phase + turned + season,
    )
}

/// Obliquity of the ecliptic at J2000.0 (IAU 2006).
const OBLIQUITY_J2000_DEG: f64 = 84_381.406 / 3600.0;

/// Which side of Mars the arriving light shows.
///
/// Pole and prime meridian: B. A. Archinal et al. 2011 (IAU working group report for 2009), Celest. Mech. Dyn. Astr.
/// 109, 101: linear terms, good to 0.1 degree over the span, which changes the magnitude by less than 0.001.
pub fn mars_aspect(observation: &Observation, tt: Tt) -> MarsAspect {
    let emitted = tt.plus_days(-LIGHT_DAYS_PER_AU * observation.distance_au());
    let centuries = emitted.julian_centuries();
    let pole_right_ascension_deg = 317.681_43 - 0.106_1 * centuries;
    let pole_declination_deg = 52.886_50 - 0.060_9 * centuries;
    let prime_meridian_deg = 176.630 + (350.891_982_26 * emitted.days_since_j2000()) % 360.0;
    let fixed_to_globe = Matrix::about_z((90.0 + pole_right_ascension_deg).to_radians())
        .then(Matrix::about_x((90.0 - pole_declination_deg).to_radians()))
        .then(Matrix::about_z(prime_meridian_deg.to_radians()));
    let west_longitude_deg = |to_mars: [f64; 3]| {
        360.0 - Spherical::of(fixed_to_globe.apply(scaled(-1.0, to_mars))).longitude_deg
    };
    let ecliptic = Matrix::about_x(OBLIQUITY_J2000_DEG.to_radians()).apply(observation.from_sun_au);
    MarsAspect {
        sub_earth_longitude_deg: west_longitude_deg(observation.from_earth_au),
        sub_solar_longitude_deg: west_longitude_deg(observation.from_sun_au),
        heliocentric_longitude_deg: Spherical::of(ecliptic).longitude_deg,
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::body::Body;
    use crate::ephemeris::Earth;
    use crate::time::Utc;

    #[test]
    fn the_middle_longitude_takes_the_shorter_arc() {
        let light = Illumination {
            sun_distance_au: 1.5,
            distance_au: 1.0,
            phase_angle_deg: 20.0,
        };
        let at = |sub_earth_longitude_deg, sub_solar_longitude_deg| {
            let aspect = MarsAspect {
                sub_earth_longitude_deg,
                sub_solar_longitude_deg,
                heliocentric_longitude_deg: 85.0,
            };
            mars(&light, &aspect, MarsRotation::AtInstant).value_or_nan()
        };
        assert!((at(350.0, 10.0) - at(0.0, 0.0)).abs() < 1e-12);
        assert!((at(30.0, 350.0) - at(10.0, 10.0)).abs() < 1e-12);
        assert!((at(120.0, 120.0) - at(10.0, 10.0) + 0.105).abs() < 1e-12);
    }

    #[test]
    fn the_seam_at_fifty_degrees_is_small() {
        let aspect = MarsAspect {
            sub_earth_longitude_deg: 0.0,
            sub_solar_longitude_deg: 0.0,
            heliocentric_longitude_deg: 0.0,
        };
        let at = |phase_angle_deg| {
            let light = Illumination {
                sun_distance_au: 1.5,
                distance_au: 1.0,
                phase_angle_deg,
            };
            mars(&light, &aspect, MarsRotation::Averaged).value_or_nan()
        };
        assert!(
            (at(50.0 + 1e-9) - at(50.0)).abs() < 0.02,
            "{}",
            at(50.0 + 1e-9) - at(50.0)
        );
    }

    #[test]
    fn longitudes_of_the_laws_own_test_dates() {
        // Mallama and Hilton 2018, test data of their program: 2003-08-28 and 2004-07-19, 0h UT.
        for (date, sub_earth_deg, sub_solar_deg, heliocentric_deg) in [
            ("2003-08-28", 329.27, 330.76, 334.4996),
            ("2004-07-19", 76.84, 64.66, 147.3485),
        ] {
            let tt = Utc::parse(date).expect("a valid date").to_tt();
            let aspect = mars_aspect(&Observation::of(Body::Mars, &Earth::at(tt)), tt);
            assert!(
                (aspect.sub_earth_longitude_deg - sub_earth_deg).abs() < 0.3,
                "{date} {aspect:?}"
            );
            assert!(
                (aspect.sub_solar_longitude_deg - sub_solar_deg).abs() < 0.3,
                "{date} {aspect:?}"
            );
            assert!(
                (aspect.heliocentric_longitude_deg - heliocentric_deg).abs() < 0.06,
                "{date} {aspect:?}"
            );
        }
    }
}
