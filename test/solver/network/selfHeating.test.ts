/** Invented networks; against closed forms, and against plain iteration of the dc answer from cold. */
import { describe, expect, it } from "vitest";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import type { HeatAsk } from "../../../src/solver/network/networkForm.ts";
import { selfHeating } from "../../../src/solver/network/selfHeating.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

interface Given {
  alpha?: number | number[];
  kv?: number | number[];
  Rth?: number | number[];
  ambient?: number;
  lvAlpha?: number;
  lvKv?: number;
  lvRth?: number;
}

function heat(n: number, given: Given): HeatAsk {
  const each = (value: number | number[] | undefined) =>
    typeof value === "object" ? value : new Array<number>(n).fill(value ?? 0);
  return {
    temperatureCoefficient_per_K: each(given.alpha),
    voltageCoefficient_per_V: each(given.kv),
    thermalResistance_K_per_W: each(given.Rth),
    ambientRise_K: given.ambient ?? 0,
    lvTemperatureCoefficient_per_K: given.lvAlpha ?? 0,
    lvVoltageCoefficient_per_V: given.lvKv ?? 0,
    lvThermalResistance_K_per_W: given.lvRth ?? 0,
  };
}

const behind = (network: LadderNetwork, resistance_ohm: number): LadderNetwork => ({
  ...network,
  source: { ...network.source, resistance_ohm, damping_ohm: resistance_ohm / 10 },
});

/** Each resistance from the last state's power and voltage, over and over, half a step at a time. */
function iterated(network: LadderNetwork, voltage: number, ask: HeatAsk): LadderNetwork {
  let now = network;
  for (let round = 0; round < 400; round++) {
    const dc = dcSolution(now, voltage)!;
    const next = network.resistance_ohm.map((R, i) => {
      const warmth = ask.ambientRise_K + dc.elementPower_W[i]! * ask.thermalResistance_K_per_W[i]!;
      const changed =
        1 +
        ask.temperatureCoefficient_per_K[i]! * warmth +
        ask.voltageCoefficient_per_V[i]! * Math.abs(dc.elementVoltage_V[i]!);
      return (now.resistance_ohm[i]! + R * changed) / 2;
    });
    const lvWarmth = ask.ambientRise_K + dc.lvPower_W * ask.lvThermalResistance_K_per_W;
    const lvChanged =
      1 + ask.lvTemperatureCoefficient_per_K * lvWarmth + ask.lvVoltageCoefficient_per_V * Math.abs(dc.tapVoltage_V);
    now = {
      ...network,
      resistance_ohm: next,
      lv: { ...network.lv, resistance_ohm: (now.lv.resistance_ohm + network.lv.resistance_ohm * lvChanged) / 2 },
    };
  }
  return now;
}

describe("self-heating", () => {
  it("without coefficients is the linear answer to the last digit", () => {
    const random = seeded(2);
    for (let trial = 0; trial < 20; trial++) {
      const network = behind(randomNetwork(random, 1 + Math.floor(random() * 30)), 1e5 * random());
      const dc = dcSolution(network, -8000)!;
      expect(selfHeating(network, -8000, heat(network.n, { Rth: 50, lvRth: 50, ambient: 30 }))).toEqual({
        scaleFactor: dc.scaleFactor,
        relativeShift: 0,
        resistance_ohm: Array.from(network.resistance_ohm),
        lvResistance_ohm: network.lv.resistance_ohm,
        elementVoltage_V: dc.elementVoltage_V,
        elementPower_W: dc.elementPower_W,
        temperatureRise_K: dc.elementPower_W.map((P) => P * 50),
      });
    }
  });
  it("agrees with plain iteration from cold", () => {
    const random = seeded(4);
    const about = (size: number) => size * (2 * random() - 1);
    for (let trial = 0; trial < 40; trial++) {
      const drawn = randomNetwork(random, 1 + Math.floor(random() * 8));
      const network = behind(drawn, trial % 2 === 0 ? 0 : 1e6);
      const voltage = trial % 3 === 0 ? -500 : 3000;
      const cold = dcSolution(network, voltage)!;
      // Rises of up to 200 K by the cold power, so that the coefficients are felt.
      const ask = heat(network.n, {
        alpha: Array.from(network.resistance_ohm, () => about(8e-4)),
        kv: Array.from(cold.elementVoltage_V, (V) => about(0.1) / Math.abs(V)),
        Rth: Array.from(cold.elementPower_W, (P) => (200 * random()) / P),
        ambient: about(40),
        lvAlpha: about(8e-4),
        lvKv: about(0.1) / Math.abs(cold.tapVoltage_V),
        lvRth: (200 * random()) / cold.lvPower_W,
      });
      const found = selfHeating(network, voltage, ask)!;
      const hot = iterated(network, voltage, ask);
      const dc = dcSolution(hot, voltage)!;
      expectRelative(found.scaleFactor, dc.scaleFactor, 1e-10, "plain iteration");
      expectRelative(found.lvResistance_ohm, hot.lv.resistance_ohm, 1e-10, "plain iteration");
      const shift = dc.scaleFactor / cold.scaleFactor - 1;
      expectRelative(found.relativeShift, shift, 1e-10, "plain iteration", 1);
      dc.elementVoltage_V.forEach((V, i) => {
        expectRelative(found.elementVoltage_V[i], V, 1e-10, "plain iteration");
        expectRelative(found.resistance_ohm[i], hot.resistance_ohm[i]!, 1e-10, "plain iteration");
        expectRelative(
          found.temperatureRise_K[i],
          dc.elementPower_W[i]! * ask.thermalResistance_K_per_W[i]!,
          1e-10,
          "P·Rth",
        );
      });
    }
  });
  it("keeps the digits of a shift of parts in 1e12", () => {
    const network = sketch({ n: 10, R: 1e8, R2: 1e5 });
    const found = selfHeating(network, 1000, heat(10, { alpha: 1e-9, Rth: 1 }))!;
    const P = (1000 / (1e9 + 1e5)) ** 2 * 1e8;
    expectRelative(
      found.relativeShift,
      1e-9 * P * (1e9 / (1e9 + 1e5)),
      1e-9,
      "first order: α P of every element, string over whole",
    );
  });
  it("of a lone LV arm driven by a current is R0/(1 − R0 α Rth I²)", () => {
    const network = sketch({ n: 1, R: 1e9, R2: 1e5 });
    for (const lvAlpha of [2e-3, -2e-3]) {
      const found = selfHeating(network, 1e6, heat(1, { lvAlpha, lvRth: 1000 }))!;
      const I = found.elementVoltage_V[0]! / 1e9;
      expectRelative(found.lvResistance_ohm, 1e5 / (1 - 1e5 * lvAlpha * 1000 * I * I), 1e-12, "its own power");
      expectRelative(found.scaleFactor, 1 + 1e9 / found.lvResistance_ohm!, 1e-12, "two resistances");
    }
  });
  it("runs away where the branch from cold turns back: V = R0/(2 √|R0 α Rth|) for a lone falling element", () => {
    const network = sketch({ n: 1, R: 1e6, R2: 1e-3 });
    const turn = 1e6 / (2 * Math.sqrt(1e6 * 1e-3 * 100));
    const found = selfHeating(network, turn * (1 - 1e-6), heat(1, { alpha: -1e-3, Rth: 100 }))!;
    expectRelative(found.resistance_ohm[0], 5e5, 3e-3, "half of the cold resistance at the turn, reached as a root");
    expect(selfHeating(network, turn * (1 + 1e-6), heat(1, { alpha: -1e-3, Rth: 100 }))).toBeNull();
    // Behind a resistance as great as its own the element never turns.
    expect(selfHeating(behind(network, 1e6), 10 * turn, heat(1, { alpha: -1e-3, Rth: 100 }))).not.toBeNull();
  });
  it("stays on the branch from cold where a hotter state exists too", () => {
    // Behind R0/100 the falling element has three states below the turn; the first is the cold one.
    const network = behind(sketch({ n: 1, R: 1e6, R2: 1e-3 }), 1e4 / 1.1);
    const turn = 1e6 / (2 * Math.sqrt(1e6 * 1e-3 * 100));
    const found = selfHeating(network, turn * 0.9, heat(1, { alpha: -1e-3, Rth: 100 }))!;
    expect(found.resistance_ohm[0]).toBeGreaterThan(5e5);
    expect(selfHeating(network, turn * 1.2, heat(1, { alpha: -1e-3, Rth: 100 }))).toBeNull();
  });
  it("rising coefficients always settle, 400 unlike elements at once", () => {
    const random = seeded(9);
    const network = randomNetwork(random, 400);
    const ask = heat(400, {
      alpha: Array.from({ length: 400 }, () => 1e-2 * random()),
      Rth: 1e4,
      kv: 1e-4,
      lvAlpha: 1e-2,
      lvRth: 1e4,
    });
    const found = selfHeating(network, 1e6, ask)!;
    found.resistance_ohm.forEach((R, i) => {
      const own =
        1 + ask.temperatureCoefficient_per_K[i]! * found.temperatureRise_K[i]! + 1e-4 * found.elementVoltage_V[i]!;
      expectRelative(R, network.resistance_ohm[i]! * own, 1e-11, "its own temperature and voltage");
    });
  });
  it("surroundings that leave no resistance: nothing; a blocked string: cold", () => {
    expect(selfHeating(sketch({ n: 1, R: 1e6, R2: 1e3 }), 1, heat(1, { alpha: -0.1, ambient: 10 }))).toBeNull();
    const found = selfHeating(
      sketch({ n: 2, R: [1e6, Number.POSITIVE_INFINITY], C: 1e-12, R2: 1e3 }),
      100,
      heat(2, { alpha: 1e-3, ambient: 10, Rth: 5 }),
    )!;
    expect(found.scaleFactor).toBeNull();
    expectRelative(found.resistance_ohm[0], 1.01e6, 1e-12, "ten kelvin");
    expect(found.resistance_ohm[1]).toBeNull();
    expect(found.elementVoltage_V).toEqual([0, 100]);
    expect(found.temperatureRise_K).toEqual([0, 0]);
  });
});
