//! Turning of the Earth: rotation angle and sidereal time.

use std::f64::consts::TAU;

use super::precession::OfDate;
use crate::quantity::{ARCSEC_PER_RAD, cos, sin, wrap};
use crate::time::{Tt, Ut1};

/// Earth rotation angle, 0 to 2 pi (IAU 2000 resolution B1.8).
pub fn earth_rotation_angle_rad(ut1: Ut1) -> f64 {
    let days = ut1.days_since_j2000();
    // The whole turns are left out first: they would cost digits.
    let turns = wrap(days, 1.0) + 0.779_057_273_264_0 + 0.002_737_811_911_354_48 * days;
    TAU * wrap(turns, 1.0)
}

/// Greenwich mean sidereal time, 0 to 2 pi, IAU 2006 (N. Capitaine et al. 2003, A&A 412, 567, with P03 precession).
pub fn greenwich_mean_sidereal_time_rad(ut1: Ut1, tt: Tt) -> f64 {
    const ARCSEC: [f64; 6] = [
        0.014_506,
        4_612.156_534,
        1.391_581_7,
        -0.000_000_44,
        -0.000_029_956,
        -0.000_000_036_8,
    ];
    let centuries = tt.julian_centuries();
    let precession_arcsec = ARCSEC
        .iter()
        .rev()
        .fold(0.0, |sum, coefficient| sum * centuries + coefficient);
    wrap(
        earth_rotation_angle_rad(ut1) + precession_arcsec / ARCSEC_PER_RAD,
        TAU,
    )
}

/// Greenwich apparent sidereal time, 0 to 2 pi.
///
/// The equation of the equinoxes keeps the two largest complementary terms; the rest is below 0.00002 arcsec.
pub fn greenwich_apparent_sidereal_time_rad(ut1: Ut1, tt: Tt, of_date: &OfDate) -> f64 {
    let nutation = of_date.nutation();
    let complementary_arcsec =
        0.002_640_96 * sin(nutation.node_rad) + 0.000_063_52 * sin(2.0 * nutation.node_rad);
    let equation_rad = nutation.longitude_rad * cos(of_date.mean_obliquity_rad())
        + complementary_arcsec / ARCSEC_PER_RAD;
    wrap(
        greenwich_mean_sidereal_time_rad(ut1, tt) + equation_rad,
        TAU,
    )
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn published_example() {
        // Meeus, Astronomical Algorithms, ex. 12.a (from memory): 1987 April 10, 0h UT: mean 13h 10m 46.3668s,
        // apparent 13h 10m 46.1351s. IAU 1982 and 1980 against 2006 and 2000B: 0.003 s.
        let (ut1, tt) = (
            Ut1::from_days_since_j2000(-4_649.5),
            Tt::from_days_since_j2000(-4_649.5 + 55.0 / 86_400.0),
        );
        let seconds = |rad: f64| rad / TAU * 86_400.0;
        let mean = seconds(greenwich_mean_sidereal_time_rad(ut1, tt));
        let apparent = seconds(greenwich_apparent_sidereal_time_rad(
            ut1,
            tt,
            &OfDate::at(tt),
        ));
        assert!(
            (mean - (13.0 * 3600.0 + 10.0 * 60.0 + 46.366_8)).abs() < 0.004,
            "{mean}"
        );
        assert!(
            (apparent - (13.0 * 3600.0 + 10.0 * 60.0 + 46.135_1)).abs() < 0.004,
            "{apparent}"
        );
    }

    #[test]
    fn against_erfa() {
        // ERFA 2.0.1 through pyerfa 2.0.1.5: era00, gmst06 and gst06a of its own test dates, TT = UT1 + 0.
        let ut1 = Ut1::from_days_since_j2000(2_400_000.5 + 53_736.0 - 2_451_545.0);
        let tt = Tt::from_days_since_j2000(ut1.days_since_j2000());
        assert!(
            (greenwich_mean_sidereal_time_rad(ut1, tt) - 1.754_174_971_870_091_2).abs() < 1e-11
        );
        // 2000B instead of 2000A: 1 mas = 5e-9 rad.
        let apparent_rad = greenwich_apparent_sidereal_time_rad(ut1, tt, &OfDate::at(tt));
        assert!(
            (apparent_rad - 1.754_166_137_675_019_2).abs() < 6e-9,
            "{apparent_rad}"
        );
        let other = Ut1::from_days_since_j2000(2_400_000.5 + 54_388.0 - 2_451_545.0);
        assert!((earth_rotation_angle_rad(other) - 0.402_283_724_002_815_8).abs() < 1e-11);
    }
}
