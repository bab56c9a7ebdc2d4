//! The element's attributes as the exhibit uses them. A bad value leaves the default and becomes a problem to show.

use super::attributes::{Attributes, Problem};
use super::host::{Day, Host};
use crate::chart::Theme;
use crate::error::{Code, Error, quoted};
use crate::explain::Units;
use crate::place::{self, Place};
use crate::time::Utc;
use crate::{Body, series};

/// The pictures an element can show.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum View {
    /// Lit share, size, lit area and brightness against the date.
    Tradeoff,
    /// The disc to scale through the days.
    Disc,
    /// Sun, Earth and planet from above.
    Plan,
}

impl View {
    pub(super) const fn name(self) -> &'static str {
        match self {
            View::Tradeoff => "tradeoff",
            View::Disc => "disc",
            View::Plan => "plan",
        }
    }
}

/// The place in use and where it came from.
#[derive(Debug, Clone, PartialEq)]
pub(super) enum Spot {
    /// Nobody gave a place and the zone names none.
    Unknown,
    /// The principal city of the browser's time zone.
    Rough {
        /// Where that city lies.
        place: Place,
        /// Its name, from the zone's.
        city: String,
    },
    /// Written by the page or typed by the visitor.
    Exact(Place),
}

impl Spot {
    pub(super) fn place(&self) -> Option<&Place> {
        match self {
            Spot::Unknown => None,
            Spot::Rough { place, .. } | Spot::Exact(place) => Some(place),
        }
    }
}

/// The attributes after reading, defaults filled in.
#[derive(Debug)]
pub(super) struct Settings {
    pub(super) body: Body,
    pub(super) view: View,
    pub(super) day: Day,
    pub(super) span_days: i64,
    pub(super) spot: Spot,
    pub(super) theme: Theme,
    pub(super) units: Units,
}

const SPAN_DAYS: std::ops::RangeInclusive<i64> = 8..=3000;

impl Settings {
    /// Reads all attributes; each that cannot be used is replaced by its default and reported.
    pub(super) fn read(attributes: &Attributes, host: &Host) -> (Self, Vec<Problem>) {
        let mut reading = Reading {
            attributes,
            problems: Vec::new(),
        };
        let body = reading.pick("body", Body::Venus, read_body);
        let view = reading.pick("view", View::Tradeoff, |text| read_view(text, body));
        let settings = Self {
            body,
            view,
            day: reading.pick("date", host.today(), |text| read_date(text, host)),
            span_days: reading.pick("span", default_span_days(body, view), read_span),
            spot: reading.pick("place", rough_spot(host.zone()), |text| {
                read_spot(text, host.zone())
            }),
            theme: read_theme(&mut reading),
            units: reading.pick("units", Units::Metric, read_units),
        };
        (settings, reading.problems)
    }
}

/// The attributes and what could not be used of them so far.
struct Reading<'a> {
    attributes: &'a Attributes,
    problems: Vec<Problem>,
}

impl Reading<'_> {
    /// The value that an attribute gives, or the default where there is none or it cannot be used.
    fn pick<T>(
        &mut self,
        name: &'static str,
        default: T,
        read: impl FnOnce(&str) -> Result<T, Error>,
    ) -> T {
        let Some(text) = self.attributes.text(name) else {
            return default;
        };
        read(&text).unwrap_or_else(|error| {
            self.problems.push(Problem::new(name, &error));
            default
        })
    }
}

fn read_body(text: &str) -> Result<Body, Error> {
    match text.parse()? {
        Body::Sun => Err(Error::new(
            Code::BadOption,
            "The Sun shows no phase to draw; choose the Moon or a planet from mercury to neptune.",
        )),
        body => Ok(body),
    }
}

fn read_view(text: &str, body: Body) -> Result<View, Error> {
    let view = [View::Tradeoff, View::Disc, View::Plan]
        .into_iter()
        .find(|view| view.name() == text)
        .ok_or_else(|| not_among("view", text, "tradeoff, disc, plan"))?;
    if view == View::Plan && !Body::PLANETS.contains(&body) {
        return Err(Error::new(
            Code::BadOption,
            "The plan shows a planet on its way around the Sun; choose one from mercury to neptune.",
        ));
    }
    Ok(view)
}

fn read_units(text: &str) -> Result<Units, Error> {
    match text {
        "metric" => Ok(Units::Metric),
        "imperial" => Ok(Units::Imperial),
        _ => Err(not_among("set of units", text, "metric, imperial")),
    }
}

fn not_among(what: &str, text: &str, known: &str) -> Error {
    let shown = quoted(text);
    Error::new(
        Code::BadOption,
        format!("There is no {what} {shown} here; choose one of {known}."),
    )
}

/// A calendar date within the series' span, or `today`.
pub(super) fn read_date(text: &str, host: &Host) -> Result<Day, Error> {
    if text == "today" {
        return Ok(host.today());
    }
    let utc = Utc::parse(text)?;
    let day = match text.len() {
        // A plain date is the reader's own calendar date, not an instant in Greenwich.
        0..=10 => (utc.days_since_j2000() + 0.5).floor() as Day,
        _ => host.day_of(utc),
    };
    if day < first_day() || day > last_day() {
        return Err(Error::new(
            Code::OutOfSpan,
            format!(
                "{text} lies outside the years {} to {} for which places are computed.",
                series::VALID_FROM_YEAR,
                series::VALID_TO_YEAR
            ),
        ));
    }
    Ok(day)
}

/// First day that a frame may show: one day inside the series' span, whatever the zone.
fn first_day() -> Day {
    (f64::from(series::VALID_FROM_YEAR - 2000) * 365.2425).ceil() as Day + 2
}

/// Last day that a frame may show.
fn last_day() -> Day {
    (f64::from(series::VALID_TO_YEAR - 2000) * 365.2425).floor() as Day - 2
}

fn read_span(text: &str) -> Result<i64, Error> {
    text.parse()
        .ok()
        .filter(|days| SPAN_DAYS.contains(days))
        .ok_or_else(|| {
            let (least, most) = (SPAN_DAYS.start(), SPAN_DAYS.end());
            Error::new(
                Code::BadStep,
                format!("The span is a whole number of days from {least} to {most}."),
            )
        })
}

/// The frame of a span with a day in its middle, held within the years that the series cover.
pub(super) fn frame_around(day: Day, span_days: i64) -> (Day, Day) {
    let first = (day - span_days / 2)
        .min(last_day() - span_days)
        .max(first_day());
    (first, first + span_days)
}

/// Long enough to show how a round of phases rises and falls, short enough to read a day.
const fn default_span_days(body: Body, view: View) -> i64 {
    if matches!(view, View::Plan) {
        return synodic_days(body);
    }
    match body {
        Body::Moon => 34,
        Body::Mercury => 130,
        Body::Venus => 330,
        Body::Mars => 460,
        _ => 400,
    }
}

/// Mean time after which a planet stands again at the same angle from the Sun, in whole days: 1 / |1/P - 1/365.256|
/// with the sidereal periods P of the mean motions in `series`.
pub(super) const fn synodic_days(body: Body) -> i64 {
    match body {
        Body::Mercury => 116,
        Body::Venus => 584,
        Body::Mars => 780,
        Body::Jupiter => 399,
        Body::Saturn => 378,
        Body::Uranus => 370,
        _ => 367,
    }
}

fn rough_spot(zone: &str) -> Spot {
    place::rough_place(zone)
        .and_then(|rough| {
            let place = Place::new(rough.latitude_deg, rough.longitude_deg, 0.0).ok()?;
            Some(Spot::Rough {
                place,
                city: rough.city,
            })
        })
        .unwrap_or(Spot::Unknown)
}

fn read_spot(text: &str, zone: &str) -> Result<Spot, Error> {
    match text {
        "auto" => Ok(rough_spot(zone)),
        _ => Ok(Spot::Exact(place::parse_pair(text)?)),
    }
}

fn read_theme(reading: &mut Reading<'_>) -> Theme {
    // Statics, so that choosing one copies an address and not sixteen colours.
    static LIGHT: Theme = Theme::light();
    static DARK: Theme = Theme::dark();
    static NIGHT: Theme = Theme::night();
    let attributes = reading.attributes;
    let automatic = if attributes.prefers_dark() {
        &DARK
    } else {
        &LIGHT
    };
    let theme = reading.pick("theme", automatic, |text| match text {
        "light" => Ok(&LIGHT),
        "dark" => Ok(&DARK),
        "night" => Ok(&NIGHT),
        "auto" => Ok(automatic),
        _ => Err(not_among("theme", text, "light, dark, night, auto")),
    });
    let mut theme = theme.clone();
    for (name, colour) in [
        ("paper", &mut theme.background),
        ("ink", &mut theme.ink),
        ("accent", &mut theme.chosen),
    ] {
        *colour = attributes.colour(name).unwrap_or(*colour);
    }
    theme
}
