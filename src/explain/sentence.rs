//! Chooses which story the facts tell; the language tells it.

use super::figures::Figures;
use super::formats::DateForm;
use super::reading::{Highlights, Reading};
use super::words::{DiscStory, Story, Told};
use crate::body::Body;
use crate::circumstances::{Circumstances, Series};
use crate::time::Utc;

/// Mean apparent diameter of the Moon from the Earth's centre: 2 asin(1737.4 km / 384,400 km).
pub(crate) const MOON_WIDTH_ARCSEC: f64 = 1864.5;

/// Above this lit share all through a span, size alone decides.
const ALWAYS_NEARLY_FULL: f64 = 0.8;

/// One sentence on what the trade-off shows at the chosen instant, and why the light is what it is.
pub fn sentence_tradeoff(
    series: &Series,
    highlights: &Highlights,
    chosen: &Reading,
    figures: Figures<'_>,
) -> String {
    let now = told(chosen, figures);
    let peak = highlights
        .peak_near(chosen.utc)
        .and_then(|peak| Some((Reading::within(series, peak.utc)?, peak.magnitude)))
        .map(|(reading, magnitude)| Reading {
            magnitude,
            ..reading
        });
    let peak_told = || peak.as_ref().map(|reading| told(reading, figures));
    let least_lit = series
        .illuminated_fraction
        .iter()
        .copied()
        .fold(f64::INFINITY, f64::min);
    let story = if !chosen.illuminated_fraction.is_finite() {
        Story::OwnLight(now)
    } else if !chosen.magnitude.is_finite() {
        Story::NoMagnitude(now)
    } else if series.body == Body::Moon {
        Story::PhaseDecides(now)
    } else if highlights.flat_top_at(chosen.utc).is_some() {
        if chosen.illuminated_fraction < 0.5 {
            Story::BrightestCrescent(now)
        } else {
            Story::BrightestRound(now)
        }
    } else if least_lit > ALWAYS_NEARLY_FULL {
        Story::SizeDecides(now, peak_told())
    } else {
        match (&peak, peak_told()) {
            (Some(at), Some(told)) if chosen.magnitude > at.magnitude => {
                let larger = chosen.angular_diameter_arcsec > at.angular_diameter_arcsec;
                let fuller = chosen.illuminated_fraction > at.illuminated_fraction;
                match (larger, fuller) {
                    (true, false) => Story::ThinnerThanPeak(now, told),
                    (false, true) => Story::FullerThanPeak(now, told),
                    _ => Story::Plain(now, Some(told)),
                }
            }
            _ => Story::Plain(now, None),
        }
    };
    figures.words.tradeoff(series.body, &story)
}

/// One or two sentences on what the disc shows at the chosen instant.
pub fn sentence_disc(
    body: Body,
    chosen_utc: Utc,
    chosen: &Circumstances,
    figures: Figures<'_>,
) -> String {
    let reading = Reading::new(chosen_utc, chosen);
    let lit = reading.illuminated_fraction;
    let shape = if !lit.is_finite() {
        DiscStory::OwnLight
    } else if lit < 0.45 {
        DiscStory::Crescent
    } else if lit <= 0.55 {
        DiscStory::Half
    } else if lit < 0.97 {
        DiscStory::Gibbous
    } else if lit < 0.9995 {
        DiscStory::AlmostFull
    } else {
        DiscStory::Full
    };
    let opening = chosen
        .ring_opening_deg
        .map(|angle| figures.words.degrees(&figures.number(angle.abs(), 0)));
    figures.words.disc(
        body,
        &told(&reading, figures),
        shape,
        &moon_divisor(reading.angular_diameter_arcsec, figures),
        opening.as_deref(),
    )
}

/// The short text for a screen reader when the date has moved.
pub fn announce(chosen: &Reading, figures: Figures<'_>) -> String {
    let lit = chosen
        .illuminated_fraction
        .is_finite()
        .then(|| figures.lit_share(chosen.illuminated_fraction));
    figures.words.announce(
        &figures.date(chosen.utc, DateForm::Day),
        lit.as_deref(),
        &figures.diameter_spelled(chosen.angular_diameter_arcsec),
        &figures.magnitude(chosen.magnitude),
    )
}

/// How often an angle fits the Moon's width, rounded as far as "about" allows: two digits.
pub(crate) fn moon_divisor(arcsec: f64, figures: Figures<'_>) -> String {
    let times = MOON_WIDTH_ARCSEC / arcsec;
    let step = if times >= 100.0 { 10.0 } else { 1.0 };
    figures.number((times / step).round() * step, 0)
}

pub(super) fn told(reading: &Reading, figures: Figures<'_>) -> Told {
    Told {
        date: figures.date(reading.utc, DateForm::Day),
        lit: figures.lit_share(reading.illuminated_fraction),
        diameter: figures.diameter_spelled(reading.angular_diameter_arcsec),
        magnitude: if reading.magnitude.is_finite() {
            figures.number(reading.magnitude, 1)
        } else {
            String::new()
        },
    }
}
