//! Drawing in CSS pixels, with a memory of where text already stands.

use super::Viewport;
pub(super) use super::ink::Align;
use super::ink::{Failed, Ink, Mark, TextLook, Weight};
use super::theme::Colour;
use plotters_backend::BackendCoord;
use std::cell::Cell;

/// A point in CSS pixels from the upper left corner.
pub(super) type Point = (f64, f64);

/// Size, weight and colour of a text in CSS pixels.
#[derive(Clone, Copy)]
pub(super) struct Face {
    pub(super) size: f64,
    pub(super) weight: Weight,
    pub(super) colour: Colour,
}

/// A regular face.
pub(super) const fn plain(size: f64, colour: Colour) -> Face {
    Face {
        size,
        weight: Weight::Regular,
        colour,
    }
}

/// A bold face.
pub(super) const fn bold(size: f64, colour: Colour) -> Face {
    Face {
        size,
        weight: Weight::Bold,
        colour,
    }
}

/// Smallest text that `fit` shrinks to, in CSS pixels.
const SMALLEST_TEXT: f64 = 9.0;

/// Line height in units of the text size, with air, for the test of overlaps.
const LINE: f64 = 1.16;

pub(super) struct Pen<'a> {
    ink: &'a dyn Ink,
    /// Backend units per CSS pixel.
    scale: f64,
    /// Backend units per device pixel, to which straight edges snap.
    grain: f64,
    width: f64,
    taken: Vec<[f64; 4]>,
}

impl<'a> Pen<'a> {
    pub(super) fn new(ink: &'a dyn Ink, view: &Viewport) -> Pen<'a> {
        let grain = f64::from(view.subpixels);
        Pen {
            ink,
            scale: view.density * grain,
            grain,
            width: view.width_css,
            taken: Vec::new(),
        }
    }

    fn at(&self, (x, y): Point) -> BackendCoord {
        (
            (x * self.scale).round() as i32,
            (y * self.scale).round() as i32,
        )
    }

    /// A stroke width; never thinner than one device pixel.
    fn stroke(&self, width: f64) -> u32 {
        (width * self.scale).max(self.grain).round() as u32
    }

    fn snapped(&self, css: f64) -> i32 {
        ((css * self.scale / self.grain).round() * self.grain) as i32
    }

    pub(super) fn area(&self, points: &[Point], colour: Colour) -> Result<(), Failed> {
        let points: Vec<BackendCoord> = points.iter().map(|&point| self.at(point)).collect();
        self.ink.put(Mark::Area(&points, colour))
    }

    pub(super) fn line(&self, points: &[Point], width: f64, colour: Colour) -> Result<(), Failed> {
        let points: Vec<BackendCoord> = points.iter().map(|&point| self.at(point)).collect();
        self.ink
            .put(Mark::Line(&points, colour, self.stroke(width)))
    }

    /// A rectangle whose edges lie on device pixels.
    pub(super) fn block(
        &self,
        (x0, y0): Point,
        (x1, y1): Point,
        colour: Colour,
    ) -> Result<(), Failed> {
        let (left, top, right, bottom) = (
            self.snapped(x0),
            self.snapped(y0),
            self.snapped(x1),
            self.snapped(y1),
        );
        self.ink.put(Mark::Area(
            &[(left, top), (right, top), (right, bottom), (left, bottom)],
            colour,
        ))
    }

    /// A horizontal line of one device pixel.
    pub(super) fn level(&self, x0: f64, x1: f64, y: f64, colour: Colour) -> Result<(), Failed> {
        let top = self.snapped(y);
        let (left, right, bottom) = (self.snapped(x0), self.snapped(x1), top + self.grain as i32);
        self.ink.put(Mark::Area(
            &[(left, top), (right, top), (right, bottom), (left, bottom)],
            colour,
        ))
    }

    /// A vertical line of at least one device pixel.
    pub(super) fn upright(
        &self,
        x: f64,
        y0: f64,
        y1: f64,
        width: f64,
        colour: Colour,
    ) -> Result<(), Failed> {
        let broad = ((width * self.scale / self.grain).round().max(1.0) * self.grain) as i32;
        let left = self.snapped(x - f64::from(broad) / self.scale / 2.0);
        let (top, right, bottom) = (self.snapped(y0), left + broad, self.snapped(y1));
        self.ink.put(Mark::Area(
            &[(left, top), (right, top), (right, bottom), (left, bottom)],
            colour,
        ))
    }

    pub(super) fn disc(&self, centre: Point, radius: f64, colour: Colour) -> Result<(), Failed> {
        self.ink
            .put(Mark::Disc(self.at(centre), self.radius(radius), colour))
    }

    pub(super) fn ring(
        &self,
        centre: Point,
        radius: f64,
        width: f64,
        colour: Colour,
    ) -> Result<(), Failed> {
        self.ink.put(Mark::Ring(
            self.at(centre),
            self.radius(radius),
            colour,
            self.stroke(width),
        ))
    }

    fn radius(&self, css: f64) -> u32 {
        (css * self.scale).round().max(1.0) as u32
    }

    /// Width of a text in CSS pixels.
    pub(super) fn text_width(&self, text: &str, face: Face) -> Result<f64, Failed> {
        let width = Cell::new(0);
        self.ink
            .put(Mark::Measure(text, self.look(face, Align::Left), &width))?;
        Ok(f64::from(width.get()) / self.scale)
    }

    /// The face, shrunk so that the text is no wider than `room`, but never below a readable size.
    pub(super) fn fit(&self, text: &str, face: Face, room: f64) -> Result<Face, Failed> {
        let width = self.text_width(text, face)?;
        if width <= room {
            return Ok(face);
        }
        // A tenth of a pixel off, since faces do not scale exactly.
        let size = (face.size * room / width - 0.1).max(SMALLEST_TEXT.min(face.size));
        Ok(Face { size, ..face })
    }

    /// Draws a text unless it would touch one that stands or run out of the picture; says whether it was drawn.
    pub(super) fn text(
        &mut self,
        text: &str,
        at: Point,
        align: Align,
        face: Face,
    ) -> Result<bool, Failed> {
        if text.is_empty() {
            return Ok(false);
        }
        let width = self.text_width(text, face)?;
        let left = match align {
            Align::Left => at.0,
            Align::Middle => at.0 - width / 2.0,
            Align::Right => at.0 - width,
        };
        let half = face.size * LINE / 2.0;
        let mine = [left, at.1 - half, left + width, at.1 + half];
        let outside = mine[0] < -0.5 || mine[2] > self.width + 0.5;
        if outside || self.taken.iter().any(|other| touches(&mine, other)) {
            return Ok(false);
        }
        self.taken.push(mine);
        self.ink
            .put(Mark::Text(text, self.at(at), self.look(face, align)))?;
        Ok(true)
    }

    /// Keeps texts off a box (left, top, right, bottom) in which something else is drawn.
    pub(super) fn keep_clear(&mut self, bounds: [f64; 4]) {
        self.taken.push(bounds);
    }

    /// Height that a text of this face takes.
    pub(super) fn text_height(face: Face) -> f64 {
        face.size * LINE
    }

    fn look(&self, face: Face, align: Align) -> TextLook {
        TextLook {
            size: face.size * self.scale,
            weight: face.weight,
            align,
            colour: face.colour,
        }
    }
}

fn touches(a: &[f64; 4], b: &[f64; 4]) -> bool {
    a[0] < b[2] && b[0] < a[2] && a[1] < b[3] && b[1] < a[3]
}
