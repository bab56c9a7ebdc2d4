//! Running other programs.

use std::io::{BufRead, BufReader};
use std::process::{Command, Stdio};

/// What a program printed while its lines were passed on, and whether it ended well.
pub struct Echoed {
    pub text: String,
    pub success: bool,
}

/// Runs a program that prints for itself.
pub fn run(command: &mut Command) -> Result<(), String> {
    let status = command
        .status()
        .map_err(|cause| not_started(command, &cause))?;
    if status.success() {
        Ok(())
    } else {
        Err(format!("`{}` failed ({status}).", line_of(command)))
    }
}

/// Runs a program silently and returns what it printed; its complaints become the error.
pub fn capture(command: &mut Command) -> Result<String, String> {
    let output = command
        .stdin(Stdio::null())
        .output()
        .map_err(|cause| not_started(command, &cause))?;
    if output.status.success() {
        Ok(String::from_utf8_lossy(&output.stdout).into_owned())
    } else {
        let complaint = String::from_utf8_lossy(&output.stderr);
        Err(format!(
            "`{}` failed: {}",
            line_of(command),
            complaint.trim()
        ))
    }
}

/// Runs a program, passing its lines on as they come and keeping them.
pub fn echo(command: &mut Command) -> Result<Echoed, String> {
    let mut child = command
        .stdin(Stdio::null())
        .stdout(Stdio::piped())
        .spawn()
        .map_err(|cause| not_started(command, &cause))?;
    let mut text = String::new();
    if let Some(stdout) = child.stdout.take() {
        for line in BufReader::new(stdout).split(b'\n').map_while(Result::ok) {
            let line = String::from_utf8_lossy(&line);
            println!("{line}");
            text.push_str(&line);
            text.push('\n');
        }
    }
    let status = child.wait().map_err(|cause| not_started(command, &cause))?;
    Ok(Echoed {
        text,
        success: status.success(),
    })
}

fn not_started(command: &Command, cause: &std::io::Error) -> String {
    format!("`{}` did not start: {cause}.", line_of(command))
}

fn line_of(command: &Command) -> String {
    let program = std::path::Path::new(command.get_program());
    let name = program.file_name().unwrap_or(command.get_program());
    std::iter::once(name)
        .chain(command.get_args())
        .map(|word| word.to_string_lossy())
        .collect::<Vec<_>>()
        .join(" ")
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::workspace::cargo;

    #[test]
    fn output_is_kept_and_failure_names_the_command() {
        assert!(capture(cargo().arg("--version")).is_ok_and(|text| text.starts_with("cargo ")));
        let complaint = capture(cargo().arg("no-such-subcommand")).unwrap_err();
        assert!(
            complaint.contains("no-such-subcommand` failed: "),
            "{complaint}"
        );
        let complaint = run(&mut Command::new("no-such-program-at-all")).unwrap_err();
        assert!(
            complaint.starts_with("`no-such-program-at-all` did not start"),
            "{complaint}"
        );
    }

    #[test]
    fn echoed_lines_are_kept() {
        let echoed = echo(cargo().arg("--version")).unwrap();
        assert!(echoed.success && echoed.text.starts_with("cargo "));
    }
}
