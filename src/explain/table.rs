//! The picture's numbers as a table.

use super::figures::{AreaScale, Figures};
use super::formats::DateForm;
use super::reading::{Highlights, Reading};
use super::words::Column;
use crate::circumstances::Series;

/// A table of finished strings.
#[derive(Debug, Clone, PartialEq, Eq, serde::Serialize)]
pub struct Table {
    /// What it is about.
    pub caption: String,
    /// Heads of the columns.
    pub head: Vec<String>,
    /// Cells by row.
    pub rows: Vec<Vec<String>>,
}

/// Rows taken evenly over the span, ends included.
const EVEN_ROWS: usize = 12;

/// The span at twelve even dates, the peaks and the chosen date, in time order.
///
/// Rows between samples are read straight between them; the chosen row is the reading itself.
pub fn reading_table(
    series: &Series,
    highlights: &Highlights,
    chosen: &Reading,
    figures: Figures<'_>,
) -> Table {
    let words = figures.words;
    let last = series.utc.len().saturating_sub(1);
    let mut rows: Vec<(Reading, &str)> = (0..EVEN_ROWS)
        .map(|row| last * row / (EVEN_ROWS - 1))
        .filter_map(|index| Some((Reading::within(series, *series.utc.get(index)?)?, "")))
        .collect();
    rows.dedup_by_key(|(reading, _)| reading.utc.days_since_j2000());
    let mut insert = |reading: Reading, remark| {
        let place = rows.partition_point(|(row, _)| row.utc <= reading.utc);
        rows.insert(place, (reading, remark));
    };
    for peak in highlights.great_peaks() {
        if let Some(reading) = Reading::within(series, peak.utc) {
            let magnitude = peak.magnitude;
            insert(
                Reading {
                    magnitude,
                    ..reading
                },
                words.remark_peak(),
            );
        }
    }
    insert(*chosen, words.remark_chosen());

    let widest = series
        .angular_diameter_arcsec
        .iter()
        .copied()
        .fold(0.0, f64::max);
    let scale = AreaScale::for_diameter(widest);
    let area = match scale {
        AreaScale::SquareArcseconds => Column::AreaArcsec2,
        AreaScale::SquareArcminutes => Column::AreaArcmin2,
    };
    let columns = [
        Column::Date,
        Column::Lit,
        Column::Diameter,
        area,
        Column::Magnitude,
        Column::Elongation,
        Column::Remark,
    ];
    let bare = |value: f64, decimals: u8| {
        if value.is_finite() {
            figures.number(value, decimals)
        } else {
            words.no_value().to_owned()
        }
    };
    let cells = |(reading, remark): &(Reading, &str)| {
        let elongation = reading.elongation_deg;
        vec![
            figures.date(reading.utc, DateForm::Day),
            figures.lit_share(reading.illuminated_fraction),
            figures.diameter(reading.angular_diameter_arcsec),
            figures.area_number(reading.lit_area_arcsec2, scale),
            bare(reading.magnitude, 1),
            if elongation.is_finite() {
                words.degrees(&bare(elongation, 0))
            } else {
                words.no_value().to_owned()
            },
            (*remark).to_owned(),
        ]
    };
    let end = |utc: Option<&crate::time::Utc>| {
        utc.map_or(String::new(), |&utc| figures.date(utc, DateForm::Day))
    };
    Table {
        caption: words.table_caption(
            series.body,
            &end(series.utc.first()),
            &end(series.utc.last()),
        ),
        head: columns
            .iter()
            .map(|&column| words.column(column).to_owned())
            .collect(),
        rows: rows.iter().map(cells).collect(),
    }
}
