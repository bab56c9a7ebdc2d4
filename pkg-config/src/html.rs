//! Finding the tags of a page: as much of HTML as the project's own pages use.

use std::ops::Range;

/// A start tag, or the end tag of a name beginning with `/`.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Tag {
    /// Lower case.
    pub name: String,
    /// Names in lower case, values with the five basic character references replaced.
    pub attributes: Vec<(String, String)>,
    /// Where the tag stands in the page, angle brackets included.
    pub range: Range<usize>,
    /// The raw text between a script or style tag and its end tag; empty for other tags.
    pub content: Range<usize>,
}

impl Tag {
    /// The value of an attribute.
    pub fn attribute(&self, name: &str) -> Option<&str> {
        self.attributes
            .iter()
            .find(|(found, _)| found == name)
            .map(|(_, value)| value.as_str())
    }
}

/// Every tag of a page in order; comments and the text of scripts and styles are passed over.
pub fn tags(page: &str) -> Vec<Tag> {
    let mut found = Vec::new();
    let mut at = 0;
    while let Some(start) = page[at..].find('<').map(|offset| at + offset) {
        let rest = &page[start..];
        if rest.starts_with("<!--") {
            at = rest
                .find("-->")
                .map_or(page.len(), |offset| start + offset + 3);
        } else if rest[1..]
            .starts_with(|letter: char| letter.is_ascii_alphabetic() || letter == '/')
        {
            let mut tag = tag_at(page, start);
            at = tag.range.end;
            if matches!(tag.name.as_str(), "script" | "style") {
                let end = end_of_raw_text(page, at, &tag.name);
                tag.content = at..end;
                at = end;
            }
            found.push(tag);
        } else {
            at = start + 1;
        }
    }
    found
}

fn end_of_raw_text(page: &str, from: usize, name: &str) -> usize {
    let closing = format!("</{name}");
    // ASCII lowering keeps every byte's place.
    page[from..]
        .to_ascii_lowercase()
        .find(&closing)
        .map_or(page.len(), |offset| from + offset)
}

fn tag_at(page: &str, start: usize) -> Tag {
    let bytes = page.as_bytes();
    let mut at = start + 1;
    while at < bytes.len()
        && !bytes[at].is_ascii_whitespace()
        && bytes[at] != b'>'
        && (bytes[at] != b'/' || at == start + 1)
    {
        at += 1;
    }
    let name = page[start + 1..at].to_ascii_lowercase();
    let mut attributes = Vec::new();
    while at < bytes.len() && bytes[at] != b'>' {
        if bytes[at].is_ascii_whitespace() || bytes[at] == b'/' {
            at += 1;
            continue;
        }
        let begin = at;
        while at < bytes.len()
            && !bytes[at].is_ascii_whitespace()
            && !matches!(bytes[at], b'=' | b'>' | b'/')
        {
            at += 1;
        }
        let attribute = page[begin..at].to_ascii_lowercase();
        while at < bytes.len() && bytes[at].is_ascii_whitespace() {
            at += 1;
        }
        let mut value = "";
        if bytes.get(at) == Some(&b'=') {
            at += 1;
            while at < bytes.len() && bytes[at].is_ascii_whitespace() {
                at += 1;
            }
            (value, at) = value_at(page, at);
        } else if at == begin {
            at += 1; // a stray sign that cannot begin a name
        }
        attributes.push((attribute, plain(value)));
    }
    let end = (at + 1).min(bytes.len());
    Tag {
        name,
        attributes,
        range: start..end,
        content: end..end,
    }
}

/// The attribute value that begins here, and where the page goes on after it.
fn value_at(page: &str, at: usize) -> (&str, usize) {
    let rest = &page[at..];
    match rest.chars().next() {
        Some(quote @ ('"' | '\'')) => {
            let end = rest[1..]
                .find(quote)
                .map_or(rest.len(), |offset| offset + 1);
            (&rest[1.min(end)..end], (at + end + 1).min(page.len()))
        }
        _ => {
            let end = rest
                .find(|letter: char| letter.is_ascii_whitespace() || letter == '>')
                .unwrap_or(rest.len());
            (&rest[..end], at + end)
        }
    }
}

fn plain(value: &str) -> String {
    [
        ("&lt;", "<"),
        ("&gt;", ">"),
        ("&quot;", "\""),
        ("&#39;", "'"),
        ("&amp;", "&"),
    ]
    .iter()
    .fold(value.to_string(), |text, (reference, sign)| {
        text.replace(reference, sign)
    })
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn attributes_of_every_spelling() {
        let page = "<P a = 'one' B=\"t&amp;wo\" c=three d><br/></P>";
        let found = tags(page);
        assert_eq!(
            found
                .iter()
                .map(|tag| tag.name.as_str())
                .collect::<Vec<_>>(),
            ["p", "br", "/p"]
        );
        let first = &found[0];
        assert_eq!(
            ["a", "b", "c", "d", "e"].map(|name| first.attribute(name)),
            [Some("one"), Some("t&wo"), Some("three"), Some(""), None]
        );
        assert_eq!(
            &page[first.range.clone()],
            "<P a = 'one' B=\"t&amp;wo\" c=three d>"
        );
    }

    #[test]
    fn comments_scripts_and_bare_signs_are_no_tags() {
        let page = "<!-- <a> --> 1 < 2 <script>if (a<b) '<i>'</SCRIPT><style>p > a {}</style>é<em>";
        let found = tags(page);
        let names: Vec<_> = found.iter().map(|tag| tag.name.as_str()).collect();
        assert_eq!(names, ["script", "/script", "style", "/style", "em"]);
        assert_eq!(&page[found[0].content.clone()], "if (a<b) '<i>'");
    }

    #[test]
    fn broken_pages_end() {
        for page in [
            "<",
            "<a",
            "<a href",
            "<a href=",
            "<a href=\"x",
            "<a =>",
            "<script>",
            "<!--",
            "<a / =",
        ] {
            assert!(tags(page).len() <= 1, "{page}");
        }
    }
}
