"""Yearly knots of delta-T = TT - UT1 as a Rust table.

Before 1973.5: the spline of Morrison, Stephenson, Hohenkerk & Zawilski 2021 (Proceedings of the Royal Society A 477,
20200776, table S15), read from the copy that Skyfield carries. From then on: the Earth rotation measured and, for the
last year, predicted by the IERS (finals2000A), together with the leap seconds.
"""

from pathlib import Path

import astropy_iers_data
import erfa
import numpy as np
import skyfield

from outputs import rust_header

FIRST_YEAR = 1600
MEASURED_FROM_YEAR = 1973.5
TT_MINUS_TAI_SECONDS = 32.184
MJD_OF_J2000_START = 51544.0


def spline_path() -> Path:
    """The published spline."""
    return Path(skyfield.__file__).parent / "data" / "delta_t.npz"


def measured_path() -> Path:
    """The IERS table of Earth rotation."""
    return Path(astropy_iers_data.IERS_A_FILE)


def from_spline(years: np.ndarray) -> np.ndarray:
    """Delta-T in seconds by the published cubic pieces."""
    with np.load(spline_path()) as tables:
        start, end, c3, c2, c1, c0 = tables["Table-S15.2020.txt"]
    piece = np.searchsorted(end, years)
    u = (years - start[piece]) / (end - start)[piece]
    return ((c3[piece] * u + c2[piece]) * u + c1[piece]) * u + c0[piece]


def measured() -> tuple[np.ndarray, np.ndarray]:
    """Days of the IERS table (modified Julian dates) and delta-T in seconds on them."""
    mjd, delta_t = [], []
    for line in measured_path().read_text(encoding="ascii").splitlines():
        # Columns of finals2000A: year, month, day 1-6; MJD 8-15; UT1-UTC in seconds 59-68.
        ut1_minus_utc = line[58:68].strip()
        if not ut1_minus_utc:
            continue
        day = float(line[7:15])
        year, month, day_of_month, _ = erfa.jd2cal(2400000.5, day)
        tai_minus_utc = erfa.dat(year, month, day_of_month, 0.0)
        mjd.append(day)
        delta_t.append(TT_MINUS_TAI_SECONDS + tai_minus_utc - float(ut1_minus_utc))
    return np.array(mjd), np.array(delta_t)


def knots() -> np.ndarray:
    """Hundredths of a second at the start of every Julian year from FIRST_YEAR on."""
    mjd, delta_t = measured()
    last_year = int(2000 + (mjd[-1] - MJD_OF_J2000_START) / 365.25)
    years = np.arange(FIRST_YEAR, last_year + 1)
    early = years < MEASURED_FROM_YEAR
    late = np.interp(MJD_OF_J2000_START + 365.25 * (years[~early] - 2000), mjd, delta_t)
    seconds = np.concatenate([from_spline(years[early].astype(float)), late])
    return np.rint(100 * seconds).astype(int)


def build() -> str:
    """The Rust file."""
    values = knots()
    last_year = FIRST_YEAR + len(values) - 1
    text = rust_header(
        "Delta-T = TT - UT1 at the start of every Julian year.",
        "",
        "Sources: until 1973 the spline of Morrison, Stephenson, Hohenkerk & Zawilski 2021, Proc. R. Soc. A 477,",
        "20200776, table S15; from 1974 the IERS series finals2000A, whose last year is predicted.",
    )
    text += f"""
/// Year of the first knot.
pub(super) const FIRST_YEAR: i32 = {FIRST_YEAR};

/// Delta-T in hundredths of a second from {FIRST_YEAR} to {last_year}: the knot of year y stands 365.25 (y - 2000) days after
/// 2000 January 1, 0h, which is January 1 of y within three days.
#[rustfmt::skip]
pub(super) const HUNDREDTHS_SECONDS: [i16; {len(values)}] = [
"""
    for first in range(0, len(values), 20):
        text += "    " + ", ".join(map(str, values[first : first + 20])) + ",\n"
    return text + "];\n"
