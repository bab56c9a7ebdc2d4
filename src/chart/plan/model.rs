//! What the plan needs to know: two orbits, two places, the disc, the turning points, and every text.

use super::super::Viewport;
use super::super::axis::{DateAxis, Span};
use super::super::disc::{Disc, DiscSample, breadth, widest_arcsec};
use super::super::pen::Point;
use super::layout::Layout;
use super::projection::Projection;
use crate::circumstances::Series;
use crate::explain::{DateForm, Figures, PlanLabels, Reading, elongation};
use crate::quantity::hypotenuse;
use crate::time::Utc;

/// Both orbits as closed paths of points seen from the north, in au from the Sun; x to the right, y up.
#[derive(Debug, Clone, Default)]
pub struct PlanPaths {
    /// The Earth's.
    pub earth_au: Vec<[f64; 2]>,
    /// The planet's.
    pub planet_au: Vec<[f64; 2]>,
}

/// A turning point of the span.
#[derive(Debug, Clone)]
pub struct PlanMark {
    /// When.
    pub utc: Utc,
    /// Its name, as in "greatest brightness".
    pub name: String,
    /// Where the planet stands then, on the axes of the paths.
    pub planet_au: [f64; 2],
}

/// The chosen moment.
#[derive(Debug, Clone, Copy)]
pub struct PlanSample<'a> {
    /// The disc as it is seen.
    pub disc: DiscSample<'a>,
    /// Where the Earth stands, on the axes of the paths.
    pub earth_au: [f64; 2],
    /// Where the planet stands.
    pub planet_au: [f64; 2],
}

/// What a pointer takes hold of.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum PlanGrip {
    /// The line of dates.
    Dates,
    /// The Earth.
    Earth,
    /// The planet.
    Planet,
}

/// The plan of one planet over one span.
#[derive(Debug, Clone)]
pub struct PlanModel {
    pub(in crate::chart) span: Span,
    pub(super) axis: DateAxis,
    pub(super) paths: PlanPaths,
    pub(super) projection: Projection,
    pub(super) marks: Vec<Mark>,
    pub(super) labels: PlanLabels,
    pub(super) name: &'static str,
    pub(super) largest_radius_arcsec: f64,
    pub(super) largest_extent_arcsec: f64,
    pub(super) chosen: Chosen,
}

#[derive(Debug, Clone)]
pub(super) struct Mark {
    pub(super) day: f64,
    pub(super) planet_au: [f64; 2],
    pub(super) name: String,
    pub(super) dated: String,
}

#[derive(Debug, Clone)]
pub(super) struct Chosen {
    pub(super) earth_au: [f64; 2],
    pub(super) planet_au: [f64; 2],
    pub(super) disc: Disc,
    pub(super) date: String,
    pub(super) lines: [String; 3],
    pub(super) elongation: String,
}

impl PlanModel {
    /// The plan of a span of days; marks stand in order of time.
    pub fn new(
        series: &Series,
        paths: PlanPaths,
        marks: &[PlanMark],
        chosen: &PlanSample<'_>,
        figures: Figures<'_>,
    ) -> PlanModel {
        let span = Span::of(&series.utc);
        let widest_arcsec = widest_arcsec(series);
        let mark = |mark: &PlanMark| Mark {
            day: mark.utc.days_since_j2000(),
            planet_au: mark.planet_au,
            name: mark.name.clone(),
            dated: figures
                .words
                .dated(&mark.name, &figures.date(mark.utc, DateForm::Day)),
        };
        PlanModel {
            span,
            axis: DateAxis::new(span, figures),
            projection: Projection::of(&paths),
            paths,
            marks: marks
                .iter()
                .map(mark)
                .filter(|mark| span.holds(mark.day))
                .collect(),
            labels: figures.words.plan_labels(),
            name: figures.words.body_heading(series.body),
            largest_radius_arcsec: widest_arcsec / 2.0,
            largest_extent_arcsec: widest_arcsec * breadth(series.body),
            chosen: Chosen::new(chosen, figures),
        }
    }

    /// Moves the chosen date.
    pub fn set_chosen(&mut self, sample: &PlanSample<'_>, figures: Figures<'_>) {
        self.chosen = Chosen::new(sample, figures);
    }

    /// What lies under a pointer; bodies and their orbits come before the dates.
    pub fn grip_at(&self, pointer: Point, view: &Viewport) -> Option<PlanGrip> {
        const BODY: f64 = 26.0;
        const ORBIT: f64 = 10.0;
        let layout = Layout::new(view.width_css, view.height_css);
        if pointer.1 >= layout.handle_top {
            return Some(PlanGrip::Dates);
        }
        let distance = |au: [f64; 2]| {
            let (x, y) = self.projection.place(au, &layout);
            hypotenuse(x - pointer.0, y - pointer.1)
        };
        let nearest = |path: &[[f64; 2]]| {
            path.iter()
                .map(|&au| distance(au))
                .fold(f64::INFINITY, f64::min)
        };
        let travellers = [
            (
                PlanGrip::Planet,
                self.chosen.planet_au,
                &self.paths.planet_au,
            ),
            (PlanGrip::Earth, self.chosen.earth_au, &self.paths.earth_au),
        ];
        let by_body = travellers
            .iter()
            .map(|&(grip, at, _)| (grip, distance(at)))
            .filter(|&(_, away)| away <= BODY)
            .min_by(|a, b| a.1.total_cmp(&b.1));
        let by_orbit = || {
            travellers
                .iter()
                .map(|&(grip, _, path)| (grip, nearest(path)))
                .find(|&(_, away)| away <= ORBIT)
        };
        by_body.or_else(by_orbit).map(|(grip, _)| grip)
    }

    /// Direction of a pointer from the Sun, from x towards y as the paths count.
    pub fn direction_at_rad(&self, pointer: Point, view: &Viewport) -> f64 {
        let (x, y) = Layout::new(view.width_css, view.height_css).centre;
        (y - pointer.1).atan2(pointer.0 - x)
    }

    /// The turning point nearest to the chosen date.
    pub(super) fn nearest_mark(&self) -> Option<&Mark> {
        let away = |mark: &Mark| (mark.day - self.chosen.disc.day).abs();
        self.marks.iter().min_by(|a, b| away(a).total_cmp(&away(b)))
    }
}

impl Chosen {
    fn new(sample: &PlanSample<'_>, figures: Figures<'_>) -> Chosen {
        let facts = sample.disc.circumstances;
        let reading = Reading::new(sample.disc.utc, facts);
        let disc = Disc::new(&sample.disc, figures);
        Chosen {
            earth_au: sample.earth_au,
            planet_au: sample.planet_au,
            date: figures.date(sample.disc.utc, DateForm::Day),
            lines: [
                disc.lit.clone(),
                figures.words.across(&disc.size),
                figures.magnitude(reading.magnitude),
            ],
            disc,
            elongation: figures.words.elongation(&elongation(&reading, figures)),
        }
    }
}
