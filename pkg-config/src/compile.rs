//! From Rust to the raw WebAssembly module.

use crate::process;
use crate::tools::RUSTUP;
use crate::workspace::{Workspace, cargo};
use std::env;
use std::path::{Path, PathBuf};
use std::process::Command;

const TARGET: &str = "wasm32-unknown-unknown";

/// Where to compile to and how hard to optimise.
pub struct Compilation<'a> {
    pub target: &'a Path,
    /// Overrides the level that Cargo.toml gives the shipped profile.
    pub level: Option<&'a str>,
}

/// Compiles the library for the web and returns the module that the linker wrote.
pub fn compile(workspace: &Workspace, compilation: &Compilation) -> Result<PathBuf, String> {
    ensure_target()?;
    let mut command = cargo();
    command
        .args([
            "build",
            "--lib",
            "--profile",
            "shipped",
            "--target",
            TARGET,
            "--package",
            "wanderlight",
        ])
        .arg("--target-dir")
        .arg(compilation.target)
        .env("CARGO_ENCODED_RUSTFLAGS", path_flags(&cargo_home()))
        .current_dir(&workspace.root);
    if let Some(level) = compilation.level {
        command.env("CARGO_PROFILE_SHIPPED_OPT_LEVEL", level);
    }
    process::run(&mut command)?;
    Ok(compilation
        .target
        .join(TARGET)
        .join("shipped/wanderlight.wasm"))
}

/// Panic messages name source files: without this flag the module would carry the builder's home folder, and its
/// size would depend on that folder's name.
fn path_flags(cargo_home: &Path) -> String {
    let sources = cargo_home.join("registry").join("src");
    format!("--remap-path-prefix={}=crates", sources.display())
}

fn cargo_home() -> PathBuf {
    env::var_os("CARGO_HOME").map_or_else(
        || env::home_dir().unwrap_or_default().join(".cargo"),
        PathBuf::from,
    )
}

/// rust-toolchain.toml makes rustup install the target by itself; a toolchain from elsewhere may lack it.
fn ensure_target() -> Result<(), String> {
    let rustc = env::var_os("RUSTC").unwrap_or_else(|| "rustc".into());
    let folder = process::capture(Command::new(rustc).args([
        "--print",
        "target-libdir",
        "--target",
        TARGET,
    ]))?;
    if Path::new(folder.trim()).is_dir() {
        return Ok(());
    }
    process::run(Command::new(RUSTUP.find()?).args(["target", "add", TARGET]))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_home_folder_is_taken_out_of_the_module() {
        let flags = path_flags(Path::new("home").join("anna").as_path());
        assert!(flags.starts_with("--remap-path-prefix=home"));
        assert!(flags.ends_with("src=crates"), "{flags}");
    }
}
