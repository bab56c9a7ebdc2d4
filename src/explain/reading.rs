//! The facts that sentences and tables tell.

use crate::circumstances::{Circumstances, Series};
use crate::time::Utc;

/// One body at one instant, as far as the pictures tell it. NaN stands where there is no value.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Reading {
    /// The instant.
    pub utc: Utc,
    /// Lit share of the disc, 0 to 1; NaN for the Sun.
    pub illuminated_fraction: f64,
    /// Equatorial diameter.
    pub angular_diameter_arcsec: f64,
    /// Lit area in the sky.
    pub lit_area_arcsec2: f64,
    /// Visual magnitude outside the air; NaN where the published law has no value.
    pub magnitude: f64,
    /// Angle from the Sun; NaN for the Sun.
    pub elongation_deg: f64,
}

impl Reading {
    /// What `circumstances` says, at the instant it was asked for.
    pub fn new(utc: Utc, circumstances: &Circumstances) -> Reading {
        Reading {
            utc,
            illuminated_fraction: circumstances.illuminated_fraction.unwrap_or(f64::NAN),
            angular_diameter_arcsec: circumstances.angular_diameter_arcsec,
            lit_area_arcsec2: circumstances.lit_area_arcsec2,
            magnitude: circumstances.magnitude.unwrap_or(f64::NAN),
            elongation_deg: circumstances.elongation_deg.unwrap_or(f64::NAN),
        }
    }

    /// The sampled span read at an instant, straight between samples; `None` outside it.
    pub fn within(series: &Series, utc: Utc) -> Option<Reading> {
        let days = utc.days_since_j2000();
        let after = series
            .utc
            .partition_point(|sample| sample.days_since_j2000() < days);
        let before = after.saturating_sub(1);
        let (first, second) = (
            series.utc.get(before)?.days_since_j2000(),
            series.utc.get(after)?.days_since_j2000(),
        );
        if days < first {
            return None;
        }
        let share = if second > first {
            (days - first) / (second - first)
        } else {
            0.0
        };
        let at = |column: &[f64]| match (column.get(before), column.get(after)) {
            (Some(a), Some(b)) => a + share * (b - a),
            _ => f64::NAN,
        };
        Some(Reading {
            utc,
            illuminated_fraction: at(&series.illuminated_fraction),
            angular_diameter_arcsec: at(&series.angular_diameter_arcsec),
            lit_area_arcsec2: at(&series.lit_area_arcsec2),
            magnitude: at(&series.magnitude),
            elongation_deg: at(&series.elongation_deg),
        })
    }
}

/// A greatest brightness and how flat it is.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Peak {
    /// Instant of the smallest magnitude.
    pub utc: Utc,
    /// That magnitude.
    pub magnitude: f64,
    /// First instant within 0.1 mag of it.
    pub flat_from: Utc,
    /// Last instant within 0.1 mag of it.
    pub flat_to: Utc,
}

impl Peak {
    /// Whole days within 0.1 mag, at least one.
    pub fn flat_days(&self) -> f64 {
        (self.flat_to.days_since_j2000() - self.flat_from.days_since_j2000())
            .round()
            .max(1.0)
    }

    fn is_flat_at(&self, utc: Utc) -> bool {
        let days = utc.days_since_j2000();
        self.flat_from.days_since_j2000() <= days && days <= self.flat_to.days_since_j2000()
    }
}

/// A greatest lit area in the sky.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct GreatestExtent {
    /// The instant.
    pub utc: Utc,
    /// Lit area then.
    pub lit_area_arcsec2: f64,
}

/// The events of a span that the pictures mark.
#[derive(Debug, Clone, PartialEq, Default)]
pub struct Highlights {
    /// Greatest brightnesses.
    pub peaks: Vec<Peak>,
    /// Greatest lit areas.
    pub extents: Vec<GreatestExtent>,
}

impl Highlights {
    /// The peaks that deserve the name "brightest": those within 0.3 mag of the best, so that the two of one
    /// apparition of Venus count and the small rise at its far side does not.
    pub fn great_peaks(&self) -> impl Iterator<Item = &Peak> {
        let best = self
            .peaks
            .iter()
            .map(|peak| peak.magnitude)
            .fold(f64::INFINITY, f64::min);
        self.peaks
            .iter()
            .filter(move |peak| peak.magnitude <= best + 0.3)
    }

    /// The great peak to tell of at an instant: the one whose flat top holds it, else the nearest.
    pub fn peak_near(&self, utc: Utc) -> Option<&Peak> {
        let distance = |peak: &Peak| (peak.utc.days_since_j2000() - utc.days_since_j2000()).abs();
        self.flat_top_at(utc).or_else(|| {
            self.great_peaks()
                .min_by(|a, b| distance(a).total_cmp(&distance(b)))
        })
    }

    /// The great peak whose flat top holds an instant.
    pub(super) fn flat_top_at(&self, utc: Utc) -> Option<&Peak> {
        self.great_peaks().find(|peak| peak.is_flat_at(utc))
    }
}
