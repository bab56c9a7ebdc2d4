//! The optimiser: makes the module smaller, and is not needed for a working one.

use crate::freshness;
use crate::npm;
use crate::process;
use crate::tools::{self, OPTIMISER};
use crate::workspace::{Workspace, read, write};
use std::path::Path;
use std::process::Command;

/// The quick level with locals sorted by use. On this library it compresses better than the levels for size (126.4
/// against 127.0 kB after brotli when it was chosen) and takes less than half their time.
const PASSES: [&str; 2] = ["-O1", "--reorder-locals"];

/// The features that rustc switches on for this target and every browser since 2023 has.
const FEATURES: [&str; 6] = [
    "--enable-bulk-memory",
    "--enable-mutable-globals",
    "--enable-multivalue",
    "--enable-nontrapping-float-to-int",
    "--enable-reference-types",
    "--enable-sign-ext",
];

/// An optimiser that can be run, with a line that tells it from others.
pub struct Optimiser {
    program: Vec<std::ffi::OsString>,
    version: String,
}

impl Optimiser {
    /// The pinned one from npm, or one on the search path; otherwise the sentence that says what is missing.
    pub fn find(workspace: &Workspace) -> Result<Self, String> {
        let pinned = tools::node().and_then(|node| {
            npm::install(&workspace.settings())?;
            let script = workspace
                .settings()
                .join("node_modules/binaryen/bin/wasm-opt");
            Ok(vec![node.into_os_string(), script.into_os_string()])
        });
        let program =
            pinned.or_else(|_| OPTIMISER.find().map(|path| vec![path.into_os_string()]))?;
        let mut optimiser = Self {
            program,
            version: String::new(),
        };
        optimiser.version = process::capture(optimiser.command().arg("--version"))?;
        Ok(optimiser)
    }

    /// Optimises a module, or takes the last result out of `folder` when the module is the same.
    pub fn optimise(&self, wasm: &[u8], folder: &Path) -> Result<Vec<u8>, String> {
        let (input, output) = (folder.join("input.wasm"), folder.join("output.wasm"));
        let stamp = folder.join("fingerprint");
        let fingerprint = freshness::fingerprint(&[
            self.version.as_bytes(),
            PASSES.concat().as_bytes(),
            FEATURES.concat().as_bytes(),
            wasm,
        ]);
        if !freshness::is_fresh(&stamp, &fingerprint, &[&output]) {
            write(&input, wasm)?;
            let mut command = self.command();
            command
                .args(PASSES)
                .args(FEATURES)
                .arg(&input)
                .arg("--output")
                .arg(&output);
            process::capture(&mut command)?;
            freshness::note(&stamp, &fingerprint)?;
        }
        read(&output)
    }

    fn command(&self) -> Command {
        let mut command = Command::new(&self.program[0]);
        command.args(&self.program[1..]);
        command
    }
}
