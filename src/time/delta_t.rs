//! Delta-T = TT - UT1: how far the turning Earth lags behind even time, and how well that is known.

use super::Utc;
use super::delta_t_table::{FIRST_YEAR, HUNDREDTHS_SECONDS};

/// Delta-T with its standard uncertainty, in seconds.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct DeltaT {
    /// TT - UT1.
    pub seconds: f64,
    /// One standard deviation.
    pub uncertainty_seconds: f64,
}

/// Last year of the table; delta-T is modelled from its January 1 on.
pub const LAST_TABLE_YEAR: i32 = FIRST_YEAR + HUNDREDTHS_SECONDS.len() as i32 - 1;

/// Growth of delta-T after the table: a day that lengthens by 1.72 ms per century, with no lag at the start.
const PARABOLA_SECONDS_PER_CENTURY_2: f64 = 31.4;

/// Delta-T at a civil instant.
///
/// Source: Morrison, Stephenson, Hohenkerk and Zawilski 2021 up to 1973, IERS from 1974 on, straight lines between
/// yearly knots (0.02 s rms against the source); after the table a parabola. Before the table its first value holds,
/// since nothing is answered there.
pub fn delta_t_seconds(utc: Utc) -> DeltaT {
    let year = utc.julian_year();
    DeltaT {
        seconds: seconds(year),
        uncertainty_seconds: uncertainty_seconds(year),
    }
}

fn seconds(year: f64) -> f64 {
    let last = HUNDREDTHS_SECONDS.len() - 1;
    let position = (year - f64::from(FIRST_YEAR)).max(0.0);
    let knot = |index: usize| f64::from(HUNDREDTHS_SECONDS[index.min(last)]) * 0.01;
    let beyond_years = position - last as f64;
    if beyond_years >= 0.0 {
        return knot(last) + PARABOLA_SECONDS_PER_CENTURY_2 * (beyond_years / 100.0).powi(2);
    }
    // The cast takes the whole part; NaN becomes the first knot.
    let index = position as usize;
    let fraction = position - index as f64;
    knot(index) + fraction * (knot(index + 1) - knot(index))
}

/// Year and standard error in seconds; straight lines between.
///
/// Before 1800 the standard errors of Morrison and Stephenson 2004 (from memory); 1800 to 1860 half of the
/// difference between two published models; then their tenths and less, down to the error of the knots.
const PAST_UNCERTAINTY: [(f64, f64); 7] = [
    (1600.0, 20.0),
    (1700.0, 5.0),
    (1800.0, 2.0),
    (1860.0, 1.0),
    (1900.0, 0.2),
    (1955.0, 0.1),
    (1973.0, 0.05),
];

/// Huber's random walk of the length of day: 0.058 ms^2 per year, correlated over 2500 years (from memory of
/// P. J. Huber 2006, Journal of Geodesy 80, 283; it gives 5.7 s for 2050, 32 s for 2100 and 120 s for 2200).
fn uncertainty_seconds(year: f64) -> f64 {
    let beyond_years = year - f64::from(LAST_TABLE_YEAR);
    if beyond_years > 0.0 {
        let walk_seconds = 0.365_25
            * beyond_years
            * (beyond_years * 0.058 / 3.0 * (1.0 + beyond_years / 2500.0)).sqrt();
        return 0.05 + walk_seconds;
    }
    let mut previous = PAST_UNCERTAINTY[0];
    for next in PAST_UNCERTAINTY {
        if year <= next.0 {
            let width_years = (next.0 - previous.0).max(1.0);
            let fraction = ((year - previous.0) / width_years).max(0.0);
            return previous.1 + fraction * (next.1 - previous.1);
        }
        previous = next;
    }
    previous.1
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn published_values() {
        // IERS values at the start of the year; the yearly knots carry hundredths of a second.
        for (year, expected_seconds) in [
            (1980.0, 50.54),
            (2000.0, 63.83),
            (2010.0, 66.07),
            (2020.0, 69.36),
        ] {
            assert!(
                (seconds(year) - expected_seconds).abs() < 0.03,
                "{year}: {}",
                seconds(year)
            );
        }
    }

    #[test]
    fn no_jump_at_a_knot_or_at_the_end_of_the_table() {
        for year in FIRST_YEAR..=LAST_TABLE_YEAR + 1 {
            let knot = f64::from(year);
            let jump_seconds = seconds(knot + 1e-7) - seconds(knot - 1e-7);
            assert!(jump_seconds.abs() < 1e-5, "{year}: {jump_seconds}");
        }
    }

    #[test]
    fn the_future_grows_as_studied() {
        assert!((seconds(2100.0) - 86.0).abs() < 1.5, "{}", seconds(2100.0));
        assert!(
            (uncertainty_seconds(2100.0) - 32.0).abs() < 2.0,
            "{}",
            uncertainty_seconds(2100.0)
        );
        assert!(
            (uncertainty_seconds(2050.0) - 5.7).abs() < 0.8,
            "{}",
            uncertainty_seconds(2050.0)
        );
    }

    #[test]
    fn uncertainty_is_positive_and_finite_over_the_span() {
        for year in 1590..2310 {
            let value = uncertainty_seconds(f64::from(year));
            assert!(
                value > 0.0 && value.is_finite() && value < 300.0,
                "{year}: {value}"
            );
        }
    }

    #[test]
    fn nonsense_gives_no_panic() {
        assert!(seconds(f64::NAN).is_finite());
        assert!(seconds(f64::NEG_INFINITY).is_finite());
    }
}
