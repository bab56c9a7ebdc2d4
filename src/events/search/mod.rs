//! One search for all events: walk along a function of time, then close in.
//!
//! The walk finds every extremum or root that its step separates; closing in follows Brent's methods, which always
//! end. A function may answer NaN where it has no value; nothing is found next to such a gap.

mod brent;

use brent::{closest_minimum, closest_root};

/// Where and how finely to look.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Scan {
    /// Start, days on whatever scale the function counts.
    pub from_days: f64,
    /// End.
    pub to_days: f64,
    /// Step of the walk: two events closer than two steps may be missed.
    pub step_days: f64,
    /// How closely an event is located. For minima of smooth functions the square root of the number precision is the
    /// limit: about 1e-8 of the width over which the function changes by its own size.
    pub tolerance_days: f64,
}

/// An event found.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Found {
    /// When.
    pub days: f64,
    /// The function's value there.
    pub value: f64,
    /// How sharply the event is defined, from the samples that enclosed it: at a root the slope per day, at a minimum
    /// or maximum the second derivative per day squared.
    pub steepness: f64,
}

/// The function at one instant.
#[derive(Debug, Clone, Copy)]
pub(super) struct Sample {
    pub(super) days: f64,
    pub(super) value: f64,
}

impl Sample {
    /// Compares with nothing.
    const NONE: Self = Self {
        days: f64::NAN,
        value: f64::NAN,
    };
}

/// No search walks more steps than this; a finer scan is coarsened, so that none runs without end.
const MAX_STEPS: f64 = 1_000_000.0;

impl Scan {
    /// Number of equal steps, none for a scan that is empty or not finite.
    fn steps(&self) -> Option<usize> {
        let count = (self.to_days - self.from_days) / self.step_days;
        let is_sound =
            self.from_days.is_finite() && self.step_days > 0.0 && count.is_finite() && count > 0.0;
        is_sound.then(|| count.ceil().min(MAX_STEPS) as usize)
    }

    fn instant(&self, index: usize, steps: usize) -> f64 {
        if index == steps {
            return self.to_days;
        }
        self.from_days + (self.to_days - self.from_days) * index as f64 / steps as f64
    }
}

/// Local minima inside a scan, in order of time. A minimum at an end of the scan does not count.
///
/// A minimum and a maximum that lie close together between two samples show as a slope that comes near zero and grows
/// again; there the walk looks a second time with a quarter of the step.
pub fn minima(scan: &Scan, function: &mut dyn FnMut(f64) -> f64) -> Vec<Found> {
    let mut found = Vec::new();
    walk_minima(scan, Look::Twice, function, &mut found);
    found
}

/// Whether a walk looks again where a minimum may hide.
#[derive(Clone, Copy, PartialEq)]
enum Look {
    Once,
    Twice,
}

fn walk_minima(
    scan: &Scan,
    look: Look,
    function: &mut dyn FnMut(f64) -> f64,
    found: &mut Vec<Found>,
) {
    let Some(steps) = scan.steps() else {
        return;
    };
    // The last samples; the one of three that is lowest in the middle brackets a minimum.
    let mut samples = [Sample::NONE; 4];
    for index in 0..=steps {
        let days = scan.instant(index, steps);
        let next = Sample {
            days,
            value: function(days),
        };
        // A flat bottom counts once, when it ends: until then the sample before it stays the left neighbour.
        if samples[3].value == next.value {
            samples[3] = next;
        } else {
            samples = [samples[1], samples[2], samples[3], next];
        }
        let [_, left, middle, right] = samples;
        if middle.value < left.value && middle.value < right.value {
            let minimum = closest_minimum(left, middle, right, scan.tolerance_days, function);
            push(found, minimum, scan);
        } else if look == Look::Twice && may_hide_a_pair(&samples) {
            let closer = Scan {
                from_days: samples[0].days,
                to_days: right.days,
                step_days: 0.25 * scan.step_days,
                tolerance_days: scan.tolerance_days,
            };
            walk_minima(&closer, Look::Once, function, found);
        }
    }
}

/// Whether the slope between the middle ones of four samples may pass zero twice: it is the smallest of three of one
/// sign, and so small that a parabola through them may dip below zero (it does by an eighth of their second difference
/// at most).
fn may_hide_a_pair(samples: &[Sample; 4]) -> bool {
    let [first, second, third, fourth] = samples.map(|sample| sample.value);
    let side = (third - second).signum();
    let [before, between, after] =
        [second - first, third - second, fourth - third].map(|difference| side * difference);
    between > 0.0
        && between <= before
        && between < after
        && 4.0 * between < before - 2.0 * between + after
}

/// Keeps an event unless it is the one found before, from a bracket that overlaps this one's.
fn push(found: &mut Vec<Found>, event: Found, scan: &Scan) {
    let is_known = found
        .last()
        .is_some_and(|last| (last.days - event.days).abs() < 0.01 * scan.step_days);
    if !is_known {
        found.push(event);
    }
}

/// Local maxima inside a scan, in order of time. A maximum at an end of the scan does not count.
pub fn maxima(scan: &Scan, function: &mut dyn FnMut(f64) -> f64) -> Vec<Found> {
    let mut found = minima(scan, &mut |days| -function(days));
    for event in &mut found {
        event.value = -event.value;
        event.steepness = -event.steepness;
    }
    found
}

/// Instants at which a function passes through zero inside a scan, in order of time.
///
/// A touch without a change of sign does not count, nor a zero at an end of the scan, nor a jump across zero larger
/// than `largest_jump`: such is the step of an angle from 180 to -180.
pub fn roots(scan: &Scan, largest_jump: f64, function: &mut dyn FnMut(f64) -> f64) -> Vec<Found> {
    let mut found = Vec::new();
    let Some(steps) = scan.steps() else {
        return found;
    };
    let mut last: Option<Sample> = None;
    for index in 0..=steps {
        let days = scan.instant(index, steps);
        let next = Sample {
            days,
            value: function(days),
        };
        if let Some(left) = last {
            let crosses =
                (left.value < 0.0 && next.value > 0.0) || (left.value > 0.0 && next.value < 0.0);
            if crosses && (next.value - left.value).abs() <= largest_jump {
                found.push(closest_root(left, next, scan.tolerance_days, function));
            }
        }
        // A sample of exactly zero lies between its neighbours, which have signs.
        if next.value != 0.0 {
            last = Some(next);
        }
    }
    found
}

/// The roots of [`roots`], and those that lie in pairs between two samples: where a sample comes near zero and the next
/// moves away again, the turning point between them is looked at.
pub(super) fn paired_roots(
    scan: &Scan,
    largest_jump: f64,
    function: &mut dyn FnMut(f64) -> f64,
) -> Vec<Found> {
    let mut found = roots(scan, largest_jump, function);
    let Some(steps) = scan.steps() else {
        return found;
    };
    let mut samples = [Sample::NONE; 3];
    for index in 0..=steps {
        let days = scan.instant(index, steps);
        samples = [
            samples[1],
            samples[2],
            Sample {
                days,
                value: function(days),
            },
        ];
        let side = samples[1].value.signum();
        let [left, middle, right] = samples.map(|sample| Sample {
            days: sample.days,
            value: side * sample.value,
        });
        // A parabola through three samples dips below the middle one by an eighth of their second difference at most.
        let may_dip = middle.value > 0.0
            && middle.value <= left.value
            && middle.value < right.value
            && 4.0 * middle.value < left.value - 2.0 * middle.value + right.value
            && left.value.max(right.value) - middle.value <= largest_jump;
        if !may_dip {
            continue;
        }
        let mut on_side = |days: f64| side * function(days);
        let dip = closest_minimum(left, middle, right, scan.tolerance_days, &mut on_side);
        if dip.value < 0.0 {
            let bottom = Sample {
                days: dip.days,
                value: dip.value,
            };
            for (from, to) in [(left, bottom), (bottom, right)] {
                insert(
                    &mut found,
                    closest_root(from, to, scan.tolerance_days, &mut on_side),
                );
            }
        }
    }
    found
}

fn insert(found: &mut Vec<Found>, new: Found) {
    let place = found.partition_point(|earlier| earlier.days <= new.days);
    found.insert(place, new);
}

#[cfg(test)]
mod tests;
