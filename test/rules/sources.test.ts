/** Every formula, method and table says where it comes from; every exported function says what it is. */
import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { catalogue, citation, formulas, type Source, solutions, units } from "../../src/solver/index.ts";

const statuses: readonly Source["status"][] = [
  "figures from a secondary copy, primary not seen",
  "common practice, no source",
  "from memory",
  "computed here",
  "definition",
];
const records = [...formulas.values(), ...solutions.values()];

describe("every formula and method", () => {
  it("has a record of its own, under its own id", () => {
    expect(formulas.size).toBeGreaterThan(60);
    expect(solutions.size).toBeGreaterThan(5);
    for (const [id, record] of [...formulas, ...solutions]) expect(record.id).toBe(id);
    expect([...formulas.keys()].filter((id) => solutions.has(id))).toEqual([]);
  });
  it("names title and status of its source, and a standard its edition and clause", () => {
    for (const { id, source } of records) {
      expect(source.title.trim().length, id).toBeGreaterThan(0);
      expect(statuses, id).toContain(source.status);
      expect(citation(source), id).not.toMatch(/null|undefined/);
      if (/^(IEC|EN|IEEE|JCGM|ISO)\b/.test(source.title)) {
        expect(source.edition, `${id}: ${source.title}`).not.toBeNull();
        expect(source.clause, `${id}: ${source.title}`).not.toBeNull();
        expect(source.status, `${id}: no standard was seen`).not.toBe("computed here");
      }
    }
  });
  it("says in a sentence where it stops holding", () => {
    for (const { id, holds, title } of records) {
      expect(holds, id).toMatch(/^(dc\b|[\p{Lu}\p{N}]).*\.$/u);
      expect(title.length, id).toBeGreaterThan(3);
    }
  });
  it("states its inputs and its result by name, and nothing else", () => {
    for (const { id, statement, inputs } of formulas.values()) {
      const named = new Set([...statement.matchAll(/\{([^}]+)\}/g)].map((match) => match[1]!));
      expect([...named].sort(), id).toEqual(["=", ...Object.keys(inputs)].sort());
    }
  });
  it("gives every input and result a symbol, a meaning and a unit that can be printed", () => {
    const known = new Set([
      ...Object.keys(units),
      "1",
      "K",
      "1/K",
      "1/V",
      "K/W",
      "F/m",
      "H/m",
      "m/s",
      "C",
      "J",
      "%",
      "dB",
    ]);
    const strange = [...formulas.values()].flatMap(({ id, inputs, result }) =>
      [...Object.values(inputs), result]
        .filter(({ symbol, unit, meaning }) => symbol === "" || meaning === "" || !known.has(unit))
        .map(({ symbol, unit }) => `${id}: ${symbol} in ${unit}`),
    );
    expect(strange).toEqual([]);
  });
  it("promises a residual that a solver can keep", () => {
    for (const { id, method, residualBound } of solutions.values()) {
      expect(method.length, id).toBeGreaterThan(5);
      expect(residualBound >= 0 && residualBound <= 1e-3, `${id}: ${residualBound}`).toBe(true);
    }
  });
});

it("every part of the catalogue is generic, says so, and states what it is judged by", () => {
  for (const part of [
    ...catalogue.resistors,
    ...catalogue.capacitors,
    ...catalogue.trimmers,
    ...catalogue.protectors,
  ]) {
    expect(part.origin, part.id).toBe("catalogue");
    expect(part.name, part.id).not.toMatch(/[®™]/);
    expect(part.tolerance, part.id).toBeGreaterThan(0);
  }
  for (const resistor of catalogue.resistors.filter((each) => each.use === "divider"))
    expect(resistor.limitingVoltage_V, resistor.id).toBeGreaterThan(0);
});

const solver = fileURLToPath(new URL("../../src/solver", import.meta.url));
const rooms = ["quantities", "standards", "parts", "checks", "sizing", "proof", "build"];
const exported = /^export (?:async )?(?:function\*? (\w+)|const (\w+) = (?:<[^>]*>)?\()/;

/** Exported functions without a comment above; lines up to the next blank one share it. */
function silentIn(text: string): string[] {
  let told = false;
  return text.split("\n").flatMap((line) => {
    if (/(\*\/|^\s*\/\/.*)$/.test(line)) told = true;
    else if (line === "") told = false;
    const found = exported.exec(line);
    return found === null || told ? [] : [found[1] ?? found[2] ?? line];
  });
}

it("every exported function has a line above that says what it is", () => {
  const silent = readdirSync(solver, { recursive: true, encoding: "utf8" })
    .filter((file) => file.endsWith(".ts") && rooms.includes(file.split(/[\\/]/)[0]!))
    .flatMap((file) => silentIn(readFileSync(`${solver}/${file}`, "utf8")).map((name) => `${file}: ${name}`));
  expect(silent).toEqual([]);
});
