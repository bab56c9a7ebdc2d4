//! Saturn, whose rings send up to half of its light.

use super::{Illumination, Magnitude, polynomial};
use crate::ephemeris::Observation;
use crate::quantity::sin;

/// North pole of the ring plane, unit vector on ICRS axes (as the authors of the law take it).
pub const SATURN_NORTH_POLE: [f64; 3] = [0.085_478_83, 0.073_235_76, 0.993_644_75];

/// Largest ring opening that the law allows for.
const LARGEST_OPENING_DEG: f64 = 27.0;

/// How far Sun and Earth stand above the ring plane, north positive.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct SaturnLatitudes {
    /// Saturnicentric latitude of the Sun.
    pub sun_deg: f64,
    /// Saturnicentric latitude of the Earth.
    pub earth_deg: f64,
}

impl SaturnLatitudes {
    /// The latitudes that the arriving light shows.
    pub fn of(observation: &Observation) -> Self {
        let (earth_deg, sun_deg) = observation.earth_and_sun_latitude_deg(SATURN_NORTH_POLE);
        Self { sun_deg, earth_deg }
    }

    /// The law's one angle: the geometric mean, or 0 when the Earth sees the unlit face.
    fn effective_deg(&self) -> f64 {
        (self.sun_deg * self.earth_deg)
            .max(0.0)
            .sqrt()
            .min(LARGEST_OPENING_DEG)
    }
}

/// Phase angle up to which the rings' share was observed; from the Earth it never grows larger.
const LARGEST_PHASE_WITH_RINGS_DEG: f64 = 6.5;

/// Globe and rings, eq. 10 of Mallama and Hilton 2018; no value above a phase angle of 6.5 degrees.
pub fn saturn(light: &Illumination, latitudes: &SaturnLatitudes) -> Magnitude {
    let i_deg = light.phase_angle_deg;
    if i_deg > LARGEST_PHASE_WITH_RINGS_DEG {
        return Magnitude::Undefined;
    }
    let sin_opening = sin(latitudes.effective_deg().to_radians());
    let law =
        -8.914 - 1.825 * sin_opening + 0.026 * i_deg - 0.378 * sin_opening * (-2.25 * i_deg).exp();
    Magnitude::Observed(light.distance_magnitudes() + law)
}

/// The globe alone, eq. 11 and 12; observed to a phase angle of 150 degrees.
pub fn saturn_globe(light: &Illumination) -> Magnitude {
    let i_deg = light.phase_angle_deg;
    let law = if i_deg <= LARGEST_PHASE_WITH_RINGS_DEG {
        polynomial(&[-8.95, -3.7e-4, 6.16e-4], i_deg)
    } else {
        polynomial(&[-8.94, 2.446e-4, 2.672e-4, -1.506e-6, 4.767e-9], i_deg)
    };
    Magnitude::observed_if(i_deg <= 150.0, light.distance_magnitudes() + law)
}

#[cfg(test)]
mod tests {
    use super::*;

    const LIGHT: Illumination = Illumination {
        sun_distance_au: 9.5,
        distance_au: 9.0,
        phase_angle_deg: 3.0,
    };

    #[test]
    fn the_unlit_face_of_the_rings_adds_nothing() {
        let edge_on = saturn(
            &LIGHT,
            &SaturnLatitudes {
                sun_deg: 0.0,
                earth_deg: 5.0,
            },
        );
        let unlit = saturn(
            &LIGHT,
            &SaturnLatitudes {
                sun_deg: -1.0,
                earth_deg: 1.0,
            },
        );
        assert_eq!(edge_on, unlit);
    }

    #[test]
    fn open_rings_add_light_on_either_side() {
        let north = saturn(
            &LIGHT,
            &SaturnLatitudes {
                sun_deg: 26.0,
                earth_deg: 26.5,
            },
        )
        .value_or_nan();
        let south = saturn(
            &LIGHT,
            &SaturnLatitudes {
                sun_deg: -26.0,
                earth_deg: -26.5,
            },
        )
        .value_or_nan();
        let globe = saturn_globe(&LIGHT).value_or_nan();
        assert_eq!(north, south);
        assert!((0.6..1.0).contains(&(globe - north)), "{}", globe - north);
    }

    #[test]
    fn the_globes_branches_meet() {
        let at = |phase_angle_deg| {
            saturn_globe(&Illumination {
                phase_angle_deg,
                ..LIGHT
            })
            .value_or_nan()
        };
        assert!(
            (at(6.5 + 1e-9) - at(6.5)).abs() < 0.02,
            "{}",
            at(6.5 + 1e-9) - at(6.5)
        );
    }
}
