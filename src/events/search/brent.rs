//! Closing in on one minimum or root that a walk has enclosed.
//!
//! Source: R. P. Brent 1973, Algorithms for Minimization without Derivatives, ch. 4 (roots) and ch. 5 (minima), written
//! from the description of the methods.

use super::{Found, Sample};

/// Brent's methods need some tens of calls; this bound only guards against a function that contradicts itself.
const MAX_CALLS: usize = 200;

/// Brent's minimum between `left` and `right` around a lower middle sample.
pub(super) fn closest_minimum(
    left: Sample,
    middle: Sample,
    right: Sample,
    tolerance_days: f64,
    function: &mut dyn FnMut(f64) -> f64,
) -> Found {
    // The smaller part of the golden section.
    let golden = 0.5 * (3.0 - 5.0_f64.sqrt());
    let (mut low, mut high) = (left.days, right.days);
    // Best, second best and third best points: the samples that enclose the minimum serve the first parabola.
    let (mut best, mut second, mut third) = if left.value < right.value {
        (middle, left, right)
    } else {
        (middle, right, left)
    };
    let (mut step, mut step_before_last) = (high - low, high - low);
    for _ in 0..MAX_CALLS {
        let centre = 0.5 * (low + high);
        let tolerance = tolerance_days
            .abs()
            .max(4.0 * f64::EPSILON * best.days.abs());
        if (best.days - centre).abs() <= 2.0 * tolerance - 0.5 * (high - low) {
            break;
        }
        // Vertex of the parabola through the three points.
        let to_second = (best.days - second.days) * (best.value - third.value);
        let to_third = (best.days - third.days) * (best.value - second.value);
        let numerator = (best.days - third.days) * to_third - (best.days - second.days) * to_second;
        let denominator = 2.0 * (to_third - to_second);
        let parabola_step = if denominator == 0.0 {
            f64::NAN
        } else {
            -numerator / denominator
        };
        let candidate = best.days + parabola_step;
        let is_trusted = step_before_last.abs() > tolerance
            && parabola_step.abs() < 0.5 * step_before_last.abs()
            && candidate > low
            && candidate < high;
        step_before_last = step;
        if is_trusted {
            step = parabola_step;
            if candidate - low < 2.0 * tolerance || high - candidate < 2.0 * tolerance {
                step = tolerance.copysign(centre - best.days);
            }
        } else {
            step_before_last = if best.days < centre {
                high - best.days
            } else {
                low - best.days
            };
            step = golden * step_before_last;
        }
        let stride = if step.abs() >= tolerance {
            step
        } else {
            tolerance.copysign(step)
        };
        // The bounds matter only where days are so large that the tolerance exceeds the bracket.
        let days = (best.days + stride).max(low).min(high);
        let next = Sample {
            days,
            value: function(days),
        };
        if next.value <= best.value {
            if next.days < best.days {
                high = best.days
            } else {
                low = best.days
            }
            (third, second, best) = (second, best, next);
        } else {
            if next.days < best.days {
                low = next.days
            } else {
                high = next.days
            }
            if next.value <= second.value || second.days == best.days {
                (third, second) = (second, next);
            } else if next.value <= third.value
                || third.days == best.days
                || third.days == second.days
            {
                third = next;
            }
        }
    }
    Found {
        days: best.days,
        value: best.value,
        steepness: second_derivative(left, middle, right),
    }
}

/// Of the parabola through three samples.
fn second_derivative(left: Sample, middle: Sample, right: Sample) -> f64 {
    2.0 * (slope(middle, right) - slope(left, middle)) / (right.days - left.days)
}

fn slope(left: Sample, right: Sample) -> f64 {
    (right.value - left.value) / (right.days - left.days)
}

/// Brent's root between two samples of different sign.
pub(super) fn closest_root(
    left: Sample,
    right: Sample,
    tolerance_days: f64,
    function: &mut dyn FnMut(f64) -> f64,
) -> Found {
    let (mut opposite, mut best, mut previous) = (left, right, left);
    let (mut step, mut step_before) = (best.days - opposite.days, best.days - opposite.days);
    for _ in 0..MAX_CALLS {
        // `best` is nearest to zero, `opposite` on the other side of it.
        if opposite.value.abs() < best.value.abs() {
            (previous, best, opposite) = (best, opposite, best);
        }
        let tolerance = (0.5 * tolerance_days.abs()).max(2.0 * f64::EPSILON * best.days.abs());
        let half = 0.5 * (opposite.days - best.days);
        if half.abs() <= tolerance || best.value == 0.0 {
            break;
        }
        let ratio = best.value / previous.value;
        let (mut numerator, mut denominator) = if previous.days == opposite.days {
            (2.0 * half * ratio, 1.0 - ratio)
        } else {
            let (q, r) = (previous.value / opposite.value, best.value / opposite.value);
            (
                ratio * (2.0 * half * q * (q - r) - (best.days - previous.days) * (r - 1.0)),
                (q - 1.0) * (r - 1.0) * (ratio - 1.0),
            )
        };
        if numerator > 0.0 {
            denominator = -denominator
        } else {
            numerator = -numerator
        }
        let is_trusted = step_before.abs() >= tolerance
            && previous.value.abs() > best.value.abs()
            && 2.0 * numerator < (3.0 * half * denominator - (tolerance * denominator).abs())
            && numerator < (0.5 * step_before * denominator).abs();
        if is_trusted {
            (step_before, step) = (step, numerator / denominator);
        } else {
            (step_before, step) = (half, half);
        }
        previous = best;
        let stride = if step.abs() > tolerance {
            step
        } else {
            tolerance.copysign(half)
        };
        let days = (best.days + stride).max(left.days).min(right.days);
        best = Sample {
            days,
            value: function(days),
        };
        if !best.value.is_finite() {
            break;
        }
        if (best.value > 0.0) == (opposite.value > 0.0) {
            opposite = previous;
            (step_before, step) = (best.days - previous.days, best.days - previous.days);
        }
    }
    Found {
        days: best.days,
        value: best.value,
        steepness: slope(left, right),
    }
}
