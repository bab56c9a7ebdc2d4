//! Dates and instants that were published.

use crate::{at, of, seconds_apart};
use wanderlight::Body;
use wanderlight::events::Kind::*;

/// Transits of Mercury from 1601 to 2100, UT dates of greatest transit, as in the catalogues printed since the
/// nineteenth century (from memory).
#[rustfmt::skip]
const MERCURY: [&str; 68] = [
    "1605-11-01", "1615-05-03", "1618-11-04", "1628-05-05", "1631-11-07", "1644-11-09",
    "1651-11-03", "1661-05-03", "1664-11-04", "1674-05-07", "1677-11-07", "1690-11-10",
    "1697-11-03", "1707-05-05", "1710-11-06", "1723-11-09", "1736-11-11", "1740-05-02",
    "1743-11-05", "1753-05-06", "1756-11-07", "1769-11-09", "1776-11-02", "1782-11-12",
    "1786-05-04", "1789-11-05", "1799-05-07", "1802-11-09", "1815-11-12", "1822-11-05",
    "1832-05-05", "1835-11-07", "1845-05-08", "1848-11-09", "1861-11-12", "1868-11-05",
    "1878-05-06", "1881-11-08", "1891-05-10", "1894-11-10", "1907-11-14", "1914-11-07",
    "1924-05-08", "1927-11-10", "1937-05-11", "1940-11-11", "1953-11-14", "1957-05-06",
    "1960-11-07", "1970-05-09", "1973-11-10", "1986-11-13", "1993-11-06", "1999-11-15",
    "2003-05-07", "2006-11-08", "2016-05-09", "2019-11-11", "2032-11-13", "2039-11-07",
    "2049-05-07", "2052-11-09", "2062-05-10", "2065-11-11", "2078-11-14", "2085-11-07",
    "2095-05-08", "2098-11-10",
];

/// Transits of Venus from 1601 to 2200, likewise.
const VENUS: [&str; 10] = [
    "1631-12-07",
    "1639-12-04",
    "1761-06-06",
    "1769-06-03",
    "1874-12-09",
    "1882-12-06",
    "2004-06-08",
    "2012-06-06",
    "2117-12-11",
    "2125-12-08",
];

fn dates(body: Body, to: &str) -> Vec<String> {
    of(body, &[Transit], "1601-01-01", to)
        .iter()
        .map(|event| event.utc.to_rfc3339()[..10].to_owned())
        .collect()
}

#[test]
fn no_transit_is_missing_and_none_is_invented() {
    assert_eq!(dates(Body::Mercury, "2101-01-01"), MERCURY);
    assert_eq!(dates(Body::Venus, "2201-01-01"), VENUS);
}

#[test]
fn the_grazing_transit_of_1937() {
    let found = of(Body::Mercury, &[Transit], "1900-01-01", "2050-01-01");
    let grazing: Vec<_> = found
        .iter()
        .filter(|event| event.values.is_grazing)
        .map(|event| event.utc.to_rfc3339()[..10].to_owned())
        .collect();
    assert_eq!(grazing, ["1937-05-11"]);
    for event in &found {
        assert_eq!(
            event.contacts.len(),
            if event.values.is_grazing { 2 } else { 4 }
        );
        assert!(event.values.separation_sun_radii < Some(1.01));
    }
    for miss in of(
        Body::Mercury,
        &[TransitNearMiss],
        "1900-01-01",
        "2050-01-01",
    ) {
        let radii = miss.values.separation_sun_radii.unwrap_or(0.0);
        assert!(
            (1.0..1.25).contains(&radii) && miss.contacts.is_empty(),
            "{miss:?}"
        );
    }
}

#[test]
fn geocentric_contacts_as_predicted_in_print() {
    // Four contacts and the greatest transit, UT, with the least angle in arcseconds: predictions circulated before the
    // events (from memory), with the Sun's semidiameter of 959.63 arcsec.
    for (body, instants, least_arcsec) in [
        (
            Body::Venus,
            [
                "2004-06-08T05:13:29Z",
                "2004-06-08T05:32:55Z",
                "2004-06-08T08:19:44Z",
                "2004-06-08T11:06:33Z",
                "2004-06-08T11:25:59Z",
            ],
            626.9,
        ),
        (
            Body::Venus,
            [
                "2012-06-05T22:09:38Z",
                "2012-06-05T22:27:34Z",
                "2012-06-06T01:29:36Z",
                "2012-06-06T04:31:39Z",
                "2012-06-06T04:49:35Z",
            ],
            554.4,
        ),
        (
            Body::Mercury,
            [
                "2019-11-11T12:35:27Z",
                "2019-11-11T12:37:08Z",
                "2019-11-11T15:19:48Z",
                "2019-11-11T18:02:33Z",
                "2019-11-11T18:04:14Z",
            ],
            75.9,
        ),
    ] {
        let day = &instants[2][..10];
        let from = at(day).plus_days(-1.0).to_rfc3339();
        let to = at(day).plus_days(2.0).to_rfc3339();
        let found = of(body, &[Transit], &from, &to);
        let event = found.first().expect("a transit");
        let greatest_seconds = seconds_apart(event.utc, at(instants[2]));
        assert!(
            greatest_seconds < 15.0,
            "{} {greatest_seconds}",
            event.utc.to_rfc3339()
        );
        let published = [instants[0], instants[1], instants[3], instants[4]];
        for (contact, published) in event.contacts.iter().zip(published) {
            let seconds = seconds_apart(contact.utc, at(published));
            assert!(
                seconds < 15.0,
                "{} {} {seconds}",
                contact.name,
                contact.utc.to_rfc3339()
            );
        }
        let arcsec = event.values.separation_deg.unwrap_or(0.0) * 3600.0;
        assert!((arcsec - least_arcsec).abs() < 0.6, "{arcsec}");
    }
}

#[test]
fn phases_of_the_moon_as_printed() {
    // Eclipses fix the instants of new and full Moon in many memories: 2017-08-21 18:30, 2024-04-08 18:21 new;
    // 2018-07-27 20:20, 2025-03-14 06:55 full (UT, almanacs, from memory).
    for (kind, text) in [
        (NewMoon, "2017-08-21T18:30:00Z"),
        (NewMoon, "2024-04-08T18:21:00Z"),
        (FullMoon, "2018-07-27T20:20:00Z"),
        (FullMoon, "2025-03-14T06:55:00Z"),
    ] {
        let from = at(text).plus_days(-3.0).to_rfc3339();
        let to = at(text).plus_days(3.0).to_rfc3339();
        let found = of(Body::Moon, &[kind], &from, &to);
        assert_eq!(found.len(), 1);
        let seconds = seconds_apart(found[0].utc, at(text));
        assert!(seconds < 45.0, "{text} {seconds}");
    }
}

#[test]
fn oppositions_of_mars_as_printed() {
    // UT dates of almanacs (from memory).
    let found = of(Body::Mars, &[Opposition], "2003-01-01", "2023-01-01");
    let dates: Vec<_> = found
        .iter()
        .map(|event| event.utc.to_rfc3339()[..10].to_owned())
        .collect();
    assert_eq!(
        dates,
        [
            "2003-08-28",
            "2005-11-07",
            "2007-12-24",
            "2010-01-29",
            "2012-03-03",
            "2014-04-08",
            "2016-05-22",
            "2018-07-27",
            "2020-10-13",
            "2022-12-08"
        ]
    );
    // The closest approach of 2003: 55.76 million km on 27 August at 09:51.
    let closest = &of(Body::Mars, &[ClosestApproach], "2003-01-01", "2004-01-01")[0];
    assert!(seconds_apart(closest.utc, at("2003-08-27T09:51:00Z")) < 600.0);
    assert!((closest.values.distance_au.unwrap_or(0.0) - 0.372_72).abs() < 1e-5);
}

#[test]
fn the_great_conjunction_of_2020() {
    // Least angle of Jupiter and Saturn 6.1 arcmin on 2020-12-21 about 18:20 UT (almanacs, from memory).
    let found = of(Body::Jupiter, &[PlanetClosest], "2020-12-01", "2021-01-01");
    let pair = found
        .iter()
        .find(|event| event.other == Some(Body::Saturn))
        .expect("the pair");
    assert!(seconds_apart(pair.utc, at("2020-12-21T18:20:00Z")) < 900.0);
    assert!((pair.values.separation_deg.unwrap_or(0.0) * 60.0 - 6.1).abs() < 0.05);
}
