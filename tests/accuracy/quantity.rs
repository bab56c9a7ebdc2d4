//! What is compared: how far one answer is from its row of the reference, quantity by quantity.

use crate::support::{Row, separation_arcsec, turn_deg};
use wanderlight::Circumstances;

/// A quantity of the reference table, with the unit of its error.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(crate) enum Quantity {
    /// Right ascension and declination together, as an angle on the sky.
    Equatorial,
    /// Ecliptic longitude and latitude together, as an angle on the sky.
    Ecliptic,
    /// Distance from the Earth, in millionths of itself.
    Distance,
    /// Distance from the Sun, in millionths of itself.
    SunDistance,
    /// Phase angle.
    PhaseAngle,
    /// Lit fraction.
    LitFraction,
    /// Elongation from the Sun.
    Elongation,
    /// Equatorial diameter, in millionths of itself.
    Diameter,
    /// Visual magnitude.
    Magnitude,
    /// Orbital speed.
    Speed,
    /// Position angle of the bright limb, times the sine of the elongation: the sideways error that it stands for.
    BrightLimb,
    /// Saturn's ring opening.
    RingOpening,
    /// Position angle of Saturn's axis.
    Axis,
}

impl Quantity {
    /// Every quantity in the order of the printed table.
    pub(crate) const ALL: [Quantity; 13] = [
        Quantity::Equatorial,
        Quantity::Ecliptic,
        Quantity::Distance,
        Quantity::SunDistance,
        Quantity::PhaseAngle,
        Quantity::LitFraction,
        Quantity::Elongation,
        Quantity::Diameter,
        Quantity::Magnitude,
        Quantity::Speed,
        Quantity::BrightLimb,
        Quantity::RingOpening,
        Quantity::Axis,
    ];

    /// Name and unit of the error.
    pub(crate) const fn label(self) -> &'static str {
        match self {
            Quantity::Equatorial => "RA and Dec, arcsec",
            Quantity::Ecliptic => "ecliptic place, arcsec",
            Quantity::Distance => "distance, ppm",
            Quantity::SunDistance => "Sun distance, ppm",
            Quantity::PhaseAngle => "phase angle, arcsec",
            Quantity::LitFraction => "lit fraction, 1e-6",
            Quantity::Elongation => "elongation, arcsec",
            Quantity::Diameter => "diameter, ppm",
            Quantity::Magnitude => "magnitude, mmag",
            Quantity::Speed => "orbital speed, m/s",
            Quantity::BrightLimb => "bright limb, arcsec",
            Quantity::RingOpening => "ring opening, arcsec",
            Quantity::Axis => "Saturn's axis, arcsec",
        }
    }

    /// Size of the error; none where the reference has no value or the body lies behind the Sun's disc.
    ///
    /// Where only the crate has no value the error is infinite, so that a missing value cannot pass.
    pub(crate) fn error(self, got: &Circumstances, row: Row<'_>) -> Option<f64> {
        let plain = |got: Option<f64>, column: &str| {
            row.maybe(column)
                .map(|want| got.map_or(f64::INFINITY, |got| (got - want).abs()))
        };
        let angle = |got: Option<f64>, column: &str| {
            row.maybe(column)
                .map(|want| got.map_or(f64::INFINITY, |got| turn_deg(got - want).abs() * 3600.0))
        };
        let share = |got: f64, column: &str| {
            row.maybe(column)
                .filter(|want| *want != 0.0)
                .map(|want| (got / want - 1.0).abs() * 1e6)
        };
        let place = |got: [f64; 2], columns: [&str; 2]| {
            separation_arcsec(got, columns.map(|name| row.number(name)))
        };
        let seen = !hidden_by_sun(row);
        match self {
            Quantity::Equatorial => seen.then(|| {
                place(
                    [got.right_ascension_deg, got.declination_deg],
                    ["ra_deg", "dec_deg"],
                )
            }),
            Quantity::Ecliptic => seen.then(|| {
                place(
                    [got.ecliptic_longitude_deg, got.ecliptic_latitude_deg],
                    ["ecl_lon_deg", "ecl_lat_deg"],
                )
            }),
            Quantity::Distance => share(got.distance_au, "distance_au"),
            Quantity::SunDistance => share(got.sun_distance_au, "sun_distance_au"),
            Quantity::PhaseAngle => angle(got.phase_angle_deg, "phase_angle_deg"),
            Quantity::LitFraction => {
                plain(got.illuminated_fraction, "lit_fraction").map(|error| error * 1e6)
            }
            Quantity::Elongation => angle(got.elongation_deg, "elongation_deg").filter(|_| seen),
            Quantity::Diameter => share(got.angular_diameter_arcsec, "diameter_arcsec"),
            Quantity::Magnitude => {
                let as_published = got
                    .magnitude
                    .map(|magnitude| magnitude + held_back_mag(row));
                plain(as_published, "magnitude").map(|error| error * 1e3)
            }
            Quantity::Speed => {
                plain(got.orbital_speed_km_s, "orbital_speed_km_s").map(|error| error * 1e3)
            }
            Quantity::BrightLimb => {
                let lever = row.maybe("elongation_deg")?.to_radians().sin();
                angle(got.bright_limb_angle_deg, "bright_limb_deg")
                    .filter(|_| seen)
                    .map(|error| error * lever)
            }
            Quantity::RingOpening => angle(got.ring_opening_deg, "ring_opening_deg"),
            Quantity::Axis => angle(got.axis_angle_deg, "axis_deg"),
        }
    }
}

/// The term in phase angle that the crate leaves out for Uranus and Neptune as seen from the Earth.
///
/// The laws' authors let it begin at 3.1 and 1.9 degrees, just below the largest angles seen from here, with a step of
/// 0.02 mag. The crate takes it for views from elsewhere only, so that no curve jumps; the reference follows the authors.
fn held_back_mag(row: Row<'_>) -> f64 {
    let i_deg = row.maybe("phase_angle_deg").unwrap_or_default();
    match row.text("body") {
        "uranus" if i_deg > 3.1 => (6.587e-3 + 1.045e-4 * i_deg) * i_deg,
        "neptune" if i_deg > 1.9 => (7.944e-3 + 9.617e-5 * i_deg) * i_deg,
        _ => 0.0,
    }
}

/// Behind the Sun's disc: nothing is seen there, and the bending of light grows without bound.
pub(crate) fn hidden_by_sun(row: Row<'_>) -> bool {
    let behind = row.number("distance_au") > row.number("sun_distance_au").max(0.9);
    behind
        && row
            .maybe("elongation_deg")
            .is_some_and(|elongation_deg| elongation_deg < 0.27)
}
