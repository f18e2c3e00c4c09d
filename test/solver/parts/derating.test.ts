import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { stressFormulas } from "../../../src/solver/checks/stressFormulas.ts";
import type { ResistorFamily } from "../../../src/solver/job/part.ts";
import { catalogued } from "../../../src/solver/parts/catalogue.ts";
import {
  criticalResistance,
  dissipationLimit,
  elementLimit,
  voltageLimit,
} from "../../../src/solver/parts/derating.ts";
import { deratingFormulas } from "../../../src/solver/parts/deratingFormulas.ts";
import { celsius, ohm } from "../../../src/solver/quantities/quantity.ts";
import { expectRelative } from "../../support/relative.ts";

const room = celsius(23);
const whole = { voltage: 1, dissipation: 1 };
const usual = { voltage: 0.6, dissipation: 0.5 };
const film = catalogued("resistors", "film-06") as ResistorFamily;
const rated = (limitingVoltage_V: number | null, ratedDissipation_W: number): ResistorFamily => ({
  ...film,
  limitingVoltage_V,
  ratedDissipation_W,
});

describe("IEC 60115-1 (ed. 4:2008 / ed. 5:2020, definitions from memory, examples computed here)", () => {
  it.each([
    [250, 0.25, 250e3],
    [3500, 0.5, 24.5e6],
  ])("%f V and %f W have their critical resistance at %f Ω", (V, P, R) => {
    expectRelative(criticalResistance(rated(V, P), room, whole), R, 1e-12, "V²/P");
  });
  it("1 W in 1 MΩ is 1000 V, where the limiting voltage is higher", () => {
    const limit = elementLimit(rated(3500, 1), ohm(1e6), room, whole)!;
    expectRelative(limit.voltage, 1000, 1e-12, "√(P·R)");
    expect(limit.ruledBy).toBe("dissipation");
  });
  it.each([
    [70, 1],
    [85, 0.8235],
    [100, 0.6471],
    [125, 0.3529],
    [155, 0],
    [200, 0],
  ])("at %f °C leaves %f of the dissipation for a line from 70 °C to 155 °C", (T, share) => {
    expectRelative(dissipationLimit(rated(350, 2), celsius(T), 0.5), share, 1e-4, "four digits, 0.5 of 2 W", 1);
  });
});

// Invented scenario, computed independently: derated to 0.6 of the voltage and 0.5 of the dissipation.
it.each([
  ["film-06", 147e3],
  ["hv-film-1", 8.82e6],
  ["hv-body-2", 81e6],
])("%s has its derated critical resistance at %f Ω", (id, R) => {
  const family = catalogued("resistors", id) as ResistorFamily;
  expectRelative(criticalResistance(family, room, usual), R, 1e-12, "closed form");
});

describe("limits of an element", () => {
  const share = fc.double({ min: 0.1, max: 1, noNaN: true });
  const value = fc.double({ min: 1, max: 12, noNaN: true }).map((power) => 10 ** power);
  it("are both kept and one is reached, on its own side of the critical resistance", () => {
    fc.assert(
      fc.property(share, share, value, fc.integer({ min: -40, max: 150 }), (voltage, dissipation, R, T) => {
        const derating = { voltage, dissipation };
        const { voltage: V, ruledBy } = elementLimit(film, ohm(R), celsius(T), derating)!;
        const [most, P] = [voltageLimit(film, voltage)!, dissipationLimit(film, celsius(T), dissipation)];
        expect(V).toBeLessThanOrEqual(most);
        expect((V * V) / R).toBeLessThanOrEqual(P * (1 + 1e-12));
        expect(ruledBy).toBe(R < criticalResistance(film, celsius(T), derating)! ? "dissipation" : "voltage");
        expectRelative(ruledBy === "voltage" ? V / most : (V * V) / R / P, 1, 1e-12, "the limit that rules");
      }),
    );
  });
  it("do not exist without a limiting voltage, and leave no voltage where no dissipation is left", () => {
    expect(voltageLimit(rated(null, 1), 0.6)).toBeNull();
    expect(elementLimit(rated(null, 1), ohm(1e6), room, usual)).toBeNull();
    expect(criticalResistance(rated(350, 1), celsius(155), usual)).toBeNull();
    expect(elementLimit(rated(350, 1), ohm(1e6), celsius(155), usual)).toEqual({ voltage: 0, ruledBy: "dissipation" });
  });
  it("refuse a derating that was never checked", () => {
    for (const wrong of [0, -0.1, 1.01, Number.NaN]) {
      expect(() => voltageLimit(film, wrong)).toThrow(RangeError);
      expect(() => dissipationLimit(film, room, wrong)).toThrow(RangeError);
    }
  });
});

it("the proof judges an element by the same figures", () => {
  const { dissipationRating, deratedDissipation, deratedVoltage, critical } = stressFormulas;
  fc.assert(
    fc.property(
      fc.double({ min: -40, max: 200, noNaN: true }),
      fc.double({ min: 0.1, max: 1, noNaN: true }),
      (T, d) => {
        const P = dissipationRating.compute({ P: 2, Tr: 70, Tz: 155, T })!;
        const mine = deratingFormulas.dissipationLimit.compute({ d, P: 2, Tr: 70, Tz: 155, T })!;
        expectRelative(mine, deratedDissipation.compute({ d, P })!, 1e-14, "same line", 1);
        const V = deratingFormulas.voltageLimit.compute({ d, Vlim: 350 })!;
        expect(V).toBe(deratedVoltage.compute({ d, Vlim: 350 }));
        const R = deratingFormulas.criticalResistance.compute({ V, P: mine });
        if (R === null) expect(critical.compute({ dv: d, Vlim: 350, P: mine })).toBeNull();
        else expectRelative(critical.compute({ dv: d, Vlim: 350, P: mine }), R, 1e-14, "same closed form");
      },
    ),
  );
});

it("every formula of this room states its inputs, its source and where it stops holding", () => {
  for (const { id, statement, inputs, holds, source } of Object.values(deratingFormulas)) {
    expect(id).toMatch(/^parts\./);
    const named = new Set([...statement.matchAll(/\{([^}]+)\}/g)].map((match) => match[1]!));
    expect([...named].sort()).toEqual(["=", ...Object.keys(inputs)].sort());
    expect(holds).toMatch(/\.$/);
    expect(source).toMatchObject({ title: "IEC 60115-1", edition: "ed. 5 (2020)", status: "from memory" });
  }
});
