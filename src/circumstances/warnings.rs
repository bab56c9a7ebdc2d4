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
    let clock_uncertainty = || seconds_text(delta_t_seconds(utc).uncertainty_seconds);
    match utc.scale() {
        CivilScale::Ut1Before1972 => warn(
            "ut1-before-1972",
            format!(
                "Before 1972 the time is taken as UT1; delta-T is known to about {} s here.",
                clock_uncertainty()
            ),
        ),
        CivilScale::Ut1Future => warn(
            "future-utc",
            format!(
                "Leap seconds from {LAST_TABLE_YEAR} on are unknown: the time is taken as UT1 with a modelled delta-T, \
                 uncertain by about {} s here.",
                clock_uncertainty()
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

/// An uncertainty rounded up: tenths below 2 seconds, whole seconds from there on.
///
/// Whole numbers only: the formatting of floating point numbers would weigh more than all sentences here.
fn seconds_text(seconds: f64) -> String {
    let tenths = (seconds * 10.0).ceil() as u32;
    if tenths < 20 {
        format!("{}.{}", tenths / 10, tenths % 10)
    } else {
        format!("{}", tenths.div_ceil(10))
    }
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

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn uncertainties_are_rounded_up() {
        assert_eq!(seconds_text(0.05), "0.1");
        assert_eq!(seconds_text(1.91), "2");
        assert_eq!(seconds_text(1.9), "1.9");
        assert_eq!(seconds_text(31.2), "32");
    }

    fn codes(body: Body, text: &str, place: Option<&crate::Place>) -> Vec<&'static str> {
        let utc = Utc::parse(text).expect("a valid instant");
        let answer = crate::circumstances(body, utc, place).expect("within the span");
        answer.warnings.iter().map(|warning| warning.code).collect()
    }

    #[test]
    fn each_warning_comes_when_it_is_due() {
        let none: [&str; 0] = [];
        assert_eq!(codes(Body::Venus, "2026-11-24", None), none);
        assert_eq!(codes(Body::Venus, "1850-01-01", None), ["ut1-before-1972"]);
        assert_eq!(
            codes(Body::Venus, "1650-01-01", None),
            ["ut1-before-1972", "outside-checked-span"]
        );
        assert_eq!(codes(Body::Venus, "2150-01-01", None), ["future-utc"]);
        // New Moon of 2024-04-08 (a total solar eclipse), Mercury's inferior conjunction of 2019-11-11 (a transit).
        assert_eq!(
            codes(Body::Moon, "2024-04-08T18:00:00Z", None),
            ["magnitude-undefined"]
        );
        assert_eq!(
            codes(Body::Mercury, "2019-11-11T15:20:00Z", None),
            ["magnitude-extrapolated"]
        );
    }

    #[test]
    fn close_to_the_horizon_the_air_is_named() {
        let greenwich = crate::Place::new(51.48, 0.0, 0.0).expect("a valid place");
        // The Sun within three degrees above the western horizon, an hour before and after: not.
        assert_eq!(
            codes(Body::Sun, "2026-06-21T20:10:00Z", Some(&greenwich)),
            ["near-horizon"]
        );
        assert!(codes(Body::Sun, "2026-06-21T19:10:00Z", Some(&greenwich)).is_empty());
        assert!(codes(Body::Sun, "2026-06-21T21:10:00Z", Some(&greenwich)).is_empty());
    }
}
