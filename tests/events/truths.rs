//! Every event is a true zero or extremum of what `circumstances` gives.

use crate::support::turn_deg;
use crate::{at, of};
use wanderlight::events::Event;
use wanderlight::events::Kind::*;
use wanderlight::photometry::illuminated_fraction;
use wanderlight::{Body, Circumstances, Utc, circumstances};

fn seen(body: Body, utc: Utc) -> Circumstances {
    circumstances(body, utc, None).expect("within the span")
}

/// Longitude of the body ahead of the Sun's.
fn ahead_deg(body: Body, utc: Utc) -> f64 {
    turn_deg(seen(body, utc).ecliptic_longitude_deg - seen(Body::Sun, utc).ecliptic_longitude_deg)
}

/// A quantity is smaller at the event than some days before and after it.
#[track_caller]
fn assert_least(event: &Event, days: f64, quantity: &dyn Fn(Utc) -> f64) {
    let there = quantity(event.utc);
    for shift_days in [-days, days] {
        let beside = quantity(event.utc.plus_days(shift_days));
        assert!(
            there < beside,
            "{} {} {}: {there} against {beside}",
            event.body,
            event.kind.name(),
            event.utc.to_rfc3339()
        );
    }
}

#[test]
fn turning_points_of_planets() {
    for body in Body::PLANETS {
        for event in of(body, &[], "2019-01-01", "2027-01-01") {
            let at_event = || seen(body, event.utc);
            let off = match event.kind {
                InferiorConjunction | SuperiorConjunction | Conjunction => {
                    ahead_deg(body, event.utc)
                }
                Opposition => turn_deg(ahead_deg(body, event.utc) - 180.0),
                QuadratureEast => ahead_deg(body, event.utc) - 90.0,
                QuadratureWest => ahead_deg(body, event.utc) + 90.0,
                HalfPhase => at_event().illuminated_fraction.unwrap_or(1.0) - 0.5,
                GreatestElongationEast | GreatestElongationWest => {
                    assert_least(&event, 0.05, &|utc| {
                        -seen(body, utc).elongation_deg.unwrap_or(0.0)
                    });
                    let is_east = at_event().elongation_side == Some("east");
                    assert_eq!(is_east, event.kind == GreatestElongationEast);
                    0.0
                }
                GreatestIlluminatedExtent => {
                    assert_least(&event, 0.2, &|utc| -seen(body, utc).lit_area_arcsec2);
                    0.0
                }
                // The magnitude of Mars in the circumstances swings with its rotation.
                GreatestBrightness if body != Body::Mars => {
                    assert_least(&event, 0.7, &|utc| {
                        seen(body, utc).magnitude.unwrap_or(f64::NAN)
                    });
                    0.0
                }
                StationRetrograde | StationDirect => {
                    let sign = if event.kind == StationDirect {
                        1.0
                    } else {
                        -1.0
                    };
                    let there_deg = at_event().right_ascension_deg;
                    assert_least(&event, 0.3, &|utc| {
                        sign * turn_deg(seen(body, utc).right_ascension_deg - there_deg)
                    });
                    0.0
                }
                ClosestApproach => {
                    assert_least(&event, 0.1, &|utc| seen(body, utc).distance_au);
                    0.0
                }
                _ => 0.0,
            };
            assert!(
                off.abs() < 2e-5,
                "{body} {} {}: {off}",
                event.kind.name(),
                event.utc.to_rfc3339()
            );
        }
    }
}

#[test]
fn values_are_those_of_the_circumstances() {
    for event in of(Body::Venus, &[], "2025-01-01", "2026-01-01") {
        let seen = seen(event.body, event.utc);
        let values = &event.values;
        let close = |a: Option<f64>, b: Option<f64>, what: &str| {
            let (a, b) = (a.unwrap_or(f64::NAN), b.unwrap_or(f64::NAN));
            assert!((a - b).abs() <= 1e-6 * b.abs(), "{what}: {a} {b}");
        };
        close(values.distance_au, Some(seen.distance_au), "distance");
        close(values.elongation_deg, seen.elongation_deg, "elongation");
        close(values.magnitude, seen.magnitude, "magnitude");
        close(values.lit_area_arcsec2, Some(seen.lit_area_arcsec2), "area");
        close(
            values.illuminated_fraction,
            seen.phase_angle_deg.map(illuminated_fraction),
            "fraction",
        );
        close(
            values.angular_diameter_arcsec,
            Some(seen.angular_diameter_arcsec),
            "diameter",
        );
    }
}

#[test]
fn the_moon_and_its_meetings() {
    for event in of(Body::Moon, &[], "2026-03-01", "2026-06-01") {
        let utc = event.utc;
        let (moon, planet) = (seen(Body::Moon, utc), seen(event.body, utc));
        let off = match event.kind {
            NewMoon => ahead_deg(Body::Moon, utc),
            FirstQuarter => ahead_deg(Body::Moon, utc) - 90.0,
            FullMoon => turn_deg(ahead_deg(Body::Moon, utc) - 180.0),
            LastQuarter => ahead_deg(Body::Moon, utc) + 90.0,
            MoonConjunction => turn_deg(moon.right_ascension_deg - planet.right_ascension_deg),
            SamePhase => {
                assert_eq!(event.values.is_waxing, planet.waxing);
                assert_eq!(event.values.is_other_waxing, moon.waxing);
                moon.illuminated_fraction.unwrap_or(0.0)
                    - planet.illuminated_fraction.unwrap_or(1.0)
            }
            MoonPerigee => {
                assert_least(&event, 0.02, &|utc| seen(Body::Moon, utc).distance_au);
                0.0
            }
            MoonApogee => {
                assert_least(&event, 0.02, &|utc| -seen(Body::Moon, utc).distance_au);
                0.0
            }
            _ => 0.0,
        };
        // Half a second of the Moon.
        assert!(
            off.abs() < 1e-4,
            "{} {}: {off}",
            event.kind.name(),
            utc.to_rfc3339()
        );
    }
}

#[test]
fn a_peak_is_the_best_of_its_round() {
    let kinds = [InferiorConjunction, SuperiorConjunction, GreatestBrightness];
    let found = of(Body::Venus, &kinds, "1950-01-01", "2050-01-01");
    for round in found.split(|event| event.kind != GreatestBrightness) {
        let best = round.iter().filter(|event| !event.values.is_secondary);
        // The first and the last part may have been cut.
        assert!(best.count() <= 1, "{round:?}");
        for event in round {
            let elongation_deg = event.values.elongation_deg.unwrap_or(0.0);
            assert!(
                event.values.is_secondary || elongation_deg > 30.0,
                "never at a conjunction: {event:?}"
            );
        }
    }
}

#[test]
fn perihelia_follow_at_the_planets_year() {
    for (body, year_days, slack_days) in [
        (Body::Mercury, 87.97, 0.5),
        (Body::Venus, 224.7, 2.0),
        (Body::Mars, 686.98, 1.0),
        (Body::Jupiter, 4_332.6, 40.0),
        (Body::Saturn, 10_759.0, 250.0),
    ] {
        let all = of(body, &[Perihelion], "1850-01-01", "2050-01-01");
        let found: Vec<&Event> = all
            .iter()
            .filter(|event| !event.values.is_secondary)
            .collect();
        assert!(found.len() >= 6, "{body}: {}", found.len());
        for pair in found.windows(2) {
            let days = pair[1].utc.days_since_j2000() - pair[0].utc.days_since_j2000();
            assert!((days - year_days).abs() < slack_days, "{body}: {days}");
        }
    }
    let utc = at("1989-09-12");
    assert!(seen(Body::Neptune, utc).sun_distance_au > 30.0);
}
