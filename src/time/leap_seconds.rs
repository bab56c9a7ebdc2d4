//! TAI - UTC since 1972.

use super::calendar::days_from_2000;

/// Year and month at whose start TAI - UTC grew by one second; it was 10 s at the first entry.
///
/// IERS Bulletin C; the last entry is still in force at the end of the delta-T table.
const STARTS: [(i32, u8); 28] = [
    (1972, 1),
    (1972, 7),
    (1973, 1),
    (1974, 1),
    (1975, 1),
    (1976, 1),
    (1977, 1),
    (1978, 1),
    (1979, 1),
    (1980, 1),
    (1981, 7),
    (1982, 7),
    (1983, 7),
    (1985, 7),
    (1988, 1),
    (1990, 1),
    (1991, 1),
    (1992, 7),
    (1993, 7),
    (1994, 7),
    (1996, 1),
    (1997, 7),
    (1999, 1),
    (2006, 1),
    (2009, 1),
    (2012, 7),
    (2015, 7),
    (2017, 1),
];

/// TAI - UTC at the first entry.
const FIRST_SECONDS: u8 = 10;

/// The same starts as days since 2000-01-01T12:00.
static START_DAYS: [f64; STARTS.len()] = {
    let mut days = [0.0; STARTS.len()];
    let mut index = 0;
    while index < STARTS.len() {
        days[index] = days_from_2000(STARTS[index].0, STARTS[index].1, 1) as f64 - 0.5;
        index += 1;
    }
    days
};

/// TAI - UTC in seconds, or none before 1972 and for NaN.
pub(super) fn tai_minus_utc_seconds(days_since_j2000: f64) -> Option<u8> {
    let started = START_DAYS
        .iter()
        .take_while(|&&start| days_since_j2000 >= start)
        .count();
    // At most 28 entries, so the count fits.
    (started > 0).then(|| FIRST_SECONDS + started as u8 - 1)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn steps_fall_on_their_dates() {
        let at = |year, month, day| {
            tai_minus_utc_seconds(f64::from(days_from_2000(year, month, day)) - 0.5)
        };
        assert_eq!(at(1971, 12, 31), None);
        assert_eq!(at(1972, 1, 1), Some(10));
        assert_eq!(at(1985, 6, 30), Some(22));
        assert_eq!(at(1985, 7, 1), Some(23));
        assert_eq!(at(1999, 1, 1), Some(32));
        assert_eq!(at(2017, 1, 1), Some(37));
        assert_eq!(at(2026, 11, 24), Some(37));
        assert_eq!(tai_minus_utc_seconds(f64::NAN), None);
    }
}
