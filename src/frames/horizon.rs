//! From the equator of date to an observer's horizon.

use crate::quantity::{hypotenuse, sin_cos, wrap_degrees};

/// A direction seen from a place.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Horizontal {
    /// Above the horizon, without refraction.
    pub altitude_deg: f64,
    /// From north through east, 0 to 360.
    pub azimuth_deg: f64,
    /// Position angle of the zenith at the body, -180 to 180: positive west of the meridian. A position angle minus it
    /// is counted from the zenith, counter-clockwise as seen in the sky.
    pub parallactic_angle_deg: f64,
}

/// Horizontal coordinates of a direction given on the true equator and equinox of date.
pub(crate) fn horizontal(
    direction_of_date: [f64; 3],
    local_sidereal_time_rad: f64,
    latitude_rad: f64,
) -> Horizontal {
    let (sin_time, cos_time) = sin_cos(local_sidereal_time_rad);
    let (sin_latitude, cos_latitude) = sin_cos(latitude_rad);
    let [x, y, z] = direction_of_date;
    // Axes of the meridian: towards it along the equator, and west of it.
    let toward_meridian = x * cos_time + y * sin_time;
    let west = x * sin_time - y * cos_time;
    let north = z * cos_latitude - toward_meridian * sin_latitude;
    let up = z * sin_latitude + toward_meridian * cos_latitude;
    // The parallactic angle from the same components: tan q = cos(latitude) sin(H) / (sin(latitude) cos(declination)
    // - cos(latitude) sin(declination) cos(H)), both sides multiplied by cos(declination).
    let equatorial_square = x * x + y * y;
    let parallactic_rad = (cos_latitude * west)
        .atan2(sin_latitude * equatorial_square - cos_latitude * z * toward_meridian);
    Horizontal {
        altitude_deg: up.atan2(hypotenuse(north, west)).to_degrees(),
        azimuth_deg: wrap_degrees((-west).atan2(north).to_degrees()),
        parallactic_angle_deg: parallactic_rad.to_degrees(),
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn published_example() {
        // Meeus, Astronomical Algorithms, ex. 13.b (from memory): Venus from Washington, 1987 April 10, 19:21 UT:
        // hour angle 64.352133, declination -6.719892, latitude 38.921389: azimuth 68.0337 from south, altitude 15.1249.
        let (hour_angle_rad, declination_rad) =
            (64.352_133_f64.to_radians(), (-6.719_892_f64).to_radians());
        let direction = [
            declination_rad.cos() * hour_angle_rad.cos(),
            -declination_rad.cos() * hour_angle_rad.sin(),
            declination_rad.sin(),
        ];
        let seen = horizontal(direction, 0.0, 38.921_389_f64.to_radians());
        assert!((seen.azimuth_deg - 248.0337).abs() < 1e-4, "{seen:?}");
        assert!((seen.altitude_deg - 15.1249).abs() < 1e-4, "{seen:?}");
        // West of the meridian the zenith lies on the eastern side of the body's pole-ward direction.
        assert!(seen.parallactic_angle_deg > 0.0);
    }

    #[test]
    fn on_the_meridian_the_pole_is_straight_up_or_down() {
        let south = horizontal([1.0, 0.0, 0.0], 0.0, 0.8);
        assert!(
            south.parallactic_angle_deg.abs() < 1e-12 && (south.azimuth_deg - 180.0).abs() < 1e-12,
            "{south:?}"
        );
        let above_pole = horizontal([0.1, 0.0, 0.995], 0.0, 0.8);
        assert!(
            (above_pole.parallactic_angle_deg.abs() - 180.0).abs() < 1e-9,
            "{above_pole:?}"
        );
        assert!(above_pole.azimuth_deg.min(360.0 - above_pole.azimuth_deg) < 1e-9);
    }
}
