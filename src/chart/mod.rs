//! Pictures: plain models of what is to be drawn, and their drawing on any plotters backend.
//!
//! A model is built once for a span and told of a new chosen date cheaply; it holds numbers and finished strings and
//! computes no astronomy. Lengths are CSS pixels until a mark reaches the surface, which counts device pixels.

mod axis;
mod disc;
mod handle;
mod ink;
mod pen;
mod plan;
mod shapes;
#[cfg(not(target_arch = "wasm32"))]
mod svg;
mod theme;
mod tradeoff;

pub use disc::{DiscModel, DiscSample};
pub use plan::{PlanGrip, PlanMark, PlanModel, PlanPaths, PlanSample};
#[cfg(not(target_arch = "wasm32"))]
pub use svg::to_svg;
pub use theme::{Colour, Theme};
pub use tradeoff::TradeoffModel;

use crate::error::{Code, Error};
use crate::time::Utc;
use pen::Pen;
use plotters::coord::Shift;
use plotters::drawing::DrawingArea;
use plotters_backend::DrawingBackend;

/// Narrowest picture, in CSS pixels.
pub const MIN_WIDTH_CSS: f64 = 240.0;

/// The surface: its size in CSS pixels and how many device pixels one of them is.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Viewport {
    /// Width in CSS pixels.
    pub width_css: f64,
    /// Height in CSS pixels.
    pub height_css: f64,
    /// Device pixels per CSS pixel.
    pub density: f64,
    /// Backend units per device pixel: 1 where the backend counts device pixels. A backend that scales its surface
    /// down by this number draws curves smoother than whole pixels allow; straight edges still snap to device pixels.
    pub subpixels: u32,
}

impl Viewport {
    /// A surface whose backend counts device pixels.
    pub const fn new(width_css: f64, height_css: f64, density: f64) -> Viewport {
        Viewport {
            width_css,
            height_css,
            density,
            subpixels: 1,
        }
    }

    /// The same surface with finer backend units.
    pub const fn with_subpixels(self, subpixels: u32) -> Viewport {
        Viewport { subpixels, ..self }
    }
}

/// One picture, ready to draw.
#[derive(Debug, Clone)]
pub enum Picture {
    /// Lit share, size, lit area and brightness against date.
    Tradeoff(TradeoffModel),
    /// The disc to scale through the days.
    Disc(DiscModel),
    /// Sun, Earth and planet from above.
    Plan(Box<PlanModel>),
}

impl Picture {
    /// Height in CSS pixels that suits a width; it depends on nothing else, so a page can reserve it at once.
    pub fn preferred_height(&self, width_css: f64) -> f64 {
        match self {
            Picture::Tradeoff(_) => tradeoff::preferred_height(width_css),
            Picture::Disc(_) => disc::preferred_height(width_css),
            Picture::Plan(_) => plan::preferred_height(width_css),
        }
    }

    /// Draws the picture over the whole area.
    ///
    /// # Errors
    /// `drawing` when the surface is smaller than the picture can be, or refuses a mark.
    pub fn draw<DB: DrawingBackend>(
        &self,
        root: &DrawingArea<DB, Shift>,
        view: &Viewport,
        theme: &Theme,
    ) -> Result<(), Error> {
        let least_height = match self {
            Picture::Tradeoff(_) => tradeoff::least_height(view.width_css),
            Picture::Disc(_) => disc::least_height(view.width_css),
            Picture::Plan(_) => plan::least_height(view.width_css),
        };
        let large = view.width_css >= MIN_WIDTH_CSS && view.height_css >= least_height;
        if !(large && view.density > 0.0 && view.density.is_finite() && view.subpixels > 0) {
            return Err(Error::new(
                Code::Drawing,
                "The picture needs a surface at least 240 pixels wide and as high as its layout asks for.",
            ));
        }
        let mut pen = Pen::new(root, view);
        pen.block(
            (0.0, 0.0),
            (view.width_css, view.height_css),
            theme.background,
        )?;
        match self {
            Picture::Tradeoff(model) => tradeoff::draw(model, &mut pen, view, theme)?,
            Picture::Disc(model) => disc::draw(model, &mut pen, view, theme)?,
            Picture::Plan(model) => plan::draw(model, &mut pen, view, theme)?,
        }
        Ok(())
    }

    /// The instant at a horizontal position, held within the span; `None` for a picture without a span.
    pub fn date_at(&self, x_css: f64, view: &Viewport) -> Option<Utc> {
        let (span, (left, right)) = self.date_scale(view);
        span.date_at(x_css, left, right)
    }

    /// The horizontal position of an instant, held within the date axis.
    pub fn x_of_date(&self, utc: Utc, view: &Viewport) -> f64 {
        let (span, (left, right)) = self.date_scale(view);
        span.x_of(utc.days_since_j2000(), left, right)
    }

    fn date_scale(&self, view: &Viewport) -> (axis::Span, (f64, f64)) {
        match self {
            Picture::Tradeoff(model) => (model.span, tradeoff::plot_edges(view.width_css)),
            Picture::Disc(model) => (model.span, disc::lane_edges(view.width_css)),
            Picture::Plan(model) => (model.span, plan::lane_edges(view.width_css)),
        }
    }
}
