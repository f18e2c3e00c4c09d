import { fixedOf, isResistive, trimOf } from "../checks/lvArm.ts";
import type { Design } from "../job/design.ts";
import { type Result, refuse } from "../quantities/result.ts";

/** Refuses an element or an LV branch of 0 Ω as it stands: a wire divides nothing, and no figure of it exists. Null when none is. */
export function noResistance({ hvArm, lvArm }: Design): Result<never> | null {
  const element = hvArm.elements.findIndex(({ resistance_ohm }) => !(resistance_ohm > 0));
  if (element >= 0) {
    return refuse(
      `/design/hvArm/elements/${element}/resistance_ohm`,
      `Element ${element + 1} is 0 Ω: a wire is no element.`,
      "Give it a value, or leave the element out.",
    );
  }
  const branch = lvArm.branches.findIndex(
    (each) => isResistive(each) && !(fixedOf(each.series) + trimOf(each.series) > 0),
  );
  if (branch < 0) return null;
  return refuse(
    `/design/lvArm/branches/${branch}/series`,
    `LV branch ${lvArm.branches[branch]!.name} is 0 Ω as it stands: it shorts the LV arm, and no scale factor exists.`,
    "Give its resistor a value, turn its rheostat up, or leave the branch out.",
  );
}
