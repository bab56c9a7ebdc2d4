//! The plan: texts apart, true distances, lit halves towards the Sun, and what a pointer takes hold of.

use super::support_chart::plan::{picture, places, plan, sample, spans};
use super::support_chart::recorder::{Drawn, Seen, record};
use super::support_chart::{circumstances, day, figures};
use super::{WIDTHS, check_marks, drawn, texts, view};
use wanderlight::chart::{Picture, PlanGrip, Theme, Viewport, to_svg};
use wanderlight::explain::{DateForm, sentence_plan};
use wanderlight::{Body, Code, Utc};

fn venus(chosen: Utc) -> Picture {
    picture(Body::Venus, day(2026, 2, 1), 584, chosen)
}

#[test]
fn everything_lies_inside_and_no_text_touches_another() {
    for (body, from, days) in spans() {
        for step in 0..=24 {
            let chosen = from.plus_days((days * step) as f64 / 24.0);
            let picture = picture(body, from, days, chosen);
            for width in WIDTHS {
                for density in [1.0, 2.0] {
                    let view = view(&picture, width, density);
                    let seen =
                        record(&picture, &view, &Theme::dark()).expect("the plan can be drawn");
                    let label = format!("{body} day {step}/24, {width} px, density {density}");
                    check_marks(&seen, &view, &label);
                }
            }
        }
    }
}

#[test]
fn names_readings_and_the_angle_are_always_there() {
    for (body, from, days) in spans() {
        for step in 0..=24 {
            let chosen = from.plus_days((days * step) as f64 / 24.0);
            let facts = circumstances(body, chosen);
            let wanted = [
                figures().date(chosen, DateForm::Day),
                figures().words.body_heading(body).to_owned(),
                "Earth".to_owned(),
                format!(
                    "elongation {}°",
                    figures().number(facts.elongation_deg.unwrap_or(f64::NAN), 0)
                ),
                format!(
                    "{} across",
                    figures().diameter(facts.angular_diameter_arcsec)
                ),
                figures().magnitude(facts.magnitude.unwrap_or(f64::NAN)),
                "as seen from the Earth".to_owned(),
            ];
            let picture = picture(body, from, days, chosen);
            for width in WIDTHS {
                let seen = drawn(&picture, width);
                let texts = texts(&seen);
                for wanted in &wanted {
                    assert!(
                        texts.contains(&wanted.as_str()),
                        "{body}, day {step}/24, {width} px: no \"{wanted}\" among {texts:?}"
                    );
                }
            }
        }
    }
}

/// Centre and radius of the largest globe of the lit colour's dark side that is not the disc seen from the Earth.
fn night_globes(seen: &[Seen]) -> Vec<((f64, f64), f64)> {
    seen.iter()
        .filter(|mark| mark.colour == Theme::light().night_side)
        .filter_map(|mark| match mark.drawn {
            Drawn::Disc(at, radius) => {
                Some(((f64::from(at.0), f64::from(at.1)), f64::from(radius)))
            }
            _ => None,
        })
        .collect()
}

#[test]
fn distances_are_true_and_lit_halves_look_at_the_sun() {
    let chosen = day(2026, 12, 1);
    for body in [Body::Mercury, Body::Venus, Body::Mars, Body::Jupiter] {
        let picture = picture(body, day(2026, 6, 1), 400, chosen);
        let seen = drawn(&picture, 800.0);
        let globes = night_globes(&seen);
        let sun = seen
            .iter()
            .find_map(|mark| match mark.drawn {
                Drawn::Disc(at, _) if mark.colour == Theme::light().glow => {
                    Some((f64::from(at.0), f64::from(at.1)))
                }
                _ => None,
            })
            .expect("a Sun");
        let away = |a: (f64, f64), b: (f64, f64)| (a.0 - b.0).hypot(a.1 - b.1);
        let (earth, planet) = (globes[0], globes[1]);
        let [earth_au, planet_au] = places(body, chosen);
        let true_ratio = planet_au[0].hypot(planet_au[1]) / earth_au[0].hypot(earth_au[1]);
        let drawn_ratio = away(planet.0, sun) / away(earth.0, sun);
        assert!(
            (drawn_ratio / true_ratio - 1.0).abs() < 0.02,
            "{body}: {drawn_ratio} for {true_ratio}"
        );
        let apart_au = (planet_au[0] - earth_au[0]).hypot(planet_au[1] - earth_au[1]);
        let drawn_apart = away(planet.0, earth.0) / away(earth.0, sun);
        assert!((drawn_apart / apart_au - 1.0).abs() < 0.02, "{body}");
        for (at, radius) in [earth, planet] {
            let half = seen
                .iter()
                .filter(|mark| mark.colour == Theme::light().sunlit)
                .filter(|mark| matches!(mark.drawn, Drawn::Area(_)))
                .map(Seen::bounds)
                .map(|b| ((b[0] + b[2]) / 2.0, (b[1] + b[3]) / 2.0))
                .find(|&middle| away(middle, at) < radius)
                .expect("a lit half");
            let nearer = away(at, sun) - away(half, sun);
            assert!(nearer > 0.2 * radius, "{body}: lit away from the Sun");
        }
    }
}

#[test]
fn what_is_to_scale_is_said() {
    for (body, from, days) in spans() {
        let seen = drawn(&picture(body, from, days, from), 360.0);
        let shortened = matches!(body, Body::Uranus | Body::Neptune);
        let wanted = if shortened {
            "far distances shortened, bodies enlarged"
        } else {
            "distances to scale, bodies enlarged"
        };
        assert!(texts(&seen).contains(&wanted), "{body}");
    }
}

#[test]
fn a_pointer_takes_hold_of_bodies_orbits_and_dates() {
    let chosen = day(2026, 12, 1);
    let model = plan(Body::Venus, day(2026, 2, 1), 584, chosen);
    let picture = Picture::Plan(Box::new(model.clone()));
    for width in WIDTHS {
        let view = view(&picture, width, 1.0);
        let seen = record(&picture, &view, &Theme::light()).expect("drawn");
        let globes = night_globes(&seen);
        let (earth, planet) = (globes[0].0, globes[1].0);
        assert_eq!(model.grip_at(planet, &view), Some(PlanGrip::Planet));
        assert_eq!(model.grip_at(earth, &view), Some(PlanGrip::Earth));
        let bottom = (width / 2.0, view.height_css - 40.0);
        assert_eq!(model.grip_at(bottom, &view), Some(PlanGrip::Dates));
        assert_eq!(model.grip_at((10.0, 10.0), &view), None);
        let [_, planet_au] = places(Body::Venus, chosen);
        let pointed = model.direction_at_rad(planet, &view);
        let off = (pointed - planet_au[1].atan2(planet_au[0])).abs();
        assert!(off < 0.03, "{width} px: {off}");
    }
}

#[test]
fn moving_the_date_equals_building_anew() {
    let (first, second) = (day(2026, 9, 1), day(2026, 12, 1));
    let mut model = plan(Body::Venus, day(2026, 2, 1), 584, first);
    let now = circumstances(Body::Venus, second);
    model.set_chosen(&sample(Body::Venus, second, &now), figures());
    assert_eq!(
        drawn(&Picture::Plan(Box::new(model)), 800.0),
        drawn(&venus(second), 800.0)
    );
}

#[test]
fn positions_and_dates_are_each_others_inverse() {
    let picture = venus(day(2026, 12, 1));
    for width in WIDTHS {
        let view = view(&picture, width, 2.0);
        for step in 0..=24 {
            let utc = day(2026, 2, 1).plus_days(f64::from(step) * 24.0);
            let back = picture
                .date_at(picture.x_of_date(utc, &view), &view)
                .expect("a date");
            assert!((back.days_since_j2000() - utc.days_since_j2000()).abs() < 1e-6);
        }
    }
}

#[test]
fn a_surface_that_is_too_small_is_refused_and_svg_holds_only_numbers() {
    let picture = venus(day(2026, 12, 1));
    for (width, height) in [(200.0, 600.0), (800.0, 200.0), (f64::NAN, 9.0)] {
        let view = Viewport::new(width, height, 1.0);
        let refusal = record(&picture, &view, &Theme::light()).err();
        assert_eq!(refusal.map(|error| error.code()), Some(Code::Drawing));
    }
    let svg = to_svg(
        &picture,
        800.0,
        picture.preferred_height(800.0),
        &Theme::night(),
    )
    .expect("an SVG");
    assert!(svg.contains("elongation") && !svg.contains("NaN") && !svg.contains("inf"));
}

#[test]
fn the_sentence_tells_where_the_planet_stands() {
    let said = |body: Body, chosen: Utc| {
        sentence_plan(body, chosen, &circumstances(body, chosen), figures())
    };
    for (body, chosen, words) in [
        (Body::Venus, day(2026, 11, 1), "turned away from us"),
        (Body::Venus, day(2026, 11, 28), "near part of its orbit"),
        (Body::Venus, day(2027, 1, 5), "to one side of the Sun"),
        (Body::Venus, day(2027, 3, 20), "far part of its orbit"),
        (Body::Venus, day(2027, 8, 10), "beyond the Sun"),
        (Body::Mars, day(2027, 2, 19), "opposite to the Sun"),
        (Body::Mars, day(2026, 10, 1), "farther out than we are"),
        (Body::Mars, day(2026, 1, 20), "beyond the Sun and far away"),
    ] {
        let sentence = said(body, chosen);
        assert!(sentence.contains(words), "{sentence}");
        let elongation = circumstances(body, chosen).elongation_deg.unwrap_or(0.0);
        let angle = format!("{}°", figures().number(elongation, 0));
        assert!(sentence.contains(&angle), "{sentence}");
    }
}
