/** One cell of a CSV file as a number in its base unit. */
import { parseQuantity, type Refusal, type Result, type UnitName } from "../solver/index.ts";

export interface CellMeaning {
  readonly where: string;
  readonly unit: UnitName;
  /** From a bare number to the base unit. */
  readonly factor: number;
  readonly signed: boolean;
  /** The file writes its decimals with a comma. */
  readonly decimalComma: boolean;
}

/**
 * A bare number counts in the unit of its column; a number with a unit or a letter code is read as written. A mark that may stand
 * for a decimal or for thousands is asked about, never guessed; a cell that begins like a formula is text, and no number.
 */
export function cellNumber(text: string, meaning: CellMeaning): Result<number> {
  const { where, unit, factor, signed } = meaning;
  const bare = /^[-+\u2212]?[\d.,]+(?:[eE][-+]?\d+)?$/.test(text);
  const locale = meaning.decimalComma || text.includes(",") ? "comma" : "point";
  const parsed = parseQuantity(text, bare ? "1" : unit, { signed, locale });
  switch (parsed.kind) {
    case "value":
      return { ok: true, value: bare && factor !== 1 ? decimalTimes(parsed.value, factor) : parsed.value };
    case "ambiguous":
      return refused(
        where,
        parsed.why,
        `Write ${parsed.choices.map(({ label }) => unmistakable(label)).join(" or ")}.`,
      );
    case "arithmetic":
      return refused(where, `"${text.slice(0, 40)}" is a sum or a formula, not a number.`, "Write the value out.");
    case "refused":
      return refused(where, parsed.why, parsed.cure);
  }
}

/** 6.5 in mm is 0.0065 to the digit, without the last bit that a product may be off by. */
const decimalTimes = (value: number, factor: number): number => Number((value * factor).toPrecision(15));

/** Three figures after the mark would be asked about again; a fourth settles it: 1.234 → 1.2340. */
const unmistakable = (label: string): string => (/^\d{1,3}\.\d{3}$/.test(label) ? `${label}0` : label);

const refused = (where: string, why: string, cure: string): Result<never, Refusal> => ({
  ok: false,
  error: { where, why, cure },
});
