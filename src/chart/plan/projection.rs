//! From au to the map: true to scale as long as the Earth's orbit stays readable, else long distances shortened.

use super::super::pen::Point;
use super::layout::Layout;
use super::model::PlanPaths;
use crate::quantity::hypotenuse;

/// Smallest share of the map's reach that the Earth's orbit may have.
const LEAST_EARTH_SHARE: f64 = 0.09;
/// The share that it gets where distances are shortened.
const SHORTENED_EARTH_SHARE: f64 = 0.13;

/// How far from the Sun a place is drawn. Directions from the Sun stay true.
#[derive(Debug, Clone, Copy)]
pub(super) struct Projection {
    farthest_au: f64,
    /// With x the distance as a share of the farthest, `(1 + k) x / (x + k)` of the reach is drawn; a shorter `k`
    /// shortens long distances more. None is true to scale.
    shortening: Option<f64>,
    nearest_au: f64,
    earth_au: f64,
}

impl Projection {
    pub(super) fn of(paths: &PlanPaths) -> Projection {
        let radius = |point: &[f64; 2]| hypotenuse(point[0], point[1]);
        let all = || paths.earth_au.iter().chain(&paths.planet_au).map(radius);
        let farthest_au = all().fold(f64::MIN_POSITIVE, f64::max);
        let nearest_au = all().fold(farthest_au, f64::min);
        let earth_au = paths
            .earth_au
            .iter()
            .map(radius)
            .fold(farthest_au, f64::min);
        let (earth, wanted) = (earth_au / farthest_au, SHORTENED_EARTH_SHARE);
        let shortening =
            (earth < LEAST_EARTH_SHARE).then(|| earth * (1.0 - wanted) / (wanted - earth));
        Projection {
            farthest_au,
            shortening,
            nearest_au,
            earth_au,
        }
    }

    pub(super) fn is_true(&self) -> bool {
        self.shortening.is_none()
    }

    fn share(&self, radius_au: f64) -> f64 {
        let share = radius_au / self.farthest_au;
        match self.shortening {
            None => share,
            Some(k) => (1.0 + k) * share / (share + k),
        }
    }

    pub(super) fn place(&self, [x, y]: [f64; 2], layout: &Layout) -> Point {
        let radius_au = hypotenuse(x, y);
        let scale = layout.reach * self.share(radius_au) / radius_au.max(f64::MIN_POSITIVE);
        (layout.centre.0 + scale * x, layout.centre.1 - scale * y)
    }

    /// Radii of Sun, Earth and planet in the picture, so that they keep apart.
    pub(super) fn bodies(&self, layout: &Layout) -> [f64; 3] {
        let drawn = |radius_au| self.share(radius_au) * layout.reach;
        [
            (0.36 * drawn(self.nearest_au)).min(11.0),
            (0.28 * drawn(self.earth_au)).min(8.0),
            (0.1 * layout.reach).clamp(9.0, 20.0),
        ]
    }
}
