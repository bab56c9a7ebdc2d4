//! What the plan has to say: its labels and the sentence on why the disc looks as it does.

use super::figures::Figures;
use super::reading::Reading;
use super::sentence::told;
use crate::body::Body;
use crate::circumstances::Circumstances;
use crate::time::Utc;

/// Words of the plan that neither date nor planet changes.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub struct PlanLabels {
    /// The Sun in the picture.
    pub sun: &'static str,
    /// The Earth in the picture.
    pub earth: &'static str,
    /// Heading of the disc.
    pub seen_from_earth: &'static str,
    /// What the arc around the planet means.
    pub facing_arc: &'static str,
    /// What the outline around the disc means.
    pub largest_outline: &'static str,
    /// What is to scale, where distances are.
    pub true_distances: &'static str,
    /// What is to scale, where long distances are drawn shorter.
    pub shortened_distances: &'static str,
}

/// Where a planet stands between, beside or beyond Earth and Sun.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum PlanStory {
    /// Inner planet near the line from us to the Sun: a thin crescent.
    Between,
    /// Inner planet on the near part of its orbit: a crescent.
    NearSide,
    /// Inner planet about half lit.
    Beside,
    /// Inner planet on the far part of its orbit.
    FarSide,
    /// Inner planet beyond the Sun.
    Behind,
    /// Outer planet opposite to the Sun.
    Opposite,
    /// Outer planet to one side.
    OuterBeside,
    /// Outer planet beyond the Sun.
    OuterBehind,
}

/// Below this lit share an inner planet counts as standing between us and the Sun.
const BETWEEN_LIT: f64 = 0.2;
/// From this lit share on it counts as standing beyond the Sun.
const BEHIND_LIT: f64 = 0.9;
/// An outer planet farther than this from the Sun is told of as opposite to it, nearer than the second as beyond it.
const OPPOSITE_DEG: f64 = 150.0;
const OUTER_BEHIND_DEG: f64 = 45.0;

impl PlanStory {
    fn of(body: Body, reading: &Reading) -> PlanStory {
        let lit = reading.illuminated_fraction;
        if body.is_inner_planet() {
            match lit {
                _ if lit < BETWEEN_LIT => PlanStory::Between,
                _ if lit < 0.45 => PlanStory::NearSide,
                _ if lit <= 0.55 => PlanStory::Beside,
                _ if lit < BEHIND_LIT => PlanStory::FarSide,
                _ => PlanStory::Behind,
            }
        } else if reading.elongation_deg > OPPOSITE_DEG {
            PlanStory::Opposite
        } else if reading.elongation_deg < OUTER_BEHIND_DEG {
            PlanStory::OuterBehind
        } else {
            PlanStory::OuterBeside
        }
    }
}

/// Where the planet stands at the chosen instant, and what that makes of its lit half.
pub fn sentence_plan(
    body: Body,
    chosen_utc: Utc,
    chosen: &Circumstances,
    figures: Figures<'_>,
) -> String {
    let reading = Reading::new(chosen_utc, chosen);
    figures.words.plan(
        body,
        PlanStory::of(body, &reading),
        &told(&reading, figures),
        &elongation(&reading, figures),
    )
}

/// The angle from the Sun with its unit, as the plan writes it.
pub(crate) fn elongation(reading: &Reading, figures: Figures<'_>) -> String {
    figures
        .words
        .degrees(&figures.number(reading.elongation_deg, 0))
}
