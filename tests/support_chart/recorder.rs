//! A plotters backend that remembers marks instead of drawing them; text is measured with fixed metrics.

use plotters::drawing::DrawingArea;
use plotters_backend::text_anchor::HPos;
use plotters_backend::{
    BackendColor, BackendCoord, BackendStyle, BackendTextStyle, DrawingBackend, DrawingErrorKind,
    FontStyle,
};
use std::cell::RefCell;
use std::convert::Infallible;
use std::rc::Rc;
use wanderlight::Error;
use wanderlight::chart::{Colour, Picture, Theme, Viewport};

/// What was drawn, in backend units.
#[derive(Debug, Clone, PartialEq)]
pub(crate) enum Drawn {
    Area(Vec<BackendCoord>),
    Line(Vec<BackendCoord>, u32),
    Disc(BackendCoord, u32),
    Ring(BackendCoord, u32, u32),
    /// The words, their box (left, top, right, bottom) and size.
    Text(String, [f64; 4], f64),
}

/// One mark with its colour.
#[derive(Debug, Clone, PartialEq)]
pub(crate) struct Seen {
    pub(crate) colour: Colour,
    pub(crate) drawn: Drawn,
}

impl Seen {
    /// Left, top, right and bottom of the ink.
    pub(crate) fn bounds(&self) -> [f64; 4] {
        let of = |points: &[BackendCoord], around: f64| {
            points.iter().fold(
                [
                    f64::INFINITY,
                    f64::INFINITY,
                    f64::NEG_INFINITY,
                    f64::NEG_INFINITY,
                ],
                |b, p| {
                    let (x, y) = (f64::from(p.0), f64::from(p.1));
                    [
                        b[0].min(x - around),
                        b[1].min(y - around),
                        b[2].max(x + around),
                        b[3].max(y + around),
                    ]
                },
            )
        };
        match &self.drawn {
            Drawn::Area(points) => of(points, 0.0),
            Drawn::Line(points, width) => of(points, f64::from(*width) / 2.0),
            Drawn::Disc(centre, radius) => of(&[*centre], f64::from(*radius)),
            Drawn::Ring(centre, radius, width) => {
                of(&[*centre], f64::from(*radius) + f64::from(*width) / 2.0)
            }
            Drawn::Text(_, bounds, _) => *bounds,
        }
    }

    pub(crate) fn text(&self) -> Option<&str> {
        match &self.drawn {
            Drawn::Text(text, ..) => Some(text),
            _ => None,
        }
    }
}

/// The recording surface.
pub(crate) struct Recorder {
    size: (u32, u32),
    seen: Vec<Seen>,
}

/// Everything that a picture puts on a surface.
pub(crate) fn record(
    picture: &Picture,
    view: &Viewport,
    theme: &Theme,
) -> Result<Vec<Seen>, Error> {
    let units = view.density * f64::from(view.subpixels);
    let size = (
        (view.width_css * units).round() as u32,
        (view.height_css * units).round() as u32,
    );
    let recorder = Rc::new(RefCell::new(Recorder {
        size,
        seen: Vec::new(),
    }));
    picture.draw(&DrawingArea::from(&recorder), view, theme)?;
    let seen = std::mem::take(&mut recorder.borrow_mut().seen);
    Ok(seen)
}

type Outcome = Result<(), DrawingErrorKind<Infallible>>;

impl Recorder {
    fn see(&mut self, colour: BackendColor, drawn: Drawn) -> Outcome {
        assert_eq!(
            colour.alpha, 1.0,
            "marks are opaque, so that print and screen agree"
        );
        let (r, g, b) = colour.rgb;
        self.seen.push(Seen {
            colour: Colour(r, g, b),
            drawn,
        });
        Ok(())
    }
}

impl DrawingBackend for Recorder {
    type ErrorType = Infallible;

    fn get_size(&self) -> (u32, u32) {
        self.size
    }

    fn ensure_prepared(&mut self) -> Outcome {
        Ok(())
    }

    fn present(&mut self) -> Outcome {
        Ok(())
    }

    fn draw_pixel(&mut self, _: BackendCoord, _: BackendColor) -> Outcome {
        panic!("pictures are made of marks, not of pixels");
    }

    fn draw_path<S: BackendStyle, I: IntoIterator<Item = BackendCoord>>(
        &mut self,
        path: I,
        style: &S,
    ) -> Outcome {
        self.see(
            style.color(),
            Drawn::Line(path.into_iter().collect(), style.stroke_width()),
        )
    }

    fn fill_polygon<S: BackendStyle, I: IntoIterator<Item = BackendCoord>>(
        &mut self,
        path: I,
        style: &S,
    ) -> Outcome {
        self.see(style.color(), Drawn::Area(path.into_iter().collect()))
    }

    fn draw_circle<S: BackendStyle>(
        &mut self,
        at: BackendCoord,
        radius: u32,
        style: &S,
        fill: bool,
    ) -> Outcome {
        let drawn = if fill {
            Drawn::Disc(at, radius)
        } else {
            Drawn::Ring(at, radius, style.stroke_width())
        };
        self.see(style.color(), drawn)
    }

    fn draw_text<S: BackendTextStyle>(
        &mut self,
        text: &str,
        style: &S,
        at: BackendCoord,
    ) -> Outcome {
        let (width, height) = self.estimate_text_size(text, style)?;
        let (width, height) = (f64::from(width), f64::from(height));
        let left = f64::from(at.0)
            - match style.anchor().h_pos {
                HPos::Left => 0.0,
                HPos::Center => width / 2.0,
                HPos::Right => width,
            };
        let top = f64::from(at.1) - height / 2.0;
        self.see(
            style.color(),
            Drawn::Text(
                text.to_owned(),
                [left, top, left + width, top + height],
                style.size(),
            ),
        )
    }

    /// 0.56 em a character, 0.6 em in bold; 1.1 em high.
    fn estimate_text_size<S: BackendTextStyle>(
        &self,
        text: &str,
        style: &S,
    ) -> Result<(u32, u32), DrawingErrorKind<Infallible>> {
        let em = match style.style() {
            FontStyle::Bold => 0.6,
            _ => 0.56,
        };
        let width = em * style.size() * text.chars().count() as f64;
        Ok((width.ceil() as u32, (1.1 * style.size()).floor() as u32))
    }
}
