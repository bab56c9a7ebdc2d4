//! Every event of the reference lists is found, at its instant and with its value, and no other.
//!
//! Lists and definitions: `tests/data/SOURCES.md`. Each test prints, per kind, how many events were compared and how far
//! off their instants and values are.

#[path = "events_reference/compare.rs"]
mod compare;
mod support;

use compare::{
    Listed, apsis_days, body_of, compare, distance_error, is_slow, kind_of, listed, rows_of,
    tt_days_of,
};
use support::{Row, Spread, Table, utc_at_tt};
use wanderlight::Body;
use wanderlight::events::{Query, events};

/// First and last year of the spans that the lists cover, each from 1 January, 0h TT.
const WHOLE: [(i32, i32); 1] = [(2000, 2051)];
const DECADES: [(i32, i32); 5] = [
    (1700, 1710),
    (1790, 1800),
    (1860, 1870),
    (2100, 2110),
    (2180, 2190),
];
/// Outside 2000-2050 the Moon's events are listed for the first year of each decade.
const MOON_YEARS: [(i32, i32); 5] = [
    (1700, 1701),
    (1790, 1791),
    (1860, 1861),
    (2100, 2101),
    (2180, 2181),
];

const ARCSEC_DEG: f64 = 1.0 / 3600.0;
const MINUTE: f64 = 60.0;

fn whole_and(others: &[(i32, i32)]) -> Vec<(i32, i32)> {
    WHOLE.iter().chain(others).copied().collect()
}

#[test]
fn with_the_sun() {
    let lists = rows_of("events_sun.csv", &|row| {
        let kind = row.text("kind");
        let body = body_of(row, "body");
        let is_elongation = kind.starts_with("greatest-elongation");
        let seconds = match kind {
            _ if is_elongation => 10.0 * MINUTE,
            "half-phase" => 10.0 * MINUTE,
            _ if is_slow(body) => 10.0 * MINUTE,
            _ => MINUTE,
        };
        let mut listed = listed(row, kind, seconds);
        let elongation_deg = row.number("elongation_deg");
        // Behind the Sun's disc no light arrives, and what bending would do there is a matter of convention.
        if !kind.ends_with("conjunction") || kind.starts_with("inferior") || elongation_deg > 0.3 {
            listed.value = Some(("elongationDeg", elongation_deg, 2.0 * ARCSEC_DEG));
        }
        if is_elongation {
            listed.value = Some(("elongationDeg", elongation_deg, ARCSEC_DEG));
        }
        vec![listed]
    });
    let kinds = [
        "inferior-conjunction",
        "superior-conjunction",
        "conjunction",
        "opposition",
        "quadrature-east",
        "quadrature-west",
        "greatest-elongation-east",
        "greatest-elongation-west",
        "half-phase",
    ];
    compare(&lists, &kinds, &[], &whole_and(&DECADES));
}

#[test]
fn by_light() {
    let lists = rows_of("events_light.csv", &|row| {
        let kind = row.text("kind");
        let mut listed = listed(row, kind, 30.0 * MINUTE);
        listed.is_secondary = row.number("secondary") == 1.0;
        // In magnitudes and in square arcseconds; the laws are good to hundredths.
        listed.is_marginal = row.maybe("stands_out_by").is_some_and(|by| by < 5e-4);
        listed.value = Some(if kind == "greatest-brightness" {
            ("magnitude", row.number("magnitude"), 0.0005)
        } else {
            let area = row.number("lit_area_arcsec2");
            ("litAreaArcsec2", area, 1e-5 * area)
        });
        vec![listed]
    });
    let kinds = ["greatest-illuminated-extent", "greatest-brightness"];
    compare(&lists, &kinds, &[], &whole_and(&DECADES));
}

#[test]
fn by_motion() {
    let lists = rows_of("events_motion.csv", &|row| {
        let kind = row.text("kind");
        let body = body_of(row, "body");
        let is_station = kind.starts_with("station");
        let seconds = if is_station && is_slow(body) {
            300.0 * MINUTE
        } else {
            30.0 * MINUTE
        };
        let mut listed = listed(row, kind, seconds);
        listed.is_secondary = row.maybe("secondary") == Some(1.0);
        if kind.ends_with("helion") && !INNER.contains(&body) {
            listed.seconds = apsis_days(body) * 86_400.0;
            // Neptune's lesser extrema are a matter of a hundred-thousandth of its distance.
            listed.is_marginal = listed.is_secondary;
        }
        if let Some(distance_au) = row.maybe("distance_au") {
            let name = if kind == "closest-approach" {
                "distanceAu"
            } else {
                "sunDistanceAu"
            };
            listed.value = Some((name, distance_au, distance_error(body) * distance_au));
        }
        vec![listed]
    });
    let kinds = ["station-retrograde", "station-direct", "closest-approach"];
    compare(&lists, &kinds, &[], &whole_and(&DECADES));
    let kinds = ["perihelion", "aphelion"];
    compare(&lists, &kinds, &INNER, &whole_and(&DECADES));
    let giants = [Body::Jupiter, Body::Saturn, Body::Uranus, Body::Neptune];
    compare(&lists, &kinds, &giants, &[(1700, 2200)]);
}

/// Planets whose distance from the Sun has one sharp extremum an orbit.
const INNER: [Body; 3] = [Body::Mercury, Body::Venus, Body::Mars];

#[test]
fn of_the_moon() {
    let lists = rows_of("events_moon.csv", &|row| {
        let kind = row.text("kind");
        let seconds = if kind.starts_with("moon-") {
            10.0 * MINUTE
        } else {
            30.0
        };
        vec![Listed {
            kind: kind_of(kind),
            body: Body::Moon,
            other: None,
            tt_days: row.number("tt_days_since_j2000"),
            value: None,
            is_secondary: false,
            is_marginal: false,
            seconds,
        }]
    });
    let kinds = [
        "new-moon",
        "first-quarter",
        "full-moon",
        "last-quarter",
        "moon-perigee",
        "moon-apogee",
    ];
    compare(&lists, &kinds, &[Body::Moon], &whole_and(&MOON_YEARS));
}

#[test]
fn of_the_moon_with_planets() {
    let lists = rows_of("events_moon_meetings.csv", &|row| {
        let mut conjunction = listed(row, "moon-conjunction", MINUTE);
        let allowed = 5.0 * ARCSEC_DEG;
        let value = |column| Some(("separationDeg", row.number(column) * ARCSEC_DEG, allowed));
        conjunction.value = value("separation_arcsec");
        let mut closest = listed(row, "moon-closest", MINUTE);
        closest.tt_days += row.number("closest_after_days");
        closest.value = value("least_separation_arcsec");
        vec![conjunction, closest]
    });
    compare(
        &lists,
        &["moon-conjunction", "moon-closest"],
        &[],
        &whole_and(&MOON_YEARS),
    );
}

#[test]
fn of_the_same_phase() {
    let lists = rows_of("events_same_phase.csv", &|row| {
        let mut listed = listed(row, "same-phase", MINUTE);
        // Near full Moon its phase angle passes a minimum: the slower it changes, the less an instant is fixed.
        let rate = row.number("phase_rate_deg_per_day").abs();
        listed.seconds *= (12.0 / rate).max(1.0);
        listed.value = Some((
            "separationDeg",
            row.number("separation_deg"),
            0.05 * (12.0 / rate).max(1.0),
        ));
        vec![listed]
    });
    compare(&lists, &["same-phase"], &[], &whole_and(&MOON_YEARS));
}

#[test]
fn of_two_planets() {
    let pair_of = |row: Row<'_>, kind: &str| {
        let mut listed = listed(row, kind, 2.0 * MINUTE);
        listed.other = Some(body_of(row, "other"));
        let separation_deg = row.number("separation_deg");
        listed.value = Some(("separationDeg", separation_deg, 3.0 * ARCSEC_DEG));
        vec![listed]
    };
    let mut lists = rows_of("events_planet_conjunctions.csv", &|row| {
        pair_of(row, "planet-conjunction")
    });
    // Two conjunctions of one pair within days: it hardly passes before it turns back, and the instants are ill fixed.
    for index in 1..lists.len() {
        let [before, after] = [lists[index - 1], lists[index]];
        let is_same_pair = before.body == after.body && before.other == after.other;
        if is_same_pair && after.tt_days - before.tt_days < 10.0 {
            lists[index - 1].seconds = 10.0 * MINUTE;
            lists[index].seconds = 10.0 * MINUTE;
        }
    }
    compare(&lists, &["planet-conjunction"], &[], &whole_and(&DECADES));
    let lists = rows_of("events_planet_closest.csv", &|row| {
        pair_of(row, "planet-closest")
    });
    compare(&lists, &["planet-closest"], &[], &whole_and(&DECADES));
}

#[test]
fn transits_and_near_misses() {
    let lists = rows_of("events_transits.csv", &|row| {
        let mut listed = listed(row, row.text("kind"), MINUTE);
        let separation_deg = row.number("separation_arcsec") * ARCSEC_DEG;
        listed.value = Some(("separationDeg", separation_deg, ARCSEC_DEG));
        vec![listed]
    });
    compare(
        &lists,
        &["transit", "transit-near-miss"],
        &[Body::Mercury, Body::Venus],
        &[(1601, 2200)],
    );
}

#[test]
fn contacts_of_transits() {
    let query = Query {
        kinds: vec![kind_of("transit")],
        ..Query::all(utc_at_tt(tt_days_of(1601)), utc_at_tt(tt_days_of(2201)))
    };
    let found = events(&query).expect("a span that is covered");
    let table = Table::read("events_transits.csv");
    let mut seconds = Vec::new();
    for row in table.rows().filter(|row| row.text("kind") == "transit") {
        let (tt_days, body) = (row.number("tt_days_since_j2000"), body_of(row, "body"));
        let event = found
            .iter()
            .find(|event| {
                event.body == body && (event.utc.to_tt().days_since_j2000() - tt_days).abs() < 1.0
            })
            .unwrap_or_else(|| panic!("no transit at TT {tt_days}"));
        let names = [
            "contact_1_tt",
            "contact_2_tt",
            "contact_3_tt",
            "contact_4_tt",
        ];
        let wanted: Vec<f64> = names.iter().filter_map(|name| row.maybe(name)).collect();
        assert_eq!(
            event.contacts.len(),
            wanted.len(),
            "contacts at TT {tt_days}"
        );
        assert_eq!(
            event.values.is_grazing,
            row.number("grazing") == 1.0,
            "grazing at TT {tt_days}"
        );
        for (contact, wanted) in event.contacts.iter().zip(&wanted) {
            seconds.push((contact.utc.to_tt().days_since_j2000() - wanted).abs() * 86_400.0);
        }
    }
    let spread = Spread::of(&seconds).expect("contacts");
    println!(
        "{} contacts, p50 {:.2} s, max {:.2} s",
        spread.count, spread.p50, spread.max
    );
    assert!(spread.max <= 90.0, "a contact is {:.1} s off", spread.max);
}
