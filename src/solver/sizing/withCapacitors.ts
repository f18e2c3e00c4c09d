import { bandTop } from "../checks/band.ts";
import type { Design, Geometry } from "../job/design.ts";
import type { Part } from "../job/part.ts";
import { formatShare } from "../quantities/format.ts";
import type { Finding } from "../standards/finding.ts";
import { elementCapacitor } from "./compensation.ts";
import { found } from "./found.ts";
import { columnGeometry, geometryFormulas } from "./geometry.ts";
import type { Limits } from "./kind.ts";
import type { Build } from "./line.ts";
import { lvCapacitors } from "./lvCapacitors.ts";
import { lvCapacitanceNeed } from "./lvMatch.ts";
import type { Pool } from "./pool.ts";

/** A design on its way, with every part that it names and what was found. */
export interface Fitted {
  readonly design: Design;
  readonly parts: readonly Part[];
  readonly findings: readonly Finding[];
}

/** A capacitor across each element and the LV capacitors that match it; a stop where one of them does not exist. */
export function withCapacitors(build: Build, limits: Limits, pool: Pool, bare: Fitted): Fitted {
  const chosen = elementCapacitor(build, limits, pool);
  if (!("family" in chosen)) return { ...bare, findings: [chosen] };
  const { family, capacitance_F } = chosen;
  const design: Design = {
    ...bare.design,
    hvArm: {
      ...bare.design.hvArm,
      elements: bare.design.hvArm.elements.map((each) => ({ ...each, capacitor: family.id, capacitance_F })),
    },
    geometry: geometryOf(limits, build.elements, chosen.length_m, chosen.diameter_m),
  };
  const parts = unique([...bare.parts, family]);
  const need = lvCapacitanceNeed({
    document: { ...limits.ask.j.document, design, parts },
    at: limits.ask.at,
    band_Hz: bandOf(limits),
    capacitorTolerance: family.tolerance,
    dielectric: family.dielectric,
    stray_F: chosen.stray_F,
    counts: bankCounts(limits),
  });
  if (!("nominal_F" in need)) return { design, parts, findings: [...chosen.findings, need] };
  const lv = lvCapacitors(limits.ask, pool, need);
  return {
    design: {
      ...design,
      lvArm: { ...design.lvArm, branches: [...design.lvArm.branches, ...lv.branches], capacitanceBy: "flattest" },
    },
    parts: unique([...parts, ...lv.parts]),
    findings: [...chosen.findings, ...lv.findings, ...bandFindings(need.deviation, limits)],
  };
}

/** Even the flattest match leaves more over the band than is wanted: strays are too large against the capacitors. */
function bandFindings(deviation: number, { ask }: Limits): Finding[] {
  const wanted = ask.j.document.brief.wantedUncertainty;
  if (deviation <= wanted) return [];
  return [
    found("response.band", "stop", "deviation over the wanted band", {
      actual: deviation,
      limit: wanted,
      sense: "atMost",
      reason:
        `Even the flattest LV capacitance leaves ${formatShare(deviation)} over the band; ${formatShare(wanted)} is wanted. ` +
        "The strays of the column are too large against its capacitors.",
    }),
  ];
}

/** Two banks where one of them open, which doubles the reading of an edge, stays within the instrument's greatest input. */
function bankCounts({ ask }: Limits): readonly number[] {
  const doubled = (2 * ask.working.greatest_Vpeak) / ask.j.document.brief.scaleFactor;
  return doubled <= ask.j.instrument.greatestInput_Vpeak ? [2, 3] : [3, 2];
}

/** The band that must be right; a lower end of 0 counts as a millionth of the upper. */
function bandOf({ ask }: Limits): readonly [number, number] {
  const [low] = ask.j.document.brief.band_Hz;
  const high = bandTop(ask.j.document.brief);
  return [low > 0 ? low : high * 1e-6, high];
}

/** Geometry of a column of that length and diameter, m, with the electrode that its greatest peak asks for. */
export function geometryOf(limits: Limits, elements: number, length_m: number, diameter_m: number): Geometry {
  const { ask } = limits;
  const greatest_Vpeak = ask.working.greatest_Vpeak;
  const h = ask.j.document.brief.surroundings.altitude_m;
  return columnGeometry(ask.j.document, {
    elements,
    columnLength_m: length_m,
    columnDiameter_m: diameter_m,
    electrodeRadius_m: geometryFormulas.electrodeRadius.compute({ V: greatest_Vpeak, h }) as number,
    greatest_Vpeak,
  });
}

/** Each part once, the last of its id. */
export const unique = (parts: readonly Part[]): Part[] => [...new Map(parts.map((part) => [part.id, part])).values()];
