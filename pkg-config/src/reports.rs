//! `cargo widget accuracy`, `bench` and `tables`.

use crate::assemble;
use crate::process;
use crate::suite;
use crate::tools::PYTHON;
use crate::workspace::{Workspace, cargo, read};
use crate::{freshness, tools};
use std::path::Path;
use std::process::Command;

/// Runs the comparison with the reference data and prints its tables.
pub fn accuracy(workspace: &Workspace) -> Result<(), String> {
    let output = process::capture(
        cargo()
            .args([
                "test",
                "--quiet",
                "--package",
                "wanderlight",
                "--test",
                "accuracy",
                "--",
                "--nocapture",
                "--test-threads=1",
            ])
            .current_dir(&workspace.root),
    )?;
    let table = table_lines(&output);
    if table.is_empty() {
        return Err(format!("The comparison printed no table:\n{output}"));
    }
    println!("{table}");
    Ok(())
}

/// The Markdown tables of an output, with one empty line between two tables.
fn table_lines(output: &str) -> String {
    let mut tables: Vec<Vec<&str>> = Vec::new();
    let mut inside = false;
    for line in output.lines() {
        let is_row = line.starts_with('|');
        match tables.last_mut() {
            Some(table) if is_row && inside => table.push(line),
            _ if is_row => tables.push(vec![line]),
            _ => {}
        }
        inside = is_row;
    }
    tables
        .iter()
        .map(|table| table.join("\n"))
        .collect::<Vec<_>>()
        .join("\n\n")
}

/// Builds, then measures speed in Node and the browser.
pub fn bench(workspace: &Workspace, arguments: &[String]) -> Result<(), String> {
    assemble::build(workspace)?;
    let mut command = suite::node_in(workspace)?;
    suite::name_browser(&mut command)?;
    process::run(command.arg("tests/bench/bench.mjs").args(arguments))
}

/// Runs the builder of the packed tables in a Python environment with its pinned packages.
pub fn tables(workspace: &Workspace, arguments: &[String]) -> Result<(), String> {
    let folder = workspace.settings().join("tables");
    let environment = workspace.target.join("tables-venv");
    let python = python_environment(&environment, &folder.join("requirements.txt"))?;
    process::run(
        Command::new(python)
            .arg(folder.join("build.py"))
            .args(arguments)
            .current_dir(&workspace.root),
    )
}

fn python_environment(
    environment: &Path,
    requirements: &Path,
) -> Result<std::path::PathBuf, String> {
    let programs = environment.join(if cfg!(windows) { "Scripts" } else { "bin" });
    let python = programs.join("python");
    let stamp = environment.join("requirements-fingerprint");
    let fingerprint = freshness::fingerprint(&[&read(requirements)?]);
    if !freshness::is_fresh(&stamp, &fingerprint, &[]) {
        let system = PYTHON.find()?;
        process::capture(Command::new(system).args(["-m", "venv"]).arg(environment))
            .map_err(|complaint| format!("{complaint}\n{}", tools::PYTHON.missing()))?;
        println!("Installing the packages of {}", requirements.display());
        process::run(
            Command::new(&python)
                .args([
                    "-m",
                    "pip",
                    "install",
                    "--quiet",
                    "--disable-pip-version-check",
                    "--requirement",
                ])
                .arg(requirements),
        )?;
        freshness::note(&stamp, &fingerprint)?;
    }
    Ok(python)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn only_tables_are_kept() {
        let output = "running 1 test\n| a | b |\n|---|---|\n| 1 | 2 |\nbetween\n| c |\n|---|\ntest result: ok\n";
        assert_eq!(
            table_lines(output),
            "| a | b |\n|---|---|\n| 1 | 2 |\n\n| c |\n|---|"
        );
        assert_eq!(table_lines("running 1 test\n"), "");
    }
}
