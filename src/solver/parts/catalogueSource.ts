import type { Source } from "../standards/source.ts";
import { catalogue } from "./catalogue.ts";

const typical = (clause: string): Source => ({
  title: "Typical of its kind",
  edition: null,
  clause,
  status: "from memory",
});

const each = (list: readonly { readonly id: string }[], clause: string): readonly (readonly [string, Source])[] =>
  list.map(({ id }) => [id, typical(clause)]);

const decides = "the data sheet of the part bought decides";

/** Where the figures of each catalogue record come from, by its id. None is a maker's. */
export const catalogueSource: Readonly<Record<string, Source>> = Object.fromEntries([
  ...each(catalogue.resistors, `resistor ratings, rated dissipation at 70 °C as IEC 60115-1 defines it; ${decides}`),
  ...each(catalogue.capacitors, `capacitor ratings; ${decides}`),
  ...each(catalogue.trimmers, `spans commonly sold; ${decides}`),
  ...each(catalogue.protectors, `strike and let-through voltages, leakage; ${decides}`),
  ...each(catalogue.instruments, "input of the function on one range; the manual of the instrument at hand decides"),
]);
