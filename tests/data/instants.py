"""The instants at which the reference data are given: drawn at random with a recorded seed, and chosen by hand."""

import datetime

import numpy as np

SEED = 17_002_200
EPOCH = datetime.datetime(2000, 1, 1, 12)


def civil(days):
    """Whole-second civil text (proleptic Gregorian) of days of 86,400 s since 2000-01-01 12h."""
    return (EPOCH + datetime.timedelta(seconds=round(days * 86_400))).strftime("%Y-%m-%dT%H:%M:%SZ")


def days_of(year, month=1, day=1, hour=0, minute=0, second=0):
    return (datetime.datetime(year, month, day, hour, minute, second) - EPOCH).total_seconds() / 86_400


def drawn():
    """Random instants: dense in 1900-2100, thinner to both ends of 1700-2200, and a few beyond them."""
    random = np.random.default_rng(SEED)
    centuries = [(1700, 1800, 50), (1800, 1900, 50), (1900, 2000, 120), (2000, 2101, 120), (2101, 2201, 60)]
    for first, last, count in [*centuries, (1601, 1700, 12), (2201, 2300, 12)]:
        edges = np.linspace(days_of(first), days_of(last), count + 1)
        for lower, upper in zip(edges, edges[1:]):
            yield random.uniform(lower, upper), "drawn"


def local_extremes(values, sign):
    """Indices of the local maxima of `sign * values`."""
    v = sign * values
    return 1 + np.flatnonzero((v[1:-1] > v[:-2]) & (v[1:-1] >= v[2:]))


def chosen(geometry):
    """Instants picked for what happens then. `geometry(name, days)` gives distance, elongation and ring opening."""
    days = np.arange(days_of(1700, 1, 2), days_of(2200, 12, 30), 1.0)
    venus, mars, mercury, saturn = (geometry(name, days) for name in ("venus", "mars", "mercury", "saturn"))
    near_venus = local_extremes(venus["distance_au"], -1)
    for at in near_venus[::6]:
        yield days[at], "venus nearest"
    for at in local_extremes(mars["distance_au"], -1)[::6]:
        yield days[at], "mars nearest"
    for at in local_extremes(mercury["elongation_deg"], 1)[::140]:
        yield days[at], "mercury elongation"
    for at in local_extremes(venus["elongation_deg"], 1)[::50]:
        yield days[at], "venus elongation"
    for at in local_extremes(mercury["distance_au"], -1)[::120]:
        yield days[at], "mercury nearest"
    for at in local_extremes(venus["distance_au"], 1)[::60]:
        yield days[at], "venus farthest"
    opening = saturn["ring_opening_deg"]
    for at in np.flatnonzero(opening[:-1] * opening[1:] <= 0):
        yield days[at], "saturn ring plane"
    for parts, why in [
        ((1700, 1, 1), "first day"),
        ((2200, 12, 31, 23, 59, 59), "last day"),
        ((1769, 6, 3, 22), "venus transit"),
        ((1882, 12, 6, 17), "venus transit"),
        ((2012, 6, 6, 1, 30), "venus transit"),
        ((2019, 11, 11, 15, 20), "mercury transit"),
        ((1971, 12, 31, 23, 59, 59), "before leap seconds"),
        ((1972, 1, 1, 0, 0, 1), "first leap-second day"),
        ((1972, 6, 30, 23, 59, 59), "leap second"),
        ((1972, 7, 1, 0, 0, 1), "leap second"),
        ((1999, 1, 1, 0, 0, 1), "leap second"),
        ((2005, 12, 31, 23, 59, 59), "leap second"),
        ((2006, 1, 1, 0, 0, 1), "leap second"),
        ((2016, 12, 31, 23, 59, 59), "leap second"),
        ((2017, 1, 1, 0, 0, 1), "leap second"),
        ((1900, 1, 1), "century day"),
        ((2000, 2, 29, 12), "leap day"),
        ((2100, 3, 1), "no leap day"),
        ((2003, 8, 28), "mars brightest"),
        ((2026, 11, 25, 2), "venus brightest"),
        ((2020, 12, 21, 18), "jupiter beside saturn"),
        ((1999, 8, 11, 11), "solar eclipse"),
        ((2018, 7, 27, 20, 22), "lunar eclipse"),
        ((2016, 11, 14, 13, 52), "moon near and full"),
    ]:
        yield days_of(*parts), why
