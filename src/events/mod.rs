//! Moments at which something happens, found by one search.

mod brent;
mod brightness;
mod search;
mod twilight;

pub use brightness::{
    Extremum, Interval, greatest_brightness, greatest_illuminated_extent,
    interval_within_magnitudes,
};
pub use search::{Found, Scan, maxima, minima, roots};
pub use twilight::{civil_dawn, civil_dusk};
