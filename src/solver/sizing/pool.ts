import type { DividerDocument } from "../job/document.ts";
import type { CapacitorFamily, Part, ResistorFamily, TrimmerFamily } from "../job/part.ts";
import { availableValues } from "../parts/availableValues.ts";
import type { LostFamily } from "./outcome.ts";

/** Parts that a search picks from: the document's own first, then the catalogue's that it does not name. */
export interface Pool {
  /** Families that strings may be made of: with parts in hand only, those that have any in hand. */
  readonly resistors: readonly ResistorFamily[];
  /** Families that the LV arm may be made of where nothing in hand does. */
  readonly allResistors: readonly ResistorFamily[];
  readonly capacitors: readonly CapacitorFamily[];
  readonly trimmers: readonly TrimmerFamily[];
}

/** The document's parts, then those of the catalogue that it does not name. */
export function poolOf(document: DividerDocument, catalogue: readonly Part[]): Pool {
  const own = new Set(document.parts.map((part) => part.id));
  const parts = [...document.parts, ...catalogue.filter((part) => !own.has(part.id))];
  const handOnly = document.brief.policy.partsInHandOnly;
  const allResistors = parts.filter((part) => part.kind === "resistor");
  return {
    resistors: allResistors.filter((part) => !handOnly || (part.inHand ?? []).some((each) => each.count > 0)),
    allResistors,
    capacitors: parts.filter((part) => part.kind === "capacitor"),
    trimmers: parts.filter((part) => part.kind === "trimmer"),
  };
}

/** A value of a family and how many of it can be had. */
export interface Offer {
  readonly value: number;
  readonly count: number;
}

/** Values of a family that can be bought, or that are in hand, ascending. */
export function offers(family: ResistorFamily, handOnly: boolean): readonly Offer[] {
  if (handOnly) {
    return [...(family.inHand ?? [])].filter((each) => each.count > 0).sort((a, b) => a.value - b.value);
  }
  return availableValues(family).map((value) => ({ value, count: Number.POSITIVE_INFINITY }));
}

/** Why a family is never put into a string, whatever the voltage; null where it may be. */
export function refusedFamily(family: ResistorFamily): LostFamily | null {
  const lost = (reason: string, unit = "1"): LostFamily => ({
    family: family.id,
    familyName: family.name,
    reason,
    actual: null,
    limit: null,
    unit,
  });
  if (/wire ?wound/i.test(family.name)) return lost("Wirewound: its inductance spoils a string.");
  if (family.use === "damping")
    return lost("For damping and surges only: tolerance and voltage effect are too large to divide with.");
  if (family.limitingVoltage_V === null) {
    return lost(
      "No limiting element voltage is stated, so its voltage cannot be judged. Type it from the data sheet.",
      "V",
    );
  }
  return null;
}
