//! The plan's places: where Earth and planet stand at an instant, their paths, and the turning points of a span.

use crate::Body;
use crate::chart::{DiscSample, PlanMark, PlanModel, PlanPaths, PlanSample};
use crate::circumstances::{Circumstances, Series};
use crate::ephemeris::{Traveller, plan_orbit, plan_positions};
use crate::error::Error;
use crate::events::{Kind, Query, events};
use crate::explain::Figures;
use crate::time::Utc;

/// The plan of a span.
pub(super) fn plan_model(
    series: &Series,
    utc: Utc,
    now: &Circumstances,
    figures: Figures<'_>,
) -> Result<PlanModel, Error> {
    let body = series.body;
    let paths = PlanPaths {
        earth_au: plan_orbit(Traveller::Earth, utc)?,
        planet_au: plan_orbit(Traveller::Planet(body), utc)?,
    };
    let marks = marks(series, figures)?;
    let chosen = plan_sample(body, utc, now)?;
    Ok(PlanModel::new(series, paths, &marks, &chosen, figures))
}

/// Earth, planet and disc at an instant.
pub(super) fn plan_sample(
    body: Body,
    utc: Utc,
    circumstances: &Circumstances,
) -> Result<PlanSample<'_>, Error> {
    let places = plan_positions(body, utc)?;
    Ok(PlanSample {
        disc: DiscSample {
            utc,
            circumstances,
            up_angle_deg: 0.0,
        },
        earth_au: places.earth_au,
        planet_au: places.planet_au,
    })
}

/// The kinds that mark a planet's round.
const MARKED: [Kind; 10] = [
    Kind::InferiorConjunction,
    Kind::SuperiorConjunction,
    Kind::Conjunction,
    Kind::Opposition,
    Kind::GreatestElongationEast,
    Kind::GreatestElongationWest,
    Kind::GreatestIlluminatedExtent,
    Kind::GreatestBrightness,
    Kind::StationRetrograde,
    Kind::StationDirect,
];

fn marks(series: &Series, figures: Figures<'_>) -> Result<Vec<PlanMark>, Error> {
    let body = series.body;
    let (Some(&from), Some(&to)) = (series.utc.first(), series.utc.last()) else {
        return Ok(Vec::new());
    };
    let kinds: Vec<Kind> = MARKED
        .into_iter()
        .filter(|kind| kind.is_possible_for(body))
        .collect();
    events(&Query::of(body, &kinds, from, to))?
        .into_iter()
        .filter(|event| !event.values.is_secondary)
        .map(|event| {
            Ok(PlanMark {
                utc: event.utc,
                name: figures.words.turning_point(event.kind),
                planet_au: plan_positions(body, event.utc)?.planet_au,
            })
        })
        .collect()
}
