// Loads the built module in Node, the way a program there would.
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";

export const dist = process.env.WANDERLIGHT_DIST ?? new URL("../../dist", import.meta.url).pathname;

const module = await import(pathToFileURL(join(dist, "wanderlight.js")).href);
module.initSync({ module: readFileSync(join(dist, "wanderlight.wasm")) });

export const { apparitions, circumstances, eventKinds, events, series } = module;
