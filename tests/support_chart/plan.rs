//! The plan of the toy sky: circles in one plane, the planet at the Earth's longitude on the day of its conjunction.

use super::{circumstances, day, figures, highlights, orbit, series};
use std::f64::consts::TAU;
use wanderlight::chart::{DiscSample, Picture, PlanMark, PlanModel, PlanPaths, PlanSample};
use wanderlight::{Body, Circumstances, Utc};

fn on_circle(radius_au: f64, angle_rad: f64) -> [f64; 2] {
    [radius_au * angle_rad.cos(), radius_au * angle_rad.sin()]
}

/// Earth and planet at an instant.
pub(crate) fn places(body: Body, utc: Utc) -> [[f64; 2]; 2] {
    let (radius_au, period_days, _, conjunction_days) = orbit(body);
    let days = utc.days_since_j2000();
    let earth = TAU * days / 365.25;
    let ahead = TAU * (days - conjunction_days) * (1.0 / period_days - 1.0 / 365.25);
    [on_circle(1.0, earth), on_circle(radius_au, earth + ahead)]
}

/// The chosen moment of the plan.
pub(crate) fn sample(body: Body, utc: Utc, circumstances: &Circumstances) -> PlanSample<'_> {
    let [earth_au, planet_au] = places(body, utc);
    PlanSample {
        disc: DiscSample {
            utc,
            circumstances,
            up_angle_deg: 0.0,
        },
        earth_au,
        planet_au,
    }
}

/// Spans of a synodic period or so: planet, first day, days.
pub(crate) fn spans() -> [(Body, Utc, usize); 7] {
    [
        (Body::Venus, day(2026, 2, 1), 584),
        (Body::Mercury, day(2026, 9, 1), 120),
        (Body::Mars, day(2026, 2, 1), 780),
        (Body::Jupiter, day(2026, 9, 1), 400),
        (Body::Saturn, day(2026, 6, 1), 380),
        (Body::Uranus, day(2026, 6, 1), 370),
        (Body::Neptune, day(2026, 9, 1), 368),
    ]
}

/// The plan of a planet over a span of days with a date chosen.
pub(crate) fn plan(body: Body, from: Utc, days: usize, chosen: Utc) -> PlanModel {
    let span = series(body, from, days);
    let circle = |radius_au: f64| {
        (0..120)
            .map(|step| on_circle(radius_au, TAU * f64::from(step) / 120.0))
            .collect()
    };
    let paths = PlanPaths {
        earth_au: circle(1.0),
        planet_au: circle(orbit(body).0),
    };
    let marks: Vec<PlanMark> = highlights(&span)
        .great_peaks()
        .map(|peak| PlanMark {
            utc: peak.utc,
            name: "greatest brightness".to_owned(),
            planet_au: places(body, peak.utc)[1],
        })
        .collect();
    let now = circumstances(body, chosen);
    PlanModel::new(&span, paths, &marks, &sample(body, chosen, &now), figures())
}

/// The same as a picture.
pub(crate) fn picture(body: Body, from: Utc, days: usize, chosen: Utc) -> Picture {
    Picture::Plan(Box::new(plan(body, from, days, chosen)))
}
