//! Reader of the packed tables: planar streams of small whole numbers, written by `pkg-config/tables/series.py`.

use crate::quantity::hypotenuse;

/// Powers of time that an argument can carry in each coordinate.
pub(super) const POWERS: usize = 4;
/// Coordinates of one series: longitude, latitude, radius.
pub(super) const COORDINATES: usize = 3;
/// Most angles that a series is built from: five of the Moon and eight of the planets.
pub(super) const ANGLES: usize = 13;
/// Largest multiple of one angle that a table may use.
pub(super) const HIGHEST_MULTIPLE: usize = 31;

const RADIANS_PER_ARCSEC: f64 = std::f64::consts::PI / (180.0 * 3600.0);

/// One decoded series: three polynomials and the terms that share arguments.
#[derive(Debug, Default)]
pub(super) struct Series {
    /// Coefficients in rising powers, radians.
    pub(super) polynomials: [Vec<f64>; COORDINATES],
    /// The arguments with how many factors and terms each has.
    pub(super) arguments: Vec<Argument>,
    /// Factors of all arguments, one after the other.
    pub(super) factors: Vec<Factor>,
    /// Terms of all arguments, one after the other.
    pub(super) terms: Vec<Term>,
    /// The largest multiple of each angle that occurs.
    pub(super) highest: [usize; ANGLES],
}

/// A sum of multiples of the basic angles.
#[derive(Debug)]
pub(super) struct Argument {
    pub(super) factor_count: usize,
    pub(super) term_count: usize,
}

/// One angle's share in an argument.
#[derive(Debug)]
pub(super) struct Factor {
    pub(super) angle: usize,
    pub(super) multiple: i8,
}

/// What an argument adds to one coordinate with one power of time.
#[derive(Debug)]
pub(super) struct Term {
    /// Coordinate times [`POWERS`] plus the power.
    pub(super) slot: usize,
    pub(super) cosine_rad: f64,
    pub(super) sine_rad: f64,
}

impl Series {
    /// Leaves out the arguments of which no term reaches an amplitude.
    pub(super) fn keep_terms_of(&mut self, least_rad: f64) {
        let mut kept = Self {
            polynomials: std::mem::take(&mut self.polynomials),
            highest: self.highest,
            ..Self::default()
        };
        let mut factors = std::mem::take(&mut self.factors).into_iter();
        let mut terms = std::mem::take(&mut self.terms).into_iter();
        for argument in std::mem::take(&mut self.arguments) {
            let of_argument: Vec<Term> = terms.by_ref().take(argument.term_count).collect();
            let its_factors: Vec<Factor> = factors.by_ref().take(argument.factor_count).collect();
            let is_large = of_argument
                .iter()
                .any(|term| hypotenuse(term.cosine_rad, term.sine_rad) >= least_rad);
            if is_large {
                kept.factors.extend(its_factors);
                kept.terms.extend(of_argument);
                kept.arguments.push(argument);
            }
        }
        *self = kept;
    }
}

/// Reads series one after the other from the bytes of a table.
pub(super) struct Reader<'a> {
    bytes: std::slice::Iter<'a, u8>,
}

impl<'a> Reader<'a> {
    pub(super) fn new(bytes: &'a [u8]) -> Self {
        Self {
            bytes: bytes.iter(),
        }
    }

    /// True when every byte has been read.
    #[cfg(test)]
    pub(super) fn is_finished(&self) -> bool {
        self.bytes.len() == 0
    }

    fn byte(&mut self) -> u8 {
        self.bytes.next().copied().unwrap_or(0)
    }

    /// Little-endian base 128.
    fn number(&mut self) -> u32 {
        let mut value = 0;
        let mut shift = 0;
        loop {
            let byte = self.byte();
            value |= u32::from(byte & 127) << shift;
            shift += 7;
            if byte < 128 || shift > 28 {
                return value;
            }
        }
    }

    /// Zigzag: 0, 1, 2, 3 mean 0, -1, 1, -2.
    fn signed(&mut self) -> f64 {
        let value = self.number();
        f64::from((value >> 1) as i32 ^ -((value & 1) as i32))
    }

    /// The next series. Arguments made of the first `single_below` angles alone store one amplitude per slot: a sine in
    /// longitude and latitude, a cosine in the radius.
    pub(super) fn series(&mut self, single_below: usize) -> Series {
        let mut series = Series::default();
        let steps_rad =
            [(); COORDINATES].map(|()| 0.5_f64.powi(self.byte().into()) * RADIANS_PER_ARCSEC);
        for (polynomial, step_rad) in series.polynomials.iter_mut().zip(steps_rad) {
            let length = self.byte();
            *polynomial = (0..length).map(|_| self.signed() * step_rad).collect();
        }
        let count = self.number();
        let angle_masks: Vec<u32> = (0..count).map(|_| self.number()).collect();
        for &mask in &angle_masks {
            for angle in bits(mask, ANGLES) {
                let multiple = i8::from_le_bytes([self.byte()]);
                series.highest[angle] =
                    series.highest[angle].max(usize::from(multiple.unsigned_abs()));
                series.factors.push(Factor { angle, multiple });
            }
        }
        let slot_masks: Vec<u32> = (0..count).map(|_| self.number()).collect();
        let mut terms: Vec<Vec<Term>> = slot_masks.iter().map(|_| Vec::new()).collect();
        for slot in 0..COORDINATES * POWERS {
            let step_rad = steps_rad[slot / POWERS];
            for ((terms, &slots), &angles) in terms.iter_mut().zip(&slot_masks).zip(&angle_masks) {
                if slots & (1 << slot) == 0 {
                    continue;
                }
                let is_single = angles >> single_below == 0;
                let has_cosine = !is_single || slot / POWERS == COORDINATES - 1;
                let cosine_rad = if has_cosine {
                    self.signed() * step_rad
                } else {
                    0.0
                };
                let has_sine = !is_single || !has_cosine;
                let sine_rad = if has_sine {
                    self.signed() * step_rad
                } else {
                    0.0
                };
                terms.push(Term {
                    slot,
                    cosine_rad,
                    sine_rad,
                });
            }
        }
        for (terms, mask) in terms.into_iter().zip(angle_masks) {
            series.arguments.push(Argument {
                factor_count: mask.count_ones() as usize,
                term_count: terms.len(),
            });
            series.terms.extend(terms);
        }
        series
    }
}

/// The positions below `limit` of the bits that are set.
fn bits(mask: u32, limit: usize) -> impl Iterator<Item = usize> {
    (0..limit).filter(move |bit| mask & (1 << bit) != 0)
}
