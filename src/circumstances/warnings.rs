//! Remarks that limit an answer, and when each is due.

use serde::Serialize;

use super::answer::Local;
use crate::body::Body;
use crate::ephemeris::SpanPart;
use crate::photometry::Magnitude;
use crate::time::{CivilScale, LAST_TABLE_YEAR, Utc, delta_t_seconds};

/// A remark that limits how far an answer may be trusted.
///
/// | code | due when |
/// |---|---|
/// | `ut1-before-1972` | the date is before 1972, where UTC did not exist in its present form |
/// | `future-utc` | the date is after the delta-T table, so that leap seconds to come are unknown |
/// | `outside-checked-span` | the year is outside 1700 to 2200 |
/// | `magnitude-extrapolated` | the law is used outside the phase angles at which the body was observed |
/// | `magnitude-undefined` | the law has no value at this phase angle |
/// | `near-horizon` | the body stands below 3 degrees, where the air decides more than any formula |
#[derive(Debug, Clone, PartialEq, Serialize)]
pub struct Warning {
    /// Stable code, kebab case.
    pub code: &'static str,
    /// One sentence for people.
    pub message: String,
}

/// Apparent altitudes between 0 and this are uncertain: real haze and refraction scatter.
const UNCERTAIN_ALTITUDE_DEG: f64 = 3.0;

pub(super) fn of(
    body: Body,
    utc: Utc,
    span_part: SpanPart,
    magnitude: Magnitude,
    local: Option<&Local>,
) -> Vec<Warning> {
    let mut warnings = Vec::new();
    let mut warn = |code: &'static str, message: String| warnings.push(Warning { code, message });
    // One decimal is more than any of these uncertainties deserves; whole seconds from 2 on.
    let clock_seconds = || {
        let seconds = delta_t_seconds(utc).uncertainty_seconds;
        if seconds < 2.0 {
            (seconds * 10.0).ceil() / 10.0
        } else {
            seconds.ceil()
        }
    };
    match utc.scale() {
        CivilScale::Ut1Before1972 => warn(
            "ut1-before-1972",
            format!(
                "Before 1972 the time is taken as UT1; delta-T is known to about {} s here.",
                clock_seconds()
            ),
        ),
        CivilScale::Ut1Future => warn(
            "future-utc",
            format!(
                "Leap seconds after {LAST_TABLE_YEAR} are unknown: the time is taken as UT1 with a modelled delta-T, \
                 uncertain by about {} s here.",
                clock_seconds()
            ),
        ),
        CivilScale::Utc { .. } => {}
    }
    if span_part == SpanPart::Fitted {
        warn(
            "outside-checked-span",
            "Positions were compared with a reference from 1700 to 2200 only.".to_owned(),
        );
    }
    match magnitude {
        Magnitude::Observed(_) => {}
        Magnitude::Extrapolated(_) => warn(
            "magnitude-extrapolated",
            format!(
                "No brightness of {} was observed at this phase angle; the value extends the law.",
                named(body)
            ),
        ),
        Magnitude::Undefined => warn(
            "magnitude-undefined",
            format!(
                "The published law has no brightness of {} at this phase angle.",
                named(body)
            ),
        ),
    }
    if local
        .is_some_and(|local| (0.0..UNCERTAIN_ALTITUDE_DEG).contains(&local.apparent_altitude_deg))
    {
        warn(
            "near-horizon",
            "Below 3 degrees refraction and dimming vary from day to day; altitude and apparent magnitude are rough."
                .to_owned(),
        );
    }
    warnings
}

/// The name as it stands in a sentence.
fn named(body: Body) -> &'static str {
    match body {
        Body::Sun => "the Sun",
        Body::Moon => "the Moon",
        Body::Mercury => "Mercury",
        Body::Venus => "Venus",
        Body::Mars => "Mars",
        Body::Jupiter => "Jupiter",
        Body::Saturn => "Saturn",
        Body::Uranus => "Uranus",
        Body::Neptune => "Neptune",
    }
}
