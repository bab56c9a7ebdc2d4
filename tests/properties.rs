//! Any input gives a value or an error of the documented kind: no panic, no NaN in an answer, no unexplained jump.

use proptest::prelude::*;
use wanderlight::error::Code;
use wanderlight::events::{
    Scan, greatest_brightness, interval_within_magnitudes, maxima, minima, roots,
};
use wanderlight::photometry::{MarsRotation, Seen, magnitude};
use wanderlight::{Body, Place, Utc, circumstances, series};

/// Any double, with the troublesome ones often.
fn any_number() -> impl Strategy<Value = f64> {
    prop_oneof![
        any::<f64>(),
        Just(f64::NAN),
        Just(f64::INFINITY),
        Just(f64::NEG_INFINITY),
        Just(0.0),
        -1e6..1e6,
    ]
}

/// An instant in or near the years that are answered, sometimes far off.
fn any_instant() -> impl Strategy<Value = Utc> {
    prop_oneof![4 => -147_000.0..110_000.0, 1 => any_number()].prop_map(Utc::from_days_since_j2000)
}

/// An instant within the years that are answered.
fn answered_instant() -> impl Strategy<Value = Utc> {
    (-146_000.0..109_500.0).prop_map(Utc::from_days_since_j2000)
}

fn any_body() -> impl Strategy<Value = Body> {
    prop::sample::select(Body::ALL.to_vec())
}

/// Every number of a JSON value is finite: serde_json writes NaN and infinity as null, so nulls are listed instead.
fn nulls(value: &serde_json::Value, path: &str, found: &mut Vec<String>) {
    match value {
        serde_json::Value::Null => found.push(path.to_owned()),
        serde_json::Value::Object(map) => {
            map.iter().for_each(|(key, value)| nulls(value, key, found))
        }
        serde_json::Value::Array(values) => {
            values.iter().for_each(|value| nulls(value, path, found))
        }
        _ => {}
    }
}

/// Keys that the contract allows to be null.
fn may_be_null(body: Body, key: &str) -> bool {
    let of_sun = [
        "phaseAngleDeg",
        "illuminatedFraction",
        "waxing",
        "elongationDeg",
        "elongationSide",
        "orbitalSpeedKmS",
        "brightLimbAngleDeg",
    ];
    let of_any = [
        "magnitude",
        "surfaceBrightnessMagArcsec2",
        "apparentMagnitude",
    ];
    of_any.contains(&key) || (body == Body::Sun && of_sun.contains(&key))
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(512))]

    #[test]
    fn circumstances_answer_or_refuse(
        body in any_body(),
        utc in any_instant(),
        latitude_deg in any_number(),
        longitude_deg in any_number(),
        height_m in any_number(),
    ) {
        let place = Place::new(latitude_deg, longitude_deg, height_m);
        if let Err(error) = &place {
            prop_assert_eq!(error.code(), Code::BadPlace);
        }
        match circumstances(body, utc, place.as_ref().ok()) {
            Err(error) => prop_assert!(matches!(error.code(), Code::BadInstant | Code::OutOfSpan), "{:?}", error),
            Ok(answer) => {
                let json = serde_json::to_value(&answer).expect("plain data");
                let mut found = Vec::new();
                nulls(&json, "", &mut found);
                if let Some(local) = &answer.local {
                    nulls(&serde_json::to_value(local).expect("plain data"), "", &mut found);
                }
                found.retain(|key| !may_be_null(body, key));
                prop_assert!(found.is_empty(), "{:?} in {}", found, json);
                prop_assert!(answer.illuminated_fraction.is_none_or(|share| (0.0..=1.0).contains(&share)));
                prop_assert!((0.0..360.0).contains(&answer.right_ascension_deg));
                prop_assert!(answer.declination_deg.abs() <= 90.0);
                prop_assert!(answer.elongation_deg.is_none_or(|angle| (0.0..=180.0).contains(&angle)));
            }
        }
    }

    #[test]
    fn places_near_the_edges_are_answered(
        body in any_body(),
        utc in answered_instant(),
        latitude_deg in prop_oneof![Just(90.0), Just(-90.0), Just(0.0), -90.0..90.0],
        longitude_deg in prop_oneof![Just(180.0), Just(-180.0), Just(360.0), -360.0..360.0],
    ) {
        let place = Place::new(latitude_deg, longitude_deg, 0.0).expect("a valid place");
        let answer = circumstances(body, utc, Some(&place)).expect("within the span");
        let local = answer.local.expect("asked for");
        prop_assert!(local.altitude_deg.abs() <= 90.0 && local.apparent_altitude_deg >= local.altitude_deg);
        prop_assert!((0.0..360.0).contains(&local.azimuth_deg));
        prop_assert!(local.parallactic_angle_deg.abs() <= 180.0);
        prop_assert_eq!(local.apparent_magnitude.is_some(), local.apparent_altitude_deg >= 0.0 && answer.magnitude.is_some());
        if let (Some(dimmed), Some(bright)) = (local.apparent_magnitude, answer.magnitude) {
            prop_assert!(dimmed > bright);
        }
    }

    #[test]
    fn series_answer_or_refuse(
        body in any_body(),
        from in any_instant(),
        span_days in prop_oneof![-10.0..400.0, any_number()],
        step_days in prop_oneof![5.0..50.0, any_number()],
    ) {
        match series(body, from, from.plus_days(span_days), step_days) {
            Err(error) => prop_assert!(
                matches!(error.code(), Code::BadInstant | Code::OutOfSpan | Code::BadStep), "{:?}", error
            ),
            Ok(series) => {
                let samples = series.utc.len();
                prop_assert!(samples >= 1);
                for column in [&series.distance_au, &series.angular_diameter_arcsec, &series.lit_area_arcsec2] {
                    prop_assert_eq!(column.len(), samples);
                    prop_assert!(column.iter().all(|value| value.is_finite()));
                }
                prop_assert_eq!(series.magnitude.len(), samples);
                prop_assert_eq!(series.elongation_deg.len(), samples);
                prop_assert_eq!(series.illuminated_fraction.len(), samples);
            }
        }
    }

    #[test]
    fn any_text_is_an_instant_or_refused(text in ".{0,40}") {
        if let Err(error) = Utc::parse(&text) {
            prop_assert_eq!(error.code(), Code::BadInstant);
        }
    }

    #[test]
    fn texts_close_to_an_instant_are_read_or_refused(
        text in "[0-9]{4}-[0-9]{2}-[0-9]{2}([Tt ][0-9]{2}:[0-9]{2}:[0-9]{2}(\\.[0-9]{1,12})?([Zz]|[+-][0-9]{2}:[0-9]{2})?)?"
    ) {
        match Utc::parse(&text) {
            Err(error) => prop_assert_eq!(error.code(), Code::BadInstant),
            Ok(utc) => {
                let again = Utc::parse(&utc.to_rfc3339());
                // A date before year 0 or after 9999 can arise from an offset only; it is not written in four digits.
                if let Ok(again) = again {
                    prop_assert!((again.days_since_j2000() - utc.days_since_j2000()).abs() * 86_400.0 < 0.501);
                }
            }
        }
    }

    #[test]
    fn civil_dates_come_back(days in -1e6..1e6_f64) {
        let civil = Utc::from_days_since_j2000(days).civil();
        let seconds = f64::from(civil.hour) * 3600.0 + f64::from(civil.minute) * 60.0 + civil.second;
        let again = Utc::from_civil(civil.year, civil.month, civil.day, seconds).expect("a date of the calendar");
        prop_assert!((again.days_since_j2000() - days).abs() < 1e-9);
    }

    #[test]
    fn time_never_panics(days in any_number()) {
        let utc = Utc::from_days_since_j2000(days);
        let civil = utc.civil();
        prop_assert!((1..=12).contains(&civil.month) && (1..=31).contains(&civil.day));
        prop_assert!(civil.hour < 24 && civil.minute < 60 && (0.0..60.0).contains(&civil.second));
        prop_assert!(!utc.to_rfc3339().is_empty());
        if days.abs() < 1e6 {
            prop_assert!(utc.to_tt().days_since_j2000().is_finite() && utc.to_ut1().days_since_j2000().is_finite());
        }
    }

    #[test]
    fn unknown_bodies_are_refused(text in "[a-z]{0,12}") {
        match text.parse::<Body>() {
            Ok(body) => prop_assert_eq!(body.name(), text),
            Err(error) => prop_assert_eq!(error.code(), Code::UnknownBody),
        }
    }

    #[test]
    fn searches_end(from in any_number(), to in any_number(), tolerance_days in any_number(), wave in 0.01..10.0_f64) {
        // A step of a thousandth of the span, so that the walk stays short; the tolerance may be anything.
        let scan = Scan { from_days: from, to_days: to, step_days: (to - from) / 1000.0, tolerance_days };
        let width = (to - from).abs();
        let mut function = |days: f64| ((days - from) / width * wave * 10.0).sin();
        for event in minima(&scan, &mut function).iter().chain(&maxima(&scan, &mut function)) {
            prop_assert!((from..=to).contains(&event.days));
        }
        for event in roots(&scan, f64::INFINITY, &mut function) {
            prop_assert!((from..=to).contains(&event.days));
        }
    }
}

proptest! {
    // Each case walks over a year or more.
    #![proptest_config(ProptestConfig::with_cases(24))]

    #[test]
    fn the_brightest_moment_is_brighter_than_its_neighbours(
        body in prop::sample::select(Body::PLANETS.to_vec()),
        from in answered_instant(),
        span_days in 0.0..900.0_f64,
    ) {
        let to = from.plus_days(span_days);
        let Ok(peaks) = greatest_brightness(body, from, to) else {
            // The end may lie beyond the span.
            return Ok(());
        };
        for peak in peaks {
            prop_assert!(from <= peak.utc && peak.utc <= to);
            if let Some(interval) = interval_within_magnitudes(body, peak.utc, 0.1).expect("within the span") {
                prop_assert!(interval.from < peak.utc && peak.utc < interval.to);
            }
        }
    }
}

fn averaged_magnitude(body: Body, utc: Utc) -> f64 {
    let earth = wanderlight::ephemeris::Earth::at(utc.to_tt());
    let observation = wanderlight::ephemeris::Observation::of(body, &earth);
    magnitude(
        &Seen::new(&observation, &earth, utc),
        MarsRotation::Averaged,
    )
    .value_or_nan()
}

#[test]
fn magnitudes_run_on_without_unexplained_jumps() {
    // Hourly over years that hold conjunctions of all planets. Venus steps by 0.007 mag at a phase angle of 163.7;
    // Mercury's law is steep near conjunction: 0.05 mag per hour; the others move by less than 0.004 in an hour.
    for (body, largest_step) in [
        (Body::Mercury, 0.06),
        (Body::Venus, 0.012),
        (Body::Mars, 0.004),
        (Body::Jupiter, 0.001),
        (Body::Saturn, 0.002),
        (Body::Uranus, 0.001),
        (Body::Neptune, 0.001),
    ] {
        let start = Utc::parse("2025-01-01").expect("a valid date");
        let mut last = averaged_magnitude(body, start);
        for hour in 1..2 * 8766 {
            let next = averaged_magnitude(body, start.plus_days(f64::from(hour) / 24.0));
            assert!(
                (next - last).abs() < largest_step,
                "{body}: {last} to {next} in hour {hour}"
            );
            last = next;
        }
    }
}

#[test]
fn places_run_on_across_the_seams_of_time() {
    // Across 1972, a leap second, and the end of the delta-T table: the Moon, which moves most, steps by what it does
    // in the seam's seconds (0.55 arcsec per second of time), here two minutes before to two minutes after.
    for (text, seam_seconds) in [
        ("1972-01-01", 0.2),
        ("2017-01-01", 1.01),
        ("2027-01-01", 0.3),
        ("1800-01-01", 0.001),
    ] {
        let seam = Utc::parse(text).expect("a valid date");
        let longitude_deg = |minutes: f64| {
            let utc = seam.plus_days(minutes / 1440.0);
            circumstances(Body::Moon, utc, None)
                .expect("within the span")
                .ecliptic_longitude_deg
        };
        let moved_arcsec = (longitude_deg(2.0) - longitude_deg(-2.0)).rem_euclid(360.0) * 3600.0;
        let moved_next_arcsec =
            (longitude_deg(6.0) - longitude_deg(2.0)).rem_euclid(360.0) * 3600.0;
        let largest_arcsec = 0.64 * seam_seconds + 0.02;
        assert!(
            (moved_arcsec - moved_next_arcsec).abs() < largest_arcsec,
            "{text}: {moved_arcsec} {moved_next_arcsec}"
        );
    }
}
