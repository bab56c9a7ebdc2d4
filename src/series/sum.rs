//! Sums a series: every argument's cosine and sine by complex products of few powers, not by calls.

use super::packed::{ANGLES, COORDINATES, HIGHEST_MULTIPLE, POWERS, Series};
use crate::quantity::sin_cos;
use crate::time::Tt;

/// Middle of the fit window, Julian millennia from J2000.0 (1950).
const CENTRE_MILLENNIA: f64 = -0.05;
/// Half its width: 1590 to 2310.
const HALF_WIDTH_MILLENNIA: f64 = 0.36;

/// One of the basic angles at an instant.
#[derive(Debug, Clone, Copy, Default)]
pub(super) struct Angle {
    pub(super) value_rad: f64,
    pub(super) rate_rad_per_millennium: f64,
}

/// One coordinate and how fast it changes.
#[derive(Debug, Clone, Copy, Default)]
pub(super) struct Coordinate {
    pub(super) value_rad: f64,
    pub(super) rate_rad_per_millennium: f64,
}

#[derive(Clone, Copy)]
struct Complex {
    re: f64,
    im: f64,
}

impl Complex {
    const ONE: Self = Self { re: 1.0, im: 0.0 };

    fn times(self, other: Self) -> Self {
        Self {
            re: self.re * other.re - self.im * other.im,
            im: self.re * other.im + self.im * other.re,
        }
    }
}

/// The three coordinates of a series at an instant, for the basic angles given.
pub(super) fn sum(series: &Series, angles: &[Angle], tt: Tt) -> [Coordinate; COORDINATES] {
    let x = (tt.julian_millennia() - CENTRE_MILLENNIA) / HALF_WIDTH_MILLENNIA;
    let powers = powers(series, angles);
    // What stands beside each power of x, and its rate.
    let mut beside = [Coordinate::default(); COORDINATES * POWERS];
    let mut factors = series.factors.iter();
    let mut terms = series.terms.iter();
    for argument in &series.arguments {
        let mut turn = Complex::ONE;
        let mut rate = 0.0;
        for factor in factors.by_ref().take(argument.factor_count) {
            let Complex { re, im } =
                powers[factor.angle][usize::from(factor.multiple.unsigned_abs())];
            turn = turn.times(Complex {
                re,
                im: if factor.multiple < 0 { -im } else { im },
            });
            rate += f64::from(factor.multiple) * angles[factor.angle].rate_rad_per_millennium;
        }
        for term in terms.by_ref().take(argument.term_count) {
            let sum = &mut beside[term.slot];
            sum.value_rad += term.cosine_rad * turn.re + term.sine_rad * turn.im;
            sum.rate_rad_per_millennium +=
                rate * (term.sine_rad * turn.re - term.cosine_rad * turn.im);
        }
    }
    let mut coordinates = [Coordinate::default(); COORDINATES];
    for (index, coordinate) in coordinates.iter_mut().enumerate() {
        let (polynomial, polynomial_rate) =
            with_derivative(series.polynomials[index].iter().copied(), x);
        let of_power = &beside[index * POWERS..(index + 1) * POWERS];
        let (periodic, periodic_rate) =
            with_derivative(of_power.iter().map(|sum| sum.value_rad), x);
        let (turning, _) =
            with_derivative(of_power.iter().map(|sum| sum.rate_rad_per_millennium), x);
        coordinate.value_rad = polynomial + periodic;
        coordinate.rate_rad_per_millennium =
            turning + (polynomial_rate + periodic_rate) / HALF_WIDTH_MILLENNIA;
    }
    coordinates
}

/// cos(k a) + i sin(k a) of every angle a for k from 0 to the largest multiple that the series uses.
fn powers(series: &Series, angles: &[Angle]) -> [[Complex; HIGHEST_MULTIPLE + 1]; ANGLES] {
    let mut powers = [[Complex::ONE; HIGHEST_MULTIPLE + 1]; ANGLES];
    for ((powers, angle), &highest) in powers.iter_mut().zip(angles).zip(&series.highest) {
        if highest == 0 {
            continue;
        }
        let (im, re) = sin_cos(angle.value_rad);
        let first = Complex { re, im };
        let mut turn = Complex::ONE;
        for power in powers.iter_mut().skip(1).take(highest) {
            turn = turn.times(first);
            *power = turn;
        }
    }
    powers
}

/// A polynomial given in rising powers, and its derivative by x.
fn with_derivative(coefficients: impl DoubleEndedIterator<Item = f64>, x: f64) -> (f64, f64) {
    coefficients
        .rev()
        .fold((0.0, 0.0), |(value, slope), coefficient| {
            (value * x + coefficient, slope * x + value)
        })
}
