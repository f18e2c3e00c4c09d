/** What a search answers: the resistance window, the ranked candidates and why every other family lost. Plain data. */
import type { Design } from "../job/design.ts";
import type { Part } from "../job/part.ts";
import type { Cure, Finding } from "../standards/finding.ts";
import type { SheetData } from "../standards/sheet.ts";

/** One named bound of R1. Its number stands in the sheet at `path`. */
export interface Bound {
  readonly id:
    | "sourceSag"
    | "dissipation"
    | "currentLimit"
    | "leakage"
    | "leastCurrent"
    | "existence"
    | "instrumentShare"
    | "lvArmValue"
    | "band"
    | "lvPole";
  /** Plain name: "source sag". */
  readonly name: string;
  readonly side: "atLeast" | "atMost";
  /** null: this bound does not apply (its reason says why). */
  readonly resistance_ohm: number | null;
  readonly reason: string;
  readonly path: string;
}

export interface ResistanceWindow {
  readonly bounds: readonly Bound[];
  /** Largest lower bound and smallest upper bound; null: none applies. */
  readonly least_ohm: number | null;
  readonly greatest_ohm: number | null;
  readonly leastBy: Bound["id"] | null;
  readonly greatestBy: Bound["id"] | null;
  /** false: the two bounds collide; `cures` has the cheapest ways to part them. */
  readonly open: boolean;
  readonly collision: string | null;
  readonly cures: readonly Cure[];
}

/** The six figures a candidate is judged on, and what it is. */
export interface Candidate {
  readonly rank: number;
  readonly family: string;
  readonly familyName: string;
  readonly resistance_ohm: number;
  readonly elements: number;
  readonly strings: number;
  readonly hvArmResistance_ohm: number;
  /** elements × strings. */
  readonly elementCount: number;
  readonly columnLength_m: number;
  /** Scale-factor uncertainty from parts, relative, k = 2, lot term in. */
  readonly partsUncertainty: number;
  /** Sag at the source, relative. */
  readonly loading: number;
  /** Smallest of all margins to derated limits, 0 … 1. */
  readonly smallestMargin: number;
  readonly differentParts: number;
  readonly elementVoltage_Vrms: number;
  readonly elementVoltage_Vpeak: number;
  readonly elementDissipation_W: number;
  readonly governing: string;
  /** Ids of the stops that would stand. */
  readonly stops: readonly string[];
  /** What the search found on the way: stops and cautions of LV arm, compensation, insulation tables; none that is clear. */
  readonly findings: readonly Finding[];
  readonly design: Design;
  /** Every part that the design names, ratings copied in. */
  readonly parts: readonly Part[];
}

/** Why a family gave no candidate, or none that survived: the reason with its number. */
export interface LostFamily {
  readonly family: string;
  readonly familyName: string;
  readonly reason: string;
  readonly actual: number | null;
  readonly limit: number | null;
  readonly unit: string;
}

export interface Sizing {
  readonly window: ResistanceWindow;
  readonly candidates: readonly Candidate[];
  readonly lost: readonly LostFamily[];
  /** How many combinations were looked at. */
  readonly considered: number;
  readonly sheet: SheetData;
}
