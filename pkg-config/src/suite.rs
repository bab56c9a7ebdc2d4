//! `cargo widget test`: every test of the project, and one closing line.

use crate::arguments::Part;
use crate::assemble::{self, Optimisation};
use crate::counts::{self, Counts};
use crate::npm;
use crate::pins::Pins;
use crate::process;
use crate::size;
use crate::tools::{self, CHROMEDRIVER, CHROMIUM};
use crate::workspace::{Workspace, cargo};
use std::path::{Path, PathBuf};
use std::process::{Command, ExitCode};

/// Runs all parts, or one, in a fixed order; a failing part does not keep the next from running.
pub fn test(workspace: &Workspace, only: Option<Part>) -> Result<ExitCode, String> {
    let wanted = |part| only.is_none_or(|only| only == part);
    let mut sum = Counts::default();
    if wanted(Part::Native) {
        // Package by package: together, cargo would unify their features and compile the tool's dependencies again.
        for package in ["wanderlight", "wanderlight-pack"] {
            heading(&format!("Native tests of {package}"));
            sum += counted(native(workspace, package));
        }
    }
    if only != Some(Part::Native) {
        heading("Build");
        match assemble::build(workspace) {
            Ok(optimisation) => {
                for part in [Part::Module, Part::Browser, Part::Size]
                    .into_iter()
                    .filter(|part| wanted(*part))
                {
                    sum += on_build(workspace, part, &optimisation);
                }
            }
            Err(sentence) => sum += failed(&sentence),
        }
    }
    println!("\n{}", sum.closing_line());
    Ok(if sum.failed == 0 {
        ExitCode::SUCCESS
    } else {
        ExitCode::FAILURE
    })
}

fn on_build(workspace: &Workspace, part: Part, optimisation: &Optimisation) -> Counts {
    match part {
        Part::Native => Counts::default(),
        Part::Module => {
            heading("Module tests in Node");
            let mut sum = counted(node_tests(workspace, "tests/module", &mut |_| Ok(())));
            heading("Type check of a consumer");
            sum += counted(type_check(workspace));
            sum
        }
        Part::Browser => {
            heading("Browser tests");
            counted(node_tests(workspace, "tests/browser", &mut name_browser))
        }
        Part::Size => {
            heading("Sizes against their pins");
            counted(sizes(workspace, optimisation))
        }
    }
}

fn heading(text: &str) {
    println!("\n== {text}");
}

/// A part that could not run at all is one failure with its sentence.
fn counted(result: Result<Counts, String>) -> Counts {
    result.unwrap_or_else(|sentence| failed(&sentence))
}

fn failed(sentence: &str) -> Counts {
    println!("FAILED: {sentence}");
    Counts::FAILED
}

fn native(workspace: &Workspace, package: &str) -> Result<Counts, String> {
    let mut command = cargo();
    command
        .args(["test", "--no-fail-fast", "--package", package])
        .current_dir(&workspace.root);
    let echoed = process::echo(&mut command)?;
    Ok(counts::of_cargo(&echoed.text).confirmed(echoed.success))
}

fn node_tests(
    workspace: &Workspace,
    folder: &str,
    prepare: &mut dyn FnMut(&mut Command) -> Result<(), String>,
) -> Result<Counts, String> {
    let files = test_files(&workspace.root.join(folder))?;
    let mut command = node_in(workspace)?;
    prepare(&mut command)?;
    // One file at a time: two browsers at once slow each other down into timeouts on a small machine.
    command
        .args(["--test", "--test-reporter=spec", "--test-concurrency=1"])
        .args(files);
    let echoed = process::echo(&mut command)?;
    Ok(counts::of_node(&echoed.text).confirmed(echoed.success))
}

/// Node with the packages of the tests installed and the environment that tests and benches read.
pub fn node_in(workspace: &Workspace) -> Result<Command, String> {
    let node = tools::node()?;
    npm::install(&workspace.root.join("tests"))?;
    let mut command = Command::new(node);
    command
        .current_dir(&workspace.root)
        .env("WANDERLIGHT_DIST", workspace.dist())
        // The driver is found by us; selenium must neither look for another nor report its use.
        .env("SE_OFFLINE", "true")
        .env("SE_AVOID_STATS", "true");
    Ok(command)
}

/// Tells tests and benches where the browser and its driver are.
pub fn name_browser(command: &mut Command) -> Result<(), String> {
    command.env("WANDERLIGHT_CHROMIUM", CHROMIUM.find()?);
    command.env("WANDERLIGHT_CHROMEDRIVER", CHROMEDRIVER.find()?);
    Ok(())
}

/// The files `*.test.mjs` and `*.test.js` of a folder; other files are what they share.
fn test_files(folder: &Path) -> Result<Vec<PathBuf>, String> {
    let none = || {
        format!(
            "{} has no file that ends with .test.mjs or .test.js.",
            folder.display()
        )
    };
    let entries = std::fs::read_dir(folder).map_err(|_| none())?;
    let mut files: Vec<PathBuf> = entries
        .filter_map(|entry| Some(entry.ok()?.path()))
        .filter(|path| {
            let name = path
                .file_name()
                .map(|name| name.to_string_lossy().into_owned())
                .unwrap_or_default();
            name.ends_with(".test.mjs") || name.ends_with(".test.js")
        })
        .collect();
    files.sort();
    if files.is_empty() {
        Err(none())
    } else {
        Ok(files)
    }
}

fn type_check(workspace: &Workspace) -> Result<Counts, String> {
    let mut command = node_in(workspace)?;
    command.arg("tests/node_modules/typescript/bin/tsc").args([
        "--strict",
        "--project",
        "tests/module/tsconfig.json",
    ]);
    let echoed = process::echo(&mut command)?;
    println!(
        "consumer.ts {}",
        if echoed.success {
            "agrees with wanderlight.d.ts"
        } else {
            "FAILED"
        }
    );
    Ok(if echoed.success {
        Counts::PASSED
    } else {
        Counts::FAILED
    })
}

fn sizes(workspace: &Workspace, optimisation: &Optimisation) -> Result<Counts, String> {
    if let Optimisation::LeftOut(sentence) = optimisation {
        return Err(format!(
            "The pinned sizes are those of an optimised module. {sentence}"
        ));
    }
    let pins = Pins::read(workspace)?;
    let mut sum = Counts::default();
    for item in size::measure(workspace)?
        .iter()
        .filter(|item| item.is_pinned)
    {
        match pins.judge(&item.name, item.sizes.brotli) {
            Ok(()) => {
                println!("{} ok: {} bytes compressed", item.name, item.sizes.brotli);
                sum += Counts::PASSED;
            }
            Err(sentence) => sum += failed(&sentence),
        }
    }
    Ok(sum)
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::workspace::write;

    #[test]
    fn only_test_files_are_run_and_an_empty_folder_is_an_error() {
        let folder = std::env::temp_dir().join(format!("wanderlight-suite-{}", std::process::id()));
        assert!(test_files(&folder).is_err());
        write(&folder.join("page.mjs"), b"").unwrap();
        assert!(test_files(&folder).unwrap_err().contains(".test.mjs"));
        write(&folder.join("b.test.mjs"), b"").unwrap();
        write(&folder.join("a.test.js"), b"").unwrap();
        let names: Vec<_> = test_files(&folder)
            .unwrap()
            .iter()
            .map(|path| path.file_name().unwrap().to_owned())
            .collect();
        assert_eq!(names, ["a.test.js", "b.test.mjs"]);
        std::fs::remove_dir_all(&folder).unwrap();
    }

    #[test]
    fn a_part_that_cannot_run_is_a_failure() {
        assert_eq!(counted(Err("Chromium is missing.".into())), Counts::FAILED);
        assert_eq!(counted(Ok(Counts::PASSED)), Counts::PASSED);
    }
}
