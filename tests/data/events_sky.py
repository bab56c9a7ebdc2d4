"""The sky at an array of instants, as far as events need it: apparent places, distances, phase, light.

Positions are JPL DE440's through a general-purpose library, with light time, deflection, aberration, IAU 2006 precession
and IAU 2000A nutation; magnitudes follow laws.py. Every figure is worked out when first asked for, and kept.
"""

import functools

import numpy as np
from skyfield.framelib import ecliptic_frame

import instants
import laws
from build_reference import C_AU_DAY, EARTH, KERNEL, LEAP_SECONDS_FROM, LEAP_SECONDS_TO, SCALE, SUN, TARGET, leap_seconds, magnitude, time_of

INNER = ["mercury", "venus"]
OUTER = ["mars", "jupiter", "saturn", "uranus", "neptune"]
PLANETS = INNER + OUTER
J2000_TILT = np.radians(84_381.406 / 3600)


def kept(method):
    """Keeps a method's answer for each body."""

    @functools.wraps(method)
    def answer(self, *names):
        key = (method.__name__, *names)
        if key not in self.answers:
            self.answers[key] = method(self, *names)
        return self.answers[key]

    return answer


class Sky:
    def __init__(self, tt_days):
        self.tt_days = np.asarray(tt_days, dtype=float)
        self.time = time_of(self.tt_days)
        self.here = EARTH.at(self.time)
        self.answers = {}

    @kept
    def astrometric(self, name):
        return self.here.observe(KERNEL[TARGET[name]])

    @kept
    def apparent(self, name):
        return self.astrometric(name).apparent()

    @kept
    def ra_deg(self, name):
        return self.apparent(name).radec("date")[0]._degrees

    @kept
    def longitude_deg(self, name):
        """Apparent longitude in the true ecliptic and from the true equinox of date."""
        return self.apparent(name).frame_latlon(ecliptic_frame)[1].degrees

    @kept
    def from_sun_longitude_deg(self, name):
        """Longitude in excess of the Sun's, 0 to 360."""
        return np.mod(self.longitude_deg(name) - self.longitude_deg("sun"), 360)

    @kept
    def emission(self, name):
        """When the light left, the vectors Sun to body and Earth to body in au; the Moon's in the Earth's own frame."""
        to_body = self.astrometric(name).xyz.au
        delay = np.linalg.norm(to_body, axis=0) / C_AU_DAY
        then = SCALE.tdb_jd(2_451_545.0, self.time.tdb - 2_451_545.0 - delay)
        position = KERNEL[TARGET[name]].at(then).xyz.au
        if name == "moon":
            to_body = position - EARTH.at(then).xyz.au
        return then, position - SUN.at(then).xyz.au, to_body

    @kept
    def distance_au(self, name):
        return np.linalg.norm(self.emission(name)[2], axis=0)

    @kept
    def phase_angle_deg(self, name):
        _, sun_to_body, to_body = self.emission(name)
        return laws.angle_deg(sun_to_body, to_body)

    @kept
    def lit_fraction(self, name):
        return (1 + np.cos(np.radians(self.phase_angle_deg(name)))) / 2

    @kept
    def lit_area_arcsec2(self, name):
        radius = np.degrees(np.arcsin(laws.RADIUS_KM[name] / laws.AU_KM / self.distance_au(name))) * 3600
        return np.pi * radius**2 * self.lit_fraction(name)

    @kept
    def magnitude(self, name):
        """For Mars averaged over its rotation: the season's term alone."""
        then, sun_to_body, to_body = self.emission(name)
        r, delta, i = np.linalg.norm(sun_to_body, axis=0), self.distance_au(name), self.phase_angle_deg(name)
        if name == "mars":
            x, y, z = sun_to_body
            longitude = np.degrees(np.arctan2(y * np.cos(J2000_TILT) + z * np.sin(J2000_TILT), x))
            # The table of the rotation is exactly zero at 60 degrees, and so is its mean.
            return laws.mars(r, delta, i, np.full_like(r, 60.0), np.full_like(r, 60.0), longitude)
        row = {"sun_distance_au": r, "distance_au": delta, "phase_angle_deg": i}
        return magnitude(name, row, to_body, sun_to_body, then, self.tt_days)

    @kept
    def separation_deg(self, first, second):
        """Angle between the apparent directions."""
        return laws.angle_deg(self.apparent(first).xyz.au, self.apparent(second).xyz.au)

    @kept
    def square_of_chord(self, first, second):
        """Grows with the separation and, unlike it, is smooth where the two bodies meet."""
        difference = laws.unit(self.apparent(first).xyz.au) - laws.unit(self.apparent(second).xyz.au)
        return np.sum(difference**2, axis=0)

    @kept
    def heliocentric_distance_au(self, name):
        """Geometric, at the instant itself."""
        return np.linalg.norm(KERNEL[TARGET[name]].at(self.time).xyz.au - SUN.at(self.time).xyz.au, axis=0)


def civil(tt_days):
    """Civil text of instants: UTC from 1972 to the date of the leap-second table, UT1 by the library's delta-T outside."""
    tt_days = np.asarray(tt_days, dtype=float)
    delta_t = time_of(tt_days).delta_t if len(tt_days) else tt_days
    texts = []
    for tt, delta in zip(tt_days, delta_t):
        ut1 = tt - delta / 86_400
        utc = tt - (leap_seconds(ut1) + 32.184) / 86_400
        texts.append(instants.civil(utc if LEAP_SECONDS_FROM <= utc < LEAP_SECONDS_TO else ut1))
    return texts
