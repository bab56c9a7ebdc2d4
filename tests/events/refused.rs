//! What cannot be answered is refused with a code and a sentence that says what is allowed.

use crate::at;
use wanderlight::error::{Code, Error};
use wanderlight::events::Kind::{self, *};
use wanderlight::events::{Query, apparitions, events, rhythm};
use wanderlight::{Body, Utc};

fn refusal(query: &Query) -> Error {
    match events(query) {
        Ok(found) => panic!("{query:?} gave {} events", found.len()),
        Err(error) => error,
    }
}

#[test]
fn spans_outside_the_series() {
    for (from, to) in [("1599-06-01", "1600-06-01"), ("2300-01-01", "2301-01-01")] {
        let error = refusal(&Query::all(at(from), at(to)));
        assert_eq!(error.code(), Code::OutOfSpan);
        assert!(error.message().contains("1600 to 2300"), "{error}");
    }
    let nan = Utc::from_days_since_j2000(f64::NAN);
    let error = refusal(&Query::all(nan, at("2000-01-01")));
    assert_eq!(error.code(), Code::BadInstant);
}

#[test]
fn reversed_and_empty_spans() {
    let (from, to) = (at("2026-01-01"), at("2027-01-01"));
    assert_eq!(refusal(&Query::all(to, from)).code(), Code::BadStep);
    assert_eq!(events(&Query::all(from, from)), Ok(Vec::new()));
}

#[test]
fn five_hundred_years_at_once() {
    let query = Query::of(
        Body::Mars,
        &[Opposition],
        at("1700-01-01"),
        at("2200-01-01"),
    );
    let found = events(&query).expect("a valid query");
    // A mean synodic period of 779.94 days.
    assert!((233..=235).contains(&found.len()), "{}", found.len());
    let whole = Query::of(
        Body::Neptune,
        &[Opposition],
        at("1600-01-02"),
        at("2299-12-30"),
    );
    assert!(events(&whole).expect("a valid query").len() > 694);
}

#[test]
fn a_kind_that_a_body_cannot_have_says_why() {
    let (from, to) = (at("2026-01-01"), at("2027-01-01"));
    for (body, kind, why) in [
        (
            Body::Jupiter,
            InferiorConjunction,
            "orbits lie inside the Earth's",
        ),
        (Body::Venus, Opposition, "never leave the Sun's side"),
        (Body::Moon, Opposition, "phases instead"),
        (Body::Mars, NewMoon, "belongs to the Moon"),
        (Body::Moon, StationDirect, "belongs to the planets"),
        (Body::Neptune, Transit, "orbits lie inside"),
        (Body::Sun, Transit, "no events of its own"),
    ] {
        let error = refusal(&Query::of(body, &[kind], from, to));
        assert_eq!(error.code(), Code::BadOption, "{body} {kind:?}");
        assert!(error.message().contains(why), "{error}");
        assert!(error.message().contains(kind.name()), "{error}");
    }
    // Among several bodies one that fits is enough.
    let mut query = Query::of(Body::Jupiter, &[InferiorConjunction], from, to);
    query.bodies.push(Body::Venus);
    assert_eq!(events(&query).expect("a valid query").len(), 1);
}

#[test]
fn an_unknown_kind_lists_the_kinds() {
    let error = "eclipse".parse::<Kind>().expect_err("no such kind");
    assert_eq!(error.code(), Code::BadOption);
    for kind in Kind::all() {
        assert!(error.message().contains(kind.name()), "{error}");
        assert_eq!(kind.name().parse(), Ok(kind));
        assert!(kind.definition().ends_with('.'));
    }
}

#[test]
fn apparitions_of_sun_and_moon() {
    let (from, to) = (at("2026-01-01"), at("2027-01-01"));
    for body in [Body::Sun, Body::Moon] {
        let code = apparitions(body, from, to).map_err(|error| error.code());
        assert_eq!(code.map(|found| found.len()), Err(Code::UnknownBody));
        let code = rhythm(body, from, to).map_err(|error| error.code());
        assert_eq!(code.map(|_| ()), Err(Code::UnknownBody));
    }
    let code = apparitions(Body::Venus, to, from).map_err(|error| error.code());
    assert_eq!(code.map(|found| found.len()), Err(Code::BadStep));
}
