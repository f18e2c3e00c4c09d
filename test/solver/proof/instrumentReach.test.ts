import { describe, expect, it } from "vitest";
import { bank, finding, fixed, instrument, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: scale factor 1000, 5 × 51 pF (10.2 pF), stray of 1.2 pF: C1 with strays about 10.00 pF.
const nodes = 4;
const trim = {
  id: "t",
  kind: "trimmer",
  name: "invented trimmer",
  origin: "typed",
  tolerance: 0,
  bodyLength_m: 0.01,
  bodyDiameter_m: 0.008,
  quantity: "F",
  spans: [60e-12],
  leastShare: 5 / 60,
  turns: 0.5,
  ratedVoltage_V: 200,
};
const five = {
  id: "k5",
  kind: "capacitor",
  name: "invented 5 % capacitor",
  origin: "typed",
  tolerance: 0.05,
  bodyLength_m: 0.005,
  bodyDiameter_m: 0.005,
  least_F: 1e-12,
  greatest_F: 1e-8,
  series: "E24",
  dielectric: "class1",
  dielectricClass: "class1",
  ratedVoltage_V: 100,
  temperatureCoefficient_per_K: 3e-5,
  dissipationFactor: 1e-3,
  leadInductance_H: 1e-9,
};
const trimmer = { name: "T1", part: "t", trimmer: { least_F: 5e-12, greatest_F: 60e-12, setting: 0.5 } };
const link = (pF: number, i: number) => ({
  name: `K${i}`,
  part: "k5",
  link: true,
  capacitance_F: pF * 1e-12,
  fitted: false,
});
const small: Sketch = {
  waveform: { kind: "pulse", nominal_V: 5000, statedAs: "peak", greatest_Vpeak: 5000, riseTime_s: 1e-7 },
  brief: { band_Hz: [1, 1e6] },
  elements: 5,
  resistance_ohm: 20e6,
  capacitance_F: 51e-12,
  strays: { from: "typed", toEarth_F: new Array(nodes).fill(1.2e-12 / 5) },
  instrument: { function: "scope 1 MΩ", resistance_ohm: 1e6, capacitance_F: 20e-12, capacitanceSpread_F: 3e-12 },
  branches: [fixed("R2", 111235.8), bank("C2", 9.4e-9), trimmer],
  parts: [trim, five],
};

describe("reach of links and trimmer", () => {
  it("a trimmer of 5 to 60 pF moves 10 nF by ±0.275 %, parts in tolerance ask for far more", () => {
    const { reach } = proven(small);
    const { sure } = reach!;
    const { nominal_F, least_F, greatest_F } = reach!.needs[0]!;
    expectRelative(nominal_F + 20e-12, 9.99e-9, 3e-3, "three digits given; the flattest match, the real tap counts in");
    expectRelative((60e-12 - 5e-12) / 2 / 10e-9, 0.00275, 1e-9, "three digits given");
    // Fixed capacitor of 2 %: the sure reach is empty, its upper end below the lower one.
    expect(sure.to_F).toBeLessThan(sure.from_F);
    expectRelative((greatest_F - least_F) / 2, 0.02 * 9.99e-9 + 3e-12, 5e-3, "2 % of the match and the scope's 3 pF");
    expect(finding(proven(small), "lvArm.reach")?.level).toBe("caution");
  });

  const links = (...pF: number[]) => proven({ ...small, branches: [...small.branches!, ...pF.map(link)] }).reach!;
  it("39/82/150/330/680 pF of 5 % and 55 pF of trimmer leave two holes, 39/75/150/270/470/820 none", () => {
    const holed = links(39, 82, 150, 330, 680);
    expect(holed.holes.map((hole) => Math.round(hole.link_F * 1e12))).toEqual([330, 680]);
    const [first] = holed.holes;
    expectRelative(first!.to_F - first!.from_F, 330e-12 * 1.05 - (271e-12 * 0.95 + 55e-12), 1e-9, "overlap rule");
    expect(links(39, 75, 150, 270, 470, 820).holes).toEqual([]);
  });

  it("names the links and proposes a set without a hole", () => {
    const reason = finding(
      proven({ ...small, branches: [...small.branches!, ...[39, 82, 150, 330].map(link)] }),
      "lvArm.reach",
    )!.reason;
    expect(reason).toContain("330\u2009pF link");
    expect(reason).toContain("without a hole");
  });

  it("covers every instrument of the document with its own cable and spread", () => {
    const proof = proven({
      ...small,
      branches: [
        fixed("R2", 111235.8),
        bank("C2", 8.9e-9, "k5"),
        ...[39, 75, 150, 270, 470, 820, 1500].map(link),
        trimmer,
      ],
      others: [
        instrument({ id: "near", name: "near", resistance_ohm: 1e6, capacitance_F: 20e-12 }),
        instrument({
          id: "far",
          name: "far",
          resistance_ohm: 1e6,
          capacitance_F: 20e-12,
          cable: { length_m: 20, capacitance_F_per_m: 1e-10, impedance_ohm: 50 },
        }),
      ],
    });
    const [own, near, far] = proof.reach!.needs;
    expect(proof.reach!.needs.map((need) => need.id)).toEqual(["m", "near", "far"]);
    expect(own!.principal).toBe(true);
    expectRelative(near!.nominal_F, own!.nominal_F, 3e-4, "the same input on a coarser grid of the band");
    expectRelative(near!.nominal_F - far!.nominal_F, 2e-9, 5e-3, "20 m of 100 pF/m need not be fitted");
    // The far one's 5 % of 2 nF widens its range; a spread of resistance counts for the others alone.
    expect(far!.greatest_F - far!.least_F).toBeGreaterThan(near!.greatest_F - near!.least_F + 1.9e-10);
    expect([own, near].every((need) => need!.within)).toBe(true);
    expect(far!.within).toBe(false);
    expect(finding(proof, "lvArm.reach")!.reason).toContain("far may need");
  });

  it("does not exist where neither arm holds a capacitor", () => {
    expect(proven({ elements: 4, resistance_ohm: 1e8, branches: [fixed("a", 1e6)] }).reach).toBeNull();
  });
});
