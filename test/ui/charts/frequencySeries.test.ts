import { describe, expect, it } from "vitest";
import { magnitudeAxis, unwrapped } from "../../../src/ui/charts/frequencySeries.ts";
import { inventedResponse } from "../../support/inventedProof.ts";

describe("frequency response before it is drawn", () => {
  it("has its phase in one line where the numbers jump by a turn", () => {
    expect(unwrapped([-90, -170, 170, 100, 175, -175])).toEqual([-90, -170, -190, -260, -185, -175]);
  });

  it("closes in on a response that never falls to −3 dB, and keeps the −3 dB point of one that does", () => {
    const flat = { ...inventedResponse, magnitude_dB: inventedResponse.magnitude_dB.map(() => -0.02) };
    expect(magnitudeAxis("dB", flat, 0.01, [0, 1e6])!.domain[0]).toBeGreaterThan(-0.5);
    expect(magnitudeAxis("dB", inventedResponse, 0.01, [0, 1e6])!.domain[0]).toBeLessThan(-3);
  });
});
