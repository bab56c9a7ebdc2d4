// The custom element <wander-light>: what a page needs around the module and Rust cannot be.
//
// It holds attributes, has the module loaded once per page, hands events to the Rust `Exhibit` and puts the exhibit's
// words and picture into its shadow tree. It computes nothing about the sky and owns no wording.

import { Exhibit } from "./wanderlight.js";
import { addPlayer, trackPointer } from "./wander-light-motion.js";
import { fillTable, styles, template } from "./wander-light-shadow.js";
import {
  adoptEarlyProperties, brokenMessage, camelCase, companions, devicePosition, joinGroup, leaveGroup, loadModule,
  onDensityChange, reflectAttributes, surroundings, whenNear,
} from "./wander-light-shared.js";

const SETTINGS = ["body", "view", "date", "span", "place", "zone", "lang", "theme", "units", "group"];

class WanderLight extends HTMLElement {
  static observedAttributes = SETTINGS;

  #exhibit;
  #parts;
  #group;
  #cleanup;
  #player;
  #frame = 0;
  #resume = {};
  #reported = new Set();

  connectedCallback() {
    adoptEarlyProperties(this, SETTINGS);
    if (!this.#parts) this.#buildShadow();
    this.#joinGroup();
    this.#cleanup = new AbortController();
    whenNear(this, () => this.#start(), this.#cleanup.signal);
  }

  disconnectedCallback() {
    this.#cleanup?.abort();
    cancelAnimationFrame(this.#frame);
    this.#frame = 0;
    this.#leaveGroup();
    // What the visitor chose is kept for the case that the element was only moved.
    if (this.#exhibit) this.#resume = this.#exhibit.choices();
    this.#exhibit?.free();
    this.#exhibit = undefined;
  }

  attributeChangedCallback(name, before, after) {
    if (before === after) return;
    if (name === "date" || name === "place") delete this.#resume[name];
    if (name === "group" && this.isConnected) this.#joinGroup();
    this.#player?.stop();
    if (this.#exhibit) this.#guard(() => this.#configure());
  }

  /** Everything about the body at the chosen moment, as the module's `circumstances` gives it; null before the start. */
  get circumstances() {
    return this.#exhibit ? this.#exhibit.circumstances() : null;
  }

  /** Choose a calendar date (yyyy-mm-dd) as a script; like every script setting it fires no change event. */
  get date() {
    return this.#exhibit ? this.#exhibit.choices().date : this.getAttribute("date") ?? "today";
  }
  set date(value) {
    delete this.#resume.date;
    // A second setting of the same text must still move a date that was dragged away.
    if (this.getAttribute("date") === String(value)) this.attributeChangedCallback("date", null, value);
    else this.setAttribute("date", value);
  }

  #buildShadow() {
    const root = this.shadowRoot ?? this.attachShadow({ mode: "open" });
    root.innerHTML = `<style>${styles}</style>${template}`;
    this.#parts = Object.fromEntries([...root.querySelectorAll("[id]")].map((node) => [node.id, node]));
  }

  async #start() {
    const { signal } = this.#cleanup;
    try {
      await loadModule();
    } catch (error) {
      if (!signal.aborted) this.#giveUp("not-loaded", error.message);
      return;
    }
    if (signal.aborted) return;
    this.#guard(() => {
      this.#exhibit = new Exhibit();
      this.#configure();
      this.#listen(signal);
      this.#draw();
      this.#parts.figure.dataset.state = "ready";
      this.#fire("wanderlight-ready", this.#exhibit.circumstances());
    });
  }

  #configure() {
    const settings = Object.fromEntries(SETTINGS.map((name) => [camelCase(name), this.getAttribute(name)]));
    const problems = this.#exhibit.configure({ ...settings, ...surroundings(this), ...this.#resume });
    this.#notify(problems.map((problem) => problem.message).join(" "));
    for (const problem of problems) {
      const key = `${problem.attribute}\n${problem.message}`;
      if (!this.#reported.has(key)) this.#fire("wanderlight-error", problem);
      this.#reported.add(key);
    }
    this.#showFurniture();
    this.#show();
  }

  /** The parts that change with settings but not with the date. */
  #showFurniture() {
    const { labels, palette, view, hasPlace } = this.#exhibit.furniture();
    const p = this.#parts;
    for (const [name, colour] of Object.entries(palette)) p.figure.style.setProperty(`--${name}`, colour);
    for (const [id, text] of Object.entries(labels)) p[id].textContent = text;
    p.up.hidden = view !== "disc" || !hasPlace;
    p.play.hidden = view !== "plan";
  }

  /** The parts that change with the date. */
  #show() {
    const state = this.#exhibit.state();
    const p = this.#parts;
    p.slider.min = state.firstDay;
    p.slider.max = state.lastDay;
    p.slider.value = state.day;
    p.slider.setAttribute("aria-valuetext", state.announcement);
    p.picker.value = state.date;
    p.canvas.setAttribute("aria-label", state.description);
    p.sentence.textContent = state.sentence;
    p.placeline.textContent = state.place;
    p.remarks.textContent = state.remarks;
    p.caution.textContent = state.caution;
    p.caution.hidden = !state.caution;
    p.horizonup.checked = state.horizonUp;
    if (p.numbers.open) fillTable(p, this.#exhibit.table());
    this.#requestDraw();
  }

  #requestDraw() {
    this.#frame ||= requestAnimationFrame(() => {
      this.#frame = 0;
      if (this.#exhibit) this.#guard(() => this.#draw());
    });
  }

  #draw() {
    const { stage, canvas } = this.#parts;
    const { width, height } = stage.getBoundingClientRect();
    if (width < 1 || height < 1) return;
    const [left, right] = this.#exhibit.draw(canvas, width, height, devicePixelRatio);
    // The slider lies under the date axis, half its thumb beyond each end.
    this.#parts.slider.style.cssText = `margin-left: ${left - 8}px; width: ${right - left + 16}px`;
  }

  #listen(signal) {
    const p = this.#parts;
    const on = (target, type, handler, options) =>
      target.addEventListener(type, (event) => this.#guard(() => handler(event)), { ...options, signal });

    trackPointer(p.stage, {
      press: (x, y) => {
        // The slider is the keyboard twin of the drag, so arrow keys go on from where the finger stopped.
        p.slider.focus({ preventScroll: true });
        return this.#exhibit.grab(x, y);
      },
      drag: (x, y) => this.#moved(this.#exhibit.drag(x, y)),
    }, on);
    this.#player = addPlayer(p, {
      begin: () => this.#moved(this.#exhibit.begin_round()),
      play: (seconds) => this.#guard(() => {
        const goesOn = this.#exhibit.play(seconds);
        this.#requestDraw();
        return goesOn;
      }),
      tell: () => this.#guard(() => this.#moved(true)),
      rest: () => this.#guard(() => this.#moved((this.#exhibit.rest(), true))),
      step: () => this.#moved(this.#exhibit.step_round()),
    }, on, signal);
    on(p.slider, "keydown", (event) => {
      if (event.altKey || event.ctrlKey || event.metaKey) return;
      if (!this.#exhibit.knows_key(event.key)) return;
      event.preventDefault();
      this.#moved(this.#exhibit.press(event.key));
    });
    on(p.slider, "input", () => this.#moved(this.#exhibit.choose_day(p.slider.valueAsNumber)));
    on(p.picker, "change", () => this.#typed(this.#exhibit.choose_date(p.picker.value)));
    on(p.today, "click", () => this.#moved(this.#exhibit.choose_today()));
    on(p.horizonup, "change", () => {
      this.#exhibit.turn_disc(p.horizonup.checked);
      this.#show();
    });
    on(p.numbers, "toggle", () => p.numbers.open && fillTable(p, this.#exhibit.table()));
    on(p.placeform, "submit", (event) => {
      event.preventDefault();
      this.#placed(this.#exhibit.choose_place(p.latitude.value, p.longitude.value));
    });
    on(p.locate, "click", () => this.#locate());
    on(p.canvas, "contextrestored", () => this.#requestDraw());

    const resize = new ResizeObserver(() => this.#requestDraw());
    resize.observe(p.stage);
    signal.addEventListener("abort", () => resize.disconnect());
    on(matchMedia("(prefers-color-scheme: dark)"), "change", () => this.#configure());
    onDensityChange(() => this.#requestDraw(), signal);
  }

  /** The visitor moved the date: show it, tell the page, take the group along. */
  #moved(changed) {
    if (!changed) return;
    this.#resume.date = this.#exhibit.choices().date;
    this.#show();
    this.#fire("wanderlight-change", this.#exhibit.circumstances());
    for (const other of companions(this.#group, this)) other.#follow(this.#resume.date);
  }

  #follow(date) {
    this.#resume.date = date;
    // One that is not loaded yet begins at this date when it is.
    if (!this.#exhibit) return;
    this.#player?.stop();
    this.#guard(() => {
      if (!this.#exhibit.choose_date(date).changed) return;
      this.#show();
      this.#fire("wanderlight-change", this.#exhibit.circumstances());
    });
  }

  /** A typed date: a refusal is said beside the field, and what was typed stays there. */
  #typed({ changed, message }) {
    this.#parts.pickernote.textContent = message ?? "";
    this.#moved(changed);
  }

  #placed({ changed, message }) {
    this.#parts.placenote.textContent = message ?? "";
    if (!changed) return;
    this.#resume.place = this.#exhibit.choices().place;
    this.#showFurniture();
    this.#show();
    this.#fire("wanderlight-change", this.#exhibit.circumstances());
  }

  async #locate() {
    const position = await devicePosition();
    if (!this.#exhibit) return;
    const { latitude, longitude, placenote } = this.#parts;
    if (!position) return void (placenote.textContent = this.#exhibit.furniture().locateRefused);
    [latitude.value, longitude.value] = position;
    this.#guard(() => this.#placed(this.#exhibit.choose_place(...position)));
  }

  #joinGroup() {
    const name = this.getAttribute("group") || undefined;
    if (name === this.#group) return;
    this.#leaveGroup();
    this.#group = name;
    if (name) joinGroup(name, this);
  }

  #leaveGroup() {
    leaveGroup(this.#group, this);
    this.#group = undefined;
  }

  /** Runs calls into the module; whatever goes wrong there stays inside this element. */
  #guard(action) {
    try {
      return action();
    } catch (error) {
      this.#giveUp(error.code ?? "broken", error.code ? error.message : brokenMessage, error);
    }
  }

  #giveUp(code, message, cause) {
    this.#cleanup.abort();
    this.#leaveGroup();
    this.#exhibit = undefined;
    this.#parts.figure.dataset.state = "failed";
    this.#notify(message);
    this.#fire("wanderlight-error", { code, message, cause });
  }

  #notify(text) {
    this.#parts.notice.textContent = text;
    this.#parts.notice.hidden = !text;
  }

  #fire(type, detail) {
    this.dispatchEvent(new CustomEvent(type, { detail, bubbles: true, composed: true }));
  }
}

reflectAttributes(WanderLight.prototype, SETTINGS);

// A page that includes the script twice, or a second copy of it, keeps the first.
if (!customElements.get("wander-light")) customElements.define("wander-light", WanderLight);
