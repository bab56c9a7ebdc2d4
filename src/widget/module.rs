//! The module's functions: one plain object in, plain data out, errors with a `code`.

use js_sys::{Array, Float64Array, Object, Reflect};
use wasm_bindgen::prelude::*;

use super::plain::{self, put};
use crate::error::{Code, Error, listed};
use crate::{Place, Utc};

#[wasm_bindgen(typescript_custom_section)]
const TYPES: &str = include_str!("types.d.ts");

/// One body at one instant; see `Circumstances` in the declarations.
#[wasm_bindgen(unchecked_return_type = "Circumstances")]
pub fn circumstances(
    #[wasm_bindgen(unchecked_param_type = "CircumstancesQuery")] query: JsValue,
) -> Result<JsValue, JsValue> {
    let answer = || {
        let query = Query::read(
            &query,
            &["body", "utc", "latitudeDeg", "longitudeDeg", "heightM"],
        )?;
        let place = query.place()?;
        crate::circumstances(
            query.text("body")?.parse()?,
            Utc::parse(&query.text("utc")?)?,
            place.as_ref(),
        )
    };
    plain::circumstances(&answer().map_err(thrown)?)
}

/// One body over a span of days; see `Series` in the declarations.
#[wasm_bindgen(unchecked_return_type = "Series")]
pub fn series(
    #[wasm_bindgen(unchecked_param_type = "SeriesQuery")] query: JsValue,
) -> Result<JsValue, JsValue> {
    let answer = || {
        let query = Query::read(&query, &["body", "fromUtc", "toUtc", "stepDays"])?;
        let instant = |key| Utc::parse(&query.text(key)?);
        let step_days = query
            .number("stepDays")?
            .ok_or_else(|| query.unreadable("stepDays", "a number"))?;
        crate::series(
            query.text("body")?.parse()?,
            instant("fromUtc")?,
            instant("toUtc")?,
            step_days,
        )
    };
    let series = answer().map_err(thrown)?;
    let instants: Array = series
        .utc
        .iter()
        .map(|utc| JsValue::from(utc.to_rfc3339()))
        .collect();
    let object = Object::new();
    put(&object, "utc", &instants);
    for (key, column) in [
        ("illuminatedFraction", &series.illuminated_fraction),
        ("angularDiameterArcsec", &series.angular_diameter_arcsec),
        ("magnitude", &series.magnitude),
        ("litAreaArcsec2", &series.lit_area_arcsec2),
        ("elongationDeg", &series.elongation_deg),
        ("distanceAu", &series.distance_au),
    ] {
        put(&object, key, &Float64Array::from(column.as_slice()));
    }
    Ok(object.into())
}

/// A query object. A key that is not among those known is refused: a misspelt option must not be ignored.
pub(super) struct Query<'a> {
    object: &'a Object,
    keys: &'a [&'static str],
}

impl<'a> Query<'a> {
    pub(super) fn read(query: &'a JsValue, keys: &'a [&'static str]) -> Result<Self, Error> {
        let Some(object) = query.dyn_ref::<Object>() else {
            let message = format!(
                "The function takes one object with the keys {}.",
                listed(keys.iter().copied())
            );
            return Err(Error::new(Code::BadOption, message));
        };
        let stranger = Object::keys(object)
            .iter()
            .filter_map(|key| key.as_string())
            .find(|key| !keys.contains(&key.as_str()));
        match stranger {
            None => Ok(Self { object, keys }),
            Some(key) => {
                let message = format!(
                    "There is no key \"{key}\" here; the keys are {}.",
                    listed(keys.iter().copied())
                );
                Err(Error::new(Code::BadOption, message))
            }
        }
    }

    fn value(&self, key: &str) -> JsValue {
        Reflect::get(self.object, &key.into()).unwrap_or(JsValue::UNDEFINED)
    }

    pub(super) fn text(&self, key: &str) -> Result<String, Error> {
        self.value(key)
            .as_string()
            .ok_or_else(|| self.unreadable(key, "a text"))
    }

    /// A number, or `None` where the key is absent or null.
    pub(super) fn number(&self, key: &str) -> Result<Option<f64>, Error> {
        let value = self.value(key);
        if value.is_undefined() || value.is_null() {
            return Ok(None);
        }
        value
            .as_f64()
            .map(Some)
            .ok_or_else(|| self.unreadable(key, "a number"))
    }

    /// Yes or no; no where the key is absent or null.
    pub(super) fn truth(&self, key: &str) -> Result<bool, Error> {
        let value = self.value(key);
        if value.is_undefined() || value.is_null() {
            return Ok(false);
        }
        value
            .as_bool()
            .ok_or_else(|| self.unreadable(key, "true or false"))
    }

    /// A list of texts, or an empty one where the key is absent or null.
    pub(super) fn texts(&self, key: &str) -> Result<Vec<String>, Error> {
        let value = self.value(key);
        let mut texts = Vec::new();
        if value.is_undefined() || value.is_null() {
            return Ok(texts);
        }
        let wanted = "a list of texts";
        let list = value
            .dyn_ref::<Array>()
            .ok_or_else(|| self.unreadable(key, wanted))?;
        for entry in list.iter() {
            texts.push(
                entry
                    .as_string()
                    .ok_or_else(|| self.unreadable(key, wanted))?,
            );
        }
        Ok(texts)
    }

    /// The place of the keys `latitudeDeg`, `longitudeDeg` and `heightM`, where they are given.
    pub(super) fn place(&self) -> Result<Option<Place>, Error> {
        match (self.number("latitudeDeg")?, self.number("longitudeDeg")?) {
            (Some(latitude_deg), Some(longitude_deg)) => Place::new(
                latitude_deg,
                longitude_deg,
                self.number("heightM")?.unwrap_or(0.0),
            )
            .map(Some),
            (None, None) => Ok(None),
            _ => {
                let message =
                    "A place needs both latitudeDeg (-90 to 90) and longitudeDeg (east positive).";
                Err(Error::new(Code::BadPlace, message))
            }
        }
    }

    pub(super) fn unreadable(&self, key: &str, wanted: &str) -> Error {
        Error::new(
            Code::BadOption,
            format!(
                "{key} must be {wanted}; the keys are {}.",
                listed(self.keys.iter().copied())
            ),
        )
    }
}

/// An `Error` whose `code` a program can test.
pub(super) fn thrown(error: Error) -> JsValue {
    let thrown = js_sys::Error::new(error.message());
    put(&thrown, "code", &error.code().as_str().into());
    thrown.into()
}
