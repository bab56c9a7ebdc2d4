//! What was asked for on the command line.

/// The text of `cargo widget help`.
pub const HELP: &str = "\
cargo widget                  build dist/, serve it on 127.0.0.1 and open the example article
    --port NUMBER             use this port instead of a free one
    --no-open                 only print the address
cargo widget build            build dist/
cargo widget test             run every test: native, module in Node, browser, sizes
    --only PART               native, module, browser or size
cargo widget size             print the sizes of what a page loads
    --pin                     write the measured sizes to pkg-config/pins.json
    --levels                  build at each optimisation level and compare
cargo widget accuracy         print the accuracy table
cargo widget bench            print the speed figures
cargo widget tables           generate the packed tables again; needs Python
    --check                   only prove that the committed tables are what the builder writes";

/// Whether `cargo widget` tries to show the article in the desktop's browser.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Browser {
    Open,
    LeaveClosed,
}

/// One part of the test run.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Part {
    Native,
    Module,
    Browser,
    Size,
}

/// What `cargo widget size` does.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum SizeMode {
    Print,
    Pin,
    Levels,
}

/// A subcommand with its options.
#[derive(Debug, PartialEq, Eq)]
pub enum Command {
    Open { port: Option<u16>, browser: Browser },
    Build,
    Test { only: Option<Part> },
    Size(SizeMode),
    Accuracy,
    Bench(Vec<String>),
    Tables(Vec<String>),
    Help,
}

/// Reads the words after `cargo widget`; the error is a sentence for the terminal.
pub fn parse(words: &[String]) -> Result<Command, String> {
    let words: Vec<&str> = words.iter().map(String::as_str).collect();
    match words.as_slice() {
        ["help" | "-h" | "--help", ..] => Ok(Command::Help),
        ["build"] => Ok(Command::Build),
        ["accuracy"] => Ok(Command::Accuracy),
        ["test"] => Ok(Command::Test { only: None }),
        ["test", "--only", part] => Ok(Command::Test {
            only: Some(parse_part(part)?),
        }),
        ["size"] => Ok(Command::Size(SizeMode::Print)),
        ["size", "--pin"] => Ok(Command::Size(SizeMode::Pin)),
        ["size", "--levels"] => Ok(Command::Size(SizeMode::Levels)),
        ["bench", rest @ ..] => Ok(Command::Bench(owned(rest))),
        ["tables", rest @ ..] => Ok(Command::Tables(owned(rest))),
        [name @ ("build" | "accuracy" | "test" | "size"), ..] => Err(format!(
            "`cargo widget {name}` does not take `{}`; see `cargo widget help`.",
            words[1..].join(" ")
        )),
        [name, ..] if !name.starts_with('-') => Err(format!(
            "`cargo widget {name}` is not known; there are build, test, size, accuracy, bench, tables and help, \
             and `cargo widget` alone builds and serves."
        )),
        options => parse_open(options),
    }
}

fn parse_open(mut options: &[&str]) -> Result<Command, String> {
    let (mut port, mut browser) = (None, Browser::Open);
    while let Some((first, rest)) = options.split_first() {
        options = match (*first, rest.split_first()) {
            ("--no-open", _) => {
                browser = Browser::LeaveClosed;
                rest
            }
            ("--port", Some((number, rest))) => {
                let number = number
                    .parse()
                    .map_err(|_| format!("`--port {number}`: a port is a number from 0 to 65535, where 0 means a free one."))?;
                port = Some(number);
                rest
            }
            ("--port", None) => return Err("`--port` needs a number after it.".into()),
            (other, _) => {
                return Err(format!(
                    "`{other}` is not an option of `cargo widget`; there are --port NUMBER and --no-open."
                ));
            }
        };
    }
    Ok(Command::Open { port, browser })
}

fn parse_part(name: &str) -> Result<Part, String> {
    match name {
        "native" => Ok(Part::Native),
        "module" => Ok(Part::Module),
        "browser" => Ok(Part::Browser),
        "size" => Ok(Part::Size),
        _ => Err(format!(
            "`--only {name}`: the parts are native, module, browser and size."
        )),
    }
}

fn owned(words: &[&str]) -> Vec<String> {
    words.iter().map(|word| (*word).to_string()).collect()
}

#[cfg(test)]
mod tests {
    use super::*;

    fn parsed(line: &str) -> Result<Command, String> {
        parse(&owned(&line.split_whitespace().collect::<Vec<_>>()))
    }

    #[test]
    fn nothing_means_build_and_serve() {
        let want = Command::Open {
            port: None,
            browser: Browser::Open,
        };
        assert_eq!(parsed(""), Ok(want));
        let want = Command::Open {
            port: Some(8080),
            browser: Browser::LeaveClosed,
        };
        assert_eq!(parsed("--no-open --port 8080"), Ok(want));
    }

    #[test]
    fn subcommands_take_their_own_options_only() {
        assert_eq!(
            parsed("test --only browser"),
            Ok(Command::Test {
                only: Some(Part::Browser)
            })
        );
        assert_eq!(parsed("size --levels"), Ok(Command::Size(SizeMode::Levels)));
        assert_eq!(
            parsed("tables --check"),
            Ok(Command::Tables(vec!["--check".into()]))
        );
        assert!(
            parsed("build --release")
                .unwrap_err()
                .contains("`--release`")
        );
        assert!(
            parsed("test --only")
                .unwrap_err()
                .contains("does not take `--only`")
        );
        assert!(
            parsed("test --only all")
                .unwrap_err()
                .contains("native, module, browser and size")
        );
        assert!(parsed("--port many").unwrap_err().contains("65535"));
        assert!(parsed("--port").unwrap_err().contains("needs a number"));
        assert!(parsed("--quick").unwrap_err().contains("--no-open"));
    }

    #[test]
    fn an_unknown_subcommand_gets_the_list() {
        let sentence = parsed("paint").unwrap_err();
        for name in [
            "paint", "build", "test", "size", "accuracy", "bench", "tables",
        ] {
            assert!(sentence.contains(name), "{name} is missing in: {sentence}");
            assert!(
                name == "paint" || HELP.contains(&format!("cargo widget {name}")),
                "{name} is not in the help"
            );
        }
    }
}
