// What a reader sees when something is wrong: the article stays, and one calm sentence says what is allowed.
import assert from "node:assert/strict";
import { test } from "node:test";
import { browser } from "./support.mjs";

const page = browser();
const PLAIN = "Venus is 23 % lit.";
const element = (attributes) => `<p id="around">The article.</p><wander-light id="v" ${attributes}>${PLAIN}</wander-light>`;
const GOOD = `body="venus" date="2026-11-25"`;

const notice = () => page.ask("#v", "p('notice').hidden ? '' : p('notice').textContent");
const failed = () => page.driver.wait(
  () => page.run("return document.querySelector('wander-light')?.shadowRoot?.querySelector('figure').dataset.state === 'failed'"), 10_000);
const beforeScripts = async (source) => (await page.driver.sendAndGetDevToolsCommand("Page.addScriptToEvaluateOnNewDocument", { source })).identifier;

const BAD = [
  ["an unknown body", `body="vulcan"`, "body", "unknown-body", /vulcan.*mercury.*neptune/],
  ["the Sun, which has no phase", `body="sun"`, "body", "bad-option", /Moon/],
  ["an unknown view", `body="venus" view="cube"`, "view", "bad-option", /tradeoff.*disc/],
  ["a broken date", `body="venus" date="2026-02-30"`, "date", "bad-instant", /2026-02-30/],
  ["a date outside the series", `body="venus" date="9000-01-01"`, "date", "out-of-span", /1600.*2300/],
  ["a span of no days", `body="venus" span="0"`, "span", "bad-step", /days/],
  ["a span that is no number", `body="venus" span="long"`, "span", "bad-step", /days/],
  ["latitude 95", `body="venus" place="95,10"`, "place", "bad-place", /-90 to 90/],
  ["a place that is no place", `body="venus" place="home"`, "place", "bad-place", /auto/],
  ["a zone that the browser does not know", `body="venus" zone="Mars/Olympus"`, "zone", "bad-option", /Europe\/Prague/],
  ["a broken language tag", `body="venus" lang="!!"`, "lang", "bad-option", /en-GB/],
  ["an unknown theme", `body="venus" theme="pink"`, "theme", "bad-option", /light.*dark.*night.*auto/],
  ["unknown units", `body="venus" units="furlongs"`, "units", "bad-option", /metric.*imperial/],
];

for (const [what, attributes, attribute, code, sentence] of BAD) {
  test(`${what}: a sentence, an event, and the chart with the default`, async () => {
    await page.open(element(attributes));
    await page.ready();
    assert.match(await notice(), sentence);
    const errors = await page.heard("error");
    assert.equal(errors.length, 1);
    assert.equal(errors[0].detail.attribute, attribute);
    assert.equal(errors[0].detail.code, code);
    assert.ok((await page.pixels("#v")).marked > 0.01);
    await page.run("document.getElementById('v').removeAttribute(arguments[0])", attribute);
    assert.equal(await notice(), "", "the notice goes with its cause");
  });
}

test("without WebAssembly the plain text stays and a sentence says why", async () => {
  const identifier = await beforeScripts("delete window.WebAssembly");
  try {
    await page.open(element(GOOD));
    await failed();
    assert.match(await notice(), /WebAssembly/);
    assert.equal(await page.ask("#v", "e.textContent"), PLAIN);
    assert.ok(await page.ask("#v", "e.shadowRoot.querySelector('slot').getBoundingClientRect().height") > 10);
    assert.equal(await page.ask("#v", "getComputedStyle(p('controls')).display"), "none");
    assert.equal((await page.heard("error"))[0].detail.code, "not-loaded");
    assert.equal(await page.run("return document.getElementById('around').textContent"), "The article.");
    await page.shot("fallback-no-webassembly");
  } finally {
    await page.devtools("Page.removeScriptToEvaluateOnNewDocument", { identifier });
  }
});

test("when the module cannot be fetched the plain text stays, and a later element tries again", async () => {
  await page.devtools("Network.enable");
  await page.devtools("Network.setBlockedURLs", { urls: ["*.wasm"] });
  try {
    await page.open(element(GOOD));
    await failed();
    assert.match(await notice(), /could not be loaded/);
  } finally {
    await page.devtools("Network.setBlockedURLs", { urls: [] });
  }
  await page.run(`document.body.insertAdjacentHTML("beforeend", '<wander-light id="w" body="venus"></wander-light>')`);
  await page.ready(1);
  assert.ok((await page.pixels("#w")).marked > 0.01);
});

test("with JavaScript off the text between the tags is read", async () => {
  await page.devtools("Emulation.setScriptExecutionDisabled", { value: true });
  try {
    await page.open(element(GOOD));
    const { root } = await page.driver.sendAndGetDevToolsCommand("DOM.getDocument", { depth: -1 });
    const { nodeId } = await page.driver.sendAndGetDevToolsCommand("DOM.querySelector", { nodeId: root.nodeId, selector: "#v" });
    const { model } = await page.driver.sendAndGetDevToolsCommand("DOM.getBoxModel", { nodeId });
    assert.ok(model.height > 10);
    const { outerHTML } = await page.driver.sendAndGetDevToolsCommand("DOM.getOuterHTML", { nodeId });
    assert.ok(outerHTML.includes(PLAIN));
  } finally {
    await page.devtools("Emulation.setScriptExecutionDisabled", { value: false });
  }
});

test("the script twice, or a second definition, changes nothing", async () => {
  const script = `<script type="module" src="/wander-light.js"></script><script type="module" src="/wander-light.js?again"></script>`;
  await page.open(element(GOOD), { script });
  await page.ready();
  assert.equal((await page.heard("ready")).length, 1);
  assert.deepEqual(await page.consoleErrors(), []);
});

test("a lost canvas is drawn again when it comes back", async () => {
  await page.open(element(GOOD));
  await page.ready();
  const { sum } = await page.pixels("#v");
  await page.run(`const canvas = arguments[0]; canvas.width = 1; canvas.dispatchEvent(new Event("contextrestored"));`, await page.part("#v", "canvas"));
  await page.painted();
  assert.equal((await page.pixels("#v")).sum, sum);
});

test("properties set before the element is defined are adopted", async () => {
  await page.open(`<wander-light id="v"></wander-light><script>Object.assign(document.getElementById("v"), { body: "mars", date: "2027-02-19" })</script>`);
  await page.ready();
  assert.equal(await page.ask("#v", "e.circumstances.body"), "mars");
  assert.equal(await page.ask("#v", "e.date"), "2027-02-19");
});

test("nothing on the page moves while the chart loads", async () => {
  await page.screen(900, 900);
  const identifier = await beforeScripts(`window.shift = 0; new PerformanceObserver((list) => { for (const entry of list.getEntries()) shift += entry.value; }).observe({ type: "layout-shift", buffered: true });`);
  try {
    for (const width of [360, 900]) {
      await page.screen(width, 900);
      await page.open(`${element(GOOD)}<p>After the chart.</p>`, { head: `<link rel="stylesheet" href="/wander-light.css">` });
      await page.ready();
      await page.painted();
      assert.ok((await page.run("return shift")) < 0.02, `layout shift ${await page.run("return shift")} at ${width} px`);
    }
  } finally {
    await page.devtools("Page.removeScriptToEvaluateOnNewDocument", { identifier });
  }
});
