//! Which module may know which: from the bottom to the top, each line only those above it in this list or beside it.

/// Ranks from the bottom up. Modules of one rank may know each other.
const ORDER: [&[&str]; 10] = [
    &["error", "quantity", "body"],
    &["time", "series", "frames"],
    &["ephemeris"],
    &["photometry"],
    &["place"],
    &["circumstances"],
    &["events"],
    &["explain"],
    &["chart"],
    &["widget"],
];

/// What the crate's root re-exports, and where it lives.
const AT_ROOT: [(&str, &str); 9] = [
    ("Body", "body"),
    ("Error", "error"),
    ("Code", "error"),
    ("Utc", "time"),
    ("Place", "place"),
    ("Circumstances", "circumstances"),
    ("Series", "circumstances"),
    ("circumstances", "circumstances"),
    ("series", "series"),
];

fn rank(module: &str) -> Option<usize> {
    ORDER.iter().position(|level| level.contains(&module))
}

/// The crate's modules that a piece of code names through `crate::`, single or in braces.
pub(crate) fn named(code: &str) -> Vec<String> {
    let mut found = Vec::new();
    for rest in code.split("crate::").skip(1) {
        match rest.strip_prefix('{') {
            Some(list) => found.extend(first_words(list)),
            None => found.extend(word(rest)),
        }
    }
    found
}

/// The first word of every entry of a brace list, nested lists left out.
fn first_words(list: &str) -> Vec<String> {
    let mut depth = 0;
    let mut entry = String::new();
    let mut entries = Vec::new();
    for letter in list.chars() {
        match letter {
            '{' => depth += 1,
            '}' if depth == 0 => break,
            '}' => depth -= 1,
            ',' if depth == 0 => entries.push(std::mem::take(&mut entry)),
            _ if depth == 0 => entry.push(letter),
            _ => {}
        }
    }
    entries.push(entry);
    entries.iter().filter_map(|entry| word(entry)).collect()
}

fn word(text: &str) -> Option<String> {
    let word: String = text
        .trim_start()
        .chars()
        .take_while(|letter| letter.is_alphanumeric() || *letter == '_')
        .collect();
    (!word.is_empty()).then_some(word)
}

/// Imports of one file under src/ that point upwards.
pub(crate) fn against_the_order(path: &str, code: &str) -> Vec<String> {
    let Some(module) = path
        .strip_prefix("src/")
        .and_then(|rest| rest.split(['/', '.']).next())
    else {
        return Vec::new();
    };
    if module == "lib" {
        return Vec::new();
    }
    let Some(own) = rank(module) else {
        return vec![format!("{path}: module {module} has no rank in the order")];
    };
    let home = |name: &str| {
        AT_ROOT
            .iter()
            .find(|(root, _)| *root == name)
            .map_or(name.to_owned(), |(_, home)| (*home).to_owned())
    };
    let mut found = Vec::new();
    for name in named(code) {
        match rank(&home(&name)) {
            Some(other) if other > own => {
                found.push(format!("{path}: {module} knows crate::{name}"))
            }
            Some(_) => {}
            None => found.push(format!(
                "{path}: crate::{name} is not in the order or among the root's names"
            )),
        }
    }
    found
}

#[test]
fn planted_imports_are_seen() {
    let code = "use crate::{Body, time::{Tt, Utc}, chart::draw};\nuse crate::error::Error;\nlet x = crate::widget::run();";
    assert_eq!(named(code), ["Body", "time", "chart", "error", "widget"]);
    assert_eq!(against_the_order("src/frames/mod.rs", code).len(), 2);
    assert!(against_the_order("src/widget/mod.rs", code).is_empty());
    assert_eq!(against_the_order("src/stray.rs", code).len(), 1);
}
