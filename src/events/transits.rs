//! Mercury and Venus before the Sun.

use super::errors::{between_deg, of_closest_days};
use super::event::{Contact, Local};
use super::kind::Kind::{self, *};
use super::piece::Piece;
use super::search::{Scan, minima, roots};
use super::sky::Moment;
use super::sun_line::{is_inferior, lines};
use super::topocentric::View;
use crate::body::Body;
use crate::frames::position_angle_deg;
use crate::photometry::Disc;
use crate::place::Place;
use crate::quantity::{ARCSEC_PER_RAD, angle_of_sine_rad, sin};

pub(super) const KINDS: [Kind; 2] = [Transit, TransitNearMiss];

/// Semidiameter of the Sun at 1 au by the almanacs' convention. The nominal radius of IAU 2015 is 959.23 arcsec; the
/// choice moves contacts by up to a minute.
pub const SUN_SEMIDIAMETER_AT_1_AU_ARCSEC: f64 = 959.63;
/// A near miss passes within so many semidiameters of the Sun's centre.
const NEAR_MISS_SUN_RADII: f64 = 1.25;
/// The least angle comes within some hours of the conjunction in longitude.
const HALF_SPAN_DAYS: f64 = 0.5;
/// A central transit lasts eight hours.
const HALF_TRANSIT_DAYS: f64 = 0.3;
const TOLERANCE_DAYS: f64 = 1e-6;

pub(super) fn find(piece: &Piece<'_>) {
    for body in Body::PLANETS {
        if !body.is_inner_planet() || !piece.query().names(body) {
            continue;
        }
        for conjunction in lines(piece, body, 0.0, HALF_SPAN_DAYS) {
            let moment = piece.at(conjunction.days);
            let reach_deg = 2.0 * sun_semidiameter_deg(moment.seen(Body::Sun).distance_au());
            if is_inferior(&moment, body) && moment.elongation_deg(body) < reach_deg {
                record(piece, body, conjunction.days);
            }
        }
    }
}

fn record(piece: &Piece<'_>, body: Body, conjunction_days: f64) {
    let scan = Scan {
        from_days: conjunction_days - HALF_SPAN_DAYS,
        to_days: conjunction_days + HALF_SPAN_DAYS,
        step_days: HALF_SPAN_DAYS / 2.0,
        tolerance_days: TOLERANCE_DAYS,
    };
    let closest = minima(&scan, &mut |days| {
        Moment::at(days).separation_square_deg2(body, Body::Sun)
    });
    let Some(closest) = closest.first() else {
        return;
    };
    let error_days = of_closest_days(closest, between_deg(body, Body::Sun));
    let geocentric = |days: f64| Sight::of(&Moment::at(days), body);
    let greatest = geocentric(closest.days);
    if greatest.separation_deg > NEAR_MISS_SUN_RADII * greatest.sun_deg {
        return;
    }
    let kind = if greatest.gap_deg(Touch::Outside) < 0.0 {
        Transit
    } else {
        TransitNearMiss
    };
    piece.record(kind, body, closest.days, error_days, &|moment, event| {
        let position_angle_at = |moment: &Moment| {
            let equator = moment.of_date().equator();
            position_angle_deg(
                equator.apply(moment.earth().sun_direction()),
                equator.apply(moment.seen(body).direction),
            )
        };
        let values = &mut event.values;
        values.separation_deg = Some(greatest.separation_deg);
        values.separation_sun_radii = Some(greatest.separation_deg / greatest.sun_deg);
        values.sun_semidiameter_arcsec = Some(greatest.sun_deg * 3600.0);
        values.position_angle_deg = Some(position_angle_at(moment));
        if kind == Transit {
            values.is_grazing = greatest.gap_deg(Touch::Inside) > 0.0;
            let times = contacts(closest.days, &geocentric);
            if let (Some(first), Some(last)) = (times[0], times[3]) {
                values.duration_minutes = Some((last - first) * 1440.0);
            }
            for (name, days) in NAMES.into_iter().zip(times) {
                if let Some(days) = days {
                    let moment = Moment::at(days);
                    event.contacts.push(Contact {
                        name,
                        utc: moment.utc(),
                        position_angle_deg: position_angle_at(&moment),
                        altitude_deg: None,
                        sun_altitude_deg: None,
                    });
                }
            }
        }
        event.local = piece
            .query()
            .place
            .map(|place| seen_from(&place, body, closest.days));
    });
}

const NAMES: [&str; 4] = [
    "first-contact",
    "second-contact",
    "third-contact",
    "fourth-contact",
];

fn seen_from(place: &Place, body: Body, geocentric_days: f64) -> Local {
    let sight = |days: f64| {
        let view = View::new(place, days);
        Sight {
            separation_deg: view.separation_deg(body, Body::Sun),
            sun_deg: sun_semidiameter_deg(view.distance_au(Body::Sun)),
            planet_deg: semidiameter_deg(body, view.distance_au(body)),
        }
    };
    // Parallax moves the greatest transit by some minutes.
    let scan = Scan {
        from_days: geocentric_days - 0.05,
        to_days: geocentric_days + 0.05,
        step_days: 0.025,
        tolerance_days: TOLERANCE_DAYS,
    };
    let greatest = minima(&scan, &mut |days| sight(days).separation_deg);
    let mut contacts_there = Vec::new();
    for greatest in greatest {
        for (name, days) in NAMES.into_iter().zip(contacts(greatest.days, &sight)) {
            if let Some(days) = days {
                contacts_there.push(View::new(place, days).contact(name, body, Body::Sun));
            }
        }
    }
    Local {
        is_above_horizon: contacts_there.iter().any(|contact| {
            contact
                .altitude_deg
                .is_some_and(|altitude_deg| altitude_deg > 0.0)
        }),
        contacts: contacts_there,
    }
}

/// How the discs stand to each other.
struct Sight {
    separation_deg: f64,
    sun_deg: f64,
    planet_deg: f64,
}

#[derive(Clone, Copy)]
enum Touch {
    Outside,
    Inside,
}

impl Sight {
    fn of(moment: &Moment, body: Body) -> Self {
        Self {
            separation_deg: moment.elongation_deg(body),
            sun_deg: sun_semidiameter_deg(moment.seen(Body::Sun).distance_au()),
            planet_deg: semidiameter_deg(body, moment.seen(body).distance_au()),
        }
    }

    /// Negative once the discs overlap, or once the planet's lies inside.
    fn gap_deg(&self, touch: Touch) -> f64 {
        match touch {
            Touch::Outside => self.separation_deg - self.sun_deg - self.planet_deg,
            Touch::Inside => self.separation_deg - self.sun_deg + self.planet_deg,
        }
    }
}

/// The four contacts around the greatest transit, days TT; none that does not happen.
fn contacts(greatest_days: f64, sight: &dyn Fn(f64) -> Sight) -> [Option<f64>; 4] {
    let contact = |touch: Touch, far_days: f64| {
        let (from_days, to_days) = if far_days < 0.0 {
            (greatest_days + far_days, greatest_days)
        } else {
            (greatest_days, greatest_days + far_days)
        };
        let scan = Scan {
            from_days,
            to_days,
            step_days: HALF_TRANSIT_DAYS,
            tolerance_days: TOLERANCE_DAYS,
        };
        roots(&scan, f64::INFINITY, &mut |days| sight(days).gap_deg(touch))
            .first()
            .map(|found| found.days)
    };
    [
        contact(Touch::Outside, -HALF_TRANSIT_DAYS),
        contact(Touch::Inside, -HALF_TRANSIT_DAYS),
        contact(Touch::Inside, HALF_TRANSIT_DAYS),
        contact(Touch::Outside, HALF_TRANSIT_DAYS),
    ]
}

fn sun_semidiameter_deg(distance_au: f64) -> f64 {
    let at_1_au = SUN_SEMIDIAMETER_AT_1_AU_ARCSEC / ARCSEC_PER_RAD;
    angle_of_sine_rad(sin(at_1_au) / distance_au).to_degrees()
}

fn semidiameter_deg(body: Body, distance_au: f64) -> f64 {
    Disc::of(body, distance_au).angular_diameter_arcsec / 7200.0
}
