//! What an element shows: the samples of its frame, the reading of its day, and the picture made of both.

use super::host::{Day, Host};
use super::plan::{plan_model, plan_sample};
use super::settings::{Settings, View};
use crate::Body;
use crate::chart::{DiscModel, DiscSample, Picture, TradeoffModel};
use crate::circumstances::{Circumstances, Series, circumstances, series};
use crate::error::Error;
use crate::events::{greatest_brightness, greatest_illuminated_extent, interval_within_magnitudes};
use crate::explain::{
    English, Figures, GreatestExtent, Highlights, NightEdge, Orientation, Peak, Reading, Table,
    reading_table,
};
use crate::place::{SkySide, lean_deg};
use crate::time::Utc;

/// Samples of a frame: more than a chart has pixels for would not be seen.
const SAMPLES: f64 = 400.0;
/// Flatness of a peak is told for this much fading.
const FLAT_MAGNITUDES: f64 = 0.1;

/// Samples, reading and picture of one element.
pub(super) struct Scene {
    pub(super) utc: Utc,
    pub(super) now: Circumstances,
    pub(super) series: Series,
    pub(super) highlights: Highlights,
    pub(super) picture: Picture,
}

impl Scene {
    /// Computes everything for a frame of days.
    pub(super) fn build(
        settings: &Settings,
        host: &Host,
        (first, last): (Day, Day),
        horizon_up: bool,
    ) -> Result<Self, Error> {
        let body = settings.body;
        let (from, to) = (host.noon(first), host.noon(last));
        let length_days = to.days_since_j2000() - from.days_since_j2000();
        let series = series(body, from, to, length_days / SAMPLES)?;
        let highlights = highlights(body, from, to)?;
        let utc = host.noon(settings.day);
        let now = circumstances(body, utc, settings.spot.place())?;
        let figures = figures(host);
        let picture = match settings.view {
            View::Tradeoff => {
                Picture::Tradeoff(TradeoffModel::new(&series, &highlights, utc, &now, figures))
            }
            View::Disc => {
                let moments = DiscModel::dates(from, to)
                    .into_iter()
                    .map(|utc| Ok((utc, circumstances(body, utc, None)?)))
                    .collect::<Result<Vec<_>, Error>>()?;
                let samples: Vec<DiscSample<'_>> = moments
                    .iter()
                    .map(|(utc, then)| disc_sample(settings, *utc, then, horizon_up))
                    .collect();
                let orientation = if horizon_up {
                    Orientation::ZenithUp
                } else {
                    Orientation::NorthUp
                };
                let chosen = disc_sample(settings, utc, &now, horizon_up);
                Picture::Disc(DiscModel::new(
                    &series,
                    &samples,
                    &chosen,
                    orientation,
                    figures,
                ))
            }
            View::Plan => Picture::Plan(Box::new(plan_model(&series, utc, &now, figures)?)),
        };
        Ok(Self {
            utc,
            now,
            series,
            highlights,
            picture,
        })
    }

    /// Moves to the settings' day within the same frame.
    pub(super) fn set_day(
        &mut self,
        settings: &Settings,
        host: &Host,
        horizon_up: bool,
    ) -> Result<(), Error> {
        self.set_instant(host.noon(settings.day), settings, host, horizon_up)
    }

    /// Moves to an instant of the settings' day.
    pub(super) fn set_instant(
        &mut self,
        utc: Utc,
        settings: &Settings,
        host: &Host,
        horizon_up: bool,
    ) -> Result<(), Error> {
        self.utc = utc;
        self.now = circumstances(settings.body, self.utc, settings.spot.place())?;
        match &mut self.picture {
            Picture::Tradeoff(model) => model.set_chosen(self.utc, &self.now, figures(host)),
            Picture::Disc(model) => {
                model.set_chosen(
                    &disc_sample(settings, self.utc, &self.now, horizon_up),
                    figures(host),
                );
            }
            Picture::Plan(model) => {
                let chosen = plan_sample(settings.body, self.utc, &self.now)?;
                model.set_chosen(&chosen, figures(host));
            }
        }
        Ok(())
    }

    pub(super) fn reading(&self) -> Reading {
        Reading::new(self.utc, &self.now)
    }

    pub(super) fn table(&self, host: &Host) -> Table {
        reading_table(
            &self.series,
            &self.highlights,
            &self.reading(),
            figures(host),
        )
    }
}

/// Numbers and sentences in the host's language.
pub(super) fn figures(host: &Host) -> Figures<'_> {
    Figures {
        formats: host,
        words: &English,
    }
}

/// The end of the night at which a body is looked for: east of the Sun it follows into the evening.
pub(super) fn night_edge(now: &Circumstances) -> NightEdge {
    match now.elongation_side {
        Some("west") => NightEdge::Morning,
        _ => NightEdge::Evening,
    }
}

fn disc_sample<'a>(
    settings: &Settings,
    utc: Utc,
    circumstances: &'a Circumstances,
    horizon_up: bool,
) -> DiscSample<'a> {
    let side = match night_edge(circumstances) {
        NightEdge::Evening => SkySide::Setting,
        NightEdge::Morning => SkySide::Rising,
    };
    let up_angle_deg = match settings.spot.place() {
        Some(place) if horizon_up => lean_deg(place, circumstances.declination_deg, side),
        _ => 0.0,
    };
    DiscSample {
        utc,
        circumstances,
        up_angle_deg,
    }
}

fn highlights(body: Body, from: Utc, to: Utc) -> Result<Highlights, Error> {
    let mut highlights = Highlights::default();
    if Body::PLANETS.contains(&body) {
        for peak in greatest_brightness(body, from, to)? {
            let flat = interval_within_magnitudes(body, peak.utc, FLAT_MAGNITUDES)?;
            highlights.peaks.push(Peak {
                utc: peak.utc,
                magnitude: peak.magnitude,
                // A planet that never fades so much is within it all through the frame.
                flat_from: flat.map_or(from, |flat| flat.from),
                flat_to: flat.map_or(to, |flat| flat.to),
            });
        }
    }
    if body.is_inner_planet() {
        highlights.extents = greatest_illuminated_extent(body, from, to)?
            .into_iter()
            .map(|extent| GreatestExtent {
                utc: extent.utc,
                lit_area_arcsec2: extent.lit_area_arcsec2,
            })
            .collect();
    }
    Ok(highlights)
}
