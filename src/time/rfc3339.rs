//! Reading and writing instants in the form of RFC 3339.

use super::calendar::{bounded, date, days_in_month, from_civil};
use crate::error::{Code, Error, quoted};
use crate::quantity::SECONDS_PER_DAY;

/// Days since 2000-01-01T12:00 of an RFC 3339 instant or of a plain date at 0h UTC.
pub(super) fn parse(text: &str) -> Result<f64, Error> {
    let mut rest = Reader {
        bytes: text.trim().as_bytes(),
    };
    let days = rest.instant().filter(|_| rest.bytes.is_empty());
    days.ok_or_else(|| {
        Error::new(
            Code::BadInstant,
            format!(
                "{} is no instant: give a date of the Gregorian calendar such as 2026-11-24, or a date and time with \
                 offset such as 2026-11-24T18:30:00Z or 2026-11-24T19:30:00+01:00.",
                quoted(text)
            ),
        )
    })
}

/// RFC 3339 rounded to the second, with "Z".
pub(super) fn format(days_since_j2000: f64) -> String {
    let seconds = ((bounded(days_since_j2000) + 0.5) * SECONDS_PER_DAY).round() as i64;
    let (year, month, day) = date(seconds.div_euclid(86_400));
    let of_day = seconds.rem_euclid(86_400);
    let (hour, minute, second) = (of_day / 3600, of_day / 60 % 60, of_day % 60);
    format!("{year:04}-{month:02}-{day:02}T{hour:02}:{minute:02}:{second:02}Z")
}

/// What is still to be read.
struct Reader<'a> {
    bytes: &'a [u8],
}

impl Reader<'_> {
    fn instant(&mut self) -> Option<f64> {
        let year = self.number(4)? as i32;
        self.one_of(b"-")?;
        let month = self.number(2)? as u8;
        self.one_of(b"-")?;
        let day = self.number(2)? as u8;
        let midnight = from_civil(year, month, day, 0.0).ok()?;
        if self.bytes.is_empty() {
            return Some(midnight);
        }
        // RFC 3339 allows a blank in place of the T.
        self.one_of(b"Tt ")?;
        let hour = self.number(2)?;
        self.one_of(b":")?;
        let minute = self.number(2)?;
        self.one_of(b":")?;
        let second = self.number(2)?;
        let fraction = self.fraction()?;
        let offset_minutes = self.offset_minutes()?;
        if hour > 23 || minute > 59 || second > 60 {
            return None;
        }
        let minutes = i64::from(hour * 60 + minute) - offset_minutes;
        if second == 60 && !ends_a_month(midnight, minutes) {
            return None;
        }
        let seconds = (minutes * 60) as f64 + f64::from(second) + fraction;
        Some(midnight + seconds / SECONDS_PER_DAY)
    }

    /// Exactly so many digits.
    fn number(&mut self, digits: usize) -> Option<u32> {
        let (head, tail) = self.bytes.split_at_checked(digits)?;
        self.bytes = tail;
        head.iter().try_fold(0, |value, byte| {
            byte.is_ascii_digit()
                .then(|| value * 10 + u32::from(byte - b'0'))
        })
    }

    fn one_of(&mut self, allowed: &[u8]) -> Option<u8> {
        let (&first, tail) = self.bytes.split_first()?;
        self.bytes = tail;
        allowed.contains(&first).then_some(first)
    }

    /// The fraction of a second: a point and at least one digit, or nothing.
    fn fraction(&mut self) -> Option<f64> {
        let Some((b'.', tail)) = self.bytes.split_first() else {
            return Some(0.0);
        };
        self.bytes = tail;
        let (mut value, mut weight) = (0.0, 0.1);
        let mut digits = 0;
        while let Some((&byte, tail)) = self.bytes.split_first()
            && byte.is_ascii_digit()
        {
            value += f64::from(byte - b'0') * weight;
            weight *= 0.1;
            digits += 1;
            self.bytes = tail;
        }
        (digits > 0).then_some(value)
    }

    /// Minutes by which the clock is ahead of UTC.
    fn offset_minutes(&mut self) -> Option<i64> {
        let sign = match self.one_of(b"Zz+-")? {
            b'+' => 1,
            b'-' => -1,
            _ => return Some(0),
        };
        let hours = self.number(2)?;
        self.one_of(b":")?;
        let minutes = self.number(2)?;
        (hours <= 23 && minutes <= 59).then(|| sign * i64::from(hours * 60 + minutes))
    }
}

/// Whether the minute is 23:59 UTC on the last day of a month: the only minute that may have a second 60.
fn ends_a_month(midnight_days: f64, minutes: i64) -> bool {
    let (year, month, day) = date((midnight_days + 0.5) as i64 + minutes.div_euclid(1440));
    minutes.rem_euclid(1440) == 1439 && day == days_in_month(year, month)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn reads_what_the_standard_allows() {
        for (text, expected) in [
            ("2026-11-24", "2026-11-24T00:00:00Z"),
            ("2026-11-24T18:30:00Z", "2026-11-24T18:30:00Z"),
            ("2026-11-24t18:30:00z", "2026-11-24T18:30:00Z"),
            ("2026-11-24 18:30:00Z", "2026-11-24T18:30:00Z"),
            ("2026-11-24T19:30:00+01:00", "2026-11-24T18:30:00Z"),
            ("2026-11-24T00:30:00.75+05:45", "2026-11-23T18:45:01Z"),
            ("1985-06-30T23:59:60Z", "1985-07-01T00:00:00Z"),
            ("1985-07-01T01:59:60+02:00", "1985-07-01T00:00:00Z"),
            ("1996-12-19T16:39:57-08:00", "1996-12-20T00:39:57Z"),
            ("1700-02-28T23:59:59.6Z", "1700-03-01T00:00:00Z"),
            ("  2026-11-24  ", "2026-11-24T00:00:00Z"),
            ("2026-11-24T00:00:00-00:00", "2026-11-24T00:00:00Z"),
        ] {
            let days = parse(text).unwrap_or_else(|error| panic!("{text}: {error}"));
            assert_eq!(format(days), expected, "{text}");
        }
    }

    #[test]
    fn refuses_everything_else() {
        for text in [
            "",
            "today",
            "2026",
            "2026-2-3",
            "2026-02-30",
            "2026-13-01",
            "2026-11-24T",
            "2026-11-24T18:30Z",
            "2026-11-24T24:00:00Z",
            "2026-11-24T18:60:00Z",
            "2026-11-24T18:30:61Z",
            "2026-11-24T18:30:60Z",
            "2026-11-24T23:59:60Z",
            "2026-11-30T22:59:60Z",
            "2026-11-24T18:30:00",
            "2026-11-24T18:30:00.Z",
            "2026-11-24T18:30:00+1:00",
            "2026-11-24T18:30:00+24:00",
            "2026-11-24T18:30:00Zx",
            "+2026-11-24",
            "2026-11-2\u{664}",
            "２０２６-11-24",
        ] {
            let error = parse(text).expect_err(text);
            assert_eq!(error.code(), Code::BadInstant);
        }
    }
}
