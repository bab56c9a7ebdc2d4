// What a visitor does with <wander-light>: drags, keys, typing, other screens, several elements.
import assert from "node:assert/strict";
import { test } from "node:test";
import { browser, Key } from "./support.mjs";

const page = browser();
const VENUS = `<wander-light id="venus" body="venus" view="tradeoff" date="2026-11-25" span="300" place="54.5,-3.1" zone="Europe/London"></wander-light>`;

async function drag(selector, fromShare, toShare) {
  const { driver } = page;
  const stage = await page.part(selector, "stage");
  const { width } = await stage.getRect();
  const x = (share) => Math.round((share - 0.5) * width);
  await driver.actions().move({ origin: stage, x: x(fromShare), y: 0 }).press()
    .move({ origin: stage, x: x((fromShare + toShare) / 2), y: 0 }).move({ origin: stage, x: x(toShare), y: 0 }).release().perform();
  await page.painted();
}

async function press(selector, ...keys) {
  const slider = await page.part(selector, "slider");
  await slider.sendKeys(...keys);
  await page.painted();
}

test("a chart is drawn for the date asked, and the page is told once", async () => {
  await page.screen(900, 900);
  await page.open(VENUS);
  await page.ready();
  const { marked } = await page.pixels("#venus");
  assert.ok(marked > 0.02 && marked < 0.9, `${marked} of the canvas is marked`);
  const ready = await page.heard("ready");
  assert.equal(ready.length, 1);
  assert.equal(ready[0].detail.body, "venus");
  assert.equal(ready[0].detail.utc, "2026-11-25T12:00:00Z");
  assert.equal((await page.heard("change")).length, 0);
  assert.match(await page.ask("#venus", "p('sentence').textContent"), /Venus/);
  assert.equal(await page.ask("#venus", "getComputedStyle(e.shadowRoot.querySelector('slot')).display"), "none");
});

test("dragging moves the date, redraws, and tells the page", async () => {
  await page.screen(900, 900);
  await page.open(VENUS);
  await page.ready();
  const before = await page.pixels("#venus");
  const sentence = await page.ask("#venus", "p('sentence').textContent");
  await drag("#venus", 0.6, 0.9);
  assert.notEqual((await page.pixels("#venus")).sum, before.sum);
  assert.notEqual(await page.ask("#venus", "p('sentence').textContent"), sentence);
  const changes = await page.heard("change");
  assert.ok(changes.length >= 1);
  const last = changes.at(-1).detail;
  assert.ok(last.utc > "2027-01-01", last.utc);
  assert.equal(await page.ask("#venus", "e.date"), last.utc.slice(0, 10));
  assert.equal(await page.ask("#venus", "e.circumstances.utc"), last.utc);
  assert.equal(await page.ask("#venus", "e.getAttribute('date')"), "2026-11-25");
});

test("keys move by a day, a larger step, and to the ends, and are announced", async () => {
  await page.screen(900, 900);
  await page.open(VENUS);
  await page.ready();
  const date = () => page.ask("#venus", "e.date");
  const spoken = () => page.ask("#venus", "p('slider').getAttribute('aria-valuetext')");
  assert.match(await spoken(), /25 November 2026/);
  await press("#venus", Key.ARROW_RIGHT);
  assert.equal(await date(), "2026-11-26");
  assert.match(await spoken(), /26 November 2026/);
  await press("#venus", Key.ARROW_LEFT, Key.ARROW_LEFT);
  assert.equal(await date(), "2026-11-24");
  await press("#venus", Key.PAGE_UP);
  const larger = await date();
  assert.ok(larger > "2026-11-28", larger);
  await press("#venus", Key.PAGE_DOWN);
  assert.equal(await date(), "2026-11-24");
  await press("#venus", Key.END);
  const last = await date();
  assert.ok(last > "2027-03-01", last);
  await press("#venus", Key.ARROW_RIGHT);
  assert.equal(await date(), last, "the end is the end");
  await press("#venus", Key.HOME);
  assert.ok((await date()) < "2026-08-01");
});

test("a typed date outside the frame moves the frame; one outside the series is refused beside the field", async () => {
  await page.screen(900, 900);
  await page.open(VENUS);
  await page.ready();
  const type = async (value) => {
    await page.ask("#venus", `(p('picker').value = '${value}', p('picker').dispatchEvent(new Event('change')), true)`);
    await page.painted();
  };
  await type("2030-01-06");
  assert.equal(await page.ask("#venus", "e.date"), "2030-01-06");
  assert.ok(await page.ask("#venus", "Number(p('slider').min) < Number(p('slider').value) && Number(p('slider').value) < Number(p('slider').max)"));
  await type("9000-01-01");
  assert.match(await page.ask("#venus", "p('pickernote').textContent"), /1600.*2300/);
  assert.equal(await page.ask("#venus", "p('picker').value"), "9000-01-01", "what was typed stays");
  assert.equal(await page.ask("#venus", "e.date"), "2030-01-06");
  await type("2030-01-07");
  assert.equal(await page.ask("#venus", "p('pickernote').textContent"), "");
});

test("today is the visitor's own date", async () => {
  await page.open(`<wander-light id="now" body="venus" zone="Pacific/Kiritimati"></wander-light>`);
  await page.ready();
  const today = await page.run("return new Intl.DateTimeFormat('sv', { timeZone: 'Pacific/Kiritimati' }).format(new Date())");
  assert.equal(await page.ask("#now", "e.date"), today);
  await press("#now", Key.HOME);
  assert.notEqual(await page.ask("#now", "e.date"), today);
  await (await page.part("#now", "today")).click();
  assert.equal(await page.ask("#now", "e.date"), today);
});

test("the canvas follows its container and the screen's density", async () => {
  await page.screen(1000, 900, { density: 2 });
  await page.open(`<div id="box" style="width:800px">${VENUS}</div>`);
  await page.ready();
  const stage = () => page.ask("#venus", "[p('stage').clientWidth, p('stage').clientHeight]");
  for (const [box, density] of [[800, 2], [280, 2], [1600, 2], [500, 1], [500, 3]]) {
    await page.screen(Math.max(400, box + 100), 900, { density });
    await page.run(`document.getElementById("box").style.width = "${box}px"`);
    await page.painted();
    await page.painted();
    const [width, height] = await stage();
    const canvas = await page.pixels("#venus");
    assert.ok(Math.abs(canvas.width - width * density) <= 1, `${canvas.width} for ${width} x ${density}`);
    assert.ok(Math.abs(canvas.height - height * density) <= 1);
    assert.ok(canvas.marked > 0.02);
    assert.ok(await page.run("return document.documentElement.scrollWidth <= innerWidth || arguments[0] > innerWidth", box), "no sideways scrolling");
  }
});

test("light, dark and night differ, and auto follows the system", async () => {
  await page.screen(900, 900, { scheme: "light" });
  await page.open(VENUS);
  await page.ready();
  const paper = async () => (await page.pixels("#venus")).first.reduce((sum, channel) => sum + channel, 0);
  const light = await paper();
  await page.screen(900, 900, { scheme: "dark" });
  await page.painted();
  const dark = await paper();
  assert.ok(light > 600 && dark < 150, `${light} and ${dark}`);
  await page.run("document.getElementById('venus').theme = 'light'");
  await page.painted();
  assert.equal(await paper(), light);
  await page.run("document.getElementById('venus').theme = 'night'");
  await page.painted();
  const { first } = await page.pixels("#venus");
  assert.ok(first[2] <= 8 && first[1] <= 16, `night is red on black: ${first}`);
});

test("attributes and properties are live", async () => {
  await page.screen(900, 900);
  await page.open(VENUS);
  await page.ready();
  const before = await page.pixels("#venus");
  await page.run("document.getElementById('venus').view = 'disc'");
  await page.painted();
  const disc = await page.pixels("#venus");
  assert.notEqual(disc.sum, before.sum);
  assert.equal(await page.ask("#venus", "e.getAttribute('view')"), "disc");
  assert.equal(await page.ask("#venus", "p('up').hidden"), false);
  await (await page.part("#venus", "horizonup")).click();
  await page.painted();
  assert.notEqual((await page.pixels("#venus")).sum, disc.sum, "horizon up turns the discs");
  await page.run("document.getElementById('venus').body = 'saturn'");
  await page.painted();
  assert.match(await page.ask("#venus", "p('sentence').textContent"), /Saturn/);
  await page.run("document.getElementById('venus').setAttribute('date', '2030-06-01')");
  assert.equal(await page.ask("#venus", "e.date"), "2030-06-01");
  assert.equal((await page.heard("change")).length, 0, "a script's own settings are not echoed as changes");
});

test("the numbers behind the chart are a table", async () => {
  await page.open(VENUS);
  await page.ready();
  await page.ask("#venus", "(p('numbers').open = true)");
  await page.painted();
  const rows = await page.ask("#venus", "[...p('rows').rows].map((row) => [...row.cells].map((cell) => cell.textContent))");
  assert.ok(rows.length >= 8, `${rows.length} rows`);
  const columns = await page.ask("#venus", "p('head').rows[0].cells.length");
  for (const row of rows) assert.equal(row.length, columns);
  assert.equal(await page.ask("#venus", "p('rows').querySelectorAll('[aria-current]').length"), 1);
  assert.ok(rows.some((row) => row.join().includes("−4.9")), JSON.stringify(rows));
});

test("elements of one group move together, others stay", async () => {
  const one = (id, group, view = "tradeoff") =>
    `<wander-light id="${id}" body="venus" view="${view}" date="2026-11-25" span="300" group="${group}"></wander-light>`;
  await page.open(one("a", "x") + one("b", "x", "disc") + one("c", "y") + one("d", "y"));
  await page.ready();
  await press("#a", Key.ARROW_RIGHT);
  const dates = () => page.run("return [...document.querySelectorAll('wander-light')].map((e) => e.date)");
  assert.deepEqual(await dates(), ["2026-11-26", "2026-11-26", "2026-11-25", "2026-11-25"]);
  await press("#d", Key.ARROW_LEFT);
  assert.deepEqual(await dates(), ["2026-11-26", "2026-11-26", "2026-11-24", "2026-11-24"]);
  await page.run("document.getElementById('b').group = 'y'");
  await press("#d", Key.ARROW_LEFT);
  assert.deepEqual(await dates(), ["2026-11-26", "2026-11-23", "2026-11-23", "2026-11-23"]);
  const origins = (await page.heard("change")).map((event) => event.id);
  assert.deepEqual(origins, ["a", "b", "d", "c", "d", "c", "b"]);
});

test("several elements share one module; removing and adding them again leaks nothing", async () => {
  await page.open(VENUS + VENUS.replace('id="venus"', 'id="second"'));
  await page.ready();
  const loads = await page.run("return performance.getEntriesByType('resource').filter((entry) => entry.name.endsWith('.wasm')).length");
  assert.equal(loads, 1);
  await press("#venus", Key.ARROW_RIGHT);
  const cycle = (times) => page.driver.executeAsyncScript(`
    const [times, done] = arguments;
    const frame = () => new Promise((next) => requestAnimationFrame(() => requestAnimationFrame(next)));
    (async () => {
      const parent = document.body, element = document.getElementById("venus");
      for (let round = 0; round < times; round += 1) { element.remove(); await frame(); parent.append(element); await frame(); await frame(); }
      done();
    })();`, times);
  await cycle(5);
  await page.ready();
  assert.equal(await page.ask("#venus", "e.date"), "2026-11-26", "the visitor's date survives the move");
  const memory = async () => {
    await page.devtools("HeapProfiler.collectGarbage");
    const { metrics } = await page.driver.sendAndGetDevToolsCommand("Performance.getMetrics");
    return Object.fromEntries(metrics.map(({ name, value }) => [name, value]));
  };
  await page.devtools("Performance.enable");
  const before = await memory();
  await cycle(40);
  await page.ready();
  const after = await memory();
  assert.ok(after.Nodes <= before.Nodes + 20, `nodes: ${before.Nodes}, then ${after.Nodes}`);
  assert.ok(after.JSEventListeners <= before.JSEventListeners + 5, `listeners: ${before.JSEventListeners}, then ${after.JSEventListeners}`);
  assert.ok(after.JSHeapUsedSize <= before.JSHeapUsedSize * 1.15 + 300_000, `heap: ${before.JSHeapUsedSize}, then ${after.JSHeapUsedSize}`);
  assert.equal((await page.heard("error")).length, 0);
});

test("the visitor corrects the place; nothing is asked and nothing is sent", async () => {
  await page.open(`<script>window.asked = 0; navigator.geolocation.getCurrentPosition = (good) => { asked += 1; good({ coords: { latitude: -33.912, longitude: 18.423 } }); };</script>
    <wander-light id="v" body="venus" view="disc" date="2026-11-25" zone="Europe/Prague"></wander-light>`);
  await page.ready();
  assert.match(await page.ask("#v", "p('placelabel').textContent + p('placehint').textContent"), /Prague/);
  assert.match(await page.ask("#v", "p('placelabel').textContent + p('placehint').textContent"), /rough/i);
  assert.equal(await page.run("return asked"), 0);
  await page.ask("#v", "(p('where').open = true)");
  await (await page.part("#v", "latitude")).sendKeys("95");
  await (await page.part("#v", "longitude")).sendKeys("18.4");
  await (await page.part("#v", "useplace")).click();
  assert.match(await page.ask("#v", "p('placenote').textContent"), /-90 to 90/);
  assert.equal(await page.ask("#v", "p('latitude').value"), "95", "what was typed stays");
  await (await page.part("#v", "latitude")).clear();
  await (await page.part("#v", "latitude")).sendKeys("33,9 S");
  await (await page.part("#v", "useplace")).click();
  assert.equal(await page.ask("#v", "p('placenote').textContent"), "");
  assert.doesNotMatch(await page.ask("#v", "p('placelabel').textContent"), /Prague/);
  await (await page.part("#v", "locate")).click();
  assert.equal(await page.run("return asked"), 1);
  assert.equal(await page.ask("#v", "p('latitude').value"), "-33.9");
  const requests = await page.run("return performance.getEntriesByType('resource').map((entry) => entry.name).filter((name) => !name.startsWith(location.origin) && !name.startsWith('data:'))");
  assert.deepEqual(requests, []);
});
