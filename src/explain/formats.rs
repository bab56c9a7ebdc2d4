//! How numbers and dates are written.

use crate::time::Utc;

/// Which parts of a date are wanted.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum DateForm {
    /// 24 November 2026
    Day,
    /// 24 Nov
    DayMonth,
    /// Nov
    Month,
    /// Nov 2026
    MonthYear,
    /// 2026
    Year,
    /// 24 November 2026, 06:30
    DayTime,
}

/// Numbers and dates in the reader's language and time zone.
pub trait Formats {
    /// A number with this many decimals and a sign where it is negative.
    fn number(&self, value: f64, decimals: u8) -> String;
    /// An instant as a date on the reader's clock.
    fn date(&self, utc: Utc, form: DateForm) -> String;
}

/// English formats with a fixed offset from UTC, for use without a browser.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub struct EnglishFormats {
    /// Minutes that the reader's clock is ahead of UTC.
    pub utc_offset_minutes: i32,
}

const MONTHS: [&str; 12] = [
    "January",
    "February",
    "March",
    "April",
    "May",
    "June",
    "July",
    "August",
    "September",
    "October",
    "November",
    "December",
];

impl Formats for EnglishFormats {
    fn number(&self, value: f64, decimals: u8) -> String {
        let plain = format!("{:.*}", usize::from(decimals), value.abs());
        let whole = plain.find('.').unwrap_or(plain.len());
        let mut text = String::new();
        // No minus on what is printed as zero.
        if value < 0.0 && plain.bytes().any(|byte| (b'1'..=b'9').contains(&byte)) {
            text.push('\u{2212}');
        }
        for (index, character) in plain.char_indices() {
            if index > 0 && index < whole && (whole - index) % 3 == 0 {
                text.push(',');
            }
            text.push(character);
        }
        text
    }

    fn date(&self, utc: Utc, form: DateForm) -> String {
        let civil = utc
            .plus_days(f64::from(self.utc_offset_minutes) / 1440.0)
            .civil();
        let month = MONTHS[usize::from(civil.month.clamp(1, 12)) - 1];
        let short = &month[..3];
        match form {
            DateForm::Day => format!("{} {month} {}", civil.day, civil.year),
            DateForm::DayMonth => format!("{} {short}", civil.day),
            DateForm::Month => short.to_owned(),
            DateForm::MonthYear => format!("{short} {}", civil.year),
            DateForm::Year => civil.year.to_string(),
            DateForm::DayTime => {
                format!(
                    "{} {month} {}, {:02}:{:02}",
                    civil.day, civil.year, civil.hour, civil.minute
                )
            }
        }
    }
}
