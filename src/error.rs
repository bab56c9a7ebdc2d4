//! The one error type: a stable code for programs, a sentence for people.

use std::fmt;

/// Why a request was refused.
///
/// `code` never changes once released; the message is one sentence that says what is allowed.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Error {
    code: Code,
    message: String,
}

/// Stable codes of [`Error`], spelled in kebab case at the module's edge.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
#[non_exhaustive]
pub enum Code {
    /// The body is not one of those that the ephemeris knows.
    UnknownBody,
    /// The text is no instant or date, or the number is not finite.
    BadInstant,
    /// The instant lies outside the span that the series are valid for.
    OutOfSpan,
    /// Latitude, longitude or height is not finite or out of range.
    BadPlace,
    /// A step, span or count is not finite, not positive, or too long.
    BadStep,
    /// An option has a value that is not among those allowed.
    BadOption,
    /// The picture could not be drawn on the surface given.
    Drawing,
}

impl Code {
    /// The code as the module spells it.
    pub const fn as_str(self) -> &'static str {
        match self {
            Code::UnknownBody => "unknown-body",
            Code::BadInstant => "bad-instant",
            Code::OutOfSpan => "out-of-span",
            Code::BadPlace => "bad-place",
            Code::BadStep => "bad-step",
            Code::BadOption => "bad-option",
            Code::Drawing => "drawing",
        }
    }
}

impl Error {
    /// An error with its code and a sentence that says what is allowed.
    #[cold]
    pub fn new(code: Code, message: impl Into<String>) -> Self {
        Self {
            code,
            message: message.into(),
        }
    }

    /// The stable code.
    pub fn code(&self) -> Code {
        self.code
    }

    /// The sentence for people.
    pub fn message(&self) -> &str {
        &self.message
    }
}

impl fmt::Display for Error {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(&self.message)
    }
}

impl std::error::Error for Error {}

/// Names with commas between them.
pub(crate) fn listed<'a>(names: impl Iterator<Item = &'a str>) -> String {
    let mut list = String::new();
    for name in names {
        if !list.is_empty() {
            list.push_str(", ");
        }
        list.push_str(name);
    }
    list
}

/// What was typed, in quotes, cut so that a pasted page does not become the message.
pub(crate) fn quoted(text: &str) -> String {
    let mut shown: String = text.trim().chars().take(40).collect();
    shown.insert(0, '"');
    shown.push('"');
    shown
}
