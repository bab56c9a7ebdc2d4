//! The Moon before a planet: possible somewhere, and seen from a place.

use super::event::Local;
use super::search::{Scan, roots};
use super::sky::Moment;
use super::topocentric::View;
use crate::body::Body;
use crate::photometry::Disc;
use crate::place::Place;
use crate::quantity::{ARCSEC_PER_RAD, AU_KM, angle_of_sine_rad};

/// The Earth's equatorial radius, whose angle at the Moon is the parallax.
const EARTH_RADIUS_KM: f64 = 6_378.137;

/// Whether the Moon covers any part of the planet somewhere, at the least angle between their centres.
pub(super) fn is_possible(moment: &Moment, body: Body) -> bool {
    let parallax_deg = |body: Body| {
        angle_of_sine_rad(EARTH_RADIUS_KM / AU_KM / moment.seen(body).distance_au()).to_degrees()
    };
    let semidiameter_deg = |body: Body| moment.disc(body).angular_diameter_arcsec / 7200.0;
    moment.separation_deg(body, Body::Moon)
        < semidiameter_deg(Body::Moon) + semidiameter_deg(body) + parallax_deg(Body::Moon)
            - parallax_deg(body)
}

/// Parallax carries the Moon by up to one degree, which it needs two hours for, against one and a half more for its disc.
const HALF_SPAN_DAYS: f64 = 0.17;
const STEP_DAYS: f64 = HALF_SPAN_DAYS / 12.0;
const TOLERANCE_DAYS: f64 = 1e-6;

/// When the planet's centre is behind the Moon's mean limb, seen from a place.
///
/// Good to some 5 seconds where the limb is crossed steeply: the position of the Moon is good to half a second of arc,
/// mountains at its limb stand out by two.
pub(super) fn seen_from(place: &Place, body: Body, closest_days: f64) -> Local {
    let gap_deg = |days: f64| {
        let view = View::new(place, days);
        let limb_arcsec =
            Disc::of(Body::Moon, view.distance_au(Body::Moon)).angular_diameter_arcsec / 2.0;
        view.separation_deg(body, Body::Moon) - (limb_arcsec / ARCSEC_PER_RAD).to_degrees()
    };
    let scan = Scan {
        from_days: closest_days - HALF_SPAN_DAYS,
        to_days: closest_days + HALF_SPAN_DAYS,
        step_days: STEP_DAYS,
        tolerance_days: TOLERANCE_DAYS,
    };
    let mut contacts = Vec::new();
    for crossing in roots(&scan, f64::INFINITY, &mut { gap_deg }) {
        let name = if crossing.steepness < 0.0 {
            "disappearance"
        } else {
            "reappearance"
        };
        contacts.push(View::new(place, crossing.days).contact(name, body, Body::Moon));
    }
    Local {
        is_above_horizon: contacts.iter().any(|contact| {
            contact
                .altitude_deg
                .is_some_and(|altitude_deg| altitude_deg > 0.0)
        }),
        contacts,
    }
}
