//! The eight heliocentric series.

use super::packed::{Reader, Series};
use super::sum::{Angle, Coordinate, sum};
use crate::quantity::sin_cos;
use crate::time::Tt;
use std::sync::OnceLock;

/// Bodies of the heliocentric series. Jupiter to Neptune, and Mars, stand for the centre of mass with their moons: up to
/// 0.1 arcsec from Jupiter's centre as seen from the Earth, less for the others.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum SeriesBody {
    /// Mercury.
    Mercury,
    /// Venus.
    Venus,
    /// The centre of mass of Earth and Moon.
    EarthMoonBarycentre,
    /// Mars.
    Mars,
    /// Jupiter.
    Jupiter,
    /// Saturn.
    Saturn,
    /// Uranus.
    Uranus,
    /// Neptune.
    Neptune,
}

/// Position and velocity on ICRS equatorial axes.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct State {
    /// Astronomical units.
    pub position_au: [f64; 3],
    /// Astronomical units per day of TT.
    pub velocity_au_per_day: [f64; 3],
}

/// The packed tables of the eight series, from Mercury to Neptune.
pub(super) static BYTES: &[u8] = include_bytes!("planets.bin");

const DAYS_PER_MILLENNIUM: f64 = 365_250.0;

/// The plane of the series is the ICRS equator turned about its x axis by this angle, the obliquity of J2000.0
/// (IAU 2006): 84381.406 arcsec.
const OBLIQUITY_J2000_RAD: f64 = 84_381.406 / 3600.0 * std::f64::consts::PI / 180.0;

/// Mean longitude at J2000.0 in radians and its rate in radians per Julian millennium: Bretagnon & Francou 1988
/// (VSOP87), Astronomy & Astrophysics 202, 309. What the true motion adds is in the tables.
pub(super) const LONGITUDES: [(f64, f64); 8] = [
    (4.402_608_842_40, 26_087.903_141_574_2),
    (3.176_146_696_89, 10_213.285_546_211_0),
    (1.753_470_459_53, 6_283.075_849_991_4),
    (6.203_476_112_91, 3_340.612_426_699_8),
    (0.599_546_497_39, 529.690_965_094_6),
    (0.874_016_756_50, 213.299_095_438_0),
    (5.481_293_871_59, 74.781_598_567_3),
    (5.311_886_286_76, 38.133_035_637_8),
];

/// Lengths by which the tables scale the radius, in astronomical units: the semi-major axes of the same source.
const AXES_AU: [f64; 8] = [
    0.387_098_31,
    0.723_329_82,
    1.000_001_02,
    1.523_679_34,
    5.202_603_19,
    9.554_909_60,
    19.218_446_06,
    30.110_386_87,
];

fn series() -> &'static [Series] {
    static SERIES: OnceLock<Vec<Series>> = OnceLock::new();
    SERIES.get_or_init(|| {
        let mut reader = Reader::new(BYTES);
        LONGITUDES.iter().map(|_| reader.series(0)).collect()
    })
}

/// The planets' mean longitudes at an instant.
pub(super) fn mean_longitudes(tt: Tt) -> [Angle; 8] {
    let millennia = tt.julian_millennia();
    LONGITUDES.map(|(at_j2000_rad, rate)| Angle {
        value_rad: at_j2000_rad + rate * millennia,
        rate_rad_per_millennium: rate,
    })
}

/// Geometric heliocentric position and velocity of a planet's system, ICRS equatorial axes; TT serves as TDB.
///
/// Fitted to JPL DE440 (Park et al. 2021, Astronomical Journal 161, 105) over 1590 to 2310; what remains is listed in
/// `pkg-config/tables/README.md`. Good from [`VALID_FROM_YEAR`](super::VALID_FROM_YEAR) to
/// [`VALID_TO_YEAR`](super::VALID_TO_YEAR); far outside the answer has no meaning, so the caller checks the span.
pub fn heliocentric(body: SeriesBody, tt: Tt) -> State {
    let index = body as usize;
    let angles = mean_longitudes(tt);
    let [longitude, latitude, radius] = sum(&series()[index], &angles, tt);
    let mean = angles[index];
    to_icrs(
        Coordinate {
            value_rad: mean.value_rad + longitude.value_rad,
            rate_rad_per_millennium: mean.rate_rad_per_millennium
                + longitude.rate_rad_per_millennium,
        },
        latitude,
        AXES_AU[index] * (1.0 + radius.value_rad),
        AXES_AU[index] * radius.rate_rad_per_millennium / DAYS_PER_MILLENNIUM,
    )
}

/// The position alone of [`heliocentric`], in astronomical units.
pub fn heliocentric_position_au(body: SeriesBody, tt: Tt) -> [f64; 3] {
    heliocentric(body, tt).position_au
}

/// Spherical coordinates in the plane of the series to rectangular ones on ICRS axes.
fn to_icrs(
    longitude: Coordinate,
    latitude: Coordinate,
    radius_au: f64,
    radius_au_per_day: f64,
) -> State {
    let (sin_l, cos_l) = sin_cos(longitude.value_rad);
    let (sin_b, cos_b) = sin_cos(latitude.value_rad);
    let along = radius_au * cos_b * longitude.rate_rad_per_millennium / DAYS_PER_MILLENNIUM;
    let up = radius_au * latitude.rate_rad_per_millennium / DAYS_PER_MILLENNIUM;
    let outward = radius_au_per_day * cos_b - up * sin_b;
    State {
        position_au: tilt([
            radius_au * cos_b * cos_l,
            radius_au * cos_b * sin_l,
            radius_au * sin_b,
        ]),
        velocity_au_per_day: tilt([
            outward * cos_l - along * sin_l,
            outward * sin_l + along * cos_l,
            radius_au_per_day * sin_b + up * cos_b,
        ]),
    }
}

/// From the plane of the series to the ICRS equator.
fn tilt([x, y, z]: [f64; 3]) -> [f64; 3] {
    let (sin, cos) = sin_cos(OBLIQUITY_J2000_RAD);
    [x, y * cos - z * sin, y * sin + z * cos]
}
