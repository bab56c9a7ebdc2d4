//! The object in which the element class hands over its attributes.

use js_sys::{Object, Reflect};
use wasm_bindgen::JsValue;

use super::plain;
use crate::chart::Colour;
use crate::error::Error;

/// Attributes as the page gives them: a plain object of texts, absent ones null, with `prefersDark` and `colours`.
pub(super) struct Attributes(JsValue);

impl Attributes {
    pub(super) fn new(attributes: JsValue) -> Self {
        Self(attributes)
    }

    /// The text of one attribute, trimmed; `None` where there is none.
    pub(super) fn text(&self, name: &str) -> Option<String> {
        let text = get(&self.0, name).as_string()?;
        Some(text.trim().to_owned()).filter(|text| !text.is_empty())
    }

    pub(super) fn prefers_dark(&self) -> bool {
        get(&self.0, "prefersDark").is_truthy()
    }

    /// A custom property of the form `#rrggbb`; other forms leave the theme's own colour.
    pub(super) fn colour(&self, name: &str) -> Option<Colour> {
        let text = get(&get(&self.0, "colours"), name).as_string()?;
        let digits = text.strip_prefix('#').filter(|digits| digits.len() == 6)?;
        let channel = |at: usize| u8::from_str_radix(digits.get(at..at + 2)?, 16).ok();
        Some(Colour(channel(0)?, channel(2)?, channel(4)?))
    }
}

fn get(object: &JsValue, key: &str) -> JsValue {
    Reflect::get(object, &key.into()).unwrap_or(JsValue::UNDEFINED)
}

/// One attribute that could not be used.
#[derive(Debug)]
pub(super) struct Problem {
    attribute: &'static str,
    code: &'static str,
    message: String,
}

impl Problem {
    pub(super) fn new(attribute: &'static str, error: &Error) -> Self {
        Self {
            attribute,
            code: error.code().as_str(),
            message: error.message().to_owned(),
        }
    }

    pub(super) fn write(&self) -> Object {
        plain::texts(&[
            ("attribute", self.attribute),
            ("code", self.code),
            ("message", &self.message),
        ])
    }
}
