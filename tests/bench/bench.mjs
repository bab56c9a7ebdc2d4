// Times the module against two general-purpose ephemeris libraries on the same work, and the element in a browser.
// Each figure is the median of several rounds; the comparison alternates between the libraries within one run.
import { createRequire } from "node:module";
import { start } from "../browser/support.mjs";
import { circumstances, series } from "../module/load.mjs";

const require = createRequire(import.meta.url);
const PLANETS = ["mercury", "venus", "mars", "jupiter", "saturn", "uranus", "neptune"];
const ROUNDS = 15;

const median = (values) => values.toSorted((a, b) => a - b)[values.length >> 1];
const line = (what, value, unit, goal) => console.log(`${what.padEnd(64)} ${value.toPrecision(3).padStart(8)} ${unit.padEnd(3)} ${goal}`);

/** Microseconds per call of each contender, `calls` calls a round, contenders taking turns. */
function race(contenders, calls) {
  const times = new Map(Object.keys(contenders).map((name) => [name, []]));
  for (let round = 0; round < ROUNDS; round += 1) {
    for (const [name, work] of Object.entries(contenders)) {
      const began = performance.now();
      for (let call = 0; call < calls; call += 1) work(round * calls + call);
      times.get(name).push(((performance.now() - began) * 1000) / calls);
    }
  }
  return Object.fromEntries([...times].map(([name, values]) => [name, median(values)]));
}

/** Apparent place of date, distances, phase, elongation and magnitude with the library `astronomy-engine`. */
function engineWork() {
  const engine = require("astronomy-engine");
  const centre = new engine.Observer(0, 0, 0);
  const names = PLANETS.map((name) => engine.Body[name[0].toUpperCase() + name.slice(1)]);
  return (call) => {
    const body = names[call % names.length];
    const when = new Date(Date.UTC(2000, 0, 1 + ((call * 37) % 18_000)));
    const place = engine.Equator(body, when, centre, true, true);
    const light = engine.Illumination(body, when);
    return place.ra + light.mag + engine.AngleFromSun(body, when) + engine.Ecliptic(engine.GeoVector(body, when, true)).elon;
  };
}

/** Apparent place of date, distances, phase, elongation and magnitude with the library `astronomia`. */
function theoryWork() {
  const { planetposition, elliptic, julian, illum, base, solar } = require("astronomia");
  const data = require("astronomia/data").default ?? require("astronomia/data");
  const earth = new planetposition.Planet(data.vsop87Bearth);
  const planets = PLANETS.map((name) => new planetposition.Planet(data[`vsop87B${name}`]));
  return (call) => {
    const planet = planets[call % planets.length];
    const jde = julian.CalendarGregorianToJD(2000, 1, 1 + ((call * 37) % 18_000));
    const place = elliptic.position(planet, earth, jde);
    const [home, there] = [earth.position(jde), planet.position(jde)];
    const sun = solar.apparentVSOP87(earth, jde);
    const elongation = Math.acos(Math.sin(place.dec) * Math.sin(sun.lat) + Math.cos(place.dec) * Math.cos(sun.lat) * Math.cos(place.ra - sun.lon));
    const x = (p) => p.range * Math.cos(p.lat) * Math.cos(p.lon), y = (p) => p.range * Math.cos(p.lat) * Math.sin(p.lon), z = (p) => p.range * Math.sin(p.lat);
    const distance = Math.hypot(x(there) - x(home), y(there) - y(home), z(there) - z(home));
    const angle = base.toRad ? illum.phaseAngle(there.range, distance, home.range) : 0;
    return place.ra + elongation + illum.fraction(there.range, distance, home.range) + illum.venus(there.range, distance, angle);
  };
}

console.log("In Node, one planet at one instant:");
const ours = (call) => circumstances({
  body: PLANETS[call % PLANETS.length],
  utc: new Date(Date.UTC(2000, 0, 1 + ((call * 37) % 18_000))).toISOString(),
});
const result = race({ wanderlight: ours, "astronomy-engine": engineWork(), astronomia: theoryWork() }, 140);
line("circumstances", result.wanderlight, "us", "");
for (const rival of ["astronomy-engine", "astronomia"]) {
  line(`the same with ${rival}`, result[rival], "us", "");
  line("  times as long", result[rival] / result.wanderlight, "x", "goal: at least 5");
}
const spans = [];
for (let round = 0; round < ROUNDS; round += 1) {
  const began = performance.now();
  series({ body: PLANETS[round % PLANETS.length], fromUtc: "2026-01-01", toUtc: "2027-08-24", stepDays: 1 });
  spans.push(performance.now() - began);
}
line("series of 600 days", median(spans), "ms", "goal: at most 25");

console.log("In the browser:");
const page = await start();
try {
  await page.screen(832, 900, { density: 2 });
  const timings = [];
  for (let round = 0; round < 7; round += 1) {
    // The first round fills the cache; each page reports the time from the script's arrival to the first frame drawn.
    await page.open(`<wander-light id="v" body="venus" view="tradeoff" date="2026-11-25" span="300"></wander-light>
      <script>addEventListener("wanderlight-ready", () => { window.readyAt = performance.now(); });</script>`);
    await page.ready();
    timings.push(await page.run(`return readyAt - performance.getEntriesByName(location.origin + "/wander-light.js")[0].responseEnd`));
  }
  line("first chart after the script's arrival, warm cache", median(timings.slice(1)), "ms", "goal: at most 300");
  const browserCall = await page.driver.executeAsyncScript(`
    const done = arguments[0];
    import("/wanderlight.js").then(({ circumstances }) => {
      const planets = ${JSON.stringify(PLANETS)};
      const rounds = [];
      for (let round = 0; round < ${ROUNDS}; round += 1) {
        const began = performance.now();
        for (let call = 0; call < 700; call += 1) circumstances({ body: planets[call % 7], utc: new Date(Date.UTC(2000, 0, 1 + (call * 37) % 18000)).toISOString() });
        rounds.push((performance.now() - began) * 1000 / 700);
      }
      done(rounds);
    });`);
  line("circumstances", median(browserCall), "us", "goal: at most 60");
  await page.run(`Object.assign(document.getElementById("v").shadowRoot.getElementById("stage").style, { width: "800px", height: "450px" })`);
  await page.painted();
  const redraws = await page.driver.executeAsyncScript(`
    const done = arguments[0];
    const element = document.getElementById("v");
    const stage = element.shadowRoot.getElementById("stage");
    const canvas = element.shadowRoot.getElementById("canvas");
    const { left, top } = stage.getBoundingClientRect();
    stage.setPointerCapture = () => {};
    stage.hasPointerCapture = () => true;
    const request = window.requestAnimationFrame;
    let draw;
    window.requestAnimationFrame = (work) => { draw = work; return 1; };
    const rounds = [];
    for (let step = 0; step < 120; step += 1) {
      const event = new PointerEvent("pointermove", { clientX: left + 60 + ((step * 53) % 680), clientY: top + 40 });
      const began = performance.now();
      stage.dispatchEvent(event);
      draw?.();
      draw = undefined;
      const scripted = performance.now() - began;
      // Reading one pixel back makes the browser carry out what was drawn, and copy the canvas.
      canvas.getContext("2d").getImageData(0, 0, 1, 1);
      rounds.push([scripted, performance.now() - began]);
    }
    window.requestAnimationFrame = request;
    done(rounds.slice(20));`);
  line("redraw while dragging, 800 x 450 px, density 2", median(redraws.map(([scripted]) => scripted)), "ms", "goal: at most 6");
  line("  and until its pixels can be read back, painted without a GPU", median(redraws.map(([, painted]) => painted)), "ms", "");
} finally {
  await page.stop();
}
