//! Worked examples and check values of published works, through the crate's public interface.
//!
//! Keys in brackets are those of `tests/data/SOURCES.md`; [meeus], [sofa] and [delta-t] are quoted from memory. Each
//! tolerance is the difference between the models of the work and ours, or half of the last digit printed.

mod places;
#[path = "../support/mod.rs"]
mod support;
mod time_and_frames;

/// Hours, minutes and seconds as degrees.
fn hours(h: f64, m: f64, s: f64) -> f64 {
    15.0 * (h + m / 60.0 + s / 3600.0)
}

/// Degrees, minutes and seconds of one sign.
fn degrees(sign: f64, d: f64, m: f64, s: f64) -> f64 {
    sign * (d + m / 60.0 + s / 3600.0)
}
