//! Nutation IAU 2000B: how the Moon and the Sun make the Earth's axis nod.

use super::nutation_table::LUNI_SOLAR;
use crate::quantity::{ARCSEC_PER_RAD, sin_cos, wrap};
use crate::time::Tt;

/// Displacement of the true equinox and equator of date from the mean ones.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Nutation {
    /// Along the ecliptic.
    pub longitude_rad: f64,
    /// In the obliquity.
    pub obliquity_rad: f64,
    /// Mean longitude of the Moon's ascending node, which sidereal time needs too.
    pub(super) node_rad: f64,
}

// Mean anomalies of Moon and Sun, the Moon's argument of latitude, its elongation and its node: arcseconds at J2000.0
// and per Julian century. Source: J. L. Simon et al. 1994, as prescribed for IAU 2000B by D. D. McCarthy and
// B. J. Luzum 2003, Celest. Mech. Dyn. Astr. 85, 37.
const ARGUMENTS_ARCSEC: [(f64, f64); 5] = [
    (485_868.249_036, 1_717_915_923.217_8),
    (1_287_104.793_05, 129_596_581.048_1),
    (335_779.526_232, 1_739_527_262.847_8),
    (1_072_260.703_69, 1_602_961_601.209_0),
    (450_160.398_036, -6_962_890.543_1),
];

/// Mean effect of the planetary terms that 2000B leaves out, milliarcseconds.
const PLANETARY_LONGITUDE_ARCSEC: f64 = -0.000_135;
const PLANETARY_OBLIQUITY_ARCSEC: f64 = 0.000_388;

/// Fractions by which the terms grow to fit the IAU 2006 precession: the dynamical form factor's rate per century, and
/// the changed obliquity. Source: P. T. Wallace and N. Capitaine 2006, A&A 459, 981.
const FORM_FACTOR_PER_CENTURY: f64 = -2.777_4e-6;
const OBLIQUITY_FACTOR: f64 = 0.469_7e-6;

/// Tenths of a microarcsecond in one radian.
const TABLE_UNITS_PER_RAD: f64 = 1e7 * ARCSEC_PER_RAD;

/// Cosine and sine of the multiples 0 to 4 of an angle: the table has no larger ones, and products are cheaper than calls.
fn turns(angle_rad: f64) -> [(f64, f64); 5] {
    let (sin, cos) = sin_cos(angle_rad);
    let mut turns = [(1.0, 0.0); 5];
    for index in 1..turns.len() {
        let (re, im) = turns[index - 1];
        turns[index] = (re * cos - im * sin, re * sin + im * cos);
    }
    turns
}

/// Nutation at an instant; within 3.6 mas of IAU 2000A from 1800 to 2200.
pub fn nutation(tt: Tt) -> Nutation {
    let centuries = tt.julian_centuries();
    let arguments_rad = ARGUMENTS_ARCSEC.map(|(at_j2000_arcsec, rate_arcsec)| {
        wrap(at_j2000_arcsec + rate_arcsec * centuries, 1_296_000.0) / ARCSEC_PER_RAD
    });
    let turns = arguments_rad.map(turns);
    let (mut longitude, mut obliquity) = (0.0, 0.0);
    // Small terms first, so that their sum is not lost in the large ones.
    for term in LUNI_SOLAR.iter().rev() {
        let (mut cos, mut sin) = (1.0, 0.0);
        for (turns, &multiplier) in turns.iter().zip(&term.multipliers) {
            if multiplier != 0 {
                let (re, im) = turns[usize::from(multiplier.unsigned_abs()) % turns.len()];
                let im = if multiplier < 0 { -im } else { im };
                (cos, sin) = (cos * re - sin * im, sin * re + cos * im);
            }
        }
        let [psi_sin, psi_sin_t, psi_cos, eps_cos, eps_cos_t, eps_sin] =
            term.tenth_microarcsec.map(f64::from);
        longitude += (psi_sin + psi_sin_t * centuries) * sin + psi_cos * cos;
        obliquity += (eps_cos + eps_cos_t * centuries) * cos + eps_sin * sin;
    }
    let longitude_rad =
        longitude / TABLE_UNITS_PER_RAD + PLANETARY_LONGITUDE_ARCSEC / ARCSEC_PER_RAD;
    let obliquity_rad =
        obliquity / TABLE_UNITS_PER_RAD + PLANETARY_OBLIQUITY_ARCSEC / ARCSEC_PER_RAD;
    let form_factor = FORM_FACTOR_PER_CENTURY * centuries;
    Nutation {
        longitude_rad: longitude_rad * (1.0 + OBLIQUITY_FACTOR + form_factor),
        obliquity_rad: obliquity_rad * (1.0 + form_factor),
        node_rad: arguments_rad[4],
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn against_erfa() {
        // ERFA 2.0.1 through pyerfa 2.0.1.5, recorded: nut00b at TT days from J2000.0, then the two factors of
        // Wallace and Capitaine 2006, radians.
        for (days, longitude_rad, obliquity_rad) in ERFA_VALUES {
            let computed = nutation(Tt::from_days_since_j2000(days));
            assert!(
                (computed.longitude_rad - longitude_rad).abs() < 1e-13,
                "{days} {}",
                computed.longitude_rad
            );
            assert!(
                (computed.obliquity_rad - obliquity_rad).abs() < 1e-13,
                "{days} {}",
                computed.obliquity_rad
            );
        }
    }

    const ERFA_VALUES: [(f64, f64, f64); 3] = [
        (
            -4_649.5,
            -1.833_027_420_151_040_7e-5,
            4.579_328_709_875_152_4e-5,
        ),
        (9_826.25, 4.216_040_849_888_796e-5, 3.395_625_577_603_06e-5),
        (
            -109_000.75,
            -5.279_989_938_621_656e-5,
            -3.341_594_834_482_015e-5,
        ),
    ];
}
