"""The Moon's phases and apsides, its meetings with the planets, and instants at which it shows a planet's phase."""

import numpy as np

from events_search import minima, roots, wrapped
from events_sky import PLANETS, Sky

STEP_DAYS = 0.25
# Every event of the span has samples on both sides.
MARGIN_DAYS = 3.0
# A conjunction in right ascension and the least separation that goes with it are not further apart.
LONGEST_LAG_DAYS = 1.0
PHASES = {"new-moon": 0, "first-quarter": 90, "full-moon": 180, "last-quarter": 270}


class Moon:
    def __init__(self, start, end):
        self.days = np.arange(start - MARGIN_DAYS, end + MARGIN_DAYS, STEP_DAYS)
        self.sky = Sky(self.days)

    def alone(self):
        for kind, excess in PHASES.items():
            samples = wrapped(self.sky.from_sun_longitude_deg("moon") - excess)
            found = roots(lambda t: wrapped(Sky(t).from_sun_longitude_deg("moon") - excess), self.days, samples, 180)
            yield from ({"kind": kind, "tt": tt} for tt in found)
        for kind, sign in (("moon-perigee", 1), ("moon-apogee", -1)):
            found = minima(lambda t: sign * Sky(t).distance_au("moon"), self.days, sign * self.sky.distance_au("moon"))
            yield from ({"kind": kind, "tt": tt} for tt in found)

    def meetings(self):
        """Every passage of the Moon by a planet: the conjunction in right ascension and the least separation."""
        for name in PLANETS:

            def difference(sky):
                return wrapped(sky.ra_deg("moon") - sky.ra_deg(name))

            met = roots(lambda t: difference(Sky(t)), self.days, difference(self.sky), 180)
            met = met[(met > self.days[0] + LONGEST_LAG_DAYS) & (met < self.days[-1] - LONGEST_LAG_DAYS)]
            closest = minima(lambda t: Sky(t).square_of_chord("moon", name), self.days, self.sky.square_of_chord("moon", name))
            # One least separation belongs to each conjunction and none is left between the first and the last.
            nearest = np.array([np.argmin(np.abs(closest - tt)) for tt in met])
            assert np.all(np.diff(nearest) == 1) and np.all(np.abs(closest[nearest] - met) < LONGEST_LAG_DAYS)
            closest = closest[nearest]
            separations = (Sky(t).separation_deg("moon", name) * 3600 for t in (met, closest))
            for tt, least, separation, least_separation in zip(met, closest, *separations):
                row = {"body": name, "tt": tt, "separation_arcsec": separation, "closest_after_days": least - tt}
                yield row | {"least_separation_arcsec": least_separation}

    def of_same_phase(self):
        for name in PLANETS:

            def excess(sky):
                # Twice the difference of the lit fractions.
                return np.cos(np.radians(sky.phase_angle_deg("moon"))) - np.cos(np.radians(sky.phase_angle_deg(name)))

            found = roots(lambda t: excess(Sky(t)), self.days, excess(self.sky))
            if len(found) == 0:
                continue
            sky, before, after = Sky(found), Sky(found - 0.02), Sky(found + 0.02)
            rate = {body: (after.phase_angle_deg(body) - before.phase_angle_deg(body)) / 0.04 for body in ("moon", name)}
            columns = sky.separation_deg("moon", name), rate["moon"], rate[name]
            for tt, separation, moon_rate, rate_of_planet in zip(found, *columns):
                row = {"body": name, "tt": tt, "separation_deg": separation}
                row |= {"moon_waxing": int(moon_rate < 0), "planet_waxing": int(rate_of_planet < 0)}
                yield row | {"phase_rate_deg_per_day": moon_rate - rate_of_planet}
