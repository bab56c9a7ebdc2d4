//! Civil dates of the proleptic Gregorian calendar and their day numbers.

use crate::error::{Code, Error};
use crate::quantity::SECONDS_PER_DAY;

/// A civil date and time of day, proleptic Gregorian (the rules of 1582 carried back before 1582).
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Civil {
    /// Astronomical year: the year before 1 is 0.
    pub year: i32,
    /// 1 to 12.
    pub month: u8,
    /// 1 to 31.
    pub day: u8,
    /// 0 to 23.
    pub hour: u8,
    /// 0 to 59.
    pub minute: u8,
    /// 0 up to 60.
    pub second: f64,
}

/// Years that a date may have.
const YEARS: std::ops::RangeInclusive<i32> = -9999..=9999;
/// About a million years: far outside anything answered, well inside integer arithmetic.
const DAYS_LIMIT: f64 = 3.6e8;

/// Whole days from 2000-01-01 to a date; the month may be any of 1 to 12, the day is not checked.
///
/// The year is counted from March, so that the leap day is its last and the months before it have a fixed rhythm.
pub(super) const fn days_from_2000(year: i32, month: u8, day: u8) -> i32 {
    let (march_year, march_month) = if month > 2 {
        (year, month as i32 - 3)
    } else {
        (year - 1, month as i32 + 9)
    };
    let leap_days =
        march_year.div_euclid(4) - march_year.div_euclid(100) + march_year.div_euclid(400);
    // 153 days in every five months from March; 730,425 = day number of 2000-01-01 in this count.
    march_year * 365 + leap_days + (153 * march_month + 2) / 5 + day as i32 - 1 - 730_425
}

/// Days in a month.
pub(super) const fn days_in_month(year: i32, month: u8) -> u8 {
    match month {
        2 if year.rem_euclid(4) == 0
            && (year.rem_euclid(100) != 0 || year.rem_euclid(400) == 0) =>
        {
            29
        }
        2 => 28,
        4 | 6 | 9 | 11 => 30,
        _ => 31,
    }
}

/// Days since 2000-01-01T12:00 of a civil date and seconds since its midnight.
pub(super) fn from_civil(year: i32, month: u8, day: u8, seconds_of_day: f64) -> Result<f64, Error> {
    if !YEARS.contains(&year)
        || !(1..=12).contains(&month)
        || day < 1
        || day > days_in_month(year, month)
    {
        return Err(Error::new(
            Code::BadInstant,
            "There is no such date; give a year from -9999 to 9999, a month and a day of the Gregorian calendar.",
        ));
    }
    if !(0.0..SECONDS_PER_DAY + 1.0).contains(&seconds_of_day) {
        return Err(Error::new(
            Code::BadInstant,
            "The time of day must be from 0 to 86,400 seconds after midnight.",
        ));
    }
    Ok(f64::from(days_from_2000(year, month, day)) - 0.5 + seconds_of_day / SECONDS_PER_DAY)
}

/// Year, month and day of a number of whole days since 2000-01-01.
pub(super) fn date(days_from_2000: i64) -> (i32, u8, u8) {
    // Day 0 is 0000-03-01 from here on; an era is the 400 years after which the calendar repeats.
    let shifted = days_from_2000 + 730_425;
    let era = shifted.div_euclid(146_097);
    let day_of_era = shifted.rem_euclid(146_097);
    let year_of_era =
        (day_of_era - day_of_era / 1_460 + day_of_era / 36_524 - day_of_era / 146_096) / 365;
    let day_of_year = day_of_era - (365 * year_of_era + year_of_era / 4 - year_of_era / 100);
    let march_month = (5 * day_of_year + 2) / 153;
    let day = day_of_year - (153 * march_month + 2) / 5 + 1;
    let month = if march_month < 10 {
        march_month + 3
    } else {
        march_month - 9
    };
    let year = era * 400 + year_of_era + i64::from(month <= 2);
    (year as i32, month as u8, day as u8)
}

/// The civil date and time of day of a number of days since 2000-01-01T12:00.
pub(super) fn civil(days_since_j2000: f64) -> Civil {
    let from_midnight = bounded(days_since_j2000) + 0.5;
    let mut whole_days = from_midnight.floor();
    let mut seconds = (from_midnight - whole_days) * SECONDS_PER_DAY;
    if seconds >= SECONDS_PER_DAY {
        whole_days += 1.0;
        seconds = 0.0;
    }
    let (year, month, day) = date(whole_days as i64);
    let minute_of_day = (seconds / 60.0).floor();
    Civil {
        year,
        month,
        day,
        hour: (minute_of_day / 60.0) as u8,
        minute: (minute_of_day as u32 % 60) as u8,
        second: seconds - minute_of_day * 60.0,
    }
}

/// The count kept within about a million years; NaN becomes the epoch.
pub(super) fn bounded(days_since_j2000: f64) -> f64 {
    if days_since_j2000.is_nan() {
        0.0
    } else {
        days_since_j2000.clamp(-DAYS_LIMIT, DAYS_LIMIT)
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn day_numbers_of_published_dates() {
        // Julian dates of J. Meeus, Astronomical Algorithms, ch. 7 (Gregorian ones; from memory of the book).
        for (year, month, day, julian_date) in [
            (2000, 1, 1, 2_451_544.5),
            (1999, 1, 1, 2_451_179.5),
            (1987, 1, 27, 2_446_822.5),
            (1988, 6, 19, 2_447_331.5),
            (1900, 1, 1, 2_415_020.5),
            (1600, 12, 31, 2_305_812.5),
        ] {
            let days = from_civil(year, month, day, 0.0).expect("a valid date");
            assert_eq!(days + 2_451_545.0, julian_date, "{year}-{month}-{day}");
        }
    }

    #[test]
    fn every_day_of_a_thousand_years_comes_back() {
        let first = days_from_2000(1500, 1, 1);
        let mut expected = (1500, 1u8, 1u8);
        for days in first..first + 366_000 {
            assert_eq!(date(i64::from(days)), expected);
            assert_eq!(days_from_2000(expected.0, expected.1, expected.2), days);
            expected = match expected {
                (year, 12, 31) => (year + 1, 1, 1),
                (year, month, day) if day == days_in_month(year, month) => (year, month + 1, 1),
                (year, month, day) => (year, month, day + 1),
            };
        }
    }

    #[test]
    fn leap_years_follow_the_gregorian_rule() {
        assert_eq!(days_in_month(2000, 2), 29);
        assert_eq!(days_in_month(1900, 2), 28);
        assert_eq!(days_in_month(2024, 2), 29);
        assert_eq!(days_in_month(0, 2), 29);
        assert_eq!(days_in_month(-1, 2), 28);
    }

    #[test]
    fn broken_dates_are_refused() {
        for (year, month, day, seconds) in [
            (2026, 2, 29, 0.0),
            (2026, 13, 1, 0.0),
            (2026, 0, 1, 0.0),
            (2026, 1, 0, 0.0),
            (20_000, 1, 1, 0.0),
            (2026, 1, 1, -1.0),
            (2026, 1, 1, 86_401.0),
            (2026, 1, 1, f64::NAN),
        ] {
            let error = from_civil(year, month, day, seconds).expect_err("must be refused");
            assert_eq!(error.code(), Code::BadInstant);
        }
    }

    #[test]
    fn civil_is_total() {
        assert_eq!(civil(f64::NAN).year, 2000);
        assert!(civil(f64::INFINITY).year > 900_000);
        assert!(civil(f64::NEG_INFINITY).year < -900_000);
        let evening = civil(0.25);
        assert_eq!((evening.hour, evening.minute), (18, 0));
    }
}
