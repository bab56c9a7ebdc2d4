//! What the disc picture needs to know: phases, sizes and angles at even dates and at the chosen one.

use super::super::axis::Span;
use super::super::pen::Point;
use super::super::shapes::direction;
use crate::body::Body;
use crate::circumstances::{Circumstances, Series};
use crate::explain::{DateForm, Figures, MOON_WIDTH_ARCSEC, Orientation, Reading, moon_divisor};
use crate::time::Utc;

/// Numbers of discs in a row, from narrow to wide.
const ROWS: [usize; 3] = [5, 7, 9];

/// Outer edge of Saturn's A ring in equatorial radii of the planet: 136,780 km over 60,268 km.
pub(in crate::chart) const RING_EDGE: f64 = 136_780.0 / 60_268.0;

/// Largest diameter in a span; above zero, so that scales can be made of it.
pub(in crate::chart) fn widest_arcsec(series: &Series) -> f64 {
    series
        .angular_diameter_arcsec
        .iter()
        .copied()
        .fold(f64::MIN_POSITIVE, f64::max)
}

/// How far a body reaches with its rings, in diameters of its globe.
pub(in crate::chart) fn breadth(body: Body) -> f64 {
    if body == Body::Saturn { RING_EDGE } else { 1.0 }
}

/// Lengths that a scale bar may have.
const BARS_ARCSEC: [f64; 10] = [1.0, 2.0, 5.0, 10.0, 20.0, 30.0, 60.0, 120.0, 300.0, 600.0];

/// One moment to be drawn.
#[derive(Debug, Clone, Copy)]
pub struct DiscSample<'a> {
    /// The instant.
    pub utc: Utc,
    /// What the sky shows then.
    pub circumstances: &'a Circumstances,
    /// Position angle, from celestial north through east, of what is up in the picture: 0 for north up, the
    /// parallactic angle for zenith up.
    pub up_angle_deg: f64,
}

/// The disc picture of one body over one span.
#[derive(Debug, Clone)]
pub struct DiscModel {
    pub(in crate::chart) span: Span,
    pub(super) moon_edge: Option<&'static str>,
    pub(super) largest_extent_arcsec: f64,
    rows: [Vec<Disc>; 3],
    pub(super) chosen: Disc,
    pub(super) chosen_date: String,
    pub(super) chosen_lines: [String; 3],
    /// Scale bars with their labels, shortest first.
    pub(super) bars: Vec<(f64, String)>,
    pub(super) orientation: &'static str,
}

#[derive(Debug, Clone)]
pub(in crate::chart) struct Disc {
    pub(in crate::chart) day: f64,
    pub(in crate::chart) lit_fraction: f64,
    pub(in crate::chart) radius_arcsec: f64,
    /// Direction in the picture of the middle of the lit limb.
    pub(in crate::chart) towards_sun: Point,
    pub(in crate::chart) ring: Option<Ring>,
    pub(in crate::chart) date: String,
    pub(in crate::chart) lit: String,
    pub(in crate::chart) size: String,
}

#[derive(Debug, Clone, Copy)]
pub(in crate::chart) struct Ring {
    /// Direction in the picture of the north pole of the rings.
    pub(super) pole: Point,
    pub(super) opening_deg: f64,
}

impl DiscModel {
    /// The instants that [`DiscModel::new`] wants samples of: rows of 5, 7 and 9 in the middles of equal parts.
    pub fn dates(from: Utc, to: Utc) -> Vec<Utc> {
        let length = to.days_since_j2000() - from.days_since_j2000();
        ROWS.iter()
            .flat_map(|&count| {
                (0..count)
                    .map(move |index| from.plus_days(length * (index as f64 + 0.5) / count as f64))
            })
            .collect()
    }

    /// The picture of a span; `samples` stand in the order of [`DiscModel::dates`].
    pub fn new(
        series: &Series,
        samples: &[DiscSample<'_>],
        chosen: &DiscSample<'_>,
        orientation: Orientation,
        figures: Figures<'_>,
    ) -> DiscModel {
        let words = figures.words;
        let mut rest = samples;
        let rows = ROWS.map(|count| {
            let (row, after) = rest.split_at(count.min(rest.len()));
            rest = after;
            row.iter()
                .map(|sample| Disc::new(sample, figures))
                .collect::<Vec<_>>()
        });
        let widest = widest_arcsec(series);
        let bar = |&arcsec: &f64| {
            let length = if arcsec < 60.0 {
                words.arcseconds_short(&figures.number(arcsec, 0))
            } else {
                words.arcminutes_short(&figures.number(arcsec / 60.0, 0))
            };
            (
                arcsec,
                words.scale_bar(&length, &moon_divisor(arcsec, figures)),
            )
        };
        let mut model = DiscModel {
            span: Span::of(&series.utc),
            // The Moon itself and the Sun are as large as the scale that it would give.
            moon_edge: (widest < MOON_WIDTH_ARCSEC / 2.0).then(|| words.moon_edge()),
            largest_extent_arcsec: widest * breadth(series.body),
            rows,
            chosen: Disc::new(chosen, figures),
            chosen_date: String::new(),
            chosen_lines: Default::default(),
            bars: BARS_ARCSEC.iter().map(bar).collect(),
            orientation: words.orientation(orientation),
        };
        model.set_chosen(chosen, figures);
        model
    }

    /// Moves the chosen date; the row stays as it is.
    pub fn set_chosen(&mut self, sample: &DiscSample<'_>, figures: Figures<'_>) {
        let reading = Reading::new(sample.utc, sample.circumstances);
        self.chosen = Disc::new(sample, figures);
        self.chosen_date = figures.date(sample.utc, DateForm::Day);
        self.chosen_lines = [
            if reading.illuminated_fraction.is_finite() {
                self.chosen.lit.clone()
            } else {
                String::new()
            },
            figures.words.across(&self.chosen.size),
            figures.magnitude(reading.magnitude),
        ];
    }

    /// The row of this many discs.
    pub(super) fn row(&self, count: usize) -> &[Disc] {
        ROWS.iter()
            .position(|&known| known == count)
            .map_or(&[], |index| &self.rows[index])
    }
}

impl Disc {
    pub(in crate::chart) fn new(sample: &DiscSample<'_>, figures: Figures<'_>) -> Disc {
        let facts = sample.circumstances;
        let up = sample.up_angle_deg;
        let ring = facts.axis_angle_deg.zip(facts.ring_opening_deg);
        Disc {
            day: sample.utc.days_since_j2000(),
            // A body of its own light has no phase: all of it shines.
            lit_fraction: facts.illuminated_fraction.unwrap_or(1.0),
            radius_arcsec: facts.angular_diameter_arcsec / 2.0,
            towards_sun: direction(facts.bright_limb_angle_deg.unwrap_or(0.0), up),
            ring: ring.map(|(axis, opening_deg)| Ring {
                pole: direction(axis, up),
                opening_deg,
            }),
            date: figures.date(sample.utc, DateForm::DayMonth),
            lit: facts.illuminated_fraction.map_or(String::new(), |share| {
                figures.words.lit(&figures.lit_share(share))
            }),
            size: figures.diameter(facts.angular_diameter_arcsec),
        }
    }

    /// Full extent, rings included.
    pub(in crate::chart) fn extent_arcsec(&self) -> f64 {
        2.0 * self.radius_arcsec * if self.ring.is_some() { RING_EDGE } else { 1.0 }
    }
}
