//! When a planet is brightest, when its lit area is largest, and for how long it stays nearly as bright.

use super::search::{Found, Scan, maxima, minima, roots};
use crate::body::Body;
use crate::ephemeris::{Earth, Observation, check_span};
use crate::error::{Code, Error};
use crate::photometry::{Disc, MarsRotation, Seen, illuminated_fraction, magnitude};
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

/// Step of the walk; the shortest time between two peaks is some 60 days.
const STEP_DAYS: f64 = 2.0;
/// About a minute and a half; the models themselves leave hours.
const TOLERANCE_DAYS: f64 = 0.001;
/// Two peaks of an outer planet closer than this belong to one opposition.
const ONE_OPPOSITION_DAYS: f64 = 150.0;
/// How far from a peak the end of its plateau is sought: beyond half of any synodic period but that of Mars.
const LONGEST_PLATEAU_DAYS: f64 = 250.0;

/// A planet at one instant, as far as brightness needs it.
struct Light {
    magnitude: f64,
    lit_area_arcsec2: f64,
    phase_angle_deg: f64,
    elongation_deg: f64,
}

impl Light {
    fn at(body: Body, days: f64) -> Self {
        let utc = Utc::from_days_since_j2000(days);
        let earth = Earth::at(utc.to_tt());
        let observation = Observation::of(body, &earth);
        let phase_angle_deg = observation.phase_angle_deg();
        Self {
            // Mars turns once a day and swings by 0.06 mag: its average is what has one peak per opposition.
            magnitude: magnitude(
                &Seen::new(&observation, &earth, utc),
                MarsRotation::Averaged,
            )
            .value_or_nan(),
            lit_area_arcsec2: Disc::of(body, observation.distance_au())
                .lit_area_arcsec2(illuminated_fraction(phase_angle_deg)),
            phase_angle_deg,
            elongation_deg: observation.elongation_deg(earth.sun_direction()),
        }
    }

    /// Whether the planet stands where its greatest brightness is looked for.
    ///
    /// Venus brightens again as a thin crescent (phase angles near 170) and a little when full, behind the Sun:
    /// neither is its greatest brightness. Outer planets are brightest around opposition; elsewhere the seasons of
    /// Mars would make small peaks of their own.
    fn may_peak(&self, body: Body) -> bool {
        match body {
            Body::Venus => (60.0..160.0).contains(&self.phase_angle_deg),
            Body::Mercury => self.phase_angle_deg < 160.0,
            _ => self.elongation_deg > 120.0,
        }
    }
}

/// Moments of greatest brightness of a planet between two instants, in order of time.
///
/// Venus has one on either side of each inferior conjunction, Mercury one near superior conjunction, the others one
/// near opposition. The brightest moment is broad: a change of 0.01 mag takes days.
///
/// # Errors
/// `unknown-body` for Sun and Moon, `bad-instant` and `out-of-span` for either instant, `bad-step` when the end is
/// before the start.
pub fn greatest_brightness(body: Body, from: Utc, to: Utc) -> Result<Vec<Extremum>, Error> {
    if !Body::PLANETS.contains(&body) {
        return Err(Error::new(
            Code::UnknownBody,
            "Greatest brightness is found for planets, not for Sun and Moon.",
        ));
    }
    let scan = scan(from, to)?;
    let mut peaks = minima(&scan, &mut |days| {
        let light = Light::at(body, days);
        if light.may_peak(body) {
            light.magnitude
        } else {
            f64::NAN
        }
    });
    if !body.is_inner_planet() {
        keep_brightest_of_each_opposition(&mut peaks);
    }
    Ok(within(&peaks, body, from, to))
}

/// Moments at which the lit area of an inner planet is largest: its greatest illuminated extent, in order of time.
///
/// # Errors
/// `unknown-body` except for Mercury and Venus, `bad-instant` and `out-of-span` for either instant, `bad-step` when
/// the end is before the start.
pub fn greatest_illuminated_extent(body: Body, from: Utc, to: Utc) -> Result<Vec<Extremum>, Error> {
    if !body.is_inner_planet() {
        return Err(Error::new(
            Code::UnknownBody,
            "Greatest illuminated extent is found for Mercury and Venus only.",
        ));
    }
    let peaks = maxima(&scan(from, to)?, &mut |days| {
        Light::at(body, days).lit_area_arcsec2
    });
    Ok(within(&peaks, body, from, to))
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
    let peak_days = peak.days_since_j2000();
    let limit = Light::at(body, peak_days).magnitude + magnitudes;
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
                Light::at(body, peak_days + direction * away_days).magnitude - limit
            });
            if let Some(crossing) = crossings.first() {
                return Some(Utc::from_days_since_j2000(
                    peak_days + direction * crossing.days,
                ));
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

/// The walk between two instants, a step wider on either side so that a peak close to an end is still enclosed.
fn scan(from: Utc, to: Utc) -> Result<Scan, Error> {
    check_span(from)?;
    check_span(to)?;
    if to < from {
        return Err(Error::new(
            Code::BadStep,
            "The end of the span must not be before its start.",
        ));
    }
    Ok(Scan {
        from_days: from.days_since_j2000() - STEP_DAYS,
        to_days: to.days_since_j2000() + STEP_DAYS,
        step_days: STEP_DAYS,
        tolerance_days: TOLERANCE_DAYS,
    })
}

fn within(peaks: &[Found], body: Body, from: Utc, to: Utc) -> Vec<Extremum> {
    let inside = from.days_since_j2000()..=to.days_since_j2000();
    let extremum = |peak: &Found| {
        let light = Light::at(body, peak.days);
        Extremum {
            utc: Utc::from_days_since_j2000(peak.days),
            magnitude: light.magnitude,
            lit_area_arcsec2: light.lit_area_arcsec2,
        }
    };
    peaks
        .iter()
        .filter(|peak| inside.contains(&peak.days))
        .map(extremum)
        .collect()
}

fn keep_brightest_of_each_opposition(peaks: &mut Vec<Found>) {
    peaks.dedup_by(|next, kept| {
        let is_same = next.days - kept.days < ONE_OPPOSITION_DAYS;
        if is_same && next.value < kept.value {
            *kept = *next;
        }
        is_same
    });
}
