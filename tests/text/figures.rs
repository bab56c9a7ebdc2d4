//! How many digits a figure gets, and how numbers and dates are written.

use super::support_chart::{day, figures};
use proptest::prelude::*;
use wanderlight::Utc;
use wanderlight::explain::{AreaScale, DateForm, EnglishFormats, Formats, Peak};

#[test]
fn figures_get_the_digits_they_deserve() {
    let f = figures();
    let share = |fraction| f.lit_share(fraction);
    assert_eq!(
        [
            0.0004, 0.0312, 0.0994, 0.0996, 0.227, 0.994, 0.9973, 0.9996, 1.0
        ]
        .map(share),
        [
            "under 0.1",
            "3.1",
            "9.9",
            "10",
            "23",
            "99",
            "99.7",
            "100",
            "100"
        ]
        .map(|n| format!("{n}\u{a0}%"))
    );
    assert_eq!(
        [2.34, 9.94, 9.96, 43.4, 119.0, 1880.0].map(|arcsec| f.diameter(arcsec)),
        ["2.3″", "9.9″", "10″", "43″", "119″", "31.3′"]
    );
    assert_eq!(f.diameter_spelled(1.0), "1.0 arcseconds");
    assert_eq!(
        f.area(1456.4, AreaScale::SquareArcseconds),
        "1,456\u{a0}arcsec²"
    );
    assert_eq!(
        f.area(2.36e6, AreaScale::SquareArcminutes),
        "656\u{a0}arcmin²"
    );
    assert_eq!(f.magnitude(-4.87), "magnitude −4.9");
    assert_eq!(
        f.magnitude(-0.04),
        "magnitude 0.0",
        "no minus before what is printed as zero"
    );
}

#[test]
fn one_day_is_not_one_days() {
    let peak = |days| Peak {
        utc: day(2026, 11, 24),
        magnitude: -4.9,
        flat_from: day(2026, 11, 24),
        flat_to: day(2026, 11, 24).plus_days(days),
    };
    let words = figures().words;
    assert_eq!((peak(0.2).flat_days(), peak(30.6).flat_days()), (1.0, 31.0));
    assert_eq!(words.flatness("1", 1), "within 0.1 mag for 1 day");
    assert_eq!(words.flatness("31", 31), "within 0.1 mag for 31 days");
    assert_eq!(words.arcminutes("1"), "1 arcminute");
}

#[test]
fn dates_follow_the_readers_clock() {
    let utc = Utc::from_civil(2026, 12, 31, 23.5 * 3600.0).expect("a date");
    let in_zone = |utc_offset_minutes, form| EnglishFormats { utc_offset_minutes }.date(utc, form);
    assert_eq!(in_zone(0, DateForm::Day), "31 December 2026");
    assert_eq!(in_zone(60, DateForm::Day), "1 January 2027");
    assert_eq!(in_zone(60, DateForm::DayMonth), "1 Jan");
    assert_eq!(in_zone(-300, DateForm::MonthYear), "Dec 2026");
    assert_eq!(in_zone(345, DateForm::DayTime), "1 January 2027, 05:15");
    assert_eq!(in_zone(0, DateForm::Year), "2026");
}

proptest! {
    #[test]
    fn no_figure_is_ever_printed_as_nan(value in prop_oneof![any::<f64>(), -30.0..30.0f64, 0.0..2000.0f64]) {
        let f = figures();
        for text in [f.lit_share(value), f.magnitude(value)] {
            prop_assert!(!text.contains("NaN") && !text.contains("inf"), "{text}");
            prop_assert!(!text.contains('-'), "a hyphen is no minus sign: {text}");
        }
    }

    #[test]
    fn numbers_read_back_as_what_was_written(value in -1e7..1e7f64, decimals in 0u8..4) {
        let text = EnglishFormats::default().number(value, decimals).replace(',', "").replace('\u{2212}', "-");
        let back: f64 = text.parse().expect("a number");
        prop_assert!((back - value).abs() <= 0.5 * 10f64.powi(-i32::from(decimals)) + 1e-9, "{value} became {text}");
    }
}
