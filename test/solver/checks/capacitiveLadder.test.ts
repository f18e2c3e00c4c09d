import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { capacitiveLadder } from "../../../src/solver/checks/capacitiveLadder.ts";
import { expectRelative } from "../../support/relative.ts";

const uniform = (n: number, C1: number, Ce: number, Ch = 0) =>
  capacitiveLadder(new Array(n).fill(n * C1), new Array(n - 1).fill(Ce / n), new Array(n - 1).fill(Ch / n));

describe("capacitive ladder", () => {
  it("is the plain series string without strays", () => {
    const ladder = capacitiveLadder([2e-12, 3e-12, 6e-12], [0, 0], [0, 0]);
    for (const C of [ladder.transfer_F, ladder.tap_F, ladder.electrode_F]) {
      expectRelative(C, 1e-12, 1e-12, "series sum of 2, 3 and 6 pF");
    }
  });

  // Kuffel, Zaengl, Kuffel, ch. 3 (from memory), recomputed: output factor x/sinh x, input factor x·coth x, x = √(Ce/C1).
  it.each([
    [0.05, 0.9917150228004925, 1.0166113743452714],
    [0.1, 0.9835257483006861, 1.0331132065608417],
    [0.2, 0.9674283716150475, 1.065794377075495],
  ])("approaches the capacitor column with Ce/C1 = %f", (ratio, output, input) => {
    const ladder = uniform(4000, 1e-11, ratio * 1e-11);
    expectRelative(ladder.transfer_F, output * 1e-11, 1e-4, "4000 elements against the continuous column: 1/n");
    expectRelative(ladder.electrode_F, input * 1e-11, 1e-4, "4000 elements against the continuous column: 1/n");
  });

  it("gives the discrete uniform ladder's closed form", () => {
    // Invented scenario, computed independently: 24 × 470 pF, Ce 11.799 pF.
    const ladder = uniform(24, 470e-12 / 24, 11.799e-12);
    expectRelative(ladder.transfer_F, 17.75e-12, 1e-4, "figure given to six digits");
    const theta = Math.acosh(1 + 11.799e-12 / 24 / (2 * 470e-12));
    const closed = (470e-12 * Math.sinh(theta)) / Math.sinh(24 * theta);
    expectRelative(ladder.transfer_F, closed, 1e-12, "closed form C sinh θ / sinh nθ");
  });

  it("is reciprocal: the transfer from tap to electrode is the same", () => {
    const capacitance = fc.double({ min: 1e-14, max: 1e-9, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(capacitance, capacitance, capacitance), { minLength: 2, maxLength: 12 }),
        (rows) => {
          const C = rows.map((row) => row[0]);
          const earth = rows.slice(1).map((row) => row[1]);
          const forward = capacitiveLadder(C, earth, []);
          const backward = capacitiveLadder([...C].reverse(), [...earth].reverse(), []);
          expectRelative(forward.transfer_F, backward.transfer_F, 1e-9, "reciprocity");
          expect(forward.residual).toBeLessThan(1e-9);
          expect(forward.transfer_F).toBeLessThanOrEqual(Math.min(...C));
        },
      ),
    );
  });

  it("passes nothing through an open element and keeps finite", () => {
    const ladder = capacitiveLadder([1e-12, 0, 1e-12], [0, 0], [0, 0]);
    expect(ladder.transfer_F).toBe(0);
    expect(Number.isFinite(ladder.electrode_F)).toBe(true);
  });
});
