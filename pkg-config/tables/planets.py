"""Fits the eight heliocentric series on DE440."""

import numpy as np

import greedy
import kernel
from basis import PLANET_AXES, PLANET_LONGITUDES, PLANET_RATES, PLANETS
from series import ARCSEC, Series, Term, angles, instants_millennia, read_arguments, window_part

# Root-mean-square error aimed at per coordinate, arcseconds, before the factors below.
TOLERANCE_ARCSEC = 0.13

# The nearer a body comes to the Earth, the more its heliocentric error is magnified; the Earth's own enters everywhere.
BODY_FACTOR = dict(zip(PLANETS, [1.0, 0.5, 0.35, 0.4, 0.8, 0.8, 0.8, 0.8]))

# A radius error reaches the sky only through the parallax of the Earth's orbit.
RADIUS_FACTOR = dict(zip(PLANETS, [1.0, 1.0, 1.0, 1.0, 4.0, 8.0, 16.0, 25.0]))

DEGREES = (6, 4, 5)

# How many of the listed arguments are offered with the powers 0, 1, 2, 3 of time.
OFFERED = (500, 160, 60, 30)

# An argument that the body has already costs only its amplitudes.
KNOWN_ARGUMENT_GAIN = 1.6

INSTANTS = 14000
SEED = 20260101


def truth_arcsec(body: str, t: np.ndarray) -> list[np.ndarray]:
    """What the series must give beside the mean motion: longitude, latitude and relative radius."""
    i = PLANETS.index(body)
    longitude, latitude, radius = kernel.spherical(kernel.to_series_plane(kernel.heliocentric_au(body, t * 365250)))
    mean = PLANET_LONGITUDES[i] + PLANET_RATES[i] * t
    beside = (longitude - mean + np.pi) % (2 * np.pi) - np.pi
    return [beside * ARCSEC, latitude * ARCSEC, (radius / PLANET_AXES[i] - 1) * ARCSEC]


def fit(body: str) -> Series:
    """The quantised series of one body."""
    t = instants_millennia(INSTANTS, SEED)
    x = window_part(t)
    listed = read_arguments("planet_arguments.txt", body)
    used: set[int] = set()
    series = Series()
    turning = angles("planets", t)
    phases = np.array([np.array(multiples) @ turning for multiples in listed])
    for coordinate, truth in enumerate(truth_arcsec(body, t)):
        tolerance = TOLERANCE_ARCSEC * BODY_FACTOR[body] * (RADIUS_FACTOR[body] if coordinate == 2 else 1.0)
        offered = [(a, p) for p, count in enumerate(OFFERED) for a in range(min(count, len(listed)))]
        degree = DEGREES[coordinate]

        def columns(rows: slice, pairs=offered) -> np.ndarray:
            out = np.empty((len(x[rows]), degree + 1 + 2 * len(pairs)))
            for power in range(degree + 1):
                out[:, power] = x[rows] ** power
            for i, (argument, power) in enumerate(pairs):
                phase, weight = phases[argument, rows], x[rows] ** power
                out[:, degree + 1 + 2 * i] = weight * np.cos(phase)
                out[:, degree + 2 + 2 * i] = weight * np.sin(phase)
            return out

        g, b = greedy.gram(columns, truth)
        blocks = [(degree + 1 + 2 * i, degree + 2 + 2 * i) for i in range(len(offered))]
        chosen = greedy.choose(
            g,
            b,
            float((truth**2).mean()),
            list(range(degree + 1)),
            blocks,
            lambda i: KNOWN_ARGUMENT_GAIN if offered[i][0] in used else 1.0,
            tolerance,
        )
        kept = [offered[i] for i in chosen]
        amplitudes = greedy.solve(columns(slice(None), kept), truth)
        used |= {argument for argument, _ in kept}
        terms = [
            Term(listed[argument], power, amplitudes[degree + 1 + 2 * i], amplitudes[degree + 2 + 2 * i])
            for i, (argument, power) in enumerate(kept)
        ]
        series.add(coordinate, amplitudes[: degree + 1], terms, tolerance)
    return series


def position_au(series: Series, body: str, t: np.ndarray) -> np.ndarray:
    """Heliocentric ICRS position (3 by n) that the quantised series gives."""
    i = PLANETS.index(body)
    longitude, latitude, radius = series.evaluate(angles("planets", t), t)
    longitude = longitude / ARCSEC + PLANET_LONGITUDES[i] + PLANET_RATES[i] * t
    latitude = latitude / ARCSEC
    r = PLANET_AXES[i] * (1 + radius / ARCSEC)
    cos_b = np.cos(latitude)
    plane = np.array([r * cos_b * np.cos(longitude), r * cos_b * np.sin(longitude), r * np.sin(latitude)])
    return kernel.from_series_plane(plane)
