//! From the even time of the search to the civil time of the answer.

use crate::quantity::{SECONDS_PER_DAY, hypotenuse};
use crate::time::{CivilScale, Tt, Utc, delta_t_seconds};

/// The civil instant of a terrestrial time.
///
/// Within a leap second, and at the seams of the civil scales, no civil instant may belong to it exactly; the answer
/// is then off by less than a second.
pub(super) fn utc_of(tt: Tt) -> Utc {
    let mut utc = Utc::from_days_since_j2000(tt.days_since_j2000());
    // The difference changes by less than a second a day: each pass leaves a hundred thousandth of the error.
    for _ in 0..3 {
        utc = utc.plus_days(tt.days_since_j2000() - utc.to_tt().days_since_j2000());
    }
    utc
}

/// How well the civil clock of a date is known against even time: nothing between the first leap second and the last
/// known one, delta-T's own uncertainty outside.
pub(super) fn clock_uncertainty_seconds(utc: Utc) -> f64 {
    match utc.scale() {
        CivilScale::Utc { .. } => 0.0,
        CivilScale::Ut1Before1972 | CivilScale::Ut1Future => {
            delta_t_seconds(utc).uncertainty_seconds
        }
    }
}

/// An error in days and the clock's own, in seconds; never below what the search resolves.
pub(super) fn with_clock_seconds(error_days: f64, utc: Utc) -> f64 {
    hypotenuse(error_days * SECONDS_PER_DAY, clock_uncertainty_seconds(utc))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn there_and_back() {
        for text in [
            "1650-03-01T04:00:00Z",
            "1971-12-31T12:00:00Z",
            "2016-12-31T23:59:58Z",
            "2030-07-01",
            "2199-01-01",
        ] {
            let utc = Utc::parse(text).expect("an instant");
            let back = utc_of(utc.to_tt());
            assert!(
                (back.days_since_j2000() - utc.days_since_j2000()).abs() < 1e-9,
                "{text}"
            );
        }
    }
}
