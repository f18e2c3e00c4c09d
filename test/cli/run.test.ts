import { readdirSync, readFileSync } from "node:fs";
import Papa from "papaparse";
import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { figures } from "../../src/solver/index.ts";
import { expectRelative } from "../support/relative.ts";

const folder = new URL("../../demo/", import.meta.url);
const demos = readdirSync(folder).filter((name) => name.endsWith(".json"));
const demo = (name: string) => readFileSync(new URL(name, folder), "utf8");

async function shell(words: readonly string[], files: Readonly<Record<string, string>> = {}) {
  let out = "";
  let said = "";
  const code = await run(words, {
    read: (file) => {
      const text = files[file] ?? (demos.includes(file) ? demo(file) : undefined);
      if (text === undefined) throw new Error("no such file");
      return text;
    },
    print: (text) => {
      out += text;
    },
    say: (text) => {
      said += `${text}\n`;
    },
  });
  return { code, out, said };
}

const without = (name: string) => JSON.stringify({ ...JSON.parse(demo(name)), design: null });

describe.each(demos)("%s in the shell", (name) => {
  it("is sized, taken and proved with the same digits as written", async () => {
    const sized = await shell(["size", name, "--top", "4"]);
    expect(sized.code).toBe(0);
    const { candidates, window } = JSON.parse(sized.out);
    expect(candidates).toHaveLength(4);
    expect(window.open).toBe(true);
    const taken = await shell(["size", "brief", "--top", "4", "--take", "2"], { brief: without(name) });
    expect(taken.code).toBe(0);
    const document = JSON.parse(taken.out);
    expect(document.design.hvArm.elements).toHaveLength(candidates[1].elements);
    const again = await shell(["prove", "taken"], { taken: taken.out });
    expect(again.said).toBe("");
    expectRelative(
      JSON.parse(again.out).hvArm.resistance_ohm,
      candidates[1].hvArmResistance_ohm,
      1e-9,
      "the same digits, but for the last",
    );
  });

  it("proves every key of the README, findings and cautions", async () => {
    const { code, out } = await shell(["prove", name, "--frequencies", "50,1k,1MHz", "--times", "1n,10us,1m"]);
    expect(code).toBe(0);
    const proof = JSON.parse(out);
    for (const path of Object.keys(figures)) {
      const value = path.split(".").reduce((at, key) => at?.[key], proof);
      expect(value, path).toBeDefined();
    }
    expect(proof.frequency.asked.magnitude_dB).toHaveLength(3);
    expect(proof.step.asked.value).toHaveLength(3);
    expect(proof.findings.length).toBeGreaterThan(5);
    expect(proof.cautions.map((each: { text: string }) => each.text).join(" ")).toMatch(
      /A zero reading does not mean that the voltage is off/,
    );
    expect(out).not.toMatch(/NaN|Infinity/);
  });

  it("lists its parts as CSV that an independent reader takes back, every number a number", async () => {
    const { code, out } = await shell(["parts", name]);
    expect(code).toBe(0);
    const { data, errors } = Papa.parse<Record<string, string>>(out, { header: true, skipEmptyLines: true });
    expect(errors).toEqual([]);
    for (const row of data) {
      for (const key of ["quantity", "spares", "buy"])
        expect(Number.isInteger(Number(row[key])) && row[key] !== "").toBe(true);
      if (row.value_base_unit !== "") expect(Number(row.value_base_unit)).toBeGreaterThan(0);
    }
    const { design } = JSON.parse(demo(name));
    const string = data.filter((row) => row.place === "HV arm" && row.unit === "ohm");
    expect(string.reduce((sum, row) => sum + Number(row.quantity), 0)).toBe(
      design.hvArm.elements.length * design.hvArm.strings,
    );
    expect((await shell(["parts", name, "--flavour", "spreadsheet"])).out.charCodeAt(0)).toBe(0xfeff);
  });

  it("says why", async () => {
    const { code, out } = await shell(["why", name, "scaleFactor.predicted"]);
    expect(code).toBe(0);
    expect(out).toMatch(/F = \(1 \+ R_1 \/ R_2p\)/);
    expect((await shell(["why", name, "element.dissipation_W", "--element", "2"])).out).toMatch(/Joule/);
  });
});

describe("unusable input ends in one message and exit 2", () => {
  it.each([
    [["prove", "none.json"], /cannot be read/],
    [["prove"], /No FILE/],
    [["prove", "a", "b"], /expected/],
    [["prove", "broken"], /JSON|read/i],
    [["prove", "brief"], /no design yet: size FILE --take 1/],
    [["parts", "brief"], /no design yet: size FILE --take 1/],
    [["parts", demos[0]!, "--flavour", "table"], /flavour/],
    [["size", demos[0]!, "--top", "0"], /--top/],
    [["size", demos[0]!, "--wrong", "1"], /wrong/],
    [["prove", demos[0]!, "--times", "soon"], /soon/],
    [["why", demos[0]!, "no.such"], /There is no figure/],
    [["frobnicate"], /no verb/],
    [["network", "broken"], /not JSON/],
    [["network", "brief"], /not known|format/],
  ] as const)("%j", async (words, message) => {
    const { code, out, said } = await shell(words as readonly string[], {
      broken: '{"brief": ',
      brief: without(demos[0]!),
    });
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
  });
  it("asks for the list's --top when the candidate is not on it", async () => {
    const { code, said } = await shell(["size", demos[0]!, "--take", "500"]);
    expect(code).toBe(1);
    expect(said).toMatch(/no candidate 500 among 10/);
  });
  it("helps with every verb", async () => {
    for (const verb of ["size", "prove", "parts", "why", "network"]) {
      const { code, out } = await shell([verb, "--help"]);
      expect(code).toBe(0);
      expect(out).toContain(`${verb} FILE`);
    }
    expect((await shell(["--help"])).code).toBe(0);
  });
});

describe("the raw network", () => {
  const attenuator = {
    format: "stringwright-network",
    version: 1,
    elements: [{ resistance_ohm: 9e6, capacitance_F: 20e-12 / 9 }],
    lvArm: { resistance_ohm: 1e6, capacitance_F: 20e-12 },
    source: { voltage_V: 200 },
    ask: {
      frequencies_Hz: [1, 1e6],
      times_s: [1e-9, 1e-3],
      compensation: { band_Hz: [1, 1e6] },
      grading: { first_F: 1e-12 },
      elementVoltageAt: { frequencies_Hz: [50], peak_V: 100 },
      ramp: { riseTime_s: 1e-6, times_s: [5e-7, 1e-3] },
    },
  };
  const solve = (form: unknown) => shell(["network", "form"], { form: JSON.stringify(form) });
  it("answers what is asked of a matched attenuator", async () => {
    const { code, out } = await solve(attenuator);
    expect(code).toBe(0);
    const answer = JSON.parse(out);
    expect(answer.dc).toMatchObject({ scaleFactor: 10, inputResistance_ohm: 1e7, outputVoltage_V: 20 });
    expect(answer.bandwidth_Hz).toBeNull();
    expect(answer.step.overshoot).toBe(0);
    for (const value of [...answer.frequency.real, ...answer.step.value, answer.step.initial])
      expectRelative(value, 1, 1e-9, "the same digits, but for the last");
    expectRelative(
      answer.compensation.lvCapacitance_F.highFrequency,
      20e-12,
      1e-9,
      "the same digits, but for the last",
    );
    expectRelative(answer.ramp.value[0], 0.5, 1e-9, "the same digits, but for the last");
  });
  it("has null for what an element without resistance blocks", async () => {
    const { out } = await solve({ ...attenuator, elements: [{ capacitance_F: 1e-12 }] });
    const answer = JSON.parse(out);
    expect(answer.dc.scaleFactor).toBeNull();
    expect(answer.step.initial).toBeNull();
  });
  it.each([
    [{ ...attenuator, elements: [] }, /elements: There are 0/],
    [{ ...attenuator, elements: [{ resistance_ohm: -1 }] }, /elements\/0\/resistance_ohm/],
    [{ ...attenuator, lvArm: { resistance_ohm: 1e6, inductance_H: -1e-9 } }, /lvArm\/inductance_H/],
    [{ ...attenuator, ask: { faults: "all" } }, /ask\/faults: It must be true or false/],
    [{ ...attenuator, source: { resistance_ohm: -10 } }, /source\/resistance_ohm/],
    [{ ...attenuator, cable: { delay_s: 1e-9 } }, /cable\/impedance_ohm: A line needs it/],
    [{ ...attenuator, surprise: 1 }, /surprise: This key is not known/],
    [{ ...attenuator, strays: { toEarth_F: [1e-12] } }, /inner nodes/],
    [{ ...attenuator, ask: { times_s: [-1] } }, /times_s\/0/],
  ])("refuses by name %#", async (form, message) => {
    const { code, said } = await solve(form);
    expect(code).toBe(2);
    expect(said).toMatch(message);
  });
});
