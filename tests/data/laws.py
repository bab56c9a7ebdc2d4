"""Published laws of planetary brightness and size, written for the reference data alone.

Nothing here is shared with the Rust crate: the formulas are typed a second time from the papers, so that a slip in one
place shows as a difference. Sources stand in SOURCES.md under the keys in brackets.

Angles are degrees, distances au, magnitudes V. Arrays throughout.
"""

import numpy as np

AU_KM = 149_597_870.7
LIGHT_KM_S = 299_792.458

# Equatorial radii, km [radii].
RADIUS_KM = {
    "sun": 695_700.0,
    "moon": 1_737.4,
    "mercury": 2_440.53,
    "venus": 6_051.8,
    "mars": 3_396.19,
    "jupiter": 71_492.0,
    "saturn": 60_268.0,
    "uranus": 25_559.0,
    "neptune": 24_764.0,
}

# North poles on ICRF axes as unit vectors [magnitudes].
SATURN_POLE = np.array([0.08547883, 0.07323576, 0.99364475])
URANUS_POLE = np.array([-0.21199958, -0.94155916, -0.26176809])

# Mars: corrections in thousandths of a magnitude every 10 degrees of rotation and of season [mars-terms].
MARS_ROTATION = np.array(
    "36 45 38 23 15 11 0 -12 -18 -36 -44 -59 -60 -55 -43 -41 -41 -36 -36 -18 -38 -11 2 4 18 19 35 50 35 27 37 48 25 22 24 34".split(),
    dtype=float,
)
MARS_SEASON = np.array(
    "-29 -17 -14 -6 -18 -20 -14 -30 -8 -40 -24 -37 -36 -32 10 10 -1 44 25 -4 -16 -8 29 -54 -33 55 17 52 6 87 6 64 30 19 -30 -17".split(),
    dtype=float,
)


def unit(vector):
    """The vector scaled to length one along its first axis."""
    return vector / np.linalg.norm(vector, axis=0)


def angle_deg(a, b):
    """Angle between two vectors, by the tangent of half of it: exact for small and for nearly straight angles."""
    a, b = unit(a), unit(b)
    return np.degrees(2 * np.arctan2(np.linalg.norm(a - b, axis=0), np.linalg.norm(a + b, axis=0)))


def latitude_deg(pole, body_to_point):
    """Planetocentric latitude of the point under `body_to_point`."""
    return np.degrees(np.arcsin(np.clip(np.tensordot(pole, unit(body_to_point), 1), -1, 1)))


def table_value(table, angle):
    """Value of a cyclic table with one entry every 10 degrees, in magnitudes: Lagrange's polynomial through five entries.

    The middle one is the entry at or below the angle, as in the authors' program.
    """
    position = np.mod(angle, 360) / 10
    middle = np.floor(position).astype(int)
    x = position - middle
    nodes = (-2, -1, 0, 1, 2)
    total = np.zeros_like(x)
    for node in nodes:
        weight = np.prod([(x - other) / (node - other) for other in nodes if other != node], axis=0)
        total = total + weight * table[(middle + node) % 36]
    return total / 1000


def mars_west_longitude_deg(tdb_days, body_to_point):
    """Planetographic (west) longitude under `body_to_point` at `tdb_days` since J2000.0 [mars-axis]."""
    century = tdb_days / 36_525
    pole_ra, pole_dec = np.radians(317.68143 - 0.1061 * century), np.radians(52.88650 - 0.0609 * century)
    prime = np.radians(176.630 + 350.89198226 * tdb_days)
    zero = np.zeros_like(century)
    node = np.array([-np.sin(pole_ra), np.cos(pole_ra), zero])
    pole = np.array([np.cos(pole_dec) * np.cos(pole_ra), np.cos(pole_dec) * np.sin(pole_ra), np.sin(pole_dec)])
    along = np.cross(pole, node, axis=0)
    east = np.arctan2(np.sum(body_to_point * along, axis=0), np.sum(body_to_point * node, axis=0)) - prime
    return np.mod(-np.degrees(east), 360)


def mercury(r, delta, i):
    f = np.polyval([-3.0334e-12, 1.6893e-9, -3.4265e-7, 3.3644e-5, -1.6336e-3, 6.3280e-2, -0.613], i)
    return 5 * np.log10(r * delta) + f


def venus(r, delta, i):
    thick = np.polyval([8.938e-9, -2.814e-6, 3.687e-4, -1.044e-3, -4.384], i)
    thin = np.polyval([8.39034e-3, -2.81914, 236.05828], i)
    f = np.where(i < 163.7, thick, np.where(i <= 179, thin, np.nan))
    return 5 * np.log10(r * delta) + f


def mars(r, delta, i, sub_earth_deg, sub_sun_deg, heliocentric_longitude_deg):
    middle = (sub_earth_deg + sub_sun_deg) / 2
    middle = np.where(np.abs(sub_earth_deg - sub_sun_deg) > 180, middle + 180, middle)
    near = np.polyval([-1.302e-4, 0.02267, -1.601], i)
    far = np.polyval([3.445e-4, -0.02573, -0.367], i)
    terms = table_value(MARS_ROTATION, middle) + table_value(MARS_SEASON, heliocentric_longitude_deg - 85)
    return 5 * np.log10(r * delta) + np.where(i <= 50, near, far) + terms


def jupiter(r, delta, i):
    return 5 * np.log10(r * delta) + np.polyval([6.16e-4, -3.7e-4, -9.395], i)


def saturn(r, delta, i, sun_latitude_deg, earth_latitude_deg):
    product = sun_latitude_deg * earth_latitude_deg
    tilt = np.minimum(np.sqrt(np.maximum(product, 0)), 27)
    s = np.sin(np.radians(tilt))
    f = -8.914 - 1.825 * s + 0.026 * i - 0.378 * s * np.exp(-2.25 * i)
    return 5 * np.log10(r * delta) + f


def uranus(r, delta, i, sun_latitude_deg, earth_latitude_deg):
    graphic = [np.degrees(np.arctan(np.tan(np.radians(x)) / (1 - 0.0229) ** 2)) for x in (sun_latitude_deg, earth_latitude_deg)]
    f = -7.110 - 8.4e-4 * (np.abs(graphic[0]) + np.abs(graphic[1])) / 2
    return 5 * np.log10(r * delta) + f + np.where(i > 3.1, 6.587e-3 * i + 1.045e-4 * i**2, 0)


def neptune(r, delta, i, year):
    f = np.clip(-6.89 - 0.0054 * (year - 1980), -7.00, -6.89)
    # The dependence on phase was observed from 2000 on; before, the law has no value above 1.9 degrees.
    phase = np.where(i <= 1.9, 0, np.where(year >= 2000, 7.944e-3 * i + 9.617e-5 * i**2, np.nan))
    return 5 * np.log10(r * delta) + f + phase


def moon(r, delta, i):
    """The Moon's law has no value beyond 150 degrees [moon-law]."""
    law = -12.73 + 0.026 * i + 4e-9 * i**4 + 5 * np.log10(delta * AU_KM / 384_400) + 5 * np.log10(r)
    return np.where(i <= 150, law, np.nan)


def sun(delta):
    return -26.74 + 5 * np.log10(delta)


def prove_laws():
    """Stops the build when a law departs from its authors' own test values [magnitudes]."""
    rows = [
        (mercury(0.310295423552, 1.32182643625754, 1.1677), -2.477),
        (mercury(0.413629222334, 0.92644808718613, 90.1662), 0.181),
        (venus(0.722722540169, 1.71607489554051, 1.3232), -3.917),
        (venus(0.721480714554, 0.37762511206278, 124.1348), -4.916),
        (venus(0.726166592736, 0.28889582420642, 179.0 + 0.1845), np.nan),
        (mars(1.381191244505, 0.37274381097911, 4.8948, 329.27, 330.76, 334.4996), -2.862),
        (mars(1.664150453905, 2.58995164518460, 11.5877, 76.84, 64.66, 147.3485), 1.788),
        (jupiter(5.446231815414, 6.44985867459088, 0.2446), -1.667),
        (jupiter(4.957681473205, 3.95393078136013, 0.3431), -2.934),
        (saturn(9.014989659493, 8.03160470546889, 0.1055, -26.224865, -26.332276), -0.552),
        (uranus(18.321003215845, 17.3229728525108, 0.0410, -20.29, -20.28), 5.381),
        (uranus(20.096361095266, 21.0888470145276, 0.0568, 1.02, 0.97), 6.025),
        (neptune(30.322109867761, 31.3091610098214, 0.0549, 1970.8963), 7.997),
        (neptune(30.207767693725, 29.8172370857530, 1.7741, 1990.3240), 7.827),
        (neptune(30.028181709541, 29.0158521665744, 0.0381, 2009.6299), 7.701),
    ]
    for number, (got, want) in enumerate(rows):
        assert np.isnan(want) == np.isnan(got), (number, got, want)
        assert np.isnan(want) or abs(got - want) < 0.001, (number, got, want)
