//! From orbits to what is seen from the Earth: light time, bending of light by the Sun, aberration.
//!
//! Everything is heliocentric, including the Earth's velocity in the aberration: the Sun's own motion about the
//! barycentre then cancels to below 0.0001 arcsec, and no barycentre is needed. Vectors are in au on ICRS axes.

mod earth;
mod light;
mod observation;
mod plan;
mod span;

pub use earth::Earth;
pub use observation::Observation;
pub use plan::{PlanPointAu, PlanPositions, Traveller, plan_orbit, plan_passage, plan_positions};
pub use span::{SpanPart, check_span};
