//! What a page may rely on: positions, sizes, colours, refusals, and SVG.

use super::support_chart::recorder::{Drawn, Seen, record};
use super::support_chart::{circumstances, day, figures, highlights, pictures, series};
use super::{WIDTHS, check_marks, drawn, texts, venus, view};
use wanderlight::chart::{
    Colour, DiscModel, DiscSample, Picture, Theme, TradeoffModel, Viewport, to_svg,
};
use wanderlight::explain::Orientation;
use wanderlight::{Body, Code};

const THEMES: [fn() -> Theme; 3] = [Theme::light, Theme::dark, Theme::night];

#[test]
fn moving_the_date_equals_building_anew() {
    let span = series(Body::Venus, day(2026, 8, 1), 240);
    let (first, second) = (day(2026, 9, 1), day(2026, 12, 1));
    let now = circumstances(Body::Venus, second);
    let [mut tradeoff, mut disc] = pictures(&span, first, 0.0);
    if let Picture::Tradeoff(model) = &mut tradeoff {
        model.set_chosen(second, &now, figures());
    }
    if let Picture::Disc(model) = &mut disc {
        model.set_chosen(
            &DiscSample {
                utc: second,
                circumstances: &now,
                up_angle_deg: 0.0,
            },
            figures(),
        );
    }
    let [new_tradeoff, new_disc] = pictures(&span, second, 0.0);
    assert_eq!(drawn(&tradeoff, 800.0), drawn(&new_tradeoff, 800.0));
    assert_eq!(drawn(&disc, 800.0), drawn(&new_disc, 800.0));
}

#[test]
fn positions_and_dates_are_each_others_inverse() {
    for picture in &venus(day(2026, 12, 1)) {
        for width in WIDTHS {
            let view = view(picture, width, 2.0);
            for step in 0..=24 {
                let utc = day(2026, 8, 1).plus_days(f64::from(step) * 10.0);
                let back = picture
                    .date_at(picture.x_of_date(utc, &view), &view)
                    .expect("a date");
                assert!(
                    (back.days_since_j2000() - utc.days_since_j2000()).abs() < 1e-6,
                    "{width} px, step {step}"
                );
            }
            let last = day(2026, 8, 1).plus_days(240.0);
            let held = picture.date_at(1e9, &view).expect("a date");
            assert!(
                (held.days_since_j2000() - last.days_since_j2000()).abs() < 1e-6,
                "held within the span"
            );
            assert_eq!(picture.date_at(f64::NAN, &view), None);
        }
    }
}

#[test]
fn the_grip_is_large_enough_for_a_finger() {
    for picture in &venus(day(2026, 12, 1)) {
        for width in WIDTHS {
            let seen = drawn(picture, width);
            let grip = seen
                .iter()
                .filter(|mark| {
                    mark.colour == Theme::light().chosen && matches!(mark.drawn, Drawn::Area(_))
                })
                .map(Seen::bounds)
                .max_by(|a, b| (a[2] - a[0]).total_cmp(&(b[2] - b[0])))
                .expect("a grip");
            assert!(
                grip[2] - grip[0] >= 240.0 && grip[3] - grip[1] >= 240.0,
                "{grip:?} in tenths at {width} px"
            );
        }
    }
}

#[test]
fn a_surface_that_is_too_small_is_refused_with_a_sentence() {
    for picture in &venus(day(2026, 12, 1)) {
        for (width, height, density) in [
            (200.0, 500.0, 1.0),
            (800.0, 100.0, 1.0),
            (800.0, 500.0, 0.0),
            (f64::NAN, 9.0, 1.0),
        ] {
            let refusal = record(
                picture,
                &Viewport::new(width, height, density),
                &Theme::light(),
            )
            .err();
            assert_eq!(
                refusal.map(|error| error.code()),
                Some(Code::Drawing),
                "{width} x {height} at {density}"
            );
        }
    }
}

/// Relative luminance, WCAG 2.2.
fn luminance(colour: Colour) -> f64 {
    let linear = |channel: u8| {
        let c = f64::from(channel) / 255.0;
        if c <= 0.04045 {
            c / 12.92
        } else {
            ((c + 0.055) / 1.055).powf(2.4)
        }
    };
    0.2126 * linear(colour.0) + 0.7152 * linear(colour.1) + 0.0722 * linear(colour.2)
}

fn contrast(a: Colour, b: Colour) -> f64 {
    let (a, b) = (luminance(a) + 0.05, luminance(b) + 0.05);
    a.max(b) / a.min(b)
}

#[test]
fn colours_have_contrast() {
    for (index, theme) in THEMES.iter().map(|theme| theme()).enumerate() {
        let enough = |what: &str, a: Colour, b: Colour, least: f64| {
            let got = contrast(a, b);
            assert!(
                got >= least,
                "theme {index}, {what}: {got:.2} is below {least}"
            );
        };
        for ground in [theme.background, theme.panel, theme.moon] {
            enough("text", theme.ink, ground, 4.5);
            enough("quiet text", theme.muted, ground, 4.5);
        }
        enough("text on the grip", theme.on_chosen, theme.chosen, 4.5);
        for ground in [theme.background, theme.panel] {
            for (what, line) in [
                ("light", theme.light),
                ("size", theme.size),
                ("limb", theme.limb),
                ("chosen", theme.chosen),
            ] {
                enough(what, line, ground, 3.0);
            }
        }
        enough("curve on its own tint", theme.light, theme.light_tint, 3.0);
        enough("curve on its own tint", theme.size, theme.size_tint, 3.0);
        enough("lit against unlit", theme.sunlit, theme.night_side, 1.3);
    }
}

#[test]
fn svg_has_the_size_asked_for_and_only_numbers() {
    for picture in &venus(day(2026, 12, 1)) {
        for theme in THEMES {
            let height = picture.preferred_height(800.0);
            let svg = to_svg(picture, 800.0, height, &theme()).expect("an SVG");
            assert!(svg.starts_with(&format!(
                "<svg width=\"800\" height=\"{height}\" viewBox=\"0 0 8000 "
            )));
            assert!(svg.trim_end().ends_with("</svg>"));
            assert!(
                svg.contains("1 December 2026") && !svg.contains("NaN") && !svg.contains("inf")
            );
        }
    }
}

#[test]
fn the_models_hold_for_any_chosen_date() {
    let span = series(Body::Venus, day(2026, 8, 1), 240);
    let far = day(2031, 1, 1);
    let model = TradeoffModel::new(
        &span,
        &highlights(&span),
        far,
        &circumstances(Body::Venus, far),
        figures(),
    );
    let picture = Picture::Tradeoff(model);
    let view = view(&picture, 360.0, 3.0);
    let seen = record(&picture, &view, &Theme::night())
        .expect("drawn with the line at the end of the span");
    check_marks(&seen, &view, "a date outside the span");
    assert!(texts(&seen).contains(&"1 January 2031"));
    let facts = circumstances(Body::Venus, far);
    let chosen = DiscSample {
        utc: far,
        circumstances: &facts,
        up_angle_deg: 0.0,
    };
    let bare = Picture::Disc(DiscModel::new(
        &span,
        &[],
        &chosen,
        Orientation::ZenithUp,
        figures(),
    ));
    let seen = drawn(&bare, 800.0);
    assert!(texts(&seen).contains(&"zenith up, as it stands in the sky"));
}
