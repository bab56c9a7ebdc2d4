"""DE440 positions for the unit tests of src/series: quiet dates, both ends of the span, and the hardest geometry."""

import numpy as np

import kernel
from basis import PLANETS
from outputs import rust_header

# Days from J2000.0 TDB. The span's ends, and dates that the tests add for one reason or another.
START_OF_1600 = -146096.5
START_OF_2300 = 109572.5
CASES = [
    ("start of the span", START_OF_1600),
    ("", -109573.25),
    ("", -60000.125),
    ("", -20000.0),
    ("J2000.0", 0.0),
    ("", 9862.375),
    ("", 36524.5),
    ("", 73048.625),
    ("end of the span", START_OF_2300),
]

VARIANTS = dict(
    zip(
        PLANETS,
        ["Mercury", "Venus", "EarthMoonBarycentre", "Mars", "Jupiter", "Saturn", "Uranus", "Neptune"],
    )
)


def nearest_to_earth(body: str, first_day: float, last_day: float) -> float:
    """The whole day of least distance from the Earth-Moon barycentre between two days."""
    days = np.arange(first_day, last_day)
    apart = kernel.heliocentric_au(body, days) - kernel.heliocentric_au("emb", days)
    return float(days[np.argmin((apart**2).sum(axis=0))])


def cases() -> list[tuple[str, str, float]]:
    """Body, remark and day of every planetary position."""
    out = [(body, remark, day) for body in PLANETS for remark, day in CASES]
    out += [("venus", "inferior conjunction", nearest_to_earth("venus", year, year + 590)) for year in (-135000, 300, 9500)]
    out += [("emb", "with it", day) for body, _, day in out[-3:]]
    mars = [("mars", "opposition", nearest_to_earth("mars", year, year + 790)) for year in (-100000, 1000, 70000)]
    return out + mars + [("emb", "with it", day) for _, _, day in mars]


def build() -> str:
    """The Rust file."""
    text = rust_header("Positions from JPL DE440 (Park et al. 2021, Astronomical Journal 161, 105) for the tests.")
    text += """
use super::SeriesBody::{self, *};

/// Body, days from J2000.0 TDB, heliocentric ICRS position in au.
#[rustfmt::skip]
pub(super) const PLANETS: &[(SeriesBody, f64, [f64; 3])] = &[
"""
    for body, remark, day in cases():
        x, y, z = kernel.heliocentric_au(body, np.array([day]))[:, 0]
        note = f" // {remark}" if remark else ""
        text += f"    ({VARIANTS[body]}, {day!r}, [{x:.9f}, {y:.9f}, {z:.9f}]),{note}\n"
    text += """];

/// Days from J2000.0 TDB, then longitude and latitude in degrees and distance in kilometres: the Moon from the Earth's
/// centre, mean ecliptic and equinox of date (ERFA, IAU 2006).
#[rustfmt::skip]
pub(super) const MOON: &[(f64, [f64; 3])] = &[
"""
    days = np.array([START_OF_1600, *np.round(np.linspace(-140000, 105000, 22), 3), START_OF_2300])
    longitude, latitude, distance = kernel.spherical(kernel.to_ecliptic_of_date(kernel.moon_km(days), days))
    for day, l, b, r in zip(days, np.degrees(longitude) % 360, np.degrees(latitude), distance):
        text += f"    ({float(day)!r}, [{l:.7f}, {b:.7f}, {r:.3f}]),\n"
    return text + "];\n"
