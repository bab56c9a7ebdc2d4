//! The element's phrases in English.

use super::english::English;
use super::page::{DistanceTold, Label, NightEdge, Outlook, PageWords, SpotName, Units};
use super::words::Words;
use crate::body::Body;

const COMPASS: [&str; 16] = [
    "north",
    "north-north-east",
    "north-east",
    "east-north-east",
    "east",
    "east-south-east",
    "south-east",
    "south-south-east",
    "south",
    "south-south-west",
    "south-west",
    "west-south-west",
    "west",
    "west-north-west",
    "north-west",
    "north-north-west",
];

impl PageWords for English {
    fn labels(&self) -> Vec<Label> {
        [
            ("sliderlabel", "Date, by day"),
            ("pickerlabel", "Date"),
            ("today", "Today"),
            ("playlabel", "Play"),
            ("steplabel", "Step on"),
            ("horizonuplabel", "Horizon up"),
            ("numberslabel", "The same in numbers"),
            ("latitudelabel", "Latitude"),
            ("longitudelabel", "Longitude"),
            ("useplace", "Use this place"),
            ("locate", "Ask this device"),
            (
                "placehint",
                "The place is used in this page only and is sent nowhere. Write degrees, for instance 54.5 or 33° 54′ S.",
            ),
        ]
        .map(|(part, text)| (part, text.to_owned()))
        .into()
    }

    fn place_heading(&self, spot: &SpotName) -> String {
        match spot {
            SpotName::Unknown => "Your place: not known, choose it here".to_owned(),
            SpotName::Rough(city) => {
                format!("Your rough place: {city}, from the time zone; correct it here")
            }
            SpotName::Exact(place) => format!("Place: {place}"),
        }
    }

    fn outlook(&self, body: Body, spot: &SpotName, edge: NightEdge, outlook: &Outlook) -> String {
        let name = self.body(body);
        let from = match spot {
            SpotName::Unknown => return String::new(),
            SpotName::Rough(city) => format!("From around {city}"),
            SpotName::Exact(place) => format!("From {place}"),
        };
        let when = match edge {
            NightEdge::Evening => "that evening, once the Sun is 6° below the horizon",
            NightEdge::Morning => "that morning, while the Sun is still 6° below the horizon",
        };
        match outlook {
            Outlook::Up {
                altitude,
                compass_point,
            } => {
                let point = COMPASS[compass_point % COMPASS.len()];
                format!("{from} {name} stands about {altitude}° high in the {point} {when}.")
            }
            Outlook::Down => format!("{from} {name} is below the horizon {when}."),
            Outlook::NoTwilight => {
                format!("{from} the Sun does not reach 6° below the horizon on that date.")
            }
        }
    }

    fn distance(&self, body: Body, distance: &DistanceTold, units: Units) -> String {
        let unit = match units {
            Units::Metric => "km",
            Units::Imperial => "miles",
        };
        let name = capitalised(self.body(body));
        match distance {
            DistanceTold::Millions { distance, minutes } => {
                format!(
                    "{name} is {distance} million {unit} away; its light takes {minutes} minutes to arrive."
                )
            }
            DistanceTold::Whole { distance, seconds } => {
                format!(
                    "{name} is {distance} {unit} away; its light takes {seconds} seconds to arrive."
                )
            }
        }
    }

    fn lean(&self, body: Body, edge: NightEdge) -> String {
        let name = self.body(body);
        match edge {
            NightEdge::Evening => format!("The discs lean as when {name} stands low in the west."),
            NightEdge::Morning => format!("The discs lean as when {name} stands low in the east."),
        }
    }

    fn caution(&self, body: Body, elongation: &str) -> String {
        let name = self.body(body);
        format!(
            "Caution: {name} is only {elongation}° from the Sun. Never search for it while the Sun is up, with the naked eye, \
             binoculars or a telescope, and stop before sunrise: a glimpse of the Sun can blind. Follow local rules and \
             trained guides."
        )
    }

    fn locate_refused(&self) -> &'static str {
        "The device gave no position. You can type latitude and longitude instead."
    }
}

fn capitalised(text: &str) -> String {
    let mut letters = text.chars();
    let first = letters.next().map(|first| first.to_ascii_uppercase());
    first.into_iter().chain(letters).collect()
}
