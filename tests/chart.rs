//! Pictures on a recording surface: everything inside, no text on text, and shapes that measure what they claim.

#[path = "chart/contract.rs"]
mod contract;
#[path = "chart/curves.rs"]
mod curves;
#[path = "chart/discs.rs"]
mod discs;
#[path = "chart/plan.rs"]
mod plan;
mod support_chart;

use support_chart::recorder::{Drawn, Seen, record};
use support_chart::{circumstances, day, figures, pictures, series, spans};
use wanderlight::chart::{Picture, Theme, Viewport};
use wanderlight::explain::DateForm;
use wanderlight::{Body, Utc};

const WIDTHS: [f64; 11] = [
    280.0, 320.0, 360.0, 479.0, 480.0, 619.0, 620.0, 800.0, 900.0, 1280.0, 1600.0,
];

fn view(picture: &Picture, width: f64, density: f64) -> Viewport {
    Viewport::new(width, picture.preferred_height(width), density)
}

fn drawn(picture: &Picture, width: f64) -> Vec<Seen> {
    // Ten units a pixel, so that shapes can be measured.
    let view = view(picture, width, 1.0).with_subpixels(10);
    record(picture, &view, &Theme::light()).expect("the picture can be drawn")
}

fn texts(seen: &[Seen]) -> Vec<&str> {
    seen.iter().filter_map(Seen::text).collect()
}

fn venus(chosen: Utc) -> [Picture; 2] {
    pictures(&series(Body::Venus, day(2026, 8, 1), 240), chosen, 0.0)
}

#[test]
fn everything_lies_inside_and_no_text_touches_another() {
    for (body, from, days) in spans() {
        let span = series(body, from, days);
        for step in 0..=8 {
            let chosen = from.plus_days((days * step) as f64 / 8.0);
            for (picture, width) in pictures(&span, chosen, 0.0)
                .iter()
                .flat_map(|p| WIDTHS.map(|width| (p, width)))
            {
                for density in [1.0, 1.5, 2.0] {
                    let view = view(picture, width, density);
                    let seen =
                        record(picture, &view, &Theme::light()).expect("the picture can be drawn");
                    check_marks(
                        &seen,
                        &view,
                        &format!("{body} day {step}/8 of {days}, {width} px, density {density}"),
                    );
                }
            }
        }
    }
}

fn check_marks(seen: &[Seen], view: &Viewport, label: &str) {
    assert!(
        seen.len() < 300,
        "{label}: {} marks are too many to redraw while dragging",
        seen.len()
    );
    let (right, bottom) = (
        view.width_css * view.density,
        view.height_css * view.density,
    );
    for mark in seen {
        let [x0, y0, x1, y1] = mark.bounds();
        let inside = x0 >= -1.0 && y0 >= -1.0 && x1 <= right + 1.0 && y1 <= bottom + 1.0;
        assert!(inside, "{label}: {mark:?} leaves the surface");
    }
    let texts: Vec<&Seen> = seen.iter().filter(|mark| mark.text().is_some()).collect();
    for (index, mark) in texts.iter().enumerate() {
        let a = mark.bounds();
        if let Drawn::Text(words, _, size) = &mark.drawn {
            assert!(
                *size >= 8.99 * view.density,
                "{label}: \"{words}\" is only {size} high"
            );
        }
        for other in &texts[index + 1..] {
            let b = other.bounds();
            let touch = a[0] < b[2] && b[0] < a[2] && a[1] < b[3] && b[1] < a[3];
            assert!(
                !touch,
                "{label}: {:?} touches {:?}",
                mark.text(),
                other.text()
            );
        }
    }
}

#[test]
fn the_chosen_readings_are_there_for_every_body() {
    for (body, from, days) in spans() {
        let span = series(body, from, days);
        for step in 0..=8 {
            let chosen = from.plus_days((days * step) as f64 / 8.0);
            let facts = circumstances(body, chosen);
            let date = figures().date(chosen, DateForm::Day);
            let lit = figures().lit_share(facts.illuminated_fraction.unwrap_or(f64::NAN));
            let across = format!(
                "{} across",
                figures().diameter(facts.angular_diameter_arcsec)
            );
            let magnitude = figures().magnitude(facts.magnitude.unwrap_or(f64::NAN));
            for (picture, width) in pictures(&span, chosen, 0.0)
                .iter()
                .flat_map(|p| WIDTHS.map(|width| (p, width)))
            {
                let seen = drawn(picture, width);
                let texts = texts(&seen);
                for wanted in [&date, &across, &magnitude] {
                    assert!(
                        texts.contains(&wanted.as_str()),
                        "{body}, {width} px: no \"{wanted}\" among {texts:?}"
                    );
                }
                let shown = texts.iter().any(|text| text.starts_with(&lit));
                assert!(
                    shown || body == Body::Sun,
                    "{body}, {width} px: no \"{lit}\" among {texts:?}"
                );
            }
        }
    }
}

#[test]
fn the_readings_and_the_named_peak_are_there_at_every_width() {
    let [tradeoff, disc] = venus(day(2026, 12, 1));
    for width in WIDTHS {
        let seen = drawn(&tradeoff, width);
        let texts = texts(&seen);
        let has = |start: &str| texts.iter().any(|text| text.starts_with(start));
        for start in [
            "1 December 2026",
            "28\u{a0}%",
            "38″ across",
            "313\u{a0}arcsec²",
            "magnitude −4.8",
            "brightest: 24 Nov",
            "within 0.1 mag for 26 days",
            "greatest illuminated extent: 29 Nov",
            "brighter",
        ] {
            assert!(
                has(start),
                "\"{start}\" is missing at {width} px among {texts:?}"
            );
        }
        let seen = drawn(&disc, width);
        let texts = self::texts(&seen);
        for text in [
            "1 December 2026",
            "28\u{a0}% lit",
            "38″ across",
            "magnitude −4.8",
            "celestial north up, east left",
        ] {
            assert!(
                texts.contains(&text),
                "\"{text}\" is missing at {width} px among {texts:?}"
            );
        }
        assert!(
            texts
                .iter()
                .any(|text| text.contains("of the Moon’s width")),
            "no scale bar at {width} px"
        );
    }
}

#[test]
fn the_label_names_the_peak_nearest_to_the_chosen_date() {
    let [before, _] = venus(day(2026, 9, 1));
    let [after, _] = venus(day(2027, 2, 1));
    assert!(
        texts(&drawn(&before, 800.0))
            .iter()
            .any(|text| text.starts_with("brightest: 23 September 2026"))
    );
    assert!(
        texts(&drawn(&after, 800.0))
            .iter()
            .any(|text| text.starts_with("brightest: 24 November 2026"))
    );
}
