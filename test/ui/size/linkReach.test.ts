import { describe, expect, it } from "vitest";
import type { LvBranch } from "../../../src/solver/index.ts";
import { linkReach, outOfReach } from "../../../src/ui/size/linkReach.ts";
import { expectRelative } from "../../support/relative.ts";

const lvArm = (branches: readonly LvBranch[]) =>
  ({ stays: "withDivider", capacitanceBy: "flattest", inductance_H: 0, branches }) as const;
const link = (capacitance_F: number): LvBranch => ({ name: "K", part: "c", link: true, capacitance_F, fitted: false });
const trimmer: LvBranch = { name: "T", part: "t", trimmer: { least_F: 10e-12, greatest_F: 60e-12, setting: 0.5 } };
const fixed: LvBranch = { name: "C", part: "c", capacitance_F: 1e-9 };

describe("reach of links and trimmer", () => {
  it("is one stretch where each link is no wider than the trimmer's span", () => {
    const reach = linkReach(lvArm([fixed, link(47e-12), trimmer]));
    expect(reach).toHaveLength(1);
    expect(outOfReach(reach, 1.1e-9)).toBe(0);
  });

  it("has a hole where a link is wider, and tells by how much a match is missed", () => {
    const reach = linkReach(lvArm([fixed, link(100e-12), trimmer]));
    expect(reach).toHaveLength(2);
    expectRelative(outOfReach(reach, 1.085e-9), 25e-12, 1e-6, "difference of two near numbers in double");
  });

  it("does not exist for an LV arm of resistors alone", () => {
    expect(linkReach(lvArm([{ name: "R2a", series: [] }]))).toEqual([]);
  });
});
