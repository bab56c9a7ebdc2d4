//! The outside tools: what each is for, where it is looked for, and the sentence when it is missing.

use crate::process;
use std::env;
use std::path::PathBuf;
use std::process::Command;

/// An outside tool. A step that needs one asks [`Tool::find`] and passes the sentence on when there is none.
pub struct Tool {
    /// Its name in a sentence.
    name: &'static str,
    /// Completes "is needed to ...".
    purpose: &'static str,
    /// How it is installed on Debian.
    debian: &'static str,
    /// How it is installed elsewhere; completes "elsewhere, ...".
    elsewhere: &'static str,
    /// An environment variable that names the program and goes first.
    variable: &'static str,
    /// Names on the search path, the best first.
    commands: &'static [&'static str],
    /// Full paths of usual places outside the search path.
    places: &'static [&'static str],
}

/// Runs the optimiser, the module's tests, the type check and the browser tests.
pub const NODE: Tool = Tool {
    name: "Node 20 or newer",
    purpose: "run the optimiser, the module's tests, the type check and the browser tests",
    debian: "apt-get install nodejs (Debian 13 or newer)",
    elsewhere: "take the long-term version that the Node project offers",
    variable: "WANDERLIGHT_NODE",
    commands: &["node", "nodejs"],
    places: &["/usr/local/bin/node", "C:\\Program Files\\nodejs\\node.exe"],
};

/// Installs the pinned optimiser and test tools.
pub const NPM: Tool = Tool {
    name: "npm",
    purpose: "install the pinned optimiser and the tools of the tests",
    debian: "apt-get install npm",
    elsewhere: "it comes with Node",
    variable: "WANDERLIGHT_NPM",
    commands: &["npm"],
    places: &["/usr/local/bin/npm", "C:\\Program Files\\nodejs\\npm.cmd"],
};

/// The browser of the browser tests.
pub const CHROMIUM: Tool = Tool {
    name: "Chromium",
    purpose: "run the browser tests",
    debian: "apt-get install chromium",
    elsewhere: "install Chromium or Chrome from its maker, or name the program in WANDERLIGHT_CHROMIUM",
    variable: "WANDERLIGHT_CHROMIUM",
    commands: &[
        "chromium",
        "chromium-browser",
        "google-chrome",
        "google-chrome-stable",
    ],
    places: &[
        "/usr/lib/chromium/chromium",
        "/snap/bin/chromium",
        "/Applications/Chromium.app/Contents/MacOS/Chromium",
        "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
        "C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe",
    ],
};

/// Drives the browser of the browser tests.
pub const CHROMEDRIVER: Tool = Tool {
    name: "chromedriver",
    purpose: "drive Chromium in the browser tests",
    debian: "apt-get install chromium-driver",
    elsewhere: "install the driver of the same version as the browser, or name it in WANDERLIGHT_CHROMEDRIVER",
    variable: "WANDERLIGHT_CHROMEDRIVER",
    commands: &["chromedriver"],
    places: &[
        "/usr/lib/chromium/chromedriver",
        "/usr/lib/chromium-browser/chromedriver",
        "/snap/bin/chromium.chromedriver",
    ],
};

/// Runs the builder of the packed tables.
pub const PYTHON: Tool = Tool {
    name: "Python 3.11 or newer",
    purpose: "generate the packed tables",
    debian: "apt-get install python3 python3-venv",
    elsewhere: "take the installer of the Python project",
    variable: "WANDERLIGHT_PYTHON",
    commands: &["python3", "python"],
    places: &["/usr/local/bin/python3"],
};

/// An optimiser outside npm; only looked for when npm's is not there.
pub const OPTIMISER: Tool = Tool {
    name: "The optimiser wasm-opt",
    purpose: "make the shipped module smaller",
    debian: "apt-get install nodejs npm, and the build fetches the pinned one (the package binaryen of Debian 12 is too old)",
    elsewhere: "install Node 20 or newer with npm, or Binaryen 120 or newer",
    variable: "WANDERLIGHT_WASM_OPT",
    commands: &["wasm-opt"],
    places: &[],
};

/// Adds the WebAssembly target to the toolchain.
pub const RUSTUP: Tool = Tool {
    name: "The Rust target wasm32-unknown-unknown",
    purpose: "build the module",
    debian: "install rustup with its own installer and run rustup target add wasm32-unknown-unknown",
    elsewhere: "do the same",
    variable: "WANDERLIGHT_RUSTUP",
    commands: &["rustup"],
    places: &[],
};

impl Tool {
    /// The program, or the sentence that says what is missing.
    pub fn find(&self) -> Result<PathBuf, String> {
        let named = env::var_os(self.variable).map(PathBuf::from);
        let search_path = env::var_os("PATH").unwrap_or_default();
        let on_path = self.commands.iter().flat_map(|command| {
            env::split_paths(&search_path)
                .flat_map(|folder| {
                    ["", ".exe", ".cmd"].map(|ending| folder.join(format!("{command}{ending}")))
                })
                .collect::<Vec<_>>()
        });
        named
            .into_iter()
            .chain(on_path)
            .chain(self.places.iter().map(PathBuf::from))
            .find(|path| path.is_file())
            .ok_or_else(|| self.missing())
    }

    /// What is missing, what it is for, and how to install it.
    pub fn missing(&self) -> String {
        format!(
            "{} is missing; it is needed to {}. On Debian: {}; elsewhere: {}.",
            self.name, self.purpose, self.debian, self.elsewhere
        )
    }
}

/// Node of a version that the tests can run on.
pub fn node() -> Result<PathBuf, String> {
    let path = NODE.find()?;
    let version = process::capture(Command::new(&path).arg("--version"))?;
    match major_version(&version) {
        Some(major) if major >= 20 => Ok(path),
        _ => Err(format!("{} Found only {}.", NODE.missing(), version.trim())),
    }
}

/// The first number of a version such as `v20.11.1` or `wasm-opt version 132`.
pub fn major_version(text: &str) -> Option<u32> {
    let start = text.find(|letter: char| letter.is_ascii_digit())?;
    let digits = &text[start..];
    let end = digits
        .find(|letter: char| !letter.is_ascii_digit())
        .unwrap_or(digits.len());
    digits[..end].parse().ok()
}

#[cfg(test)]
mod tests {
    use super::*;

    const ALL: [&Tool; 7] = [
        &NODE,
        &NPM,
        &CHROMIUM,
        &CHROMEDRIVER,
        &PYTHON,
        &OPTIMISER,
        &RUSTUP,
    ];

    #[test]
    fn a_missing_tool_gets_purpose_and_both_ways_to_install() {
        let none = Tool {
            commands: &["no-such-tool"],
            places: &["/no/such/place"],
            variable: "NO_SUCH_VARIABLE",
            ..CHROMIUM
        };
        assert_eq!(
            none.find().unwrap_err(),
            "Chromium is missing; it is needed to run the browser tests. On Debian: apt-get install chromium; \
             elsewhere: install Chromium or Chrome from its maker, or name the program in WANDERLIGHT_CHROMIUM."
        );
        for tool in ALL {
            let sentence = tool.missing();
            assert!(
                sentence.contains(" is needed to ")
                    && sentence.contains("On Debian: ")
                    && sentence.contains("elsewhere: ")
            );
            assert!(
                !sentence.contains('\n') && sentence.ends_with('.') && !sentence.ends_with(".."),
                "{sentence}"
            );
        }
    }

    #[test]
    fn a_program_on_the_search_path_is_found() {
        let cargo = Tool {
            commands: &["no-such-tool", "cargo"],
            places: &[],
            variable: "NO_SUCH_VARIABLE",
            ..NODE
        };
        assert!(cargo.find().unwrap().is_file());
    }

    #[test]
    fn versions() {
        assert_eq!(major_version("v20.11.1\n"), Some(20));
        assert_eq!(major_version("wasm-opt version 132"), Some(132));
        assert_eq!(major_version("unknown"), None);
    }
}
