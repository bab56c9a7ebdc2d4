//! Everything about one body at one instant, and the same quantities over a span of days.
//!
//! These two answers are the module's public contract; they gather what `ephemeris`, `photometry` and `place` compute.

mod answer;
mod span;
mod warnings;

pub use answer::{Circumstances, Local, circumstances};
pub use span::{MAX_SAMPLES, Series, series};
pub use warnings::Warning;
