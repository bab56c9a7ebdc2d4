//! Holds lists of events against what the crate finds.

use crate::support::{Row, Spread, Table, utc_at_tt};
use std::collections::BTreeMap;
use wanderlight::Body;
use wanderlight::events::{Event, Kind, Query, events};

/// An event of the lists.
#[derive(Clone, Copy)]
pub(crate) struct Listed {
    /// What happens.
    pub(crate) kind: Kind,
    /// To which body.
    pub(crate) body: Body,
    /// The second planet of a pair.
    pub(crate) other: Option<Body>,
    /// When.
    pub(crate) tt_days: f64,
    /// A figure by its name in the module's contract, and how far it may be off.
    pub(crate) value: Option<(&'static str, f64, f64)>,
    /// Whether it is marked as a lesser peak.
    pub(crate) is_secondary: bool,
    /// A lesser peak that stands out by less than the models are worth: it may be found or not.
    pub(crate) is_marginal: bool,
    /// How far the instant may be off.
    pub(crate) seconds: f64,
}

/// Events this close to an end of a span may fall on either side of it.
const EDGE_DAYS: f64 = 0.25;
/// Beyond this and what is allowed the nearest event of the same kind is another one.
const SAME_EVENT_DAYS: f64 = 0.75;

pub(crate) fn tt_days_of(year: i32) -> f64 {
    let days = wanderlight::Utc::from_civil(year, 1, 1, 0.0).expect("a year of the span");
    days.days_since_j2000()
}

pub(crate) fn body_of(row: Row<'_>, column: &str) -> Body {
    row.text(column).parse().expect("a body")
}

pub(crate) fn kind_of(name: &str) -> Kind {
    name.parse().expect("a kind")
}

pub(crate) fn is_slow(body: Body) -> bool {
    matches!(body, Body::Uranus | Body::Neptune)
}

/// How far a distance may be off, as a part of it. The series of the outermost planets were cut for directions, on
/// which a distance counts for little.
pub(crate) fn distance_error(body: Body) -> f64 {
    match body {
        Body::Saturn | Body::Uranus | Body::Neptune => 4e-5,
        _ => 1e-5,
    }
}

/// The giants' distances from the Sun hardly change around an extremum: an error of a thousandth of a percent moves it
/// by days.
pub(crate) fn apsis_days(body: Body) -> f64 {
    match body {
        Body::Jupiter => 1.0,
        Body::Saturn => 3.0,
        Body::Uranus => 10.0,
        _ => 80.0,
    }
}

/// An event of a list with a kind and a body of its own, and the instant under the usual column.
pub(crate) fn listed(row: Row<'_>, kind: &str, seconds: f64) -> Listed {
    Listed {
        kind: kind_of(kind),
        body: body_of(row, "body"),
        other: None,
        tt_days: row.number("tt_days_since_j2000"),
        value: None,
        is_secondary: false,
        is_marginal: false,
        seconds,
    }
}

pub(crate) fn rows_of(name: &str, of_row: &dyn Fn(Row<'_>) -> Vec<Listed>) -> Vec<Listed> {
    Table::read(name).rows().flat_map(of_row).collect()
}

fn in_span(tt_days: f64, span: (i32, i32), margin_days: f64) -> bool {
    (tt_days_of(span.0) - margin_days..tt_days_of(span.1) + margin_days).contains(&tt_days)
}

/// What a list and the crate have of one kind and body.
#[derive(Default)]
struct Pair {
    listed: Vec<Listed>,
    found: Vec<Event>,
}

/// Holds the crate's events of the spans against a list that is complete in them. No bodies named: all.
pub(crate) fn compare(lists: &[Listed], kinds: &[&str], bodies: &[Body], spans: &[(i32, i32)]) {
    let kinds: Vec<Kind> = kinds.iter().map(|name| kind_of(name)).collect();
    let mut errors: BTreeMap<String, (Vec<f64>, Vec<f64>)> = BTreeMap::new();
    let mut faults = Vec::new();
    for span in spans {
        let mut pairs: BTreeMap<String, Pair> = BTreeMap::new();
        let name = |kind: Kind, body: Body, other: Option<Body>| {
            let other = other.filter(|other| *other != Body::Moon);
            format!(
                "{} {} {}",
                kind.name(),
                body.name(),
                other.map_or("", Body::name)
            )
        };
        let query = Query {
            kinds: kinds.clone(),
            bodies: bodies.to_vec(),
            ..Query::all(
                utc_at_tt(tt_days_of(span.0) - 2.0),
                utc_at_tt(tt_days_of(span.1) + 2.0),
            )
        };
        for event in events(&query).expect("a span that is covered") {
            let key = name(event.kind, event.body, event.other);
            pairs.entry(key).or_default().found.push(event);
        }
        for listed in lists {
            let is_asked = kinds.contains(&listed.kind)
                && (bodies.is_empty() || bodies.contains(&listed.body));
            if is_asked && in_span(listed.tt_days, *span, 0.0) {
                let key = name(listed.kind, listed.body, listed.other);
                pairs.entry(key).or_default().listed.push(*listed);
            }
        }
        for (key, pair) in &pairs {
            faults.extend(compare_pair(key, pair, *span, &mut errors));
        }
    }
    for (kind, (seconds, values)) in &errors {
        let time = Spread::of(seconds).expect("some events");
        print!(
            "{kind:27} {:5} events, p50 {:9.2} s, max {:9.2} s",
            time.count, time.p50, time.max
        );
        match Spread::of(values) {
            Some(value) => println!("; value p50 {:.2e}, max {:.2e}", value.p50, value.max),
            None => println!(),
        }
    }
    assert!(!errors.is_empty(), "nothing was compared");
    assert!(
        faults.is_empty(),
        "{} faults:\n  {}",
        faults.len(),
        faults.join("\n  ")
    );
}

fn compare_pair(
    key: &str,
    pair: &Pair,
    span: (i32, i32),
    errors: &mut BTreeMap<String, (Vec<f64>, Vec<f64>)>,
) -> Vec<String> {
    let mut faults = Vec::new();
    let tt_days = |event: &Event| event.utc.to_tt().days_since_j2000();
    let mut is_met = vec![false; pair.found.len()];
    for listed in &pair.listed {
        let away = |index: usize| (tt_days(&pair.found[index]) - listed.tt_days).abs();
        let nearest = (0..pair.found.len())
            .filter(|index| {
                !is_met[*index] && away(*index) < SAME_EVENT_DAYS + listed.seconds / 86_400.0
            })
            .min_by(|a, b| away(*a).total_cmp(&away(*b)));
        let Some(nearest) = nearest else {
            if !listed.is_marginal {
                faults.push(format!("{key}: missing at TT {}", listed.tt_days));
            }
            continue;
        };
        is_met[nearest] = true;
        let event = &pair.found[nearest];
        let seconds = (tt_days(event) - listed.tt_days).abs() * 86_400.0;
        let entry = errors.entry(kind_label(listed)).or_default();
        entry.0.push(seconds);
        if seconds > listed.seconds {
            let allowed = listed.seconds;
            faults.push(format!(
                "{key}: TT {}: {seconds:.1} s off, allowed {allowed:.1}",
                listed.tt_days
            ));
        }
        if event.values.is_secondary != listed.is_secondary {
            faults.push(format!("{key}: TT {}: secondary or not", listed.tt_days));
        }
        if let Some((name, value, allowed)) = listed.value {
            let got = event.values.numbers().find(|(key, _)| *key == name);
            let got = got.map_or(f64::NAN, |(_, got)| got);
            entry.1.push((got - value).abs());
            if (got - value).abs() > allowed || got.is_nan() {
                faults.push(format!(
                    "{key}: TT {}: {name} {got}, want {value}, allowed {allowed}",
                    listed.tt_days
                ));
            }
        }
    }
    for (event, _) in pair
        .found
        .iter()
        .zip(&is_met)
        .filter(|(_, is_met)| !**is_met)
    {
        if in_span(tt_days(event), span, -EDGE_DAYS) {
            faults.push(format!(
                "{key}: not in the list: {} TT {}",
                event.utc.to_rfc3339(),
                tt_days(event)
            ));
        }
    }
    faults
}

/// Uranus and Neptune have bounds of their own and so a line of their own.
fn kind_label(listed: &Listed) -> String {
    let slow = if is_slow(listed.body) { " (slow)" } else { "" };
    format!("{}{slow}", listed.kind.name())
}
