//! Date and value scales: where ticks fall and which of their labels fit.

use super::ink::Failed;
use super::pen::{Align, Face, Pen};
use super::theme::Colour;
use crate::explain::{DateForm, Figures};
use crate::time::Utc;

/// First and last day of a span, in days since J2000.0.
#[derive(Debug, Clone, Copy, PartialEq)]
pub(super) struct Span {
    pub(super) from_day: f64,
    pub(super) to_day: f64,
}

impl Span {
    pub(super) fn of(instants: &[Utc]) -> Span {
        let day = |utc: Option<&Utc>| utc.map_or(0.0, |utc| utc.days_since_j2000());
        Span {
            from_day: day(instants.first()),
            to_day: day(instants.last()),
        }
    }

    /// Position of a day between two edges, held between them.
    pub(super) fn x_of(&self, day: f64, left: f64, right: f64) -> f64 {
        let length = self.to_day - self.from_day;
        let share = if length > 0.0 {
            ((day - self.from_day) / length).clamp(0.0, 1.0)
        } else {
            0.5
        };
        left + share * (right - left)
    }

    pub(super) fn date_at(&self, x: f64, left: f64, right: f64) -> Option<Utc> {
        if !(x.is_finite() && self.to_day > self.from_day) {
            return None;
        }
        let share = ((x - left) / (right - left)).clamp(0.0, 1.0);
        Some(Utc::from_days_since_j2000(
            self.from_day + share * (self.to_day - self.from_day),
        ))
    }

    pub(super) fn holds(&self, day: f64) -> bool {
        self.from_day <= day && day <= self.to_day
    }
}

#[derive(Debug, Clone, PartialEq)]
struct Tick {
    day: f64,
    /// Counts the unit, so that every second or fifth can be taken.
    count: i32,
    label: String,
    year: Option<String>,
}

/// Candidate ticks of a date axis with their labels, finest first.
#[derive(Debug, Clone, PartialEq)]
pub(super) struct DateAxis {
    days: Vec<Tick>,
    months: Vec<Tick>,
    years: Vec<Tick>,
}

/// Counts from 0 at the first of a month. The 31st counts as -1, which no stride takes: it would crowd the 1st.
fn day_of_month(day: f64) -> i32 {
    match Utc::from_days_since_j2000(day + 0.5).civil().day {
        31 => -1,
        day => i32::from(day) - 1,
    }
}

/// Most labels made of one kind; more never fit.
const MOST_TICKS: f64 = 64.0;

impl DateAxis {
    pub(super) fn new(span: Span, figures: Figures<'_>) -> DateAxis {
        let length = span.to_day - span.from_day;
        let first = Utc::from_days_since_j2000(span.from_day).civil();
        let last = Utc::from_days_since_j2000(span.to_day).civil();
        // Ticks stand at 0h UTC but are named by noon, which is the same date on clocks from UTC-12 to UTC+11 and the
        // same month on all.
        let named =
            |day: f64, form: DateForm| figures.date(Utc::from_days_since_j2000(day + 0.5), form);
        let start = |year: i32, month: i32| {
            Utc::from_civil(year, month as u8, 1, 0.0)
                .ok()
                .map(|utc| utc.days_since_j2000())
                .filter(|&d| span.holds(d))
        };
        let mut axis = DateAxis {
            days: Vec::new(),
            months: Vec::new(),
            years: Vec::new(),
        };
        if length <= MOST_TICKS {
            let midnight = (span.from_day - 0.5).ceil() + 0.5;
            axis.days = (0..=length as i32)
                .map(|index| midnight + f64::from(index))
                .filter(|&day| span.holds(day))
                .map(|day| Tick {
                    day,
                    count: day_of_month(day),
                    label: named(day, DateForm::DayMonth),
                    year: Some(named(day, DateForm::Year)),
                })
                .collect();
        }
        if length <= 30.0 * MOST_TICKS {
            let from = first.year * 12 + i32::from(first.month) - 1;
            let to = last.year * 12 + i32::from(last.month) - 1;
            axis.months = (from..=to)
                .filter_map(|index| {
                    Some((
                        index,
                        start(index.div_euclid(12), index.rem_euclid(12) + 1)?,
                    ))
                })
                .map(|(count, day)| Tick {
                    day,
                    count,
                    label: named(day, DateForm::Month),
                    year: Some(named(day, DateForm::Year)),
                })
                .collect();
        }
        let stride = ((length / 365.25 / MOST_TICKS).ceil() as i32).max(1);
        axis.years = (first.year..=last.year)
            .filter(|year| year.rem_euclid(stride) == 0)
            .filter_map(|year| Some((year, start(year, 1)?)))
            .map(|(count, day)| Tick {
                day,
                count,
                label: named(day, DateForm::Year),
                year: None,
            })
            .collect();
        axis
    }

    /// Draws the finest ticks whose labels have room: a hairline between `top` and `bottom` for each, the labels
    /// below, years in a second line where they begin.
    pub(super) fn draw(&self, pen: &mut Pen<'_>, scale: &Scale, face: Face) -> Result<(), Failed> {
        let choices: [(&[Tick], &[i32]); 3] = [
            (&self.days, &[1, 2, 5, 10]),
            (&self.months, &[1, 2, 3, 6]),
            (&self.years, &[1, 2, 5, 10, 20, 50, 100]),
        ];
        for (ticks, strides) in choices {
            let mut widest: f64 = 0.0;
            for tick in ticks {
                widest = widest.max(pen.text_width(&tick.label, face)?);
            }
            for &stride in strides {
                let chosen: Vec<&Tick> = ticks
                    .iter()
                    .filter(|tick| tick.count.rem_euclid(stride) == 0)
                    .collect();
                let close = chosen
                    .windows(2)
                    .any(|pair| scale.x(pair[1].day) - scale.x(pair[0].day) < widest + 8.0);
                if chosen.len() >= 2 && !close {
                    return Self::draw_ticks(&chosen, pen, scale, face);
                }
            }
        }
        Ok(())
    }

    fn draw_ticks(
        ticks: &[&Tick],
        pen: &mut Pen<'_>,
        scale: &Scale,
        face: Face,
    ) -> Result<(), Failed> {
        let mut year_before: Option<&str> = None;
        let mut years = Vec::new();
        for tick in ticks {
            let x = scale.x(tick.day);
            for &(top, bottom) in scale.bands {
                pen.upright(x, top, bottom, 1.0, scale.grid)?;
            }
            pen.text(&tick.label, (x, scale.labels_y), Align::Middle, face)?;
            if let Some(year) = tick
                .year
                .as_deref()
                .filter(|year| year_before != Some(year))
            {
                years.push((x, year));
                year_before = Some(year);
            }
        }
        // The later of two crowded years tells more: it marks where the year begins.
        for (x, year) in years.into_iter().rev() {
            pen.text(
                year,
                (x, scale.labels_y + face.size + 3.0),
                Align::Middle,
                face,
            )?;
        }
        Ok(())
    }
}

/// Where a date axis is drawn.
pub(super) struct Scale<'a> {
    pub(super) span: Span,
    pub(super) left: f64,
    pub(super) right: f64,
    /// Heights that the hairlines cross.
    pub(super) bands: &'a [(f64, f64)],
    pub(super) labels_y: f64,
    pub(super) grid: Colour,
}

impl Scale<'_> {
    fn x(&self, day: f64) -> f64 {
        self.span.x_of(day, self.left, self.right)
    }
}

/// Round values inside a range, at most `most` of them but at least one step where the range allows.
pub(super) fn round_values(from: f64, to: f64, most: usize) -> (Vec<f64>, u8) {
    let span = to - from;
    if !(span > 0.0 && span.is_finite()) {
        return (Vec::new(), 0);
    }
    let mut decade = -2;
    loop {
        for digit in [1.0, 2.0, 5.0] {
            let step: f64 = digit * 10f64.powi(decade);
            let first = (from / step - 1e-9).ceil();
            let last = (to / step + 1e-9).floor();
            if last - first < most as f64 {
                let count = (last - first).max(-1.0) as usize + 1;
                let values = (0..count.min(most))
                    .map(|index| (first + index as f64) * step)
                    .collect();
                return (values, (-decade).max(0) as u8);
            }
        }
        decade += 1;
    }
}
