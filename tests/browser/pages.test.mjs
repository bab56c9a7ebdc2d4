// The pages that are shipped, looked at on wide and narrow screens, light and dark, audited, and opened from a file.
import assert from "node:assert/strict";
import { copyFileSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { createRequire } from "node:module";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { test } from "node:test";
import { pathToFileURL } from "node:url";
import { browser, dist } from "./support.mjs";

const page = browser();
const audit = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

/** Rule violations of an accessibility audit after WCAG 2.2 A and AA, shadow trees included. */
async function violations() {
  await page.run(audit);
  const found = await page.driver.executeAsyncScript(`
    const done = arguments[0];
    axe.run({ runOnly: ["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"] }).then(({ violations }) =>
      done(violations.map(({ id, nodes }) => id + ": " + nodes.map((node) => node.target.flat().join(" ") + " " + node.failureSummary).join("; "))));`);
  return found;
}

/** Elements load only when they come near the viewport, so walk down the page first. */
async function walkDown() {
  for (const step of [0, 1, 2, 3, 4, 5, 6, 7]) {
    await page.run("scrollTo(0, arguments[0] * document.documentElement.scrollHeight / 7)", step);
    await page.painted();
  }
  await page.ready();
  await page.run("scrollTo(0, 0)");
  await page.painted();
}

for (const width of [1200, 360]) {
  for (const scheme of ["light", "dark"]) {
    test(`the article at ${width} px, ${scheme}: draws, fits, reads, and passes the audit`, async () => {
      await page.screen(width, 900, { scheme, density: width === 360 ? 2 : 1 });
      await page.driver.get(`${page.origin}/article.html`);
      await walkDown();
      assert.equal(await page.run("return document.querySelectorAll('wander-light').length"), 3);
      for (const at of [1, 2, 3]) {
        const { marked } = await page.pixels(`wander-light:nth-of-type(${at})`);
        assert.ok(marked > 0.01, `chart ${at} is empty`);
      }
      assert.ok(await page.run("return document.documentElement.scrollWidth <= innerWidth"), "no sideways scrolling");
      assert.deepEqual(await page.consoleErrors(), []);
      assert.deepEqual(await violations(), []);
      await page.shot(`article-${width}-${scheme}`);
    });
  }
}

test("the article opened with its tables and place shown passes the audit too", async () => {
  await page.screen(360, 900, { density: 2 });
  await page.driver.get(`${page.origin}/article.html`);
  await walkDown();
  await page.run("for (const e of document.querySelectorAll('wander-light')) for (const d of e.shadowRoot.querySelectorAll('details')) d.open = true");
  await page.painted();
  assert.deepEqual(await violations(), []);
  assert.ok(await page.run("return document.documentElement.scrollWidth <= innerWidth"), "no sideways scrolling");
  await page.shot("article-360-opened");
});

test("the one-file page opens from a file with the network off", async () => {
  await page.screen(1000, 900);
  const folder = mkdtempSync(join(tmpdir(), "stick-"));
  try {
    copyFileSync(join(dist, "wanderlight-single.html"), join(folder, "on a stick.html"));
    await page.devtools("Network.enable");
    await page.devtools("Network.emulateNetworkConditions", { offline: true, latency: 0, downloadThroughput: 0, uploadThroughput: 0 });
    await page.driver.get(pathToFileURL(join(folder, "on a stick.html")).href);
    await walkDown();
    for (const at of [1, 2, 3]) assert.ok((await page.pixels(`wander-light:nth-of-type(${at})`)).marked > 0.01);
    assert.deepEqual(await page.consoleErrors(), []);
    assert.deepEqual(await page.run("return performance.getEntriesByType('resource').map((entry) => entry.name).filter((name) => !name.startsWith('data:'))"), []);
    await page.shot("single-1000-light");
  } finally {
    await page.devtools("Network.emulateNetworkConditions", { offline: false, latency: 0, downloadThroughput: -1, uploadThroughput: -1 });
    rmSync(folder, { recursive: true, force: true });
  }
});

test("every view and body is pictured for people to look at", async () => {
  const bodies = ["moon", "mercury", "venus", "mars", "jupiter", "saturn", "uranus", "neptune"];
  for (const view of ["tradeoff", "disc"]) {
    for (const [width, theme] of [[360, "night"], [900, "dark"], [900, "light"]]) {
      await page.screen(width, 900, { density: 2 });
      await page.open(`<style>body { margin: 0; display: grid; gap: 8px; background: ${theme === "light" ? "#fff" : "#000"} }</style>` +
        bodies.map((body) => `<wander-light id="${body}" body="${body}" view="${view}" date="2026-12-01" theme="${theme}"></wander-light>`).join(""));
      await walkDown();
      for (const body of bodies) assert.ok((await page.pixels(`#${body}`)).marked > 0.004, `${body} ${view}`);
      assert.deepEqual(await page.consoleErrors(), []);
      await page.shot(`${view}-all-${width}-${theme}`);
    }
  }
});
