// A real browser for the tests: a server for dist/ and for small pages made by a test, and a WebDriver session.
import { createServer } from "node:http";
import { createReadStream, existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { extname, join, normalize } from "node:path";
import { after, before } from "node:test";
import webdriver from "selenium-webdriver";
import chrome from "selenium-webdriver/chrome.js";

export const { By, Key, Origin } = { ...webdriver, Origin: webdriver.Origin };
export const dist = process.env.WANDERLIGHT_DIST ?? new URL("../../dist", import.meta.url).pathname;
const shots = new URL("../shots/", import.meta.url).pathname;

const TYPES = {
  ".css": "text/css", ".html": "text/html; charset=utf-8", ".js": "text/javascript", ".json": "application/json",
  ".wasm": "application/wasm",
};

/** Starts server and browser before a file's tests and stops them after; returns the tools, filled in by then. */
export function browser() {
  const tools = {};
  before(async () => void Object.assign(tools, await start()));
  after(() => tools.stop?.());
  return tools;
}

/** A server, a browser with a profile of its own, and the tools to use them. */
export async function start() {
  const tools = {};
  const pages = new Map();
  const server = createServer((request, response) => {
    const path = decodeURIComponent(new URL(request.url, "http://localhost").pathname);
    if (pages.has(path)) return response.setHeader("content-type", TYPES[".html"]).end(pages.get(path));
    const file = join(dist, normalize(path));
    if (!file.startsWith(dist) || !existsSync(file)) return response.writeHead(404).end();
    response.setHeader("content-type", TYPES[extname(file)] ?? "application/octet-stream");
    createReadStream(file).pipe(response);
  });
  await new Promise((resolve) => server.listen(0, "127.0.0.1", resolve));
  const profile = mkdtempSync(join(tmpdir(), "wanderlight-"));
  const options = new chrome.Options().addArguments(
    "--headless", "--no-sandbox", "--disable-gpu", "--no-first-run", "--disable-background-networking",
    "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage", "--hide-scrollbars",
    "--force-color-profile=srgb", `--user-data-dir=${profile}`,
  );
  if (process.env.WANDERLIGHT_CHROMIUM) options.setBinaryPath(process.env.WANDERLIGHT_CHROMIUM);
  const logging = new webdriver.logging.Preferences();
  logging.setLevel(webdriver.logging.Type.BROWSER, webdriver.logging.Level.ALL);
  options.setLoggingPrefs(logging);
  const service = new chrome.ServiceBuilder(process.env.WANDERLIGHT_CHROMEDRIVER ?? "/usr/bin/chromedriver");
  tools.driver = await new webdriver.Builder()
    .forBrowser("chrome").setChromeOptions(options).setChromeService(service).build();
  tools.origin = `http://127.0.0.1:${server.address().port}`;
  tools.stop = async () => {
    await tools.driver.quit();
    server.closeAllConnections();
    server.close();
    rmSync(profile, { recursive: true, force: true });
  };
  return Object.assign(tools, methods(tools, pages));
}

function methods(tools, pages) {
  const run = (script, ...values) => tools.driver.executeScript(script, ...values);

  return {
    run,

    /** Opens a page with the given body; the element's script is included unless told otherwise. */
    async open(body, { script = `<script type="module" src="/wander-light.js"></script>`, head = "" } = {}) {
      const path = `/case-${pages.size}.html`;
      pages.set(path, `<!doctype html><html lang="en-GB"><head><meta charset="utf-8"><title>case</title>
        <link rel="icon" href="data:,">${head}${script}
        <script>window.heard = [];
          for (const type of ["ready", "change", "error"]) addEventListener("wanderlight-" + type, (event) =>
            heard.push({ type, id: event.target.id, detail: JSON.parse(JSON.stringify(event.detail)) }));
        </script></head><body>${body}</body></html>`);
      await tools.driver.get(tools.origin + path);
    },

    /** Waits until as many elements have drawn as the page has, or the number given. */
    async ready(count) {
      const wanted = count ?? (await run("return document.querySelectorAll('wander-light').length"));
      // An element loads when it comes near the viewport, so each that is not drawn yet is scrolled to.
      const drawn = () => run(`
        const waiting = [...document.querySelectorAll("wander-light")].filter((e) => e.shadowRoot?.querySelector("figure")?.dataset.state !== "ready");
        waiting[0]?.scrollIntoView();
        return document.querySelectorAll("wander-light").length - waiting.length;`);
      await tools.driver.wait(async () => (await drawn()) >= wanted, 15_000, "the elements did not become ready");
      await run("scrollTo(0, 0)");
      await this.painted();
    },

    /** Waits for two animation frames: what was asked for is on the canvas then. */
    painted() {
      return tools.driver.executeAsyncScript(
        "const done = arguments[0]; requestAnimationFrame(() => requestAnimationFrame(() => done()));");
    },

    heard: (type) => run("return heard.filter((event) => event.type === arguments[0])", type),
    /** Evaluates an expression about one element; `e` is the element, `p(id)` a node of its shadow tree. */
    ask: (selector, expression) =>
      run(`const e = document.querySelector(arguments[0]); const p = (id) => e.shadowRoot.getElementById(id); return ${expression};`, selector),
    part: (selector, id) => run("return document.querySelector(arguments[0]).shadowRoot.getElementById(arguments[1])", selector, id),

    /** Share of a canvas that differs from its first pixel, and a checksum of all pixels. */
    pixels: (selector) => run(`
      const canvas = document.querySelector(arguments[0]).shadowRoot.querySelector("canvas");
      const { data } = canvas.getContext("2d").getImageData(0, 0, canvas.width, canvas.height);
      let marked = 0, sum = 0;
      for (let at = 0; at < data.length; at += 4) {
        if (data[at] !== data[0] || data[at + 1] !== data[1] || data[at + 2] !== data[2]) marked += 1;
        sum = (Math.imul(sum, 31) + data[at] + 256 * data[at + 1] + 65536 * data[at + 2]) | 0;
      }
      return { width: canvas.width, height: canvas.height, marked: marked / (data.length / 4), sum, first: [data[0], data[1], data[2]] };`, selector),

    devtools: (command, settings = {}) => tools.driver.sendDevToolsCommand(command, settings),

    async screen(width, height, { density = 1, scheme = "light", media = [] } = {}) {
      await this.devtools("Emulation.setDeviceMetricsOverride", { width, height, deviceScaleFactor: density, mobile: false });
      await this.devtools("Emulation.setEmulatedMedia", { features: [{ name: "prefers-color-scheme", value: scheme }, ...media] });
    },

    /** A picture of the whole page for people, `tests/shots/<name>.png`. */
    async shot(name) {
      const height = await run("return Math.ceil(document.documentElement.scrollHeight)");
      const width = await run("return innerWidth");
      const { data } = await tools.driver.sendAndGetDevToolsCommand("Page.captureScreenshot", {
        format: "png", captureBeyondViewport: true, clip: { x: 0, y: 0, width, height: Math.min(height, 12_000), scale: 1 },
      });
      mkdirSync(shots, { recursive: true });
      writeFileSync(join(shots, `${name}.png`), Buffer.from(data, "base64"));
    },

    /** Errors that the browser has written to its console since the last call. */
    async consoleErrors() {
      const entries = await tools.driver.manage().logs().get(webdriver.logging.Type.BROWSER);
      return entries.filter((entry) => entry.level.value >= webdriver.logging.Level.SEVERE.value).map((entry) => entry.message);
    },
  };
}
