//! Events: what geometry demands of them, what was published about them, and what is refused.

#[path = "../support/mod.rs"]
mod support;

mod apparitions;
mod order;
mod places;
mod published;
mod refused;
mod truths;

use wanderlight::events::{Event, Kind, Query, events};
use wanderlight::{Body, Utc};

fn at(text: &str) -> Utc {
    Utc::parse(text).expect("a valid instant")
}

/// Some kinds of one body; all when none is named.
fn of(body: Body, kinds: &[Kind], from: &str, to: &str) -> Vec<Event> {
    events(&Query::of(body, kinds, at(from), at(to))).expect("a valid query")
}

fn seconds_apart(a: Utc, b: Utc) -> f64 {
    (a.days_since_j2000() - b.days_since_j2000()).abs() * 86_400.0
}
