//! A piece of the span that is searched: what the families share.

use std::cell::RefCell;
use std::rc::Rc;

use super::civil::{utc_of, with_clock_seconds};
use super::event::{Event, Values};
use super::kind::Kind;
use super::query::Query;
use super::search::{Found, Scan, maxima, minima, paired_roots, roots};
use super::sky::{Moment, Sky};
use crate::body::Body;
use crate::time::{Tt, Utc};

/// How closely an instant is located; half a second.
const TOLERANCE_DAYS: f64 = 5e-6;
/// The same for extrema, whose function is flat: the number precision ends there.
const EXTREMUM_TOLERANCE_DAYS: f64 = 2e-5;
/// Half a turn: an angle that steps by more has jumped from one end of its range to the other.
const HALF_TURN_DEG: f64 = 180.0;
/// How far beyond the piece the sky is kept: a round of Mars.
const KEPT_MARGIN_DAYS: f64 = 840.0;

/// A stretch of time in which families look for their events.
pub(super) struct Piece<'a> {
    query: &'a Query,
    from: Utc,
    to: Utc,
    sky: Sky,
    found: RefCell<Record>,
}

impl<'a> Piece<'a> {
    /// The piece from one instant up to, but not including, another.
    pub(super) fn new(query: &'a Query, from: Utc, to: Utc) -> Self {
        Self {
            query,
            from,
            to,
            sky: Sky::new(
                from.to_tt().days_since_j2000() - KEPT_MARGIN_DAYS,
                to.to_tt().days_since_j2000() + KEPT_MARGIN_DAYS,
            ),
            found: RefCell::default(),
        }
    }

    pub(super) fn query(&self) -> &Query {
        self.query
    }

    /// The planets of the query to which a kind can happen.
    pub(super) fn planets(&self, kind: Kind) -> impl Iterator<Item = Body> {
        let wants = self.query.wants(kind);
        Body::PLANETS
            .into_iter()
            .filter(move |body| wants && kind.is_possible_for(*body) && self.query.names(*body))
    }

    /// The planets whose meetings with the Moon are asked for.
    pub(super) fn planets_with_moon(&self) -> impl Iterator<Item = Body> {
        let moon = self.query.names(Body::Moon);
        Body::PLANETS
            .into_iter()
            .filter(move |body| moon || self.query.names(*body))
    }

    /// The sky at days TT.
    pub(super) fn at(&self, tt_days: f64) -> Rc<Moment> {
        self.sky.at(tt_days)
    }

    /// Steps that enclose everything in the piece and so many days on either side of it. They are counted from J2000.0
    /// and not from the start of the piece: a span gives the same events however it is cut.
    fn scan(&self, step_days: f64, margin_days: f64, tolerance_days: f64) -> Scan {
        let steps =
            |utc: Utc, margin_days: f64| (utc.to_tt().days_since_j2000() + margin_days) / step_days;
        Scan {
            from_days: (steps(self.from, -margin_days).floor() - 3.0) * step_days,
            to_days: (steps(self.to, margin_days).ceil() + 3.0) * step_days,
            step_days,
            tolerance_days,
        }
    }

    /// The steps for an extremum of something other than the sky.
    pub(super) fn scan_for(&self, step_days: f64) -> Scan {
        self.scan(step_days, 0.0, EXTREMUM_TOLERANCE_DAYS)
    }

    /// Where a quantity of the sky passes zero; steps of more than half a turn do not count.
    pub(super) fn roots(
        &self,
        step_days: f64,
        margin_days: f64,
        quantity: &dyn Fn(&Moment) -> f64,
    ) -> Vec<Found> {
        roots(
            &self.scan(step_days, margin_days, TOLERANCE_DAYS),
            HALF_TURN_DEG,
            &mut |days| quantity(&self.at(days)),
        )
    }

    /// The same, and roots that lie in pairs between two steps.
    pub(super) fn paired_roots(
        &self,
        step_days: f64,
        quantity: &dyn Fn(&Moment) -> f64,
    ) -> Vec<Found> {
        paired_roots(
            &self.scan(step_days, 0.0, TOLERANCE_DAYS),
            HALF_TURN_DEG,
            &mut |days| quantity(&self.at(days)),
        )
    }

    /// Where a quantity of the sky is least.
    pub(super) fn minima(
        &self,
        step_days: f64,
        margin_days: f64,
        quantity: &dyn Fn(&Moment) -> f64,
    ) -> Vec<Found> {
        minima(
            &self.scan(step_days, margin_days, EXTREMUM_TOLERANCE_DAYS),
            &mut |days| quantity(&self.at(days)),
        )
    }

    /// Where a quantity of the sky is largest.
    pub(super) fn maxima(
        &self,
        step_days: f64,
        margin_days: f64,
        quantity: &dyn Fn(&Moment) -> f64,
    ) -> Vec<Found> {
        maxima(
            &self.scan(step_days, margin_days, EXTREMUM_TOLERANCE_DAYS),
            &mut |days| quantity(&self.at(days)),
        )
    }

    /// Whether an instant, days TT, lies in the piece.
    pub(super) fn contains(&self, tt_days: f64) -> bool {
        let utc = utc_of(Tt::from_days_since_j2000(tt_days));
        self.from <= utc && utc < self.to
    }

    /// Keeps an event that lies in the piece and is asked for. `error_days` is what the ephemeris leaves; `add` puts
    /// in what is the kind's own.
    pub(super) fn record(
        &self,
        kind: Kind,
        body: Body,
        tt_days: f64,
        error_days: f64,
        add: &dyn Fn(&Moment, &mut Event),
    ) {
        if !self.query.wants(kind) || !self.contains(tt_days) {
            return;
        }
        let moment = self.at(tt_days);
        let utc = utc_of(Tt::from_days_since_j2000(tt_days));
        let magnitude = moment.magnitude(body);
        let mut event = Event {
            kind,
            body,
            other: None,
            utc,
            time_uncertainty_seconds: with_clock_seconds(error_days.abs() + TOLERANCE_DAYS, utc),
            values: Values {
                distance_au: Some(moment.seen(body).distance_au()),
                elongation_deg: Some(moment.elongation_deg(body)),
                magnitude: magnitude.is_finite().then_some(magnitude),
                illuminated_fraction: Some(moment.illuminated_fraction(body)),
                lit_area_arcsec2: Some(moment.lit_area_arcsec2(body)),
                angular_diameter_arcsec: Some(moment.disc(body).angular_diameter_arcsec),
                ..Values::default()
            },
            contacts: Vec::new(),
            local: None,
        };
        add(&moment, &mut event);
        self.found.borrow_mut().insert(event);
    }

    /// Adds the events to others, in order of time.
    pub(super) fn hand_over(self, to: &mut Vec<Event>) {
        let Record { mut events, order } = self.found.into_inner();
        for index in order {
            to.extend(events.get_mut(index).and_then(Option::take));
        }
    }
}

/// Events as they were found, and their order in time: small indices are moved about, not events.
#[derive(Default)]
struct Record {
    events: Vec<Option<Event>>,
    order: Vec<usize>,
}

impl Record {
    fn insert(&mut self, event: Event) {
        let is_earlier = |index: &usize| {
            self.events
                .get(*index)
                .and_then(Option::as_ref)
                .is_some_and(|earlier| earlier.utc <= event.utc)
        };
        let place = self.order.partition_point(is_earlier);
        self.order.insert(place, self.events.len());
        self.events.push(Some(event));
    }
}

/// Nothing of its own.
pub(super) fn nothing(_: &Moment, _: &mut Event) {}
