"""Events of the planets with the Sun, by their light, by their motion, and with each other. Definitions: SOURCES.md."""

import itertools

import numpy as np

from build_reference import SCALE
from events_search import brackets_of_minima, minima, minima_within, roots, wrapped
from events_sky import INNER, OUTER, PLANETS, Sky

STEP_DAYS = 1.0
# Some extrema hardly stand out from the slope beside them: light by millionths of a magnitude, separations by arcseconds.
FINE_STEP_DAYS = 0.1
# Half a synodic round of Mars and more: whole rounds are seen on either side of the span.
MARGIN_DAYS = 420.0
ORBIT_DAYS = {"mercury": 87.97, "venus": 224.70, "mars": 686.98, "jupiter": 4332.6, "saturn": 10759.2, "uranus": 30688.5, "neptune": 60182.0}
CLOSE_DEG = 5.0


class Planets:
    """Samples of a span, shared by all searches; every search yields rows as dictionaries, also from the margins."""

    def __init__(self, start, end):
        self.days = np.arange(start - MARGIN_DAYS, end + MARGIN_DAYS, STEP_DAYS)
        self.sky = Sky(self.days)
        self.fine_days = np.arange(self.days[0], self.days[-1], FINE_STEP_DAYS)
        self.fine_sky = Sky(self.fine_days)
        self.conjunctions = {name: self.meets_sun(name, 0) for name in PLANETS}

    def meets_sun(self, name, excess_deg):
        """Instants at which the body's longitude exceeds the Sun's by so much."""
        samples = wrapped(self.sky.from_sun_longitude_deg(name) - excess_deg)
        return roots(lambda t: wrapped(Sky(t).from_sun_longitude_deg(name) - excess_deg), self.days, samples, 180)

    def is_inferior(self, name):
        sky = Sky(self.conjunctions[name])
        return sky.distance_au(name) < sky.distance_au("sun")

    def with_the_sun(self):
        for name in INNER:
            inferior = self.is_inferior(name)
            yield from with_elongation("inferior-conjunction", name, self.conjunctions[name][inferior])
            yield from with_elongation("superior-conjunction", name, self.conjunctions[name][~inferior])
            found = minima(lambda t: -Sky(t).separation_deg(name, "sun"), self.fine_days, -self.fine_sky.separation_deg(name, "sun"))
            east = Sky(found).from_sun_longitude_deg(name) < 180
            yield from with_elongation("greatest-elongation-east", name, found[east])
            yield from with_elongation("greatest-elongation-west", name, found[~east])
            half = roots(lambda t: Sky(t).phase_angle_deg(name) - 90, self.days, self.sky.phase_angle_deg(name) - 90)
            yield from with_elongation("half-phase", name, half)
        for name in OUTER:
            yield from with_elongation("conjunction", name, self.conjunctions[name])
            for kind, excess in (("opposition", 180), ("quadrature-east", 90), ("quadrature-west", 270)):
                yield from with_elongation(kind, name, self.meets_sun(name, excess))

    def by_light(self):
        days, sky = self.fine_days, self.fine_sky
        for name in INNER:
            merits = -sky.lit_area_arcsec2(name)
            found = minima(lambda t: -Sky(t).lit_area_arcsec2(name), days, merits)
            parts = np.searchsorted(self.conjunctions[name], found)
            yield from with_light("greatest-illuminated-extent", name, found, parts, -Sky(found).lit_area_arcsec2(name), days, merits)
        for name in PLANETS:
            around, merits = (days, sky.magnitude(name)) if name in INNER else (self.days, self.sky.magnitude(name))
            found = minima(lambda t: Sky(t).magnitude(name), around, merits)
            there = Sky(found)
            if name in INNER:
                found = found[there.phase_angle_deg(name) < 160]
            else:
                found = found[there.separation_deg(name, "sun") > 120]
            # Venus has a brightest moment on either side of inferior conjunction, the others have one a round.
            ends = self.conjunctions[name]
            if name == "mercury":
                ends = ends[self.is_inferior(name)]
            parts = np.searchsorted(ends, found)
            yield from with_light("greatest-brightness", name, found, parts, Sky(found).magnitude(name), around, merits)

    def by_motion(self):
        for name in PLANETS:
            samples = np.unwrap(self.sky.ra_deg(name), period=360)
            for kind, sign in (("station-retrograde", -1), ("station-direct", 1)):
                starts, ends = brackets_of_minima(self.days, sign * samples)
                if len(starts) == 0:
                    continue
                middle = Sky((starts + ends) / 2).ra_deg(name)
                found = minima_within(lambda t: sign * wrapped(Sky(t).ra_deg(name) - middle), starts, ends)
                for tt, ra in zip(found, Sky(found).ra_deg(name)):
                    yield {"kind": kind, "body": name, "tt": tt, "ra_deg": ra}
            found = minima(lambda t: Sky(t).distance_au(name), self.days, self.sky.distance_au(name))
            for tt, distance in zip(found, Sky(found).distance_au(name)):
                yield {"kind": "closest-approach", "body": name, "tt": tt, "distance_au": distance}

    def conjunctions_of_pairs(self):
        for first, second in itertools.combinations(PLANETS, 2):

            def difference(sky):
                return wrapped(sky.ra_deg(first) - sky.ra_deg(second))

            yield from with_separation(first, second, roots(lambda t: difference(Sky(t)), self.days, difference(self.sky), 180))

    def closest_of_pairs(self):
        for first, second in itertools.combinations(PLANETS, 2):
            samples = self.fine_sky.square_of_chord(first, second)
            found = minima(lambda t: Sky(t).square_of_chord(first, second), self.fine_days, samples)
            found = found[Sky(found).separation_deg(first, second) < CLOSE_DEG]
            yield from with_separation(first, second, found)


def apsides(names, start, end):
    """Extrema of the geometric distance from the Sun; secondary when another within a quarter of an orbit beats them."""
    for name in names:
        quarter = ORBIT_DAYS[name] / 4
        days = np.arange(start - quarter - 2 * STEP_DAYS, end + quarter + 2 * STEP_DAYS, 10.0 if quarter > 1000 else STEP_DAYS)
        samples = Bare(days).heliocentric_distance_au(name)
        for kind, sign in (("perihelion", 1), ("aphelion", -1)):
            found = minima(lambda t: sign * Bare(t).heliocentric_distance_au(name), days, sign * samples)
            distance = Bare(found).heliocentric_distance_au(name)
            for tt, r in zip(found, distance):
                beaten = np.any(sign * samples[np.abs(days - tt) <= quarter] < sign * r - 1e-9)
                yield {"kind": kind, "body": name, "tt": tt, "distance_au": r, "secondary": int(beaten)}


class Bare(Sky):
    """A sky of which only geometric distances are asked: TDB is taken as TT, and no Earth is placed."""

    def __init__(self, tt_days):
        self.tt_days = np.asarray(tt_days, dtype=float)
        self.time = SCALE.tt_jd(2_451_545.0, self.tt_days)
        self.answers = {}


def with_elongation(kind, name, found):
    for tt, elongation in zip(found, Sky(found).separation_deg(name, "sun")):
        yield {"kind": kind, "body": name, "tt": tt, "elongation_deg": elongation}


def with_light(kind, name, found, groups, merit, days, merits):
    """The least merit of each group is the event proper; the others are secondary and may hardly stand out."""
    sky = Sky(found)
    for n, (tt, magnitude, area) in enumerate(zip(found, sky.magnitude(name), sky.lit_area_arcsec2(name))):
        row = {"kind": kind, "body": name, "tt": tt, "magnitude": magnitude, "lit_area_arcsec2": area, "secondary": 0}
        if np.any(merit[groups == groups[n]] < merit[n]):
            after = np.searchsorted(days, tt)
            sides = merits[after:], merits[after - 1 :: -1]
            row |= {"secondary": 1, "stands_out_by": min(climb(merit[n], side) for side in sides)}
        yield row


def climb(bottom, side):
    """How far one must climb from a minimum along the samples of one side before it goes below it."""
    beyond = np.flatnonzero(side < bottom)
    passed = side[: beyond[0]] if len(beyond) else side
    return np.max(passed, initial=bottom) - bottom


def with_separation(first, second, found):
    for tt, separation in zip(found, Sky(found).separation_deg(first, second) if len(found) else found):
        yield {"body": first, "other": second, "tt": tt, "separation_deg": separation}
