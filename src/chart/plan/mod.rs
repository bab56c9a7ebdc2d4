//! Sun, Earth and planet from the north of the Earth's orbit, the disc that follows from it, and the dates below.
//!
//! Places are seen straight from above: heights above the plane of the Earth's orbit are left out. The elongation that
//! is written is the true one.

mod dates;
mod labels;
mod layout;
mod map;
mod model;
mod panel;
mod projection;

pub(super) use layout::{lane_edges, least_height, preferred_height};
pub use model::{PlanGrip, PlanMark, PlanModel, PlanPaths, PlanSample};

use super::Viewport;
use super::ink::Failed;
use super::pen::Pen;
use super::theme::Theme;
use layout::Layout;

pub(super) fn draw(
    model: &PlanModel,
    pen: &mut Pen<'_>,
    view: &Viewport,
    theme: &Theme,
) -> Result<(), Failed> {
    let layout = Layout::new(view.width_css, view.height_css);
    for [left, top, right, bottom] in [layout.map, layout.panel] {
        pen.block((left, top), (right, bottom), theme.panel)?;
    }
    map::draw(model, pen, &layout, theme)?;
    panel::draw(model, pen, &layout, theme)?;
    dates::draw(model, pen, &layout, view.width_css, theme)
}
