//! The plan's phrases in English.

use super::plan::{PlanLabels, PlanStory};
use super::words::Told;

pub(super) const LABELS: PlanLabels = PlanLabels {
    sun: "Sun",
    earth: "Earth",
    seen_from_earth: "as seen from the Earth",
    facing_arc: "arc: the half turned to us",
    largest_outline: "outline: largest in this span",
    true_distances: "distances to scale, bodies enlarged",
    shortened_distances: "far distances shortened, bodies enlarged",
};

/// Where the planet stands, and what that makes of its lit half.
pub(super) fn sentence(name: &str, story: PlanStory, told: &Told, elongation: &str) -> String {
    let Told {
        date,
        lit,
        diameter,
        ..
    } = told;
    let why = match story {
        PlanStory::Between => format!(
            "is close to us, not far from the line to the Sun: the half that the Sun lights is turned away from us. We see a large disc, {diameter} across, with only a thin crescent of it lit, {lit}."
        ),
        PlanStory::NearSide => format!(
            "is on the near part of its orbit: most of the half that the Sun lights is turned away from us. We see a crescent, {lit} lit, on a disc that is {diameter} across."
        ),
        PlanStory::Beside => format!(
            "stands to one side of the Sun: we see as much of its lit half as of its dark half, {lit} of the disc, which is {diameter} across."
        ),
        PlanStory::FarSide => format!(
            "is on the far part of its orbit: more of its lit half is turned to us, {lit} of the disc, but being farther away it is smaller, {diameter} across."
        ),
        PlanStory::Behind => format!(
            "is beyond the Sun: almost all of its lit half is turned to us, {lit} of the disc, but from so far away it is only {diameter} across."
        ),
        PlanStory::Opposite => format!(
            "is opposite to the Sun: the Earth is between the two, so we look at it from the Sun’s side and {lit} of its disc is lit. It is about as near as it comes this time, {diameter} across."
        ),
        PlanStory::OuterBeside => format!(
            "is to one side of the Sun. It is always farther out than we are, so we look at it from nearly the Sun’s side: {lit} of its disc is lit. It is {diameter} across."
        ),
        PlanStory::OuterBehind => format!(
            "is beyond the Sun and far away: {lit} of its disc is lit, but that is only {diameter} across."
        ),
    };
    format!("On {date} {name} {why} In our sky it is {elongation} from the Sun: its elongation.")
}
