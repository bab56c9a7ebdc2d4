//! The element's words: gathers facts, has them told, and hands finished strings to the page.

use js_sys::Object;
use wasm_bindgen::JsValue;

use super::host::{Day, Host};
use super::plain::{put, texts};
use super::scene::{Scene, figures, night_edge};
use super::settings::{Settings, Spot, View};
use crate::chart::Colour;
use crate::circumstances::circumstances;
use crate::events::{civil_dawn, civil_dusk};
use crate::explain::{
    DistanceTold, English, NightEdge, Outlook, PageWords, SpotName, Words, announce, sentence_disc,
    sentence_plan, sentence_tradeoff,
};
use crate::quantity::AU_KM;
use crate::time::Utc;

/// Within this angle from the Sun a body is not to be searched for without the caution.
const CAUTION_ELONGATION_DEG: f64 = 20.0;
const WEIGHTY_WARNINGS: [&str; 3] = [
    "magnitude-extrapolated",
    "magnitude-undefined",
    "outside-checked-span",
];
/// Below this distance it is told in whole kilometres or miles rather than millions.
const FAR_KM: f64 = 1e6;

/// What the page shows and the date does not change: `{ labels, palette, view, hasPlace, locateRefused }`.
pub(super) fn furniture(settings: &Settings, host: &Host) -> Object {
    let labels = Object::new();
    for (part, text) in English.labels() {
        put(&labels, part, &text.into());
    }
    put(
        &labels,
        "placelabel",
        &English
            .place_heading(&spot_name(&settings.spot, host))
            .into(),
    );
    let palette = Object::new();
    let theme = &settings.theme;
    for (name, colour) in [
        ("paper", theme.background),
        ("ink", theme.ink),
        ("soft", theme.muted),
        ("line", theme.grid),
        ("accent", theme.chosen),
    ] {
        put(&palette, name, &hex(colour).into());
    }
    let Colour(red, green, blue) = theme.background;
    let is_dark = u16::from(red) + u16::from(green) + u16::from(blue) < 384;
    put(
        &palette,
        "scheme",
        &if is_dark { "dark" } else { "light" }.into(),
    );
    let furniture = Object::new();
    put(&furniture, "labels", &labels);
    put(&furniture, "palette", &palette);
    put(&furniture, "view", &settings.view.name().into());
    put(
        &furniture,
        "hasPlace",
        &settings.spot.place().is_some().into(),
    );
    put(
        &furniture,
        "locateRefused",
        &English.locate_refused().into(),
    );
    furniture
}

/// Slider positions and everything that is told about the chosen date.
pub(super) fn state(
    settings: &Settings,
    host: &Host,
    scene: &Scene,
    (first_day, last_day): (Day, Day),
    horizon_up: bool,
) -> Object {
    let body = settings.body;
    let figures = figures(host);
    let (sentence, picture) = match settings.view {
        View::Tradeoff => (
            sentence_tradeoff(&scene.series, &scene.highlights, &scene.reading(), figures),
            English.picture_tradeoff(body),
        ),
        View::Disc => (
            sentence_disc(body, scene.utc, &scene.now, figures),
            English.picture_disc(body),
        ),
        View::Plan => (
            sentence_plan(body, scene.utc, &scene.now, figures),
            English.picture_plan(body),
        ),
    };
    let mut place = distance(settings, host, scene);
    add_sentence(&mut place, &outlook(settings, host, scene));
    if horizon_up {
        add_sentence(&mut place, &English.lean(body, night_edge(&scene.now)));
    }
    // What limits the picture itself is said with it; what only limits the last digit stands with the numbers.
    let mut remarks = String::new();
    for warning in &scene.now.warnings {
        if WEIGHTY_WARNINGS.contains(&warning.code) {
            add_sentence(&mut place, &warning.message);
        }
        add_sentence(&mut remarks, &warning.message);
    }
    let caution = scene
        .now
        .elongation_deg
        .filter(|&elongation_deg| elongation_deg < CAUTION_ELONGATION_DEG)
        .map(|elongation_deg| English.caution(body, &figures.number(elongation_deg, 0)))
        .unwrap_or_default();
    let state = texts(&[
        ("date", &iso_date(settings.day)),
        ("description", &format!("{picture}. {sentence}")),
        ("sentence", &sentence),
        ("place", &place),
        ("caution", &caution),
        ("remarks", &remarks),
        ("announcement", &announce(&scene.reading(), figures)),
    ]);
    for (key, day) in [
        ("day", settings.day),
        ("firstDay", first_day),
        ("lastDay", last_day),
    ] {
        put(&state, key, &JsValue::from_f64(day as f64));
    }
    put(&state, "horizonUp", &horizon_up.into());
    state
}

fn add_sentence(text: &mut String, sentence: &str) {
    if !text.is_empty() && !sentence.is_empty() {
        text.push(' ');
    }
    text.push_str(sentence);
}

/// A calendar day as the date field of a page writes it.
pub(super) fn iso_date(day: Day) -> String {
    // Noon of the count's own day: its date in UTC is the calendar date of the zone.
    let text = Utc::from_days_since_j2000(day as f64).to_rfc3339();
    text.split('T').next().unwrap_or_default().to_owned()
}

/// The remark that marks the chosen row of the table.
pub(super) fn chosen_remark() -> &'static str {
    English.remark_chosen()
}

fn distance(settings: &Settings, host: &Host, scene: &Scene) -> String {
    let figures = figures(host);
    let distance_km = scene.now.distance_au * AU_KM;
    let in_unit = settings.units.from_km(distance_km);
    let told = if distance_km < FAR_KM {
        DistanceTold::Whole {
            // The light's path and the Moon's centre differ by tens of kilometres; hundreds are safe to print.
            distance: figures.number((in_unit / 100.0).round() * 100.0, 0),
            seconds: figures.number(scene.now.light_time_seconds, 1),
        }
    } else {
        let millions = in_unit / 1e6;
        let decimals = u8::from(millions < 100.0);
        let minutes = scene.now.distance_light_minutes;
        DistanceTold::Millions {
            distance: figures.number(millions, decimals),
            minutes: figures.number(minutes, u8::from(minutes < 10.0)),
        }
    };
    English.distance(settings.body, &told, settings.units)
}

/// Where to look from the place at the darker end of civil twilight.
fn outlook(settings: &Settings, host: &Host, scene: &Scene) -> String {
    let Some(place) = settings.spot.place() else {
        return String::new();
    };
    let edge = night_edge(&scene.now);
    let twilight = match edge {
        NightEdge::Evening => civil_dusk(place, scene.utc),
        NightEdge::Morning => civil_dawn(place, scene.utc),
    };
    let outlook = match twilight {
        None => Outlook::NoTwilight,
        Some(utc) => match circumstances(settings.body, utc, Some(place))
            .ok()
            .and_then(|then| then.local)
        {
            Some(local) if local.apparent_altitude_deg > 0.0 => Outlook::Up {
                altitude: figures(host).number(local.apparent_altitude_deg, 0),
                compass_point: (local.azimuth_deg / 22.5).round() as usize % 16,
            },
            _ => Outlook::Down,
        },
    };
    English.outlook(
        settings.body,
        &spot_name(&settings.spot, host),
        edge,
        &outlook,
    )
}

fn spot_name(spot: &Spot, host: &Host) -> SpotName {
    let figures = figures(host);
    match spot {
        Spot::Unknown => SpotName::Unknown,
        Spot::Rough { city, .. } => SpotName::Rough(city.clone()),
        Spot::Exact(place) => {
            let coordinate = |degrees: f64, [positive, negative]: [char; 2]| {
                let letter = if degrees < 0.0 { negative } else { positive };
                format!("{}° {letter}", figures.number(degrees.abs(), 1))
            };
            let latitude = coordinate(place.latitude_deg(), ['N', 'S']);
            SpotName::Exact(format!(
                "{latitude}, {}",
                coordinate(place.longitude_deg(), ['E', 'W'])
            ))
        }
    }
}

fn hex(Colour(red, green, blue): Colour) -> String {
    format!("#{red:02x}{green:02x}{blue:02x}")
}
