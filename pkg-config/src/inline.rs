//! One page with everything inside: opens from a USB stick with the network off.
//!
//! A browser does not let a page from `file://` import modules or fetch the WebAssembly file. So each module becomes a
//! `data:` address under a bare name in an import map, and the WebAssembly file an inert script element that the
//! custom element looks for by its id.

use crate::html::{Tag, tags};
use crate::modules::{reachable, resolve, rewrite, specifiers};
use base64::Engine;
use base64::engine::general_purpose::STANDARD;
use std::collections::BTreeMap;

/// The id under which `<wander-light>` looks for the WebAssembly file inside the page.
const WASM_ID: &str = "wanderlight-wasm";

/// Reads a file of the folder that the page lies in.
pub type Read<'a> = &'a dyn Fn(&str) -> Result<Vec<u8>, String>;

/// Puts the modules, styles, pictures and the WebAssembly file `wasm` into the page. Fails, naming it, at anything
/// that the page would still load from elsewhere.
pub fn single_page(page: &str, wasm: &str, read: Read) -> Result<String, String> {
    let read_text = |path: &str| {
        String::from_utf8(read(path)?).map_err(|_| format!("{path} is not UTF-8 text."))
    };
    let mut modules = BTreeMap::new();
    let mut body = String::with_capacity(page.len());
    let mut copied = 0;
    let mut first_script = None;
    for tag in tags(page) {
        let Some(Replacement { text, end }) =
            replacement(page, &tag, &read_text, read, &mut modules)?
        else {
            continue;
        };
        body.push_str(&page[copied..tag.range.start]);
        if tag.name == "script" {
            first_script.get_or_insert(body.len());
        }
        body.push_str(&text);
        copied = end;
    }
    body.push_str(&page[copied..]);
    // The map must stand before the first module, the bulky module after the text that is read meanwhile.
    body.insert_str(first_script.unwrap_or(0), &import_map(&modules)?);
    let data = STANDARD.encode(read(wasm)?);
    let script = format!("<script type=\"application/wasm\" id=\"{WASM_ID}\">{data}</script>\n");
    body.insert_str(body.rfind("</body").unwrap_or(body.len()), &script);
    self::verify(&body, &modules)?;
    Ok(body)
}

/// What stands in a tag's place, and where the page goes on.
struct Replacement {
    text: String,
    end: usize,
}

fn replacement(
    page: &str,
    tag: &Tag,
    read_text: &dyn Fn(&str) -> Result<String, String>,
    read: Read,
    modules: &mut BTreeMap<String, String>,
) -> Result<Option<Replacement>, String> {
    let is_module = tag.attribute("type") == Some("module");
    let replace = |text, end| Ok(Some(Replacement { text, end }));
    match (
        tag.name.as_str(),
        tag.attribute("src"),
        tag.attribute("href"),
    ) {
        ("script", Some(src), _) if is_module => {
            let path = resolve("", src)?;
            modules.extend(reachable(&path, read_text)?);
            replace(
                format!("<script type=\"module\">import \"{}\";", bare(&path)),
                tag.content.end,
            )
        }
        ("script", Some(src), _) => {
            let source = read_text(&resolve("", src)?)?;
            if source.contains("</script") {
                return Err(format!(
                    "{src} contains the end tag of a script and cannot be put into a page."
                ));
            }
            replace(format!("<script>{source}"), tag.content.end)
        }
        ("script", None, _) if is_module => {
            let source = &page[tag.content.clone()];
            for range in specifiers(source) {
                modules.extend(reachable(&resolve("", &source[range])?, read_text)?);
            }
            let rewritten = rewrite(source, |name| Ok(bare(&resolve("", name)?)))?;
            replace(
                format!("{}{rewritten}", &page[tag.range.clone()]),
                tag.content.end,
            )
        }
        ("link", _, Some(href)) => match tag.attribute("rel").unwrap_or_default() {
            "stylesheet" => {
                let media = tag
                    .attribute("media")
                    .map_or(String::new(), |media| format!(" media=\"{media}\""));
                let css = read_text(&resolve("", href)?)?;
                replace(
                    format!("<style{media}>\n{}\n</style>", css.trim()),
                    tag.range.end,
                )
            }
            // Hints to fetch early have no sense where nothing is fetched.
            "modulepreload" | "preload" | "prefetch" => replace(String::new(), tag.range.end),
            "icon" if !href.starts_with("data:") => {
                replace(with_data(page, tag, href, read)?, tag.range.end)
            }
            _ => Ok(None),
        },
        ("img" | "source", Some(src), _) if !src.starts_with("data:") => {
            replace(with_data(page, tag, src, read)?, tag.range.end)
        }
        _ => Ok(None),
    }
}

/// The tag with the file it refers to in place of the reference.
fn with_data(page: &str, tag: &Tag, reference: &str, read: Read) -> Result<String, String> {
    let path = resolve("", reference)?;
    let kind = crate::serve::content_type(&path);
    let kind = kind.split(';').next().unwrap_or(kind);
    let address = format!("data:{kind};base64,{}", STANDARD.encode(read(&path)?));
    Ok(page[tag.range.clone()].replacen(reference, &address, 1))
}

/// The name of a module inside the page.
fn bare(path: &str) -> String {
    format!("wanderlight/{path}")
}

fn import_map(modules: &BTreeMap<String, String>) -> Result<String, String> {
    let mut imports = serde_json::Map::new();
    for (path, source) in modules {
        let source = rewrite(source, |name| Ok(bare(&resolve(path, name)?)))?;
        let address = format!("data:text/javascript;base64,{}", STANDARD.encode(source));
        imports.insert(bare(path), address.into());
    }
    let map = serde_json::json!({ "imports": imports });
    Ok(format!("<script type=\"importmap\">{map}</script>\n"))
}

/// Fails at anything in the page that a browser would load from elsewhere.
fn verify(page: &str, modules: &BTreeMap<String, String>) -> Result<(), String> {
    let complain = |tag: &Tag, what: &str| {
        Err(format!(
            "The one-file page would still load `{what}` (in a <{}> tag).",
            tag.name
        ))
    };
    for tag in tags(page) {
        for (name, value) in &tag.attributes {
            let inside = value.is_empty() || value.starts_with("data:") || value.starts_with('#');
            let outside_link = ["https://", "http://", "mailto:"]
                .iter()
                .any(|start| value.starts_with(start));
            let is_link = matches!(tag.name.as_str(), "a" | "area") || is_passive_link(&tag);
            let loads = match name.as_str() {
                "href" | "xlink:href" => !(inside || is_link && outside_link),
                "src" | "srcset" | "poster" | "data" | "action" | "background" => !inside,
                "style" => css_reference(value).is_some(),
                _ => false,
            };
            if loads {
                return complain(&tag, value);
            }
        }
        let content = &page[tag.content.clone()];
        if tag.name == "style"
            && let Some(reference) = css_reference(content)
        {
            return complain(&tag, reference);
        }
        if tag.name == "script"
            && tag.attribute("type") == Some("module")
            && let Some(range) = specifiers(content).into_iter().next()
        {
            return complain(&tag, &content[range]);
        }
    }
    for (path, source) in modules {
        if let Some(range) = specifiers(source)
            .into_iter()
            .find(|range| source[range.clone()].contains(':'))
        {
            return Err(format!(
                "The one-file page would still load `{}` (in {path}).",
                &source[range]
            ));
        }
    }
    Ok(())
}

/// A `<link>` that only tells something about the page.
fn is_passive_link(tag: &Tag) -> bool {
    tag.name == "link"
        && matches!(
            tag.attribute("rel"),
            Some("canonical" | "alternate" | "author" | "license")
        )
}

/// The first thing that a style sheet would load.
fn css_reference(css: &str) -> Option<&str> {
    if let Some(at) = css.find("@import") {
        return css[at..].lines().next();
    }
    css.match_indices("url(")
        .map(|(at, word)| css[at + word.len()..].trim_start_matches([' ', '"', '\'']))
        .find_map(|rest| {
            let end = rest.find(['"', '\'', ')']).unwrap_or(rest.len());
            (!rest.starts_with("data:") && !rest.starts_with('#')).then_some(&rest[..end])
        })
}

#[cfg(test)]
#[path = "inline_tests.rs"]
mod tests;
