//! Apparitions: the stretches between conjunctions with the Sun in which a planet can be seen.

use super::event::Event;
use super::kind::Kind::{self, *};
use super::query::{Query, search};
use super::search::{Scan, roots};
use super::sky::Moment;
use crate::body::Body;
use crate::error::{Code, Error};
use crate::time::Utc;

/// Where an apparition is seen.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum ApparitionSide {
    /// After sunset: an inner planet between superior and inferior conjunction.
    Evening,
    /// Before sunrise: an inner planet between inferior and superior conjunction.
    Morning,
    /// An outer planet from one conjunction to the next: first in the morning, around opposition all night, then in the
    /// evening.
    Night,
}

impl ApparitionSide {
    /// The name in the module's contract.
    pub const fn name(self) -> &'static str {
        match self {
            ApparitionSide::Evening => "evening",
            ApparitionSide::Morning => "morning",
            ApparitionSide::Night => "night",
        }
    }
}

/// One apparition.
#[derive(Debug, Clone, PartialEq)]
pub struct Apparition {
    /// The planet.
    pub body: Body,
    /// When in the night.
    pub side: ApparitionSide,
    /// The conjunction with the Sun before it.
    pub from: Utc,
    /// The conjunction with the Sun after it.
    pub to: Utc,
    /// What happens between both, in order of time; both conjunctions included, secondary peaks left out.
    pub turning_points: Vec<Event>,
    /// Smallest magnitude while the planet stands at least 10 degrees from the Sun; of Mars averaged over its rotation.
    pub peak_magnitude: f64,
    /// When that is.
    pub peak_utc: Utc,
    /// Largest angle from the Sun; of an outer planet that at opposition.
    pub largest_elongation_deg: f64,
    /// Largest lit area in the sky.
    pub largest_lit_area_arcsec2: f64,
}

/// Closer to the Sun a planet is lost in twilight whatever its magnitude.
const SEEN_FROM_ELONGATION_DEG: f64 = 10.0;

const TURNING_POINTS: [Kind; 15] = [
    InferiorConjunction,
    SuperiorConjunction,
    Conjunction,
    Opposition,
    QuadratureEast,
    QuadratureWest,
    GreatestElongationEast,
    GreatestElongationWest,
    GreatestIlluminatedExtent,
    GreatestBrightness,
    HalfPhase,
    StationRetrograde,
    StationDirect,
    ClosestApproach,
    Transit,
];

/// What [`ranks`] needs of them.
const PEAKS: [Kind; 6] = [
    InferiorConjunction,
    SuperiorConjunction,
    Conjunction,
    GreatestBrightness,
    GreatestElongationEast,
    GreatestElongationWest,
];

/// Longer than any time between two conjunctions, 812 days of Mars.
const LONGEST_ROUND_DAYS: f64 = 830.0;

/// The apparitions of a planet of which a part lies between two instants, in order of time.
///
/// # Errors
/// `unknown-body` for Sun and Moon, `bad-instant` and `out-of-span` for either instant, `bad-step` when the end is
/// before the start.
pub fn apparitions(body: Body, from: Utc, to: Utc) -> Result<Vec<Apparition>, Error> {
    planet(body)?;
    Query::of(body, &[], from, to).check()?;
    let mut found = with_kinds(body, &TURNING_POINTS, from, to);
    found.retain(|apparition| apparition.from < to && from < apparition.to);
    Ok(found)
}

pub(super) fn planet(body: Body) -> Result<(), Error> {
    if Body::PLANETS.contains(&body) {
        return Ok(());
    }
    Err(Error::new(
        Code::UnknownBody,
        "Apparitions are those of a planet; Sun and Moon have none.",
    ))
}

/// The apparitions around a span; near its ends one more on either side.
fn with_kinds(body: Body, kinds: &[Kind], from: Utc, to: Utc) -> Vec<Apparition> {
    // The series reach ten years beyond the years that are answered, so these margins are covered.
    let events = search(&Query::of(
        body,
        kinds,
        from.plus_days(-LONGEST_ROUND_DAYS),
        to.plus_days(LONGEST_ROUND_DAYS),
    ));
    let mut found = Vec::new();
    let mut start: Option<usize> = None;
    for (index, event) in events.iter().enumerate() {
        if !matches!(
            event.kind,
            InferiorConjunction | SuperiorConjunction | Conjunction
        ) {
            continue;
        }
        if let Some(start) = start {
            found.extend(apparition(&events[start..=index]));
        }
        start = Some(index);
    }
    found
}

/// The apparition of events that begin and end with a conjunction.
fn apparition(events: &[Event]) -> Option<Apparition> {
    let (first, last) = (events.first()?, events.last()?);
    let body = first.body;
    let largest =
        |of: &dyn Fn(&Event) -> Option<f64>| events.iter().filter_map(of).fold(0.0, f64::max);
    let (peak_utc, peak_magnitude) = peak(events, body, first.utc, last.utc)?;
    Some(Apparition {
        body,
        side: match first.kind {
            SuperiorConjunction => ApparitionSide::Evening,
            InferiorConjunction => ApparitionSide::Morning,
            _ => ApparitionSide::Night,
        },
        from: first.utc,
        to: last.utc,
        turning_points: events
            .iter()
            .filter(|event| !event.values.is_secondary)
            .cloned()
            .collect(),
        peak_magnitude,
        peak_utc,
        largest_elongation_deg: largest(&|event| event.values.elongation_deg),
        largest_lit_area_arcsec2: largest(&|event| event.values.lit_area_arcsec2),
    })
}

/// The brightest of the peaks far enough from the Sun and of the instants at which the planet comes out of twilight and
/// goes back: Mercury is brightest close to the Sun, so that its seen peak is one of the latter.
fn peak(events: &[Event], body: Body, from: Utc, to: Utc) -> Option<(Utc, f64)> {
    let mut candidates: Vec<(Utc, f64)> = events
        .iter()
        .filter(|event| {
            event.kind == GreatestBrightness
                && event.values.elongation_deg >= Some(SEEN_FROM_ELONGATION_DEG)
        })
        .filter_map(|event| {
            event
                .values
                .magnitude
                .map(|magnitude| (event.utc, magnitude))
        })
        .collect();
    if body == Body::Mercury {
        let scan = Scan {
            from_days: from.to_tt().days_since_j2000(),
            to_days: to.to_tt().days_since_j2000(),
            step_days: 2.0,
            tolerance_days: 1e-3,
        };
        let above = |days: f64| Moment::at(days).elongation_deg(body) - SEEN_FROM_ELONGATION_DEG;
        for crossing in roots(&scan, f64::INFINITY, &mut { above }) {
            let moment = Moment::at(crossing.days);
            candidates.push((moment.utc(), moment.magnitude(body)));
        }
    }
    let mut best: Option<(Utc, f64)> = None;
    for candidate in candidates {
        if best.is_none_or(|best| candidate.1 < best.1) {
            best = Some(candidate);
        }
    }
    best
}

/// How an apparition's peak magnitude compares with those of the same planet and side from 1900 to 2100.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Rank {
    /// 1 for the brightest.
    pub position: usize,
    /// How many are compared, this one included.
    pub of: usize,
    /// Peak of the last brighter one before; none within the years compared when absent.
    pub brighter_before: Option<Utc>,
    /// Peak of the first brighter one after; none within the years compared when absent.
    pub brighter_after: Option<Utc>,
}

/// Years whose apparitions are compared, days from J2000.0.
const COMPARED_FROM: Utc = Utc::from_days_since_j2000(-36_524.5);
const COMPARED_TO: Utc = Utc::from_days_since_j2000(36_524.5);

/// The places of a planet's apparitions among those of 1900 to 2100: looks through all of them, which takes a while.
///
/// All are compared with the apparitions of the first one's planet.
pub fn ranks(apparitions: &[Apparition]) -> Vec<Rank> {
    let Some(first) = apparitions.first() else {
        return Vec::new();
    };
    let mut compared = with_kinds(first.body, &PEAKS, COMPARED_FROM, COMPARED_TO);
    compared.retain(|other| COMPARED_FROM <= other.peak_utc && other.peak_utc < COMPARED_TO);
    apparitions
        .iter()
        .map(|apparition| rank_among(&compared, apparition))
        .collect()
}

fn rank_among(compared: &[Apparition], apparition: &Apparition) -> Rank {
    let mut rank = Rank {
        position: 1,
        of: 1,
        brighter_before: None,
        brighter_after: None,
    };
    for other in compared {
        let is_itself =
            (other.from.days_since_j2000() - apparition.from.days_since_j2000()).abs() < 1.0;
        if other.side != apparition.side || is_itself {
            continue;
        }
        rank.of += 1;
        if other.peak_magnitude >= apparition.peak_magnitude {
            continue;
        }
        rank.position += 1;
        if other.peak_utc < apparition.peak_utc {
            rank.brighter_before = Some(other.peak_utc);
        } else if rank.brighter_after.is_none() {
            rank.brighter_after = Some(other.peak_utc);
        }
    }
    rank
}
