//! The tool behind `cargo widget`: builds, serves, tests and measures Wanderlight.
//!
//! It knows the outside tools (bindgen, optimiser, browser, Node) and their versions; the library knows none of them.
//! Nothing in the library may depend on this package.

mod arguments;
mod assemble;
mod bindgen;
mod compile;
mod counts;
mod freshness;
mod html;
mod inline;
mod minify;
mod modules;
mod npm;
mod optimise;
mod pins;
mod process;
mod reports;
mod serve;
mod size;
mod suite;
mod tools;
mod workspace;

use arguments::Command;
use std::process::ExitCode;
use workspace::Workspace;

fn main() -> ExitCode {
    let given: Vec<String> = std::env::args().skip(1).collect();
    match arguments::parse(&given).and_then(carry_out) {
        Ok(code) => code,
        Err(sentence) => {
            eprintln!("{sentence}");
            ExitCode::FAILURE
        }
    }
}

fn carry_out(command: Command) -> Result<ExitCode, String> {
    if let Command::Help = command {
        println!("{}", arguments::HELP);
        return Ok(ExitCode::SUCCESS);
    }
    let workspace = Workspace::find()?;
    match command {
        Command::Help => {}
        Command::Open { port, browser } => {
            assemble::build(&workspace)?;
            serve::serve(&workspace.dist(), port, browser)?;
        }
        Command::Build => {
            assemble::build(&workspace)?;
        }
        Command::Test { only } => return suite::test(&workspace, only),
        Command::Size(mode) => size::print(&workspace, mode)?,
        Command::Accuracy => reports::accuracy(&workspace)?,
        Command::Bench(rest) => reports::bench(&workspace, &rest)?,
        Command::Tables(rest) => reports::tables(&workspace, &rest)?,
    }
    Ok(ExitCode::SUCCESS)
}
