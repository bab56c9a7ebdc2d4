//! Pinned Node packages, installed from a committed lock file when they are not there.

use crate::process;
use crate::tools::NPM;
use crate::workspace::read_text;
use serde_json::Value;
use std::path::Path;
use std::process::Command;

/// Makes sure that `folder/node_modules` holds the packages of `folder/package.json` in their pinned versions.
pub fn install(folder: &Path) -> Result<(), String> {
    if is_installed(folder)? {
        return Ok(());
    }
    let npm = NPM.find()?;
    println!(
        "Installing the packages of {}",
        folder.join("package.json").display()
    );
    process::run(
        Command::new(npm)
            .args(["ci", "--no-audit", "--no-fund", "--loglevel=error"])
            .current_dir(folder),
    )
}

/// Whether every dependency of the manifest is installed in exactly the pinned version.
fn is_installed(folder: &Path) -> Result<bool, String> {
    let path = folder.join("package.json");
    let manifest: Value = serde_json::from_str(&read_text(&path)?)
        .map_err(|cause| format!("{}: {cause}.", path.display()))?;
    let pinned = manifest["devDependencies"].as_object();
    Ok(pinned.into_iter().flatten().all(|(name, version)| {
        let installed = folder.join("node_modules").join(name).join("package.json");
        std::fs::read_to_string(installed)
            .ok()
            .and_then(|text| serde_json::from_str::<Value>(&text).ok())
            .is_some_and(|package| package["version"] == *version)
    }))
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::workspace::write;

    #[test]
    fn only_the_pinned_version_counts_as_installed() {
        let folder = std::env::temp_dir().join(format!("wanderlight-npm-{}", std::process::id()));
        write(
            &folder.join("package.json"),
            br#"{ "devDependencies": { "one": "1.2.3" } }"#,
        )
        .unwrap();
        assert_eq!(is_installed(&folder), Ok(false));
        let package = folder.join("node_modules/one/package.json");
        write(&package, br#"{ "version": "1.2.4" }"#).unwrap();
        assert_eq!(is_installed(&folder), Ok(false));
        write(&package, br#"{ "version": "1.2.3" }"#).unwrap();
        assert_eq!(is_installed(&folder), Ok(true));
        std::fs::remove_dir_all(&folder).unwrap();
    }
}
