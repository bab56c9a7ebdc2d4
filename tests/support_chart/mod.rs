//! A toy sky for the tests of texts and pictures: circular orbits in one plane and published phase laws, so that the
//! curves have true shapes without the ephemeris. Its figures are not meant to be the real ones.
#![allow(dead_code)] // each test file uses its own share

pub(crate) mod plan;
pub(crate) mod recorder;

use wanderlight::chart::{DiscModel, DiscSample, Picture, TradeoffModel};
use wanderlight::explain::{
    English, EnglishFormats, Figures, GreatestExtent, Highlights, Orientation, Peak,
};
use wanderlight::{Body, Circumstances, Series, Utc};

/// English without a browser, on a clock that shows UTC.
pub(crate) fn figures() -> Figures<'static> {
    const FORMATS: EnglishFormats = EnglishFormats {
        utc_offset_minutes: 0,
    };
    Figures {
        formats: &FORMATS,
        words: &English,
    }
}

/// An instant at 0h UTC.
pub(crate) fn day(year: i32, month: u8, day: u8) -> Utc {
    Utc::from_civil(year, month, day, 0.0).expect("a valid date")
}

/// Orbit radius in au, period in days, diameter at 1 au in arcsec, day of a conjunction with the Earth's longitude.
pub(crate) fn orbit(body: Body) -> (f64, f64, f64, f64) {
    match body {
        Body::Mercury => (0.387, 87.97, 6.73, 9805.0),
        Body::Venus => (0.7233, 224.70, 16.69, day(2026, 10, 24).days_since_j2000()),
        Body::Mars => (1.524, 686.98, 9.37, day(2027, 2, 19).days_since_j2000()),
        Body::Jupiter => (5.203, 4332.6, 197.1, day(2027, 2, 10).days_since_j2000()),
        Body::Saturn => (9.537, 10759.0, 166.2, day(2026, 10, 4).days_since_j2000()),
        Body::Uranus => (19.19, 30685.0, 70.5, day(2026, 11, 25).days_since_j2000()),
        _ => (30.07, 60190.0, 68.3, day(2026, 9, 25).days_since_j2000()),
    }
}

struct Place {
    distance_au: f64,
    sun_distance_au: f64,
    phase_angle_deg: f64,
    elongation_deg: f64,
    east: bool,
    diameter_arcsec: f64,
}

fn place(body: Body, utc: Utc) -> Place {
    let days = utc.days_since_j2000();
    if body == Body::Moon {
        let age = (days - day(2026, 11, 9).days_since_j2000()).rem_euclid(29.53) / 29.53 * 360.0;
        let distance_km = 384_400.0 * (1.0 - 0.055 * (std::f64::consts::TAU * days / 27.55).cos());
        return Place {
            distance_au: distance_km / 149_597_870.7,
            sun_distance_au: 1.0,
            phase_angle_deg: (180.0 - age).abs(),
            elongation_deg: if age > 180.0 { 360.0 - age } else { age },
            east: age < 180.0,
            diameter_arcsec: 2.0 * (1737.4 / distance_km).asin().to_degrees() * 3600.0,
        };
    }
    let (radius, period, at_one_au, conjunction) = orbit(body);
    let angle = std::f64::consts::TAU * (days - conjunction) * (1.0 / period - 1.0 / 365.25);
    let distance_au = (1.0 + radius * radius - 2.0 * radius * angle.cos()).sqrt();
    let angle_at = |near: f64, other: f64, far: f64| {
        ((near * near + other * other - far * far) / (2.0 * near * other))
            .clamp(-1.0, 1.0)
            .acos()
            .to_degrees()
    };
    Place {
        distance_au,
        sun_distance_au: radius,
        phase_angle_deg: angle_at(radius, distance_au, 1.0),
        elongation_deg: angle_at(1.0, distance_au, radius),
        // An inner planet comes from the evening side to inferior conjunction.
        east: if radius < 1.0 {
            angle.sin() < 0.0
        } else {
            angle.sin() > 0.0
        },
        diameter_arcsec: at_one_au / distance_au,
    }
}

/// Mallama and Hilton 2018 without their fine terms; Allen 1973 for the Moon.
fn magnitude(body: Body, place: &Place) -> Option<f64> {
    let i = place.phase_angle_deg;
    let distances = 5.0 * (place.sun_distance_au * place.distance_au).log10();
    let poly = |terms: &[f64]| terms.iter().rev().fold(0.0, |sum, term| sum * i + term);
    let value = match body {
        Body::Mercury if !(2.0..=170.0).contains(&i) => return None,
        Body::Mercury => {
            distances
                + poly(&[
                    -0.613,
                    6.3280e-2,
                    -1.6336e-3,
                    3.3644e-5,
                    -3.4265e-7,
                    1.6893e-9,
                    -3.0334e-12,
                ])
        }
        Body::Venus if i > 163.7 => return None,
        Body::Venus => distances + poly(&[-4.384, -1.044e-3, 3.687e-4, -2.814e-6, 8.938e-9]),
        Body::Moon if i > 150.0 => return None,
        Body::Moon => {
            -12.73
                + poly(&[0.0, 0.026, 0.0, 0.0, 4e-9])
                + 5.0 * (place.distance_au * 389.17).log10()
        }
        Body::Mars => distances + poly(&[-1.601, 0.02267, -1.302e-4]),
        Body::Jupiter => distances + poly(&[-9.395, -3.7e-4, 6.16e-4]),
        Body::Saturn => distances - 9.2,
        Body::Uranus => distances - 7.11,
        _ => distances - 7.0,
    };
    Some(value)
}

fn fraction(place: &Place) -> f64 {
    (1.0 + place.phase_angle_deg.to_radians().cos()) / 2.0
}

fn area(place: &Place, lit: f64) -> f64 {
    lit * std::f64::consts::FRAC_PI_4 * place.diameter_arcsec * place.diameter_arcsec
}

/// The toy sky's answer for one instant.
pub(crate) fn circumstances(body: Body, utc: Utc) -> Circumstances {
    let place = place(body, utc);
    let sun = body == Body::Sun;
    let lit = fraction(&place);
    let diameter = if sun { 1919.0 } else { place.diameter_arcsec };
    let tilt = 20.0;
    Circumstances {
        body: body.name(),
        utc: String::new(),
        delta_t_seconds: 69.2,
        right_ascension_deg: 0.0,
        declination_deg: 0.0,
        ecliptic_longitude_deg: 0.0,
        ecliptic_latitude_deg: 0.0,
        distance_au: place.distance_au,
        sun_distance_au: place.sun_distance_au,
        light_time_seconds: place.distance_au * 499.0,
        distance_light_minutes: place.distance_au * 8.317,
        phase_angle_deg: (!sun).then_some(place.phase_angle_deg),
        illuminated_fraction: (!sun).then_some(lit),
        waxing: (!sun).then_some(place.east),
        elongation_deg: (!sun).then_some(place.elongation_deg),
        elongation_side: (!sun).then_some(if place.east { "east" } else { "west" }),
        angular_diameter_arcsec: diameter,
        lit_area_arcsec2: if sun {
            std::f64::consts::FRAC_PI_4 * diameter * diameter
        } else {
            area(&place, lit)
        },
        orbital_speed_km_s: None,
        magnitude: if sun {
            Some(-26.7)
        } else {
            magnitude(body, &place)
        },
        surface_brightness_mag_arcsec2: None,
        bright_limb_angle_deg: (!sun).then_some(if place.east {
            270.0 + tilt
        } else {
            90.0 + tilt
        }),
        axis_angle_deg: (body == Body::Saturn).then_some(4.0),
        ring_opening_deg: (body == Body::Saturn).then_some(-9.5),
        local: None,
        warnings: Vec::new(),
    }
}

/// The toy sky over a span, one sample a day.
pub(crate) fn series(body: Body, from: Utc, days: usize) -> Series {
    let utc: Vec<Utc> = (0..=days)
        .map(|index| from.plus_days(index as f64))
        .collect();
    let places: Vec<Place> = utc.iter().map(|&utc| place(body, utc)).collect();
    let all: Vec<Circumstances> = utc.iter().map(|&utc| circumstances(body, utc)).collect();
    Series {
        body,
        illuminated_fraction: all
            .iter()
            .map(|c| c.illuminated_fraction.unwrap_or(f64::NAN))
            .collect(),
        angular_diameter_arcsec: all.iter().map(|c| c.angular_diameter_arcsec).collect(),
        magnitude: all
            .iter()
            .map(|c| c.magnitude.unwrap_or(f64::NAN))
            .collect(),
        lit_area_arcsec2: all.iter().map(|c| c.lit_area_arcsec2).collect(),
        elongation_deg: places.iter().map(|place| place.elongation_deg).collect(),
        distance_au: places.iter().map(|place| place.distance_au).collect(),
        utc,
    }
}

/// Local extremes of the sampled span; the flat top is counted in whole samples.
pub(crate) fn highlights(series: &Series) -> Highlights {
    let inner = 1..series.utc.len().saturating_sub(1);
    let m = &series.magnitude;
    let peaks = inner
        .clone()
        .filter(|&i| m[i] < m[i - 1] && m[i] <= m[i + 1])
        .map(|i| {
            let flat = |index: &usize| m[*index] <= m[i] + 0.1;
            let from = (0..i).rev().take_while(flat).last().unwrap_or(i);
            let to = (i..m.len()).take_while(flat).last().unwrap_or(i);
            Peak {
                utc: series.utc[i],
                magnitude: m[i],
                flat_from: series.utc[from],
                flat_to: series.utc[to],
            }
        });
    let a = &series.lit_area_arcsec2;
    let extents = inner
        .filter(|&i| a[i] > a[i - 1] && a[i] >= a[i + 1])
        .map(|i| GreatestExtent {
            utc: series.utc[i],
            lit_area_arcsec2: a[i],
        });
    Highlights {
        peaks: peaks.collect(),
        extents: extents.collect(),
    }
}

/// Both pictures of a body with the date chosen.
pub(crate) fn pictures(series: &Series, chosen: Utc, up_angle_deg: f64) -> [Picture; 2] {
    let marks = highlights(series);
    let now = circumstances(series.body, chosen);
    let tradeoff = TradeoffModel::new(series, &marks, chosen, &now, figures());
    let ends = (series.utc[0], series.utc[series.utc.len() - 1]);
    let dates = DiscModel::dates(ends.0, ends.1);
    let all: Vec<Circumstances> = dates
        .iter()
        .map(|&utc| circumstances(series.body, utc))
        .collect();
    let sample = |utc: Utc, circumstances| DiscSample {
        utc,
        circumstances,
        up_angle_deg,
    };
    let samples: Vec<DiscSample<'_>> = dates
        .iter()
        .zip(&all)
        .map(|(&utc, facts)| sample(utc, facts))
        .collect();
    let disc = DiscModel::new(
        series,
        &samples,
        &sample(chosen, &now),
        Orientation::NorthUp,
        figures(),
    );
    [Picture::Tradeoff(tradeoff), Picture::Disc(disc)]
}

/// Spans that show what each body does: name, first day, number of days.
pub(crate) fn spans() -> [(Body, Utc, usize); 9] {
    [
        (Body::Venus, day(2026, 8, 1), 240),
        (Body::Venus, day(2026, 1, 1), 600),
        (Body::Mercury, day(2026, 9, 1), 120),
        (Body::Mars, day(2026, 9, 1), 360),
        (Body::Jupiter, day(2026, 9, 1), 360),
        (Body::Saturn, day(2026, 6, 1), 360),
        (Body::Neptune, day(2026, 9, 1), 360),
        (Body::Moon, day(2026, 11, 1), 45),
        (Body::Sun, day(2026, 11, 1), 45),
    ]
}
