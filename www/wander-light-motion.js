// How the visitor sets the moment in motion: a pointer that drags it, and the play button of the plan.

/** Hands the positions of a pressed pointer to `act.press(x, y)` (true: it holds something) and `act.drag(x, y)`. */
export function trackPointer(stage, act, on) {
  let holds = false;
  const position = (event) => {
    const { left, top } = stage.getBoundingClientRect();
    return [event.clientX - left, event.clientY - top];
  };
  on(stage, "pointerdown", (event) => {
    if (event.button !== 0) return;
    stage.setPointerCapture(event.pointerId);
    event.preventDefault();
    holds = act.press(...position(event));
    act.drag(...position(event));
  });
  on(stage, "pointermove", (event) => {
    if (stage.hasPointerCapture(event.pointerId)) act.drag(...position(event));
  });
  // A finger scrolls the page up and down, unless it holds what moves in any direction.
  on(stage, "touchstart", (event) => holds && event.preventDefault(), { passive: false });
}

/** The longest time that one frame plays on for, in seconds: after a pause nothing jumps. */
const LONGEST_FRAME = 0.1;
/** The words follow this often, in milliseconds; faster they could not be read. */
const WORDS_EVERY = 250;

/**
 * A play button. `act.begin()` prepares, `act.play(seconds)` moves on and says whether there is more, `act.tell()` shows
 * the words, `act.rest()` ends, `act.step()` is one large step for visitors who want no motion. Anything that the
 * visitor does inside `figure` ends the playing; out of sight it waits.
 */
export function addPlayer({ figure, stage, play: button }, act, on, signal) {
  const calm = matchMedia("(prefers-reduced-motion: reduce)");
  let playing = false, inSight = true, frame = 0, before = 0, told = 0;

  const mark = () => (calm.matches ? button.removeAttribute("aria-pressed") : button.setAttribute("aria-pressed", playing));
  const wait = () => {
    cancelAnimationFrame(frame);
    frame = before = 0;
  };
  const stop = () => {
    if (!playing) return;
    playing = false;
    wait();
    mark();
    if (!signal.aborted) act.rest();
  };
  const next = () => {
    if (!playing || !inSight || document.hidden) return wait();
    frame ||= requestAnimationFrame((now) => {
      frame = 0;
      const seconds = before ? Math.min((now - before) / 1000, LONGEST_FRAME) : 0;
      before = now;
      if (!act.play(seconds)) return stop();
      if (now - told >= WORDS_EVERY) {
        told = now;
        act.tell();
      }
      next();
    });
  };

  on(button, "click", () => {
    if (calm.matches) return act.step();
    if (playing) return stop();
    playing = true;
    mark();
    act.begin();
    next();
  });
  const watch = (event) => {
    const moves = event.key !== "Tab" && event.key !== "Shift";
    if (moves && !event.composedPath().includes(button)) stop();
  };
  for (const type of ["pointerdown", "keydown", "input", "change", "click"]) on(figure, type, watch, { capture: true });
  on(document, "visibilitychange", next);
  on(calm, "change", () => {
    stop();
    mark();
  });
  const sight = new IntersectionObserver((entries) => {
    inSight = entries.at(-1).isIntersecting;
    next();
  });
  sight.observe(stage);
  signal.addEventListener("abort", () => {
    sight.disconnect();
    stop();
  });
  mark();
  return { stop };
}
