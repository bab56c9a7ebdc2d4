//! Apparitions and their rhythm.

use crate::at;
use wanderlight::Body;
use wanderlight::events::ApparitionSide::{Evening, Morning, Night};
use wanderlight::events::Kind::*;
use wanderlight::events::{Query, apparitions, events, ranks, rhythm};

#[test]
fn venus_in_2026_comes_in_the_evening_and_leaves_in_the_morning() {
    let found = apparitions(Body::Venus, at("2026-02-01"), at("2027-01-01")).expect("a valid span");
    assert_eq!(
        found.iter().map(|one| one.side).collect::<Vec<_>>(),
        [Evening, Morning]
    );
    let evening = &found[0];
    assert_eq!(&evening.from.to_rfc3339()[..10], "2026-01-06");
    assert_eq!(&evening.to.to_rfc3339()[..10], "2026-10-24");
    assert_eq!(found[1].from, evening.to);
    // The peak and the largest elongation of the table in tests/brightest.rs and of the events themselves.
    assert!((evening.peak_magnitude + 4.80).abs() < 0.006, "{evening:?}");
    assert!((found[1].peak_magnitude + 4.89).abs() < 0.006);
    let largest = events(&Query::of(
        Body::Venus,
        &[GreatestElongationEast],
        evening.from,
        evening.to,
    ))
    .expect("a valid query");
    assert_eq!(
        Some(evening.largest_elongation_deg),
        largest[0].values.elongation_deg
    );
    let turning: Vec<_> = evening
        .turning_points
        .iter()
        .map(|event| event.kind)
        .collect();
    assert_eq!(turning.first(), Some(&SuperiorConjunction));
    assert_eq!(turning.last(), Some(&InferiorConjunction));
    for kind in [
        GreatestElongationEast,
        HalfPhase,
        GreatestIlluminatedExtent,
        GreatestBrightness,
        StationRetrograde,
    ] {
        assert_eq!(
            turning.iter().filter(|one| **one == kind).count(),
            1,
            "{kind:?}"
        );
    }
}

#[test]
fn rounds_join_without_gap_or_overlap() {
    for body in Body::PLANETS {
        let found = apparitions(body, at("2000-01-01"), at("2010-01-01")).expect("a valid span");
        assert!(found.len() >= 5, "{body}: {}", found.len());
        for pair in found.windows(2) {
            assert_eq!(pair[0].to, pair[1].from, "{body}");
        }
        assert!(found[0].from < at("2000-01-01") && found[found.len() - 1].to > at("2010-01-01"));
        for one in &found {
            assert_eq!(one.side == Night, !body.is_inner_planet());
            assert!(one.from <= one.peak_utc && one.peak_utc <= one.to);
            assert!(one.peak_magnitude.is_finite() && one.largest_lit_area_arcsec2 > 0.0);
        }
    }
}

#[test]
fn the_rank_of_mars_is_its_place_among_the_peaks_of_two_centuries() {
    let query = Query::of(
        Body::Mars,
        &[GreatestBrightness],
        at("1900-01-01"),
        at("2100-01-01"),
    );
    let mut peaks = events(&query).expect("a valid query");
    peaks.retain(|event| !event.values.is_secondary);
    let found = apparitions(Body::Mars, at("2018-06-01"), at("2018-12-01")).expect("a valid span");
    let place = ranks(&found)[0];
    let magnitude = Some(found[0].peak_magnitude);
    let brighter: Vec<_> = peaks
        .iter()
        .filter(|event| event.values.magnitude < magnitude)
        .collect();
    assert_eq!(place.of, peaks.len());
    assert_eq!(place.position, 1 + brighter.len());
    let last_before = brighter.iter().rfind(|event| event.utc < found[0].from);
    let first_after = brighter.iter().find(|event| event.utc > found[0].to);
    assert_eq!(place.brighter_before, last_before.map(|event| event.utc));
    assert_eq!(place.brighter_after, first_after.map(|event| event.utc));
    // Nearer than for long before and after: 2003-08-28.
    assert_eq!(
        place
            .brighter_before
            .map(|utc| utc.to_rfc3339()[..7].to_owned()),
        Some("2003-08".to_owned())
    );
}

#[test]
fn the_rhythm_of_venus() {
    // Common knowledge of the trade: 583.92 days between inferior conjunctions, about 19 1/2 months; five of them come
    // two to three days short of eight years; Venus runs at 35 km/s, the Earth at 29.8, 18.5 miles a second.
    let rhythm = rhythm(Body::Venus, at("2000-01-01"), at("2030-01-01")).expect("a valid span");
    assert!(
        (rhythm.mean_synodic_period_days - 583.92).abs() < 0.01,
        "{rhythm:?}"
    );
    let (shortest, longest) = (
        rhythm.shortest_synodic_period_days.expect("rounds"),
        rhythm.longest_synodic_period_days.expect("rounds"),
    );
    assert!(579.0 < shortest && shortest < 583.92 && 583.92 < longest && longest < 588.0);
    let drift_days = rhythm.eight_year_drift_days.expect("Venus has it");
    assert!((-2.7..-2.0).contains(&drift_days), "{drift_days}");
    assert!((rhythm.orbital_speed_km_s - 35.02).abs() < 0.02);
    assert!((rhythm.earth_orbital_speed_mi_s - 18.5).abs() < 0.02);
    assert!((rhythm.orbits_per_synodic_period - 2.5987).abs() < 1e-3);
}
