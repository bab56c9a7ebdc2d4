//! Rules of the repository, each failing with the file, the line and what stands there.

#[path = "repository/imports.rs"]
mod imports;
#[path = "repository/tree.rs"]
mod tree;

use tree::{Source, code_lines, files, is_source, read, without_tests};

/// Files longer than the rest for a reason.
const LONG_FILES: [(&str, &str); 0] = [];

/// Length from which a file should be split.
const MOST_LINES: usize = 300;

#[track_caller]
fn none_found(rule: &str, found: Vec<String>) {
    assert!(found.is_empty(), "{rule}:\n  {}", found.join("\n  "));
}

/// Every line of the files chosen for which `broken` gives a reason.
fn lines_where(
    sources: impl Iterator<Item = Source>,
    broken: impl Fn(&str) -> Option<String>,
) -> Vec<String> {
    let mut found = Vec::new();
    for source in sources {
        for (number, line) in source.text.lines().enumerate() {
            if let Some(why) = broken(line) {
                found.push(format!("{}:{}: {why}", source.path, number + 1));
            }
        }
    }
    found
}

fn sources(chosen: impl Fn(&str) -> bool) -> impl Iterator<Item = Source> {
    files()
        .into_iter()
        .filter(move |path| chosen(path))
        .map(|path| Source {
            text: read(&path),
            path,
        })
}

fn is_rust_of_core(path: &str) -> bool {
    path.starts_with("src/") && path.ends_with(".rs") && !path.starts_with("src/widget/")
}

/// The code of a file without comments and unit tests, as lines.
fn bare(source: Source) -> Source {
    Source {
        text: code_lines(without_tests(&source.text)),
        path: source.path,
    }
}

#[test]
fn imports_run_one_way() {
    let mut found = Vec::new();
    for source in sources(|path| path.starts_with("src/") && path.ends_with(".rs")).map(bare) {
        found.extend(imports::against_the_order(&source.path, &source.text));
    }
    none_found("a module imports one that stands above it", found);
}

#[test]
fn only_the_widget_knows_the_browser() {
    let names = [
        "wasm_bindgen",
        "web_sys",
        "js_sys",
        "serde_wasm_bindgen",
        "plotters_canvas",
    ];
    none_found(
        "a browser crate outside src/widget",
        lines_where(sources(is_rust_of_core).map(bare), |line| {
            names
                .iter()
                .find(|name| line.contains(*name))
                .map(|name| (*name).to_owned())
        }),
    );
}

#[test]
fn the_core_is_a_function_of_its_input() {
    let names = [
        "SystemTime",
        "Instant::now",
        "std::env",
        "std::fs",
        "std::net",
        "std::process",
        "std::thread",
        "println!",
        "dbg!",
    ];
    none_found(
        "the core reads or writes the world around it",
        lines_where(sources(is_rust_of_core).map(bare), |line| {
            names
                .iter()
                .find(|name| line.contains(*name))
                .map(|name| (*name).to_owned())
        }),
    );
}

#[test]
fn nothing_panics_on_purpose() {
    let names = [
        ".unwrap()",
        ".expect(",
        "panic!(",
        "unreachable!(",
        "unsafe ",
    ];
    none_found(
        "a panic that input might reach",
        lines_where(
            sources(|path| path.starts_with("src/") && path.ends_with(".rs")).map(bare),
            |line| {
                names
                    .iter()
                    .find(|name| line.contains(*name))
                    .map(|name| (*name).to_owned())
            },
        ),
    );
}

#[test]
fn files_stay_short() {
    let mut found = Vec::new();
    for source in sources(is_source) {
        let lines = source.text.lines().count();
        let excused =
            LONG_FILES.iter().any(|(path, _)| *path == source.path) || tree::is_generated(&source);
        if lines > MOST_LINES && !excused {
            found.push(format!("{}: {lines} lines", source.path));
        }
    }
    found.extend(
        LONG_FILES
            .iter()
            .filter(|(path, _)| read(path).lines().count() <= MOST_LINES)
            .map(|(path, why)| format!("{path} is short now; excuse gone: {why}")),
    );
    none_found("files above 300 lines", found);
}

#[test]
fn every_rust_file_says_what_it_is() {
    let mut found = Vec::new();
    for source in sources(|path| path.ends_with(".rs")) {
        let first = source.text.lines().next().unwrap_or_default();
        if !(first.starts_with("//! ") || tree::is_generated(&source)) {
            found.push(format!("{}: begins with {first:?}", source.path));
        }
    }
    none_found("no module documentation on the first line", found);
}

#[test]
fn nothing_is_left_for_later() {
    // Put together here so that this file does not hold the words itself.
    let words = [
        ["TO", "DO"],
        ["FIX", "ME"],
        ["XX", "X:"],
        ["to", "do!"],
        ["unimple", "mented!"],
        ["#[ig", "nore"],
        ["test.sk", "ip("],
        ["it.sk", "ip("],
        ["skip: tr", "ue"],
    ];
    let words = words.map(|halves| halves.concat());
    none_found(
        "unfinished or switched off",
        lines_where(sources(is_source), |line| {
            words.iter().find(|word| line.contains(*word)).cloned()
        }),
    );
}

#[test]
fn the_project_speaks_of_itself_alone() {
    let words = [
        ["../sha", "red"],
        ["/wo", "rk/"],
        ["/tmp/w", "l-"],
        ["/tmp/br", "ief"],
    ]
    .map(|halves| halves.concat());
    none_found(
        "a path of someone's machine",
        lines_where(sources(tree::is_text), |line| {
            words.iter().find(|word| line.contains(*word)).cloned()
        }),
    );
}

#[test]
fn the_pages_hold_no_astronomy() {
    let names = [
        "Math.sin",
        "Math.cos",
        "Math.tan",
        "Math.asin",
        "Math.acos",
        "Math.atan",
        "Math.PI",
        "Math.log",
        "2451545",
    ];
    let scripts = |path: &str| {
        path.starts_with("www/")
            && (path.ends_with(".js") || path.ends_with(".mjs") || path.ends_with(".html"))
    };
    assert!(
        sources(scripts).next().is_some(),
        "no page found under www/"
    );
    none_found(
        "mathematics of the sky in a page",
        lines_where(sources(scripts), |line| {
            names
                .iter()
                .find(|name| line.contains(*name))
                .map(|name| (*name).to_owned())
        }),
    );
}

#[test]
fn papers_name_commands_that_exist() {
    let tool: String = sources(|path| path.starts_with("pkg-config/src/") && path.ends_with(".rs"))
        .map(|source| source.text)
        .collect();
    let mut found = Vec::new();
    let mut named = 0;
    for paper in ["README.md", "DEVELOPERS.md", ".ci/run"] {
        let text = read(paper);
        for rest in text.split("cargo widget").skip(1) {
            let command: String = rest
                .strip_prefix(' ')
                .unwrap_or_default()
                .chars()
                .take_while(char::is_ascii_lowercase)
                .collect();
            named += 1;
            // Commands stand in the tool as string literals; a bare `cargo widget` in prose is followed by no word or by prose.
            let literal = format!("\"{command}\"");
            let in_code = rest
                .find(['`', '\n'])
                .is_some_and(|end| rest[..end].trim().starts_with(&command));
            if !command.is_empty() && in_code && !tool.contains(&literal) {
                found.push(format!("{paper}: cargo widget {command}"));
            }
        }
    }
    assert!(named > 5, "the papers name only {named} commands");
    none_found("a command that the tool does not know", found);
}

#[test]
fn the_chart_and_binding_crates_are_used() {
    let manifest = read("Cargo.toml");
    let code: String = sources(|path| path.starts_with("src/") && path.ends_with(".rs"))
        .map(|source| code_lines(&source.text))
        .collect();
    let mut found = Vec::new();
    for name in [
        "wasm-bindgen",
        "web-sys",
        "js-sys",
        "plotters",
        "plotters-canvas",
        "serde-wasm-bindgen",
    ] {
        let declared = manifest
            .lines()
            .any(|line| line.split(['=', ' ', '.']).next() == Some(name));
        let path = format!("{}::", name.replace('-', "_"));
        if !declared || !code.contains(&path) {
            found.push(format!(
                "{name}: declared {declared}, used {}",
                code.contains(&path)
            ));
        }
    }
    none_found("a crate of the architecture is missing", found);
}
