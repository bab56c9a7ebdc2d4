//! The module's functions that look for events.

use js_sys::{Array, Object};
use wasm_bindgen::prelude::*;

use super::module::{Query, thrown};
use super::plain::put;
use crate::Utc;
use crate::error::Error;
use crate::events::{self, Apparition, Contact, Event, Kind, Rank};

/// The events of a span in order of time; see `SkyEvent` in the declarations.
#[wasm_bindgen(unchecked_return_type = "SkyEvent[]")]
pub fn events(
    #[wasm_bindgen(unchecked_param_type = "EventsQuery")] query: JsValue,
) -> Result<JsValue, JsValue> {
    let answer = || {
        let query = Query::read(
            &query,
            &[
                "fromUtc",
                "toUtc",
                "bodies",
                "kinds",
                "latitudeDeg",
                "longitudeDeg",
                "heightM",
            ],
        )?;
        let (mut bodies, mut kinds) = (Vec::new(), Vec::new());
        for body in query.texts("bodies")? {
            bodies.push(body.parse()?);
        }
        for kind in query.texts("kinds")? {
            kinds.push(kind.parse()?);
        }
        events::events(&events::Query {
            from: Utc::parse(&query.text("fromUtc")?)?,
            to: Utc::parse(&query.text("toUtc")?)?,
            bodies,
            kinds,
            place: query.place()?,
        })
    };
    Ok(list(&answer().map_err(thrown)?, &event_object).into())
}

/// The kinds of events with their definitions.
#[wasm_bindgen(
    js_name = eventKinds,
    unchecked_return_type = "{ kind: EventKind; definition: string }[]"
)]
pub fn event_kinds() -> JsValue {
    let kinds = Array::new();
    for kind in Kind::all() {
        let object = Object::new();
        put(&object, "kind", &kind.name().into());
        put(&object, "definition", &kind.definition().into());
        kinds.push(&object);
    }
    kinds.into()
}

/// A planet's apparitions and their rhythm; see `Apparitions` in the declarations.
#[wasm_bindgen(unchecked_return_type = "Apparitions")]
pub fn apparitions(
    #[wasm_bindgen(unchecked_param_type = "ApparitionsQuery")] query: JsValue,
) -> Result<JsValue, JsValue> {
    let answer = || {
        let query = Query::read(&query, &["body", "fromUtc", "toUtc", "rank"])?;
        let body = query.text("body")?.parse()?;
        let from = Utc::parse(&query.text("fromUtc")?)?;
        let to = Utc::parse(&query.text("toUtc")?)?;
        let is_ranked = query.truth("rank")?;
        Ok::<_, Error>((
            events::apparitions(body, from, to)?,
            events::rhythm(body, from, to)?,
            is_ranked,
        ))
    };
    let (apparitions, rhythm, is_ranked) = answer().map_err(thrown)?;
    let object = Object::new();
    let ranks = if is_ranked {
        events::ranks(&apparitions)
    } else {
        Vec::new()
    };
    let told = Array::new();
    for (index, apparition) in apparitions.iter().enumerate() {
        told.push(&apparition_object(apparition, ranks.get(index)));
    }
    put(&object, "apparitions", &told);
    let facts = Object::new();
    for (key, value) in [
        (
            "meanSynodicPeriodDays",
            Some(rhythm.mean_synodic_period_days),
        ),
        (
            "shortestSynodicPeriodDays",
            rhythm.shortest_synodic_period_days,
        ),
        (
            "longestSynodicPeriodDays",
            rhythm.longest_synodic_period_days,
        ),
        (
            "orbitsPerSynodicPeriod",
            Some(rhythm.orbits_per_synodic_period),
        ),
        ("orbitalSpeedKmS", Some(rhythm.orbital_speed_km_s)),
        ("orbitalSpeedMiS", Some(rhythm.orbital_speed_mi_s)),
        (
            "earthOrbitalSpeedKmS",
            Some(rhythm.earth_orbital_speed_km_s),
        ),
        (
            "earthOrbitalSpeedMiS",
            Some(rhythm.earth_orbital_speed_mi_s),
        ),
        ("eightYearDriftDays", rhythm.eight_year_drift_days),
    ] {
        put(&facts, key, &value.map_or(JsValue::NULL, JsValue::from));
    }
    put(&object, "rhythm", &facts);
    Ok(object.into())
}

fn list<T>(items: &[T], object_of: &dyn Fn(&T) -> Object) -> Array {
    let array = Array::new();
    for item in items {
        array.push(&object_of(item));
    }
    array
}

fn put_utc(object: &Object, key: &str, utc: Utc) {
    put(object, key, &utc.to_rfc3339().into());
}

fn event_object(event: &Event) -> Object {
    let object = Object::new();
    put(&object, "kind", &event.kind.name().into());
    put(&object, "body", &event.body.name().into());
    if let Some(other) = event.other {
        put(&object, "other", &other.name().into());
    }
    put_utc(&object, "utc", event.utc);
    put(
        &object,
        "timeUncertaintySeconds",
        &event.time_uncertainty_seconds.into(),
    );
    let values = Object::new();
    for (key, value) in event.values.numbers() {
        put(&values, key, &value.into());
    }
    for (key, value) in event.values.facts() {
        put(&values, key, &value.into());
    }
    put(&object, "values", &values);
    if !event.contacts.is_empty() {
        put(&object, "contacts", &list(&event.contacts, &contact_object));
    }
    if let Some(local) = &event.local {
        let there = Object::new();
        put(&there, "aboveHorizon", &local.is_above_horizon.into());
        put(&there, "contacts", &list(&local.contacts, &contact_object));
        put(&object, "local", &there);
    }
    object
}

fn contact_object(contact: &Contact) -> Object {
    let object = Object::new();
    put(&object, "name", &contact.name.into());
    put_utc(&object, "utc", contact.utc);
    for (key, value) in [
        ("positionAngleDeg", Some(contact.position_angle_deg)),
        ("altitudeDeg", contact.altitude_deg),
        ("sunAltitudeDeg", contact.sun_altitude_deg),
    ] {
        if let Some(value) = value {
            put(&object, key, &value.into());
        }
    }
    object
}

fn apparition_object(apparition: &Apparition, rank: Option<&Rank>) -> Object {
    let object = Object::new();
    put(&object, "side", &apparition.side.name().into());
    put_utc(&object, "fromUtc", apparition.from);
    put_utc(&object, "toUtc", apparition.to);
    put(
        &object,
        "turningPoints",
        &list(&apparition.turning_points, &event_object),
    );
    put_utc(&object, "peakUtc", apparition.peak_utc);
    for (key, value) in [
        ("peakMagnitude", apparition.peak_magnitude),
        ("largestElongationDeg", apparition.largest_elongation_deg),
        ("largestLitAreaArcsec2", apparition.largest_lit_area_arcsec2),
    ] {
        put(&object, key, &value.into());
    }
    if let Some(rank) = rank {
        let place = Object::new();
        put(&place, "position", &(rank.position as f64).into());
        put(&place, "of", &(rank.of as f64).into());
        for (key, utc) in [
            ("brighterBeforeUtc", rank.brighter_before),
            ("brighterAfterUtc", rank.brighter_after),
        ] {
            let text = utc.map_or(JsValue::NULL, |utc| utc.to_rfc3339().into());
            put(&place, key, &text);
        }
        put(&object, "rank", &place);
    }
    object
}
