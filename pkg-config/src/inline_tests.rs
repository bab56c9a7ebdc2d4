//! Tests of the one-file page, on a folder of made-up files.

use super::*;

fn read(path: &str) -> Result<Vec<u8>, String> {
    let text = match path {
        "element.js" => {
            "import init from './glue.js'; import { s } from \"./parts/shadow.js\"; init(s);"
        }
        "parts/shadow.js" => "import '../glue.js'; export const s = 1;",
        "glue.js" => "export default (x) => new URL('m.wasm', import.meta.url);",
        "plain.js" => "window.ready = true;",
        "far.js" => "import 'https://example.org/far.js';",
        "page.css" => "p { background: url(#a); }",
        "far.css" => "p { background: url('https://example.org/far.png'); }",
        "mark.svg" => "<svg/>",
        "m.wasm" => "\0asm",
        other => return Err(format!("{other} cannot be read.")),
    };
    Ok(text.as_bytes().to_vec())
}

fn inlined(page: &str) -> Result<String, String> {
    single_page(page, "m.wasm", &read)
}

/// The sources in the page's import map by name.
fn map_of(page: &str) -> BTreeMap<String, String> {
    let script = tags(page)
        .into_iter()
        .find(|tag| tag.attribute("type") == Some("importmap"))
        .unwrap();
    let map: serde_json::Value = serde_json::from_str(&page[script.content]).unwrap();
    let imports = map["imports"].as_object().unwrap();
    let decode = |address: &serde_json::Value| {
        let data = address
            .as_str()
            .unwrap()
            .strip_prefix("data:text/javascript;base64,")
            .unwrap();
        String::from_utf8(STANDARD.decode(data).unwrap()).unwrap()
    };
    imports
        .iter()
        .map(|(name, address)| (name.clone(), decode(address)))
        .collect()
}

#[test]
fn modules_become_bare_names_in_a_map() {
    let page = inlined(
        "<head><script type=\"module\" src=\"./element.js\"></script></head><body>text</body>",
    )
    .unwrap();
    let map = map_of(&page);
    assert_eq!(
        map.keys().collect::<Vec<_>>(),
        [
            "wanderlight/element.js",
            "wanderlight/glue.js",
            "wanderlight/parts/shadow.js"
        ]
    );
    assert!(map["wanderlight/element.js"].starts_with(
        "import init from 'wanderlight/glue.js'; import { s } from \"wanderlight/parts/shadow.js\""
    ));
    assert!(map["wanderlight/parts/shadow.js"].starts_with("import 'wanderlight/glue.js'"));
    assert!(page.contains("<script type=\"module\">import \"wanderlight/element.js\";</script>"));
    assert!(page.find("importmap") < page.find("type=\"module\""));
    let wasm = format!(
        "<script type=\"application/wasm\" id=\"wanderlight-wasm\">{}</script>\n</body>",
        STANDARD.encode("\0asm")
    );
    assert!(page.contains(&wasm), "{page}");
}

#[test]
fn inline_modules_classic_scripts_styles_and_pictures() {
    let page = inlined(
        "<link rel=stylesheet href=page.css media=\"print\"><link rel=\"modulepreload\" href=\"glue.js\">\
         <link rel=\"icon\" href=\"mark.svg\"><script src=\"plain.js\"></script>\
         <script type=\"module\">import go from \"./glue.js\"; go();</script><img src=\"mark.svg\" alt=\"\">",
    )
    .unwrap();
    assert!(
        page.contains("<style media=\"print\">\np { background: url(#a); }\n</style>"),
        "{page}"
    );
    assert!(
        page.contains("<script>window.ready = true;</script>"),
        "{page}"
    );
    assert!(
        page.contains(
            "<script type=\"module\">import go from \"wanderlight/glue.js\"; go();</script>"
        ),
        "{page}"
    );
    assert!(!page.contains("modulepreload"));
    let picture = format!("data:image/svg+xml;base64,{}", STANDARD.encode("<svg/>"));
    assert_eq!(page.matches(&picture).count(), 2, "{page}");
}

#[test]
fn outside_links_and_links_within_the_page_stay() {
    let page = "<a href=\"https://example.org/\">there</a><a href=\"#top\">up</a><link rel=\"license\" href=\"https://example.org/l\">";
    assert!(inlined(page).unwrap().contains(page));
}

#[test]
fn whatever_would_be_loaded_is_named() {
    for (page, what) in [
        (
            "<img src=\"https://example.org/a.png\">",
            "https://example.org/a.png",
        ),
        ("<img srcset=\"a.png 2x\">", "a.png 2x"),
        ("<iframe src=\"other.html\"></iframe>", "other.html"),
        ("<a href=\"other.html\">other</a>", "other.html"),
        ("<link rel=\"manifest\" href=\"m.json\">", "m.json"),
        (
            "<link rel=\"stylesheet\" href=\"far.css\">",
            "https://example.org/far.png",
        ),
        ("<style>@import 'x.css';</style>", "@import 'x.css';"),
        ("<p style=\"background: url(x.png)\">", "x.png"),
        (
            "<script type=\"module\" src=\"far.js\"></script>",
            "https://example.org/far.js",
        ),
        (
            "<script type=\"module\" src=\"absent.js\"></script>",
            "absent.js",
        ),
        (
            "<script src=\"https://example.org/a.js\"></script>",
            "https://example.org/a.js",
        ),
    ] {
        let complaint = inlined(page).expect_err(page);
        assert!(complaint.contains(what), "{complaint}");
    }
}
