//! What a language has to say: one method per phrase, so that word order is the language's own affair.
//!
//! Numbers, dates and units arrive as finished strings. `English` in `english.rs` is the reference.

use super::plan::{PlanLabels, PlanStory};
use crate::body::Body;
use crate::events::Kind;

/// Ready strings about one instant.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Told {
    /// Date, as in "24 November 2026".
    pub date: String,
    /// Lit share, as in "23 %".
    pub lit: String,
    /// Diameter with its unit spelled out.
    pub diameter: String,
    /// Magnitude as a bare number, as in "−4.9"; empty where there is none.
    pub magnitude: String,
}

/// What the trade-off shows at the chosen date.
#[derive(Debug, Clone, PartialEq, Eq)]
pub enum Story {
    /// A star of its own: no phase.
    OwnLight(Told),
    /// The published law has no value here.
    NoMagnitude(Told),
    /// On the flat top of a peak, as a crescent.
    BrightestCrescent(Told),
    /// On the flat top of a peak, more than half lit.
    BrightestRound(Told),
    /// Less lit and larger than at the peak (second), and fainter.
    ThinnerThanPeak(Told, Told),
    /// More lit and smaller than at the peak (second), and fainter.
    FullerThanPeak(Told, Told),
    /// Always almost fully lit: size decides; with the peak where the span has one.
    SizeDecides(Told, Option<Told>),
    /// Always about the same size: phase decides.
    PhaseDecides(Told),
    /// None of the above; with the peak where the span has one.
    Plain(Told, Option<Told>),
}

/// Shape of the lit part.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum DiscStory {
    /// Below 45 % lit.
    Crescent,
    /// 45 to 55 % lit.
    Half,
    /// Above 55 % and below 97 % lit.
    Gibbous,
    /// From 97 % lit.
    AlmostFull,
    /// Lit to within what is printed.
    Full,
    /// Shining by itself.
    OwnLight,
}

/// What is up in the pictures of the disc.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Orientation {
    /// The celestial pole of the north.
    NorthUp,
    /// The observer's zenith.
    ZenithUp,
}

/// Columns of the table of readings.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Column {
    /// Date.
    Date,
    /// Lit share of the disc.
    Lit,
    /// Apparent diameter.
    Diameter,
    /// Lit area, square seconds of arc.
    AreaArcsec2,
    /// Lit area, square minutes of arc.
    AreaArcmin2,
    /// Magnitude.
    Magnitude,
    /// Angle from the Sun.
    Elongation,
    /// Why the row is there.
    Remark,
}

/// Every phrase of the pictures, in one language.
pub trait Words {
    /// The body inside a sentence: "Venus", "the Moon".
    fn body(&self, body: Body) -> &'static str;
    /// The body as a heading: "Venus", "Moon".
    fn body_heading(&self, body: Body) -> &'static str;

    /// A percentage.
    fn percent(&self, number: &str) -> String;
    /// Less than a quantity.
    fn less_than(&self, quantity: &str) -> String;
    /// Seconds of arc, short, as in a label.
    fn arcseconds_short(&self, number: &str) -> String;
    /// Minutes of arc, short.
    fn arcminutes_short(&self, number: &str) -> String;
    /// Seconds of arc, spelled out.
    fn arcseconds(&self, number: &str) -> String;
    /// Minutes of arc, spelled out.
    fn arcminutes(&self, number: &str) -> String;
    /// Square seconds of arc, short.
    fn square_arcseconds_short(&self, number: &str) -> String;
    /// Square minutes of arc, short.
    fn square_arcminutes_short(&self, number: &str) -> String;
    /// Degrees.
    fn degrees(&self, number: &str) -> String;
    /// A magnitude with its word.
    fn magnitude(&self, number: &str) -> String;
    /// Stands where the published law gives no magnitude.
    fn no_magnitude(&self) -> &'static str;
    /// Stands where there is no value.
    fn no_value(&self) -> &'static str;

    /// Name of the strip with the lit share.
    fn strip_lit(&self) -> &'static str;
    /// Name of the strip with the diameter.
    fn strip_size(&self) -> &'static str;
    /// Name of the strip with the lit area.
    fn strip_area(&self) -> &'static str;
    /// Name of the strip with the magnitude.
    fn strip_brightness(&self) -> &'static str;
    /// A diameter as a reading: "43″ across".
    fn across(&self, diameter: &str) -> String;
    /// Area of the whole disc as a remark.
    fn whole_disc(&self, area: &str) -> String;
    /// The product that gives the lit area: share and area of the disc as bare number.
    fn product(&self, lit: &str, disc_area: &str) -> String;
    /// Label of the magnitude axis: which way is brighter.
    fn brighter(&self) -> &'static str;
    /// Remark on the magnitude scale.
    fn smaller_is_brighter(&self) -> &'static str;
    /// Name of the peak with date and magnitude (bare number).
    fn peak(&self, date: &str, magnitude: &str) -> String;
    /// Flatness of the peak in whole days; `days` is the number as written.
    fn flatness(&self, days: &str, count: u32) -> String;
    /// The same where the whole span is as bright.
    fn flat_throughout(&self) -> &'static str;
    /// Name of the greatest lit area with its date; a term of the trade for Mercury and Venus.
    fn greatest_area(&self, body: Body, date: &str) -> String;

    /// A lit share as a reading: "23 % lit".
    fn lit(&self, share: &str) -> String;
    /// Stands for the lit share of a body that has none.
    fn own_light(&self) -> &'static str;
    /// Which way is up in the pictures of the disc.
    fn orientation(&self, orientation: Orientation) -> &'static str;
    /// Scale bar: its length and the share of the Moon's width, as the number that divides it.
    fn scale_bar(&self, length: &str, moon_divisor: &str) -> String;
    /// Label at the edge of the Moon.
    fn moon_edge(&self) -> &'static str;

    /// One or two sentences on what the trade-off shows.
    fn tradeoff(&self, body: Body, story: &Story) -> String;
    /// One or two sentences on what the disc shows; `moon_divisor` says how often it fits the Moon's width, and
    /// `ring_opening` is there for Saturn.
    fn disc(
        &self,
        body: Body,
        told: &Told,
        shape: DiscStory,
        moon_divisor: &str,
        ring_opening: Option<&str>,
    ) -> String;
    /// What a screen reader hears when the date moves: lit share where there is one, diameter spelled out, magnitude
    /// with its word.
    fn announce(&self, date: &str, lit: Option<&str>, diameter: &str, magnitude: &str) -> String;

    /// Caption of the table: body, first and last date.
    fn table_caption(&self, body: Body, from: &str, to: &str) -> String;
    /// Head of a column.
    fn column(&self, column: Column) -> &'static str;
    /// Remark of the chosen row.
    fn remark_chosen(&self) -> &'static str;
    /// Remark of a peak's row.
    fn remark_peak(&self) -> &'static str;

    /// Accessible name of the trade-off picture.
    fn picture_tradeoff(&self, body: Body) -> String;
    /// Accessible name of the disc picture.
    fn picture_disc(&self, body: Body) -> String;
    /// Accessible name of the plan.
    fn picture_plan(&self, body: Body) -> String;

    /// The plan's fixed words.
    fn plan_labels(&self) -> PlanLabels;
    /// The angle from the Sun at the Earth, with its name.
    fn elongation(&self, angle: &str) -> String;
    /// The name of a turning point.
    fn turning_point(&self, kind: Kind) -> String;
    /// A turning point with its date.
    fn dated(&self, name: &str, date: &str) -> String;
    /// Where the planet stands, and what that makes of its lit half.
    fn plan(&self, body: Body, story: PlanStory, told: &Told, elongation: &str) -> String;
}
