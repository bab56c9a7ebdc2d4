//! Where on the Earth the observer stands.

mod lean;
mod observer;
mod text;
mod zone;

pub use lean::{SkySide, lean_deg};
pub use observer::{Place, topocentric};
pub use text::{Coordinate, parse_coordinate, parse_pair};
pub use zone::{RoughPlace, rough_place};
