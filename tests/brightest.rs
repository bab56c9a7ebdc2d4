//! When planets are brightest, against tables made independently.

use wanderlight::error::{Code, Error};
use wanderlight::events::{
    Extremum, greatest_brightness, greatest_illuminated_extent, interval_within_magnitudes,
};
use wanderlight::{Body, Utc};

fn at(text: &str) -> Utc {
    Utc::parse(text).expect("a valid instant")
}

fn days_apart(a: Utc, b: Utc) -> f64 {
    (a.days_since_j2000() - b.days_since_j2000()).abs()
}

/// Instants, values and tolerance of a table made with JPL DE421 and an independent program of the same laws,
/// instants to half a day.
const VENUS_BRIGHTEST: [(&str, f64); 10] = [
    ("2023-07-12T14:24:00Z", -4.71),
    ("2023-09-14T19:12:00Z", -4.78),
    ("2025-02-19T12:00:00Z", -4.87),
    ("2025-04-22T07:12:00Z", -4.78),
    ("2026-09-24T07:12:00Z", -4.80),
    ("2026-11-25T02:24:00Z", -4.89),
    ("2028-04-30T02:24:00Z", -4.76),
    ("2028-07-03T04:48:00Z", -4.72),
    ("2029-12-07T00:00:00Z", -4.91),
    ("2030-02-05T09:36:00Z", -4.89),
];
const VENUS_LARGEST: [(&str, f64); 10] = [
    ("2023-07-07T19:12:00Z", 289.5),
    ("2023-09-19T07:12:00Z", 308.3),
    ("2025-02-14T21:36:00Z", 329.1),
    ("2025-04-27T16:48:00Z", 304.1),
    ("2026-09-18T21:36:00Z", 312.6),
    ("2026-11-29T14:24:00Z", 334.4),
    ("2028-04-25T16:48:00Z", 298.5),
    ("2028-07-08T00:00:00Z", 292.3),
    ("2029-12-01T19:12:00Z", 341.3),
    ("2030-02-10T12:00:00Z", 332.4),
];

#[test]
fn venus_is_brightest_when_an_independent_program_says_so() {
    let peaks =
        greatest_brightness(Body::Venus, at("2023-01-01"), at("2030-12-31")).expect("a valid span");
    assert_eq!(peaks.len(), VENUS_BRIGHTEST.len(), "{peaks:?}");
    for (peak, (utc, magnitude)) in peaks.iter().zip(VENUS_BRIGHTEST) {
        assert!(
            days_apart(peak.utc, at(utc)) < 0.5,
            "{} {utc}",
            peak.utc.to_rfc3339()
        );
        assert!(
            (peak.magnitude - magnitude).abs() < 0.006,
            "{peak:?} {magnitude}"
        );
    }
}

#[test]
fn venus_shows_its_largest_lit_area_when_an_independent_program_says_so() {
    let peaks = greatest_illuminated_extent(Body::Venus, at("2023-01-01"), at("2030-12-31"))
        .expect("a valid span");
    assert_eq!(peaks.len(), VENUS_LARGEST.len(), "{peaks:?}");
    for (peak, (utc, area_arcsec2)) in peaks.iter().zip(VENUS_LARGEST) {
        assert!(
            days_apart(peak.utc, at(utc)) < 0.5,
            "{} {utc}",
            peak.utc.to_rfc3339()
        );
        assert!(
            (peak.lit_area_arcsec2 - area_arcsec2).abs() < 0.1,
            "{peak:?} {area_arcsec2}"
        );
    }
}

#[test]
fn outer_planets_peak_once_per_opposition() {
    // 2000 to 2049: Mars has 23 or 24 oppositions, Jupiter 45 or 46, Saturn 48 or 49.
    for (body, expected) in [
        (Body::Mars, 23..=24),
        (Body::Jupiter, 45..=46),
        (Body::Saturn, 48..=49),
    ] {
        let peaks =
            greatest_brightness(body, at("2000-01-01"), at("2050-01-01")).expect("a valid span");
        assert!(expected.contains(&peaks.len()), "{body}: {}", peaks.len());
    }
}

#[test]
fn mars_in_2003() {
    // Opposition 2003-08-28, the closest for long; the law's authors give -2.862, of which rotation is +0.022.
    let peaks =
        greatest_brightness(Body::Mars, at("2003-01-01"), at("2004-01-01")).expect("a valid span");
    assert_eq!(peaks.len(), 1);
    assert!(
        days_apart(peaks[0].utc, at("2003-08-28")) < 2.0,
        "{peaks:?}"
    );
    assert!((peaks[0].magnitude + 2.884).abs() < 0.01, "{peaks:?}");
}

#[test]
fn the_plateau_of_venus_lasts_about_a_month() {
    let peak = greatest_brightness(Body::Venus, at("2026-11-01"), at("2026-12-31"))
        .expect("a valid span")[0];
    let plateau = interval_within_magnitudes(Body::Venus, peak.utc, 0.1).expect("a valid peak");
    let plateau = plateau.expect("Venus fades by more");
    let length_days = days_apart(plateau.from, plateau.to);
    assert!(plateau.from < peak.utc && peak.utc < plateau.to);
    assert!((25.0..50.0).contains(&length_days), "{length_days}");
    let edge = wanderlight::circumstances(Body::Venus, plateau.from, None)
        .expect("a valid instant")
        .magnitude;
    assert!(
        (edge.expect("Venus has one") - peak.magnitude - 0.1).abs() < 1e-3,
        "{edge:?}"
    );
}

#[test]
fn a_peak_close_to_an_end_is_found_and_one_outside_is_not() {
    let peak = greatest_brightness(Body::Venus, at("2026-11-01"), at("2026-12-31"))
        .expect("a valid span")[0]
        .utc;
    let just_inside = greatest_brightness(Body::Venus, peak.plus_days(-0.1), peak.plus_days(0.1));
    assert_eq!(just_inside.expect("a valid span").len(), 1);
    let just_outside = greatest_brightness(Body::Venus, peak.plus_days(0.1), peak.plus_days(5.0));
    assert_eq!(just_outside.expect("a valid span").len(), 0);
}

#[test]
fn what_cannot_be_answered_is_refused() {
    let (from, to) = (at("2026-01-01"), at("2027-01-01"));
    let code = |result: Result<Vec<Extremum>, Error>| result.map_err(|error| error.code());
    assert_eq!(
        code(greatest_brightness(Body::Moon, from, to)),
        Err(Code::UnknownBody)
    );
    assert_eq!(
        code(greatest_illuminated_extent(Body::Mars, from, to)),
        Err(Code::UnknownBody)
    );
    assert_eq!(
        code(greatest_brightness(Body::Venus, to, from)),
        Err(Code::BadStep)
    );
    assert_eq!(
        code(greatest_brightness(Body::Venus, from, at("2400-01-01"))),
        Err(Code::OutOfSpan)
    );
    assert_eq!(
        interval_within_magnitudes(Body::Venus, from, f64::NAN),
        Ok(None)
    );
    // Uranus never fades by half a magnitude.
    assert_eq!(
        interval_within_magnitudes(Body::Uranus, from, 0.5),
        Ok(None)
    );
}
