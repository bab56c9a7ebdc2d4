//! How far each quantity of each body may be from the reference: median, 99th percentile and largest error.
//!
//! About a third above what was measured, so that a change for the worse is noticed; units are those of
//! [`Quantity::label`]. First for 1900 to 2100, then for 1700 to 2200.

use crate::quantity::Quantity;
use crate::spans::{Part, Span};
use wanderlight::Body;

/// Body; limits of p50, p99 and max within 1900 to 2100; the same within 1700 to 2200.
type Limits = &'static [(Body, [f64; 3], [f64; 3])];

/// Set by the truncated series. Seen from nearby, an error of the orbit looks larger: Venus and Mars have their largest
/// errors when nearest to the Earth. The Moon is a fit of some hundred terms.
const EQUATORIAL: Limits = &[
    (Body::Sun, [0.068, 0.18, 0.22], [0.069, 0.18, 0.22]),
    (Body::Moon, [0.31, 0.9, 1.5], [0.3, 0.94, 1.5]),
    (Body::Mercury, [0.094, 0.35, 0.39], [0.095, 0.32, 0.39]),
    (Body::Venus, [0.094, 0.7, 0.79], [0.099, 0.76, 0.98]),
    (Body::Mars, [0.084, 0.77, 0.91], [0.086, 0.77, 0.97]),
    (Body::Jupiter, [0.17, 0.47, 0.6], [0.17, 0.52, 0.64]),
    (Body::Saturn, [0.18, 0.48, 0.57], [0.19, 0.5, 0.72]),
    (Body::Uranus, [0.19, 0.5, 0.53], [0.19, 0.49, 0.56]),
    (Body::Neptune, [0.15, 0.36, 0.41], [0.16, 0.39, 0.54]),
];

/// The same places on other axes.
const ECLIPTIC: Limits = &[
    (Body::Sun, [0.068, 0.18, 0.22], [0.069, 0.18, 0.22]),
    (Body::Moon, [0.31, 0.9, 1.5], [0.3, 0.94, 1.5]),
    (Body::Mercury, [0.094, 0.35, 0.39], [0.095, 0.32, 0.39]),
    (Body::Venus, [0.094, 0.7, 0.79], [0.1, 0.76, 0.98]),
    (Body::Mars, [0.084, 0.77, 0.91], [0.086, 0.77, 0.97]),
    (Body::Jupiter, [0.17, 0.47, 0.6], [0.17, 0.52, 0.64]),
    (Body::Saturn, [0.18, 0.49, 0.57], [0.19, 0.5, 0.72]),
    (Body::Uranus, [0.19, 0.5, 0.53], [0.18, 0.49, 0.56]),
    (Body::Neptune, [0.15, 0.36, 0.41], [0.16, 0.39, 0.54]),
];

/// Set by the series; in parts of a small distance for Venus and Mars when near, for the Moon always.
const DISTANCE: Limits = &[
    (Body::Sun, [0.3, 0.73, 1.1], [0.3, 0.75, 1.1]),
    (Body::Moon, [5.2, 18.0, 23.0], [4.7, 18.0, 23.0]),
    (Body::Mercury, [0.3, 1.6, 2.1], [0.31, 1.6, 2.3]),
    (Body::Venus, [0.3, 3.9, 5.4], [0.32, 3.9, 5.5]),
    (Body::Mars, [0.3, 4.2, 4.7], [0.3, 4.2, 5.8]),
    (Body::Jupiter, [2.1, 7.1, 8.0], [1.9, 7.4, 10.0]),
    (Body::Saturn, [3.3, 14.0, 16.0], [3.5, 16.0, 17.0]),
    (Body::Uranus, [7.2, 23.0, 24.0], [8.0, 25.0, 33.0]),
    (Body::Neptune, [9.1, 29.0, 30.0], [11.0, 39.0, 47.0]),
];

/// The heliocentric series themselves. Jupiter to Neptune are fitted for direction, hence coarser in distance.
const SUN_DISTANCE: Limits = &[
    (Body::Moon, [0.23, 0.67, 1.1], [0.22, 0.82, 1.1]),
    (Body::Mercury, [0.56, 2.9, 3.2], [0.57, 2.9, 3.5]),
    (Body::Venus, [0.27, 1.3, 1.4], [0.3, 1.3, 1.4]),
    (Body::Mars, [0.2, 0.9, 1.1], [0.22, 0.96, 1.5]),
    (Body::Jupiter, [2.2, 6.5, 7.5], [2.0, 6.8, 8.0]),
    (Body::Saturn, [3.4, 14.0, 15.0], [3.7, 15.0, 17.0]),
    (Body::Uranus, [7.2, 23.0, 23.0], [7.9, 25.0, 32.0]),
    (Body::Neptune, [9.1, 30.0, 30.0], [11.0, 39.0, 46.0]),
];

/// Venus and Mercury near inferior conjunction turn fast as seen from here: the angle takes over their error magnified.
const PHASE_ANGLE: Limits = &[
    (Body::Moon, [0.16, 0.67, 0.98], [0.17, 0.79, 1.1]),
    (Body::Mercury, [0.13, 0.55, 0.78], [0.13, 0.58, 0.78]),
    (Body::Venus, [0.1, 0.81, 0.93], [0.1, 0.86, 1.1]),
    (Body::Mars, [0.1, 0.42, 0.53], [0.1, 0.43, 0.6]),
    (Body::Jupiter, [0.1, 0.23, 0.31], [0.1, 0.23, 0.33]),
    (Body::Saturn, [0.1, 0.25, 0.28], [0.1, 0.25, 0.36]),
    (Body::Uranus, [0.1, 0.22, 0.25], [0.1, 0.24, 0.28]),
    (Body::Neptune, [0.1, 0.18, 0.21], [0.1, 0.25, 0.3]),
];

/// Follows from the phase angle. The reference has seven decimals.
const LIT_FRACTION: Limits = &[
    (Body::Moon, [0.21, 1.2, 1.4], [0.24, 1.3, 2.1]),
    (Body::Mercury, [0.2, 1.2, 1.4], [0.2, 1.3, 1.5]),
    (Body::Venus, [0.2, 1.2, 1.6], [0.2, 1.2, 1.9]),
    (Body::Mars, [0.2, 0.5, 0.67], [0.2, 0.52, 0.73]),
    (Body::Jupiter, [0.2, 0.2, 0.2], [0.2, 0.2, 0.2]),
    (Body::Saturn, [0.2, 0.2, 0.2], [0.2, 0.2, 0.2]),
    (Body::Uranus, [0.2, 0.2, 0.2], [0.2, 0.2, 0.2]),
    (Body::Neptune, [0.2, 0.2, 0.2], [0.2, 0.2, 0.2]),
];

/// A difference of two directions.
const ELONGATION: Limits = &[
    (Body::Moon, [0.16, 0.69, 0.99], [0.17, 0.81, 1.1]),
    (Body::Mercury, [0.05, 0.22, 0.32], [0.05, 0.22, 0.32]),
    (Body::Venus, [0.05, 0.56, 0.65], [0.05, 0.61, 0.77]),
    (Body::Mars, [0.053, 0.63, 0.74], [0.056, 0.67, 0.85]),
    (Body::Jupiter, [0.12, 0.43, 0.56], [0.12, 0.51, 0.58]),
    (Body::Saturn, [0.11, 0.45, 0.52], [0.11, 0.47, 0.73]),
    (Body::Uranus, [0.12, 0.45, 0.52], [0.13, 0.48, 0.55]),
    (Body::Neptune, [0.098, 0.37, 0.43], [0.11, 0.43, 0.51]),
];

/// Follows from the distance. The reference has five decimals of an arcsecond: 2 ppm of Neptune's disc.
const DIAMETER: Limits = &[
    (Body::Sun, [1.0, 1.0, 1.1], [1.0, 1.0, 1.1]),
    (Body::Moon, [5.2, 18.0, 23.0], [4.8, 18.0, 23.0]),
    (Body::Mercury, [1.0, 1.9, 2.6], [1.0, 1.9, 2.6]),
    (Body::Venus, [1.0, 3.9, 5.3], [1.0, 4.0, 5.6]),
    (Body::Mars, [1.0, 4.2, 4.7], [1.0, 4.2, 5.6]),
    (Body::Jupiter, [2.1, 7.0, 7.9], [1.9, 7.5, 9.9]),
    (Body::Saturn, [3.2, 14.0, 16.0], [3.6, 16.0, 18.0]),
    (Body::Uranus, [7.3, 24.0, 25.0], [7.9, 25.0, 33.0]),
    (Body::Neptune, [9.1, 30.0, 32.0], [11.0, 38.0, 50.0]),
];

/// Errors against the published laws, not of the laws, in thousandths of a magnitude; the reference has four decimals.
/// Uranus and Neptune follow their coarse distances.
const MAGNITUDE: Limits = &[
    (Body::Sun, [0.1, 0.1, 0.1], [0.1, 0.1, 0.1]),
    (Body::Moon, [0.1, 0.1, 0.12], [0.1, 0.1, 0.12]),
    (Body::Mercury, [0.1, 0.1, 0.1], [0.1, 0.1, 0.1]),
    (Body::Venus, [0.1, 0.1, 0.1], [0.1, 0.1, 0.1]),
    (Body::Mars, [0.1, 0.1, 0.1], [0.1, 0.1, 0.1]),
    (Body::Jupiter, [0.1, 0.1, 0.1], [0.1, 0.1, 0.1]),
    (Body::Saturn, [0.1, 0.11, 0.12], [0.1, 0.11, 0.13]),
    (Body::Uranus, [0.1, 0.14, 0.16], [0.1, 0.15, 0.19]),
    (Body::Neptune, [0.1, 0.18, 0.19], [0.1, 0.2, 0.23]),
];

/// Derivative of the series.
const SPEED: Limits = &[
    (Body::Moon, [0.02, 0.023, 0.03], [0.02, 0.026, 0.032]),
    (Body::Mercury, [0.069, 0.22, 0.25], [0.069, 0.22, 0.31]),
    (Body::Venus, [0.02, 0.052, 0.057], [0.02, 0.063, 0.094]),
    (Body::Mars, [0.02, 0.049, 0.063], [0.02, 0.053, 0.063]),
    (Body::Jupiter, [0.032, 0.11, 0.13], [0.029, 0.11, 0.18]),
    (Body::Saturn, [0.077, 0.25, 0.29], [0.075, 0.25, 0.35]),
    (Body::Uranus, [0.12, 0.39, 0.41], [0.12, 0.39, 0.42]),
    (Body::Neptune, [0.1, 0.38, 0.41], [0.11, 0.39, 0.46]),
];

/// Sideways error between body and Sun; the reference has four decimals of a degree, 0.18 arcsec.
const BRIGHT_LIMB: Limits = &[
    (Body::Moon, [0.3, 0.75, 1.2], [0.3, 0.71, 1.2]),
    (Body::Mercury, [0.3, 0.3, 0.3], [0.3, 0.3, 0.3]),
    (Body::Venus, [0.3, 0.42, 0.54], [0.3, 0.42, 0.79]),
    (Body::Mars, [0.3, 0.56, 0.68], [0.3, 0.56, 0.68]),
    (Body::Jupiter, [0.3, 0.39, 0.46], [0.3, 0.38, 0.46]),
    (Body::Saturn, [0.3, 0.42, 0.5], [0.3, 0.41, 0.5]),
    (Body::Uranus, [0.3, 0.35, 0.44], [0.3, 0.37, 0.44]),
    (Body::Neptune, [0.3, 0.35, 0.44], [0.3, 0.35, 0.44]),
];

/// Follows from Saturn's place.
const RING_OPENING: Limits = &[(Body::Saturn, [0.1, 0.4, 0.48], [0.1, 0.4, 0.49])];

/// Follows from Saturn's place and the axes of date; the reference has four decimals of a degree.
const AXIS: Limits = &[(Body::Saturn, [0.3, 0.3, 0.3], [0.3, 0.3, 0.3])];

/// Largest error of a direction above the horizon, arcsec: the geocentric one, and the Moon's parallax with its distance.
const HORIZON_ARCSEC: [(Body, f64); 9] = [
    (Body::Sun, 0.15),
    (Body::Moon, 0.68),
    (Body::Mercury, 0.23),
    (Body::Venus, 0.59),
    (Body::Mars, 0.59),
    (Body::Jupiter, 0.57),
    (Body::Saturn, 0.51),
    (Body::Uranus, 0.46),
    (Body::Neptune, 0.35),
];

fn limits(quantity: Quantity) -> Limits {
    match quantity {
        Quantity::Equatorial => EQUATORIAL,
        Quantity::Ecliptic => ECLIPTIC,
        Quantity::Distance => DISTANCE,
        Quantity::SunDistance => SUN_DISTANCE,
        Quantity::PhaseAngle => PHASE_ANGLE,
        Quantity::LitFraction => LIT_FRACTION,
        Quantity::Elongation => ELONGATION,
        Quantity::Diameter => DIAMETER,
        Quantity::Magnitude => MAGNITUDE,
        Quantity::Speed => SPEED,
        Quantity::BrightLimb => BRIGHT_LIMB,
        Quantity::RingOpening => RING_OPENING,
        Quantity::Axis => AXIS,
    }
}

/// The limits of one quantity of one body within a span.
pub(crate) fn limit(span: &Span, quantity: Quantity, body: Body) -> [f64; 3] {
    let row = limits(quantity).iter().find(|(other, ..)| *other == body);
    let (_, inner, outer) =
        row.unwrap_or_else(|| panic!("no limit for {} of {body}", quantity.label()));
    match span.part {
        Part::Inner => *inner,
        Part::Checked => *outer,
        // Beyond the checked span errors may be twice as large; a handful of instants only.
        Part::Answered => outer.map(|limit| 2.0 * limit),
    }
}

/// The limit of a direction above the horizon.
pub(crate) fn horizon_arcsec(body: Body) -> f64 {
    HORIZON_ARCSEC[Body::ALL
        .iter()
        .position(|other| *other == body)
        .expect("a body")]
    .1
}
