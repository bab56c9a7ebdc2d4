//! How many digits a printed figure deserves.
//!
//! - Magnitude: one decimal; the published laws are good to some hundredths at best and 0.1 at worst.
//! - Lit share: whole percent from 10 % up, one decimal below and from 99.5 up; under 0.05 % is
//!   told as "under 0.1 %", since nothing is lit only at the very instant of a conjunction.
//! - Diameter: whole seconds of arc from 10 up, one decimal below; from 120 up in minutes of arc with one decimal.
//! - Area: three digits are enough to follow the product; whole numbers from 100 up, one decimal below.

use super::formats::{DateForm, Formats};
use super::words::Words;
use crate::time::Utc;

/// From this diameter on, sizes are told in minutes of arc.
const ARCMINUTES_FROM_ARCSEC: f64 = 120.0;

/// Figures written with their units by one language and one set of formats.
#[derive(Clone, Copy)]
pub struct Figures<'a> {
    /// Numbers and dates.
    pub formats: &'a dyn Formats,
    /// Units and sentences.
    pub words: &'a dyn Words,
}

impl Figures<'_> {
    /// A bare number; negative ones bear a true minus sign, whatever the formats wrote.
    pub fn number(&self, value: f64, decimals: u8) -> String {
        self.formats
            .number(value, decimals)
            .replace('-', "\u{2212}")
    }

    /// A date in a form.
    pub fn date(&self, utc: Utc, form: DateForm) -> String {
        self.formats.date(utc, form)
    }

    /// Lit share with its sign, or the words for a body that shines by itself.
    pub fn lit_share(&self, fraction: f64) -> String {
        if !fraction.is_finite() {
            return self.words.own_light().to_owned();
        }
        // A share never exceeds the whole, whatever rounding says.
        let percent = 100.0 * fraction.min(1.0);
        if percent < 0.05 {
            return self
                .words
                .less_than(&self.words.percent(&self.number(0.1, 1)));
        }
        let decimals = u8::from(percent < 9.95 || (99.5..99.95).contains(&percent));
        self.words.percent(&self.number(percent, decimals))
    }

    /// Diameter with the short unit, as in a label.
    pub fn diameter(&self, arcsec: f64) -> String {
        if arcsec >= ARCMINUTES_FROM_ARCSEC {
            self.words.arcminutes_short(&self.number(arcsec / 60.0, 1))
        } else {
            self.words
                .arcseconds_short(&self.number(arcsec, Self::arcsec_decimals(arcsec)))
        }
    }

    /// Diameter with the unit spelled out, as in a sentence.
    pub fn diameter_spelled(&self, arcsec: f64) -> String {
        if arcsec >= ARCMINUTES_FROM_ARCSEC {
            self.words.arcminutes(&self.number(arcsec / 60.0, 1))
        } else {
            self.words
                .arcseconds(&self.number(arcsec, Self::arcsec_decimals(arcsec)))
        }
    }

    fn arcsec_decimals(arcsec: f64) -> u8 {
        u8::from(arcsec < 9.95)
    }

    /// Area as a bare number in square seconds of arc, or in square minutes for a large disc.
    pub fn area_number(&self, arcsec2: f64, scale: AreaScale) -> String {
        let value = arcsec2 / scale.arcsec2();
        self.number(value, if value >= 99.95 { 0 } else { 1 })
    }

    /// Area with the short unit.
    pub fn area(&self, arcsec2: f64, scale: AreaScale) -> String {
        let number = self.area_number(arcsec2, scale);
        match scale {
            AreaScale::SquareArcseconds => self.words.square_arcseconds_short(&number),
            AreaScale::SquareArcminutes => self.words.square_arcminutes_short(&number),
        }
    }

    /// Magnitude with its word, or the words for none.
    pub fn magnitude(&self, magnitude: f64) -> String {
        if magnitude.is_finite() {
            self.words.magnitude(&self.number(magnitude, 1))
        } else {
            self.words.no_magnitude().to_owned()
        }
    }
}

/// Unit of an area in the sky.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum AreaScale {
    /// Square seconds of arc.
    SquareArcseconds,
    /// Square minutes of arc.
    SquareArcminutes,
}

impl AreaScale {
    /// The unit that suits a disc of this diameter.
    pub fn for_diameter(arcsec: f64) -> AreaScale {
        if arcsec >= ARCMINUTES_FROM_ARCSEC {
            AreaScale::SquareArcminutes
        } else {
            AreaScale::SquareArcseconds
        }
    }

    /// Square seconds of arc in one unit.
    pub fn arcsec2(self) -> f64 {
        match self {
            AreaScale::SquareArcseconds => 1.0,
            AreaScale::SquareArcminutes => 3600.0,
        }
    }

    /// Seconds of arc in the matching unit of length.
    pub fn arcsec(self) -> f64 {
        match self {
            AreaScale::SquareArcseconds => 1.0,
            AreaScale::SquareArcminutes => 60.0,
        }
    }
}
