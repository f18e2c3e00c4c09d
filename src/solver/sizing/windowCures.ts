import { show } from "../checks/show.ts";
import type { DividerDocument } from "../job/document.ts";
import type { Cure, Edit } from "../standards/finding.ts";
import { edited } from "./edits.ts";
import type { Bound } from "./outcome.ts";
import type { Pool } from "./pool.ts";
import { isOpen, type WindowFound, windowOf } from "./resistanceWindow.ts";
import { systematicShare } from "./windowFormulas.ts";

/** Room left between two bounds that a cure has parted. */
const room = 1.25;

/** Steps that one cure may take where several bounds stand in the way, and how many cures are shown. */
const mostSteps = 3;
const mostCures = 5;

/** The cheapest ways to part the bounds that collide: each was tried on the document and opens the window; fewest steps first. */
export function windowCures(document: DividerDocument, pool: Pool, found: WindowFound): Cure[] {
  const cures: Cure[] = [];
  let waiting: { document: DividerDocument; found: WindowFound; steps: readonly Cure[] }[] = [
    { document, found, steps: [] },
  ];
  for (let step = 0; step < mostSteps && cures.length === 0; step++) {
    const next: typeof waiting = [];
    for (const each of waiting) {
      for (const way of waysOf(each.document, each.found)) {
        const changed = edited(each.document, way.edits);
        const tried = windowOf(changed, pool);
        if (!tried.ok) continue;
        const steps = [...each.steps, way];
        if (isOpen(tried.value)) cures.push(joined(steps));
        else next.push({ document: changed, found: tried.value, steps });
      }
    }
    waiting = next.slice(0, 24);
  }
  return cures.slice(0, mostCures);
}

const waysOf = (document: DividerDocument, found: WindowFound): Cure[] => [
  ...upperWays(document, found, found.greatest),
  ...lowerWays(document, found, found.least, found.greatest),
];

/** One cure of several steps; a later edit of the same key stands for an earlier one. */
function joined(steps: readonly Cure[]): Cure {
  const edits = new Map(steps.flatMap((each) => each.edits).map((edit) => [edit.pointer, edit]));
  const labels = new Map(steps.map((each) => [each.edits[0]?.pointer, each.label]));
  return { label: [...labels.values()].join("; "), edits: [...edits.values()], sizeAgain: true };
}

const cure = (label: string, ...edits: Edit[]): Cure => ({ label, edits, sizeAgain: true });
const percent = (value: number) => `${Number((value * 100).toPrecision(3))} %`;
/** Rounded to two figures, away from the collision. */
const upTo = (value: number): number => {
  const unit = 10 ** (Math.floor(Math.log10(value)) - 1);
  return Number((Math.ceil(value / unit - 1e-9) * unit).toPrecision(2));
};
const downTo = (value: number): number => {
  const unit = 10 ** (Math.floor(Math.log10(value)) - 1);
  return Number((Math.floor(value / unit + 1e-9) * unit).toPrecision(2));
};

/** The next of 1, 2, 5, 10 … not below. */
const roundNumber = (value: number): number => {
  const decade = 10 ** Math.floor(Math.log10(value));
  return ([1, 2, 5, 10].find((step) => step * decade >= value * (1 - 1e-12)) as number) * decade;
};

/** Ways that raise the upper bound above the least resistance. */
function upperWays(document: DividerDocument, found: WindowFound, greatest: Bound | null): Cure[] {
  const needed = (found.least?.resistance_ohm ?? 0) * room;
  const upper = greatest?.resistance_ohm ?? 0;
  const { policy, wantedUncertainty } = document.brief;
  switch (greatest?.id) {
    case "existence":
    case "instrumentShare":
    case "lvArmValue":
      return scaleFactorWays(document, found, needed, upper, greatest.id);
    case "leakage": {
      const clean = upTo(needed / (systematicShare * wantedUncertainty));
      return [
        cure(`insulation of ${show(clean, "ohm")}: clean, dry, or with a guard ring`, {
          pointer: "/brief/policy/leakageResistance_ohm",
          value: clean,
        }),
        ...lessExact(wantedUncertainty, needed / upper),
      ];
    }
    case "leastCurrent": {
      const current = downTo((policy.leastCurrent_A * upper) / needed);
      return [
        cure(`accept ${show(current, "A")} through the string`, {
          pointer: "/brief/policy/leastCurrent_A",
          value: current,
        }),
      ];
    }
    case "band":
    case "lvPole":
      return [
        cure("fit capacitors across the elements", { pointer: "/brief/policy/compensation", value: "whenNeeded" }),
      ];
    default:
      return [];
  }
}

function scaleFactorWays(
  document: DividerDocument,
  found: WindowFound,
  needed: number,
  upper: number,
  id: Bound["id"],
): Cure[] {
  const { scaleFactor, wantedUncertainty } = document.brief;
  const { at } = found.ask;
  const instrument = found.ask.j.instrument;
  const ways: Cure[] = [];
  if (instrument.function === "scope 50 Ω") {
    ways.push(
      cure(
        "set the input to 1 MΩ",
        { pointer: `/instruments/${at}/function`, value: "scope 1 MΩ" },
        { pointer: `/instruments/${at}/resistance_ohm`, value: 1e6 },
      ),
    );
  }
  const factor = upper > 0 ? 1 + ((scaleFactor - 1) * needed) / upper : scaleFactor * 10;
  const nice = roundNumber(Math.max(factor, scaleFactor * 1.01));
  ways.push(cure(`scale factor ${show(nice, "1")}`, { pointer: "/brief/scaleFactor", value: nice }));
  for (const other of document.instruments) {
    if (other.id === instrument.id || other.resistance_ohm <= instrument.resistance_ohm) continue;
    ways.push(cure(`read with ${other.name}`, { pointer: "/principal", value: other.id }));
  }
  if (id === "instrumentShare") {
    const spread = downTo((instrument.resistanceSpread * upper) / needed);
    ways.push(
      cure(`measure the instrument's resistance to ${percent(spread)}`, {
        pointer: `/instruments/${at}/resistanceSpread`,
        value: spread,
      }),
      ...lessExact(wantedUncertainty, needed / upper),
    );
  }
  return ways;
}

function lessExact(wantedUncertainty: number, by: number): Cure[] {
  const value = upTo(wantedUncertainty * by);
  return value < 0.2 ? [cure(`be content with ${percent(value)}`, { pointer: "/brief/wantedUncertainty", value })] : [];
}

/** Ways that bring the least resistance below the upper bound. */
function lowerWays(document: DividerDocument, found: WindowFound, least: Bound | null, greatest: Bound | null): Cure[] {
  const allowed = (greatest?.resistance_ohm ?? 0) / room;
  if (allowed <= 0) return [];
  const { source } = document.brief;
  switch (least?.id) {
    case "sourceSag": {
      const sag = upTo(source.resistance_ohm / (source.resistance_ohm + allowed));
      if (sag >= 0.5) return [];
      return [
        cure(`accept ${percent(sag)} of sag and correct for it by the two-load method`, {
          pointer: "/brief/policy/allowedSag",
          value: sag,
        }),
      ];
    }
    case "dissipation": {
      const power = upTo(found.ask.working.greatestRms_V ** 2 / allowed);
      return [cure(`accept ${show(power, "W")}`, { pointer: "/brief/policy/greatestDissipation_W", value: power })];
    }
    default:
      return [];
  }
}
