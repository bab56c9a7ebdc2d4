//! What is asked for, and the table of families that answer.

use super::event::Event;
use super::kind::Kind;
use super::piece::Piece;
use super::{
    apsides, distances, elongation, half_phase, light, moon_meetings, planet_meetings, same_phase,
    stations, sun_line, transits,
};
use crate::body::Body;
use crate::ephemeris::check_span;
use crate::error::{Code, Error};
use crate::place::Place;
use crate::time::Utc;

/// A family of kinds that are found together.
struct Family {
    kinds: &'static [Kind],
    find: fn(&Piece<'_>),
}

/// Every family; a new one needs a file and a line here.
const FAMILIES: [Family; 11] = [
    Family {
        kinds: &sun_line::KINDS,
        find: sun_line::find,
    },
    Family {
        kinds: &elongation::KINDS,
        find: elongation::find,
    },
    Family {
        kinds: &light::KINDS,
        find: light::find,
    },
    Family {
        kinds: &half_phase::KINDS,
        find: half_phase::find,
    },
    Family {
        kinds: &stations::KINDS,
        find: stations::find,
    },
    Family {
        kinds: &distances::KINDS,
        find: distances::find,
    },
    Family {
        kinds: &apsides::KINDS,
        find: apsides::find,
    },
    Family {
        kinds: &moon_meetings::KINDS,
        find: moon_meetings::find,
    },
    Family {
        kinds: &same_phase::KINDS,
        find: same_phase::find,
    },
    Family {
        kinds: &planet_meetings::KINDS,
        find: planet_meetings::find,
    },
    Family {
        kinds: &transits::KINDS,
        find: transits::find,
    },
];

/// Which events are asked for.
#[derive(Debug, Clone, PartialEq)]
pub struct Query {
    /// Start; an event at this instant belongs to the span.
    pub from: Utc,
    /// End; an event at this instant does not, so that spans that follow each other share none.
    pub to: Utc,
    /// Events in which at least one of these takes part; all when empty.
    pub bodies: Vec<Body>,
    /// Events of these kinds; all when empty.
    pub kinds: Vec<Kind>,
    /// Where the observer stands; transits and occultations then tell what is seen there.
    pub place: Option<Place>,
}

impl Query {
    /// Everything between two instants.
    pub fn all(from: Utc, to: Utc) -> Self {
        Self {
            from,
            to,
            bodies: Vec::new(),
            kinds: Vec::new(),
            place: None,
        }
    }

    /// Some kinds of one body's events between two instants; all kinds when none is named.
    pub fn of(body: Body, kinds: &[Kind], from: Utc, to: Utc) -> Self {
        Self {
            bodies: vec![body],
            kinds: kinds.to_vec(),
            ..Self::all(from, to)
        }
    }

    pub(super) fn wants(&self, kind: Kind) -> bool {
        self.kinds.is_empty() || self.kinds.contains(&kind)
    }

    /// Whether a body is among those asked for.
    pub(super) fn names(&self, body: Body) -> bool {
        self.bodies.is_empty() || self.bodies.contains(&body)
    }

    pub(super) fn check(&self) -> Result<(), Error> {
        check_span(self.from)?;
        check_span(self.to)?;
        if self.to < self.from {
            return Err(Error::new(
                Code::BadStep,
                "The end of the span must not be before its start.",
            ));
        }
        for body in &self.bodies {
            if *body == Body::Sun {
                return Err(impossible(Kind::Transit, *body));
            }
        }
        for kind in &self.kinds {
            let fits = |body: &Body| kind.is_possible_for(*body);
            if let Some(first) = self.bodies.first()
                && !self.bodies.iter().any(fits)
            {
                return Err(impossible(*kind, *first));
            }
        }
        Ok(())
    }
}

fn impossible(kind: Kind, body: Body) -> Error {
    let mut message = String::from("There is no ");
    message.push_str(kind.name());
    message.push_str(" of ");
    message.push_str(body.name());
    message.push_str(": ");
    message.push_str(kind.why_not(body));
    Error::new(Code::BadOption, message)
}

/// Long spans are searched in pieces of so many days: what is kept of the sky stays small.
const PIECE_DAYS: f64 = 2000.0;

/// The events asked for, in order of time.
///
/// Positions are those of [`crate::circumstances`]; each kind's rule is its [`Kind::definition`]. Instants are civil
/// time (see [`crate::time`]).
///
/// # Errors
/// `bad-instant` and `out-of-span` for either end of the span, `bad-step` when the end is before the start,
/// `bad-option` when a kind is asked for that none of the bodies asked for can have, or the Sun is.
///
/// ```
/// use wanderlight::events::{Kind, Query, events};
/// use wanderlight::{Body, Utc};
/// let (from, to) = (Utc::parse("2026-01-01")?, Utc::parse("2027-01-01")?);
/// let found = events(&Query::of(Body::Venus, &[Kind::InferiorConjunction], from, to))?;
/// assert_eq!(&found[0].utc.to_rfc3339()[..10], "2026-10-24");
/// # Ok::<(), wanderlight::Error>(())
/// ```
pub fn events(query: &Query) -> Result<Vec<Event>, Error> {
    query.check()?;
    Ok(search(query))
}

/// The events of a query that is known to lie within the years the series are fitted to.
pub(super) fn search(query: &Query) -> Vec<Event> {
    let mut found = Vec::new();
    let mut from = query.from;
    while from < query.to {
        let next = from.plus_days(PIECE_DAYS);
        let to = if next < query.to { next } else { query.to };
        let piece = Piece::new(query, from, to);
        for family in &FAMILIES {
            if family.kinds.iter().any(|kind| query.wants(*kind)) {
                (family.find)(&piece);
            }
        }
        piece.hand_over(&mut found);
        from = to;
    }
    found
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn every_kind_belongs_to_one_family() {
        for kind in Kind::all() {
            let families = FAMILIES
                .iter()
                .filter(|family| family.kinds.contains(&kind));
            assert_eq!(families.count(), 1, "{}", kind.name());
        }
    }
}
