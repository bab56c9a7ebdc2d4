//! The search on functions whose events are known.

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
    assert!((tops[0].days - 2.0 * std::f64::consts::TAU).abs() < 1e-6 && tops[0].value > 0.999_999);
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
fn a_minimum_beside_a_maximum_between_two_samples() {
    // The slope is (x^2 - 0.09) / 10 around the inflection: a maximum 0.3 before it and a minimum 0.3 after it.
    for at in [41.2, 41.5, 41.9] {
        let shallow = |days: f64| {
            let x = days - at;
            (x.powi(3) / 3.0 - 0.09 * x) / 10.0
        };
        let found = minima(&SCAN, &mut { shallow });
        assert_eq!(found.len(), 1, "{at} {found:?}");
        assert!((found[0].days - at - 0.3).abs() < 1e-5, "{at} {found:?}");
    }
    assert!(minima(&SCAN, &mut |days| (days - 41.2).powi(3) + 0.01 * days).is_empty());
}

#[test]
fn roots_in_pairs_between_two_samples() {
    let dip = |days: f64| (days - 41.6).powi(2) - 0.01;
    assert!(roots(&SCAN, f64::INFINITY, &mut { dip }).is_empty());
    let found = paired_roots(&SCAN, f64::INFINITY, &mut { dip });
    assert_eq!(found.len(), 2, "{found:?}");
    assert!((found[0].days - 41.5).abs() < 1e-6 && (found[1].days - 41.7).abs() < 1e-6);
    let bump = paired_roots(&SCAN, f64::INFINITY, &mut |days| -dip(days));
    assert_eq!(bump.len(), 2, "{bump:?}");
    assert!(paired_roots(&SCAN, f64::INFINITY, &mut |days| dip(days) + 0.02).is_empty());
    let wave = paired_roots(&SCAN, f64::INFINITY, &mut |days| (days * 0.5).sin());
    assert_eq!(wave.len(), 15, "{wave:?}");
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
    assert!((roots(&tight, f64::INFINITY, &mut |days| days - 41.3)[0].days - 41.3).abs() < 1e-12);
}
