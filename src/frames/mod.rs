//! Axes: from the fixed ICRS to the equator, ecliptic and horizon of the date, and what the air does to altitudes.
//!
//! Precession is IAU 2006 in the angles of Fukushima and Williams, nutation IAU 2000B with its 77 terms; together they
//! stay within 4 mas of IAU 2006/2000A over 1800 to 2200. Polar motion (0.3 arcsec) is left out.

mod horizon;
mod matrix;
mod nutation;
mod nutation_table;
mod precession;
mod refraction;
mod sidereal;
mod sky;

pub use horizon::Horizontal;
pub(crate) use horizon::horizontal;
pub use matrix::Matrix;
pub use nutation::{Nutation, nutation};
pub use precession::{OfDate, mean_ecliptic_of_date, mean_obliquity_rad};
pub use refraction::{refraction_from_apparent_altitude_deg, refraction_from_true_altitude_deg};
pub use sidereal::{
    earth_rotation_angle_rad, greenwich_apparent_sidereal_time_rad,
    greenwich_mean_sidereal_time_rad,
};
pub use sky::{Spherical, position_angle_deg, separation_deg};
