import type { CapacitorFamily, InHand, ResistorFamily } from "../job/part.ts";
import { valuesInHand } from "./availableValues.ts";

/**
 * The family with what was found in the drawer added to what it already lists: values ascending, each once with its whole count.
 * @example withInHand(family, [{ value: 10e6, count: 20 }])
 */
export function withInHand<F extends ResistorFamily | CapacitorFamily>(family: F, found: readonly InHand[]): F {
  const all = { ...family, inHand: [...(family.inHand ?? []), ...found] };
  return { ...family, inHand: valuesInHand(all) };
}

/** Whether a family is sold in this value at all, its ends included. */
export function withinRange(family: ResistorFamily | CapacitorFamily, value: number): boolean {
  const [least, greatest] =
    family.kind === "resistor" ? [family.least_ohm, family.greatest_ohm] : [family.least_F, family.greatest_F];
  return value >= least * (1 - 1e-9) && value <= greatest * (1 + 1e-9);
}
