//! What the page knows and the core must not: the clock, the time zone, the language's number and date forms.

use std::cell::RefCell;

use js_sys::{Date, Function, Intl, Object, Reflect};
use wasm_bindgen::prelude::wasm_bindgen;
use wasm_bindgen::{JsCast, JsValue};

use super::attributes::{Attributes, Problem};
use crate::error::{Code, Error, quoted};
use crate::explain::{DateForm, Formats};
use crate::time::Utc;

const MILLISECONDS_PER_DAY: f64 = 86_400_000.0;
/// 2000-01-01T12:00 UTC in the browser's count of milliseconds since 1970.
const J2000_UNIX_MILLISECONDS: f64 = 946_728_000_000.0;

// The binding's own constructors do not catch the RangeError for a zone or tag that the browser does not know.
#[wasm_bindgen]
extern "C" {
    #[wasm_bindgen(catch, js_namespace = Intl, js_name = DateTimeFormat)]
    fn date_time_format(lang: &str, options: &Object) -> Result<JsValue, JsValue>;
    #[wasm_bindgen(catch, js_namespace = Intl, js_name = NumberFormat)]
    fn number_format(lang: &str, options: &Object) -> Result<JsValue, JsValue>;
}

/// Calendar day in the zone of a [`Host`], counted from 2000-01-01.
pub(super) type Day = i64;

/// Clock, zone and language of one element.
pub(super) struct Host {
    lang: String,
    zone: String,
    /// Formats an instant as plain fields of the zone's civil time.
    fields: Intl::DateTimeFormat,
    dates: RefCell<Vec<(DateForm, Function)>>,
    numbers: RefCell<Vec<(u8, Function)>>,
}

impl Host {
    /// # Errors
    /// `BadOption` when the browser does not know the zone or the language tag.
    pub(super) fn new(lang: &str, zone: Option<&str>) -> Result<Self, Error> {
        let zone = match zone {
            Some(zone) => zone.to_owned(),
            None => browser_zone(),
        };
        let plain = [
            ("year", "numeric"),
            ("month", "numeric"),
            ("day", "numeric"),
            ("hour", "numeric"),
        ];
        let options = options(&plain);
        for (key, value) in [
            ("minute", "numeric"),
            ("second", "numeric"),
            ("hourCycle", "h23"),
            ("timeZone", &zone),
        ] {
            set(&options, key, &value.into());
        }
        let fields = date_time_format("en-u-ca-gregory", &options).map_err(|_| {
            let message = format!(
                "This browser knows no time zone \"{zone}\"; a zone is written like Europe/Prague."
            );
            Error::new(Code::BadOption, message)
        })?;
        let host = Self {
            lang: lang.to_owned(),
            zone,
            fields: fields.unchecked_into(),
            dates: RefCell::default(),
            numbers: RefCell::default(),
        };
        number_format(lang, &Object::new()).map_err(|_| {
            Error::new(
                Code::BadOption,
                format!(
                    "{} is no language tag; one is written like en or en-GB.",
                    quoted(lang)
                ),
            )
        })?;
        Ok(host)
    }

    /// Name of the zone, as the browser spells it.
    pub(super) fn zone(&self) -> &str {
        &self.zone
    }

    /// The visitor's present day in the zone.
    pub(super) fn today(&self) -> Day {
        self.day_of(Utc::from_days_since_j2000(
            (Date::now() - J2000_UNIX_MILLISECONDS) / MILLISECONDS_PER_DAY,
        ))
    }

    /// The zone's calendar day at an instant.
    pub(super) fn day_of(&self, utc: Utc) -> Day {
        (utc.days_since_j2000() + self.offset_days(utc) + 0.5).floor() as Day
    }

    /// Noon of a calendar day in the zone: within half a day of everything that happens on that date.
    pub(super) fn noon(&self, day: Day) -> Utc {
        let as_if_utc = Utc::from_days_since_j2000(day as f64);
        // The offset belongs to the instant sought, so it is read again there; at noon no zone changes its clocks.
        let near = as_if_utc.plus_days(-self.offset_days(as_if_utc));
        as_if_utc.plus_days(-self.offset_days(near))
    }

    /// Civil time of the zone minus UTC, in days.
    fn offset_days(&self, utc: Utc) -> f64 {
        let mut field = [2000, 1, 1, 0, 0, 0];
        for part in self.fields.format_to_parts(&js_date(utc)).iter() {
            let kind = text(&part, "type");
            let names = ["year", "month", "day", "hour", "minute", "second"];
            if let Some(at) = names.iter().position(|name| *name == kind) {
                field[at] = text(&part, "value").parse().unwrap_or(field[at]);
            }
        }
        let [year, month, day, hour, minute, second] = field;
        let seconds_of_day = f64::from(hour * 3600 + minute * 60 + second);
        match Utc::from_civil(year, month as u8, day as u8, seconds_of_day) {
            // The browser drops fractions of a second; the nearest second is what was meant.
            Ok(civil) => {
                ((civil.days_since_j2000() - utc.days_since_j2000()) * 86_400.0).round() / 86_400.0
            }
            Err(_) => 0.0,
        }
    }

    fn date_format(&self, form: DateForm) -> Option<Function> {
        let fields: &[(&str, &str)] = match form {
            DateForm::Day => &[("day", "numeric"), ("month", "long"), ("year", "numeric")],
            DateForm::DayMonth => &[("day", "numeric"), ("month", "short")],
            DateForm::Month => &[("month", "short")],
            DateForm::MonthYear => &[("month", "short"), ("year", "numeric")],
            DateForm::Year => &[("year", "numeric")],
            DateForm::DayTime => &[
                ("day", "numeric"),
                ("month", "short"),
                ("hour", "numeric"),
                ("minute", "2-digit"),
            ],
        };
        let options = options(fields);
        set(&options, "timeZone", &self.zone.as_str().into());
        set(&options, "calendar", &"gregory".into());
        let format: Intl::DateTimeFormat = date_time_format(&self.lang, &options)
            .ok()?
            .unchecked_into();
        Some(format.format())
    }

    fn number_format(&self, decimals: u8) -> Option<Function> {
        let options = Object::new();
        for key in ["minimumFractionDigits", "maximumFractionDigits"] {
            set(&options, key, &f64::from(decimals).into());
        }
        let format: Intl::NumberFormat = number_format(&self.lang, &options).ok()?.unchecked_into();
        Some(format.format())
    }
}

impl Formats for Host {
    fn number(&self, value: f64, decimals: u8) -> String {
        cached(&self.numbers, decimals, || self.number_format(decimals))
            .and_then(|format| {
                format
                    .call1(&JsValue::NULL, &value.into())
                    .ok()?
                    .as_string()
            })
            .unwrap_or_else(|| value.to_string())
    }

    fn date(&self, utc: Utc, form: DateForm) -> String {
        cached(&self.dates, form, || self.date_format(form))
            .and_then(|format| {
                format
                    .call1(&JsValue::NULL, &js_date(utc))
                    .ok()?
                    .as_string()
            })
            .unwrap_or_else(|| utc.to_rfc3339())
    }
}

/// A host with the zone and language asked for, or with the browser's zone and English where they cannot be used.
pub(super) fn read_host(attributes: &Attributes) -> Result<(Host, Vec<Problem>), Error> {
    let mut problems = Vec::new();
    let mut note = |attribute, error| problems.push(Problem::new(attribute, &error));
    let zone = attributes.text("zone");
    let zone = zone.as_deref().filter(|zone| {
        let outcome = Host::new(ENGLISH, Some(zone));
        outcome.map_err(|error| note("zone", error)).is_ok()
    });
    let english = || ENGLISH.to_owned();
    let lang = match attributes.text("lang") {
        Some(asked) => read_lang(asked).unwrap_or_else(|error| {
            note("lang", error);
            english()
        }),
        // A page in another language is no mistake of the element's; its words are English all the same.
        None => attributes
            .text("pageLang")
            .and_then(|lang| read_lang(lang).ok())
            .unwrap_or_else(english),
    };
    Ok((Host::new(&lang, zone)?, problems))
}

/// The language of the words there are.
const ENGLISH: &str = "en";

fn read_lang(tag: String) -> Result<String, Error> {
    Host::new(&tag, None)?;
    let primary = tag.split(['-', '_']).next().unwrap_or_default();
    if primary.eq_ignore_ascii_case(ENGLISH) {
        return Ok(tag);
    }
    let message = format!(
        "There are no words in {} here; choose en or a region of it such as en-GB.",
        quoted(&tag)
    );
    Err(Error::new(Code::BadOption, message))
}

/// Making a formatter costs the browser a hundred times what using it does.
fn cached<K: Copy + PartialEq>(
    store: &RefCell<Vec<(K, Function)>>,
    key: K,
    make: impl FnOnce() -> Option<Function>,
) -> Option<Function> {
    if let Some((_, format)) = store.borrow().iter().find(|(known, _)| *known == key) {
        return Some(format.clone());
    }
    let format = make()?;
    store.borrow_mut().push((key, format.clone()));
    Some(format)
}

/// The zone that the browser runs in; UTC where it does not say.
pub(super) fn browser_zone() -> String {
    date_time_format("en", &Object::new())
        .ok()
        .map(|format| {
            text(
                &format
                    .unchecked_into::<Intl::DateTimeFormat>()
                    .resolved_options(),
                "timeZone",
            )
        })
        .filter(|zone| !zone.is_empty())
        .unwrap_or_else(|| "UTC".to_owned())
}

fn options(fields: &[(&str, &str)]) -> Object {
    let options = Object::new();
    for (key, value) in fields {
        set(&options, key, &(*value).into());
    }
    options
}

fn set(object: &Object, key: &str, value: &JsValue) {
    // Setting a property of a plain object that we have just made cannot fail.
    let _ = Reflect::set(object, &key.into(), value);
}

fn text(object: &JsValue, key: &str) -> String {
    Reflect::get(object, &key.into())
        .ok()
        .and_then(|value| value.as_string())
        .unwrap_or_default()
}

fn js_date(utc: Utc) -> Date {
    Date::new(&(utc.days_since_j2000() * MILLISECONDS_PER_DAY + J2000_UNIX_MILLISECONDS).into())
}
