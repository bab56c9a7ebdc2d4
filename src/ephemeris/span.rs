//! The years that are answered.

use crate::error::{Code, Error};
use crate::series::{VALID_FROM_YEAR, VALID_TO_YEAR};
use crate::time::Utc;

/// First year of the span that the tests compare with a reference.
const CHECKED_FROM_YEAR: f64 = 1700.0;
/// End of the span that the tests compare with a reference.
const CHECKED_TO_YEAR: f64 = 2200.0;

/// How well an instant is covered.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum SpanPart {
    /// 1700 to 2200: compared with a reference.
    Checked,
    /// The rest of 1600 to 2300: the series are fitted there, but less was compared.
    Fitted,
}

/// Whether an instant can be answered.
///
/// # Errors
/// `bad-instant` when it is not finite, `out-of-span` outside the years that the series are fitted to.
pub fn check_span(utc: Utc) -> Result<SpanPart, Error> {
    let year = utc.julian_year();
    if !year.is_finite() {
        return Err(Error::new(
            Code::BadInstant,
            "The instant must be a finite number of days.",
        ));
    }
    if year < f64::from(VALID_FROM_YEAR) || year > f64::from(VALID_TO_YEAR) {
        return Err(Error::new(
            Code::OutOfSpan,
            format!("The instant must lie in the years {VALID_FROM_YEAR} to {VALID_TO_YEAR}."),
        ));
    }
    let checked = (CHECKED_FROM_YEAR..=CHECKED_TO_YEAR).contains(&year);
    Ok(if checked {
        SpanPart::Checked
    } else {
        SpanPart::Fitted
    })
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn parts_of_the_span() {
        let part =
            |text: &str| check_span(Utc::parse(text).expect("valid")).map_err(|error| error.code());
        assert_eq!(part("2026-11-24"), Ok(SpanPart::Checked));
        assert_eq!(part("1650-01-01"), Ok(SpanPart::Fitted));
        assert_eq!(part("2250-01-01"), Ok(SpanPart::Fitted));
        assert_eq!(part("1599-01-01"), Err(Code::OutOfSpan));
        assert_eq!(part("2301-01-01"), Err(Code::OutOfSpan));
        let nan = check_span(Utc::from_days_since_j2000(f64::NAN));
        assert_eq!(nan.map_err(|error| error.code()), Err(Code::BadInstant));
    }
}
