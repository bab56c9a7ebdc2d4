//! Where the project's files lie.

use crate::process;
use serde_json::Value;
use std::env;
use std::path::{Path, PathBuf};
use std::process::Command;

/// The project's folders and its version, as cargo reports them.
pub struct Workspace {
    /// The folder of the library's Cargo.toml.
    pub root: PathBuf,
    /// Cargo's target folder.
    pub target: PathBuf,
    /// The library's version.
    pub version: String,
}

impl Workspace {
    /// Asks cargo; works from any folder below the project.
    pub fn find() -> Result<Self, String> {
        let manifest = own_folder().with_file_name("Cargo.toml");
        let text = process::capture(
            cargo()
                .args([
                    "metadata",
                    "--no-deps",
                    "--format-version",
                    "1",
                    "--manifest-path",
                ])
                .arg(&manifest),
        )?;
        let unexpected =
            || "`cargo metadata` did not describe the package wanderlight.".to_string();
        let metadata: Value = serde_json::from_str(&text).map_err(|_| unexpected())?;
        let version = metadata["packages"]
            .as_array()
            .and_then(|packages| {
                packages
                    .iter()
                    .find(|package| package["name"] == "wanderlight")
            })
            .and_then(|package| package["version"].as_str())
            .ok_or_else(unexpected)?;
        let folder = |key: &str| {
            metadata[key]
                .as_str()
                .map(PathBuf::from)
                .ok_or_else(unexpected)
        };
        Ok(Self {
            root: folder("workspace_root")?,
            target: folder("target_directory")?,
            version: version.to_string(),
        })
    }

    /// What is built for pages.
    pub fn dist(&self) -> PathBuf {
        self.root.join("dist")
    }

    /// Results between the steps of a build, so that a step whose input did not change is not repeated.
    pub fn steps(&self) -> PathBuf {
        self.target.join("widget")
    }

    /// This tool's settings.
    pub fn settings(&self) -> PathBuf {
        self.root.join("pkg-config")
    }
}

/// The folder of this tool. Cargo says where it is now; the compiled-in path serves when the tool is started by hand.
fn own_folder() -> PathBuf {
    env::var_os("CARGO_MANIFEST_DIR")
        .map_or_else(|| PathBuf::from(env!("CARGO_MANIFEST_DIR")), PathBuf::from)
}

/// The cargo that started this tool.
pub fn cargo() -> Command {
    Command::new(env::var_os("CARGO").unwrap_or_else(|| "cargo".into()))
}

/// `fs::read` whose error is a sentence naming the file.
pub fn read(path: &Path) -> Result<Vec<u8>, String> {
    std::fs::read(path).map_err(|cause| format!("{} cannot be read: {cause}.", path.display()))
}

/// `fs::read_to_string` whose error is a sentence naming the file.
pub fn read_text(path: &Path) -> Result<String, String> {
    std::fs::read_to_string(path)
        .map_err(|cause| format!("{} cannot be read: {cause}.", path.display()))
}

/// Writes a file and the folders above it, unless it already holds these bytes: an untouched file keeps its date.
pub fn write(path: &Path, bytes: &[u8]) -> Result<(), String> {
    if std::fs::read(path).is_ok_and(|present| present == bytes) {
        return Ok(());
    }
    let folder = path.parent().unwrap_or(Path::new("."));
    std::fs::create_dir_all(folder)
        .and_then(|()| std::fs::write(path, bytes))
        .map_err(|cause| format!("{} cannot be written: {cause}.", path.display()))
}
