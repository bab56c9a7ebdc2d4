//! Instants on three time scales, civil dates, delta-T and leap seconds.
//!
//! [`Utc`] is what a clock on a wall shows, [`Tt`] runs evenly and drives the orbits, [`Ut1`] follows the turning
//! Earth. All three count days of 86,400 seconds from 2000-01-01 12:00 on their own scale, which keeps about a
//! microsecond over the whole span.
//!
//! # Which civil scale holds when
//!
//! | civil instant | count taken as | TT follows from |
//! |---|---|---|
//! | before 1972 | UT1 | delta-T |
//! | 1972 to the last year of the delta-T table | UTC | leap seconds, none assumed beyond the known 28 |
//! | later | UT1 | modelled delta-T |
//!
//! The seams are small because UTC is kept within 0.9 s of UT1: 0.15 s in 1972 (the published spline of
//! delta-T departs that much from the measured value), under 0.3 s at the end of the table (both held by tests).

mod calendar;
mod delta_t;
mod delta_t_table;
mod leap_seconds;
mod rfc3339;

pub use calendar::Civil;
pub use delta_t::{DeltaT, LAST_TABLE_YEAR, delta_t_seconds};

use crate::error::Error;
use crate::quantity::{DAYS_PER_JULIAN_CENTURY, DAYS_PER_JULIAN_YEAR, SECONDS_PER_DAY};

/// TT - TAI in seconds, by definition.
const TT_MINUS_TAI_SECONDS: f64 = 32.184;

/// A civil instant: days of 86,400 s since 2000-01-01T12:00 in the civil count.
///
/// A leap second has no number of its own: 23:59:60 is the same instant as 00:00:00 of the next day.
#[derive(Debug, Clone, Copy, PartialEq, PartialOrd)]
pub struct Utc(f64);

/// Terrestrial time: days since J2000.0 (2000-01-01T12:00 TT). Also used as TDB, at a cost below 0.002 s.
#[derive(Debug, Clone, Copy, PartialEq, PartialOrd)]
pub struct Tt(f64);

/// The time of the turning Earth: days since 2000-01-01T12:00 UT1.
#[derive(Debug, Clone, Copy, PartialEq, PartialOrd)]
pub struct Ut1(f64);

/// What the civil count of a date stands for; see the table in the [module's words](self).
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum CivilScale {
    /// Before 1972: universal time, UT1.
    Ut1Before1972,
    /// UTC with leap seconds; TAI - UTC in seconds.
    Utc {
        /// TAI - UTC.
        tai_minus_utc_seconds: u8,
    },
    /// After the last year of the delta-T table: UT1, since future leap seconds are unknown.
    Ut1Future,
}

impl Utc {
    /// The instant at a number of days since 2000-01-01T12:00 in the civil count.
    pub const fn from_days_since_j2000(days: f64) -> Self {
        Self(days)
    }

    /// Days since 2000-01-01T12:00 in the civil count.
    pub const fn days_since_j2000(self) -> f64 {
        self.0
    }

    /// The instant so many days later, in the civil count.
    pub fn plus_days(self, days: f64) -> Self {
        Self(self.0 + days)
    }

    /// The instant of a civil date, proleptic Gregorian (also before 1582), at a number of seconds since midnight.
    ///
    /// # Errors
    /// `bad-instant` when the date is not in the calendar, the year is not within -9999 to 9999, or the seconds are
    /// not within 0 up to 86,401 (the last one being a leap second).
    pub fn from_civil(year: i32, month: u8, day: u8, seconds_of_day: f64) -> Result<Self, Error> {
        calendar::from_civil(year, month, day, seconds_of_day).map(Self)
    }

    /// The civil date and time of day, proleptic Gregorian.
    ///
    /// Total: beyond a million years the nearest such date is given, and for NaN the epoch.
    pub fn civil(self) -> Civil {
        calendar::civil(self.0)
    }

    /// Reads RFC 3339 ("2026-11-24T18:30:00+01:00", any offset, "t" and "z" too) or a plain date, meaning 0h UTC.
    ///
    /// 23:59:60 UTC is accepted at the end of any month.
    ///
    /// # Errors
    /// `bad-instant` for anything else.
    pub fn parse(text: &str) -> Result<Self, Error> {
        rfc3339::parse(text).map(Self)
    }

    /// RFC 3339 rounded to the second, with "Z".
    pub fn to_rfc3339(self) -> String {
        rfc3339::format(self.0)
    }

    /// The year with its fraction, 2000.0 at 2000-01-01T00:00, in years of 365.25 days.
    pub fn julian_year(self) -> f64 {
        2000.0 + (self.0 + 0.5) / DAYS_PER_JULIAN_YEAR
    }

    /// What the civil count stands for at this date.
    pub fn scale(self) -> CivilScale {
        match leap_seconds::tai_minus_utc_seconds(self.0) {
            None => CivilScale::Ut1Before1972,
            Some(_) if self.julian_year() >= f64::from(LAST_TABLE_YEAR) => CivilScale::Ut1Future,
            Some(tai_minus_utc_seconds) => CivilScale::Utc {
                tai_minus_utc_seconds,
            },
        }
    }

    /// Terrestrial time of this instant.
    pub fn to_tt(self) -> Tt {
        let tt_minus_civil_seconds = match self.scale() {
            CivilScale::Utc {
                tai_minus_utc_seconds,
            } => f64::from(tai_minus_utc_seconds) + TT_MINUS_TAI_SECONDS,
            CivilScale::Ut1Before1972 | CivilScale::Ut1Future => delta_t_seconds(self).seconds,
        };
        Tt(self.0 + tt_minus_civil_seconds / SECONDS_PER_DAY)
    }

    /// The turning Earth's time of this instant.
    pub fn to_ut1(self) -> Ut1 {
        match self.scale() {
            CivilScale::Utc { .. } => {
                Ut1(self.to_tt().0 - delta_t_seconds(self).seconds / SECONDS_PER_DAY)
            }
            CivilScale::Ut1Before1972 | CivilScale::Ut1Future => Ut1(self.0),
        }
    }
}

impl Tt {
    /// The instant at a number of days since J2000.0 TT.
    pub const fn from_days_since_j2000(days: f64) -> Self {
        Self(days)
    }

    /// Days since J2000.0 TT.
    pub const fn days_since_j2000(self) -> f64 {
        self.0
    }

    /// The instant so many days later.
    pub fn plus_days(self, days: f64) -> Self {
        Self(self.0 + days)
    }

    /// Julian centuries of 36,525 days since J2000.0.
    pub fn julian_centuries(self) -> f64 {
        self.0 / DAYS_PER_JULIAN_CENTURY
    }

    /// Julian millennia of 365,250 days since J2000.0.
    pub fn julian_millennia(self) -> f64 {
        self.0 / (10.0 * DAYS_PER_JULIAN_CENTURY)
    }
}

impl Ut1 {
    /// The instant at a number of days since 2000-01-01T12:00 UT1.
    pub const fn from_days_since_j2000(days: f64) -> Self {
        Self(days)
    }

    /// Days since 2000-01-01T12:00 UT1.
    pub const fn days_since_j2000(self) -> f64 {
        self.0
    }

    /// The instant so many days later.
    pub fn plus_days(self, days: f64) -> Self {
        Self(self.0 + days)
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn at(text: &str) -> Utc {
        Utc::parse(text).expect("a valid instant in the test")
    }

    fn tt_minus_civil_seconds(utc: Utc) -> f64 {
        (utc.to_tt().days_since_j2000() - utc.days_since_j2000()) * SECONDS_PER_DAY
    }

    #[test]
    fn tt_follows_the_leap_seconds() {
        // TAI - UTC = 37 s since 2017-01-01, 36 s before (IERS Bulletin C 52).
        assert!((tt_minus_civil_seconds(at("2016-12-31T23:59:59Z")) - 68.184).abs() < 1e-5);
        assert!((tt_minus_civil_seconds(at("2017-01-01T00:00:00Z")) - 69.184).abs() < 1e-5);
        assert!((tt_minus_civil_seconds(at("1972-01-01T00:00:00Z")) - 42.184).abs() < 1e-5);
    }

    #[test]
    fn the_seam_of_1972_is_below_a_fifth_of_a_second() {
        let start = at("1972-01-01T00:00:00Z");
        let seam_seconds =
            tt_minus_civil_seconds(start) - tt_minus_civil_seconds(start.plus_days(-1e-7));
        assert!(seam_seconds.abs() < 0.2, "{seam_seconds}");
    }

    #[test]
    fn the_seam_after_the_table_is_below_a_third_of_a_second() {
        let last = Utc::from_days_since_j2000(
            f64::from(LAST_TABLE_YEAR - 2000) * DAYS_PER_JULIAN_YEAR - 0.5,
        );
        let (before, after) = (last.plus_days(-1e-4), last.plus_days(1e-4));
        assert_ne!(before.scale(), after.scale());
        let seam_seconds = tt_minus_civil_seconds(after) - tt_minus_civil_seconds(before);
        assert!(seam_seconds.abs() < 0.3, "{seam_seconds}");
    }

    #[test]
    fn ut1_stays_within_nine_tenths_of_a_second_of_utc() {
        let mut utc = at("1972-01-01");
        let end = at("2026-01-01");
        while utc < end {
            let difference_seconds = (utc.to_ut1().0 - utc.0) * SECONDS_PER_DAY;
            // 0.9 s is the rule of UTC; the spline that serves before 1974 departs from measured delta-T by 0.2 s.
            assert!(
                difference_seconds.abs() < 1.1,
                "{} {difference_seconds}",
                utc.to_rfc3339()
            );
            utc = utc.plus_days(11.0);
        }
    }

    #[test]
    fn before_1972_the_count_is_universal_time() {
        let utc = at("1850-06-01");
        assert_eq!(utc.to_ut1().0, utc.0);
        assert_eq!(utc.scale(), CivilScale::Ut1Before1972);
        assert_eq!(at("2150-01-01").scale(), CivilScale::Ut1Future);
    }
}
