//! What the tests against reference data share: reading the tables, the crate's instant for a given TT, and one way to say
//! how far off a value is.

#![allow(dead_code, reason = "each test program uses its own part")]

use std::path::Path;
use wanderlight::Utc;

/// A table of `tests/data`: one line naming its builder, one of column names, then the rows.
pub(crate) struct Table {
    columns: Vec<String>,
    rows: Vec<Vec<String>>,
}

/// One row of a [`Table`].
#[derive(Clone, Copy)]
pub(crate) struct Row<'a> {
    columns: &'a [String],
    cells: &'a [String],
}

impl Table {
    /// Reads `tests/data/<name>`.
    pub(crate) fn read(name: &str) -> Self {
        let path = Path::new(env!("CARGO_MANIFEST_DIR"))
            .join("tests/data")
            .join(name);
        let text = std::fs::read_to_string(&path)
            .unwrap_or_else(|why| panic!("{}: {why}", path.display()));
        let cells = |line: &str| line.split(',').map(str::to_owned).collect::<Vec<_>>();
        let mut lines = text.lines();
        assert!(
            lines
                .next()
                .is_some_and(|line| line.starts_with("# build_")),
            "{name}: the first line names the builder"
        );
        let columns = cells(lines.next().expect("column names"));
        let rows: Vec<_> = lines.map(cells).collect();
        assert!(
            rows.iter().all(|row| row.len() == columns.len()),
            "{name}: a row with a cell too many or too few"
        );
        Self { columns, rows }
    }

    /// The rows in the order of the file.
    pub(crate) fn rows(&self) -> impl ExactSizeIterator<Item = Row<'_>> {
        self.rows.iter().map(|cells| Row {
            columns: &self.columns,
            cells,
        })
    }
}

impl<'a> Row<'a> {
    /// The cell under a column's name.
    pub(crate) fn text(self, column: &str) -> &'a str {
        let at = self.columns.iter().position(|name| name == column);
        &self.cells[at.unwrap_or_else(|| panic!("no column {column}"))]
    }

    /// The number under a column's name; none where the cell is empty.
    pub(crate) fn maybe(self, column: &str) -> Option<f64> {
        let text = self.text(column);
        (!text.is_empty()).then(|| {
            text.parse()
                .unwrap_or_else(|_| panic!("{column}: {text} is no number"))
        })
    }

    /// The number under a column's name.
    pub(crate) fn number(self, column: &str) -> f64 {
        self.maybe(column)
            .unwrap_or_else(|| panic!("{column} is empty"))
    }
}

/// The UTC that the crate maps to this TT, so that its rule for delta-T plays no part in what is compared.
pub(crate) fn utc_at_tt(tt_days_since_j2000: f64) -> Utc {
    let mut utc = Utc::from_days_since_j2000(tt_days_since_j2000);
    for _ in 0..4 {
        utc = utc.plus_days(tt_days_since_j2000 - utc.to_tt().days_since_j2000());
    }
    let left_seconds = (utc.to_tt().days_since_j2000() - tt_days_since_j2000) * 86_400.0;
    assert!(
        left_seconds.abs() < 1e-4,
        "no UTC for TT {tt_days_since_j2000}: {left_seconds} s left"
    );
    utc
}

/// Fails with the label, both values and the difference when it is above the tolerance.
#[track_caller]
pub(crate) fn check(label: &str, got: f64, want: f64, tolerance: f64, unit: &str) {
    let off = (got - want).abs();
    assert!(
        off <= tolerance,
        "{label}: got {got} {unit}, want {want}, off by {off:.6}, allowed {tolerance}"
    );
}

/// The same for angles in degrees, which may differ by whole turns; the tolerance is in arcseconds.
#[track_caller]
pub(crate) fn check_angle(label: &str, got_deg: f64, want_deg: f64, tolerance_arcsec: f64) {
    let off_arcsec = turn_deg(got_deg - want_deg).abs() * 3600.0;
    assert!(
        off_arcsec <= tolerance_arcsec,
        "{label}: got {got_deg} deg, want {want_deg}, off by {off_arcsec:.4} arcsec, allowed {tolerance_arcsec}"
    );
}

/// Degrees reduced to -180 to 180.
pub(crate) fn turn_deg(angle_deg: f64) -> f64 {
    angle_deg - 360.0 * (angle_deg / 360.0).round()
}

/// Angle between two directions given as longitude and latitude in degrees (haversine: exact for small angles).
pub(crate) fn separation_arcsec(a_deg: [f64; 2], b_deg: [f64; 2]) -> f64 {
    let half = |x_deg: f64| (x_deg.to_radians() / 2.0).sin().powi(2);
    let across = a_deg[1].to_radians().cos() * b_deg[1].to_radians().cos();
    let h = half(a_deg[1] - b_deg[1]) + across * half(turn_deg(a_deg[0] - b_deg[0]));
    2.0 * h.sqrt().min(1.0).asin().to_degrees() * 3600.0
}

/// How a set of errors is spread.
#[derive(Debug, Clone, Copy)]
pub(crate) struct Spread {
    /// Number of errors.
    pub(crate) count: usize,
    /// Root of the mean square.
    pub(crate) rms: f64,
    /// The median.
    pub(crate) p50: f64,
    /// 99 of 100 are at most this.
    pub(crate) p99: f64,
    /// The largest.
    pub(crate) max: f64,
}

impl Spread {
    /// Of absolute errors; none when there are none.
    pub(crate) fn of(errors: &[f64]) -> Option<Self> {
        let mut sorted = errors.to_vec();
        assert!(
            sorted
                .iter()
                .all(|error| error.is_finite() && *error >= 0.0),
            "an error is no number"
        );
        sorted.sort_by(f64::total_cmp);
        let rank = |share: f64| sorted[((share * sorted.len() as f64).ceil() as usize).max(1) - 1];
        let max = *sorted.last()?;
        let rms =
            (sorted.iter().map(|error| error * error).sum::<f64>() / sorted.len() as f64).sqrt();
        Some(Self {
            count: sorted.len(),
            rms,
            p50: rank(0.5),
            p99: rank(0.99),
            max,
        })
    }
}
