//! Wanderlight: where a planet stands, how bright it is, and why, in a module small enough for an article page.
//!
//! The core is a pure function of its input; only [`widget`](self) code, compiled for WebAssembly, touches a page.
//! `DEVELOPERS.md` is the map of the folders.

pub mod body;
pub mod chart;
pub mod circumstances;
pub mod ephemeris;
pub mod error;
pub mod events;
pub mod explain;
pub mod frames;
pub mod photometry;
pub mod place;
pub mod quantity;
pub mod series;
pub mod time;
#[cfg(target_arch = "wasm32")]
pub mod widget;

pub use body::Body;
pub use circumstances::{Circumstances, Series, circumstances, series};
pub use error::{Code, Error};
pub use place::Place;
pub use time::Utc;
