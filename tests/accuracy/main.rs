//! How accurate the answers are: every row of the reference table, every quantity, each body with limits of its own.
//!
//! `cargo widget accuracy` prints the tables that these tests assert.

mod limits;
mod quantity;
mod report;
mod spans;
#[path = "../support/mod.rs"]
mod support;

use quantity::{Quantity, hidden_by_sun};
use report::{Answer, report, spread, summarise};
use spans::{MOON_SPAN, SPANS};
use support::{Spread, Table, check, separation_arcsec, utc_at_tt};
use wanderlight::{Body, Place, Utc, circumstances};

/// Degrees that the Earth turns in a second of UT1.
const TURN_DEG_PER_SECOND: f64 = 360.985_647_366_29 / 86_400.0;

/// Largest difference allowed between two rules for delta-T that follow the same publications.
const DELTA_T_SECONDS: f64 = 0.2;

/// The instants of the reference: what is asked of the crate, and the calendar year for choosing spans.
fn instants() -> Vec<(Utc, i32)> {
    let table = Table::read("instants.csv");
    let year = |text: &str| text[..4].parse().expect("a year");
    table
        .rows()
        .map(|row| {
            (
                utc_at_tt(row.number("tt_days_since_j2000")),
                year(row.text("civil")),
            )
        })
        .collect()
}

fn body_named(name: &str) -> Body {
    name.parse().expect("a body of the reference")
}

/// Asks the crate for every row of the reference.
fn answers(table: &Table, instants: &[(Utc, i32)]) -> Vec<Answer> {
    let answer = |row: support::Row<'_>| {
        let (utc, year) = instants[row.number("instant") as usize];
        let body = body_named(row.text("body"));
        let got = circumstances(body, utc, None)
            .unwrap_or_else(|why| panic!("{body} at {}: {why}", utc.to_rfc3339()));
        Answer { body, year, got }
    };
    table.rows().map(answer).collect()
}

/// What is promised to readers: rms and largest error of the geocentric apparent place in arcseconds.
#[test]
fn the_promised_accuracy_is_kept() {
    let table = Table::read("places.csv");
    let answers = answers(&table, &instants());
    for body in Body::ALL {
        let (span, rms_arcsec, max_arcsec) = match body {
            Body::Moon => (&MOON_SPAN, 0.6, 3.0),
            Body::Uranus | Body::Neptune => (&SPANS[0], 0.5, 5.0),
            _ => (&SPANS[0], 0.5, 2.0),
        };
        let got = spread(&answers, &table, span, Quantity::Equatorial, body).expect("rows");
        check(
            &format!("{body}, {}, rms", span.title),
            got.rms,
            0.0,
            rms_arcsec,
            "arcsec",
        );
        check(
            &format!("{body}, {}, max", span.title),
            got.max,
            0.0,
            max_arcsec,
            "arcsec",
        );
    }
}

#[test]
fn every_quantity_is_as_accurate_as_stated() {
    let instants = instants();
    let table = Table::read("places.csv");
    let answers = answers(&table, &instants);
    assert!(
        instants.len() >= 400 && answers.len() == 9 * instants.len(),
        "{} rows",
        answers.len()
    );

    for span in &SPANS[..2] {
        summarise(span, &answers, &table);
    }
    let mut failures = String::new();
    for span in SPANS {
        println!(
            "\n| {}: quantity, unit of the error | body | n | rms | p50 | p99 | max | limits p50 / p99 / max |",
            span.title
        );
        println!("|---|---|---:|---:|---:|---:|---:|---|");
        for quantity in Quantity::ALL {
            for body in Body::ALL {
                if let Some(spread) = spread(&answers, &table, span, quantity, body) {
                    report(span, quantity, body, spread, &mut failures);
                }
            }
        }
    }
    assert!(failures.is_empty(), "beyond the limits:\n{failures}");
}

/// East or west of the Sun, waxing or waning: right wherever the question has a clear answer.
#[test]
fn sides_and_waxing_are_right() {
    let instants = instants();
    let mut asked = [0; 2];
    for row in Table::read("places.csv")
        .rows()
        .filter(|row| row.text("body") != "sun")
    {
        let (utc, _) = instants[row.number("instant") as usize];
        let got = circumstances(body_named(row.text("body")), utc, None).expect("inside the span");
        let label = format!("{} at {}", got.body, got.utc);
        // A quarter of a degree from conjunction or opposition the longitudes cross while latitude keeps them apart.
        let longitude_gap = row.number("elongation_deg").to_radians().sin()
            - row.number("ecl_lat_deg").to_radians().sin().abs();
        if longitude_gap > 0.005 {
            let want = if row.number("east") == 1.0 {
                "east"
            } else {
                "west"
            };
            assert_eq!(got.elongation_side, Some(want), "{label}");
            asked[0] += 1;
        }
        let rate = row.number("phase_rate_deg_per_day");
        if rate.abs() > 0.002 {
            assert_eq!(got.waxing, Some(rate < 0.0), "{label}");
            asked[1] += 1;
        }
    }
    assert!(
        asked.iter().all(|count| *count > 4_500),
        "too few clear cases: {asked:?}"
    );
}

/// Few rows may be left out for standing behind the Sun, and only those.
#[test]
fn hardly_anything_is_left_out() {
    let table = Table::read("places.csv");
    let hidden: Vec<&str> = table
        .rows()
        .filter(|row| hidden_by_sun(*row))
        .map(|row| row.text("body"))
        .collect();
    assert!(hidden.len() <= 12 && !hidden.contains(&"sun"), "{hidden:?}");
}

/// Altitude and azimuth as one direction, the place turned by the difference between the two delta-T.
#[test]
fn horizon_directions_are_as_accurate_as_stated() {
    let instants = instants();
    let reference_delta_t: Vec<f64> = Table::read("instants.csv")
        .rows()
        .map(|row| row.number("delta_t_seconds"))
        .collect();
    let mut errors = vec![Vec::new(); Body::ALL.len()];
    for row in Table::read("horizons.csv").rows() {
        let number = row.number("instant") as usize;
        let (utc, year) = instants[number];
        if !SPANS[0].holds(year) {
            continue;
        }
        let body = body_named(row.text("body"));
        let tt_minus_ut1_days = utc.to_tt().days_since_j2000() - utc.to_ut1().days_since_j2000();
        let turn_deg =
            (tt_minus_ut1_days * 86_400.0 - reference_delta_t[number]) * TURN_DEG_PER_SECOND;
        let place = Place::new(
            row.number("latitude_deg"),
            row.number("longitude_deg") + turn_deg,
            row.number("height_m"),
        );
        let got = circumstances(body, utc, Some(&place.expect("a place")))
            .expect("inside the span")
            .local
            .expect("a horizon");
        let want = [row.number("azimuth_deg"), row.number("altitude_deg")];
        let at = Body::ALL
            .iter()
            .position(|other| *other == body)
            .expect("a body");
        errors[at].push(separation_arcsec([got.azimuth_deg, got.altitude_deg], want));
    }

    println!(
        "\n| direction over the horizon, 1900 to 2100, arcsec | n | rms | p50 | p99 | max | limit |"
    );
    println!("|---|---:|---:|---:|---:|---:|---:|");
    let mut failures = Vec::new();
    for (body, errors) in Body::ALL.into_iter().zip(&errors) {
        let Spread {
            count,
            rms,
            p50,
            p99,
            max,
        } = Spread::of(errors).expect("rows for every body");
        let allowed = limits::horizon_arcsec(body);
        println!("| {body} | {count} | {rms:.3} | {p50:.3} | {p99:.3} | {max:.3} | {allowed} |");
        assert!(count > 150, "{body}: {count} rows");
        if max > allowed {
            failures.push(format!("{body}: {max:.4} > {allowed} arcsec"));
        }
    }
    assert!(failures.is_empty(), "{failures:?}");
}

/// Civil time, 1972 to the table's end, is UTC with leap seconds: TT is exact to a tenth of a millisecond.
#[test]
fn utc_with_leap_seconds_is_exact() {
    let mut asked = 0;
    for row in Table::read("instants.csv")
        .rows()
        .filter(|row| row.text("scale") == "utc")
    {
        let utc = Utc::parse(row.text("civil")).expect("an instant");
        let off_seconds =
            (utc.to_tt().days_since_j2000() - row.number("tt_days_since_j2000")) * 86_400.0;
        check(row.text("civil"), off_seconds, 0.0, 2e-4, "s of TT");
        asked += 1;
    }
    assert!(asked > 70, "{asked} rows");
}

/// Before 1972 civil time is UT1: the crate's delta-T against the reference library's, which follows the same publications.
#[test]
fn delta_t_follows_the_published_table() {
    for row in Table::read("instants.csv")
        .rows()
        .filter(|row| row.text("scale") == "ut1")
    {
        let civil = row.text("civil");
        if civil >= "1972" {
            continue;
        }
        let got = circumstances(Body::Sun, Utc::parse(civil).expect("an instant"), None)
            .expect("inside the span")
            .delta_t_seconds;
        // Straight lines between yearly knots; the library's spline and its daily table bend a little between them.
        check(
            civil,
            got,
            row.number("delta_t_seconds"),
            DELTA_T_SECONDS,
            "s of delta-T",
        );
    }
}
