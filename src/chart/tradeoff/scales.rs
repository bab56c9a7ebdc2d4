//! The four curves with their value scales.

use super::super::axis::round_values;

/// One curve with its scale; values in the unit of the labels.
#[derive(Debug, Clone)]
pub(super) struct Curve {
    pub(super) name: &'static str,
    pub(super) values: Vec<f64>,
    /// Value at the lower and the upper end of the strip; the lower is the larger one for magnitudes.
    pub(super) ends: (f64, f64),
    pub(super) ticks: Vec<(f64, String)>,
    /// Value at the chosen date.
    pub(super) chosen: Option<f64>,
    pub(super) reading: String,
    pub(super) remark: String,
}

impl Curve {
    /// Share of the strip's height at which a value stands.
    pub(super) fn share(&self, value: f64) -> f64 {
        ((value - self.ends.0) / (self.ends.1 - self.ends.0)).clamp(0.0, 1.0)
    }
}

/// The largest value of a column.
pub(super) fn largest(values: &[f64]) -> f64 {
    values.iter().copied().fold(f64::MIN_POSITIVE, f64::max)
}

/// Labels on one scale: three stand apart even in the lowest strip.
const MOST_TICKS: usize = 3;

/// A curve between two ends.
pub(super) fn curve(
    name: &'static str,
    values: Vec<f64>,
    ends: (f64, f64),
    label: impl Fn(f64, u8) -> String,
) -> Curve {
    let (ticks, decimals) = round_values(ends.0.min(ends.1), ends.0.max(ends.1), MOST_TICKS);
    let ticks = ticks
        .into_iter()
        .map(|value| (value, label(value, decimals)))
        .collect();
    Curve {
        name,
        values,
        ends,
        ticks,
        chosen: None,
        reading: String::new(),
        remark: String::new(),
    }
}

/// A curve whose scale begins at nothing, so that heights can be compared.
pub(super) fn from_zero(
    name: &'static str,
    values: Vec<f64>,
    label: impl Fn(f64, u8) -> String,
) -> Curve {
    let top = largest(&values) * 1.02;
    curve(name, values, (0.0, top), label)
}

/// The magnitude scale: brighter is up; never less than half a magnitude, so that small changes look small.
pub(super) fn brightness(
    name: &'static str,
    values: Vec<f64>,
    label: impl Fn(f64, u8) -> String,
) -> Curve {
    let known = || values.iter().copied().filter(|value| value.is_finite());
    let (brightest, faintest) = (
        known().fold(f64::INFINITY, f64::min),
        known().fold(f64::NEG_INFINITY, f64::max),
    );
    let ends = if brightest <= faintest {
        let middle = (brightest + faintest) / 2.0;
        let half = (faintest - brightest).max(0.5) / 2.0;
        (middle + 1.08 * half, middle - 1.02 * half)
    } else {
        (1.0, 0.0)
    };
    let mut curve = curve(name, values, ends, label);
    if brightest > faintest {
        curve.ticks.clear();
    }
    curve
}
