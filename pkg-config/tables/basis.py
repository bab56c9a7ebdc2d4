"""The slowly turning angles that the series are built from, and the units of time.

Mean longitudes and semi-major axes of the planets: VSOP87 (Bretagnon & Francou 1988), ecliptic and equinox J2000.
Delaunay arguments: IERS Conventions 2003, chapter 5. They only name the arguments; what the bodies really do is
estimated on DE440, so their last digits carry no accuracy.
"""

PLANETS = ["mercury", "venus", "emb", "mars", "jupiter", "saturn", "uranus", "neptune"]

# Mean longitude at J2000, radians.
PLANET_LONGITUDES = [
    4.40260884240,
    3.17614669689,
    1.75347045953,
    6.20347611291,
    0.59954649739,
    0.87401675650,
    5.48129387159,
    5.31188628676,
]

# Radians per Julian millennium.
PLANET_RATES = [
    26087.9031415742,
    10213.2855462110,
    6283.0758499914,
    3340.6124266998,
    529.6909650946,
    213.2990954380,
    74.7815985673,
    38.1330356378,
]

# Semi-major axes, au.
PLANET_AXES = [0.38709831, 0.72332982, 1.00000102, 1.52367934, 5.20260319, 9.55490960, 19.21844606, 30.11038687]

# l, l', F, D, Omega: arcseconds, per Julian century, per century squared, cubed, to the fourth.
DELAUNAY = [
    [485868.249036, 1717915923.2178, 31.8792, 0.051635, -0.00024470],
    [1287104.793048, 129596581.0481, -0.5532, 0.000136, -0.00001149],
    [335779.526232, 1739527262.8478, -12.7512, -0.001037, 0.00000417],
    [1072260.703692, 1602961601.2090, -6.3706, 0.006593, -0.00003169],
    [450160.398036, -6962890.5431, 7.4722, 0.007702, -0.00005939],
]

# The fit: years 1590 to 2310, so that the answers hold from 1600 to 2300 with room at both ends.
CENTRE_MILLENNIA = -0.05
HALF_WIDTH_MILLENNIA = 0.36

# Rotation from the ICRS equator to the plane in which the planets' series are written, arcseconds about x.
OBLIQUITY_J2000_ARCSEC = 84381.406
