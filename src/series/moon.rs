//! The Moon's series.

use super::packed::{ANGLES, Reader, Series};
use super::planets::mean_longitudes;
use super::sum::{Angle, sum};
use crate::quantity::wrap;
use crate::time::Tt;
use std::sync::OnceLock;

/// Geometric place of the Moon's centre seen from the Earth's centre, mean ecliptic and equinox of date (IAU 2006).
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct MoonOfDate {
    /// Longitude, radians, not reduced to one turn.
    pub longitude_rad: f64,
    /// Latitude, radians.
    pub latitude_rad: f64,
    /// Distance between the centres, kilometres.
    pub distance_km: f64,
    /// Rate of the longitude.
    pub longitude_rad_per_day: f64,
    /// Rate of the latitude.
    pub latitude_rad_per_day: f64,
    /// Rate of the distance.
    pub distance_km_per_day: f64,
}

/// The packed table.
pub(super) static BYTES: &[u8] = include_bytes!("moon.bin");

/// Length by which the table scales the distance.
const MEAN_DISTANCE_KM: f64 = 385_000.0;

/// l, l', F, D, Omega: arcseconds and arcseconds per Julian century and its powers, IERS Conventions 2003, chapter 5.
const DELAUNAY_ARCSEC: [[f64; 5]; 5] = [
    [
        485_868.249_036,
        1_717_915_923.217_8,
        31.879_2,
        0.051_635,
        -0.000_244_70,
    ],
    [
        1_287_104.793_048,
        129_596_581.048_1,
        -0.553_2,
        0.000_136,
        -0.000_011_49,
    ],
    [
        335_779.526_232,
        1_739_527_262.847_8,
        -12.751_2,
        -0.001_037,
        0.000_004_17,
    ],
    [
        1_072_260.703_692,
        1_602_961_601.209_0,
        -6.370_6,
        0.006_593,
        -0.000_031_69,
    ],
    [
        450_160.398_036,
        -6_962_890.543_1,
        7.472_2,
        0.007_702,
        -0.000_059_39,
    ],
];

/// Where F and Omega stand among the angles; their sum is the mean longitude.
const F: usize = 2;
const OMEGA: usize = 4;

const ARCSEC_PER_TURN: f64 = 1_296_000.0;
const RADIANS_PER_ARCSEC: f64 = std::f64::consts::TAU / ARCSEC_PER_TURN;

const DAYS_PER_MILLENNIUM: f64 = 365_250.0;

fn series() -> &'static Series {
    static SERIES: OnceLock<Series> = OnceLock::new();
    SERIES.get_or_init(|| Reader::new(BYTES).series(DELAUNAY_ARCSEC.len()))
}

/// The large terms of the same table: what is left out adds up to 3 arcmin at most.
fn large_terms() -> &'static Series {
    const LEAST_RAD: f64 = 20.0 * RADIANS_PER_ARCSEC;
    static SERIES: OnceLock<Series> = OnceLock::new();
    SERIES.get_or_init(|| {
        let mut series = Reader::new(BYTES).series(DELAUNAY_ARCSEC.len());
        series.keep_terms_of(LEAST_RAD);
        series
    })
}

/// The Moon's place.
///
/// Fitted to JPL DE440 (Park et al. 2021, Astronomical Journal 161, 105) over 1590 to 2310, on argument combinations of
/// ELP/MPP02 (Chapront & Francou 2003, Astronomy & Astrophysics 404, 735); what remains is listed in
/// `pkg-config/tables/README.md`. Good over the same span as [`heliocentric`](super::heliocentric).
pub fn moon_of_date(tt: Tt) -> MoonOfDate {
    moon_from(series(), tt)
}

/// The Moon's place to 3 arcmin in a tenth of the time: enough for how far the Earth stands from the barycentre, which
/// it changes by 4 km.
pub(crate) fn moon_of_date_roughly(tt: Tt) -> MoonOfDate {
    moon_from(large_terms(), tt)
}

fn moon_from(series: &Series, tt: Tt) -> MoonOfDate {
    let centuries = tt.julian_centuries();
    let mut angles = [Angle::default(); ANGLES];
    let (moon, planets) = angles.split_at_mut(DELAUNAY_ARCSEC.len());
    for (angle, coefficients) in moon.iter_mut().zip(DELAUNAY_ARCSEC) {
        let arcsec = coefficients
            .iter()
            .rev()
            .fold(0.0, |sum, coefficient| sum * centuries + coefficient);
        angle.value_rad = wrap(arcsec, ARCSEC_PER_TURN) * RADIANS_PER_ARCSEC;
        angle.rate_rad_per_millennium = coefficients[1] * 10.0 * RADIANS_PER_ARCSEC;
    }
    planets.copy_from_slice(&mean_longitudes(tt));
    let [longitude, latitude, distance] = sum(series, &angles, tt);
    MoonOfDate {
        longitude_rad: angles[F].value_rad + angles[OMEGA].value_rad + longitude.value_rad,
        latitude_rad: latitude.value_rad,
        distance_km: MEAN_DISTANCE_KM * (1.0 + distance.value_rad),
        longitude_rad_per_day: (angles[F].rate_rad_per_millennium
            + angles[OMEGA].rate_rad_per_millennium
            + longitude.rate_rad_per_millennium)
            / DAYS_PER_MILLENNIUM,
        latitude_rad_per_day: latitude.rate_rad_per_millennium / DAYS_PER_MILLENNIUM,
        distance_km_per_day: MEAN_DISTANCE_KM * distance.rate_rad_per_millennium
            / DAYS_PER_MILLENNIUM,
    }
}
