// The plan: its planet dragged around the Sun, its play button, and what it refuses.
import assert from "node:assert/strict";
import { test } from "node:test";
import { browser, Key } from "./support.mjs";

const page = browser();
const plan = (more = "") =>
  `<wander-light id="plan" body="venus" view="plan" date="2026-12-01" zone="Europe/London" theme="light" ${more}></wander-light>`;
const date = () => page.ask("#plan", "e.date");
const days = (from, to) => (Date.parse(to) - Date.parse(from)) / 86_400_000;

/** Positions in the stage, in CSS pixels from its middle as WebDriver counts: Sun (middle of the map) and planet (in the accent's colour). */
async function bodies() {
  return page.ask("#plan", `(() => {
    const canvas = p("canvas"), { width, height } = p("stage").getBoundingClientRect();
    const panel = Math.max(200, Math.min(300, 0.3 * width));
    const [right, bottom] = width >= 600 ? [width - 16 - panel, height - 116] : [width - 8, height - 258];
    const scale = canvas.width / width;
    const { data } = canvas.getContext("2d").getImageData(0, 0, canvas.width, Math.floor(bottom * scale));
    let count = 0, x = 0, y = 0;
    for (let at = 0; at < data.length; at += 4) {
      if (Math.abs(data[at] - 163) + Math.abs(data[at + 1] - 44) + Math.abs(data[at + 2] - 84) > 12) continue;
      count += 1;
      x += (at / 4) % canvas.width;
      y += Math.floor(at / 4 / canvas.width);
    }
    const from = (px, py) => ({ x: px - width / 2, y: py - height / 2 });
    return { count, sun: from((8 + right) / 2, (8 + bottom) / 2), planet: from(x / count / scale, y / count / scale) };
  })()`);
}

/** Drags the planet around the Sun by a quarter turn, against the clock as planets go. */
async function quarterTurn() {
  const { sun, planet, count } = await bodies();
  assert.ok(count > 20, `${count} pixels of the planet's ring`);
  const [dx, dy] = [planet.x - sun.x, planet.y - sun.y];
  const at = (share) => {
    // From the planet's direction towards the one a quarter turn on.
    const [x, y] = [sun.x + dx * (1 - share) + dy * share, sun.y + dy * (1 - share) - dx * share];
    return { x: Math.round(x), y: Math.round(y) };
  };
  const origin = await page.part("#plan", "stage");
  let actions = page.driver.actions().move({ origin, ...at(0), duration: 0 }).press();
  for (const share of [0.25, 0.5, 0.75, 1]) actions = actions.move({ origin, ...at(share), duration: 20 });
  await actions.release().perform();
  await page.painted();
}

for (const width of [900, 360]) {
  test(`at ${width} px the planet can be dragged around the Sun, and the date with it`, async () => {
    await page.screen(width, 900);
    await page.open(plan());
    await page.ready();
    assert.match(await page.ask("#plan", "p('sentence').textContent"), /near part of its orbit/);
    await quarterTurn();
    // A quarter of 224.7 days, on an orbit that is almost a circle.
    const moved = days("2026-12-01", await date());
    assert.ok(Math.abs(moved - 56) <= 4, `${moved} days for a quarter turn`);
    assert.match(await page.ask("#plan", "p('sentence').textContent"), /far part of its orbit/);
    assert.equal((await page.heard("change")).at(-1).detail.utc.slice(0, 10), await date());
    assert.equal((await page.heard("error")).length, 0);
    assert.deepEqual(await page.consoleErrors(), []);
  });
}

test("keys, slider and table work as in the other views", async () => {
  await page.screen(900, 900);
  await page.open(plan());
  await page.ready();
  const slider = await page.part("#plan", "slider");
  await slider.sendKeys(Key.ARROW_RIGHT);
  assert.equal(await date(), "2026-12-02");
  const [first, last] = await page.ask("#plan", "[Number(p('slider').min), Number(p('slider').max)]");
  assert.equal(last - first, 584, "one synodic period");
  await page.ask("#plan", "(p('numbers').open = true)");
  await page.painted();
  assert.ok((await page.ask("#plan", "p('rows').rows.length")) >= 8);
});

const pressed = () => page.ask("#plan", "p('play').getAttribute('aria-pressed')");
const click = async () => (await page.part("#plan", "play")).click();
const pause = (milliseconds) => new Promise((done) => setTimeout(done, milliseconds));

test("the play button runs the round and any input stops it", async () => {
  await page.screen(900, 900);
  await page.open(plan());
  await page.ready();
  assert.equal(await pressed(), "false");
  await click();
  assert.equal(await pressed(), "true");
  await page.driver.wait(async () => days("2026-12-01", await date()) >= 10, 15_000, "the date runs");
  await click();
  assert.equal(await pressed(), "false");
  const rested = await date();
  assert.match(await page.ask("#plan", "e.circumstances.utc"), /T12:00:00Z$/);
  await pause(300);
  assert.equal(await date(), rested, "stopped is stopped");
  await click();
  await (await page.part("#plan", "slider")).sendKeys(Key.ARROW_RIGHT);
  assert.equal(await pressed(), "false", "a key stops it");
  const stopped = await date();
  await pause(300);
  assert.equal(await date(), stopped);
  await page.run("document.getElementById('plan').view = 'disc'");
  assert.equal(await page.ask("#plan", "p('play').hidden"), true);
});

test("playing ends at the end of the frame and begins again at its start", async () => {
  await page.open(plan(`span="20"`));
  await page.ready();
  await (await page.part("#plan", "slider")).sendKeys(Key.END);
  const end = await date();
  await click();
  await page.driver.wait(async () => (await pressed()) === "false", 15_000, "it ends");
  assert.equal(await date(), end);
  const dates = (await page.heard("change")).map(({ detail }) => detail.utc.slice(0, 10));
  assert.ok(dates.some((seen) => days(seen, end) >= 18), `from the start: ${dates}`);
});

test("out of sight it waits", async () => {
  await page.screen(900, 700);
  await page.open(plan() + `<div style="height:4000px"></div>`);
  await page.ready();
  await click();
  await page.driver.wait(async () => (await date()) > "2026-12-03", 15_000, "the date runs");
  await page.run("scrollTo(0, 3500)");
  await pause(300);
  const waiting = await date();
  await pause(500);
  assert.equal(await date(), waiting);
  assert.equal(await pressed(), "true");
  await page.run("scrollTo(0, 0)");
  await page.driver.wait(async () => (await date()) > waiting, 15_000, "it goes on");
});

test("who wants no motion gets steps", async () => {
  await page.screen(900, 900, { media: [{ name: "prefers-reduced-motion", value: "reduce" }] });
  await page.open(plan());
  await page.ready();
  assert.equal(await pressed(), null);
  assert.match(await page.ask("#plan", "p('play').innerText"), /^Step on$/);
  await click();
  assert.equal(days("2026-12-01", await date()), 24);
  await pause(300);
  assert.equal(days("2026-12-01", await date()), 24);
});

test("the Moon has no plan, and is told so", async () => {
  await page.screen(900, 900);
  await page.open(`<wander-light id="plan" body="moon" view="plan" date="2026-12-01"></wander-light>`);
  await page.ready();
  const [error] = await page.heard("error");
  assert.equal(error.detail.code, "bad-option");
  assert.match(await page.ask("#plan", "p('notice').textContent"), /choose one from mercury to neptune/);
  assert.ok((await page.pixels("#plan")).marked > 0.01, "the usual chart stands in");
});

test("every planet's plan is pictured for people to look at, and its room is kept", async () => {
  const planets = ["mercury", "venus", "mars", "jupiter", "saturn", "uranus", "neptune"];
  for (const [width, theme] of [[360, "night"], [360, "light"], [900, "dark"], [900, "light"]]) {
    await page.screen(width, 900, { density: 2 });
    await page.open(`<style>body { margin: 0; display: grid; gap: 8px; background: ${theme === "light" ? "#fff" : "#000"} }</style>` +
      planets.map((body) => `<wander-light id="${body}" body="${body}" view="plan" date="2026-11-25" theme="${theme}"></wander-light>`).join(""));
    await page.ready();
    for (const body of planets) {
      assert.ok((await page.pixels(`#${body}`)).marked > 0.004, body);
      const room = await page.ask(`#${body}`, "p('stage').clientHeight / p('stage').clientWidth");
      assert.ok(room > 0.3 && room < 2, `${room}`);
    }
    assert.deepEqual(await page.consoleErrors(), []);
    await page.shot(`plan-all-${width}-${theme}`);
  }
});
