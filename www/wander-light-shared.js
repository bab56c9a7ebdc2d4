// What <wander-light> elements share: the loaded module, groups that move together, small parts of the platform.

import init from "./wanderlight.js";

const LOADING_FAILED = "The chart could not be loaded, so this page shows its plain text instead.";
const NO_WASM = "This browser does not run WebAssembly, so this page shows its plain text instead of the chart.";

const groups = new Map();
let loading;

/** One module instance per page; a failed attempt may be repeated by the next element that asks. */
export function loadModule() {
  if (typeof WebAssembly !== "object") return Promise.reject(new Error(NO_WASM));
  // The one-file page carries the module's bytes inside itself.
  const inline = document.getElementById("wanderlight-wasm");
  const source = inline ? Uint8Array.from(atob(inline.textContent.trim()), (c) => c.charCodeAt(0)) : undefined;
  loading ??= init(source && { module_or_path: source }).catch((cause) => {
    loading = undefined;
    throw new Error(LOADING_FAILED, { cause });
  });
  return loading;
}

/** The sentence for a module that arrived and then failed. */
export const brokenMessage = LOADING_FAILED;

export function joinGroup(name, element) {
  groups.set(name, (groups.get(name) ?? new Set()).add(element));
}

export function leaveGroup(name, element) {
  const members = groups.get(name);
  members?.delete(element);
  if (members?.size === 0) groups.delete(name);
}

/** The other elements of a group, in the order in which they joined. */
export function companions(name, element) {
  return [...(groups.get(name) ?? [])].filter((other) => other !== element);
}

/** Calls back once, when an element comes near the viewport, until the signal. */
export function whenNear(element, callback, signal) {
  const near = new IntersectionObserver((entries) => {
    if (!entries.some((entry) => entry.isIntersecting)) return;
    near.disconnect();
    callback();
  }, { rootMargin: "600px" });
  near.observe(element);
  signal.addEventListener("abort", () => near.disconnect());
}

/** Calls back when the screen's density changes, until the signal. */
export function onDensityChange(callback, signal) {
  const change = () => {
    callback();
    // A media query holds for one density only, so it is renewed at each change.
    onDensityChange(callback, signal);
  };
  matchMedia(`(resolution: ${devicePixelRatio}dppx)`).addEventListener("change", change, { once: true, signal });
}

export const camelCase = (name) => name.replace(/-(.)/g, (_, letter) => letter.toUpperCase());

/** Takes over properties that a script has set before the element was defined. */
export function adoptEarlyProperties(element, names) {
  for (const name of names.map(camelCase)) {
    if (!Object.hasOwn(element, name)) continue;
    const value = element[name];
    delete element[name];
    element[name] = value;
  }
}

/** Gives each attribute a property of the same name, except where there is one already (`date`, `lang`). */
export function reflectAttributes(prototype, names) {
  for (const name of names) {
    const property = camelCase(name);
    if (property in prototype) continue;
    Object.defineProperty(prototype, property, {
      configurable: true,
      enumerable: true,
      get() {
        return this.getAttribute(name);
      },
      set(value) {
        if (value == null) this.removeAttribute(name);
        else this.setAttribute(name, value);
      },
    });
  }
}

/** The device's position as texts in degrees, or nothing. One decimal (about 10 km) is all a chart needs, so no more is kept. */
export function devicePosition() {
  return new Promise((resolve) => {
    if (!navigator.geolocation) return resolve();
    const settings = { maximumAge: 3_600_000, timeout: 15_000 };
    const found = ({ coords }) => resolve([coords.latitude.toFixed(1), coords.longitude.toFixed(1)]);
    navigator.geolocation.getCurrentPosition(found, () => resolve(), settings);
  });
}

/** What the page around an element says about language and colours. */
export function surroundings(element) {
  const look = getComputedStyle(element);
  const colour = (name) => [name, look.getPropertyValue(`--wanderlight-${name}`).trim()];
  return {
    pageLang: element.parentElement?.closest("[lang]")?.lang || navigator.language,
    prefersDark: matchMedia("(prefers-color-scheme: dark)").matches,
    colours: Object.fromEntries(["paper", "ink", "accent"].map(colour)),
  };
}
