import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import { type DividerDocument, prove, size, takeCandidate } from "../../../src/solver/index.ts";

/** What the search says of a candidate is what the proof says once it is taken: a stop in the one is a stop in the other. */
const folder = new URL("../../../demo/", import.meta.url);
const demos = readdirSync(folder).filter((name) => name.endsWith(".json"));

type Loose = { [key: string]: Loose } & { [key: number]: Loose };
const changes: readonly (readonly [string, (raw: Loose) => void])[] = [
  ["as it is", () => {}],
  ["a floating source", (raw) => Object.assign(raw.brief!.source!, { earth: "floating" })],
  ["no earth", (raw) => Object.assign(raw.brief!.source!, { earth: "none" })],
  ["a greatest peak below the working peak", (raw) => Object.assign(raw.brief!.waveform!, { greatest_Vpeak: 10 })],
  ["30 km above the sea", (raw) => Object.assign(raw.brief!.surroundings!, { altitude_m: 30000 })],
  ["4 km above the sea", (raw) => Object.assign(raw.brief!.surroundings!, { altitude_m: 4000 })],
  ["a scale factor of a tenth", (raw) => Object.assign(raw.brief!, { scaleFactor: 100 })],
  ["ten times the scale factor", (raw) => Object.assign(raw.brief!, { scaleFactor: 10000 })],
  ["1 ppm wanted", (raw) => Object.assign(raw.brief!, { wantedUncertainty: 1e-6 })],
  ["10 % wanted", (raw) => Object.assign(raw.brief!, { wantedUncertainty: 0.1 })],
  ["60 °C around it", (raw) => Object.assign(raw.brief!.surroundings!, { ambient_degC: 60 })],
  ["a negative voltage", (raw) => Object.assign(raw.brief!.waveform!, { nominal_V: -6000, greatest_Vpeak: null })],
  ["twice the voltage", (raw) => Object.assign(raw.brief!.waveform!, { nominal_V: 12000, greatest_Vpeak: null })],
  ["5 MΩ in the source", (raw) => Object.assign(raw.brief!.source!, { resistance_ohm: 5e6 })],
];

function changed(name: string, change: (raw: Loose) => void): DividerDocument {
  const raw = JSON.parse(readFileSync(new URL(name, folder), "utf8"));
  change(raw);
  const restored = restoreDocument(JSON.stringify(raw));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  return restored.document;
}

describe.each(demos)("%s", (name) => {
  it.each(changes)("with %s: taken, a candidate has the stops it was listed with", (_, change) => {
    const document = changed(name, change);
    const sizing = size(document, { top: 3 });
    if (!sizing.ok) throw new Error(sizing.error.why);
    for (const candidate of sizing.value.candidates) {
      const proof = prove(takeCandidate(document, candidate));
      if (!proof.ok) throw new Error(proof.error.why);
      const stops = proof.value.findings.filter((each) => each.level === "stop").map((each) => each.id);
      const said = `${candidate.familyName} × ${candidate.elements}: listed [${candidate.stops}], proved [${stops}]`;
      expect(stops.length > 0, said).toBe(candidate.stops.length > 0);
    }
  });
});
