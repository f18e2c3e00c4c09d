import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { LvArm, LvBranch } from "../../../src/solver/index.ts";
import { lvSetting } from "../../../src/solver/sizing/lvSetting.ts";
import { expectRelative } from "../../support/relative.ts";

const link = (pF: number): LvBranch => ({
  name: "K",
  part: "c",
  link: true,
  capacitance_F: pF * 1e-12,
  fitted: false,
});
const trimmer: LvBranch = { name: "T", part: "t", trimmer: { least_F: 5e-12, greatest_F: 60e-12, setting: 0.5 } };
const fixed: LvBranch = { name: "C", part: "c", capacitance_F: 9e-9 };
const resistor: LvBranch = { name: "R", series: [{ part: "r", resistance_ohm: 1e5 }] };
const arm = (...branches: LvBranch[]): LvArm => ({
  stays: "withDivider",
  capacitanceBy: "none",
  inductance_H: 0,
  branches,
});

/** What stands in the branches after the edits, added up by hand. */
function leftBy(lvArm: LvArm, edits: ReturnType<typeof lvSetting>["edits"]): number {
  const value = (pointer: string) => edits.find((edit) => edit.pointer === pointer)?.value;
  return lvArm.branches.reduce((sum, branch, i) => {
    if ("series" in branch) return sum;
    const fitted = value(`/design/lvArm/branches/${i}/fitted`) ?? ("link" in branch && branch.fitted);
    if ("link" in branch) return fitted ? sum + branch.capacitance_F : sum;
    if (!("trimmer" in branch)) return sum + branch.capacitance_F;
    const setting = value(`/design/lvArm/branches/${i}/trimmer/setting`) ?? branch.trimmer.setting;
    return sum + branch.trimmer.least_F + (setting as number) * (branch.trimmer.greatest_F - branch.trimmer.least_F);
  }, 0);
}

describe("setting links and trimmer", () => {
  const whole = arm(resistor, fixed, ...[39, 75, 150, 270, 470, 820].map(link), trimmer);
  it("reaches every capacitance between its ends with the set that leaves no hole", () => {
    fc.assert(
      fc.property(fc.double({ min: 9.005e-9, max: 10.884e-9, noNaN: true }), (wanted) => {
        const found = lvSetting(whole, wanted);
        expect(found.missing_F).toBe(0);
        expectRelative(leftBy(whole, found.edits), wanted, 1e-9, "sum of what the edits leave fitted");
      }),
    );
  });

  it("goes to its end and says what is missing where it does not reach", () => {
    const high = lvSetting(whole, 12e-9);
    expectRelative(high.missing_F, 12e-9 - 10.884e-9, 1e-6, "9 nF, six links and 60 pF");
    const low = lvSetting(whole, 8e-9);
    expectRelative(low.missing_F, 8e-9 - 9.005e-9, 1e-6, "9 nF and 5 pF are the least");
  });

  it("takes the nearest edge of a hole", () => {
    const holed = arm(fixed, link(330), trimmer);
    const found = lvSetting(holed, 9.1e-9);
    expectRelative(found.missing_F, 40e-12, 1e-6, "9.06 nF is reached, 9.335 nF is next");
  });

  it("sets many links from the largest down", () => {
    const many = arm(fixed, ...Array.from({ length: 14 }, (_, i) => link(30 * 1.3 ** (13 - i))), trimmer);
    const found = lvSetting(many, 9.9e-9);
    expect(found.missing_F).toBe(0);
    expectRelative(leftBy(many, found.edits), 9.9e-9, 1e-9, "sum of what the edits leave fitted");
  });
});
