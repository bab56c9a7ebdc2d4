//! One search for all events: walk along a function of time, then close in.
//!
//! The walk finds every extremum or root that its step separates; closing in follows Brent's methods, which always
//! end. A function may answer NaN where it has no value; nothing is found next to such a gap.

use super::brent::{closest_minimum, closest_root};

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
pub fn minima(scan: &Scan, function: &mut dyn FnMut(f64) -> f64) -> Vec<Found> {
    let mut found = Vec::new();
    let Some(steps) = scan.steps() else {
        return found;
    };
    // The last two samples; the middle one of three that is lowest brackets a minimum.
    let mut before: Option<Found> = None;
    let mut last: Option<Found> = None;
    for index in 0..=steps {
        let days = scan.instant(index, steps);
        let next = Found {
            days,
            value: function(days),
        };
        if let (Some(left), Some(middle)) = (before, last)
            && middle.value < left.value
            && middle.value < next.value
        {
            found.push(closest_minimum(
                left.days,
                middle,
                next.days,
                scan.tolerance_days,
                function,
            ));
        }
        // A flat bottom counts once, when it ends: until then the sample before it stays the left neighbour.
        let is_flat = last.is_some_and(|middle| middle.value == next.value);
        if !is_flat {
            before = last;
        }
        last = Some(next);
    }
    found
}

/// Local maxima inside a scan, in order of time. A maximum at an end of the scan does not count.
pub fn maxima(scan: &Scan, function: &mut dyn FnMut(f64) -> f64) -> Vec<Found> {
    let mut found = minima(scan, &mut |days| -function(days));
    for event in &mut found {
        event.value = -event.value;
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
    let mut last: Option<Found> = None;
    for index in 0..=steps {
        let days = scan.instant(index, steps);
        let next = Found {
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

#[cfg(test)]
mod tests {
    use super::*;

    const SCAN: Scan = Scan {
        from_days: 0.0,
        to_days: 100.0,
        step_days: 1.0,
        tolerance_days: 1e-7,
    };

    #[test]
    fn all_minima_and_maxima_of_a_wave() {
        let mut calls = 0;
        let found = minima(&SCAN, &mut |days| {
            calls += 1;
            (days * 0.5).cos()
        });
        assert_eq!(found.len(), 8);
        for (index, event) in found.iter().enumerate() {
            let expected = std::f64::consts::TAU * (1.0 + 2.0 * index as f64);
            assert!((event.days - expected).abs() < 1e-6, "{event:?} {expected}");
            assert!((event.value + 1.0).abs() < 1e-12);
        }
        // 101 samples and a handful of calls for each minimum.
        assert!(calls < 101 + 8 * 20, "{calls}");
        let tops = maxima(&SCAN, &mut |days| (days * 0.5).cos());
        assert_eq!(tops.len(), 7);
        assert!(
            (tops[0].days - 2.0 * std::f64::consts::TAU).abs() < 1e-6 && tops[0].value > 0.999_999
        );
    }

    #[test]
    fn a_corner_and_a_flat_bottom() {
        let corner = minima(&SCAN, &mut |days| (days - 41.3).abs());
        assert!((corner[0].days - 41.3).abs() < 1e-6, "{corner:?}");
        // The quartic's bottom is flat: the value, not the instant, is exact.
        let flat = minima(&SCAN, &mut |days| (days - 41.3).powi(4) - 5.0);
        assert_eq!(flat.len(), 1);
        assert!(
            (flat[0].days - 41.3).abs() < 0.01 && (flat[0].value + 5.0).abs() < 1e-8,
            "{flat:?}"
        );
        let plateau = minima(&SCAN, &mut |days| ((days - 50.0).abs() - 10.0).max(0.0));
        assert_eq!(plateau.len(), 1);
        assert_eq!(plateau[0].value, 0.0);
    }

    #[test]
    fn two_samples_astride_the_bottom() {
        let found = minima(&SCAN, &mut |days| (days - 41.5).powi(2));
        assert_eq!(found.len(), 1);
        assert!((found[0].days - 41.5).abs() < 1e-6);
    }

    #[test]
    fn ends_and_constants_hold_no_minimum() {
        assert!(minima(&SCAN, &mut |days| days).is_empty());
        assert!(minima(&SCAN, &mut |days| -days).is_empty());
        assert!(minima(&SCAN, &mut |_| 3.0).is_empty());
    }

    #[test]
    fn roots_of_a_wave_and_of_a_cubic() {
        let found = roots(&SCAN, f64::INFINITY, &mut |days| (days * 0.5).sin());
        assert_eq!(found.len(), 15);
        for (index, event) in found.iter().enumerate() {
            let expected = std::f64::consts::TAU * (1.0 + index as f64);
            assert!((event.days - expected).abs() < 1e-6, "{event:?} {expected}");
        }
        let mut calls = 0;
        let cubic = roots(&SCAN, f64::INFINITY, &mut |days| {
            calls += 1;
            (days - 33.3).powi(3)
        });
        assert_eq!(cubic.len(), 1);
        assert!((cubic[0].days - 33.3).abs() < 1e-4, "{cubic:?}");
        assert!(calls < 200, "{calls}");
    }

    #[test]
    fn a_root_on_a_sample_is_found_once() {
        let found = roots(&SCAN, f64::INFINITY, &mut |days| days - 42.0);
        assert_eq!(found.len(), 1);
        assert!((found[0].days - 42.0).abs() < 1e-7);
        assert!(roots(&SCAN, f64::INFINITY, &mut |days| (days - 42.0).powi(2)).is_empty());
    }

    #[test]
    fn the_jump_of_an_angle_is_no_root() {
        // An angle that runs from -180 to 180 every 40 days: roots at 20 and 60, jumps at 0, 40 and 80.
        let found = roots(&SCAN, 180.0, &mut |days| {
            (days * 9.0).rem_euclid(360.0) - 180.0
        });
        assert_eq!(found.len(), 2, "{found:?}");
        assert!((found[0].days - 20.0).abs() < 1e-6 && (found[1].days - 60.0).abs() < 1e-6);
    }

    #[test]
    fn gaps_and_broken_scans_end_quietly() {
        let gap = |days: f64| {
            if (40.0..45.0).contains(&days) {
                f64::NAN
            } else {
                (days - 42.0).powi(2)
            }
        };
        assert!(minima(&SCAN, &mut { gap }).is_empty());
        assert!(minima(&SCAN, &mut |_| f64::NAN).is_empty());
        for scan in [
            Scan {
                from_days: f64::NAN,
                ..SCAN
            },
            Scan {
                to_days: -5.0,
                ..SCAN
            },
            Scan {
                step_days: 0.0,
                to_days: 0.0,
                ..SCAN
            },
            Scan {
                step_days: f64::NAN,
                ..SCAN
            },
            Scan {
                step_days: -1.0,
                ..SCAN
            },
        ] {
            assert!(
                minima(&scan, &mut |days| (days - 42.0).powi(2)).is_empty(),
                "{scan:?}"
            );
            assert!(
                roots(&scan, f64::INFINITY, &mut |days| days - 42.0).is_empty(),
                "{scan:?}"
            );
        }
        let tight = Scan {
            tolerance_days: 0.0,
            ..SCAN
        };
        assert!((minima(&tight, &mut |days| (days - 41.3).powi(2))[0].days - 41.3).abs() < 1e-6);
        assert!(
            (roots(&tight, f64::INFINITY, &mut |days| days - 41.3)[0].days - 41.3).abs() < 1e-12
        );
    }
}
