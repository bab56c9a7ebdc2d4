//! The pinned sizes: a size grows only on purpose.

use crate::workspace::{Workspace, read_text, write};
use serde_json::{Map, Value, json};
use std::path::PathBuf;

/// Growth within this share is the toolchain's noise, not a change of ours.
const TOLERANCE_PER_MILLE: u64 = 5;

/// The pinned sizes and budgets of `pkg-config/pins.json`, brotli bytes by item.
pub struct Pins {
    path: PathBuf,
    pinned: Map<String, Value>,
    budgets: Map<String, Value>,
}

impl Pins {
    /// Reads the committed file.
    pub fn read(workspace: &Workspace) -> Result<Self, String> {
        let path = workspace.settings().join("pins.json");
        let text = read_text(&path)?;
        let value: Value =
            serde_json::from_str(&text).map_err(|cause| format!("{}: {cause}.", path.display()))?;
        let object = |key: &str| {
            value[key]
                .as_object()
                .cloned()
                .ok_or_else(|| format!("{}: `{key}` must be an object.", path.display()))
        };
        Ok(Self {
            pinned: object("pinned_brotli_bytes")?,
            budgets: object("budget_brotli_bytes")?,
            path: path.clone(),
        })
    }

    /// The pinned size of an item.
    pub fn pinned(&self, item: &str) -> Option<u64> {
        self.pinned.get(item).and_then(Value::as_u64)
    }

    /// The size that an item may never exceed.
    pub fn budget(&self, item: &str) -> Option<u64> {
        self.budgets.get(item).and_then(Value::as_u64)
    }

    /// Whether a measured size is allowed; the error says how to allow it on purpose.
    pub fn judge(&self, item: &str, brotli_bytes: u64) -> Result<(), String> {
        let raise = "If the growth is meant, run `cargo widget size --pin` and say in the change what it buys.";
        if let Some(budget) = self.budget(item).filter(|budget| brotli_bytes > *budget) {
            return Err(format!(
                "{item} has {brotli_bytes} bytes compressed, over its budget of {budget}; a budget is changed only in pkg-config/pins.json by hand."
            ));
        }
        match self.pinned(item) {
            None => Err(format!(
                "{item} has {brotli_bytes} bytes compressed and no pinned size yet. {raise}"
            )),
            Some(pinned) if brotli_bytes * 1000 > pinned * (1000 + TOLERANCE_PER_MILLE) => {
                Err(format!(
                    "{item} grew from {pinned} to {brotli_bytes} bytes compressed, more than {TOLERANCE_PER_MILLE} per mille. {raise}"
                ))
            }
            Some(_) => Ok(()),
        }
    }

    /// Pins the measured sizes and leaves the budgets as they are.
    pub fn pin(&mut self, measured: &[(&str, u64)]) -> Result<(), String> {
        self.pinned = measured
            .iter()
            .map(|(item, bytes)| ((*item).to_string(), json!(bytes)))
            .collect();
        let value =
            json!({ "budget_brotli_bytes": self.budgets, "pinned_brotli_bytes": self.pinned });
        write(&self.path, format!("{value:#}\n").as_bytes())
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn pins() -> Pins {
        let object = |value: Value| value.as_object().unwrap().clone();
        Pins {
            path: std::env::temp_dir()
                .join(format!("wanderlight-pins-{}.json", std::process::id())),
            pinned: object(json!({ "wasm": 10_000, "wire": 20_000 })),
            budgets: object(json!({ "wire": 20_050 })),
        }
    }

    #[test]
    fn noise_and_shrinking_pass_growth_does_not() {
        assert_eq!(pins().judge("wasm", 9_000), Ok(()));
        assert_eq!(pins().judge("wasm", 10_050), Ok(()));
        let complaint = pins().judge("wasm", 10_051).unwrap_err();
        assert!(
            complaint.contains("from 10000 to 10051")
                && complaint.contains("cargo widget size --pin"),
            "{complaint}"
        );
    }

    #[test]
    fn a_budget_goes_before_the_tolerance_and_a_missing_pin_is_a_failure() {
        assert!(
            pins()
                .judge("wire", 20_051)
                .unwrap_err()
                .contains("budget of 20050")
        );
        assert!(
            pins()
                .judge("glue", 1)
                .unwrap_err()
                .contains("no pinned size yet")
        );
    }

    #[test]
    fn pinning_keeps_the_budgets() {
        let mut pins = pins();
        pins.pin(&[("wasm", 9_000)]).unwrap();
        let value: Value =
            serde_json::from_str(&std::fs::read_to_string(&pins.path).unwrap()).unwrap();
        assert_eq!(
            value,
            json!({ "budget_brotli_bytes": { "wire": 20_050 }, "pinned_brotli_bytes": { "wasm": 9_000 } })
        );
        assert_eq!(
            pins.judge("wire", 20_000)
                .map_err(|complaint| complaint.contains("no pinned size")),
            Err(true)
        );
        std::fs::remove_file(&pins.path).unwrap();
    }
}
