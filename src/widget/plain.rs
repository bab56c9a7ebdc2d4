//! Plain JavaScript data: the public answers through serde, the element's own words key by key, which is smaller.

use js_sys::{Object, Reflect};
use serde::Serialize;
use wasm_bindgen::{JsCast, JsValue};

use crate::Circumstances;

pub(super) fn put(object: &Object, key: &str, value: &JsValue) {
    // Setting a property of a plain object that we have just made cannot fail.
    let _ = Reflect::set(object, &key.into(), value);
}

/// A plain object of texts.
pub(super) fn texts(pairs: &[(&str, &str)]) -> Object {
    let object = Object::new();
    for (key, text) in pairs {
        put(&object, key, &(*text).into());
    }
    object
}

/// An array of texts, or of arrays of texts.
pub(super) fn list(texts: &impl Serialize) -> JsValue {
    // Texts in memory can always be written.
    serde_wasm_bindgen::to_value(texts).unwrap_or(JsValue::NULL)
}

/// Plain data of the public answers: objects for structs, and `null` where a value does not exist.
fn serialised(value: &impl Serialize) -> Result<JsValue, JsValue> {
    let serializer = serde_wasm_bindgen::Serializer::new().serialize_missing_as_null(true);
    value.serialize(&serializer).map_err(JsValue::from)
}

/// Circumstances with the keys of the place, where there is one, beside the others.
pub(super) fn circumstances(now: &Circumstances) -> Result<JsValue, JsValue> {
    let object = serialised(now)?;
    if let Some(local) = &now.local {
        Object::assign(
            object.unchecked_ref::<Object>(),
            serialised(local)?.unchecked_ref(),
        );
    }
    Ok(object)
}
