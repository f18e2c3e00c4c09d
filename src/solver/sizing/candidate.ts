import { show } from "../checks/show.ts";
import type { Design } from "../job/design.ts";
import type { Part } from "../job/part.ts";
import type { Finding } from "../standards/finding.ts";
import { candidateFormulas } from "./candidateFormulas.ts";
import { columnGeometry, envelope, geometryFormulas } from "./geometry.ts";
import type { Limits } from "./kind.ts";
import type { Build } from "./line.ts";
import { lvResistors } from "./lvArm.ts";
import { lvNeed } from "./lvSolution.ts";
import type { Candidate } from "./outcome.ts";
import { tooUncertain } from "./pick.ts";
import type { Pool } from "./pool.ts";

/** A build with LV arm, geometry and parts: everything but its rank and the sheet's figures. */
export type Drafted = Omit<Candidate, "rank">;

export function drafted(build: Build, limits: Limits, pool: Pool): Drafted {
  const { ask } = limits;
  const { family } = build.kind;
  const findings: Finding[] = [...insulationFindings(limits), ...uncertaintyFindings(build, limits)];
  const need = lvNeed({
    hvArm_ohm: build.hvArm_ohm,
    scaleFactor: ask.j.document.brief.scaleFactor,
    instrument_ohm: ask.j.instrument.resistance_ohm,
    seriesProtector_ohm: ask.seriesProtector_ohm,
    leakage_S: ask.leakage_S,
    stringTolerance: family.tolerance,
    instrumentSpread: ask.j.instrument.resistanceSpread,
  });
  const lv = need.ok ? lvResistors(ask, pool, build.hvArm_ohm, need.value) : null;
  if (!need.ok) findings.push(noLvArm(`${need.error.why} ${need.error.cure}`));
  findings.push(...(lv?.findings ?? []));
  const parts: Part[] = unique([family, ...(lv?.parts ?? []), ...protectorParts(limits)]);
  return {
    family: family.id,
    familyName: family.name,
    resistance_ohm: build.resistance_ohm,
    elements: build.elements,
    strings: build.strings,
    hvArmResistance_ohm: build.hvArm_ohm,
    elementCount: build.elementCount,
    columnLength_m: build.length_m,
    partsUncertainty: build.uncertainty,
    loading: build.loading,
    smallestMargin: build.margin,
    differentParts: 1,
    elementVoltage_Vrms: (ask.working.rms_V * limits.share) / build.elements,
    elementVoltage_Vpeak: (ask.working.peak_V * limits.share) / build.elements,
    elementDissipation_W: ((ask.working.greatestRms_V * limits.share) / build.elements) ** 2 / build.resistance_ohm,
    governing: build.governing,
    stops: findings.filter((each) => each.level === "stop").map((each) => each.id),
    findings,
    design: designOf(build, limits, lv?.branches ?? []),
    parts,
  };
}

function designOf(build: Build, limits: Limits, branches: Design["lvArm"]["branches"]): Design {
  const { document } = limits.ask.j;
  const { family } = build.kind;
  const greatest = limits.ask.working.greatest_Vpeak;
  const electrodeRadius_m = geometryFormulas.electrodeRadius.compute({
    V: greatest,
    h: document.brief.surroundings.altitude_m,
  }) as number;
  return {
    follows: false,
    hvArm: {
      strings: build.strings,
      elements: Array.from({ length: build.elements }, () => ({
        part: family.id,
        resistance_ohm: build.resistance_ohm,
        capacitor: null,
        capacitance_F: 0,
      })),
    },
    lvArm: { stays: "withDivider", branches, capacitanceBy: "none" },
    protectors: document.design?.protectors ?? [],
    geometry: columnGeometry(document, {
      elements: build.elements,
      columnLength_m: build.length_m,
      columnDiameter_m: envelope(family.bodyDiameter_m, build.strings),
      electrodeRadius_m,
      greatest_Vpeak: greatest,
    }),
    strays: { from: "formula", toEarth_F: [], toElectrode_F: [], electrodeToTap_F: 0 },
  };
}

const protectorParts = ({ ask }: Limits): Part[] =>
  ask.j.design.protectors.flatMap((fitted) => ask.j.parts.get(fitted.part) ?? []);

const unique = (parts: readonly Part[]): Part[] => [...new Map(parts.map((part) => [part.id, part])).values()];

function noLvArm(reason: string): Finding {
  return {
    id: "scaleFactor.existence",
    level: "stop",
    what: "LV arm for the wanted scale factor",
    actual: null,
    limit: null,
    unit: "1",
    sense: "none",
    margin: null,
    reason,
    source: candidateFormulas.hvArm.source,
    cure: null,
    path: null,
  };
}

function uncertaintyFindings(build: Build, limits: Limits): Finding[] {
  if (!tooUncertain(build, limits)) return [];
  const wanted = limits.ask.j.document.brief.wantedUncertainty;
  return [
    {
      id: "scaleFactor.uncertainty",
      level: "stop",
      what: "uncertainty of the string from its parts",
      actual: build.uncertainty,
      limit: wanted,
      unit: "1",
      sense: "atMost",
      margin: 1 - build.uncertainty / wanted,
      reason:
        `The string alone is uncertain by ${show(build.uncertainty, "1")} (k = 2) before it is measured; ` +
        `${show(wanted, "1")} is wanted. Measure the elements, calibrate, or take a closer family.`,
      source: candidateFormulas.partsUncertainty.source,
      cure: null,
      path: null,
    },
  ];
}

function insulationFindings({ need, ask }: Limits): Finding[] {
  if (!need.beyondClearance && !need.beyondCreepage) return [];
  const tables = [need.beyondCreepage ? "creepage" : null, need.beyondClearance ? "clearance" : null]
    .filter((each) => each !== null)
    .join(" and ");
  return [
    {
      id: "insulation.beyondTables",
      level: "caution",
      what: "insulation beyond the tables",
      actual: ask.working.greatest_Vpeak,
      limit: null,
      unit: "V",
      sense: "none",
      margin: null,
      reason:
        `The table of ${tables} does not reach ${show(ask.working.greatest_Vpeak, "V")} in these surroundings; ` +
        "the column length rests on 3 kV/cm with air density alone.",
      source: candidateFormulas.columnLength.source,
      cure: null,
      path: "insulation.column_m",
    },
  ];
}
