//! One body at one instant.

use serde::Serialize;

use super::warnings::{self, Warning};
use crate::body::Body;
use crate::ephemeris::{Earth, Observation, check_span};
use crate::error::Error;
use crate::frames::{OfDate, Spherical, position_angle_deg, refraction_from_true_altitude_deg};
use crate::photometry::{
    DEFAULT_EXTINCTION_MAG_PER_AIRMASS, Disc, MarsRotation, SATURN_NORTH_POLE, SaturnLatitudes,
    Seen, dimmed_magnitude, illuminated_fraction, magnitude, surface_brightness_mag_arcsec2,
    surface_magnitude,
};
use crate::place::{Place, topocentric};
use crate::quantity::wrap_half_turn_degrees;
use crate::time::{Utc, delta_t_seconds};

/// What the sky shows of one body at one instant. Degrees, au, and UTC unless the name says otherwise.
#[derive(Debug, Clone, PartialEq, Serialize)]
#[serde(rename_all = "camelCase")]
pub struct Circumstances {
    /// Name of the body.
    pub body: &'static str,
    /// The instant, RFC 3339, UTC.
    pub utc: String,
    /// TT - UT1 in seconds used for this instant.
    pub delta_t_seconds: f64,
    /// Geocentric apparent right ascension, true equator and equinox of date.
    pub right_ascension_deg: f64,
    /// Geocentric apparent declination, true equator and equinox of date.
    pub declination_deg: f64,
    /// Geocentric apparent ecliptic longitude, true equinox of date.
    pub ecliptic_longitude_deg: f64,
    /// Geocentric apparent ecliptic latitude of date.
    pub ecliptic_latitude_deg: f64,
    /// Distance from the Earth's centre, as the light shows it.
    pub distance_au: f64,
    /// Distance from the Sun.
    pub sun_distance_au: f64,
    /// Time the light took to come here.
    pub light_time_seconds: f64,
    /// The same in minutes, the form in which it is told.
    pub distance_light_minutes: f64,
    /// Angle Sun-body-Earth; null for the Sun.
    pub phase_angle_deg: Option<f64>,
    /// Lit share of the disc, 0 to 1; null for the Sun.
    pub illuminated_fraction: Option<f64>,
    /// Whether the lit fraction is growing; null for the Sun.
    pub waxing: Option<bool>,
    /// Angle Sun-Earth-body; null for the Sun.
    pub elongation_deg: Option<f64>,
    /// "east" (follows the Sun, evening) or "west" (precedes it, morning); null for the Sun.
    pub elongation_side: Option<&'static str>,
    /// Equatorial diameter of the disc.
    pub angular_diameter_arcsec: f64,
    /// Lit area of the disc in the sky; the whole disc for the Sun.
    pub lit_area_arcsec2: f64,
    /// Speed along the orbit: around the Sun, for the Moon around the Earth; null for the Sun.
    pub orbital_speed_km_s: Option<f64>,
    /// Visual magnitude outside the air; null where the published law has no value.
    pub magnitude: Option<f64>,
    /// Mean surface brightness of the lit part, magnitudes per square arcsecond; null with `magnitude`.
    pub surface_brightness_mag_arcsec2: Option<f64>,
    /// Position angle of the middle of the lit limb, from celestial north through east; null for the Sun.
    pub bright_limb_angle_deg: Option<f64>,
    /// Saturn only: position angle of the ring plane's north pole.
    #[serde(skip_serializing_if = "Option::is_none")]
    pub axis_angle_deg: Option<f64>,
    /// Saturn only: latitude of the Earth above the ring plane, north positive.
    #[serde(skip_serializing_if = "Option::is_none")]
    pub ring_opening_deg: Option<f64>,
    /// What a place adds; the module puts its keys beside the others.
    #[serde(skip)]
    pub local: Option<Local>,
    /// Remarks that limit the answer.
    pub warnings: Vec<Warning>,
}

/// The topocentric part of [`Circumstances`].
#[derive(Debug, Clone, PartialEq, Serialize)]
#[serde(rename_all = "camelCase")]
pub struct Local {
    /// Topocentric altitude of the centre without refraction.
    pub altitude_deg: f64,
    /// The same, lifted by standard refraction.
    pub apparent_altitude_deg: f64,
    /// From north through east.
    pub azimuth_deg: f64,
    /// Position angle of the zenith, -180 to 180: another position angle minus it is counted from the zenith,
    /// counter-clockwise as seen in the sky.
    pub parallactic_angle_deg: f64,
    /// Magnitude dimmed by the air at that altitude; null below the horizon or without a magnitude.
    pub apparent_magnitude: Option<f64>,
}

/// What the sky shows of a body at an instant, from the Earth's centre and, with a place, from there.
///
/// Time is civil (see [`crate::time`]); accuracy is what `cargo widget accuracy` prints; warnings tell what limits it.
///
/// # Errors
/// `bad-instant` when the instant is not finite, `out-of-span` outside the years 1600 to 2300.
///
/// ```
/// let utc = wanderlight::Utc::parse("2026-11-24T18:00:00Z")?;
/// let venus = wanderlight::circumstances(wanderlight::Body::Venus, utc, None)?;
/// assert!(venus.magnitude.is_some_and(|magnitude| (-4.95..-4.8).contains(&magnitude)));
/// # Ok::<(), wanderlight::Error>(())
/// ```
pub fn circumstances(body: Body, utc: Utc, place: Option<&Place>) -> Result<Circumstances, Error> {
    let span_part = check_span(utc)?;
    let earth = Earth::at(utc.to_tt());
    let of_date = OfDate::at(earth.tt());
    let observation = Observation::of(body, &earth);
    let sun_direction = earth.sun_direction();
    let is_sun = body == Body::Sun;

    let of_equator = of_date.equator().apply(observation.direction);
    let equatorial = Spherical::of(of_equator);
    let ecliptic = Spherical::of(of_date.ecliptic().apply(observation.direction));
    let sun_longitude_deg = Spherical::of(of_date.ecliptic().apply(sun_direction)).longitude_deg;
    let from_sun_deg = wrap_half_turn_degrees(ecliptic.longitude_deg - sun_longitude_deg);
    let position_angle_of =
        |direction: [f64; 3]| position_angle_deg(of_equator, of_date.equator().apply(direction));

    let seen = Seen::new(&observation, &earth, utc);
    let estimate = magnitude(&seen, MarsRotation::AtInstant);
    let phase_angle_deg = observation.phase_angle_deg();
    let lit_share = if is_sun {
        1.0
    } else {
        illuminated_fraction(phase_angle_deg)
    };
    let disc = Disc::of(body, observation.distance_au());
    let lit_area_arcsec2 = disc.lit_area_arcsec2(lit_share);
    let saturn = (body == Body::Saturn).then(|| SaturnLatitudes::of(&observation));

    let local = place.map(|place| {
        let seen = topocentric(&observation, &earth, &of_date, utc, place);
        let apparent_altitude_deg =
            seen.altitude_deg + refraction_from_true_altitude_deg(seen.altitude_deg);
        Local {
            altitude_deg: seen.altitude_deg,
            apparent_altitude_deg,
            azimuth_deg: seen.azimuth_deg,
            parallactic_angle_deg: seen.parallactic_angle_deg,
            apparent_magnitude: estimate.value().and_then(|magnitude| {
                dimmed_magnitude(
                    magnitude,
                    apparent_altitude_deg,
                    DEFAULT_EXTINCTION_MAG_PER_AIRMASS,
                )
            }),
        }
    });
    let light_time_seconds = observation.light_time_seconds();
    Ok(Circumstances {
        body: body.name(),
        utc: utc.to_rfc3339(),
        delta_t_seconds: delta_t_seconds(utc).seconds,
        right_ascension_deg: equatorial.longitude_deg,
        declination_deg: equatorial.latitude_deg,
        ecliptic_longitude_deg: ecliptic.longitude_deg,
        ecliptic_latitude_deg: ecliptic.latitude_deg,
        distance_au: observation.distance_au(),
        sun_distance_au: observation.sun_distance_au(),
        light_time_seconds,
        distance_light_minutes: light_time_seconds / 60.0,
        phase_angle_deg: (!is_sun).then_some(phase_angle_deg),
        illuminated_fraction: (!is_sun).then_some(lit_share),
        waxing: (!is_sun).then(|| observation.is_waxing()),
        elongation_deg: (!is_sun).then(|| observation.elongation_deg(sun_direction)),
        elongation_side: (!is_sun).then_some(if from_sun_deg >= 0.0 { "east" } else { "west" }),
        angular_diameter_arcsec: disc.angular_diameter_arcsec,
        lit_area_arcsec2,
        orbital_speed_km_s: (!is_sun).then(|| observation.orbital_speed_km_s()),
        magnitude: estimate.value(),
        surface_brightness_mag_arcsec2: surface_magnitude(&seen, estimate)
            .value()
            .and_then(|magnitude| surface_brightness_mag_arcsec2(magnitude, lit_area_arcsec2)),
        bright_limb_angle_deg: (!is_sun).then(|| position_angle_of(sun_direction)),
        axis_angle_deg: saturn.map(|_| position_angle_of(SATURN_NORTH_POLE)),
        ring_opening_deg: saturn.map(|latitudes| latitudes.earth_deg),
        warnings: warnings::of(body, utc, span_part, estimate, local.as_ref()),
        local,
    })
}
