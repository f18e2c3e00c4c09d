import { cables } from "./cables.ts";
import { capacitorFamilies } from "./capacitorFamilies.ts";
import { instruments } from "./instruments.ts";
import { protectors } from "./protectors.ts";
import { resistorFamilies } from "./resistorFamilies.ts";
import { trimmers } from "./trimmers.ts";

/** The generic catalogue: no maker's parts, every figure typical and from memory. Documents copy what they use. */
export const catalogue = {
  resistors: resistorFamilies,
  capacitors: capacitorFamilies,
  trimmers,
  protectors,
  instruments,
  cables,
} as const;

type Catalogue = typeof catalogue;
type Listed = Exclude<keyof Catalogue, "cables">;

/**
 * The catalogue's record of that id; undefined where there is none.
 * @example catalogued("resistors", "film-06")?.limitingVoltage_V // 350
 */
export const catalogued = <K extends Listed>(kind: K, id: string): Catalogue[K][number] | undefined =>
  (catalogue[kind] as readonly Catalogue[K][number][]).find((each) => each.id === id);
