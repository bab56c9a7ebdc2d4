//! Places as people type them.

use super::Place;
use crate::error::{Code, Error, quoted};

/// Which of the two angles a text gives: it decides the letters and the range allowed.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum Coordinate {
    /// North positive, within 90 degrees.
    Latitude,
    /// East positive, within 180 degrees.
    Longitude,
}

impl Coordinate {
    const fn letters(self) -> [char; 2] {
        match self {
            Coordinate::Latitude => ['N', 'S'],
            Coordinate::Longitude => ['E', 'W'],
        }
    }

    const fn limit_deg(self) -> f64 {
        match self {
            Coordinate::Latitude => 90.0,
            Coordinate::Longitude => 180.0,
        }
    }

    fn refused(self, text: &str) -> Error {
        let shown = quoted(text);
        Error::new(
            Code::BadPlace,
            match self {
                Coordinate::Latitude => format!(
                    "{shown} is no latitude: write degrees from -90 to 90, for instance 54.5, 54° 30' N or 33,9 S."
                ),
                Coordinate::Longitude => format!(
                    "{shown} is no longitude: write degrees from -180 to 180, for instance -3.2, 3° 12' W or 18,4 E."
                ),
            },
        )
    }
}

/// Reads one coordinate in degrees: decimal with point or comma, or degrees, minutes and seconds,
/// with a sign or one of the letters N, S, E, W before or after.
///
/// # Errors
/// `BadPlace` with what is allowed, when the text is something else or out of range.
pub fn parse_coordinate(text: &str, which: Coordinate) -> Result<f64, Error> {
    let refused = || which.refused(text);
    let mut rest = text
        .trim()
        .to_ascii_uppercase()
        .replace(['\u{2212}', '\u{2013}'], "-");
    let [positive, negative] = which.letters();
    let mut sign = 1.0;
    let mut letter_given = false;
    for (letter, its_sign) in [(positive, 1.0), (negative, -1.0)] {
        let bare = rest
            .strip_suffix(letter)
            .or_else(|| rest.strip_prefix(letter))
            .map(|bare| bare.trim().to_owned());
        if let Some(bare) = bare {
            if letter_given {
                return Err(refused());
            }
            letter_given = true;
            sign = its_sign;
            rest = bare;
        }
    }
    if let Some(bare) = rest.strip_prefix(['-', '+']) {
        // "-33 S" would say the same thing twice, or its opposite.
        if letter_given {
            return Err(refused());
        }
        if rest.starts_with('-') {
            sign = -1.0;
        }
        rest = bare.trim().to_owned();
    }
    let marks = [
        '°', '\'', '"', '\u{2032}', '\u{2033}', '\u{2019}', '\u{201d}', ' ', ':', '\u{a0}',
    ];
    let fields: Vec<&str> = rest
        .split(marks)
        .filter(|field| !field.is_empty())
        .collect();
    if fields.is_empty() || fields.len() > 3 {
        return Err(refused());
    }
    let mut degrees = 0.0;
    for (index, field) in fields.iter().enumerate() {
        let is_last = index + 1 == fields.len();
        let value = parse_plain(field, is_last).ok_or_else(refused)?;
        if index > 0 && value >= 60.0 {
            return Err(refused());
        }
        degrees += value / 60_f64.powi(index as i32);
    }
    if degrees > which.limit_deg() {
        return Err(refused());
    }
    Ok(sign * degrees)
}

/// Digits, with a decimal point or comma where `fraction_allowed`.
fn parse_plain(field: &str, fraction_allowed: bool) -> Option<f64> {
    let (whole, fraction) = match field.split_once(['.', ',']) {
        Some(parts) if fraction_allowed => parts,
        Some(_) => return None,
        None => (field, ""),
    };
    // Nine decimals of a degree are a tenth of a millimetre on the ground; more digits are not looked at.
    let digits = |text: &str| -> Option<f64> {
        let kept = text.get(..text.len().min(9))?;
        let sound = text.bytes().all(|byte| byte.is_ascii_digit());
        if sound && kept.is_empty() {
            Some(0.0)
        } else {
            kept.parse::<u32>().ok().filter(|_| sound).map(f64::from)
        }
    };
    if whole.is_empty() && fraction.is_empty() || whole.len() > 9 {
        return None;
    }
    Some(digits(whole)? + digits(fraction)? / 10_f64.powi(fraction.len().min(9) as i32))
}

/// Reads `latitude,longitude` in decimal degrees with points, as the element's `place` attribute gives it.
///
/// # Errors
/// `BadPlace` with what is allowed.
///
/// ```
/// let place = wanderlight::place::parse_pair("54.5, -3.2")?;
/// assert_eq!((place.latitude_deg(), place.longitude_deg()), (54.5, -3.2));
/// # Ok::<(), wanderlight::Error>(())
/// ```
pub fn parse_pair(text: &str) -> Result<Place, Error> {
    let (latitude, longitude) = text.split_once([',', ';']).ok_or_else(|| {
        Error::new(
            Code::BadPlace,
            "A place is written as latitude,longitude in degrees, north and east positive, for instance 54.5,-3.2; or auto.",
        )
    })?;
    Place::new(
        parse_coordinate(latitude, Coordinate::Latitude)?,
        parse_coordinate(longitude, Coordinate::Longitude)?,
        0.0,
    )
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn usual_forms_are_read() {
        for (text, expected) in [
            ("54.5", 54.5),
            (" 54,5 ", 54.5),
            ("-33.9", -33.9),
            ("\u{2212}33.9", -33.9),
            ("33.9 S", -33.9),
            ("s 33,9", -33.9),
            ("54° 30' N", 54.5),
            ("54°30′00″n", 54.5),
            ("54 30 36", 54.51),
            ("+12:15", 12.25),
            ("90", 90.0),
        ] {
            let read = parse_coordinate(text, Coordinate::Latitude).expect(text);
            assert!((read - expected).abs() < 1e-12, "{text}: {read}");
        }
        assert_eq!(parse_coordinate("180 W", Coordinate::Longitude), Ok(-180.0));
    }

    #[test]
    fn anything_else_is_refused_with_what_is_allowed() {
        for text in [
            "", "east", "95", "-33 S", "12 E", "1 2 3 4", "54.5 30", "54 60", "NaN", "inf", "1e1",
            "--5", "N", "5 N S",
        ] {
            let error = parse_coordinate(text, Coordinate::Latitude).expect_err(text);
            assert_eq!(error.code(), Code::BadPlace);
            assert!(error.message().contains("-90 to 90"), "{}", error.message());
        }
    }
}
