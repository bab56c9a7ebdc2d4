//! The minifier: makes the JavaScript smaller, and is not needed for a working page.

use crate::freshness;
use crate::npm;
use crate::process;
use crate::tools;
use crate::workspace::{Workspace, read, write};
use std::ffi::OsString;
use std::path::Path;
use std::process::Command;

const OPTIONS: [&str; 4] = ["--module", "--compress", "passes=2", "--mangle"];

/// A minifier that can be run, with a line that tells it from others.
pub struct Minifier {
    program: [OsString; 2],
    version: String,
}

impl Minifier {
    /// The pinned one from npm; otherwise the sentence that says what is missing.
    pub fn find(workspace: &Workspace) -> Result<Self, String> {
        let node = tools::node()?;
        npm::install(&workspace.settings())?;
        let script = workspace.settings().join("node_modules/terser/bin/terser");
        let program = [node.into_os_string(), script.into_os_string()];
        let version = process::capture(
            Command::new(&program[0]).args([program[1].as_os_str(), "--version".as_ref()]),
        )?;
        Ok(Self { program, version })
    }

    /// Minifies one module, or takes the last result out of `folder` when the source is the same.
    pub fn minify(&self, source: &[u8], folder: &Path) -> Result<Vec<u8>, String> {
        let (input, output) = (folder.join("input.js"), folder.join("output.js"));
        let stamp = folder.join("fingerprint");
        let fingerprint =
            freshness::fingerprint(&[self.version.as_bytes(), OPTIONS.concat().as_bytes(), source]);
        if !freshness::is_fresh(&stamp, &fingerprint, &[&output]) {
            write(&input, source)?;
            process::capture(
                Command::new(&self.program[0])
                    .arg(&self.program[1])
                    .arg(&input)
                    .args(OPTIONS)
                    .arg("--output")
                    .arg(&output),
            )?;
            freshness::note(&stamp, &fingerprint)?;
        }
        read(&output)
    }
}
