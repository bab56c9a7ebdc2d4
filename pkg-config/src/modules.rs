//! Which files a JavaScript module imports.

use std::collections::BTreeMap;
use std::ops::Range;

/// The places of all module names in `source` that lead to a file or an address: what follows `from`, `import` and
/// `import(` in quotes and begins like a path. Bare names are left out: they are not files.
pub fn specifiers(source: &str) -> Vec<Range<usize>> {
    let mut found: Vec<Range<usize>> = ["from", "import"]
        .iter()
        .flat_map(|keyword| {
            source
                .match_indices(keyword)
                .map(|(at, word)| (at, at + word.len()))
        })
        .filter(|(at, _)| {
            !source[..*at]
                .ends_with(|letter: char| letter.is_alphanumeric() || "_$.".contains(letter))
        })
        .filter_map(|(_, end)| quoted_after(source, end))
        .filter(|range| leads_to_file(&source[range.clone()]))
        .collect();
    found.sort_by_key(|range| range.start);
    found
}

fn leads_to_file(name: &str) -> bool {
    name.starts_with(['.', '/']) || (name.contains("://") && !name.contains(char::is_whitespace))
}

/// The inside of the quotes that follow, after spaces and at most one bracket.
fn quoted_after(source: &str, at: usize) -> Option<Range<usize>> {
    let rest = source[at..].trim_start();
    let rest = rest.strip_prefix('(').map_or(rest, str::trim_start);
    let quote = rest
        .chars()
        .next()
        .filter(|letter| matches!(letter, '"' | '\''))?;
    let begin = source.len() - rest.len() + 1;
    let length = source[begin..].find([quote, '\n'])?;
    source[begin + length..]
        .starts_with(quote)
        .then_some(begin..begin + length)
}

/// Replaces each module name by what `rename` makes of it.
pub fn rewrite(
    source: &str,
    rename: impl Fn(&str) -> Result<String, String>,
) -> Result<String, String> {
    let mut rewritten = String::with_capacity(source.len());
    let mut copied = 0;
    for range in specifiers(source) {
        rewritten.push_str(&source[copied..range.start]);
        rewritten.push_str(&rename(&source[range.clone()])?);
        copied = range.end;
    }
    rewritten.push_str(&source[copied..]);
    Ok(rewritten)
}

/// The file that `name` means inside the file `importer`, both relative to one folder that they may not leave.
pub fn resolve(importer: &str, name: &str) -> Result<String, String> {
    let outside = || format!("{importer} refers to `{name}`, which is not a file of this folder.");
    if name.starts_with('/') || name.contains(':') || name.contains(['?', '#']) {
        return Err(outside());
    }
    let mut parts: Vec<&str> = importer.split('/').collect();
    parts.pop();
    for part in name.split('/') {
        match part {
            "" | "." => {}
            ".." => {
                parts.pop().ok_or_else(outside)?;
            }
            _ => parts.push(part),
        }
    }
    Ok(parts.join("/"))
}

/// The module `entry` and everything it imports, as path and source.
pub fn reachable(
    entry: &str,
    read: &dyn Fn(&str) -> Result<String, String>,
) -> Result<BTreeMap<String, String>, String> {
    let mut found = BTreeMap::new();
    let mut waiting = vec![entry.to_string()];
    while let Some(path) = waiting.pop() {
        if found.contains_key(&path) {
            continue;
        }
        let source = read(&path)?;
        for range in specifiers(&source) {
            waiting.push(resolve(&path, &source[range])?);
        }
        found.insert(path, source);
    }
    Ok(found)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn every_form_of_import_is_found() {
        let source = "import init, { A } from \"./a.js\";\nimport './b.js';\nexport * from '../c.js';\n\
            const d = await import( \"./d.js\" );\nArray.from(\"./not.js\"); import bare from 'bare'; x = 'from here';\n\
            import far from \"https://example.org/e.js\"; const important = './not.js';";
        let names: Vec<_> = specifiers(source)
            .into_iter()
            .map(|range| &source[range])
            .collect();
        assert_eq!(
            names,
            [
                "./a.js",
                "./b.js",
                "../c.js",
                "./d.js",
                "https://example.org/e.js"
            ]
        );
    }

    #[test]
    fn names_are_replaced_in_place() {
        let rewritten = rewrite("import a from './a.js'; go();", |name| {
            Ok(name.replace("./", "x/"))
        })
        .unwrap();
        assert_eq!(rewritten, "import a from 'x/a.js'; go();");
    }

    #[test]
    fn paths_stay_in_the_folder() {
        assert_eq!(resolve("a/b.js", "./c.js"), Ok("a/c.js".into()));
        assert_eq!(resolve("a/b.js", "../c.js"), Ok("c.js".into()));
        for name in ["../c.js", "/c.js", "https://example.org/c.js", "./c.js?x"] {
            assert!(resolve("b.js", name).unwrap_err().contains(name));
        }
    }

    #[test]
    fn imports_are_followed_through_circles() {
        let read = |path: &str| match path {
            "a.js" => Ok("import './b/b.js'".to_string()),
            "b/b.js" => Ok("import '../a.js'; import './c.js'".to_string()),
            "b/c.js" => Ok(String::new()),
            other => Err(format!("{other} cannot be read.")),
        };
        let found = reachable("a.js", &read).unwrap();
        assert_eq!(
            found.keys().collect::<Vec<_>>(),
            ["a.js", "b/b.js", "b/c.js"]
        );
        assert!(reachable("z.js", &read).is_err());
    }
}
