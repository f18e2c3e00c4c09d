import type { MaterialGroup, PollutionDegree } from "../job/brief.ts";
import { metre, volt } from "../quantities/quantity.ts";
import { airDensityAtAltitude } from "../standards/airDensity.ts";
import { altitudeFactor, steadyClearance } from "../standards/clearance.ts";
import { creepage } from "../standards/creepage.ts";
import { formula } from "../standards/formula.ts";
import { practice, type Source } from "../standards/source.ts";
import { givenPerElement, type Judging, judgeLimit, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";

const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const iec60664 = (clause: string): Source => ({
  title: "IEC 60664-1",
  edition: "ed. 3 (2020)",
  clause,
  status: "figures from a secondary copy, primary not seen",
});
/** Material groups as numbers on the sheet: 1 = I … 4 = IIIb. */
export const groups: readonly MaterialGroup[] = ["I", "II", "IIIa", "IIIb"];

export const insulationFormulas = {
  creepage: formula({
    id: "insulation.creepage",
    title: "Creepage by the table",
    statement: "{=} = table F.5 at {V}, pollution degree {pd}, material group {group}",
    result: m("d_c", "creepage required"),
    inputs: {
      V: V("V", "working voltage, dc or rms; the peak for pulses"),
      pd: one("PD", "pollution degree"),
      group: one("MG", "material group, 1 = I … 4 = IIIb"),
    },
    holds:
      "Between rows the next larger. Written for low-voltage equipment: beyond its scope used as the only tabulated guide. None above the last row.",
    source: iec60664("table F.5"),
    compute: ({ V, pd, group }) => {
      const found = creepage(volt(V), pd as PollutionDegree, groups[group - 1]!);
      return found.ok ? found.value : null;
    },
  }),
  clearance: formula({
    id: "insulation.clearance",
    title: "Clearance by the table",
    statement: "{=} = table F.8, case A, at {V} · altitude factor at {h}",
    result: m("d_a", "clearance required"),
    inputs: { V: V("V_max", "greatest peak"), h: m("h", "altitude") },
    holds: "Inhomogeneous field, to 50 kV; between rows the next larger; factor of table A.2 above 2000 m.",
    source: iec60664("tables F.8 and A.2"),
    compute: ({ V, h }) => {
      const gap = steadyClearance(volt(V), "A");
      const factor = altitudeFactor(metre(h));
      return gap.ok && factor.ok ? gap.value * factor.value : null;
    },
  }),
  openAir: formula({
    id: "insulation.openAir",
    title: "Air path along open parts by practice",
    statement: "{=} = {V} / (3 kV/cm · δ({h}))",
    result: m("d_o", "air path required"),
    inputs: { V: V("V_max", "greatest peak"), h: m("h", "altitude") },
    holds: "Rod-like parts in air at 20 °C; δ is relative to sea level and never mixed with the 2000 m factor.",
    source: practice("3 kV/cm along open parts, with air density"),
    compute: ({ V, h }) => V / (3e5 * airDensityAtAltitude(metre(h))),
  }),
  larger: formula({
    id: "insulation.larger",
    title: "The larger of two",
    statement: "{=} = max({a}, {b})",
    result: m("d", "distance required"),
    inputs: { a: m("a", "first requirement"), b: m("b", "second requirement") },
    holds:
      "Creepage is never below the clearance for the greatest peak; along open parts the larger of table and practice.",
    source: iec60664("clause on creepage: never below the clearance"),
    compute: ({ a, b }) => Math.max(a, b),
  }),
};

/** Requirements along the column and along one element, against the drawn lengths. */
export function insulation(j: Judging, show: Show): void {
  const { sheet, design, document } = j;
  const { surroundings } = document.brief;
  const n = design.hvArm.elements.length;
  const f = insulationFormulas;
  sheet.given("/design/geometry/columnLength_m", design.geometry.columnLength_m);
  sheet.given("/brief/surroundings/pollutionDegree", surroundings.pollutionDegree);
  sheet.given("/brief/surroundings/materialGroup", groups.indexOf(surroundings.materialGroup) + 1);
  sheet.given("/brief/surroundings/altitude_m", surroundings.altitude_m);
  const place = { pd: "/brief/surroundings/pollutionDegree", group: "/brief/surroundings/materialGroup" };
  const h = "/brief/surroundings/altitude_m";
  sheet.derive("insulation.tableCreepage_m", f.creepage, { V: "working.creepage_V", ...place });
  sheet.derive("insulation.tableClearance_m", f.clearance, { V: "working.greatest_Vpeak", h });
  sheet.derive("insulation.openAir_m", f.openAir, { V: "working.greatest_Vpeak", h });
  const beyond = sheet.number("insulation.tableClearance_m") === null;
  if (beyond) sheet.derive("insulation.clearance_m", f.openAir, { V: "working.greatest_Vpeak", h });
  else
    sheet.derive("insulation.clearance_m", f.larger, { a: "insulation.tableClearance_m", b: "insulation.openAir_m" });
  sheet.derive("insulation.creepage_m", f.larger, { a: "insulation.tableCreepage_m", b: "insulation.clearance_m" });

  const basis = document.brief.waveform.kind === "pulse" || document.brief.waveform.kind === "recorded";
  const elementVoltage = basis ? "element.voltage_Vpeak" : "element.voltage_Vrms";
  sheet.deriveEach("insulation.elementTableCreepage_m", f.creepage, { V: elementVoltage, ...place }, n);
  sheet.deriveEach("insulation.elementClearance_m", f.clearance, { V: "element.greatest_Vpeak", h }, n);
  sheet.deriveEach(
    "insulation.elementCreepage_m",
    f.larger,
    { a: "insulation.elementTableCreepage_m", b: "insulation.elementClearance_m" },
    n,
  );
  fieldCase(j);
  insulationFindings(j, show, beyond);
}

/** A homogeneous field may be claimed only where a field solve shows it; along a column of bodies and leads it never holds. */
function fieldCase(j: Judging): void {
  if (j.design.geometry.fieldCase !== "homogeneous") return;
  plainFinding(j, {
    id: "clearance.fieldCase",
    level: "stop",
    what: "homogeneous field claimed",
    reason:
      "Case B of the clearance tables holds only where a field solve shows a homogeneous field. " +
      "Bodies, leads and solder joints make the field along a string inhomogeneous: case A was used.",
    source: insulationFormulas.clearance.source,
    cure: {
      label: "judge by the inhomogeneous case",
      edits: [{ pointer: "/design/geometry/fieldCase", value: "inhomogeneous" }],
    },
  });
}

function insulationFindings(j: Judging, show: Show, beyond: boolean): void {
  const { sheet, document } = j;
  const scope =
    " The table is written for low-voltage equipment; beyond its scope it is used as the only tabulated guide.";
  const cure = { label: "size again", edits: [], sizeAgain: true };
  const bodies = givenPerElement(j, "bodyLength_m", (part) => part.bodyLength_m);
  const common = { unit: "m", sense: "atLeast" as const, statedMargin: 0, cure };
  const column = "/design/geometry/columnLength_m";
  judgeLimit(
    j,
    {
      ...common,
      id: "clearance.column",
      what: "air path along the column",
      path: column,
      limitPath: "insulation.clearance_m",
      reason: (actual, limit) =>
        `The column is ${actual} long; ${limit} is required for the greatest peak, ` +
        "the larger of the inhomogeneous case of the table and 3 kV/cm at this altitude.",
      source: insulationFormulas.clearance.source,
    },
    show,
  );
  if (sheet.number("insulation.creepage_m") === null) {
    plainFinding(j, {
      id: "creepage.column",
      level: "caution",
      what: "creepage along the column",
      reason: `No row of the table reaches ${show(sheet.number("working.creepage_V") ?? 0, "V")}; only the air path of 3 kV/cm was judged. Take the creepage from a standard for this voltage.`,
      source: insulationFormulas.creepage.source,
    });
  } else {
    judgeLimit(
      j,
      {
        ...common,
        id: "creepage.column",
        what: "creepage along the column",
        path: column,
        limitPath: "insulation.creepage_m",
        reason: (actual, limit) =>
          `The surface path along the column is ${actual}; ${limit} is required at pollution degree ` +
          `${document.brief.surroundings.pollutionDegree}, material group ${document.brief.surroundings.materialGroup}.${scope}`,
        source: insulationFormulas.creepage.source,
      },
      show,
    );
  }
  judgeLimit(
    j,
    {
      ...common,
      id: "creepage.element",
      what: "creepage along one element",
      path: bodies,
      limitPath: "insulation.elementCreepage_m",
      reason: (actual, limit, element) =>
        `The body of element ${element} is ${actual} long; ${limit} is required for its share of the voltage.${scope}`,
      source: insulationFormulas.creepage.source,
    },
    show,
  );
  if (beyond) {
    plainFinding(j, {
      id: "clearance.table",
      level: "caution",
      what: "clearance beyond the table",
      reason:
        "The inhomogeneous case is not tabulated above 50 kV (or not at this altitude); 3 kV/cm with air density was used alone.",
      source: insulationFormulas.clearance.source,
    });
  }
}
