//! The pictures' phrases in English.

use super::english_plan;
use super::english_sentences as sentences;
use super::plan::{PlanLabels, PlanStory};
use super::words::{Column, DiscStory, Orientation, Story, Told, Words};
use crate::body::Body;
use crate::events::Kind;

/// English.
#[derive(Debug, Clone, Copy, PartialEq, Eq, Default)]
pub struct English;

impl Words for English {
    fn body(&self, body: Body) -> &'static str {
        match body {
            Body::Sun => "the Sun",
            Body::Moon => "the Moon",
            _ => self.body_heading(body),
        }
    }

    fn body_heading(&self, body: Body) -> &'static str {
        match body {
            Body::Sun => "Sun",
            Body::Moon => "Moon",
            Body::Mercury => "Mercury",
            Body::Venus => "Venus",
            Body::Mars => "Mars",
            Body::Jupiter => "Jupiter",
            Body::Saturn => "Saturn",
            Body::Uranus => "Uranus",
            Body::Neptune => "Neptune",
        }
    }

    fn percent(&self, number: &str) -> String {
        format!("{number}\u{a0}%")
    }

    fn less_than(&self, quantity: &str) -> String {
        format!("under {quantity}")
    }

    fn arcseconds_short(&self, number: &str) -> String {
        format!("{number}″")
    }

    fn arcminutes_short(&self, number: &str) -> String {
        format!("{number}′")
    }

    fn arcseconds(&self, number: &str) -> String {
        counted(number, "arcsecond", "arcseconds")
    }

    fn arcminutes(&self, number: &str) -> String {
        counted(number, "arcminute", "arcminutes")
    }

    fn square_arcseconds_short(&self, number: &str) -> String {
        format!("{number}\u{a0}arcsec²")
    }

    fn square_arcminutes_short(&self, number: &str) -> String {
        format!("{number}\u{a0}arcmin²")
    }

    fn degrees(&self, number: &str) -> String {
        format!("{number}°")
    }

    fn magnitude(&self, number: &str) -> String {
        format!("magnitude {number}")
    }

    fn no_magnitude(&self) -> &'static str {
        "magnitude not known"
    }

    fn no_value(&self) -> &'static str {
        "none"
    }

    fn strip_lit(&self) -> &'static str {
        "lit share of the disc"
    }

    fn strip_size(&self) -> &'static str {
        "size of the disc"
    }

    fn strip_area(&self) -> &'static str {
        "lit area in the sky"
    }

    fn strip_brightness(&self) -> &'static str {
        "brightness"
    }

    fn across(&self, diameter: &str) -> String {
        format!("{diameter} across")
    }

    fn whole_disc(&self, area: &str) -> String {
        format!("area {area}")
    }

    fn product(&self, lit: &str, disc_area: &str) -> String {
        format!("{lit} of {disc_area}")
    }

    fn brighter(&self) -> &'static str {
        "brighter"
    }

    fn smaller_is_brighter(&self) -> &'static str {
        "less is brighter"
    }

    fn peak(&self, date: &str, magnitude: &str) -> String {
        format!("brightest: {date}, mag {magnitude}")
    }

    fn flatness(&self, days: &str, count: u32) -> String {
        format!(
            "within 0.1 mag for {days} {}",
            if count == 1 { "day" } else { "days" }
        )
    }

    fn flat_throughout(&self) -> &'static str {
        "within 0.1 mag all the time"
    }

    fn greatest_area(&self, body: Body, date: &str) -> String {
        if body.is_inner_planet() {
            format!("greatest illuminated extent: {date}")
        } else {
            format!("largest lit area: {date}")
        }
    }

    fn lit(&self, share: &str) -> String {
        format!("{share} lit")
    }

    fn own_light(&self) -> &'static str {
        "shines by itself"
    }

    fn orientation(&self, orientation: Orientation) -> &'static str {
        match orientation {
            Orientation::NorthUp => "celestial north up, east left",
            Orientation::ZenithUp => "zenith up, as it stands in the sky",
        }
    }

    fn scale_bar(&self, length: &str, moon_divisor: &str) -> String {
        format!("{length}, about 1/{moon_divisor} of the Moon’s width")
    }

    fn moon_edge(&self) -> &'static str {
        "the Moon’s edge at the same scale"
    }

    fn tradeoff(&self, body: Body, story: &Story) -> String {
        sentences::tradeoff(self.body(body), story)
    }

    fn disc(
        &self,
        body: Body,
        told: &Told,
        shape: DiscStory,
        moon_divisor: &str,
        ring_opening: Option<&str>,
    ) -> String {
        sentences::disc(
            body,
            self.body(body),
            told,
            shape,
            moon_divisor,
            ring_opening,
        )
    }

    fn announce(&self, date: &str, lit: Option<&str>, diameter: &str, magnitude: &str) -> String {
        match lit {
            Some(lit) => format!("{date}: {lit} lit, {diameter} across, {magnitude}"),
            None => format!("{date}: {diameter} across, {magnitude}"),
        }
    }

    fn table_caption(&self, body: Body, from: &str, to: &str) -> String {
        format!("{} from {from} to {to}", self.body_heading(body))
    }

    fn column(&self, column: Column) -> &'static str {
        match column {
            Column::Date => "Date",
            Column::Lit => "Lit share",
            Column::Diameter => "Diameter",
            Column::AreaArcsec2 => "Lit area (arcsec²)",
            Column::AreaArcmin2 => "Lit area (arcmin²)",
            Column::Magnitude => "Magnitude",
            Column::Elongation => "Angle from the Sun",
            Column::Remark => "Remark",
        }
    }

    fn remark_chosen(&self) -> &'static str {
        "chosen"
    }

    fn remark_peak(&self) -> &'static str {
        "brightest"
    }

    fn picture_tradeoff(&self, body: Body) -> String {
        format!(
            "Lit share, size, lit area and brightness of {} against date",
            self.body(body)
        )
    }

    fn picture_disc(&self, body: Body) -> String {
        format!("The disc of {} to scale on several dates", self.body(body))
    }

    fn picture_plan(&self, body: Body) -> String {
        format!(
            "Sun, Earth and {} seen from the north of the Earth’s orbit",
            self.body(body)
        )
    }

    fn plan_labels(&self) -> PlanLabels {
        english_plan::LABELS
    }

    fn elongation(&self, angle: &str) -> String {
        format!("elongation {angle}")
    }

    fn turning_point(&self, kind: Kind) -> String {
        // The contract's names are the English terms with hyphens.
        kind.name().replace('-', " ")
    }

    fn dated(&self, name: &str, date: &str) -> String {
        format!("{name}: {date}")
    }

    fn plan(&self, body: Body, story: PlanStory, told: &Told, elongation: &str) -> String {
        english_plan::sentence(self.body(body), story, told, elongation)
    }
}

fn counted(number: &str, one: &str, many: &str) -> String {
    format!("{number} {}", if number == "1" { one } else { many })
}
