"""Transits of Mercury and Venus seen from the Earth's centre, and the inferior conjunctions that just miss."""

import numpy as np

import laws
from build_reference import position_angle_deg
from events_search import minima, roots_within
from events_sky import INNER, Sky

# The Sun's semidiameter at 1 au that almanacs use; IAU 2015's 695,700 km would be 959.23.
SUN_RADIUS_AU = np.sin(np.radians(959.63 / 3600))
STEP_DAYS = 2.0
# Longest way from an outer contact to the middle: a central transit of Venus lasts 8 hours, of Mercury 8.
HALF_DAYS = 0.3
# A near miss passes within so many semidiameters of the Sun's centre.
NEAR_MISS = 1.25


def semidiameters_arcsec(sky, name):
    sun = np.degrees(np.arcsin(SUN_RADIUS_AU / sky.distance_au("sun"))) * 3600
    planet = np.degrees(np.arcsin(laws.RADIUS_KM[name] / laws.AU_KM / sky.distance_au(name))) * 3600
    return sun, planet


def gap_arcsec(t, name, sign):
    """How far the discs are from touching, from outside with `sign` 1, from inside with -1."""
    sky = Sky(t)
    sun, planet = semidiameters_arcsec(sky, name)
    return sky.separation_deg(name, "sun") * 3600 - (sun + sign * planet)


def transits(start, end):
    for name in INNER:
        days = np.arange(start, end, STEP_DAYS)
        sky = Sky(days)
        near = (sky.distance_au(name) < sky.distance_au("sun")) & (sky.separation_deg(name, "sun") < 8)
        samples = np.where(near, sky.square_of_chord(name, "sun"), 9.0)
        found = minima(lambda t: Sky(t).square_of_chord(name, "sun"), days, samples)
        sky = Sky(found)
        separation = sky.separation_deg(name, "sun") * 3600
        sun, planet = semidiameters_arcsec(sky, name)
        for n in np.flatnonzero(separation < NEAR_MISS * sun):
            yield transit(name, found[n], separation[n], sun[n], planet[n])


def transit(name, tt, separation, sun, planet):
    row = {"body": name, "tt": tt, "separation_arcsec": separation}
    row |= {"sun_semidiameter_arcsec": sun, "semidiameter_arcsec": planet}
    row |= {"kind": "transit" if separation < sun + planet else "transit-near-miss", "grazing": 0}
    if row["kind"] == "transit":
        row["grazing"] = int(separation >= sun - planet)
        middle = np.array([tt])
        for sign, first, last in ((1, "contact_1_tt", "contact_4_tt"), (-1, "contact_2_tt", "contact_3_tt")):
            if sign == 1 or not row["grazing"]:
                row[first] = roots_within(lambda t: gap_arcsec(t, name, sign), middle - HALF_DAYS, middle)[0]
                row[last] = roots_within(lambda t: gap_arcsec(t, name, sign), middle, middle + HALF_DAYS)[0]
    sky = Sky(np.array([tt]))
    ra, dec, _ = sky.apparent(name).radec("date")
    sun_ra, sun_dec, _ = sky.apparent("sun").radec("date")
    row["position_angle_deg"] = position_angle_deg(sun_ra.radians, sun_dec.radians, ra.radians, dec.radians)[0]
    return row
