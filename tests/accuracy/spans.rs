//! The spans of years over which errors are gathered.

/// Which limits hold in a span.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(crate) enum Part {
    /// 1900 to 2100.
    Inner,
    /// 1700 to 2200.
    Checked,
    /// All that is answered.
    Answered,
}

/// A range of calendar years.
pub(crate) struct Span {
    /// Heading of its table.
    pub(crate) title: &'static str,
    /// Which limits hold.
    pub(crate) part: Part,
    years: std::ops::RangeInclusive<i32>,
}

impl Span {
    /// Whether a year belongs to it.
    pub(crate) fn holds(&self, year: i32) -> bool {
        self.years.contains(&year)
    }
}

/// The spans, the narrowest first.
pub(crate) const SPANS: &[Span] = &[
    Span {
        title: "1900 to 2100",
        part: Part::Inner,
        years: 1900..=2100,
    },
    Span {
        title: "1700 to 2200, the checked span",
        part: Part::Checked,
        years: 1700..=2200,
    },
    Span {
        title: "1601 to 2299, the span that is answered",
        part: Part::Answered,
        years: 1601..=2299,
    },
];

/// The Moon's promise covers 1900 to 2050.
pub(crate) const MOON_SPAN: Span = Span {
    title: "1900 to 2050",
    part: Part::Inner,
    years: 1900..=2050,
};
