import { expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { expectRelative } from "../support/relative.ts";

/** A document as one writes it by hand: no ratings but the needed ones, no names, a trimmer and a link without a part. */
const byHand = {
  format: "stringwright",
  version: 1,
  name: "by hand",
  brief: {
    waveform: {
      kind: "dc",
      nominal_V: 6000,
      statedAs: "dc",
      greatest_Vpeak: 0,
      frequency_Hz: 0,
      riseTime_s: 0,
      width_s: 0,
      repetition_Hz: 0,
    },
    scaleFactor: 1000,
    wantedUncertainty: 0.03,
    band_Hz: [0, 0],
    source: {
      resistance_ohm: 220000,
      capacitance_F: 0,
      currentLimit_A: 0,
      earth: "oneSide",
      mainsConnected: false,
    },
    surroundings: {
      altitude_m: 0,
      ambient_degC: 23,
      relativeHumidity: 0.5,
      pollutionDegree: 2,
      materialGroup: "IIIa",
      wallDistance_m: 1,
    },
    policy: {
      voltageDerating: 0.6,
      powerDerating: 0.5,
      series: "E24",
      partsInHandOnly: false,
    },
  },
  parts: [
    {
      id: "r1",
      kind: "resistor",
      origin: "catalogue",
      limitingVoltage_V: 1000,
      ratedDissipation_W: 0.5,
      tolerance: 0.01,
    },
  ],
  instruments: [
    {
      id: "meter",
      function: "meter dc",
      range_V: 60,
      resistance_ohm: 10000000,
      resistanceSpread: 0.02,
      capacitance_F: 1e-10,
      capacitanceSpread_F: 0,
      greatestInput_Vpeak: 1000,
      cable: {
        length_m: 1,
        capacitance_F_per_m: 1e-10,
        impedance_ohm: 50,
      },
    },
  ],
  principal: "meter",
  design: {
    follows: false,
    hvArm: {
      strings: 1,
      elements: new Array(12).fill({ part: "r1", resistance_ohm: 1e8 }),
    },
    lvArm: {
      stays: "withDivider",
      branches: [
        {
          name: "R2a",
          series: [
            {
              part: "r1",
              resistance_ohm: 1365188,
            },
          ],
        },
        {
          name: "T1",
          trimmer: {
            least: 5e-12,
            greatest: 6e-11,
            setting: 0.5,
          },
        },
        {
          name: "K1",
          link: true,
          capacitance_F: 1e-10,
          fitted: true,
        },
      ],
    },
    strays: {
      from: "typed",
      toEarth_F: [],
      toElectrode_F: [],
      electrodeToTap_F: 0,
    },
  },
};

const shell = async (...words: string[]) => {
  let out = "";
  let said = "";
  const code = await run(words, {
    read: () => JSON.stringify(byHand),
    print: (text) => {
      out += text;
    },
    say: (text) => {
      said += text;
    },
  });
  return { code, out, said };
};

it("proves a document written by hand, and says what is not chosen", async () => {
  const { code, out } = await shell("prove", "hand.json");
  expect(code).toBe(0);
  const proof = JSON.parse(out);
  expectRelative(proof.scaleFactor.predicted, 1000, 1e-6, "the LV arm is given to seven digits");
  expect(proof.job).toBe("6.00\u2009kV dc, into meter dc, within 3 %");
  expect(proof.findings.find((each: { id: string }) => each.id === "lvArm.partNotChosen")?.level).toBe("caution");
  expect(proof.assumed.length).toBeGreaterThan(10);
});

it("lists its parts, naming what is not chosen yet", async () => {
  const { code, out } = await shell("parts", "hand.json");
  expect(code).toBe(0);
  expect(out).toMatch(/LV arm,part not chosen yet,"60.0\u2009pF"/);
  expect(out).toMatch(/HV arm,r1,/);
});
