//! Places, phases, rings and magnitudes of single dates.

use crate::support::{check, check_angle, utc_at_tt};
use crate::{degrees, hours};
use wanderlight::{Body, Circumstances, Place, Utc, circumstances};

/// Circumstances at a TT given as a civil date at 0h, as the examples state "dynamical time".
fn at_0h_tt(body: Body, date: &str) -> Circumstances {
    let civil = Utc::parse(date).expect("a date");
    circumstances(body, utc_at_tt(civil.days_since_j2000()), None).expect("inside the span")
}

/// [meeus] example 33.a: Venus, 1992 December 20 at 0h TT, the figures of the complete theory; 0.3 arcsec is VSOP87's own
/// distance from DE440 at this conjunction side, the last digit of time is 0.015 arcsec.
#[test]
fn place_of_venus() {
    let venus = at_0h_tt(Body::Venus, "1992-12-20");
    check_angle(
        "right ascension",
        venus.right_ascension_deg,
        hours(21.0, 4.0, 41.454),
        0.5,
    );
    check_angle(
        "declination",
        venus.declination_deg,
        degrees(-1.0, 18.0, 53.0, 16.84),
        0.5,
    );
    check("distance", venus.distance_au, 0.910_947, 2e-6, "au");
    // Example 41.a: its lit fraction and phase angle, three and four digits.
    check(
        "lit fraction",
        venus.illuminated_fraction.expect("a phase"),
        0.647,
        0.0005,
        "",
    );
    check(
        "phase angle",
        venus.phase_angle_deg.expect("a phase"),
        72.96,
        0.01,
        "deg",
    );
}

/// [meeus] example 47.a: Moon, 1992 April 12 at 0h TT; the complete theory's figures are printed to a second of arc, the
/// example's own series is 10 arcsec and the distance some km off.
#[test]
fn place_of_the_moon() {
    let moon = at_0h_tt(Body::Moon, "1992-04-12");
    check_angle(
        "longitude",
        moon.ecliptic_longitude_deg,
        degrees(1.0, 133.0, 10.0, 0.0),
        1.0,
    );
    check_angle(
        "latitude",
        moon.ecliptic_latitude_deg,
        degrees(-1.0, 3.0, 13.0, 45.0),
        1.0,
    );
    check_angle(
        "right ascension",
        moon.right_ascension_deg,
        134.688_470,
        10.0,
    );
    check_angle("declination", moon.declination_deg, 13.768_368, 10.0);
    check(
        "distance",
        moon.distance_au * 149_597_870.7,
        368_405.6,
        6.0,
        "km",
    );
    // Example 48.a: phase angle, lit fraction and position angle of the bright limb from low-precision positions.
    check(
        "phase angle",
        moon.phase_angle_deg.expect("a phase"),
        69.0756,
        0.02,
        "deg",
    );
    check(
        "lit fraction",
        moon.illuminated_fraction.expect("a phase"),
        0.6786,
        0.0002,
        "",
    );
    check(
        "bright limb",
        moon.bright_limb_angle_deg.expect("a limb"),
        285.0,
        0.1,
        "deg",
    );
}

/// [meeus] example 25.b: Sun, 1992 October 13 at 0h TT, by the complete theory.
#[test]
fn place_of_the_sun() {
    let sun = at_0h_tt(Body::Sun, "1992-10-13");
    check_angle(
        "longitude",
        sun.ecliptic_longitude_deg,
        degrees(1.0, 199.0, 54.0, 21.56),
        0.5,
    );
    check_angle(
        "right ascension",
        sun.right_ascension_deg,
        hours(13.0, 13.0, 30.749),
        0.6,
    );
    check_angle(
        "declination",
        sun.declination_deg,
        degrees(-1.0, 7.0, 47.0, 1.74),
        0.5,
    );
    // The book gives the geometric distance; the light-retarded one differs by the Sun's motion in eight minutes.
    check("distance", sun.distance_au, 0.997_608_5, 2e-6, "au");
}

/// [meeus] example 45.a: Saturn's ring, 1992 December 16 at 0h TT. The book's pole and axes differ from the one in use here
/// by hundredths of a degree.
#[test]
fn rings_of_saturn() {
    let saturn = at_0h_tt(Body::Saturn, "1992-12-16");
    check(
        "opening",
        saturn.ring_opening_deg.expect("a ring"),
        16.442,
        0.02,
        "deg",
    );
    check(
        "axis",
        saturn.axis_angle_deg.expect("an axis"),
        6.741,
        0.05,
        "deg",
    );
}

/// [meeus] example 13.b: Venus over Washington, 1987 April 10 at 19h21m UT, azimuth counted from the south there. The book
/// leaves out parallax, 7 arcsec, and takes the time as UT1, half a second or 7 arcsec from UTC.
#[test]
fn venus_over_washington() {
    let place = Place::new(
        38.0 + 55.0 / 60.0 + 17.0 / 3600.0,
        -(77.0 + 3.0 / 60.0 + 56.0 / 3600.0),
        0.0,
    )
    .expect("a place");
    let utc = Utc::parse("1987-04-10T19:21:00Z").expect("an instant");
    let venus = circumstances(Body::Venus, utc, Some(&place)).expect("inside the span");
    let local = venus.local.expect("a horizon");
    check(
        "altitude",
        local.altitude_deg,
        15.1249,
        15.0 / 3600.0,
        "deg",
    );
    check(
        "azimuth",
        local.azimuth_deg,
        68.0337 + 180.0,
        15.0 / 3600.0,
        "deg",
    );
    check_angle(
        "right ascension",
        venus.right_ascension_deg,
        hours(23.0, 9.0, 16.641),
        0.6,
    );
    check_angle(
        "declination",
        venus.declination_deg,
        degrees(-1.0, 6.0, 43.0, 11.61),
        0.6,
    );
}

/// [magnitudes] 2021 October 4 at 0h UTC, as published for Mars without its rotation and season terms (0.06 + 0.09 at most)
/// and for Jupiter to Neptune. The figures given beside them for Mercury and Venus use the Sun's barycentre and are left out.
#[test]
fn magnitudes_of_an_evening() {
    let utc = Utc::parse("2021-10-04").expect("a date");
    let rows = [
        (Body::Mars, 1.592, 0.10),
        (Body::Jupiter, -2.693, 0.006),
        (Body::Saturn, 0.508, 0.005),
        (Body::Uranus, 5.701, 0.003),
        (Body::Neptune, 7.690, 0.003),
    ];
    for (body, want, tolerance) in rows {
        let got = circumstances(body, utc, None)
            .expect("inside the span")
            .magnitude
            .expect("a magnitude");
        check(body.name(), got, want, tolerance, "mag");
    }
}

/// [magnitudes] the dates of the study's brightest Venus and Mars.
#[test]
fn brightest_mars_of_the_century() {
    let utc = Utc::parse("2003-08-28").expect("a date");
    let mars = circumstances(Body::Mars, utc, None).expect("inside the span");
    check("distance", mars.distance_au, 0.372_74, 2e-4, "au");
    // The paper's own value for this date; the central meridian turns 15 degrees an hour, hence not to 0.001.
    check(
        "magnitude",
        mars.magnitude.expect("a magnitude"),
        -2.862,
        0.01,
        "mag",
    );
}
