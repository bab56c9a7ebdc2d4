// The queries for events as a JavaScript program sees them.
import assert from "node:assert/strict";
import { test } from "node:test";
import { apparitions, eventKinds, events } from "./load.mjs";

test("events come in order of time, within the span, each with an honest clock", () => {
  const found = events({ fromUtc: "2026-08-01", toUtc: "2027-02-01", bodies: ["venus"] });
  const kinds = found.map((event) => event.kind);
  for (const kind of ["inferior-conjunction", "greatest-brightness", "greatest-illuminated-extent", "greatest-elongation-west"]) {
    assert.ok(kinds.includes(kind), `${kind} is missing`);
  }
  const instants = found.map((event) => event.utc);
  assert.deepEqual(instants, instants.toSorted());
  assert.ok(instants[0] >= "2026-08-01" && instants.at(-1) < "2027-02-01");
  for (const event of found) assert.ok(event.timeUncertaintySeconds > 0, event.kind);
});

test("the transits of Venus in five centuries are the eight of the catalogues", () => {
  // Dates of greatest transit: published transit catalogues, from memory; the last two and the next are in every almanac.
  const found = events({ fromUtc: "1700-01-01", toUtc: "2200-01-01", bodies: ["venus"], kinds: ["transit"] });
  const dates = found.map((event) => event.utc.slice(0, 10));
  assert.deepEqual(dates, ["1761-06-06", "1769-06-03", "1874-12-09", "1882-12-06", "2004-06-08", "2012-06-06", "2117-12-11", "2125-12-08"]);
  for (const event of found) assert.equal(event.contacts.length, 4);
});

test("every kind has a definition", () => {
  const kinds = eventKinds();
  assert.ok(kinds.length >= 25);
  for (const { kind, definition } of kinds) assert.ok(definition.length > 20, kind);
});

test("apparitions of Venus alternate between evening and morning", () => {
  const found = apparitions({ body: "venus", fromUtc: "2025-01-01", toUtc: "2028-01-01" }).apparitions;
  assert.ok(found.length >= 3);
  found.forEach(({ side }, at) => assert.equal(side, (at % 2 === 0) === (found[0].side === "evening") ? "evening" : "morning"));
});

test("an unknown kind lists the kinds, an impossible one says why, a distant span is refused", () => {
  const ask = (query) => () => events({ fromUtc: "2026-01-01", toUtc: "2027-01-01", ...query });
  assert.throws(ask({ kinds: ["wedding"] }), (error) => error.code && /greatest-brightness/.test(error.message));
  assert.throws(ask({ bodies: ["jupiter"], kinds: ["inferior-conjunction"] }), (error) => /Jupiter|jupiter/.test(error.message));
  assert.throws(ask({ fromUtc: "0900-01-01" }), { code: "out-of-span" });
});
