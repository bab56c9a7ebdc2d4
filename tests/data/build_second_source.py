"""Makes second_places.csv and second_frames.csv: a sample computed along another path than build_reference.py's.

    /tmp/reference/bin/python build_second_source.py

Another kernel (JPL DE421), another reader (jplephem.ephem), and the apparent chain written out on the standards' own
routines (ERFA): light time, deflection by `ld`, aberration by `ab`, precession and nutation by `pnm06a`. Two rows a sample
use no kernel at all: the Sun by the VSOP2000 fit `epv00`, the Moon by `moon98`. Columns are explained in SOURCES.md.
"""

import os

os.environ.setdefault("OMP_NUM_THREADS", "1")

import csv
import importlib.metadata
import pathlib

import de421
import erfa
import jplephem.ephem
import numpy as np

HERE = pathlib.Path(__file__).parent
SEED = 19_002_050
AU_KM = 149_597_870.7
C_AU_DAY = 299_792.458 * 86_400 / AU_KM
BODIES = ["sun", "moon", "mercury", "venus", "mars", "jupiter", "saturn", "uranus", "neptune"]
KERNEL = jplephem.ephem.Ephemeris(de421)
MOON_SHARE = 1 / (1 + KERNEL.EMRAT)
VERSIONS = ", ".join(f"{name} {importlib.metadata.version(name)}" for name in ("de421", "jplephem", "pyerfa", "numpy"))
FIRST_LINE = f"# build_second_source.py; {VERSIONS}; seed {SEED}"
J2000 = 2_451_545.0


def kernel_au(name, tt_days):
    """Barycentric position and velocity, au and au a day; the Moon's are geocentric in the kernel."""
    position, velocity = KERNEL.position_and_velocity(name, J2000, tt_days)
    return np.ravel(position) / AU_KM, np.ravel(velocity) / AU_KM


def earth(tt_days):
    emb, moon = kernel_au("earthmoon", tt_days), kernel_au("moon", tt_days)
    return tuple(a - MOON_SHARE * b for a, b in zip(emb, moon))


def barycentric(name, tt_days):
    if name == "moon":
        return earth(tt_days)[0] + kernel_au("moon", tt_days)[0]
    return kernel_au(name, tt_days)[0]


def spherical_deg(vector):
    longitude, latitude = erfa.c2s(vector)
    return np.degrees(longitude) % 360, np.degrees(latitude)


def apparent(name, tt_days, here, velocity):
    """Apparent direction on ICRS axes and light-retarded distance from the Earth's centre."""
    delay = 0.0
    for _ in range(5):
        to_body = barycentric(name, tt_days - delay) - here
        delay = np.linalg.norm(to_body) / C_AU_DAY
    distance = np.linalg.norm(to_body)
    if name == "moon":
        distance = np.linalg.norm(kernel_au("moon", tt_days - delay)[0])
    from_sun = here - kernel_au("sun", tt_days)[0]
    sun_distance = np.linalg.norm(from_sun)
    direction = to_body / np.linalg.norm(to_body)
    if name not in ("sun", "moon"):
        sun_to_body = barycentric(name, tt_days - delay) - kernel_au("sun", tt_days - delay)[0]
        direction = erfa.ld(1.0, direction, sun_to_body / np.linalg.norm(sun_to_body), from_sun / sun_distance, sun_distance, 1e-6)
        direction /= np.linalg.norm(direction)
    v = velocity / C_AU_DAY
    return erfa.ab(direction, v, sun_distance, np.sqrt(1 - v @ v)), distance


def of_date(direction, tt_days):
    """Right ascension, declination and ecliptic longitude, latitude of the true equator, ecliptic and equinox of date."""
    matrix = erfa.pnm06a(J2000, tt_days)
    equatorial = matrix @ direction
    _, deps = erfa.nut06a(J2000, tt_days)
    tilt = erfa.obl06(J2000, tt_days) + deps
    ecliptic = erfa.rx(tilt, np.eye(3)) @ equatorial
    return (*spherical_deg(equatorial), *spherical_deg(ecliptic))


def without_kernel(tt_days):
    """The Sun from the published Earth of epv00, the Moon of moon98, with the same light time and aberration."""
    heliocentric, barycentre = erfa.epv00(J2000, tt_days)
    to_sun = -heliocentric["p"]
    # The Sun's own barycentric motion over eight minutes is 1e-7 au at most: 0.01 arcsec.
    v = barycentre["v"] / C_AU_DAY
    direction = erfa.ab(to_sun / np.linalg.norm(to_sun), v, 1.0, np.sqrt(1 - v @ v))
    yield "sun", "epv00", direction, np.linalg.norm(to_sun)
    to_moon = erfa.moon98(J2000, tt_days)["p"]
    # Geocentric Moon at the time the light left it: no aberration is left in the Earth's own frame.
    to_moon = erfa.moon98(J2000, tt_days - np.linalg.norm(to_moon) / C_AU_DAY)["p"]
    yield "moon", "moon98", to_moon / np.linalg.norm(to_moon), np.linalg.norm(to_moon)


def rows_of_places(moments):
    for tt_days in moments:
        here, velocity = earth(tt_days)
        found = [(name, "de421", *apparent(name, tt_days, here, velocity)) for name in BODIES]
        for name, source, direction, distance in [*found, *without_kernel(tt_days)]:
            ra, dec, longitude, latitude = of_date(direction, tt_days)
            yield [f"{tt_days:.6f}", name, source, f"{ra:.7f}", f"{dec:.7f}", f"{longitude:.7f}", f"{latitude:.7f}", f"{distance:.9f}"]


def rows_of_frames(moments):
    for tt_days in moments:
        # Sidereal time is a function of UT1 above all: UT1 = TT - 65 s here, whatever the Earth did.
        ut1_days = round(tt_days - 65 / 86_400, 9)
        tt_days = round(ut1_days + 65 / 86_400, 9)
        dpsi, deps = erfa.nut06a(J2000, tt_days)
        arcsec = 180 * 3600 / np.pi
        yield [
            f"{tt_days:.9f}",
            f"{ut1_days:.9f}",
            f"{np.degrees(erfa.gmst06(J2000, ut1_days, J2000, tt_days)):.9f}",
            f"{np.degrees(erfa.gst06a(J2000, ut1_days, J2000, tt_days)):.9f}",
            f"{dpsi * arcsec:.6f}",
            f"{deps * arcsec:.6f}",
            f"{np.degrees(erfa.obl06(J2000, tt_days)):.9f}",
            *(f"{x:.12f}" for x in np.ravel(erfa.pnm06a(J2000, tt_days))),
        ]


def rows_of_refraction():
    """Refraction of optical light by ERFA's two-term series for 1010 hPa, 10 C, dry air; it holds above some 10 degrees."""
    a, b = erfa.refco(1010.0, 10.0, 0.0, 0.574)
    for apparent_altitude in (12.0, 15.0, 20.0, 30.0, 45.0, 60.0, 75.0, 85.0):
        zenith = np.tan(np.radians(90 - apparent_altitude))
        lift = np.degrees(a * zenith + b * zenith**3)
        yield [f"{apparent_altitude - lift:.8f}", f"{apparent_altitude:.8f}"]


def write(name, header, rows):
    with open(HERE / name, "w", newline="") as file:
        file.write(FIRST_LINE + "\n")
        writer = csv.writer(file, lineterminator="\n")
        writer.writerow(header)
        writer.writerows(rows)


def main():
    random = np.random.default_rng(SEED)
    # DE421 as packaged covers 1900-2050.
    moments = np.round(np.sort(random.uniform(-36_400, 18_200, 24)), 6)
    header = ["tt_days_since_j2000", "body", "source", "ra_deg", "dec_deg", "ecl_lon_deg", "ecl_lat_deg", "distance_au"]
    write("second_places.csv", header, rows_of_places(moments))
    moments = np.sort(random.uniform(-109_500, 73_400, 30))
    matrix = [f"m{i}{j}" for i in range(3) for j in range(3)]
    header = ["tt_days_since_j2000", "ut1_days_since_j2000", "gmst_deg", "gast_deg", "dpsi_arcsec", "deps_arcsec", "mean_obliquity_deg"]
    write("second_frames.csv", header + matrix, rows_of_frames(moments))
    write("second_refraction.csv", ["true_altitude_deg", "apparent_altitude_deg"], rows_of_refraction())


if __name__ == "__main__":
    main()
