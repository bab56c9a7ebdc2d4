//! A picture as SVG text, without a browser.

use super::{Picture, Theme, Viewport};
use crate::error::{Code, Error};
use plotters::drawing::IntoDrawingArea;
use plotters_backend::{
    BackendColor, BackendCoord, BackendStyle, BackendTextStyle, DrawingBackend, DrawingErrorKind,
    FontFamily, FontStyle, text_anchor,
};
use plotters_svg::SVGBackend;

/// Drawing units per CSS pixel: fine enough that no curve shows steps when printed.
const UNITS: u32 = 10;

/// plotters' SVG prints a text at this fraction of the size it is asked for.
const SVG_TEXT_SHRINKS: f64 = 1.24;

/// The picture as an SVG document of this size in CSS pixels.
///
/// # Errors
/// `drawing`, as in [`Picture::draw`].
pub fn to_svg(
    picture: &Picture,
    width_css: f64,
    height_css: f64,
    theme: &Theme,
) -> Result<String, Error> {
    let view = Viewport::new(width_css, height_css, 1.0).with_subpixels(UNITS);
    let units = |css: f64| (css * f64::from(UNITS)).round().clamp(1.0, 1e6) as u32;
    let size = (units(width_css), units(height_css));
    let mut text = String::new();
    {
        let root = TrueText(SVGBackend::with_string(&mut text, size)).into_drawing_area();
        picture.draw(&root, &view, theme)?;
        root.present()
            .map_err(|_| Error::new(Code::Drawing, "The SVG could not be completed."))?;
    }
    let drawn = format!("<svg width=\"{}\" height=\"{}\"", size.0, size.1);
    let wanted = format!("<svg width=\"{width_css}\" height=\"{height_css}\"");
    Ok(text.replacen(&drawn, &wanted, 1))
}

/// The SVG backend with texts of the size asked for.
struct TrueText<'a>(SVGBackend<'a>);

type Outcome<'a> = Result<(), DrawingErrorKind<<SVGBackend<'a> as DrawingBackend>::ErrorType>>;

impl<'a> DrawingBackend for TrueText<'a> {
    type ErrorType = <SVGBackend<'a> as DrawingBackend>::ErrorType;

    fn get_size(&self) -> (u32, u32) {
        self.0.get_size()
    }

    fn ensure_prepared(&mut self) -> Outcome<'a> {
        self.0.ensure_prepared()
    }

    fn present(&mut self) -> Outcome<'a> {
        self.0.present()
    }

    fn draw_pixel(&mut self, point: BackendCoord, color: BackendColor) -> Outcome<'a> {
        self.0.draw_pixel(point, color)
    }

    fn draw_path<S: BackendStyle, I: IntoIterator<Item = BackendCoord>>(
        &mut self,
        path: I,
        style: &S,
    ) -> Outcome<'a> {
        self.0.draw_path(path, style)
    }

    fn fill_polygon<S: BackendStyle, I: IntoIterator<Item = BackendCoord>>(
        &mut self,
        vert: I,
        style: &S,
    ) -> Outcome<'a> {
        self.0.fill_polygon(vert, style)
    }

    fn draw_circle<S: BackendStyle>(
        &mut self,
        center: BackendCoord,
        radius: u32,
        style: &S,
        fill: bool,
    ) -> Outcome<'a> {
        self.0.draw_circle(center, radius, style, fill)
    }

    fn draw_text<S: BackendTextStyle>(
        &mut self,
        text: &str,
        style: &S,
        pos: BackendCoord,
    ) -> Outcome<'a> {
        self.0.draw_text(text, &Enlarged(style), pos)
    }
}

struct Enlarged<'s, S>(&'s S);

impl<S: BackendTextStyle> BackendTextStyle for Enlarged<'_, S> {
    type FontError = S::FontError;

    fn color(&self) -> BackendColor {
        self.0.color()
    }

    fn size(&self) -> f64 {
        self.0.size() * SVG_TEXT_SHRINKS
    }

    fn style(&self) -> FontStyle {
        self.0.style()
    }

    fn anchor(&self) -> text_anchor::Pos {
        self.0.anchor()
    }

    fn family(&self) -> FontFamily<'_> {
        self.0.family()
    }

    fn layout_box(&self, text: &str) -> Result<((i32, i32), (i32, i32)), Self::FontError> {
        self.0.layout_box(text)
    }

    fn draw<E, F: FnMut(i32, i32, BackendColor) -> Result<(), E>>(
        &self,
        text: &str,
        pos: BackendCoord,
        draw: F,
    ) -> Result<Result<(), E>, Self::FontError> {
        self.0.draw(text, pos, draw)
    }
}
