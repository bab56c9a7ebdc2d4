//! The decoded tables against DE440, and against themselves.

use super::packed::{HIGHEST_MULTIPLE, POWERS, Reader, Series};
use super::*;
use crate::time::Tt;

const BODIES: [SeriesBody; 8] = [
    SeriesBody::Mercury,
    SeriesBody::Venus,
    SeriesBody::EarthMoonBarycentre,
    SeriesBody::Mars,
    SeriesBody::Jupiter,
    SeriesBody::Saturn,
    SeriesBody::Uranus,
    SeriesBody::Neptune,
];

const ARCSEC_PER_RADIAN: f64 = 180.0 * 3600.0 / std::f64::consts::PI;

fn length(vector: [f64; 3]) -> f64 {
    vector.iter().map(|x| x * x).sum::<f64>().sqrt()
}

fn difference(a: [f64; 3], b: [f64; 3]) -> [f64; 3] {
    [a[0] - b[0], a[1] - b[1], a[2] - b[2]]
}

/// Largest heliocentric direction error allowed, arcsec: about the largest that the builder finds over the whole span.
fn direction_tolerance_arcsec(body: SeriesBody) -> f64 {
    match body {
        SeriesBody::Mercury => 0.8,
        SeriesBody::Venus => 0.35,
        SeriesBody::EarthMoonBarycentre => 0.2,
        SeriesBody::Mars => 0.3,
        _ => 0.6,
    }
}

/// Largest relative error of the distance from the Sun allowed, likewise.
fn radius_tolerance(body: SeriesBody) -> f64 {
    match body {
        SeriesBody::Mercury => 3e-6,
        SeriesBody::Venus | SeriesBody::EarthMoonBarycentre | SeriesBody::Mars => 1.5e-6,
        SeriesBody::Jupiter => 1e-5,
        SeriesBody::Saturn => 2e-5,
        SeriesBody::Uranus => 3e-5,
        SeriesBody::Neptune => 5e-5,
    }
}

#[test]
fn planets_agree_with_de440() {
    for &(body, days, expected_au) in reference::PLANETS {
        let position_au = heliocentric_position_au(body, Tt::from_days_since_j2000(days));
        let radius_au = length(expected_au);
        let relative = (length(position_au) / radius_au - 1.0).abs();
        assert!(
            relative < radius_tolerance(body),
            "{body:?} {days}: radius {relative:e}"
        );
        let scaled = position_au.map(|x| x * radius_au / length(position_au));
        let apart_arcsec = length(difference(scaled, expected_au)) / radius_au * ARCSEC_PER_RADIAN;
        assert!(
            apart_arcsec < direction_tolerance_arcsec(body),
            "{body:?} {days}: {apart_arcsec} arcsec"
        );
    }
}

#[test]
fn nearest_neighbours_agree_as_seen_from_the_earth() {
    let seen = |body: SeriesBody| {
        let of_body = move |day: f64| {
            let found = reference::PLANETS
                .iter()
                .find(|row| row.0 == body && row.1 == day);
            found.map(|row| row.2)
        };
        let earths = reference::PLANETS
            .iter()
            .filter(|row| row.0 == SeriesBody::EarthMoonBarycentre);
        earths.filter_map(move |earth| Some((earth.1, difference(of_body(earth.1)?, earth.2))))
    };
    for (body, tolerance_arcsec) in [(SeriesBody::Venus, 1.2), (SeriesBody::Mars, 1.0)] {
        let mut nearest_au = f64::INFINITY;
        for (days, expected_au) in seen(body) {
            let tt = Tt::from_days_since_j2000(days);
            let place_au = difference(
                heliocentric_position_au(body, tt),
                heliocentric_position_au(SeriesBody::EarthMoonBarycentre, tt),
            );
            let apart_arcsec =
                length(difference(place_au, expected_au)) / length(expected_au) * ARCSEC_PER_RADIAN;
            assert!(
                apart_arcsec < tolerance_arcsec,
                "{body:?} {days}: {apart_arcsec} arcsec"
            );
            nearest_au = nearest_au.min(length(expected_au));
        }
        assert!(
            nearest_au < 0.7,
            "{body:?}: no near place among the cases ({nearest_au} au)"
        );
    }
}

#[test]
fn moon_agrees_with_de440() {
    for &(days, [longitude_deg, latitude_deg, distance_km]) in reference::MOON {
        let moon = moon_of_date(Tt::from_days_since_j2000(days));
        let turns = (moon.longitude_rad.to_degrees() - longitude_deg) / 360.0;
        let along_arcsec = (turns - turns.round()) * 1_296_000.0 * latitude_deg.to_radians().cos();
        let across_arcsec = (moon.latitude_rad.to_degrees() - latitude_deg) * 3600.0;
        assert!(
            along_arcsec.hypot(across_arcsec) < 1.5,
            "{days}: {along_arcsec}, {across_arcsec} arcsec"
        );
        assert!(
            (moon.distance_km - distance_km).abs() < 9.0,
            "{days}: {} km",
            moon.distance_km - distance_km
        );
    }
}

#[test]
fn velocity_is_the_change_of_position() {
    for body in BODIES {
        for days in [-140_000.0, -3_000.25, 0.0, 8_765.4, 100_000.5] {
            let at = |days| heliocentric(body, Tt::from_days_since_j2000(days));
            let half_step_days = 0.05;
            let change = difference(
                at(days + half_step_days).position_au,
                at(days - half_step_days).position_au,
            );
            let numerical = change.map(|x| x / (2.0 * half_step_days));
            let analytic = at(days).velocity_au_per_day;
            let relative = length(difference(analytic, numerical)) / length(numerical);
            assert!(relative < 2e-5, "{body:?} {days}: {relative:e}");
        }
    }
}

#[test]
fn tables_hold_what_the_manifest_counts() -> Result<(), serde_json::Error> {
    let text = include_str!("../../pkg-config/tables/manifest.json");
    let manifest: serde_json::Value = serde_json::from_str(text)?;
    let check = |name: &str, series: &Series| {
        let counted = &manifest["series"][name];
        let mut terms = [0_u64; 3];
        for term in &series.terms {
            terms[term.slot / POWERS] += 1;
        }
        assert_eq!(counted["terms"], serde_json::json!(terms), "{name}");
        assert_eq!(
            counted["arguments"].as_u64(),
            u64::try_from(series.arguments.len()).ok(),
            "{name}"
        );
        assert!(
            series
                .highest
                .iter()
                .all(|&highest| highest <= HIGHEST_MULTIPLE),
            "{name}"
        );
    };
    let mut planets = Reader::new(planets::BYTES);
    for name in [
        "mercury", "venus", "emb", "mars", "jupiter", "saturn", "uranus", "neptune",
    ] {
        check(name, &planets.series(0));
    }
    assert!(planets.is_finished());
    let mut moon = Reader::new(moon::BYTES);
    check("moon", &moon.series(5));
    assert!(moon.is_finished());
    Ok(())
}
