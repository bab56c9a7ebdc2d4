//! The page's canvas as a plotters backend.
//!
//! `plotters-canvas` draws; this wrapper answers the one question it leaves to the drawing library, how wide
//! a text will be, by asking the same canvas. (The library's own answer adds an element to the page's body.)

use plotters::drawing::IntoDrawingArea;
use plotters_backend::{
    BackendColor, BackendCoord, BackendStyle, BackendTextStyle, DrawingBackend, DrawingErrorKind,
};
use plotters_canvas::CanvasBackend;
use wasm_bindgen::JsCast;
use web_sys::{CanvasRenderingContext2d, HtmlCanvasElement};

use crate::chart::{Picture, Theme, Viewport};
use crate::error::{Code, Error};

type Outcome = Result<(), DrawingErrorKind<<CanvasBackend as DrawingBackend>::ErrorType>>;

/// A canvas that measures text as it draws it.
pub(super) struct PageCanvas {
    drawn: CanvasBackend,
    measured: CanvasRenderingContext2d,
}

impl PageCanvas {
    /// `None` when the canvas gives no two-dimensional context (it is lost, or serves another kind).
    pub(super) fn new(canvas: HtmlCanvasElement) -> Option<Self> {
        let measured = canvas.get_context("2d").ok()??.dyn_into().ok()?;
        Some(Self {
            drawn: CanvasBackend::with_canvas_object(canvas)?,
            measured,
        })
    }
}

impl DrawingBackend for PageCanvas {
    type ErrorType = <CanvasBackend as DrawingBackend>::ErrorType;

    fn estimate_text_size<S: BackendTextStyle>(
        &self,
        text: &str,
        style: &S,
    ) -> Result<(u32, u32), DrawingErrorKind<Self::ErrorType>> {
        self.measured.set_font(&format!(
            "{} {}px {}",
            style.style().as_str(),
            style.size(),
            style.family().as_str()
        ));
        let width = self
            .measured
            .measure_text(text)
            .map_or(0.0, |metrics| metrics.width());
        Ok((width.ceil() as u32, style.size().ceil() as u32))
    }

    fn get_size(&self) -> (u32, u32) {
        let (width, height) = self.drawn.get_size();
        (width * SUBPIXELS, height * SUBPIXELS)
    }

    fn ensure_prepared(&mut self) -> Outcome {
        self.drawn.ensure_prepared()
    }

    fn present(&mut self) -> Outcome {
        self.drawn.present()
    }

    fn draw_pixel(&mut self, point: BackendCoord, color: BackendColor) -> Outcome {
        self.drawn.draw_pixel(point, color)
    }

    fn draw_line<S: BackendStyle>(
        &mut self,
        from: BackendCoord,
        to: BackendCoord,
        style: &S,
    ) -> Outcome {
        self.drawn.draw_line(from, to, style)
    }

    fn draw_rect<S: BackendStyle>(
        &mut self,
        upper_left: BackendCoord,
        bottom_right: BackendCoord,
        style: &S,
        fill: bool,
    ) -> Outcome {
        self.drawn.draw_rect(upper_left, bottom_right, style, fill)
    }

    fn draw_path<S: BackendStyle, I: IntoIterator<Item = BackendCoord>>(
        &mut self,
        path: I,
        style: &S,
    ) -> Outcome {
        self.drawn.draw_path(path, style)
    }

    fn fill_polygon<S: BackendStyle, I: IntoIterator<Item = BackendCoord>>(
        &mut self,
        path: I,
        style: &S,
    ) -> Outcome {
        self.drawn.fill_polygon(path, style)
    }

    fn draw_circle<S: BackendStyle>(
        &mut self,
        center: BackendCoord,
        radius: u32,
        style: &S,
        fill: bool,
    ) -> Outcome {
        self.drawn.draw_circle(center, radius, style, fill)
    }

    fn draw_text<S: BackendTextStyle>(
        &mut self,
        text: &str,
        style: &S,
        pos: BackendCoord,
    ) -> Outcome {
        self.drawn.draw_text(text, style, pos)
    }
}

/// Curves are drawn on a grid this many times finer than device pixels, so that they do not show steps.
const SUBPIXELS: u32 = 4;

/// Draws a picture on a canvas, whose backing store is made to fit the view.
///
/// # Errors
/// `drawing` when the canvas gives no context or the picture does not fit.
pub(super) fn paint(
    canvas: HtmlCanvasElement,
    picture: &Picture,
    view: &Viewport,
    theme: &Theme,
) -> Result<(), Error> {
    let device = |css: f64| (css * view.density).round().max(1.0) as u32;
    let (width, height) = (device(view.width_css), device(view.height_css));
    // Setting a size clears the canvas and costs, even when nothing changes.
    if canvas.width() != width {
        canvas.set_width(width);
    }
    if canvas.height() != height {
        canvas.set_height(height);
    }
    let lost = || {
        Error::new(
            Code::Drawing,
            "The browser gives no canvas to draw on; reloading the page may help.",
        )
    };
    let page = PageCanvas::new(canvas).ok_or_else(lost)?;
    let scale = 1.0 / f64::from(SUBPIXELS);
    page.measured
        .set_transform(scale, 0.0, 0.0, scale, 0.0, 0.0)
        .map_err(|_| lost())?;
    picture.draw(
        &page.into_drawing_area(),
        &view.with_subpixels(SUBPIXELS),
        theme,
    )
}
