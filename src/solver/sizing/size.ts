import type { DividerDocument } from "../job/document.ts";
import { catalogue } from "../parts/catalogue.ts";
import type { Result } from "../quantities/result.ts";
import type { Sizing } from "./outcome.ts";
import { sizeFrom } from "./sizeFrom.ts";

const parts = [...catalogue.resistors, ...catalogue.capacitors, ...catalogue.trimmers];

/**
 * From the brief to the resistance window, the ranked candidates and why every other family lost. Every resistor family in
 * every value sold, 1 to 4 strings and 1 to 5000 elements is decided; what is dropped is no better in anything than
 * something else. LV arm, compensation and geometry are worked out for the candidates listed. Refused, with where and a
 * cure, where the brief cannot be searched with or no resistor is left to choose from.
 * @param options.top how many candidates are listed, 1 or more
 * @example size(document, { top: 10 })
 */
export const size = (document: DividerDocument, options: { readonly top: number }): Result<Sizing> =>
  sizeFrom(document, parts, options.top);
