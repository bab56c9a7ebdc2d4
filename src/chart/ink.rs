//! The few marks that a picture is made of, drawn on any plotters backend.
//!
//! Layout code speaks to `dyn Ink`, so it is compiled once and not once per backend.

use super::theme::Colour;
use crate::error::{Code, Error};
use plotters::coord::Shift;
use plotters::drawing::DrawingArea;
use plotters::element::{Drawable, PointCollection};
use plotters_backend::text_anchor::{HPos, Pos, VPos};
use plotters_backend::{
    BackendColor, BackendCoord, BackendStyle, BackendTextStyle, DrawingBackend, DrawingErrorKind,
    FontFamily, FontStyle,
};
use std::cell::Cell;
use std::convert::Infallible;

/// Weight of a text.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Weight {
    Regular,
    Bold,
}

/// Which point of a text stands at its position; vertically it is always the middle.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub(super) enum Align {
    Left,
    Middle,
    Right,
}

/// One mark, in the backend's own units.
pub(super) enum Mark<'a> {
    /// Filled area.
    Area(&'a [BackendCoord], Colour),
    /// Open line with its width.
    Line(&'a [BackendCoord], Colour, u32),
    /// Filled circle.
    Disc(BackendCoord, u32, Colour),
    /// Circle line with its width.
    Ring(BackendCoord, u32, Colour, u32),
    /// Text at a size and anchor.
    Text(&'a str, BackendCoord, TextLook),
    /// No ink: the width of a text is wanted.
    Measure(&'a str, TextLook, &'a Cell<u32>),
}

/// Size, weight, anchor and colour of a text.
#[derive(Debug, Clone, Copy)]
pub(super) struct TextLook {
    pub(super) size: f64,
    pub(super) weight: Weight,
    pub(super) align: Align,
    pub(super) colour: Colour,
}

/// The surface refused a mark. Empty, so that the test after every stroke costs next to nothing.
#[derive(Debug, Clone, Copy)]
pub(super) struct Failed;

impl From<Failed> for Error {
    fn from(_: Failed) -> Self {
        Self::new(
            Code::Drawing,
            "The drawing surface refused a mark; give it a size of at least one pixel.",
        )
    }
}

/// A surface that takes marks.
pub(super) trait Ink {
    /// Puts one mark on the surface.
    fn put(&self, mark: Mark<'_>) -> Result<(), Failed>;
}

impl<DB: DrawingBackend> Ink for DrawingArea<DB, Shift> {
    fn put(&self, mark: Mark<'_>) -> Result<(), Failed> {
        // The surface's own words would not help a reader, and formatting them costs bytes.
        self.draw(&mark).map_err(|_| Failed)
    }
}

// The points stay inside the mark: plotters would pull every point that it is handed to the edge of the area,
// which would bend a line instead of showing that it runs out of the picture.
impl<'a> PointCollection<'a, BackendCoord> for &'a Mark<'_> {
    type Point = &'a BackendCoord;
    type IntoIter = std::iter::Empty<&'a BackendCoord>;

    fn point_iter(self) -> Self::IntoIter {
        std::iter::empty()
    }
}

impl<DB: DrawingBackend> Drawable<DB> for Mark<'_> {
    fn draw<I: Iterator<Item = BackendCoord>>(
        &self,
        _: I,
        backend: &mut DB,
        _: (u32, u32),
    ) -> Result<(), DrawingErrorKind<DB::ErrorType>> {
        match *self {
            Mark::Area(points, colour) => {
                backend.fill_polygon(points.iter().copied(), &Stroke(colour, 1))
            }
            Mark::Line(points, colour, width) => {
                backend.draw_path(points.iter().copied(), &Stroke(colour, width))
            }
            Mark::Disc(centre, radius, colour) => {
                backend.draw_circle(centre, radius, &Stroke(colour, 1), true)
            }
            Mark::Ring(centre, radius, colour, width) => {
                backend.draw_circle(centre, radius, &Stroke(colour, width), false)
            }
            Mark::Text(text, at, look) => backend.draw_text(text, &look, at),
            Mark::Measure(text, look, width) => {
                width.set(backend.estimate_text_size(text, &look)?.0);
                Ok(())
            }
        }
    }
}

struct Stroke(Colour, u32);

impl BackendStyle for Stroke {
    fn color(&self) -> BackendColor {
        opaque(self.0)
    }

    fn stroke_width(&self) -> u32 {
        self.1
    }
}

fn opaque(colour: Colour) -> BackendColor {
    BackendColor {
        alpha: 1.0,
        rgb: (colour.0, colour.1, colour.2),
    }
}

impl BackendTextStyle for TextLook {
    type FontError = Infallible;

    fn color(&self) -> BackendColor {
        opaque(self.colour)
    }

    fn size(&self) -> f64 {
        self.size
    }

    fn style(&self) -> FontStyle {
        match self.weight {
            Weight::Regular => FontStyle::Normal,
            Weight::Bold => FontStyle::Bold,
        }
    }

    fn anchor(&self) -> Pos {
        let h_pos = match self.align {
            Align::Left => HPos::Left,
            Align::Middle => HPos::Center,
            Align::Right => HPos::Right,
        };
        Pos::new(h_pos, VPos::Center)
    }

    fn family(&self) -> FontFamily<'_> {
        FontFamily::SansSerif
    }

    /// Used by backends without a measure of their own, such as plotters' SVG.
    fn layout_box(&self, text: &str) -> Result<((i32, i32), (i32, i32)), Infallible> {
        let em: f64 = text.chars().map(advance_em).sum();
        let broad = if self.weight == Weight::Bold {
            1.08
        } else {
            1.0
        };
        Ok((
            (0, 0),
            (
                (em * broad * self.size).ceil() as i32,
                (self.size * 1.2).ceil() as i32,
            ),
        ))
    }

    /// Backends that cannot draw text themselves draw none: the pictures have no font of their own.
    fn draw<E, F: FnMut(i32, i32, BackendColor) -> Result<(), E>>(
        &self,
        _: &str,
        _: BackendCoord,
        _: F,
    ) -> Result<Result<(), E>, Infallible> {
        Ok(Ok(()))
    }
}

/// Width of a character in ems: generous classes, so that most sans-serif faces are narrower and no label collides.
fn advance_em(character: char) -> f64 {
    match character {
        'i' | 'j' | 'l' | '.' | ',' | ':' | ';' | '\'' | '|' | '!' | ' ' | '\u{a0}' | '′' => 0.32,
        'f' | 't' | 'r' | '(' | ')' | '-' | '/' | '″' | '²' | '°' => 0.43,
        'm' | 'w' | 'M' | 'W' | '%' | '—' => 0.97,
        '0'..='9' | 'a'..='z' => 0.63,
        _ => 0.75,
    }
}
