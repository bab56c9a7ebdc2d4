//! Discs, rings and the Moon's edge measure what they claim.

use super::support_chart::recorder::{Drawn, Seen, record};
use super::support_chart::{circumstances, day, pictures, series};
use super::{drawn, venus};
use wanderlight::chart::{DiscModel, Picture, Theme, Viewport};
use wanderlight::{Body, Utc};

fn area(points: &[(i32, i32)]) -> f64 {
    let next = points.iter().cycle().skip(1);
    let cross = |(a, b): (&(i32, i32), &(i32, i32))| {
        f64::from(a.0) * f64::from(b.1) - f64::from(b.0) * f64::from(a.1)
    };
    points.iter().zip(next).map(cross).sum::<f64>().abs() / 2.0
}

/// Middle of the chosen disc, its radius, and the outline of its lit part.
fn chosen_disc(picture: &Picture) -> ((f64, f64), f64, Vec<(i32, i32)>) {
    let seen = drawn(picture, 1600.0);
    let theme = Theme::light();
    let ring = seen.iter().find_map(|mark| match mark.drawn {
        Drawn::Ring(at, radius, _) if mark.colour == theme.ink => Some((at, radius)),
        _ => None,
    });
    let lit = seen.iter().find_map(|mark| match &mark.drawn {
        Drawn::Area(points) if mark.colour == theme.sunlit => Some(points.clone()),
        _ => None,
    });
    let (at, radius) = ring.expect("the limb of the chosen disc");
    (
        (f64::from(at.0), f64::from(at.1)),
        f64::from(radius),
        lit.expect("a lit part"),
    )
}

#[test]
fn the_lit_part_covers_the_lit_share_of_the_disc() {
    for step in 0..=24 {
        let chosen = day(2026, 8, 1).plus_days(f64::from(step) * 10.0);
        let [_, disc] = venus(chosen);
        let (_, radius, lit) = chosen_disc(&disc);
        let share = area(&lit) / (std::f64::consts::PI * radius * radius);
        let want = circumstances(Body::Venus, chosen)
            .illuminated_fraction
            .expect("a phase");
        assert!(
            (share - want).abs() < 0.006,
            "step {step}: drawn {share:.4}, lit {want:.4}"
        );
    }
}

#[test]
fn the_lit_limb_points_where_the_sky_shows_it() {
    // An evening planet is lit from the west: to the right with north up, and 20 degrees beyond west is upwards.
    let towards = |chosen: Utc, up: f64| {
        let [_, disc] = pictures(&series(Body::Venus, day(2026, 8, 1), 240), chosen, up);
        let (centre, _, lit) = chosen_disc(&disc);
        let n = lit.len() as f64;
        let mean = lit.iter().fold((0.0, 0.0), |sum, p| {
            (sum.0 + f64::from(p.0) / n, sum.1 + f64::from(p.1) / n)
        });
        let (x, y) = (mean.0 - centre.0, mean.1 - centre.1);
        // Position angle from the top, counted to the left.
        (-x).atan2(-y).to_degrees().rem_euclid(360.0)
    };
    for (chosen, up, want) in [
        (day(2026, 9, 15), 0.0, 290.0),
        (day(2026, 12, 15), 0.0, 110.0),
        (day(2026, 12, 15), 50.0, 60.0),
    ] {
        let got = towards(chosen, up);
        assert!(
            (got - want).abs() < 1.0,
            "lit limb at {got:.1}, wanted {want} with {up} up"
        );
    }
}

#[test]
fn discs_keep_one_scale() {
    let [_, disc] = venus(day(2026, 12, 1));
    let seen = drawn(&disc, 1600.0);
    let radii: Vec<f64> = seen
        .iter()
        .filter_map(|mark| match mark.drawn {
            Drawn::Ring(_, radius, _) => Some(f64::from(radius)),
            _ => None,
        })
        .collect();
    let row = &DiscModel::dates(day(2026, 8, 1), day(2026, 8, 1).plus_days(240.0))[12..];
    let mut arcsec: Vec<f64> = row
        .iter()
        .map(|&utc| circumstances(Body::Venus, utc).angular_diameter_arcsec)
        .collect();
    arcsec.push(circumstances(Body::Venus, day(2026, 12, 1)).angular_diameter_arcsec);
    assert_eq!(
        radii.len(),
        arcsec.len(),
        "nine discs in the row and the chosen one"
    );
    let scale = radii[0] / arcsec[0];
    for (radius, arcsec) in radii.iter().zip(&arcsec) {
        assert!(
            (radius - scale * arcsec).abs() < 8.0,
            "radius {radius} for {arcsec}″ at {scale} units each"
        );
    }
    // The Moon's edge, 1864.5 arcsec across, sinks to both sides by x^2 / 2r.
    let moon = seen
        .iter()
        .find(|mark| mark.colour == Theme::light().moon)
        .expect("the Moon's edge");
    let Drawn::Area(points) = &moon.drawn else {
        panic!("the Moon's edge is an area")
    };
    let apex = points.iter().min_by_key(|point| point.1).expect("points");
    let beside = points
        .iter()
        .find(|point| (apex.0 - point.0 - 2000).abs() < 300)
        .expect("a point beside the apex");
    let across = f64::from(apex.0 - beside.0);
    let moon_radius = scale * 1864.5;
    let want = across * across / (2.0 * moon_radius);
    assert!(
        (f64::from(beside.1 - apex.1) - want).abs() < 3.0,
        "sinks {} instead of {want}",
        beside.1 - apex.1
    );
}

#[test]
fn saturn_wears_its_rings_at_their_opening() {
    let [_, disc] = pictures(
        &series(Body::Saturn, day(2026, 6, 1), 360),
        day(2026, 9, 1),
        4.0,
    );
    let seen = drawn(&disc, 1600.0);
    let theme = Theme::light();
    let limb = seen.iter().find_map(|mark| match &mark.drawn {
        Drawn::Line(points, _) if mark.colour == theme.ink && points.len() > 20 => Some(
            Seen {
                drawn: Drawn::Area(points.clone()),
                ..mark.clone()
            }
            .bounds(),
        ),
        _ => None,
    });
    let limb = limb.expect("the limb of the chosen globe");
    let radius = (limb[2] - limb[0]) / 2.0;
    let middle = (limb[0] + limb[2]) / 2.0;
    // The globe is flattened: 54,364 km over 60,268 km, seen 9.5 degrees from its equator.
    let polar = (limb[3] - limb[1]) / (limb[2] - limb[0]);
    assert!((polar - 0.9047).abs() < 0.01, "apparent flattening {polar}");
    let rings: Vec<[f64; 4]> = seen
        .iter()
        .filter(|mark| mark.colour == theme.glow && matches!(mark.drawn, Drawn::Area(_)))
        .map(Seen::bounds)
        .filter(|b| b[1] < limb[3] && b[3] > limb[1] && (b[0] + b[2] - 2.0 * middle).abs() < 6.0)
        .collect();
    assert_eq!(rings.len(), 4, "two rings in two halves each");
    let widest = rings
        .iter()
        .map(|b| (b[2] - b[0]) / 2.0 / radius)
        .fold(0.0, f64::max);
    assert!(
        (widest - 136_780.0 / 60_268.0).abs() < 0.02,
        "ring edge at {widest} radii"
    );
    let tallest = rings.iter().map(|b| b[3] - b[1]).fold(0.0, f64::max) / radius;
    assert!(
        (tallest - widest * 9.5f64.to_radians().sin()).abs() < 0.03,
        "ring opens to {tallest} radii"
    );
}

#[test]
fn the_moon_has_no_edge_of_itself_and_a_flat_orbit_no_crash() {
    let [_, disc] = pictures(
        &series(Body::Moon, day(2026, 11, 1), 45),
        day(2026, 11, 14),
        0.0,
    );
    assert!(
        drawn(&disc, 800.0)
            .iter()
            .all(|mark| mark.colour != Theme::light().moon)
    );
    let mut empty = series(Body::Venus, day(2026, 8, 1), 0);
    let [tradeoff, _] = pictures(&empty, day(2026, 8, 1), 0.0);
    assert_eq!(
        tradeoff.date_at(400.0, &Viewport::new(800.0, 460.0, 1.0)),
        None
    );
    assert!(record(&tradeoff, &Viewport::new(800.0, 460.0, 1.0), &Theme::dark()).is_ok());
    for column in [&mut empty.magnitude, &mut empty.lit_area_arcsec2] {
        column.fill(f64::NAN);
    }
    let [tradeoff, _] = pictures(&empty, day(2026, 8, 1), 0.0);
    assert!(record(&tradeoff, &Viewport::new(800.0, 460.0, 1.0), &Theme::dark()).is_ok());
}
