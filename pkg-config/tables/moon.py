"""Fits the Moon's series on DE440, in the mean ecliptic and equinox of date (IAU 2006)."""

import numpy as np

import greedy
import kernel
from basis import DELAUNAY
from series import ARCSEC, Series, Term, angles, instants_millennia, read_arguments, window_part

# Root-mean-square error aimed at per coordinate, arcseconds; the distance counts as an angle at the mean distance.
TOLERANCE_ARCSEC = 0.2
DISTANCE_FACTOR = 5.0
MEAN_DISTANCE_KM = 385000.0

DEGREES = (5, 3, 3)
OFFERED = (900, 150)
KNOWN_ARGUMENT_GAIN = 1.6
# A combination of the Moon's own angles stores one amplitude, one with planets two.
SINGLE_GAIN = 1.6

INSTANTS = 24000
SEED = 20260102


def mean_longitude_rad(turning: np.ndarray) -> np.ndarray:
    """F + Omega."""
    return turning[2] + turning[4]


def truth_arcsec(t: np.ndarray) -> list[np.ndarray]:
    """What the series must give: longitude beside F + Omega, latitude, distance beside the mean one as an angle."""
    days = t * 365250
    longitude, latitude, distance = kernel.spherical(kernel.to_ecliptic_of_date(kernel.moon_km(days), days))
    beside = (longitude - mean_longitude_rad(angles("moon", t)) + np.pi) % (2 * np.pi) - np.pi
    return [beside * ARCSEC, latitude * ARCSEC, (distance / MEAN_DISTANCE_KM - 1) * ARCSEC]


def fit() -> Series:
    """The quantised series."""
    t = instants_millennia(INSTANTS, SEED)
    x = window_part(t)
    listed = read_arguments("moon_arguments.txt", "moon")
    series = Series(single_below=len(DELAUNAY))
    turning = angles("moon", t)
    phases = np.array([np.array(multiples) @ turning for multiples in listed])
    used: set[int] = set()
    for coordinate, truth in enumerate(truth_arcsec(t)):
        tolerance = TOLERANCE_ARCSEC * (DISTANCE_FACTOR if coordinate == 2 else 1.0)
        offered = [(a, p) for p, count in enumerate(OFFERED) for a in range(min(count, len(listed)))]
        degree = DEGREES[coordinate]
        single = [series.is_single(listed[argument]) for argument, _ in offered]
        functions = [
            ((np.cos,) if coordinate == 2 else (np.sin,)) if alone else (np.cos, np.sin) for alone in single
        ]

        def columns(rows: slice, picks=range(len(offered))) -> np.ndarray:
            out = [x[rows] ** power for power in range(degree + 1)]
            for i in picks:
                argument, power = offered[i]
                weight = x[rows] ** power
                out += [weight * function(phases[argument, rows]) for function in functions[i]]
            return np.column_stack(out)

        blocks, column = [], degree + 1
        for functions_here in functions:
            blocks.append((column, column + len(functions_here) - 1))
            column += len(functions_here)
        g, b = greedy.gram(columns, truth)
        chosen = greedy.choose(
            g,
            b,
            float((truth**2).mean()),
            list(range(degree + 1)),
            blocks,
            lambda i: (KNOWN_ARGUMENT_GAIN if offered[i][0] in used else 1.0) * (SINGLE_GAIN if single[i] else 1.0),
            tolerance,
        )
        amplitudes = greedy.solve(columns(slice(None), chosen), truth)
        terms, column = [], degree + 1
        for i in chosen:
            argument, power = offered[i]
            used.add(argument)
            values = list(amplitudes[column : column + len(functions[i])])
            column += len(values)
            if single[i]:
                values = [values[0], 0.0] if coordinate == 2 else [0.0, values[0]]
            terms.append(Term(listed[argument], power, *values))
        series.add(coordinate, amplitudes[: degree + 1], terms, tolerance)
    return series


def of_date(series: Series, t: np.ndarray) -> np.ndarray:
    """Geocentric position (3 by n, km) in the mean ecliptic and equinox of date that the quantised series gives."""
    turning = angles("moon", t)
    longitude, latitude, distance = series.evaluate(turning, t)
    longitude = longitude / ARCSEC + mean_longitude_rad(turning)
    latitude = latitude / ARCSEC
    r = MEAN_DISTANCE_KM * (1 + distance / ARCSEC)
    cos_b = np.cos(latitude)
    return np.array([r * cos_b * np.cos(longitude), r * cos_b * np.sin(longitude), r * np.sin(latitude)])
