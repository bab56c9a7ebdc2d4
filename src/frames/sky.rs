//! Angles on the sphere.

use crate::quantity::{angle_between_rad, cross, dot, hypotenuse, sin_cos, wrap_degrees};

/// Longitude and latitude of a direction on whatever axes it is given.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Spherical {
    /// From the x axis towards the y axis, 0 to 360.
    pub longitude_deg: f64,
    /// From the plane of x and y towards the z axis.
    pub latitude_deg: f64,
}

impl Spherical {
    /// The angles of a vector of any length.
    pub fn of(vector: [f64; 3]) -> Self {
        let [x, y, z] = vector;
        Self {
            longitude_deg: wrap_degrees(y.atan2(x).to_degrees()),
            latitude_deg: z.atan2(hypotenuse(x, y)).to_degrees(),
        }
    }

    /// The vector of length one in this direction.
    pub fn direction(self) -> [f64; 3] {
        let (sin_longitude, cos_longitude) = sin_cos(self.longitude_deg.to_radians());
        let (sin_latitude, cos_latitude) = sin_cos(self.latitude_deg.to_radians());
        [
            cos_latitude * cos_longitude,
            cos_latitude * sin_longitude,
            sin_latitude,
        ]
    }
}

/// Angle between two directions, 0 to 180.
pub fn separation_deg(a: [f64; 3], b: [f64; 3]) -> f64 {
    angle_between_rad(a, b).to_degrees()
}

/// Direction in which `other` lies seen from `from`: the angle from the z axis (north) through east, 0 to 360.
///
/// On axes of the equator this is the astronomers' position angle. Where `from` is a pole or both directions coincide
/// it has no meaning and is 0 or whatever rounding makes of it.
pub fn position_angle_deg(from: [f64; 3], other: [f64; 3]) -> f64 {
    // East and north at `from`, both scaled by the same length.
    let east = [-from[1], from[0], 0.0];
    let north = cross(from, east);
    let length = dot(from, from).sqrt();
    let toward_north = if length > 0.0 {
        dot(other, north) / length
    } else {
        0.0
    };
    wrap_degrees(dot(other, east).atan2(toward_north).to_degrees())
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn position_angle_counts_from_north_through_east() {
        let from = Spherical {
            longitude_deg: 40.0,
            latitude_deg: 50.0,
        };
        for (longitude_deg, latitude_deg, expected_deg) in [(40.0, 51.0, 0.0), (40.0, 49.0, 180.0)]
        {
            let other = Spherical {
                longitude_deg,
                latitude_deg,
            };
            let angle_deg = position_angle_deg(from.direction(), other.direction());
            assert!((angle_deg - expected_deg).abs() < 1e-9, "{angle_deg}");
        }
        let east = Spherical {
            longitude_deg: 40.001,
            latitude_deg: 50.0,
        };
        assert!((position_angle_deg(from.direction(), east.direction()) - 90.0).abs() < 0.01);
    }

    #[test]
    fn separation_of_a_published_pair() {
        // Meeus, Astronomical Algorithms, ex. 17.a (from memory): Arcturus 213.9154, +19.1825 and Spica 201.2983,
        // -11.1614: 32.7930 degrees apart.
        let arcturus = Spherical {
            longitude_deg: 213.9154,
            latitude_deg: 19.1825,
        };
        let spica = Spherical {
            longitude_deg: 201.2983,
            latitude_deg: -11.1614,
        };
        assert!((separation_deg(arcturus.direction(), spica.direction()) - 32.793).abs() < 1e-4);
    }

    #[test]
    fn angles_and_direction_are_inverse() {
        let angles = Spherical {
            longitude_deg: 321.0,
            latitude_deg: -77.0,
        };
        let again = Spherical::of(angles.direction());
        assert!(
            (again.longitude_deg - 321.0).abs() < 1e-12
                && (again.latitude_deg + 77.0).abs() < 1e-12
        );
    }
}
