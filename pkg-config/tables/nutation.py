"""The 77 luni-solar terms of the IAU 2000B nutation as a Rust table.

The numbers are published: McCarthy & Luzum 2003, Celestial Mechanics and Dynamical Astronomy 85, 37; they are the
leading terms of IAU 2000A as tabulated in the IERS Conventions 2003, chapter 5. They are read from the copy that
Skyfield carries, and the sum is compared with ERFA's own IAU 2000B before anything is written.
"""

from pathlib import Path

import erfa
import numpy as np
import skyfield

from outputs import rust_header

TERMS = 77
RADIANS_PER_TENTH_MICROARCSEC = np.pi / (180 * 3600) * 1e-7

# IAU 2000B replaces the planetary terms by these constants (milliarcseconds).
PLANETARY_PSI_MAS = -0.135
PLANETARY_EPS_MAS = 0.388

# Delaunay arguments of IAU 2000B (Simon et al. 1994): arcseconds at J2000 and arcseconds per Julian century.
DELAUNAY_ARCSEC = np.array(
    [
        [485868.249036, 1717915923.2178],
        [1287104.79305, 129596581.0481],
        [335779.526232, 1739527262.8478],
        [1072260.70369, 1602961601.2090],
        [450160.398036, -6962890.5431],
    ]
)


def source_path() -> Path:
    """The file that carries the published numbers."""
    return Path(skyfield.__file__).parent / "data" / "nutation.npz"


def read() -> tuple[np.ndarray, np.ndarray]:
    """Multipliers of (l, l', F, D, Omega) and the six coefficients of every term, in 0.1 microarcsecond."""
    with np.load(source_path()) as tables:
        multipliers = tables["nals_t"][:TERMS]
        coefficients = np.hstack(
            [
                tables["lunisolar_longitude_coefficients"][:TERMS],
                tables["lunisolar_obliquity_coefficients"][:TERMS],
            ]
        )
    whole = np.rint(coefficients).astype(int)
    if not np.array_equal(whole, coefficients):
        raise ValueError("nutation coefficients are not whole tenths of a microarcsecond")
    return multipliers.astype(int), whole


def largest_difference_rad(multipliers: np.ndarray, coefficients: np.ndarray) -> float:
    """The largest difference between the sum of these terms and ERFA's IAU 2000B over 1600-2300."""
    t = np.linspace(-4, 3, 1501)
    arguments = multipliers @ np.radians(
        (DELAUNAY_ARCSEC[:, :1] + DELAUNAY_ARCSEC[:, 1:] * t) % 1296000 / 3600
    )
    sine, cosine = np.sin(arguments), np.cos(arguments)
    c = coefficients[:, :, None]
    psi = ((c[:, 0] + c[:, 1] * t) * sine + c[:, 2] * cosine).sum(axis=0)
    eps = ((c[:, 3] + c[:, 4] * t) * cosine + c[:, 5] * sine).sum(axis=0)
    psi = (psi + PLANETARY_PSI_MAS * 1e4) * RADIANS_PER_TENTH_MICROARCSEC
    eps = (eps + PLANETARY_EPS_MAS * 1e4) * RADIANS_PER_TENTH_MICROARCSEC
    expected_psi, expected_eps = erfa.nut00b(2451545.0, 36525 * t)
    return max(np.abs(psi - expected_psi).max(), np.abs(eps - expected_eps).max())


def build() -> str:
    """The Rust file."""
    multipliers, coefficients = read()
    difference = largest_difference_rad(multipliers, coefficients)
    if difference > 1e-14:
        raise ValueError(f"the nutation terms differ from ERFA's IAU 2000B by {difference:.1e} rad")
    text = rust_header(
        "The luni-solar terms of the IAU 2000B nutation.",
        "",
        "Source: McCarthy & Luzum 2003, Celestial Mechanics and Dynamical Astronomy 85, 37-49, table 1;",
        "the same numbers head the IAU 2000A tables of the IERS Conventions 2003, chapter 5.",
    )
    text += f"""
/// One term: an argument and what it adds to the nutation in longitude (psi) and in obliquity (eps).
pub(super) struct Term {{
    /// Whole multiples of the Delaunay arguments l, l', F, D, Omega.
    pub(super) multipliers: [i8; 5],
    /// In 0.1 microarcsecond: psi sine, psi sine per Julian century, psi cosine,
    /// eps cosine, eps cosine per Julian century, eps sine.
    pub(super) tenth_microarcsec: [i32; 6],
}}

/// Every term, the largest first as published.
#[rustfmt::skip]
pub(super) const LUNI_SOLAR: [Term; {TERMS}] = [
"""
    for arguments, values in zip(multipliers, coefficients):
        text += (
            f"    Term {{ multipliers: [{', '.join(map(str, arguments))}], "
            f"tenth_microarcsec: [{', '.join(map(str, values))}] }},\n"
        )
    return text + "];\n"
