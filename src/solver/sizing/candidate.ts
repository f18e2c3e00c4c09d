import { readingBasis } from "../checks/loading.ts";
import { briefMisuse } from "../checks/misuse.ts";
import { show } from "../checks/show.ts";
import type { Design } from "../job/design.ts";
import type { Part } from "../job/part.ts";
import { formatShare } from "../quantities/format.ts";
import type { Finding } from "../standards/finding.ts";
import { candidateFormulas } from "./candidateFormulas.ts";
import { compensated } from "./compensation.ts";
import { found } from "./found.ts";
import { envelope } from "./geometry.ts";
import type { Limits } from "./kind.ts";
import type { Build } from "./line.ts";
import { type LvResistors, lvResistors } from "./lvArm.ts";
import { lvNeedOf, nominalLvArm } from "./lvReach.ts";
import type { Candidate } from "./outcome.ts";
import { tooUncertain } from "./pick.ts";
import type { Pool } from "./pool.ts";
import { type Fitted, geometryOf, unique, withCapacitors } from "./withCapacitors.ts";

/** A build with LV arm, capacitors, geometry and parts: everything but its rank and the sheet's figures. */
export type Drafted = Omit<Candidate, "rank">;

/** Works out all that a build leaves open, and what was found on the way. */
export function drafted(build: Build, limits: Limits, pool: Pool): Drafted {
  const { ask } = limits;
  const { family } = build.kind;
  const findings: Finding[] = [
    ...briefStops(limits),
    ...inputFindings(limits),
    ...insulationFindings(limits),
    ...uncertaintyFindings(build, limits),
  ];
  const lv = lvArmOf(build, limits, pool);
  findings.push(...lv.findings);
  const bare: Fitted = {
    design: designOf(build, limits, lv.branches),
    parts: unique([family, ...lv.parts, ...protectorParts(limits)]),
    findings: [],
  };
  const fitted = compensated(build, limits) ? withCapacitors(build, limits, pool, bare) : bare;
  findings.push(...fitted.findings, ...lengthFindings(fitted.design, limits));
  const { working } = ask;
  const share = limits.share / build.elements;
  return {
    family: family.id,
    familyName: family.name,
    resistance_ohm: build.resistance_ohm,
    elements: build.elements,
    strings: build.strings,
    hvArmResistance_ohm: build.hvArm_ohm,
    elementCount: build.elementCount,
    columnLength_m: fitted.design.geometry.columnLength_m,
    partsUncertainty: build.uncertainty,
    loading: build.loading,
    smallestMargin: build.margin,
    differentParts: differentParts(fitted.design),
    elementVoltage_Vrms: working.rms_V * share,
    elementVoltage_Vpeak: working.peak_V * share,
    elementDissipation_W: (working.greatestRms_V * share) ** 2 / build.resistance_ohm,
    governing: build.governing,
    stops: findings.filter((each) => each.level === "stop").map((each) => each.id),
    findings,
    design: fitted.design,
    parts: fitted.parts,
  };
}

/** LV resistors over all tolerances; where the extremes do not exist those for nominal parts, with a stop. */
function lvArmOf(build: Build, { ask }: Limits, pool: Pool): LvResistors {
  const need = lvNeedOf(ask, build.hvArm_ohm, build.kind.family.tolerance);
  if (need.ok) return lvResistors(ask, pool, build.hvArm_ohm, need.value);
  const stop = found("scaleFactor.existence", "stop", "LV arm", { reason: `${need.error.why} ${need.error.cure}` });
  const nominal_ohm = nominalLvArm(ask, build.hvArm_ohm);
  if (nominal_ohm === null) return { branches: [], parts: [], findings: [stop] };
  const nominal = { nominal_ohm, least_ohm: nominal_ohm, greatest_ohm: nominal_ohm };
  const lv = lvResistors(ask, pool, build.hvArm_ohm, nominal);
  return { ...lv, findings: [stop, ...lv.findings] };
}

function designOf(build: Build, limits: Limits, branches: Design["lvArm"]["branches"]): Design {
  const { document } = limits.ask.j;
  const { family } = build.kind;
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
    lvArm: {
      stays: "withDivider",
      branches,
      capacitanceBy: "none",
      inductance_H: document.design?.lvArm.inductance_H ?? 0,
    },
    protectors: document.design?.protectors ?? [],
    geometry: geometryOf(limits, build.elements, build.length_m, envelope(family.bodyDiameter_m, build.strings)),
    strays: { from: "formula", toEarth_F: [], toElectrode_F: [], electrodeToTap_F: 0 },
    lead: document.design?.lead ?? { inductance_H: 0, damping_ohm: 0 },
  };
}

/** How many different parts and values the design is made of. */
function differentParts({ hvArm, lvArm }: Design): number {
  const elements = hvArm.elements.flatMap((each) => [
    `${each.part} ${each.resistance_ohm}`,
    ...(each.capacitor === null ? [] : [`${each.capacitor} ${each.capacitance_F}`]),
  ]);
  const branches = lvArm.branches.flatMap((branch) => {
    if ("trimmer" in branch) return [`${branch.part} ${branch.trimmer.greatest_F}`];
    if (!("series" in branch)) return [`${branch.part} ${branch.capacitance_F}`];
    return branch.series.map((item) =>
      "rheostat" in item ? `${item.part} ${item.rheostat.greatest_ohm}` : `${item.part} ${item.resistance_ohm}`,
    );
  });
  return new Set([...elements, ...branches]).size;
}

const protectorParts = ({ ask }: Limits): Part[] =>
  ask.j.design.protectors.flatMap((fitted) => ask.j.parts.get(fitted.part) ?? []);

/** What stands in the way of every build alike: said with each, so that none passes for clear. */
function briefStops({ ask }: Limits): Finding[] {
  const j = { ...ask.j, findings: [] as Finding[] };
  briefMisuse(j, show);
  const stops = j.findings.filter((each) => each.level === "stop");
  const { instrument, document, sheet } = j;
  const reading = (sheet.number(readingBasis(j)) as number) / document.brief.scaleFactor;
  if (reading > instrument.range_V * (1 + 1e-9)) {
    stops.push(
      found("instrument.range", "stop", "reading within the locked range", {
        actual: reading,
        limit: instrument.range_V,
        unit: "V",
        sense: "atMost",
        reason: `The reading at working voltage is ${show(reading, "V")} on the ${show(instrument.range_V, "V")} range. Take a larger scale factor or another range.`,
      }),
    );
  }
  if (instrument.readingAccuracy > document.brief.wantedUncertainty) {
    stops.push(
      found("instrument.accuracy", "stop", "wanted uncertainty against the instrument's own", {
        actual: instrument.readingAccuracy,
        limit: document.brief.wantedUncertainty,
        sense: "atMost",
        reason: `${instrument.name} reads within ${formatShare(instrument.readingAccuracy)}, ${formatShare(document.brief.wantedUncertainty)} is wanted: no divider can repair that.`,
      }),
    );
  }
  return stops;
}

/** What the instrument sees at the greatest peak, whatever the string: a larger scale factor is the only cure. */
function inputFindings({ ask }: Limits): Finding[] {
  const { instrument, document } = ask.j;
  const { scaleFactor } = document.brief;
  const seen = ask.working.greatest_Vpeak / scaleFactor;
  if (seen <= instrument.greatestInput_Vpeak) return [];
  return [
    found("instrument.input", "stop", "voltage at the instrument", {
      actual: seen,
      limit: instrument.greatestInput_Vpeak,
      unit: "V",
      sense: "atMost",
      reason: `${instrument.name} would see ${show(seen, "V")} at the greatest peak and may see ${show(instrument.greatestInput_Vpeak, "V")}.`,
      cure: {
        label: "ten times the scale factor",
        edits: [{ pointer: "/brief/scaleFactor", value: scaleFactor * 10 }],
        sizeAgain: true,
      },
    }),
  ];
}

/** Capacitors make a column longer than the search knew: it may pass the longest accepted. */
function lengthFindings({ geometry }: Design, limits: Limits): Finding[] {
  if (geometry.columnLength_m <= limits.length_m * (1 + 1e-9)) return [];
  return [
    found("column.length", "stop", "length of the column", {
      actual: geometry.columnLength_m,
      limit: limits.length_m,
      unit: "m",
      sense: "atMost",
      reason:
        `With its capacitors the column is ${show(geometry.columnLength_m, "m")} long; ` +
        `${show(limits.length_m, "m")} is the longest accepted.`,
    }),
  ];
}

function uncertaintyFindings(build: Build, limits: Limits): Finding[] {
  if (!tooUncertain(build, limits)) return [];
  const wanted = limits.ask.j.document.brief.wantedUncertainty;
  return [
    found("scaleFactor.uncertainty", "caution", "uncertainty of the string from its parts", {
      actual: build.uncertainty,
      limit: wanted,
      sense: "atMost",
      reason:
        `The string alone is uncertain by ${formatShare(build.uncertainty)} (k = 2) before it is measured; ` +
        `${formatShare(wanted)} is wanted. Measure the elements, calibrate, or take a closer family.`,
      source: candidateFormulas.partsUncertainty.source,
    }),
  ];
}

function insulationFindings({ need, ask }: Limits): Finding[] {
  if (!need.beyondClearance && !need.beyondCreepage) return [];
  const tables = [need.beyondCreepage ? "creepage" : null, need.beyondClearance ? "clearance" : null];
  return [
    found("insulation.beyondTables", "caution", "insulation beyond the tables", {
      actual: ask.working.greatest_Vpeak,
      unit: "V",
      reason:
        `The table of ${tables.filter((each) => each !== null).join(" and ")} does not reach ` +
        `${show(ask.working.greatest_Vpeak, "V")} in these surroundings; the column length rests on 3 kV/cm with air density.`,
      source: candidateFormulas.columnLength.source,
      path: "insulation.column_m",
    }),
  ];
}
