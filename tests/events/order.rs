//! The order of kinds within a round, and spans cut into parts.

use crate::{at, of};
use proptest::prelude::*;
use wanderlight::Body;
use wanderlight::events::Kind::{self, *};
use wanderlight::events::{Event, Query, events};

/// The kinds of a sequence without secondary peaks.
fn kinds(events: &[Event]) -> Vec<Kind> {
    events
        .iter()
        .filter(|event| !event.values.is_secondary)
        .map(|event| event.kind)
        .collect()
}

/// The events repeat one order over and over, from wherever they start.
fn assert_repeats(body: Body, found: &[Event], order: &[Kind]) {
    let found = kinds(found);
    assert!(found.len() > 2 * order.len(), "{body}: {}", found.len());
    let start = order.iter().position(|kind| *kind == found[0]);
    let start = start.expect("a kind of the order");
    for (index, kind) in found.iter().enumerate() {
        assert_eq!(
            *kind,
            order[(start + index) % order.len()],
            "{body}: event {index} of {found:?}"
        );
    }
}

#[test]
fn a_round_of_venus() {
    let order = [
        SuperiorConjunction,
        GreatestElongationEast,
        GreatestIlluminatedExtent,
        GreatestBrightness,
        StationRetrograde,
        InferiorConjunction,
        StationDirect,
        GreatestBrightness,
        GreatestIlluminatedExtent,
        GreatestElongationWest,
    ];
    let found = of(Body::Venus, &order, "1900-01-01", "2000-01-01");
    assert_repeats(Body::Venus, &found, &order);
}

#[test]
fn a_round_of_mercury() {
    let order = [
        SuperiorConjunction,
        GreatestElongationEast,
        StationRetrograde,
        InferiorConjunction,
        StationDirect,
        GreatestElongationWest,
    ];
    let found = of(Body::Mercury, &order, "1980-01-01", "2030-01-01");
    assert_repeats(Body::Mercury, &found, &order);
    let halves = [
        InferiorConjunction,
        HalfPhase,
        SuperiorConjunction,
        HalfPhase,
    ];
    let found = of(Body::Mercury, &halves, "1980-01-01", "2030-01-01");
    assert_repeats(Body::Mercury, &found, &halves);
}

#[test]
fn a_round_of_the_outer_planets() {
    let order = [
        Conjunction,
        QuadratureWest,
        StationRetrograde,
        Opposition,
        StationDirect,
        QuadratureEast,
    ];
    for body in [
        Body::Mars,
        Body::Jupiter,
        Body::Saturn,
        Body::Uranus,
        Body::Neptune,
    ] {
        let found = of(body, &order, "1950-01-01", "2000-01-01");
        assert_repeats(body, &found, &order);
        let nearest = [Conjunction, ClosestApproach];
        let found = of(body, &nearest, "1950-01-01", "2000-01-01");
        assert_repeats(body, &found, &nearest);
        let brightest = [Conjunction, GreatestBrightness];
        let found = of(body, &brightest, "1950-01-01", "2000-01-01");
        assert_repeats(body, &found, &brightest);
    }
}

#[test]
fn a_month_of_the_moon() {
    let order = [NewMoon, FirstQuarter, FullMoon, LastQuarter];
    let found = of(Body::Moon, &order, "2000-01-01", "2010-01-01");
    assert_repeats(Body::Moon, &found, &order);
    let order = [MoonPerigee, MoonApogee];
    assert_repeats(
        Body::Moon,
        &of(Body::Moon, &order, "2000-01-01", "2010-01-01"),
        &order,
    );
}

#[test]
fn every_list_is_in_order_of_time_and_within_its_span() {
    let query = Query::all(at("2026-01-01"), at("2027-01-01"));
    let found = events(&query).expect("a valid query");
    assert!(found.len() > 450, "{}", found.len());
    assert!(found.windows(2).all(|pair| pair[0].utc <= pair[1].utc));
    for event in &found {
        assert!(query.from <= event.utc && event.utc < query.to, "{event:?}");
        assert!(
            event.time_uncertainty_seconds > 0.0 && event.time_uncertainty_seconds < 4e5,
            "{event:?}"
        );
        assert!(
            event.values.numbers().all(|(_, value)| value.is_finite()),
            "{event:?}"
        );
    }
    for body in Body::PLANETS {
        let of_body: Vec<&Event> = found
            .iter()
            .filter(|event| event.body == body || event.other == Some(body))
            .collect();
        let alone = events(&Query::of(body, &[], query.from, query.to)).expect("a valid query");
        assert!(
            alone.iter().eq(of_body),
            "{body}: the same alone as among all"
        );
    }
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 12, ..ProptestConfig::default() })]

    #[test]
    fn a_span_gives_the_same_events_however_it_is_cut(
        start in -100_000.0_f64..70_000.0,
        first_days in 0.0_f64..1_200.0,
        second_days in 0.0_f64..1_200.0,
        body in proptest::sample::select(vec![
            Body::Moon, Body::Mercury, Body::Venus, Body::Mars, Body::Saturn, Body::Neptune,
        ]),
    ) {
        let from = wanderlight::Utc::from_days_since_j2000(start);
        let (middle, to) = (from.plus_days(first_days), from.plus_days(first_days + second_days));
        let part = |from, to| events(&Query::of(body, &[], from, to)).expect("a valid query");
        let mut parts = part(from, middle);
        parts.extend(part(middle, to));
        prop_assert_eq!(part(from, to), parts);
    }
}

#[test]
fn an_event_at_the_cut_belongs_to_the_later_part() {
    let venus = |from, to| {
        events(&Query::of(Body::Venus, &[InferiorConjunction], from, to)).expect("a valid query")
    };
    let conjunction = venus(at("2026-10-01"), at("2026-11-15"))[0].utc;
    assert_eq!(venus(at("2026-10-01"), conjunction).len(), 0);
    assert_eq!(venus(conjunction, at("2026-11-15")).len(), 1);
    assert_eq!(venus(conjunction, conjunction).len(), 0);
}
