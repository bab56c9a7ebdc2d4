//! The curves of the trade-off measure what they claim.

use super::support_chart::recorder::{Drawn, Seen};
use super::support_chart::{circumstances, day, pictures, series};
use super::{drawn, view};
use wanderlight::chart::Theme;
use wanderlight::{Body, Utc};

#[test]
fn a_curve_without_a_value_has_a_gap() {
    let ink = Theme::light().ink;
    let runs = |body, days| {
        let [tradeoff, _] = pictures(&series(body, day(2026, 8, 1), days), day(2026, 9, 1), 0.0);
        let seen = drawn(&tradeoff, 800.0);
        let long =
            |mark: &&Seen| matches!(&mark.drawn, Drawn::Line(points, _) if points.len() > 10);
        seen.iter()
            .filter(|mark| mark.colour == ink)
            .filter(long)
            .count()
    };
    assert_eq!(
        runs(Body::Venus, 240),
        2,
        "the law of Venus has no value near inferior conjunction"
    );
    assert_eq!(runs(Body::Jupiter, 240), 1);
}

#[test]
fn brighter_is_up() {
    let [tradeoff, _] = pictures(
        &series(Body::Mars, day(2026, 9, 1), 360),
        day(2027, 2, 1),
        0.0,
    );
    let seen = drawn(&tradeoff, 800.0);
    let curve = seen
        .iter()
        .filter(|mark| mark.colour == Theme::light().ink)
        .find_map(|mark| match &mark.drawn {
            Drawn::Line(points, _) if points.len() > 10 => Some(points),
            _ => None,
        });
    let highest = curve
        .and_then(|points| points.iter().min_by_key(|point| point.1))
        .expect("a curve of brightness");
    let view = view(&tradeoff, 800.0, 1.0);
    let opposition = tradeoff.x_of_date(day(2027, 2, 19), &view);
    assert!(
        (f64::from(highest.0) / 10.0 - opposition).abs() < 4.0,
        "highest at {highest:?}, opposition at {opposition}"
    );
}

#[test]
fn the_halo_grows_in_area_with_the_light() {
    let span = series(Body::Venus, day(2026, 8, 1), 240);
    let halo = |chosen: Utc| {
        let [tradeoff, _] = pictures(&span, chosen, 0.0);
        let seen = drawn(&tradeoff, 800.0);
        let radius = seen.iter().find_map(|mark| match mark.drawn {
            Drawn::Disc(_, radius) if mark.colour == Theme::light().glow => Some(f64::from(radius)),
            _ => None,
        });
        (
            radius.expect("a halo"),
            circumstances(Body::Venus, chosen)
                .magnitude
                .expect("a magnitude"),
        )
    };
    let ((r1, m1), (r2, m2)) = (halo(day(2026, 11, 24)), halo(day(2027, 3, 20)));
    let (drawn, light) = ((r2 / r1).powi(2), 10f64.powf(-0.4 * (m2 - m1)));
    assert!((drawn - light).abs() < 0.01, "areas {drawn}, light {light}");
}
