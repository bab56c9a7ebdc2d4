//! What is said: sentences, announcements, tables, and how many digits a figure gets.

#[path = "text/figures.rs"]
mod figure_tests;
mod support_chart;

use proptest::prelude::*;
use support_chart::{circumstances, day, figures, highlights, series};
use wanderlight::explain::{
    GreatestExtent, Highlights, Peak, Reading, announce, reading_table, sentence_disc,
    sentence_tradeoff,
};
use wanderlight::{Body, Utc};

fn tradeoff(body: Body, from: Utc, days: usize, chosen: Utc) -> String {
    let span = series(body, from, days);
    sentence_tradeoff(
        &span,
        &highlights(&span),
        &Reading::new(chosen, &circumstances(body, chosen)),
        figures(),
    )
}

#[test]
fn venus_is_explained_on_every_side_of_its_peak() {
    let said = |chosen| tradeoff(Body::Venus, day(2026, 8, 1), 240, chosen);
    assert_eq!(
        said(day(2026, 12, 1)),
        "On 1 December 2026 Venus is about as bright as it gets, magnitude −4.8: only 28\u{a0}% of its disc is lit, but the disc is 38 arcseconds across, and this large crescent sends more light than the small full disc."
    );
    assert_eq!(
        said(day(2026, 10, 5)),
        "On 5 October 2026 Venus is larger (51 arcseconds) than when brightest on 23 September 2026 (42 arcseconds), but less of it is lit, 11\u{a0}% against 22\u{a0}%, and that loses more light than the size gains: magnitude −4.7 against −4.8."
    );
    assert_eq!(
        said(day(2027, 2, 20)),
        "On 20 February 2027 Venus shows more of its disc lit (71\u{a0}%) than when brightest on 24 November 2026 (22\u{a0}%), but the disc is smaller, 16 arcseconds against 42 arcseconds, and size counts twice, in width and in height: magnitude −4.1 against −4.8."
    );
    assert_eq!(
        said(day(2026, 10, 24)),
        "On 24 October 2026 Venus is under 0.1\u{a0}% lit and 60 arcseconds across; no published law gives its magnitude at this phase."
    );
}

#[test]
fn every_kind_of_body_has_its_own_reason() {
    assert_eq!(
        tradeoff(Body::Mars, day(2026, 9, 1), 360, day(2027, 2, 1)),
        "On 1 February 2027 Mars is 98\u{a0}% lit; it always stays nearly full, so its size decides: 17 arcseconds across against 18 arcseconds when brightest on 19 February 2027, magnitude −1.7 against −2.1."
    );
    assert_eq!(
        tradeoff(Body::Mars, day(2026, 9, 1), 360, day(2027, 2, 19)),
        "On 19 February 2027 Mars is about as bright as it gets, magnitude −2.1: 18 arcseconds across, with 100\u{a0}% of its disc lit."
    );
    assert_eq!(
        tradeoff(Body::Moon, day(2026, 11, 1), 45, day(2026, 11, 14)),
        "On 14 November 2026 the Moon is 26\u{a0}% lit and of magnitude −8.9; its size, 31.5 arcminutes, hardly changes, so the phase decides."
    );
    assert_eq!(
        tradeoff(Body::Sun, day(2026, 11, 1), 45, day(2026, 11, 14)),
        "On 14 November 2026 the Sun is 32.0 arcminutes across and of magnitude −26.7; it shines by its own light and has no phase."
    );
    assert_eq!(
        tradeoff(Body::Neptune, day(2026, 1, 1), 60, day(2026, 2, 1)),
        "On 1 February 2026 Neptune is 100\u{a0}% lit; it always stays nearly full, so its size decides: 2.2 arcseconds across, magnitude 7.8."
    );
}

#[test]
fn the_disc_is_named_by_its_shape() {
    let said = |body, chosen| sentence_disc(body, chosen, &circumstances(body, chosen), figures());
    assert_eq!(
        said(Body::Venus, day(2026, 12, 1)),
        "On 1 December 2026 Venus is a crescent, 28\u{a0}% lit and 38 arcseconds across, about 1/49 of the Moon’s width."
    );
    assert_eq!(
        said(Body::Venus, day(2027, 2, 20)),
        "On 20 February 2027 Venus is gibbous, 71\u{a0}% lit and 16 arcseconds across, about 1/120 of the Moon’s width."
    );
    assert_eq!(
        said(Body::Saturn, day(2026, 9, 1)),
        "On 1 September 2026 Saturn is almost fully lit (99.9\u{a0}%) and 19 arcseconds across, about 1/98 of the Moon’s width. Its rings are open by 10°."
    );
    assert_eq!(
        said(Body::Moon, day(2026, 11, 24)),
        "On 24 November 2026 the Moon is almost fully lit (99.9\u{a0}%) and 29.6 arcminutes across."
    );
    assert_eq!(
        said(Body::Sun, day(2026, 11, 24)),
        "On 24 November 2026 the Sun shows its whole disc, 32.0 arcminutes across."
    );
}

#[test]
fn a_moved_date_is_announced_shortly() {
    let said = |body, utc| announce(&Reading::new(utc, &circumstances(body, utc)), figures());
    assert_eq!(
        said(Body::Venus, day(2026, 12, 1)),
        "1 December 2026: 28\u{a0}% lit, 38 arcseconds across, magnitude −4.8"
    );
    assert_eq!(
        said(Body::Sun, day(2026, 12, 1)),
        "1 December 2026: 32.0 arcminutes across, magnitude −26.7"
    );
    assert_eq!(
        said(Body::Venus, day(2026, 10, 23)),
        "23 October 2026: under 0.1\u{a0}% lit, 60 arcseconds across, magnitude not known"
    );
}

#[test]
fn the_table_holds_span_peaks_and_chosen_date_in_order() {
    let span = series(Body::Venus, day(2026, 8, 1), 240);
    let chosen = Reading::new(
        day(2026, 12, 1),
        &circumstances(Body::Venus, day(2026, 12, 1)),
    );
    let table = reading_table(&span, &highlights(&span), &chosen, figures());
    assert_eq!(table.caption, "Venus from 1 August 2026 to 29 March 2027");
    assert_eq!(
        table.head,
        [
            "Date",
            "Lit share",
            "Diameter",
            "Lit area (arcsec²)",
            "Magnitude",
            "Angle from the Sun",
            "Remark"
        ]
    );
    assert_eq!(table.rows.len(), 12 + 2 + 1);
    assert!(table.rows.iter().all(|row| row.len() == table.head.len()));
    assert!(
        table.rows.contains(
            &[
                "1 December 2026",
                "28\u{a0}%",
                "38″",
                "313",
                "−4.8",
                "41°",
                "chosen"
            ]
            .map(str::to_owned)
            .to_vec()
        )
    );
    let remarks: Vec<&str> = table
        .rows
        .iter()
        .map(|row| row[6].as_str())
        .filter(|cell| !cell.is_empty())
        .collect();
    assert_eq!(remarks, ["brightest", "brightest", "chosen"]);
    assert_eq!(table.rows[0][0], "1 August 2026");
    assert_eq!(table.rows[14][0], "29 March 2027");
    let moon = series(Body::Moon, day(2026, 11, 1), 45);
    let chosen = Reading::new(
        day(2026, 11, 9),
        &circumstances(Body::Moon, day(2026, 11, 9)),
    );
    let table = reading_table(&moon, &Highlights::default(), &chosen, figures());
    assert_eq!(table.head[3], "Lit area (arcmin²)");
    assert!(
        table.rows.iter().any(|row| row[4] == "none"),
        "the new Moon has no magnitude"
    );
}

#[test]
fn only_great_peaks_are_called_brightest() {
    let peak = |utc: Utc, magnitude| Peak {
        utc,
        magnitude,
        flat_from: utc,
        flat_to: utc,
    };
    let marks = Highlights {
        peaks: vec![
            peak(day(2026, 1, 10), -3.9),
            peak(day(2026, 9, 23), -4.8),
            peak(day(2026, 11, 24), -4.9),
        ],
        extents: vec![GreatestExtent {
            utc: day(2026, 9, 18),
            lit_area_arcsec2: 312.6,
        }],
    };
    let near = |utc| marks.peak_near(utc).map(|peak| peak.magnitude);
    assert_eq!(marks.great_peaks().count(), 2);
    assert_eq!(
        near(day(2026, 1, 9)),
        Some(-4.8),
        "the small rise at superior conjunction is none"
    );
    assert_eq!(near(day(2026, 12, 9)), Some(-4.9));
}

#[test]
fn a_reading_between_samples_is_straight_and_none_outside() {
    let span = series(Body::Venus, day(2026, 8, 1), 240);
    let middle = Reading::within(&span, day(2026, 8, 1).plus_days(10.5)).expect("inside");
    let want = (span.angular_diameter_arcsec[10] + span.angular_diameter_arcsec[11]) / 2.0;
    assert!((middle.angular_diameter_arcsec - want).abs() < 1e-9);
    let first = Reading::within(&span, day(2026, 8, 1)).expect("the first sample");
    assert_eq!(first.magnitude, span.magnitude[0]);
    assert!(Reading::within(&span, day(2026, 7, 31)).is_none());
    assert!(Reading::within(&span, day(2027, 3, 30)).is_none());
}

proptest! {
    #[test]
    fn any_chosen_day_has_a_sentence_that_ends(step in 0.0..240.0f64) {
        let said = tradeoff(Body::Venus, day(2026, 8, 1), 240, day(2026, 8, 1).plus_days(step));
        prop_assert!(said.starts_with("On ") && said.ends_with('.') && said.len() < 320, "{said}");
        prop_assert!(!said.contains("NaN") && !said.contains("  "), "{said}");
    }
}
