//! What the trade-off picture needs to know: four curves, their scales, and finished strings.

use super::super::axis::{DateAxis, Span};
use super::scales::{Curve, brightness, curve, from_zero, largest};
use crate::circumstances::{Circumstances, Series};
use crate::explain::{AreaScale, DateForm, Figures, GreatestExtent, Highlights, Peak, Reading};
use crate::quantity::power;
use crate::time::Utc;
use std::f64::consts::FRAC_PI_4;

/// The trade-off picture of one body over one span.
#[derive(Debug, Clone)]
pub struct TradeoffModel {
    pub(in crate::chart) span: Span,
    pub(super) heading: &'static str,
    pub(super) axis: DateAxis,
    /// Days of the samples.
    pub(super) days: Vec<f64>,
    /// Lit share in percent, diameter, lit area, magnitude.
    pub(super) curves: Box<[Curve; 4]>,
    pub(super) brighter: &'static str,
    pub(super) peaks: Vec<PeakMark>,
    pub(super) extents: Vec<ExtentMark>,
    pub(super) chosen: Chosen,
    area_scale: AreaScale,
    largest_arcsec: f64,
    brightest_magnitude: f64,
}

/// A marked greatest brightness.
#[derive(Debug, Clone)]
pub(super) struct PeakMark {
    pub(super) peak: Peak,
    pub(super) label: String,
    pub(super) short_label: String,
    pub(super) flatness: String,
}

/// A marked greatest lit area; the area in the unit of the labels.
#[derive(Debug, Clone)]
pub(super) struct ExtentMark {
    pub(super) day: f64,
    pub(super) area: f64,
    pub(super) label: String,
    pub(super) short_label: String,
}

/// What depends on the chosen date beside the curves' readings.
#[derive(Debug, Clone)]
pub(super) struct Chosen {
    pub(super) day: f64,
    pub(super) date: String,
    pub(super) lit_fraction: f64,
    /// Diameter as a share of the largest in the span.
    pub(super) size_share: f64,
    /// Light as a share of the greatest in the span; NaN without a magnitude.
    pub(super) light_share: f64,
    /// 1 when the Sun stands to the right of an observer's picture with north up, -1 when to the left.
    pub(super) sunward: f64,
}

impl TradeoffModel {
    /// The picture of a span with its highlights and the chosen instant.
    pub fn new(
        series: &Series,
        highlights: &Highlights,
        chosen_utc: Utc,
        chosen: &Circumstances,
        figures: Figures<'_>,
    ) -> TradeoffModel {
        let words = figures.words;
        let span = Span::of(&series.utc);
        let largest_arcsec = largest(&series.angular_diameter_arcsec);
        let area_scale = AreaScale::for_diameter(largest_arcsec);
        let percent = series
            .illuminated_fraction
            .iter()
            .map(|fraction| 100.0 * fraction)
            .collect();
        let diameters = series
            .angular_diameter_arcsec
            .iter()
            .map(|arcsec| arcsec / area_scale.arcsec())
            .collect();
        let areas = series
            .lit_area_arcsec2
            .iter()
            .map(|arcsec2| arcsec2 / area_scale.arcsec2())
            .collect();
        let number = |value: f64, decimals: u8| figures.number(value, decimals);
        let unit = |value: f64, decimals: u8| match area_scale {
            AreaScale::SquareArcseconds => words.arcseconds_short(&figures.number(value, decimals)),
            AreaScale::SquareArcminutes => words.arcminutes_short(&figures.number(value, decimals)),
        };
        let lit = curve(words.strip_lit(), percent, (0.0, 100.0), |value, _| {
            words.percent(&number(value, 0))
        });
        let size = from_zero(words.strip_size(), diameters, unit);
        let area = from_zero(words.strip_area(), areas, number);
        let light = brightness(words.strip_brightness(), series.magnitude.clone(), number);
        let within = |day: f64| span.holds(day);
        let mut model = TradeoffModel {
            span,
            heading: words.body_heading(series.body),
            axis: DateAxis::new(span, figures),
            days: series
                .utc
                .iter()
                .map(|utc| utc.days_since_j2000())
                .collect(),
            brighter: words.brighter(),
            peaks: (highlights
                .great_peaks()
                .filter(|peak| within(peak.utc.days_since_j2000())))
            .map(|peak| PeakMark::new(peak, span, figures))
            .collect(),
            extents: (highlights
                .extents
                .iter()
                .filter(|extent| within(extent.utc.days_since_j2000())))
            .map(|extent| ExtentMark::new(extent, series.body, area_scale, figures))
            .collect(),
            brightest_magnitude: series.magnitude.iter().copied().fold(f64::NAN, f64::min),
            curves: Box::new([lit, size, area, light]),
            chosen: Chosen::at(chosen_utc, String::new()),
            area_scale,
            largest_arcsec,
        };
        model.set_chosen(chosen_utc, chosen, figures);
        model
    }

    /// Moves the chosen date; the curves stay as they are.
    pub fn set_chosen(&mut self, utc: Utc, circumstances: &Circumstances, figures: Figures<'_>) {
        let reading = Reading::new(utc, circumstances);
        let (words, scale) = (figures.words, self.area_scale);
        let arcsec = reading.angular_diameter_arcsec;
        let disc_area = FRAC_PI_4 * arcsec * arcsec;
        let finite = |value: f64| Some(value).filter(|value| value.is_finite());
        let lit = figures.lit_share(reading.illuminated_fraction);
        let told = [
            (
                finite(100.0 * reading.illuminated_fraction),
                lit.clone(),
                String::new(),
            ),
            (
                finite(arcsec / scale.arcsec()),
                words.across(&figures.diameter(arcsec)),
                words.whole_disc(&figures.area(disc_area, scale)),
            ),
            (
                finite(reading.lit_area_arcsec2 / scale.arcsec2()),
                figures.area(reading.lit_area_arcsec2, scale),
                if reading.illuminated_fraction.is_finite() {
                    words.product(&lit, &figures.area_number(disc_area, scale))
                } else {
                    String::new()
                },
            ),
            (
                finite(reading.magnitude),
                figures.magnitude(reading.magnitude),
                words.smaller_is_brighter().to_owned(),
            ),
        ];
        for (curve, (value, reading, remark)) in self.curves.iter_mut().zip(told) {
            curve.chosen = value;
            curve.reading = reading;
            curve.remark = remark;
        }
        // Pogson: light = 10^(-0.4 magnitude).
        let light_share = power(10.0, -0.4 * (reading.magnitude - self.brightest_magnitude));
        self.chosen = Chosen {
            lit_fraction: reading.illuminated_fraction,
            size_share: arcsec / self.largest_arcsec,
            light_share,
            // East of the Sun the Sun lies to the west, which is the right of a picture with north up.
            sunward: if circumstances.elongation_side == Some("west") {
                -1.0
            } else {
                1.0
            },
            ..Chosen::at(utc, figures.date(utc, DateForm::Day))
        };
    }
}

impl Chosen {
    fn at(utc: Utc, date: String) -> Chosen {
        Chosen {
            day: utc.days_since_j2000(),
            date,
            lit_fraction: f64::NAN,
            size_share: 0.0,
            light_share: f64::NAN,
            sunward: 1.0,
        }
    }
}

impl PeakMark {
    fn new(peak: &Peak, span: Span, figures: Figures<'_>) -> PeakMark {
        let magnitude = figures.number(peak.magnitude, 1);
        let days = peak.flat_days();
        let (from, to) = (
            peak.flat_from.days_since_j2000(),
            peak.flat_to.days_since_j2000(),
        );
        let label = |form: DateForm| {
            figures
                .words
                .peak(&figures.date(peak.utc, form), &magnitude)
        };
        let flatness = if from <= span.from_day && span.to_day <= to {
            figures.words.flat_throughout().to_owned()
        } else {
            figures
                .words
                .flatness(&figures.number(days, 0), days as u32)
        };
        PeakMark {
            peak: *peak,
            label: label(DateForm::Day),
            short_label: label(DateForm::DayMonth),
            flatness,
        }
    }
}

impl ExtentMark {
    fn new(
        extent: &GreatestExtent,
        body: crate::Body,
        scale: AreaScale,
        figures: Figures<'_>,
    ) -> ExtentMark {
        let label = |form: DateForm| {
            figures
                .words
                .greatest_area(body, &figures.date(extent.utc, form))
        };
        ExtentMark {
            day: extent.utc.days_since_j2000(),
            area: extent.lit_area_arcsec2 / scale.arcsec2(),
            label: label(DateForm::Day),
            short_label: label(DateForm::DayMonth),
        }
    }
}
