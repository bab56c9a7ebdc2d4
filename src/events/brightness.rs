//! When a planet is brightest, when its lit area is largest, and for how long it stays nearly as bright.

use super::kind::Kind;
use super::query::{Query, events};
use super::search::{Scan, roots};
use super::sky::Moment;
use crate::body::Body;
use crate::ephemeris::check_span;
use crate::error::{Code, Error};
use crate::time::Utc;

/// A moment at which brightness or lit area is greatest.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Extremum {
    /// When.
    pub utc: Utc,
    /// Visual magnitude at that moment, for Mars averaged over its rotation.
    pub magnitude: f64,
    /// Lit area in the sky at that moment.
    pub lit_area_arcsec2: f64,
}

/// From one instant to a later one.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Interval {
    /// Start.
    pub from: Utc,
    /// End.
    pub to: Utc,
}

/// Step of the walk along a plateau.
const STEP_DAYS: f64 = 2.0;
/// About a minute and a half; the models themselves leave hours.
const TOLERANCE_DAYS: f64 = 0.001;
/// How far from a peak the end of its plateau is sought: beyond half of any synodic period but that of Mars.
const LONGEST_PLATEAU_DAYS: f64 = 250.0;

/// Moments of [greatest brightness](Kind::GreatestBrightness) of a planet between two instants, in order of time,
/// without secondary peaks. The brightest moment is broad: a change of 0.01 mag takes days.
///
/// # Errors
/// `unknown-body` for Sun and Moon, `bad-instant` and `out-of-span` for either instant, `bad-step` when the end is
/// before the start.
pub fn greatest_brightness(body: Body, from: Utc, to: Utc) -> Result<Vec<Extremum>, Error> {
    peaks(body, Kind::GreatestBrightness, from, to)
}

/// Moments of [greatest illuminated extent](Kind::GreatestIlluminatedExtent) of an inner planet between two instants,
/// in order of time, without secondary peaks.
///
/// # Errors
/// `unknown-body` except for Mercury and Venus, `bad-instant` and `out-of-span` for either instant, `bad-step` when
/// the end is before the start.
pub fn greatest_illuminated_extent(body: Body, from: Utc, to: Utc) -> Result<Vec<Extremum>, Error> {
    peaks(body, Kind::GreatestIlluminatedExtent, from, to)
}

fn peaks(body: Body, kind: Kind, from: Utc, to: Utc) -> Result<Vec<Extremum>, Error> {
    if !kind.is_possible_for(body) {
        return Err(Error::new(Code::UnknownBody, kind.why_not(body)));
    }
    let mut peaks = Vec::new();
    for event in events(&Query::of(body, &[kind], from, to))? {
        if event.values.is_secondary {
            continue;
        }
        peaks.push(Extremum {
            utc: event.utc,
            magnitude: event.values.magnitude.unwrap_or(f64::NAN),
            lit_area_arcsec2: event.values.lit_area_arcsec2.unwrap_or(f64::NAN),
        });
    }
    Ok(peaks)
}

/// The days around a peak during which a planet is at most so many magnitudes fainter than at the peak.
///
/// None when within 250 days before or after the peak the planet does not fade by so much, and for an amount that is
/// not finite and positive.
///
/// # Errors
/// `bad-instant` and `out-of-span` for the peak.
pub fn interval_within_magnitudes(
    body: Body,
    peak: Utc,
    magnitudes: f64,
) -> Result<Option<Interval>, Error> {
    check_span(peak)?;
    if !(magnitudes.is_finite() && magnitudes > 0.0) {
        return Ok(None);
    }
    let magnitude_at = |utc: Utc| Moment::at(utc.to_tt().days_since_j2000()).magnitude(body);
    let limit = magnitude_at(peak) + magnitudes;
    // Counted away from the peak, in either direction, so that the first crossing is the end of the plateau.
    let end = |direction: f64| {
        let mut step_days = 4.0;
        let mut reached_days = 0.0;
        while reached_days < LONGEST_PLATEAU_DAYS {
            let scan = Scan {
                from_days: reached_days,
                to_days: reached_days + step_days,
                step_days,
                tolerance_days: TOLERANCE_DAYS,
            };
            let crossings = roots(&scan, f64::INFINITY, &mut |away_days| {
                magnitude_at(peak.plus_days(direction * away_days)) - limit
            });
            if let Some(crossing) = crossings.first() {
                return Some(peak.plus_days(direction * crossing.days));
            }
            reached_days += step_days;
            step_days = STEP_DAYS;
        }
        None
    };
    let (Some(from), Some(to)) = (end(-1.0), end(1.0)) else {
        return Ok(None);
    };
    Ok(Some(Interval { from, to }))
}
