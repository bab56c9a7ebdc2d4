//! The longer sentences in English.

use super::words::{DiscStory, Story, Told};
use crate::body::Body;

/// What the disc shows.
pub(super) fn disc(
    body: Body,
    name: &str,
    told: &Told,
    shape: DiscStory,
    moon_divisor: &str,
    ring_opening: Option<&str>,
) -> String {
    let Told {
        date,
        lit,
        diameter,
        ..
    } = told;
    let shape = match shape {
        DiscStory::Crescent => format!("is a crescent, {lit} lit and {diameter} across"),
        DiscStory::Half => format!("is about half lit ({lit}) and {diameter} across"),
        DiscStory::Gibbous => format!("is gibbous, {lit} lit and {diameter} across"),
        DiscStory::AlmostFull => format!("is almost fully lit ({lit}) and {diameter} across"),
        DiscStory::Full => format!("is fully lit and {diameter} across"),
        DiscStory::OwnLight => format!("shows its whole disc, {diameter} across"),
    };
    let mut text = format!("On {date} {name} {shape}");
    if body != Body::Moon && body != Body::Sun {
        text += &format!(", about 1/{moon_divisor} of the Moon’s width");
    }
    text.push('.');
    if let Some(opening) = ring_opening {
        text += &format!(" Its rings are open by {opening}.");
    }
    text
}

/// What the trade-off shows, and why.
pub(super) fn tradeoff(name: &str, story: &Story) -> String {
    match story {
        Story::OwnLight(Told {
            date,
            diameter,
            magnitude,
            ..
        }) => format!(
            "On {date} {name} is {diameter} across and of magnitude {magnitude}; it shines by its own light and has no phase."
        ),
        Story::NoMagnitude(Told {
            date,
            lit,
            diameter,
            ..
        }) => format!(
            "On {date} {name} is {lit} lit and {diameter} across; no published law gives its magnitude at this phase."
        ),
        Story::BrightestCrescent(Told {
            date,
            lit,
            diameter,
            magnitude,
        }) => format!(
            "On {date} {name} is about as bright as it gets, magnitude {magnitude}: only {lit} of its disc is lit, but the disc is {diameter} across, and this large crescent sends more light than the small full disc."
        ),
        Story::BrightestRound(Told {
            date,
            lit,
            diameter,
            magnitude,
        }) => format!(
            "On {date} {name} is about as bright as it gets, magnitude {magnitude}: {diameter} across, with {lit} of its disc lit."
        ),
        Story::ThinnerThanPeak(now, peak) => format!(
            "On {} {name} is larger ({}) than when brightest on {} ({}), but less of it is lit, {} against {}, and that loses more light than the size gains: magnitude {} against {}.",
            now.date,
            now.diameter,
            peak.date,
            peak.diameter,
            now.lit,
            peak.lit,
            now.magnitude,
            peak.magnitude
        ),
        Story::FullerThanPeak(now, peak) => format!(
            "On {} {name} shows more of its disc lit ({}) than when brightest on {} ({}), but the disc is smaller, {} against {}, and size counts twice, in width and in height: magnitude {} against {}.",
            now.date,
            now.lit,
            peak.date,
            peak.lit,
            now.diameter,
            peak.diameter,
            now.magnitude,
            peak.magnitude
        ),
        Story::SizeDecides(now, Some(peak)) => format!(
            "On {} {name} is {} lit; it always stays nearly full, so its size decides: {} across against {} when brightest on {}, magnitude {} against {}.",
            now.date,
            now.lit,
            now.diameter,
            peak.diameter,
            peak.date,
            now.magnitude,
            peak.magnitude
        ),
        Story::SizeDecides(now, None) => format!(
            "On {} {name} is {} lit; it always stays nearly full, so its size decides: {} across, magnitude {}.",
            now.date, now.lit, now.diameter, now.magnitude
        ),
        Story::PhaseDecides(now) => format!(
            "On {} {name} is {} lit and of magnitude {}; its size, {}, hardly changes, so the phase decides.",
            now.date, now.lit, now.magnitude, now.diameter
        ),
        Story::Plain(now, Some(peak)) => format!(
            "On {} {name} is {} lit and {} across, magnitude {} against {} when brightest on {}.",
            now.date, now.lit, now.diameter, now.magnitude, peak.magnitude, peak.date
        ),
        Story::Plain(now, None) => format!(
            "On {} {name} is {} lit and {} across, magnitude {}.",
            now.date, now.lit, now.diameter, now.magnitude
        ),
    }
}
