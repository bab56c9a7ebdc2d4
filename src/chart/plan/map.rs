//! The map: orbits, lines of light and sight, lit halves, the angle at the Earth, names.

use super::super::ink::Failed;
use super::super::pen::{Pen, Point, bold, plain};
use super::super::shapes::{lit_part, placed};
use super::super::theme::{Colour, Theme};
use super::labels::{ANYWHERE, CLOSE, Room, beside, keep_off_disc, keep_off_line, sign};
use super::layout::Layout;
use super::model::{Mark, PlanModel};
use crate::quantity::{cos, hypotenuse, sin, sin_cos};
use std::f64::consts::PI;

/// Gap between the planet and the arc over its half that faces us, and the arc's own width.
const ARC_GAP: f64 = 4.0;
const ARC_WIDTH: f64 = 3.0;
/// Share of a revolution by which an arrow runs ahead of its body, in points of a path.
const ARROW_AHEAD: usize = 12;
/// An orbit smaller than this has no room for an arrow.
const SMALL_ORBIT: f64 = 40.0;
/// Marks on the orbit nearer to each other than this are left to the line of dates.
const MARKS_APART: f64 = 9.0;

pub(super) fn draw(
    model: &PlanModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    theme: &Theme,
) -> Result<(), Failed> {
    let place = |au: [f64; 2]| model.projection.place(au, layout);
    let (sun, earth, planet) = (
        layout.centre,
        place(model.chosen.earth_au),
        place(model.chosen.planet_au),
    );
    let [sun_radius, earth_radius, planet_radius] = model.projection.bodies(layout);

    let path = |path: &[[f64; 2]]| path.iter().map(|&au| place(au)).collect::<Vec<Point>>();
    let (earth_orbit, planet_orbit) = (path(&model.paths.earth_au), path(&model.paths.planet_au));
    orbit(pen, &earth_orbit, (sun, earth), 1.0, theme)?;
    orbit(pen, &planet_orbit, (sun, planet), 1.5, theme)?;
    pen.line(&[sun, earth], 1.0, theme.muted)?;
    pen.line(&[sun, planet], 2.0, theme.light)?;
    let halfway = ((sun.0 + planet.0) / 2.0, (sun.1 + planet.1) / 2.0);
    arrow_head(pen, halfway, direction(sun, planet), theme.light)?;
    pen.line(&[earth, planet], 2.0, theme.size)?;
    let marks = marks(model, pen, layout, (planet, planet_radius), theme)?;

    let towards_planet = direction(earth, planet);
    let towards_sun = direction(earth, sun);
    let corner = angle(pen, layout, earth, [sun, planet], earth_radius, theme)?;
    pen.disc(sun, 1.5 * sun_radius, theme.glow)?;
    pen.disc(sun, sun_radius, theme.sunlit)?;
    half_lit(pen, earth, earth_radius, towards_sun, theme.limb, theme)?;
    pen.disc(planet, planet_radius + ARC_GAP + ARC_WIDTH, theme.panel)?;
    half_lit(
        pen,
        planet,
        planet_radius,
        direction(planet, sun),
        theme.chosen,
        theme,
    )?;
    let back = direction(planet, earth);
    let start = back.1.atan2(back.0) - PI / 2.0;
    let arc = arc(planet, planet_radius + ARC_GAP, start, PI);
    pen.line(&arc, ARC_WIDTH, theme.size)?;

    for (at, radius) in [
        (sun, 1.5 * sun_radius),
        (earth, earth_radius),
        (planet, planet_radius + ARC_GAP + ARC_WIDTH / 2.0),
    ] {
        keep_off_disc(pen, at, radius);
    }
    for (from, to) in [(sun, planet), (earth, planet), (sun, earth)] {
        keep_off_line(pen, from, to);
    }
    let labels = &model.labels;
    let room = Room {
        bounds: layout.map,
        orbits: [&earth_orbit, &planet_orbit],
    };
    let outward = |at: Point| direction(sun, at);
    let opposite = |a: Point, b: Point| (-a.0 - b.0, -a.1 - b.1);
    let near_planet = (planet, planet_radius + ARC_GAP + 6.0);
    let name = bold(14.0, theme.ink);
    beside(
        pen,
        model.name,
        name,
        near_planet,
        outward(planet),
        &room,
        &ANYWHERE,
    )?;
    let away = opposite(towards_planet, towards_sun);
    let near_earth = (earth, earth_radius + 5.0);
    beside(pen, labels.earth, name, near_earth, away, &room, &ANYWHERE)?;
    let small = bold(12.0, theme.ink);
    let inside = direction(earth, corner.0);
    beside(
        pen,
        &model.chosen.elongation,
        small,
        corner,
        inside,
        &room,
        &ANYWHERE,
    )?;
    let away = opposite(outward(earth), outward(planet));
    let near_sun = (sun, 1.5 * sun_radius + 4.0);
    beside(
        pen,
        labels.sun,
        bold(13.0, theme.muted),
        near_sun,
        away,
        &room,
        &ANYWHERE,
    )?;
    for (at, text) in marks {
        let face = plain(11.0, theme.muted);
        beside(pen, text, face, (at, 9.0), outward(at), &room, &CLOSE)?;
    }
    Ok(())
}

/// A closed path with an arrow head that runs ahead of its body.
fn orbit(
    pen: &Pen<'_>,
    points: &[Point],
    (sun, body): (Point, Point),
    width: f64,
    theme: &Theme,
) -> Result<(), Failed> {
    let closed: Vec<Point> = points.iter().chain(points.first()).copied().collect();
    pen.line(&closed, width, theme.limb)?;
    let Some(first) = points.first() else {
        return Ok(());
    };
    if hypotenuse(first.0 - sun.0, first.1 - sun.1) < SMALL_ORBIT {
        return Ok(());
    }
    let away = |point: &Point| hypotenuse(point.0 - body.0, point.1 - body.1);
    let nearest = (0..points.len()).min_by(|&a, &b| away(&points[a]).total_cmp(&away(&points[b])));
    let Some(nearest) = nearest else {
        return Ok(());
    };
    let at = |ahead: usize| points[(nearest + ahead) % points.len()];
    let along = direction(at(ARROW_AHEAD - 1), at(ARROW_AHEAD));
    arrow_head(pen, at(ARROW_AHEAD), along, theme.limb)
}

fn arrow_head(pen: &Pen<'_>, tip: Point, along: Point, colour: Colour) -> Result<(), Failed> {
    let wing = |side: f64| {
        (
            tip.0 - 6.0 * along.0 - side * 4.0 * along.1,
            tip.1 - 6.0 * along.1 + side * 4.0 * along.0,
        )
    };
    pen.line(&[wing(-1.0), tip, wing(1.0)], 1.5, colour)
}

/// Signs of the turning points on the planet's orbit, as far as they stay apart, those near the chosen date first;
/// returns the ones next to it in time, to be named when everything else stands.
fn marks<'a>(
    model: &'a PlanModel,
    pen: &mut Pen<'_>,
    layout: &Layout,
    (planet, planet_radius): (Point, f64),
    theme: &Theme,
) -> Result<Vec<(Point, &'a str)>, Failed> {
    let day = model.chosen.disc.day;
    let (before, after) = model
        .marks
        .split_at(model.marks.partition_point(|mark| mark.day <= day));
    let mut placed: Vec<Point> = Vec::new();
    let mut named = Vec::new();
    let mut put = |nearest_first: &mut dyn Iterator<Item = &'a Mark>| {
        let mut is_first = true;
        for mark in nearest_first {
            let at = model.projection.place(mark.planet_au, layout);
            let away = |from: Point| hypotenuse(at.0 - from.0, at.1 - from.1);
            let covered = away(planet) < planet_radius + ARC_GAP + 7.0;
            if covered || placed.iter().any(|&other| away(other) < MARKS_APART) {
                continue;
            }
            sign(pen, at, theme.panel, theme)?;
            keep_off_disc(pen, at, 5.0);
            placed.push(at);
            if is_first {
                named.push((at, mark.name.as_str()));
            }
            is_first = false;
        }
        Ok(())
    };
    put(&mut before.iter().rev())?;
    put(&mut after.iter())?;
    Ok(named)
}

/// The arc of the elongation at the Earth, between Sun and planet; returns where its name goes and how far from there.
fn angle(
    pen: &mut Pen<'_>,
    layout: &Layout,
    earth: Point,
    [sun, planet]: [Point; 2],
    earth_radius: f64,
    theme: &Theme,
) -> Result<(Point, f64), Failed> {
    let far = |to: Point| hypotenuse(to.0 - earth.0, to.1 - earth.1);
    let radius = (0.16 * layout.reach)
        .min(0.6 * far(sun))
        .min(0.5 * far(planet))
        .max(earth_radius + 3.0);
    let bearing = |to: Point| (to.1 - earth.1).atan2(to.0 - earth.0);
    let start = bearing(sun);
    let turn = bearing(planet) - start;
    let turn = turn - 2.0 * PI * (turn / (2.0 * PI)).round();
    let arc = arc(earth, radius, start, turn);
    pen.line(&arc, 1.5, theme.ink)?;
    for &point in &arc {
        keep_off_disc(pen, point, 2.5);
    }
    let (sin, cos) = sin_cos(start + turn / 2.0);
    Ok(((earth.0 + radius * cos, earth.1 + radius * sin), 5.0))
}

/// A globe from above: the half towards the Sun is lit.
fn half_lit(
    pen: &Pen<'_>,
    at: Point,
    radius: f64,
    towards_sun: Point,
    limb: Colour,
    theme: &Theme,
) -> Result<(), Failed> {
    pen.disc(at, radius, theme.night_side)?;
    pen.area(
        &placed(&lit_part(0.5, towards_sun), at, radius),
        theme.sunlit,
    )?;
    pen.ring(at, radius, 1.5, limb)
}

fn arc(centre: Point, radius: f64, start: f64, turn: f64) -> Vec<Point> {
    const STEPS: usize = 24;
    (0..=STEPS)
        .map(|step| start + turn * step as f64 / STEPS as f64)
        .map(|angle| {
            (
                centre.0 + radius * cos(angle),
                centre.1 + radius * sin(angle),
            )
        })
        .collect()
}

fn direction(from: Point, to: Point) -> Point {
    let (x, y) = (to.0 - from.0, to.1 - from.1);
    let length = hypotenuse(x, y).max(f64::MIN_POSITIVE);
    (x / length, y / length)
}
