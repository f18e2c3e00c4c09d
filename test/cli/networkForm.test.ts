/** The raw network's form through the shell: what cannot be used ends in exit 2 with the key, and nothing on standard output. */
import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { expectRelative } from "../support/relative.ts";

async function solve(form: unknown) {
  let out = "";
  let said = "";
  const code = await run(["network", "form"], {
    read: () => (typeof form === "string" ? form : JSON.stringify(form)),
    print: (text) => {
      out += text;
    },
    say: (text) => {
      said += text;
    },
  });
  expect(out).not.toMatch(/NaN|Infinity/);
  return { code, out, said };
}
const form = (more: object = {}) => ({
  format: "stringwright-network",
  version: 1,
  elements: [{ resistance_ohm: 9e6 }, { resistance_ohm: 9e6 }],
  lvArm: { resistance_ohm: 18e3 },
  ...more,
});

describe("a form that cannot be used", () => {
  it.each([
    ["null", /./],
    ["[]", /object/],
    ["3", /object/],
    ['{"format":"stringwright"}', /format/],
    ["", /not JSON/],
  ])("%s", async (text, message) => {
    const { code, out, said } = await solve(text);
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
  });
  it.each<[object, RegExp]>([
    [{ version: 2 }, /\/version/],
    [{ version: "1" }, /\/version/],
    [{ elements: undefined }, /\/elements/],
    [{ elements: {} }, /\/elements/],
    [{ elements: Array(5001).fill({ resistance_ohm: 1 }) }, /5001 elements/],
    [{ elements: [{ resistance_ohm: "9M" }] }, /elements\/0\/resistance_ohm/],
    [{ elements: [{ resistance_ohm: 0 }] }, /elements\/0\/resistance_ohm/],
    [{ elements: [{ resistance_ohm: 1e6, capacitance_F: -1e-12 }] }, /elements\/0\/capacitance_F/],
    [{ elements: [{ resistance_ohm: 1e6, capacitance: 1e-12 }] }, /elements\/0\/capacitance: This key is not known/],
    [{ elements: [null] }, /elements\/0/],
    [{ strays: { toEarth_F: [1e-12, 1e-12] } }, /strays\/toEarth_F.*1 inner nodes/],
    [{ strays: { toElectrode_F: ["a"] } }, /strays\/toElectrode_F\/0/],
    [{ strays: { electrodeToTap_F: -1 } }, /electrodeToTap_F/],
    [{ protector: { leakage_A: 1 } }, /protector\/leakage_A/],
    [{ seriesProtector: { resistance_ohm: 100, at: "tap" } }, /seriesProtector\/at/],
    [{ seriesProtector: { resistance_ohm: -1 } }, /seriesProtector\/resistance_ohm/],
    [{ source: { voltage_V: null, damping_ohm: -10 } }, /source\/damping_ohm/],
    [{ source: { voltage_V: "6k" } }, /source\/voltage_V/],
    [{ ask: { frequencies_Hz: 50 } }, /ask\/frequencies_Hz/],
    [{ ask: { frequencies_Hz: [-50] } }, /frequencies_Hz\/0/],
    [{ ask: { reference: "instrument" } }, /ask\/reference/],
    [{ ask: { compensation: { band_Hz: [1e6, 1] } } }, /band_Hz/],
    [{ ask: { compensation: {} } }, /band_Hz/],
    [{ ask: { grading: {} } }, /first_F/],
    [{ ask: { ramp: { riseTime_s: 0, times_s: [1] } } }, /riseTime_s/],
    [{ ask: { elementVoltageAt: { frequencies_Hz: [50] } } }, /peak_V/],
    [{ ask: { everything: true } }, /ask\/everything: This key is not known/],
    [{ ask: [] }, /\/ask/],
  ])("%j", async (more, message) => {
    const { code, out, said } = await solve(form(more));
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
  });
  it.each(["doubleExponential", "halfSine", "square", "samples", "faults", "discharge"])(
    "%s without what it needs is refused by name",
    async (ask) => {
      const { code, said, out } = await solve(form({ ask: { [ask]: {} } }));
      expect(code).toBe(2);
      expect(out).toBe("");
      expect(said).toContain(`/ask/${ask}`);
    },
  );
});

describe("faults, tolerance, heat and discharge", () => {
  it("answer under the name they were asked by", async () => {
    const asked = {
      faults: true,
      tolerance: { element: [0.01, 0.02], lvArm: 0.01, samples: 10 },
      heat: { temperatureCoefficient_per_K: 1e-4, thermalResistance_K_per_W: [50, 60] },
      discharge: { threshold_V: 60 },
    };
    const { code, out } = await solve(form({ ask: asked }));
    expect(code).toBe(0);
    const answer = JSON.parse(out);
    expect(Object.keys(answer)).toEqual(expect.arrayContaining(Object.keys(asked)));
    expect(answer.faults.map((row: { kind: string; element: number }) => `${row.kind} ${row.element}`)).toEqual([
      "normal 0",
      "elementOpen 1",
      "elementOpen 2",
      "elementShort 1",
      "elementShort 2",
      "lvOpen 0",
      "lvShort 0",
      "instrumentOpen 0",
    ]);
  });
});

describe("what does not exist is null", () => {
  it("no way to earth for dc: scale factor 1, no current, and the low-pass that is left", async () => {
    const { code, out } = await solve(
      form({
        lvArm: { capacitance_F: 1e-9 },
        source: { voltage_V: 6000 },
        ask: { frequencies_Hz: [0, 50], times_s: [0, 18e-3], grading: { first_F: 1e-12 } },
      }),
    );
    expect(code).toBe(0);
    const { dc, frequency, bandwidth_Hz, step, grading } = JSON.parse(out);
    expect(dc).toMatchObject({ scaleFactor: 1, outputVoltage_V: 6000, tapVoltage_V: 6000, current_A: 0, lvPower_W: 0 });
    expect(dc.inputResistance_ohm).toBeNull();
    expect(dc.elementVoltage_V).toEqual([0, 0]);
    expect(grading.capacitance_F).toEqual([null, null]);
    const x = 2 * Math.PI * 50 * 18e-3;
    expectRelative(frequency.real[0], 1, 1e-12, "dc");
    expectRelative(frequency.real[1], 1 / (1 + x * x), 1e-9, "low-pass of 18 MΩ and 1 nF");
    expectRelative(frequency.imaginary[1], -x / (1 + x * x), 1e-9, "low-pass of 18 MΩ and 1 nF");
    expectRelative(bandwidth_Hz, 1 / (2 * Math.PI * 18e-3), 1e-6, "low-pass of 18 MΩ and 1 nF");
    expectRelative(step.value[1], 1 - Math.exp(-1), 1e-6, "one time constant");
    expectRelative(step.responseTime_s, 18e-3, 1e-6, "R·C");
  });
  it("0 V is solved, scale factor and all", async () => {
    const { out } = await solve(form({ source: { voltage_V: 0 } }));
    expectRelative(JSON.parse(out).dc.scaleFactor, 1001, 1e-9, "18 MΩ over 18 kΩ, and one");
    expect(JSON.parse(out).dc.outputVoltage_V).toBe(0);
  });
  it("empty lists are answered with empty lists", async () => {
    const { code, out } = await solve(form({ ask: { frequencies_Hz: [], times_s: [] } }));
    expect(code).toBe(0);
    const answer = JSON.parse(out);
    expect(answer.frequency.real).toEqual([]);
    expect(answer.step.value).toEqual([]);
  });
  it("extremes stay finite: 5000 elements, 1e13 Ω, 1e-16 F, 1 THz", async () => {
    const elements = Array(5000).fill({ resistance_ohm: 1e13, capacitance_F: 1e-16 });
    const ask = { frequencies_Hz: [0, 1e-6, 1e12], times_s: [0, 1e-12, 1e5] };
    const { code } = await solve(
      form({ elements, strays: { toEarth_F: Array(4999).fill(1e-12) }, lvArm: { resistance_ohm: 1 }, ask }),
    );
    expect(code).toBe(0);
  });
});
