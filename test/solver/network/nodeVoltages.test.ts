import { describe, expect, it } from "vitest";
import { scaleFactorOf } from "../../../src/solver/network/dcSolution.ts";
import { elementVoltages } from "../../../src/solver/network/elementVoltages.ts";
import { nodeVoltages } from "../../../src/solver/network/nodeVoltages.ts";
import { sweep } from "../../../src/solver/network/sweep.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

/** 37 frequencies: two whole blocks and a part of one. */
const frequencies = Float64Array.from({ length: 37 }, (_, i) => 10 ** (i / 4 - 1));

describe("the voltage of every node", () => {
  it.each([1, 2, 7, 40])("%i elements: node by node the element voltages of the other elimination", (n) => {
    const random = seeded(n);
    for (let round = 0; round < 5; round++) {
      const network = { ...randomNetwork(random, n), electrodeToTap_F: 1e-13 * random() };
      const { re, im } = nodeVoltages(network, frequencies);
      const other = elementVoltages(network, frequencies, 1);
      frequencies.forEach((_, f) => {
        const at = (i: number) => (i === n ? [1, 0] : [re[f * n + i]!, im[f * n + i]!]);
        expectRelative(Math.hypot(at(0)[0]!, at(0)[1]!), other.tapVoltage_V[f]!, 1e-10, "the tap, two eliminations");
        for (let i = 0; i < n; i++) {
          const difference = Math.hypot(at(i + 1)[0]! - at(i)[0]!, at(i + 1)[1]! - at(i)[1]!);
          expect(Math.abs(difference - other.elementVoltage_V[f]![i]!)).toBeLessThan(1e-12);
        }
      });
    }
  });
  it("a bare compensated string shares by its elements at every frequency", () => {
    const network = sketch({ n: 10, R: 1e6, C: 1e-10, R2: 1e4, C2: 1e-8 });
    const { re, im } = nodeVoltages(network, frequencies);
    frequencies.forEach((_, f) => {
      for (let i = 0; i < 10; i++) {
        expectRelative(re[f * 10 + i]!, (1 + 100 * i) / 1001, 1e-12, "resistive and capacitive sharing are one");
        expect(Math.abs(im[f * 10 + i]!)).toBeLessThan(1e-15);
      }
    });
  });
  it("its tap is the sweep's output", () => {
    const network = randomNetwork(seeded(5), 12);
    const plain = { ...network, seriesProtector: { resistance_ohm: 0, at: "instrument" as const } };
    const { re } = nodeVoltages(plain, frequencies);
    const H = sweep(plain, frequencies)!;
    const F = scaleFactorOf(plain, "electrode")!;
    frequencies.forEach((_, f) => {
      expect(Math.abs(re[f * 12]! * F - H.real[f]!)).toBeLessThan(1e-11 * Math.max(1, Math.abs(H.real[f]!)));
    });
  });
});
