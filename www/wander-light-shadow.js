// The shadow tree of <wander-light>: its frame and its looks. Every word in it comes from the module.
//
// The colours --paper, --ink, --soft, --line, --accent are set by the element from the module's theme,
// so that the page's text and the canvas can never disagree.

export const template = `
<figure id="figure" part="figure" data-state="waiting" lang="en">
  <div id="stage" part="stage"><canvas id="canvas" part="canvas" role="img"></canvas><slot></slot></div>
  <p id="notice" part="notice" role="status" hidden></p>
  <div id="controls" part="controls">
    <label class="slide"><span id="sliderlabel" class="spoken"></span><input id="slider" type="range" step="1"></label>
    <label class="pick"><span id="pickerlabel"></span> <input id="picker" type="date"></label>
    <button id="today" type="button"></button>
    <button id="play" type="button" hidden><span id="playlabel"></span><span id="steplabel"></span></button>
    <label id="up" class="tick" hidden><input id="horizonup" type="checkbox"><span id="horizonuplabel"></span></label>
    <span id="pickernote" class="note" role="status"></span>
  </div>
  <figcaption id="words" part="sentence" aria-live="off">
    <p id="sentence"></p>
    <p id="placeline"></p>
    <p id="caution" hidden></p>
  </figcaption>
  <details id="numbers" part="numbers">
    <summary id="numberslabel"></summary>
    <div class="scroll" tabindex="0"><table><caption id="caption"></caption><thead id="head"></thead><tbody id="rows"></tbody></table></div>
    <p id="remarks"></p>
  </details>
  <details id="where" part="place">
    <summary id="placelabel"></summary>
    <p id="placehint"></p>
    <form id="placeform">
      <label><span id="latitudelabel"></span> <input id="latitude" inputmode="text" size="9" autocomplete="off" spellcheck="false"></label>
      <label><span id="longitudelabel"></span> <input id="longitude" inputmode="text" size="9" autocomplete="off" spellcheck="false"></label>
      <button id="useplace"></button>
      <button id="locate" type="button"></button>
      <span id="placenote" class="note" role="status"></span>
    </form>
  </details>
</figure>`;

export const styles = `
:host { display: block; container-type: inline-size; min-width: 0; }
:host([hidden]) { display: none; }
figure {
  margin: 0; padding: 0.75rem; box-sizing: border-box; border-radius: 0.6rem;
  background: var(--paper, Canvas); color: var(--ink, CanvasText);
  border: 1px solid var(--line, GrayText);
  font: 1rem/1.5 system-ui, sans-serif;
}
#stage {
  position: relative; height: 560px; overflow: hidden;
  touch-action: pan-y; cursor: ew-resize; user-select: none; -webkit-user-select: none;
}
/* The heights that the module's layouts prefer, written here so that nothing moves when it arrives. */
@container (min-width: 646px) { #stage { height: clamp(450px, calc(392px + 9cqw), 540px); } }
:host([view="disc"]) #stage { height: calc(176px + 40cqw); }
@container (min-width: 506px) { :host([view="disc"]) #stage { height: calc(180px + 28.6cqw); } }
@container (min-width: 926px) { :host([view="disc"]) #stage { height: min(167px + 22.2cqw, 456px); } }
:host([view="plan"]) #stage { cursor: grab; height: calc(266px + min(100cqw - 42px, 480px)); }
@container (min-width: 626px) {
  :host([view="plan"]) #stage { height: calc(124px + min(100cqw - 50px - clamp(200px, 30cqw - 7.8px, 300px), 480px)); }
}
canvas { position: absolute; inset: 0; width: 100%; height: 100%; }
slot { display: block; height: 100%; overflow: auto; cursor: auto; }
[data-state="ready"] slot { display: none; }
[data-state="failed"] :is(#stage, slot) { height: auto; touch-action: auto; cursor: auto; user-select: auto; }
[data-state="failed"] :is(canvas, #controls, figcaption, details) { display: none; }
[data-state="waiting"] :is(#controls, figcaption, details) { visibility: hidden; }
#controls { display: flex; flex-wrap: wrap; gap: 0.4rem 0.9rem; align-items: center; margin-top: 0.5rem; min-height: 4.75rem; align-content: flex-start; }
/* On a narrow screen the play button takes a line of its own. */
:host([view="plan"]) #controls { min-height: 7rem; }
@container (min-width: 400px) { :host([view="plan"]) #controls { min-height: 4.75rem; } }
.slide { flex: 1 0 100%; display: block; }
#slider { width: 100%; margin: 0; box-sizing: border-box; min-height: 1.75rem; accent-color: var(--accent, auto); }
.tick { display: inline-flex; align-items: center; gap: 0.4rem; min-height: 2rem; }
.tick[hidden] { display: none; }
.tick input { width: 1.25rem; height: 1.25rem; accent-color: var(--accent, auto); }
button, input:not([type="range"], [type="checkbox"]) {
  font: inherit; color: inherit; background: transparent; min-height: 2rem; padding: 0 0.6rem; box-sizing: border-box;
  border: 1px solid var(--soft, GrayText); border-radius: 0.35rem; color-scheme: var(--scheme, light dark);
}
button { cursor: pointer; }
button[hidden] { display: none; }
[aria-pressed="true"] { background: var(--accent, Highlight); color: var(--paper, HighlightText); border-color: transparent; }
#steplabel { display: none; }
@media (prefers-reduced-motion: reduce) { #steplabel { display: inline; } #playlabel { display: none; } }
button:hover { border-color: var(--accent, Highlight); }
:focus-visible { outline: 2px solid var(--accent, Highlight); outline-offset: 2px; }
/* Room for the longest usual sentences, so that nothing below moves while the date is dragged. */
figcaption { min-height: 18.5rem; }
@container (min-width: 400px) { figcaption { min-height: 12.5rem; } }
@container (min-width: 646px) { figcaption { min-height: 9.5rem; } }
figcaption p, #notice { margin: 0.5rem 0 0; max-width: 44rem; }
#placeline, #placehint, #remarks { color: var(--soft, inherit); }
#caution, #notice { border-left: 0.25rem solid var(--accent, Highlight); padding-left: 0.6rem; }
details { margin-top: 0.5rem; }
summary { min-height: 1.75rem; cursor: pointer; color: var(--soft, inherit); }
@container (max-width: 505px) { #placelabel { min-height: 3rem; } }
.scroll { overflow-x: auto; }
table { border-collapse: collapse; font-size: 0.9rem; font-variant-numeric: tabular-nums; }
caption { text-align: start; padding: 0.25rem 0; color: var(--soft, inherit); }
th, td { padding: 0.2rem 0.7rem 0.2rem 0; text-align: end; border-top: 1px solid var(--line, GrayText); white-space: nowrap; }
thead th { border-top: 0; vertical-align: bottom; white-space: normal; }
th:first-child { text-align: start; }
tr[aria-current] > * { font-weight: 700; color: var(--accent, inherit); }
form { display: flex; flex-wrap: wrap; gap: 0.5rem 0.9rem; align-items: center; }
.note:empty { display: none; }
.note { flex-basis: 100%; color: var(--accent, inherit); }
.spoken { position: absolute; width: 1px; height: 1px; overflow: hidden; clip-path: inset(50%); }
@media (forced-colors: active) { figure { border-color: CanvasText; } }
@media print { #controls, details { display: none; } }
`;

/** Puts the module's table into the shadow tree; `parts` are its nodes by id. */
export function fillTable(parts, { caption, head, rows, marked }) {
  const cell = (tag, text, scope) => Object.assign(document.createElement(tag), { textContent: text, ...(scope && { scope }) });
  const row = (cells) => {
    const line = document.createElement("tr");
    line.append(...cells);
    return line;
  };
  parts.caption.textContent = caption;
  parts.head.replaceChildren(row(head.map((text) => cell("th", text, "col"))));
  parts.rows.replaceChildren(
    ...rows.map(([first, ...rest], index) => {
      const line = row([cell("th", first, "row"), ...rest.map((text) => cell("td", text))]);
      if (index === marked) line.setAttribute("aria-current", "date");
      return line;
    }),
  );
}
