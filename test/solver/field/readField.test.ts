import { describe, expect, it } from "vitest";
import { readField } from "../../../src/solver/field/readField.ts";
import { shapeFault } from "../../../src/solver/field/shapeFault.ts";
import { column, disc, drawn, sphere, toroid } from "./invented.ts";

const bands = { idealisation: "bands" } as const;
const film = { idealisation: "distributed" } as const;
const base = (more: object) => column(20, 0.5, 10, 0.3, more);

describe("a shape that cannot stand", () => {
  it.each<[string, object, string, RegExp]>([
    ["a sphere thinner than the column", { electrode: sphere(0.02) }, "/electrode/radius_m", /falls into/],
    ["a disc thinner than the column", { electrode: disc(0.02, 0.01) }, "/electrode/radius_m", /narrower/],
    ["a disc thicker than wide", { electrode: disc(0.05, 0.2) }, "/electrode/thickness_m", /thicker/],
    ["a toroid without a hole", { electrode: toroid(0.05, 0.05) }, "/electrode/tubeRadius_m", /hole/],
    ["a toroid through the column", { electrode: toroid(0.04, 0.02, -0.1) }, "/electrode", /cuts into/],
    ["a toroid in the floor", { electrode: toroid(0.2, 0.05, -0.62) }, "/electrode/offset_m", /floor/],
    ["a box up to the foot", { box: { radius_m: 0.1, top_m: 0.15 } }, "/box/top_m", /foot/],
    ["a shield inside the column", { shield: { radius_m: 0.02, from_m: 0.1, to_m: 0.2 } }, "/shield/radius_m", /wider/],
    ["a shield upside down", { shield: { radius_m: 0.1, from_m: 0.3, to_m: 0.2 } }, "/shield/to_m", /below/],
    [
      "a shield inside the box",
      { shield: { radius_m: 0.05, from_m: 0.02, to_m: 0.08 }, box: { radius_m: 0.1, top_m: 0.1 } },
      "/shield/to_m",
      /inside the box/,
    ],
    [
      "a shield along the box",
      { shield: { radius_m: 0.1, from_m: 0.02, to_m: 0.3 }, box: { radius_m: 0.1, top_m: 0.1 } },
      "/shield/from_m",
      /side of the box/,
    ],
    [
      "a shield through a sphere",
      { electrode: sphere(0.1), shield: { radius_m: 0.05, from_m: 0.1, to_m: 0.7 } },
      "/shield",
      /meets/,
    ],
    [
      "a shield through a disc",
      { electrode: disc(0.2, 0.02), shield: { radius_m: 0.1, from_m: 0.1, to_m: 0.66 } },
      "/shield",
      /meets/,
    ],
    [
      "a shield through a toroid",
      { electrode: toroid(0.1, 0.02), shield: { radius_m: 0.1, from_m: 0.1, to_m: 0.65 } },
      "/shield",
      /meets/,
    ],
    [
      "a toroid low in a box",
      { electrode: toroid(0.1, 0.02, -0.55), box: { radius_m: 0.2, top_m: 0.12 } },
      "/box",
      /meets/,
    ],
    ["a wall through the electrode", { electrode: sphere(0.3), wallDistance_m: 0.3 }, "/wallDistance_m", /inside/],
    ["an HV wire as thick as the column", { wire: { radius_m: 0.025, length_m: 1 } }, "/wire/radius_m", /wide/],
  ])("%s", (_, more, where, why) => {
    const fault = shapeFault(base(more), bands);
    expect(fault?.where).toBe(where);
    expect(fault?.why).toMatch(why);
  });
  it.each(drawn)("is not: %s", (_, geometry) => {
    expect(shapeFault(geometry, bands)).toBeNull();
    expect(shapeFault(geometry, film)).toBeNull();
  });
  it("is not: a tall shield round sphere and column, a shield above the box's rim, a toroid that rests on the rim", () => {
    expect(
      shapeFault(base({ electrode: sphere(0.1), shield: { radius_m: 0.12, from_m: 0, to_m: 2 } }), bands),
    ).toBeNull();
    const onRim = { shield: { radius_m: 0.1, from_m: 0.1, to_m: 0.3 }, box: { radius_m: 0.1, top_m: 0.1 } };
    expect(shapeFault(base(onRim), bands)).toBeNull();
    expect(shapeFault(base({ electrode: toroid(0.045, 0.03, 0.025) }), bands)).toBeNull();
  });
  it("of a graded film is a toroid that covers some of it", () => {
    const electrode = toroid(0.045, 0.03, 0.02);
    expect(shapeFault(base({ electrode }), bands)).toBeNull();
    expect(shapeFault(base({ electrode }), film)?.where).toBe("/electrode");
  });
});

describe("the form", () => {
  const geometry = { elements: 4, columnDiameter_m: 0.03, columnLength_m: 0.5, footHeight_m: 0.15 };
  it("takes what is missing as absent", () => {
    const read = readField({ format: "stringwright-field", version: 1, geometry });
    expect(read).toMatchObject({
      ok: true,
      value: {
        geometry: { bandFraction: 0.4, electrode: { kind: "none" }, shield: null, box: null, wallDistance_m: null },
        ask: { idealisation: "bands", resolution: 1, wall: "round" },
      },
    });
  });
});
