//! Calendar, delta-T, sidereal time, nutation, refraction, angles.

use crate::support::{check, check_angle};
use crate::{degrees, hours};
use wanderlight::Utc;
use wanderlight::frames::{
    OfDate, Spherical, earth_rotation_angle_rad, greenwich_apparent_sidereal_time_rad,
    greenwich_mean_sidereal_time_rad, mean_obliquity_rad, nutation, position_angle_deg,
    refraction_from_apparent_altitude_deg, refraction_from_true_altitude_deg, separation_deg,
};
use wanderlight::time::{Tt, Ut1, delta_t_seconds};

/// Julian date of the epoch J2000.0, from which the crate counts days.
const J2000_JD: f64 = 2_451_545.0;
const ARCSEC_PER_RAD: f64 = 206_264.806_247_096_36;

fn tt(jd: f64) -> Tt {
    Tt::from_days_since_j2000(jd - J2000_JD)
}

/// [meeus] chapter 7, the list of Julian dates, and example 7.a.
#[test]
fn julian_dates() {
    let rows = [
        (2000, 1, 1, 0.5, 2_451_545.0),
        (1999, 1, 1, 0.0, 2_451_179.5),
        (1987, 1, 27, 0.0, 2_446_822.5),
        (1987, 6, 19, 0.5, 2_446_966.0),
        (1988, 6, 19, 0.5, 2_447_332.0),
        (1957, 10, 4, 0.81, 2_436_116.31),
        (1900, 1, 1, 0.0, 2_415_020.5),
        (1600, 1, 1, 0.0, 2_305_447.5),
        (1600, 12, 31, 0.0, 2_305_812.5),
    ];
    for (year, month, day, fraction, jd) in rows {
        let utc = Utc::from_civil(year, month, day, fraction * 86_400.0).expect("a date");
        check(
            &format!("{year}-{month}-{day}"),
            utc.days_since_j2000() + J2000_JD,
            jd,
            1e-9,
            "days",
        );
        let civil = utc.civil();
        assert_eq!((civil.year, civil.month, civil.day), (year, month, day));
    }
}

/// [meeus] examples 12.a and 12.b: Greenwich, 1987 April 10 at 0h and 19h21m UT1. IAU 1982 against IAU 2006 sidereal time
/// differs by some milliseconds of time, 0.1 arcsec, and the nutation by another 0.05 arcsec.
#[test]
fn sidereal_time_meeus() {
    let ut1 = Ut1::from_days_since_j2000(2_446_895.5 - J2000_JD);
    let instant = tt(2_446_895.5 + 55.6 / 86_400.0);
    let mean_deg = greenwich_mean_sidereal_time_rad(ut1, instant).to_degrees();
    check_angle("mean, 0h", mean_deg, hours(13.0, 10.0, 46.3668), 0.2);
    let apparent_deg =
        greenwich_apparent_sidereal_time_rad(ut1, instant, &OfDate::at(instant)).to_degrees();
    check_angle(
        "apparent, 0h",
        apparent_deg,
        hours(13.0, 10.0, 46.1351),
        0.2,
    );
    let later_days = (19.0 + 21.0 / 60.0) / 24.0;
    let later_deg =
        greenwich_mean_sidereal_time_rad(ut1.plus_days(later_days), instant.plus_days(later_days))
            .to_degrees();
    check_angle("mean, 19h21m", later_deg, hours(8.0, 34.0, 57.0896), 0.2);
}

/// [sofa] gmst06, gst06a, era00 at MJD 53736 (UT1) and 53736 (TT); era00 at MJD 54388.
#[test]
fn sidereal_time_sofa() {
    let days = 53_736.0 + 2_400_000.5 - J2000_JD;
    let (ut1, instant) = (
        Ut1::from_days_since_j2000(days),
        Tt::from_days_since_j2000(days),
    );
    let mean_deg = greenwich_mean_sidereal_time_rad(ut1, instant).to_degrees();
    // The arithmetic of days since J2000 in one number leaves 1e-5 arcsec.
    check_angle(
        "gmst06",
        mean_deg,
        1.754_174_971_870_091_2_f64.to_degrees(),
        1e-4,
    );
    let apparent_deg =
        greenwich_apparent_sidereal_time_rad(ut1, instant, &OfDate::at(instant)).to_degrees();
    // Nutation 2000B against 2000A.
    check_angle(
        "gst06a",
        apparent_deg,
        1.754_166_137_675_019_2_f64.to_degrees(),
        0.004,
    );
    let ut1 = Ut1::from_days_since_j2000(54_388.0 + 2_400_000.5 - J2000_JD);
    check_angle(
        "era00",
        earth_rotation_angle_rad(ut1).to_degrees(),
        0.402_283_724_002_815_8_f64.to_degrees(),
        1e-4,
    );
}

/// [meeus] example 22.a, 1987 April 10 at 0h TT: IAU 1980 nutation, 0.05 arcsec from today's, and an obliquity that is
/// 0.042 arcsec larger by definition.
#[test]
fn nutation_and_obliquity_meeus() {
    let instant = tt(2_446_895.5);
    let got = nutation(instant);
    check(
        "in longitude",
        got.longitude_rad * ARCSEC_PER_RAD,
        -3.788,
        0.06,
        "arcsec",
    );
    check(
        "in obliquity",
        got.obliquity_rad * ARCSEC_PER_RAD,
        9.443,
        0.02,
        "arcsec",
    );
    check_angle(
        "mean obliquity",
        mean_obliquity_rad(instant).to_degrees(),
        degrees(1.0, 23.0, 26.0, 27.407),
        0.06,
    );
    check_angle(
        "true obliquity",
        OfDate::at(instant).true_obliquity_rad().to_degrees(),
        degrees(1.0, 23.0, 26.0, 36.850),
        0.06,
    );
}

/// [sofa] nut06a at MJD 53736 against our 2000B: 4 mas; obl06 at MJD 54388 exactly.
#[test]
fn nutation_and_obliquity_sofa() {
    let got = nutation(tt(53_736.0 + 2_400_000.5));
    check(
        "nut06a psi",
        got.longitude_rad * ARCSEC_PER_RAD,
        -0.963_091_202_582_030_8e-5 * ARCSEC_PER_RAD,
        0.004,
        "arcsec",
    );
    check(
        "nut06a eps",
        got.obliquity_rad * ARCSEC_PER_RAD,
        0.406_323_849_688_724_9e-4 * ARCSEC_PER_RAD,
        0.003,
        "arcsec",
    );
    let obliquity_deg = mean_obliquity_rad(tt(54_388.0 + 2_400_000.5)).to_degrees();
    check_angle(
        "obl06",
        obliquity_deg,
        0.409_074_922_938_725_8_f64.to_degrees(),
        1e-6,
    );
}

/// [delta-t] January 1 of each year, seconds: the historical study's rounded table with its standard errors, then IERS.
#[test]
fn delta_t_of_published_years() {
    let rows = [
        (1700, 9.0, 6.0),
        (1750, 13.0, 4.5),
        (1800, 14.0, 4.5),
        (1850, 7.0, 2.5),
        (1900, -3.0, 1.5),
        (1950, 29.0, 0.5),
        // One decimal, and a later reduction of the lunar observations.
        (1960, 33.2, 0.25),
        (1970, 40.2, 0.35),
        (1980, 50.54, 0.06),
        (1990, 56.86, 0.06),
        (2000, 63.83, 0.02),
        (2010, 66.07, 0.02),
        (2020, 69.36, 0.02),
        (2024, 69.18, 0.02),
    ];
    for (year, seconds, tolerance_seconds) in rows {
        let utc = Utc::from_civil(year, 1, 1, 0.0).expect("a date");
        let got = delta_t_seconds(utc);
        check(
            &format!("delta-T {year}"),
            got.seconds,
            seconds,
            tolerance_seconds,
            "s",
        );
        assert!(
            got.uncertainty_seconds > 0.0 && got.uncertainty_seconds < 10.0,
            "{year}: {got:?}"
        );
    }
}

/// TAI - UTC became 37 s at the end of 2016 (IERS Bulletin C 52): that midnight is two elapsed seconds after 23:59:59.
#[test]
fn leap_second_of_2016() {
    let tt_of = |text: &str| {
        Utc::parse(text)
            .expect("an instant")
            .to_tt()
            .days_since_j2000()
    };
    let before = tt_of("2016-12-31T23:59:59Z");
    let after = tt_of("2017-01-01T00:00:00Z");
    check(
        "over the leap second",
        (after - before) * 86_400.0,
        2.0,
        1e-4,
        "s",
    );
    let civil = Utc::parse("2017-01-01T00:00:00Z")
        .expect("an instant")
        .days_since_j2000();
    check(
        "TT - UTC",
        (after - civil) * 86_400.0,
        37.0 + 32.184,
        1e-4,
        "s",
    );
}

/// [meeus] example 16.a: both directions of refraction at 1010 hPa and 10 C.
#[test]
fn refraction() {
    check(
        "from apparent",
        refraction_from_apparent_altitude_deg(0.5) * 60.0,
        28.754,
        0.002,
        "arcmin",
    );
    check(
        "from true",
        refraction_from_true_altitude_deg(33.246 / 60.0) * 60.0,
        24.618,
        0.002,
        "arcmin",
    );
}

/// [meeus] example 17.a: Arcturus and Spica. And the position angle of the second seen from the first is that of the arc.
#[test]
fn separation_of_two_stars() {
    let star = |longitude_deg: f64, latitude_deg: f64| {
        Spherical {
            longitude_deg,
            latitude_deg,
        }
        .direction()
    };
    let (arcturus, spica) = (star(213.9154, 19.1825), star(201.2983, -11.1614));
    check(
        "separation",
        separation_deg(arcturus, spica),
        32.7930,
        1e-4,
        "deg",
    );
    // South and west of Arcturus.
    let angle_deg = position_angle_deg(arcturus, spica);
    assert!((180.0..270.0).contains(&angle_deg), "{angle_deg}");
}
