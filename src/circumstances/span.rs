//! The same quantities over a span of days.

use crate::body::Body;
use crate::ephemeris::{Earth, Observation, check_span};
use crate::error::{Code, Error};
use crate::photometry::{Disc, MarsRotation, Seen, illuminated_fraction, magnitude};
use crate::time::Utc;

/// Samples at equal steps, one `f64` column per quantity. NaN stands where a law has no value.
#[derive(Debug, Clone, PartialEq)]
pub struct Series {
    /// The body sampled.
    pub body: Body,
    /// Instants.
    pub utc: Vec<Utc>,
    /// Lit share of the disc, 0 to 1; NaN for the Sun.
    pub illuminated_fraction: Vec<f64>,
    /// Equatorial diameter.
    pub angular_diameter_arcsec: Vec<f64>,
    /// Visual magnitude outside the air; NaN where the published law has no value.
    pub magnitude: Vec<f64>,
    /// Lit area in the sky; the whole disc for the Sun.
    pub lit_area_arcsec2: Vec<f64>,
    /// Angle from the Sun, 0 to 180; east and west are not told apart; NaN for the Sun.
    pub elongation_deg: Vec<f64>,
    /// Distance from the Earth's centre.
    pub distance_au: Vec<f64>,
}

/// The most samples that one series may have.
pub const MAX_SAMPLES: usize = 100_000;

/// A body sampled from one instant to another, both included when the step divides the span.
///
/// Values are those of [`circumstances`](super::circumstances); there are no warnings, which belong to single answers.
///
/// # Errors
/// `bad-instant` and `out-of-span` for either end, `bad-step` when the end is before the start, the step is not
/// finite and positive, or more than 100,000 samples would result.
pub fn series(body: Body, from: Utc, to: Utc, step_days: f64) -> Result<Series, Error> {
    check_span(from)?;
    check_span(to)?;
    let samples = count(from, to, step_days)?;
    let column = || Vec::with_capacity(samples);
    let mut series = Series {
        body,
        utc: Vec::with_capacity(samples),
        illuminated_fraction: column(),
        angular_diameter_arcsec: column(),
        magnitude: column(),
        lit_area_arcsec2: column(),
        elongation_deg: column(),
        distance_au: column(),
    };
    for index in 0..samples {
        // Product, not sum: rounding errors do not grow along the series.
        series.sample(from.plus_days(index as f64 * step_days));
    }
    Ok(series)
}

impl Series {
    fn sample(&mut self, utc: Utc) {
        let earth = Earth::at(utc.to_tt());
        let observation = Observation::of(self.body, &earth);
        let distance_au = observation.distance_au();
        let disc = Disc::of(self.body, distance_au);
        let (lit_share, elongation_deg) = if self.body == Body::Sun {
            (f64::NAN, f64::NAN)
        } else {
            (
                illuminated_fraction(observation.phase_angle_deg()),
                observation.elongation_deg(earth.sun_direction()),
            )
        };
        let lit_area_share = if self.body == Body::Sun {
            1.0
        } else {
            lit_share
        };
        self.utc.push(utc);
        self.illuminated_fraction.push(lit_share);
        self.angular_diameter_arcsec
            .push(disc.angular_diameter_arcsec);
        self.magnitude.push(
            magnitude(
                &Seen::new(&observation, &earth, utc),
                MarsRotation::AtInstant,
            )
            .value_or_nan(),
        );
        self.lit_area_arcsec2
            .push(disc.lit_area_arcsec2(lit_area_share));
        self.elongation_deg.push(elongation_deg);
        self.distance_au.push(distance_au);
    }
}

/// Number of samples of a valid span and step.
fn count(from: Utc, to: Utc, step_days: f64) -> Result<usize, Error> {
    let span_days = to.days_since_j2000() - from.days_since_j2000();
    if span_days < 0.0 {
        return Err(Error::new(
            Code::BadStep,
            "The end of the span must not be before its start.",
        ));
    }
    if !(step_days.is_finite() && step_days > 0.0) {
        return Err(Error::new(
            Code::BadStep,
            "The step must be a finite number of days above 0.",
        ));
    }
    // A step that divides the span must not lose the last sample to rounding.
    let steps = (span_days / step_days * (1.0 + 1e-12)).floor();
    if steps >= MAX_SAMPLES as f64 {
        return Err(Error::new(
            Code::BadStep,
            format!(
                "A series has at most {MAX_SAMPLES} samples; choose a longer step or a shorter span."
            ),
        ));
    }
    Ok(steps as usize + 1)
}

#[cfg(test)]
mod tests {
    use super::*;

    fn at(text: &str) -> Utc {
        Utc::parse(text).expect("a valid instant")
    }

    #[test]
    fn both_ends_are_sampled() {
        let series =
            series(Body::Venus, at("2026-08-01"), at("2026-08-11"), 0.1).expect("a valid series");
        assert_eq!(series.utc.len(), 101);
        assert_eq!(series.magnitude.len(), 101);
        assert!(
            (series.utc[100].days_since_j2000() - at("2026-08-11").days_since_j2000()).abs() < 1e-9
        );
    }

    #[test]
    fn an_incomplete_last_step_ends_before_the_end() {
        let series =
            series(Body::Sun, at("2026-08-01"), at("2026-08-02"), 0.7).expect("a valid series");
        assert_eq!(series.utc.len(), 2);
        assert!(series.elongation_deg.iter().all(|value| value.is_nan()));
        assert!(series.magnitude.iter().all(|value| value.is_finite()));
    }

    #[test]
    fn bad_steps_are_refused() {
        let (from, to) = (at("2026-01-01"), at("2027-01-01"));
        for (from, to, step_days) in [
            (from, to, 0.0),
            (from, to, -1.0),
            (from, to, f64::NAN),
            (from, to, f64::INFINITY),
            (from, to, 1e-3),
            (from, to, 1e-300),
            (to, from, 1.0),
        ] {
            let refused = series(Body::Mars, from, to, step_days).map_err(|error| error.code());
            assert_eq!(refused, Err(Code::BadStep), "{step_days}");
        }
    }

    #[test]
    fn samples_equal_the_single_answers() {
        for body in Body::ALL {
            let utc = at("2026-11-24T06:00:00Z");
            let series = series(body, utc, utc, 1.0).expect("a valid series");
            let single = crate::circumstances(body, utc, None).expect("a valid instant");
            assert_eq!(series.distance_au[0], single.distance_au);
            assert_eq!(series.lit_area_arcsec2[0], single.lit_area_arcsec2);
            assert_eq!(Some(series.magnitude[0]), single.magnitude);
            assert_eq!(
                Some(series.elongation_deg[0]).filter(|value| !value.is_nan()),
                single.elongation_deg
            );
            assert_eq!(
                Some(series.illuminated_fraction[0]).filter(|v| !v.is_nan()),
                single.illuminated_fraction
            );
        }
    }
}
