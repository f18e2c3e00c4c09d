import { describe, expect, it } from "vitest";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import type { LadderNetwork, Line } from "../../../src/solver/network/ladderNetwork.ts";
import { lumpedCable } from "../../../src/solver/network/lumpedCable.ts";
import { sweep } from "../../../src/solver/network/sweep.ts";
import { expectRelative } from "../../support/relative.ts";
import { sketch } from "./invented.ts";

const open: Line = {
  impedance_ohm: 50,
  delay_s: 5e-9,
  seriesAtTap_ohm: 0,
  terminationAtEnd_ohm: Number.POSITIVE_INFINITY,
};
const networks = (Rs: number, at: "divider" | "instrument"): [string, LadderNetwork][] =>
  (
    [
      ["open", open],
      ["matched at the tap", { ...open, seriesAtTap_ohm: 50 }],
      ["terminated", { ...open, terminationAtEnd_ohm: 50 }],
    ] as const
  ).map(([name, line]) => {
    const base = sketch({ n: 3, R: 1e5, C: 30e-12, Ce: 1e-12, R2: 300, C2: 9e-9, Rm: 1e6, Cm: 18e-12, Rs, at });
    return [name, { ...base, cable: { capacitance_F: 0, line } }];
  });

describe("a cable as a lump in place of a line", () => {
  it.each([...networks(0, "instrument"), ...networks(200, "divider"), ...networks(200, "instrument")])(
    "%s: the same at dc, and at frequencies slow against its delay",
    (_, network) => {
      const lump = lumpedCable(network);
      expect(lump.cable.line).toBeNull();
      expectRelative(dcSolution(lump, 1)!.scaleFactor, dcSolution(network, 1)!.scaleFactor, 1e-12, "dc");
      const f = [1e2, 1e3, 1e4];
      const [a, b] = [sweep(lump, f)!, sweep(network, f)!];
      f.forEach((__, k) => {
        expectRelative(a.real[k], b.real[k]!, 1e-4, "ωT is 3e-4 at 10 kHz; its square times the mismatch is left", 1);
        expectRelative(a.imaginary[k], b.imaginary[k]!, 3.2e-3, "ωT is 3e-4 at 10 kHz", 1);
      });
    },
  );
  it("terminated, keeps its magnitude to where its delay begins to turn the phase", () => {
    const [, network] = networks(0, "instrument")[2]!;
    const size = (of: LadderNetwork) => {
      const { real, imaginary } = sweep(of, [1e6])!;
      return Math.hypot(real[0]!, imaginary[0]!);
    };
    expectRelative(
      size(lumpedCable(network)),
      size(network),
      1e-3,
      "ωT is 0.03; only the instrument's capacitance is off",
    );
  });
  it("leaves a network without a line as it is", () => {
    const network = sketch({ n: 1, R: 1e5, C: 1e-12, R2: 300, C2: 1e-9 });
    expect(lumpedCable(network)).toBe(network);
  });
});
