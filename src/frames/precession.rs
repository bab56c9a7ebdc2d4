//! Precession IAU 2006 and the axes of date.

use super::matrix::Matrix;
use super::nutation::{Nutation, nutation};
use crate::quantity::ARCSEC_PER_RAD;
use crate::time::Tt;

// Fukushima-Williams angles of the IAU 2006 precession with the frame bias, arcseconds, by powers of Julian centuries
// TT. Source: J. L. Hilton et al. 2006, Celest. Mech. Dyn. Astr. 94, 351; IERS Conventions (2010), section 5.6.4.
const GAMMA_ARCSEC: [f64; 6] = [
    -0.052_928,
    10.556_378,
    0.493_204_4,
    -0.000_312_38,
    -0.000_002_788,
    0.000_000_026_0,
];
const PHI_ARCSEC: [f64; 6] = [
    84_381.412_819,
    -46.811_016,
    0.051_126_8,
    0.000_532_89,
    -0.000_000_440,
    -0.000_000_017_6,
];
const PSI_ARCSEC: [f64; 6] = [
    -0.041_775,
    5_038.481_484,
    1.558_417_5,
    -0.000_185_22,
    -0.000_026_452,
    -0.000_000_014_8,
];
const OBLIQUITY_ARCSEC: [f64; 6] = [
    84_381.406,
    -46.836_769,
    -0.000_183_1,
    0.002_003_40,
    -0.000_000_576,
    -0.000_000_043_4,
];

fn polynomial_rad(coefficients_arcsec: &[f64; 6], centuries: f64) -> f64 {
    coefficients_arcsec
        .iter()
        .rev()
        .fold(0.0, |sum, coefficient| sum * centuries + coefficient)
        / ARCSEC_PER_RAD
}

/// Obliquity of the mean ecliptic of date, IAU 2006.
pub fn mean_obliquity_rad(tt: Tt) -> f64 {
    polynomial_rad(&OBLIQUITY_ARCSEC, tt.julian_centuries())
}

/// ICRS to the mean ecliptic and mean equinox of date, IAU 2006.
pub fn mean_ecliptic_of_date(tt: Tt) -> Matrix {
    ecliptic(tt, 0.0)
}

/// ICRS to the ecliptic of date, counted from the equinox that nutation in longitude has moved.
fn ecliptic(tt: Tt, nutation_in_longitude_rad: f64) -> Matrix {
    let centuries = tt.julian_centuries();
    Matrix::about_z(polynomial_rad(&GAMMA_ARCSEC, centuries))
        .then(Matrix::about_x(polynomial_rad(&PHI_ARCSEC, centuries)))
        .then(Matrix::about_z(
            -(polynomial_rad(&PSI_ARCSEC, centuries) + nutation_in_longitude_rad),
        ))
}

/// Equator, ecliptic and equinox of one instant.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct OfDate {
    nutation: Nutation,
    mean_obliquity_rad: f64,
    ecliptic: Matrix,
    equator: Matrix,
}

impl OfDate {
    /// The axes at an instant.
    pub fn at(tt: Tt) -> Self {
        let nutation = nutation(tt);
        let mean_obliquity_rad = mean_obliquity_rad(tt);
        let ecliptic = ecliptic(tt, nutation.longitude_rad);
        let equator = ecliptic.then(Matrix::about_x(
            -(mean_obliquity_rad + nutation.obliquity_rad),
        ));
        Self {
            nutation,
            mean_obliquity_rad,
            ecliptic,
            equator,
        }
    }

    /// ICRS to the true equator and equinox of date.
    pub fn equator(&self) -> &Matrix {
        &self.equator
    }

    /// ICRS to the ecliptic and true equinox of date.
    pub fn ecliptic(&self) -> &Matrix {
        &self.ecliptic
    }

    /// Nutation of the instant.
    pub fn nutation(&self) -> Nutation {
        self.nutation
    }

    /// Obliquity without nutation.
    pub fn mean_obliquity_rad(&self) -> f64 {
        self.mean_obliquity_rad
    }

    /// Obliquity with nutation.
    pub fn true_obliquity_rad(&self) -> f64 {
        self.mean_obliquity_rad + self.nutation.obliquity_rad
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn matrix_of_an_instant_against_erfa() {
        // ERFA 2.0.1 through pyerfa 2.0.1.5: pnm06a(2400000.5, 50123.9999). It holds the 2000A nutation, from which
        // 2000B departs by 1 mas (5e-9 rad) at most in this century.
        let expected = [
            [
                9.999_995_832_794_205e-1,
                8.372_382_772_630_953e-4,
                3.639_684_771_140_62e-4,
            ],
            [
                -8.372_533_744_743_676e-4,
                9.999_996_486_492_861e-1,
                4.132_905_944_614_906e-5,
            ],
            [
                -3.639_337_469_629_461e-4,
                -4.163_377_605_925_778e-5,
                9.999_999_329_094_26e-1,
            ],
        ];
        let rows = OfDate::at(Tt::from_days_since_j2000(
            50_123.999_9 + 2_400_000.5 - 2_451_545.0,
        ))
        .equator()
        .rows();
        for (row, wanted) in rows.iter().flatten().zip(expected.iter().flatten()) {
            assert!((row - wanted).abs() < 6e-9, "{row} {wanted}");
        }
    }

    #[test]
    fn angles_against_erfa() {
        // ERFA 2.0.1 through pyerfa 2.0.1.5: pfw06 and obl06 one and a half centuries after J2000.0, radians.
        let expected = [
            8.188_639_161_473_659e-5,
            0.408_752_780_760_093_8,
            0.036_657_664_818_368_91,
            0.408_752_024_772_24,
        ];
        for (coefficients, wanted) in [GAMMA_ARCSEC, PHI_ARCSEC, PSI_ARCSEC, OBLIQUITY_ARCSEC]
            .iter()
            .zip(expected)
        {
            assert!(
                (polynomial_rad(coefficients, 1.5) - wanted).abs() < 1e-15,
                "{wanted}"
            );
        }
    }

    #[test]
    fn obliquity_of_a_published_example() {
        // Meeus, Astronomical Algorithms, ex. 22.a (from memory): 1987 April 10, 0h TD: mean obliquity 23 26 27.407,
        // nutation in longitude -3.788", in obliquity +9.443" by IAU 1980. The older obliquity at J2000.0 is 0.042"
        // larger, the older nutation within 0.02".
        let of_date = OfDate::at(Tt::from_days_since_j2000(2_446_895.5 - 2_451_545.0));
        let mean_arcsec = of_date.mean_obliquity_rad() * ARCSEC_PER_RAD;
        assert!(
            (mean_arcsec - (23.0 * 3600.0 + 26.0 * 60.0 + 27.407)).abs() < 0.06,
            "{mean_arcsec}"
        );
        assert!((of_date.nutation().longitude_rad * ARCSEC_PER_RAD + 3.788).abs() < 0.03);
        assert!((of_date.nutation().obliquity_rad * ARCSEC_PER_RAD - 9.443).abs() < 0.03);
    }
}
