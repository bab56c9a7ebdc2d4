// The module's public contract as a JavaScript program sees it.
import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { test } from "node:test";
import { Worker } from "node:worker_threads";
import { circumstances, dist, series } from "./load.mjs";

const BODIES = ["sun", "moon", "mercury", "venus", "mars", "jupiter", "saturn", "uranus", "neptune"];
const declarations = readFileSync(join(dist, "wanderlight.d.ts"), "utf8");

/** Keys of an interface in the declarations; the value tells whether it may be absent. */
function declaredKeys(name) {
  const body = declarations.match(new RegExp(`interface ${name} \\{([\\s\\S]*?)\\n\\}`))[1];
  return Object.fromEntries([...body.matchAll(/^ {2}(\w+)(\??):/gm)].map(([, key, optional]) => [key, optional === "?"]));
}

test("circumstances gives every declared key and no other, for every body", () => {
  const declared = declaredKeys("Circumstances");
  for (const body of BODIES) {
    const answer = circumstances({ body, utc: "2026-11-25T06:00:00Z", latitudeDeg: 54.5, longitudeDeg: -3.1 });
    for (const key of Object.keys(answer)) assert.ok(key in declared, `${key} of ${body} is not declared`);
    for (const [key, optional] of Object.entries(declared)) {
      assert.ok(optional || key in answer, `${key} of ${body} is missing`);
      assert.notEqual(answer[key], Object(answer[key]) === answer[key] ? null : NaN);
    }
    assert.equal(Object.getPrototypeOf(answer), Object.prototype);
    assert.ok(Array.isArray(answer.warnings));
    assert.equal("ringOpeningDeg" in answer, body === "saturn");
  }
});

test("the topocentric keys are there only with a place", () => {
  const answer = circumstances({ body: "venus", utc: "2026-11-25T06:00:00Z" });
  for (const key of ["altitudeDeg", "apparentAltitudeDeg", "azimuthDeg", "apparentMagnitude"]) assert.ok(!(key in answer), key);
});

test("every value is null or a finite number of the sort its key names", () => {
  for (const body of BODIES) {
    const answer = circumstances({ body, utc: "1999-12-31T23:59:60Z", latitudeDeg: -33.9, longitudeDeg: 18.4 });
    for (const [key, value] of Object.entries(answer)) {
      if (typeof value === "number") assert.ok(Number.isFinite(value), `${key} of ${body}: ${value}`);
    }
    if (body === "sun") {
      for (const key of ["phaseAngleDeg", "illuminatedFraction", "waxing", "elongationDeg", "elongationSide"]) assert.equal(answer[key], null);
    }
  }
});

test("series gives typed columns of one length that agree with circumstances", () => {
  const answer = series({ body: "venus", fromUtc: "2026-09-01T00:00:00Z", toUtc: "2027-01-01T00:00:00Z", stepDays: 1 });
  assert.deepEqual(Object.keys(answer).sort(), Object.keys(declaredKeys("Series")).sort());
  assert.equal(answer.utc.length, 123);
  for (const [key, column] of Object.entries(answer)) {
    if (key === "utc") continue;
    assert.ok(column instanceof Float64Array, key);
    assert.equal(column.length, answer.utc.length);
    for (const at of [0, 60, 122]) {
      const single = circumstances({ body: "venus", utc: answer.utc[at] })[key];
      assert.ok(Math.abs(column[at] - single) <= 1e-9 * Math.abs(single), `${key}: ${column[at]} and ${single}`);
    }
  }
});

test("an offset, a plain date and UTC name the same instant", () => {
  const right = (utc) => circumstances({ body: "mars", utc }).rightAscensionDeg;
  assert.equal(right("2026-11-25T00:00:00Z"), right("2026-11-25"));
  assert.equal(right("2026-11-25T01:30:00+01:30"), right("2026-11-25"));
});

const REFUSED = [
  ["a body that does not exist", "unknown-body", /vulcan.*mercury.*neptune/, { body: "vulcan", utc: "2026-01-01" }],
  ["a day that does not exist", "bad-instant", /2026-02-30/, { body: "venus", utc: "2026-02-30" }],
  ["a text that is no instant", "bad-instant", /./, { body: "venus", utc: "next Tuesday" }],
  ["the year 9000", "out-of-span", /1600.*2300/, { body: "venus", utc: "9000-01-01T00:00:00Z" }],
  ["latitude 95", "bad-place", /90/, { body: "venus", utc: "2026-01-01", latitudeDeg: 95, longitudeDeg: 0 }],
  ["latitude NaN", "bad-place", /90/, { body: "venus", utc: "2026-01-01", latitudeDeg: NaN, longitudeDeg: 0 }],
  ["half a place", "bad-place", /both/, { body: "venus", utc: "2026-01-01", latitudeDeg: 5 }],
  ["a text for a number", "bad-option", /latitudeDeg/, { body: "venus", utc: "2026-01-01", latitudeDeg: "east", longitudeDeg: 0 }],
  ["a misspelt key", "bad-option", /latitude.*latitudeDeg/, { body: "venus", utc: "2026-01-01", latitude: 5 }],
  ["no body", "bad-option", /body/, { utc: "2026-01-01" }],
  ["nothing", "bad-option", /object/, undefined],
];

for (const [what, code, sentence, query] of REFUSED) {
  test(`circumstances refuses ${what} with code ${code}`, () => {
    assert.throws(() => circumstances(query), (error) => {
      assert.ok(error instanceof Error);
      assert.equal(error.code, code);
      assert.match(error.message, sentence);
      return true;
    });
  });
}

for (const stepDays of [0, -1, NaN, Infinity, 1e-9]) {
  test(`series refuses a step of ${stepDays} days`, () => {
    const query = { body: "venus", fromUtc: "2026-01-01", toUtc: "2026-12-31", stepDays };
    assert.throws(() => series(query), { code: "bad-step" });
  });
}

test("after refusals the module still answers", () => {
  for (let round = 0; round < 200; round += 1) assert.throws(() => circumstances({ body: "vulcan", utc: "2026-01-01" }));
  assert.ok(circumstances({ body: "venus", utc: "2026-01-01" }).magnitude < -3);
});

test("the module answers in a worker", async () => {
  const worker = new Worker(
    `import("${new URL("load.mjs", import.meta.url).href}").then(({ circumstances }) =>
       require("node:worker_threads").parentPort.postMessage(circumstances({ body: "venus", utc: "2026-11-25" })));`,
    { eval: true, env: { ...process.env, WANDERLIGHT_DIST: dist } },
  );
  const answer = await new Promise((resolve, reject) => worker.once("message", resolve).once("error", reject));
  await worker.terminate();
  assert.deepEqual(answer, circumstances({ body: "venus", utc: "2026-11-25" }));
});
