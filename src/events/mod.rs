//! Moments at which something happens, found by one search.
//!
//! [`events()`] lists them. A kind has a name and a definition ([`Kind`]); kinds that are found together make a family,
//! a file of its own here; `query` holds the table of families, `search` the one search that all of them use.

mod apparitions;
mod apsides;
mod brightness;
mod civil;
mod definitions;
mod distances;
mod elongation;
mod errors;
mod event;
mod half_phase;
mod kind;
mod light;
mod moon_meetings;
mod occultation;
mod piece;
mod planet_meetings;
mod query;
mod rhythm;
mod same_phase;
mod search;
mod sky;
mod stations;
mod sun_line;
mod topocentric;
mod transits;
mod twilight;

pub use apparitions::{Apparition, ApparitionSide, Rank, apparitions, ranks};
pub use brightness::{
    Extremum, Interval, greatest_brightness, greatest_illuminated_extent,
    interval_within_magnitudes,
};
pub use event::{Contact, Event, Local, Values};
pub use kind::Kind;
pub use query::{Query, events};
pub use rhythm::{Rhythm, rhythm};
pub use search::{Found, Scan, maxima, minima, roots};
pub use transits::SUN_SEMIDIAMETER_AT_1_AU_ARCSEC;
pub use twilight::{civil_dawn, civil_dusk};
