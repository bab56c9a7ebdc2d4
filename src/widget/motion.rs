//! How a pointer and the play button move the date.

use wasm_bindgen::prelude::*;

use super::exhibit::Exhibit;
use super::module::thrown;
use super::settings::synodic_days;
use crate::chart::{Picture, PlanGrip};
use crate::ephemeris::{Traveller, plan_passage};
use crate::error::Error;
use crate::time::Utc;

/// Seconds in which playing runs through one synodic period.
const ROUND_SECONDS: f64 = 20.0;
/// Steps of a synodic period for visitors who want no motion.
const STEPS_PER_ROUND: i64 = 24;

#[wasm_bindgen]
impl Exhibit {
    /// A pointer is pressed at a point of the canvas; says whether it holds a body, which then moves in any direction.
    pub fn grab(&mut self, x_css: f64, y_css: f64) -> bool {
        self.grip = match &self.scene.picture {
            Picture::Plan(model) => model.grip_at((x_css, y_css), &self.viewport),
            _ => Some(PlanGrip::Dates),
        };
        matches!(self.grip, Some(PlanGrip::Earth | PlanGrip::Planet))
    }

    /// The pressed pointer is at a point of the canvas: moves to the date under it, or to the nearest one at which the
    /// body that it holds stands in its direction from the Sun.
    pub fn drag(&mut self, x_css: f64, y_css: f64) -> Result<bool, JsValue> {
        match self.instant_under(x_css, y_css).map_err(thrown)? {
            Some(utc) => self.move_to(self.host.day_of(utc).clamp(self.frame.0, self.frame.1)),
            None => Ok(false),
        }
    }

    /// Playing begins: at the chosen date, or at the start of the frame when that is its end.
    pub fn begin_round(&mut self) -> Result<bool, JsValue> {
        if self.settings.day < self.frame.1 {
            return Ok(false);
        }
        self.move_to(self.frame.0)
    }

    /// Plays on for so many seconds; says whether there is more to play.
    pub fn play(&mut self, seconds: f64) -> Result<bool, JsValue> {
        let days = seconds.max(0.0) * synodic_days(self.settings.body) as f64 / ROUND_SECONDS;
        let utc = self.scene.utc.plus_days(days);
        let day = self.host.day_of(utc);
        if !days.is_finite() || day >= self.frame.1 {
            self.move_to(self.frame.1)?;
            return Ok(false);
        }
        self.settings.day = day.max(self.frame.0);
        self.scene
            .set_instant(utc, &self.settings, &self.host, self.horizon_up)
            .map_err(thrown)?;
        Ok(true)
    }

    /// Playing ends: the instant is the noon of its day again.
    pub fn rest(&mut self) -> Result<(), JsValue> {
        self.scene
            .set_day(&self.settings, &self.host, self.horizon_up)
            .map_err(thrown)
    }

    /// One large step on, from the end of the frame to its start.
    pub fn step_round(&mut self) -> Result<bool, JsValue> {
        let day = self.settings.day;
        let step = (synodic_days(self.settings.body) / STEPS_PER_ROUND).max(1);
        self.move_to(match day {
            _ if day >= self.frame.1 => self.frame.0,
            _ => (day + step).min(self.frame.1),
        })
    }
}

impl Exhibit {
    fn instant_under(&self, x_css: f64, y_css: f64) -> Result<Option<Utc>, Error> {
        let (Some(grip), view) = (self.grip, &self.viewport) else {
            return Ok(None);
        };
        let traveller = match grip {
            PlanGrip::Dates => return Ok(self.scene.picture.date_at(x_css, view)),
            PlanGrip::Earth => Traveller::Earth,
            PlanGrip::Planet => Traveller::Planet(self.settings.body),
        };
        match &self.scene.picture {
            Picture::Plan(model) => {
                let direction_rad = model.direction_at_rad((x_css, y_css), view);
                plan_passage(traveller, self.scene.utc, direction_rad).map(Some)
            }
            _ => Ok(None),
        }
    }
}
