//! Where the planets and the Moon are: compact series fitted to JPL DE440.
//!
//! The tables beside this file, `planets.bin` and `moon.bin`, are written by `pkg-config/tables/build.py`, which also
//! measures them; `pkg-config/tables/README.md` holds the figures.

mod moon;
mod packed;
mod planets;
#[cfg(test)]
mod reference;
mod sum;
#[cfg(test)]
mod tests;

pub(crate) use moon::moon_of_date_roughly;
pub use moon::{MoonOfDate, moon_of_date};
pub use planets::{SeriesBody, State, heliocentric, heliocentric_position_au};

/// First year (from January 1, 0h) for which the series hold; the fit begins ten years earlier.
pub const VALID_FROM_YEAR: i32 = 1600;

/// The year at whose beginning they end; the fit goes on for ten years.
pub const VALID_TO_YEAR: i32 = 2300;
