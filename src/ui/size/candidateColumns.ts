import { type Candidate, formatShare } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { stringName } from "./candidateText.ts";

/** One column of the table of candidates: what it shows and what it sorts by. */
export interface CandidateColumn {
  readonly id: string;
  readonly head: string;
  readonly title: string;
  readonly number: boolean;
  readonly show: (c: Candidate) => string;
  readonly by: (c: Candidate) => number | string;
  /** Better is greater: sorts downwards at the first press. */
  readonly greaterFirst?: boolean;
}

const column = (
  id: string,
  head: string,
  title: string,
  by: (c: Candidate) => number | string,
  show: (c: Candidate) => string,
  greaterFirst = false,
): CandidateColumn => ({ id, head, title, number: id !== "family" && id !== "governing", by, show, greaterFirst });

export const candidateColumns: readonly CandidateColumn[] = [
  column(
    "rank",
    "rank",
    "order of the search",
    (c) => c.rank,
    (c) => String(c.rank),
  ),
  column(
    "family",
    "family",
    "resistor family",
    (c) => c.familyName,
    (c) => c.familyName,
  ),
  column("build", "string", "elements in series × value of each", (c) => c.elements, stringName),
  column(
    "strings",
    "strings",
    "equal strings in parallel",
    (c) => c.strings,
    (c) => String(c.strings),
  ),
  column(
    "r1",
    "R1",
    "HV arm resistance",
    (c) => c.hvArmResistance_ohm,
    (c) => withUnit(c.hvArmResistance_ohm, "ohm", 3),
  ),
  column(
    "count",
    "elements",
    "elements in all strings",
    (c) => c.elementCount,
    (c) => String(c.elementCount),
  ),
  column(
    "length",
    "length",
    "column length",
    (c) => c.columnLength_m,
    (c) => withUnit(c.columnLength_m, "m", 3),
  ),
  column(
    "u",
    "± (k = 2)",
    "uncertainty from parts",
    (c) => c.partsUncertainty,
    (c) => formatShare(c.partsUncertainty, 2),
  ),
  column(
    "sag",
    "sag",
    "sag of the source",
    (c) => c.loading,
    (c) => formatShare(c.loading, 2),
  ),
  column(
    "margin",
    "margin",
    "smallest margin to a derated limit",
    (c) => c.smallestMargin,
    (c) => formatShare(c.smallestMargin, 2),
    true,
  ),
  column(
    "parts",
    "kinds",
    "different parts",
    (c) => c.differentParts,
    (c) => String(c.differentParts),
  ),
  column(
    "governing",
    "governed by",
    "what decided its size",
    (c) => c.governing,
    (c) => c.governing,
  ),
];

export interface Order {
  readonly id: string;
  readonly down: boolean;
}

/** Sorted by one column; equal ones stay in the order of the search. */
export function sorted(candidates: readonly Candidate[], order: Order): readonly Candidate[] {
  const by = candidateColumns.find((c) => c.id === order.id)?.by ?? ((c: Candidate) => c.rank);
  const sign = order.down ? -1 : 1;
  return [...candidates].sort((a, b) => {
    const [x, y] = [by(a), by(b)];
    const less = typeof x === "string" && typeof y === "string" ? x.localeCompare(y, "en") : Number(x) - Number(y);
    return sign * less || a.rank - b.rank;
  });
}
