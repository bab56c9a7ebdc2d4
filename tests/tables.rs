//! The committed tables are what the builder in `pkg-config/tables` wrote, from the inputs and with the code named there.

use serde_json::Value;
use sha2::{Digest, Sha256};
use std::{fs, path::PathBuf};

fn root() -> PathBuf {
    PathBuf::from(env!("CARGO_MANIFEST_DIR"))
}

fn manifest() -> Value {
    let path = root().join("pkg-config/tables/manifest.json");
    let text =
        fs::read_to_string(&path).unwrap_or_else(|error| panic!("{}: {error}", path.display()));
    serde_json::from_str(&text).expect("manifest.json is JSON")
}

fn sha256_of(path: &str) -> String {
    let data = fs::read(root().join(path)).unwrap_or_else(|error| panic!("{path}: {error}"));
    Sha256::digest(data)
        .iter()
        .map(|byte| format!("{byte:02x}"))
        .collect()
}

fn entries(of: &Value) -> impl Iterator<Item = (&String, &Value)> {
    of.as_object().expect("an object").iter()
}

#[test]
fn outputs_are_those_of_the_manifest() {
    let manifest = manifest();
    let mut seen = 0;
    for (path, entry) in entries(&manifest["outputs"]) {
        assert_eq!(
            entry["sha256"].as_str(),
            Some(sha256_of(path).as_str()),
            "{path} was changed by hand or is out of date: run `cargo widget tables`"
        );
        let length = fs::metadata(root().join(path))
            .expect("it was read just now")
            .len();
        assert_eq!(entry["bytes"].as_u64(), Some(length), "{path}");
        seen += 1;
    }
    assert_eq!(seen, 6, "outputs in the manifest");
}

#[test]
fn every_table_in_the_sources_is_in_the_manifest() {
    let manifest = manifest();
    for folder in ["src/series", "src/place", "src/frames", "src/time"] {
        for file in fs::read_dir(root().join(folder)).expect("a folder of sources") {
            let path = file.expect("a readable entry").path();
            let generated = match path.extension().and_then(|ending| ending.to_str()) {
                Some("bin") => true,
                Some("rs") => fs::read_to_string(&path)
                    .expect("text")
                    .starts_with("// Written by pkg-config/tables"),
                _ => false,
            };
            let name = format!(
                "{folder}/{}",
                path.file_name()
                    .and_then(|name| name.to_str())
                    .expect("a plain name")
            );
            assert_eq!(
                generated,
                manifest["outputs"].get(&name).is_some(),
                "{name}"
            );
        }
    }
}

#[test]
fn builder_and_lists_are_those_of_the_manifest() {
    let manifest = manifest();
    for (name, sum) in entries(&manifest["builder_sha256"]) {
        let path = format!("pkg-config/tables/{name}");
        assert_eq!(
            sum.as_str(),
            Some(sha256_of(&path).as_str()),
            "{path} changed: run `cargo widget tables`"
        );
    }
    for list in [
        "moon_arguments.txt",
        "planet_arguments.txt",
        "zone_names.txt",
    ] {
        let path = format!("pkg-config/tables/inputs/{list}");
        let sum = manifest["inputs_sha256"][list].as_str();
        assert_eq!(
            sum,
            Some(sha256_of(&path).as_str()),
            "{path} changed: run `cargo widget tables`"
        );
    }
}

#[test]
fn requirements_are_those_of_the_manifest() {
    let path = root().join("pkg-config/tables/requirements.txt");
    let text = fs::read_to_string(path).expect("requirements.txt");
    let rows: Vec<(&str, &str)> = text
        .lines()
        .filter_map(|line| line.split_once("=="))
        .collect();
    let manifest = manifest();
    assert_eq!(rows.len(), entries(&manifest["packages"]).count());
    for (name, version) in rows {
        assert_eq!(manifest["packages"][name].as_str(), Some(version), "{name}");
    }
}

/// The accuracy that the project promises for 1900 to 2100, kept with room by the fit itself.
#[test]
fn what_the_fit_leaves_is_within_the_aim() {
    let manifest = manifest();
    let mut bodies = 0;
    for (body, errors) in entries(&manifest["errors_rms_and_max"]) {
        let (span, rms_arcsec, max_arcsec) = match body.as_str() {
            "moon" => ("1900-2050", 0.4, 2.0),
            "uranus" | "neptune" => ("1900-2100", 0.3, 2.0),
            _ => ("1900-2100", 0.3, 1.5),
        };
        let direction = &errors["geocentric direction, arcsec"][span];
        let (rms, max) = (
            direction[0].as_f64().expect("a number"),
            direction[1].as_f64().expect("a number"),
        );
        assert!(rms > 0.0 && rms <= rms_arcsec, "{body}: rms {rms} arcsec");
        assert!(max >= rms && max <= max_arcsec, "{body}: max {max} arcsec");
        bodies += 1;
    }
    assert_eq!(bodies, 9);
}
