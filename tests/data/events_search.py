"""Roots and extrema of functions of time, many at once: sample densely, then close in on all brackets together.

A function takes an array of days and answers an array of the same length. Nothing here knows astronomy.
"""

import numpy as np

GOLDEN = (np.sqrt(5) - 1) / 2


def wrapped(angle_deg):
    """Degrees reduced to -180 up to 180."""
    return np.mod(angle_deg + 180, 360) - 180


def roots(function, days, values, largest_jump=np.inf):
    """Every instant where the function passes zero; `values` are its samples at `days`.

    A pair of roots between two samples shows as a sample that is nearest to zero without crossing; there the true
    extremum is sought, and when it lies across zero both roots are taken.
    """
    days, values = np.asarray(days), np.where(values == 0, 1e-300, values)
    crossing = (values[:-1] * values[1:] < 0) & (np.abs(np.diff(values)) <= largest_jump)
    starts, ends = days[:-1][crossing], days[1:][crossing]
    size = np.abs(values)
    before, middle, after = size[:-2], size[1:-1], size[2:]
    same_side = (values[:-2] * values[1:-1] > 0) & (values[1:-1] * values[2:] > 0)
    # A parabola through three samples dips below the middle one by an eighth of the second difference at most.
    near = (middle <= before) & (middle < after) & (middle < before - 2 * middle + after) & same_side
    at = 1 + np.flatnonzero(near)
    if len(at):
        side = np.sign(values[at])
        bottom = minima_within(lambda t: side * function(t), days[at - 1], days[at + 1])
        across = side * function(bottom) < 0
        starts = np.concatenate([starts, days[at - 1][across], bottom[across]])
        ends = np.concatenate([ends, bottom[across], days[at + 1][across]])
    return np.sort(roots_within(function, starts, ends)) if len(starts) else starts


def roots_within(function, starts, ends, tolerance_days=1e-8):
    """One root in each bracket: bisection and inverse quadratic steps.

    T. R. Chandrupatla 1997, A new hybrid quadratic/bisection algorithm, Advances in Engineering Software 28, 145-149.
    """
    a, b = np.array(ends, dtype=float), np.array(starts, dtype=float)
    fa, fb = function(a), function(b)
    assert np.all(fa * fb <= 0), "a bracket without a change of sign"
    c, fc = a.copy(), fa.copy()
    share = np.full(len(a), 0.5)
    for _ in range(80):
        probe = a + share * (b - a)
        value = function(probe)
        same = np.sign(value) == np.sign(fa)
        c, fc = np.where(same, a, b), np.where(same, fa, fb)
        b, fb = np.where(same, b, a), np.where(same, fb, fa)
        a, fa = probe, value
        least = tolerance_days / np.maximum(np.abs(b - a), 1e-300)
        done = (least > 0.5) | (fa == 0)
        if np.all(done):
            break
        with np.errstate(all="ignore"):
            xi, phi = (a - b) / (c - b), (fa - fb) / (fc - fb)
            quadratic = (phi**2 < xi) & ((1 - phi) ** 2 < 1 - xi)
            step = fa / (fb - fa) * fc / (fb - fc) + (c - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb)
        share = np.where(quadratic & np.isfinite(step), step, 0.5)
        share = np.where(done, 0.0, np.clip(share, np.minimum(least, 0.5), np.maximum(1 - least, 0.5)))
    assert np.all(done), "a root was not closed in on"
    return np.where(np.abs(fa) < np.abs(fb), a, b)


def minima_within(function, starts, ends, tolerance_days=1e-6):
    """The minimum in each bracket by golden section; noise of the function limits what is reached, not the method."""
    a, b = np.array(starts, dtype=float), np.array(ends, dtype=float)
    inner, outer = b - GOLDEN * (b - a), a + GOLDEN * (b - a)
    f_inner, f_outer = function(inner), function(outer)
    while np.max(b - a) > tolerance_days:
        left = f_inner < f_outer
        a, b = np.where(left, a, inner), np.where(left, outer, b)
        probe = np.where(left, b - GOLDEN * (b - a), a + GOLDEN * (b - a))
        value = function(probe)
        inner, outer = np.where(left, probe, outer), np.where(left, inner, probe)
        f_inner, f_outer = np.where(left, value, f_outer), np.where(left, f_inner, value)
    return (a + b) / 2


def brackets_of_minima(days, values):
    """First and last day of every three samples of which the middle one is least; none beside a NaN."""
    with np.errstate(invalid="ignore"):
        low = (values[1:-1] <= values[:-2]) & (values[1:-1] < values[2:])
    at = 1 + np.flatnonzero(low)
    return days[at - 1], days[at + 1]


def minima(function, days, values):
    """Every local minimum of the function."""
    starts, ends = brackets_of_minima(days, values)
    return minima_within(function, starts, ends) if len(starts) else starts
