import { capacitorFamilies } from "./capacitorFamilies.ts";
import { cables, instruments } from "./instruments.ts";
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
