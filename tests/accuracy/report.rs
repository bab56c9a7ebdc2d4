//! The spread of the errors and the tables printed of it.

use crate::limits::limit;
use crate::quantity::Quantity;
use crate::spans::Span;
use crate::support::{Spread, Table};
use std::fmt::Write;
use wanderlight::{Body, Circumstances};

/// What the crate said to one row.
pub(crate) struct Answer {
    pub(crate) body: Body,
    pub(crate) year: i32,
    pub(crate) got: Circumstances,
}

/// One body's errors of one quantity within a span.
pub(crate) fn spread(
    answers: &[Answer],
    table: &Table,
    span: &Span,
    quantity: Quantity,
    body: Body,
) -> Option<Spread> {
    let errors: Vec<f64> = answers
        .iter()
        .zip(table.rows())
        .filter(|(answer, _)| answer.body == body && span.holds(answer.year))
        .filter_map(|(answer, row)| quantity.error(&answer.got, row))
        .collect();
    Spread::of(&errors)
}

/// The short table: one line a body.
pub(crate) fn summarise(span: &Span, answers: &[Answer], table: &Table) {
    println!(
        "\n| {} | n | direction rms | p50 | p99 | max, arcsec | distance p99, ppm | phase angle p99, arcsec | magnitude p50 | p99 | max, mmag |",
        span.title
    );
    println!("|---|---:|---:|---:|---:|---:|---:|---:|---:|---:|---:|");
    for body in Body::ALL {
        let of = |quantity| spread(answers, table, span, quantity, body);
        let shown = |spread: Option<Spread>, digits: usize, pick: fn(Spread) -> f64| {
            spread.map_or("-".to_owned(), |spread| {
                format!("{:.digits$}", pick(spread))
            })
        };
        let direction = of(Quantity::Equatorial);
        println!(
            "| {body} | {} | {} | {} | {} | {} | {} | {} | {} | {} | {} |",
            direction.map_or(0, |spread| spread.count),
            shown(direction, 2, |spread| spread.rms),
            shown(direction, 2, |spread| spread.p50),
            shown(direction, 2, |spread| spread.p99),
            shown(direction, 2, |spread| spread.max),
            shown(of(Quantity::Distance), 2, |spread| spread.p99),
            shown(of(Quantity::PhaseAngle), 2, |spread| spread.p99),
            shown(of(Quantity::Magnitude), 1, |spread| spread.p50),
            shown(of(Quantity::Magnitude), 1, |spread| spread.p99),
            shown(of(Quantity::Magnitude), 1, |spread| spread.max),
        );
    }
}

/// Prints one line of the long table and notes what is beyond its limit.
pub(crate) fn report(
    span: &Span,
    quantity: Quantity,
    body: Body,
    spread: Spread,
    failures: &mut String,
) {
    let Spread {
        count,
        rms,
        p50,
        p99,
        max,
    } = spread;
    let [a, b, c] = limit(span, quantity, body);
    println!(
        "| {} | {body} | {count} | {rms:.3} | {p50:.3} | {p99:.3} | {max:.3} | {a} / {b} / {c} |",
        quantity.label()
    );
    for (name, got, allowed) in [("p50", p50, a), ("p99", p99, b), ("max", max, c)] {
        if got > allowed {
            let _ = writeln!(
                failures,
                "{}, {body}, {}: {name} {got:.4} > {allowed}",
                span.title,
                quantity.label()
            );
        }
    }
}
