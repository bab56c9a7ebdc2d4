//! One element: its settings, its chosen day, its picture and its words.

use js_sys::{Array, Object};
use wasm_bindgen::prelude::*;
use web_sys::HtmlCanvasElement;

use super::attributes::{Attributes, Problem};
use super::canvas::paint;
use super::host::{Day, Host, read_host};
use super::module::thrown;
use super::plain::{self, put};
use super::scene::Scene;
use super::settings::{Settings, Spot, View, frame_around, read_date};
use super::words::{self, iso_date};
use crate::chart::{PlanGrip, Viewport};
use crate::error::Error;
use crate::explain::Table;
use crate::place::{self, Coordinate, Place};

/// How far the Page keys move, in days.
const PAGE_DAYS: i64 = 7;

/// The thinking part of one `<wander-light>`; the element class owns one while it is in a page.
#[wasm_bindgen]
pub struct Exhibit {
    pub(super) host: Host,
    pub(super) settings: Settings,
    /// First and last day shown.
    pub(super) frame: (Day, Day),
    pub(super) scene: Scene,
    pub(super) horizon_up: bool,
    /// The last drawing's, for positions of the pointer.
    pub(super) viewport: Viewport,
    /// What the pointer holds.
    pub(super) grip: Option<PlanGrip>,
}

#[wasm_bindgen]
impl Exhibit {
    /// An exhibit with the default settings.
    #[wasm_bindgen(constructor)]
    pub fn new() -> Result<Exhibit, JsValue> {
        Self::build(&Attributes::new(JsValue::UNDEFINED))
            .map(|(exhibit, _)| exhibit)
            .map_err(thrown)
    }

    /// Reads all attributes anew; returns a list of `{ attribute, code, message }` of those that cannot be used.
    pub fn configure(&mut self, attributes: JsValue) -> Result<Array, JsValue> {
        let (exhibit, problems) = Self::build(&Attributes::new(attributes)).map_err(thrown)?;
        let (horizon_up, viewport, grip) = (self.horizon_up, self.viewport, self.grip);
        *self = exhibit;
        (self.viewport, self.grip) = (viewport, grip);
        if horizon_up {
            self.turn_disc(true)?;
        }
        Ok(problems.iter().map(Problem::write).collect())
    }

    /// Draws on a canvas of the given size in CSS pixels; returns where the date axis begins and ends.
    pub fn draw(
        &mut self,
        canvas: HtmlCanvasElement,
        width_css: f64,
        height_css: f64,
        density: f64,
    ) -> Result<Vec<f64>, JsValue> {
        let view = Viewport::new(width_css, height_css, density);
        self.viewport = view;
        let picture = &self.scene.picture;
        paint(canvas, picture, &view, &self.settings.theme).map_err(thrown)?;
        let end = |day| picture.x_of_date(self.host.noon(day), &view);
        Ok(vec![end(self.frame.0), end(self.frame.1)])
    }

    /// Everything about the body at the chosen moment.
    pub fn circumstances(&self) -> Result<JsValue, JsValue> {
        plain::circumstances(&self.scene.now)
    }

    /// The chosen date and, where the visitor or the page gave one, the place.
    pub fn choices(&self) -> Object {
        let choices = plain::texts(&[("date", &iso_date(self.settings.day))]);
        if let Spot::Exact(place) = &self.settings.spot {
            let (latitude_deg, longitude_deg) = (place.latitude_deg(), place.longitude_deg());
            put(
                &choices,
                "place",
                &format!("{latitude_deg},{longitude_deg}").into(),
            );
        }
        choices
    }

    /// Labels, colours and the like: what changes with the settings but not with the date.
    pub fn furniture(&self) -> Object {
        words::furniture(&self.settings, &self.host)
    }

    /// Words and slider positions for the chosen date.
    pub fn state(&self) -> Object {
        words::state(
            &self.settings,
            &self.host,
            &self.scene,
            self.frame,
            self.horizon_up,
        )
    }

    /// The picture's numbers: `{ caption, head, rows, marked }`, `marked` being the chosen row.
    pub fn table(&self) -> Object {
        let Table {
            caption,
            head,
            rows,
        } = self.scene.table(&self.host);
        let chosen = words::chosen_remark();
        let marked = rows
            .iter()
            .position(|row| row.last().is_some_and(|remark| remark == chosen));
        let object = plain::texts(&[("caption", &caption)]);
        put(&object, "head", &plain::list(&head));
        put(&object, "rows", &plain::list(&rows));
        let marked = marked.map_or(JsValue::NULL, |row| JsValue::from_f64(row as f64));
        put(&object, "marked", &marked);
        object
    }

    /// Whether a key moves the date.
    pub fn knows_key(&self, key: &str) -> bool {
        self.target_of(key).is_some()
    }

    /// Moves as a key asks: arrows a day, Page keys a week, Home and End to the ends of the frame.
    pub fn press(&mut self, key: &str) -> Result<bool, JsValue> {
        match self.target_of(key) {
            Some(day) => self.move_to(day.clamp(self.frame.0, self.frame.1)),
            None => Ok(false),
        }
    }

    /// Moves to a position of the slider.
    pub fn choose_day(&mut self, day: f64) -> Result<bool, JsValue> {
        if !day.is_finite() {
            return Ok(false);
        }
        self.move_to((day as Day).clamp(self.frame.0, self.frame.1))
    }

    /// Moves to the visitor's own date.
    pub fn choose_today(&mut self) -> Result<bool, JsValue> {
        self.move_to(self.host.today())
    }

    /// Moves to a typed date; answers `{ changed, message }`.
    pub fn choose_date(&mut self, date: &str) -> Result<Object, JsValue> {
        match read_date(date, &self.host) {
            Ok(day) => Ok(taken(self.move_to(day)?)),
            Err(error) => Ok(refused(&error)),
        }
    }

    /// Takes a typed place; answers `{ changed, message }`.
    pub fn choose_place(&mut self, latitude: &str, longitude: &str) -> Result<Object, JsValue> {
        let typed = || {
            let latitude_deg = place::parse_coordinate(latitude, Coordinate::Latitude)?;
            let longitude_deg = place::parse_coordinate(longitude, Coordinate::Longitude)?;
            Place::new(latitude_deg, longitude_deg, 0.0)
        };
        match typed() {
            Ok(place) => {
                self.settings.spot = Spot::Exact(place);
                self.rebuild()?;
                Ok(taken(true))
            }
            Err(error) => Ok(refused(&error)),
        }
    }

    /// Shows the disc with the horizon, or else the celestial pole, up.
    pub fn turn_disc(&mut self, horizon_up: bool) -> Result<(), JsValue> {
        self.horizon_up =
            horizon_up && self.settings.view == View::Disc && self.settings.spot.place().is_some();
        self.rebuild()
    }
}

impl Exhibit {
    fn build(attributes: &Attributes) -> Result<(Self, Vec<Problem>), Error> {
        let (host, mut problems) = read_host(attributes)?;
        let (settings, more) = Settings::read(attributes, &host);
        problems.extend(more);
        let frame = frame_around(settings.day, settings.span_days);
        let scene = Scene::build(&settings, &host, frame, false)?;
        Ok((
            Self {
                host,
                settings,
                frame,
                scene,
                horizon_up: false,
                viewport: Viewport::new(0.0, 0.0, 1.0),
                grip: None,
            },
            problems,
        ))
    }

    fn target_of(&self, key: &str) -> Option<Day> {
        let day = self.settings.day;
        Some(match key {
            "ArrowRight" | "ArrowUp" => day + 1,
            "ArrowLeft" | "ArrowDown" => day - 1,
            "PageUp" => day + PAGE_DAYS,
            "PageDown" => day - PAGE_DAYS,
            "Home" => self.frame.0,
            "End" => self.frame.1,
            _ => return None,
        })
    }

    /// Chooses a day; one outside the frame takes the frame along. Answers whether anything moved.
    pub(super) fn move_to(&mut self, day: Day) -> Result<bool, JsValue> {
        if day == self.settings.day {
            return Ok(false);
        }
        self.settings.day = day;
        if (self.frame.0..=self.frame.1).contains(&day) {
            self.scene
                .set_day(&self.settings, &self.host, self.horizon_up)
                .map_err(thrown)?;
        } else {
            self.frame = frame_around(day, self.settings.span_days);
            self.rebuild()?;
        }
        Ok(true)
    }

    fn rebuild(&mut self) -> Result<(), JsValue> {
        self.scene = Scene::build(&self.settings, &self.host, self.frame, self.horizon_up)
            .map_err(thrown)?;
        Ok(())
    }
}

/// What a visitor typed was taken.
fn taken(changed: bool) -> Object {
    let answer = Object::new();
    put(&answer, "changed", &changed.into());
    put(&answer, "message", &JsValue::NULL);
    answer
}

/// What a visitor typed was not taken, and why.
fn refused(error: &Error) -> Object {
    let answer = plain::texts(&[("message", error.message())]);
    put(&answer, "changed", &false.into());
    answer
}
