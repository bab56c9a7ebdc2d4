//! The files of the repository and the code in them.

use std::path::Path;

/// A file with its text; the path is relative to the root, with forward slashes.
pub(crate) struct Source {
    /// Where it lies.
    pub(crate) path: String,
    /// What it holds.
    pub(crate) text: String,
}

/// Folders that hold what tools make or fetch.
const NOT_OURS: [&str; 7] = [
    "target",
    "dist",
    ".git",
    "node_modules",
    "__pycache__",
    ".pytest_cache",
    "screenshots",
];

/// Every file that is the project's own.
pub(crate) fn files() -> Vec<String> {
    let mut found = Vec::new();
    walk(Path::new(env!("CARGO_MANIFEST_DIR")), "", &mut found);
    assert!(found.len() > 20, "the repository was not found");
    found.sort();
    found
}

fn walk(root: &Path, below: &str, found: &mut Vec<String>) {
    let entries =
        std::fs::read_dir(root.join(below)).unwrap_or_else(|why| panic!("{below}: {why}"));
    for entry in entries.map(|entry| entry.expect("a directory entry")) {
        let name = entry.file_name().to_string_lossy().into_owned();
        let path = if below.is_empty() {
            name.clone()
        } else {
            format!("{below}/{name}")
        };
        let kind = entry.file_type().expect("a kind of file");
        if kind.is_dir() && !NOT_OURS.contains(&name.as_str()) {
            walk(root, &path, found);
        } else if kind.is_file() {
            found.push(path);
        }
    }
}

/// The text of a file of the repository.
pub(crate) fn read(path: &str) -> String {
    let bytes = std::fs::read(Path::new(env!("CARGO_MANIFEST_DIR")).join(path))
        .unwrap_or_else(|why| panic!("{path}: {why}"));
    String::from_utf8(bytes).unwrap_or_default()
}

fn ends_with_any(path: &str, endings: &[&str]) -> bool {
    endings.iter().any(|ending| path.ends_with(ending))
}

/// Code that people write and read.
pub(crate) fn is_source(path: &str) -> bool {
    ends_with_any(path, &[".rs", ".py", ".js", ".mjs", ".ts", ".css", ".html"]) || path == ".ci/run"
}

/// Anything that people read.
pub(crate) fn is_text(path: &str) -> bool {
    is_source(path) || ends_with_any(path, &[".md", ".toml", ".json", ".txt", ".yml"])
}

/// Made by a builder, as the first line says.
pub(crate) fn is_generated(source: &Source) -> bool {
    source
        .text
        .lines()
        .next()
        .is_some_and(|line| line.contains("build.py"))
}

/// The part of a file before its unit tests, which stand last.
pub(crate) fn without_tests(text: &str) -> &str {
    text.find("#[cfg(test)]").map_or(text, |end| &text[..end])
}

/// The code without line comments and documentation.
pub(crate) fn code_lines(text: &str) -> String {
    text.lines()
        .map(|line| line.find("//").map_or(line, |end| &line[..end]))
        .fold(String::new(), |code, line| code + line + "\n")
}

#[test]
fn comments_and_tests_are_cut_away() {
    let text = "use a; // not b\n/// nor c\nfn d() {}\n#[cfg(test)]\nmod tests { use e; }\n";
    assert_eq!(code_lines(without_tests(text)), "use a; \n\nfn d() {}\n");
}
