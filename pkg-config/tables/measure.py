"""What the quantised series leave: against DE440, body by body, as seen from the Sun and from the Earth's centre."""

import numpy as np

import kernel
import moon
import planets
from basis import PLANETS
from series import ARCSEC

LIGHT_DAY_AU = 173.1446326846693
SPANS = {"1600-2300": (1600, 2300), "1700-2200": (1700, 2200), "1900-2100": (1900, 2100), "1900-2050": (1900, 2050)}
INSTANTS = 12000
SEED = 20260103

# Around every closest approach to the Earth the sample is dense, since errors look largest there.
CLOSE_DAYS = np.arange(-16.0, 16.5, 2.0)
CLOSE_BODIES = ("mercury", "venus", "mars", "jupiter", "saturn")


def sample_days(body: str) -> np.ndarray:
    """Instants over 1600-2300, uniform at random, and the neighbourhoods of closest approaches."""
    days = np.random.default_rng(SEED).uniform(-400 * 365.25, 300 * 365.25, INSTANTS)
    if body not in CLOSE_BODIES:
        return np.sort(days)
    coarse = np.arange(-400 * 365.25, 300 * 365.25, 4.0)
    apart = kernel.heliocentric_au(body, coarse) - kernel.heliocentric_au("emb", coarse)
    distance = np.sqrt((apart**2).sum(axis=0))
    nearest = coarse[1:-1][(distance[1:-1] < distance[:-2]) & (distance[1:-1] < distance[2:])]
    close = (nearest[:, None] + CLOSE_DAYS).ravel()
    return np.sort(np.concatenate([days, close[np.abs(close + 50 * 365.25) < 350 * 365.25]]))


def angle_arcsec(a: np.ndarray, b: np.ndarray) -> np.ndarray:
    """Angles between the columns of two arrays of vectors."""
    a, b = a / np.linalg.norm(a, axis=0), b / np.linalg.norm(b, axis=0)
    return np.linalg.norm(a - b, axis=0) * ARCSEC


def summary(days: np.ndarray, errors: np.ndarray, digits: int) -> dict[str, list[float]]:
    """Root mean square and largest absolute value over each span."""
    out = {}
    for name, (first, last) in SPANS.items():
        part = errors[(days >= (first - 2000) * 365.25) & (days < (last - 2000) * 365.25)]
        out[name] = [round(float(np.sqrt((part**2).mean())), digits), round(float(np.abs(part).max()), digits)]
    return out


def earth_au(emb: np.ndarray, moon_km: np.ndarray) -> np.ndarray:
    """The Earth's centre from the barycentre and the Moon."""
    return emb - moon_km / kernel.AU_KM / (1 + kernel.EARTH_MOON_RATIO)


def measure(fits: dict, moon_fit) -> dict:
    """Errors of every body: geocentric direction, coordinates, distance."""
    out = {}

    def earths(days: np.ndarray) -> tuple[np.ndarray, np.ndarray]:
        t = days / 365250
        fitted_moon = kernel.from_ecliptic_of_date(moon.of_date(moon_fit, t), days)
        fitted = earth_au(planets.position_au(fits["emb"], "emb", t), fitted_moon)
        return fitted, earth_au(kernel.heliocentric_au("emb", days), kernel.moon_km(days))

    for body in PLANETS:
        days = sample_days(body)
        fitted_earth, true_earth = earths(days)
        if body == "emb":
            name, fitted, true = "sun", -fitted_earth, -true_earth
        else:
            name = body
            # The light time of the true place serves both: its own error shifts nothing that could be seen.
            true = kernel.heliocentric_au(body, days) - true_earth
            for _ in range(3):
                emitted = days - np.linalg.norm(true, axis=0) / LIGHT_DAY_AU
                true = kernel.heliocentric_au(body, emitted) - true_earth
            fitted = planets.position_au(fits[body], body, emitted / 365250) - fitted_earth
        relative = np.linalg.norm(fitted, axis=0) / np.linalg.norm(true, axis=0) - 1
        out[name] = {
            "geocentric direction, arcsec": summary(days, angle_arcsec(fitted, true), 3),
            "geocentric distance, 1e-6": summary(days, relative * 1e6, 3),
        }
        sums = fits[body].evaluate(planets.angles("planets", days / 365250), days / 365250)
        for axis, found, wanted in zip("LBR", sums, planets.truth_arcsec(body, days / 365250)):
            error = found - wanted
            if axis == "R":
                out[name]["heliocentric R, 1e-6"] = summary(days, error / ARCSEC * 1e6, 3)
            else:
                out[name][f"heliocentric {axis}, arcsec"] = summary(days, error, 3)
    days = sample_days("moon")
    found, wanted = moon.of_date(moon_fit, days / 365250), kernel.to_ecliptic_of_date(kernel.moon_km(days), days)
    out["moon"] = {
        "geocentric direction, arcsec": summary(days, angle_arcsec(found, wanted), 3),
        "geocentric distance, km": summary(days, np.linalg.norm(found, axis=0) - np.linalg.norm(wanted, axis=0), 2),
    }
    return out
