import { groups, insulationFormulas } from "../checks/insulation.ts";
import { metre, volt } from "../quantities/quantity.ts";
import { airDensityAtAltitude } from "../standards/airDensity.ts";
import { altitudeFactor, steadyClearance } from "../standards/clearance.ts";
import { creepage } from "../standards/creepage.ts";
import type { Asking } from "./asking.ts";

/** What insulation demands of a column and of one element. */
export interface InsulationNeed {
  /** Least length of the column, m. */
  readonly column_m: number;
  /** A table did not reach: 3 kV/cm was used alone. */
  readonly beyondClearance: boolean;
  readonly beyondCreepage: boolean;
  /** Least body length of an element that bears these voltages (creepage basis, greatest peak), m. */
  readonly body: (creepage_V: number, greatest_Vpeak: number) => number;
}

/** Derives `insulation.*` on the sheet with the formulas of the checks; a table that does not reach leaves 3 kV/cm. */
export function insulationNeed(ask: Asking): InsulationNeed {
  const { sheet, document } = ask.j;
  const { surroundings } = document.brief;
  const f = insulationFormulas;
  sheet.given("/brief/surroundings/pollutionDegree", surroundings.pollutionDegree);
  sheet.given("/brief/surroundings/materialGroup", groups.indexOf(surroundings.materialGroup) + 1);
  sheet.given("/brief/surroundings/altitude_m", surroundings.altitude_m);
  const place = { pd: "/brief/surroundings/pollutionDegree", group: "/brief/surroundings/materialGroup" };
  const h = "/brief/surroundings/altitude_m";
  const peak = "working.greatest_Vpeak";
  const creep = sheet.derive("insulation.tableCreepage_m", f.creepage, { V: "working.creepage_V", ...place });
  const clear = sheet.derive("insulation.tableClearance_m", f.clearance, { V: peak, h });
  const open = sheet.derive("insulation.openAir_m", f.openAir, { V: peak, h });
  const byTable = { a: "insulation.tableClearance_m", b: "insulation.openAir_m" };
  if (clear === null) sheet.derive("insulation.clearance_m", f.openAir, { V: peak, h });
  else sheet.derive("insulation.clearance_m", f.larger, byTable);
  const both = {
    a: creep === null ? "insulation.clearance_m" : "insulation.tableCreepage_m",
    b: "insulation.clearance_m",
  };
  const column_m = sheet.derive("insulation.column_m", f.larger, both) ?? open ?? 0;
  return { column_m, beyondClearance: clear === null, beyondCreepage: creep === null, body: bodyNeed(ask) };
}

function bodyNeed(ask: Asking): InsulationNeed["body"] {
  const { altitude_m, pollutionDegree, materialGroup } = ask.j.document.brief.surroundings;
  const density = airDensityAtAltitude(metre(altitude_m));
  const factor = altitudeFactor(metre(altitude_m));
  return (creepage_V, greatest_Vpeak) => {
    const creep = creepage(volt(creepage_V), pollutionDegree, materialGroup);
    const gap = steadyClearance(volt(greatest_Vpeak), "A");
    const air = greatest_Vpeak / (3e5 * density);
    const clear = gap.ok && factor.ok ? gap.value * factor.value : air;
    return Math.max(creep.ok ? creep.value : air, clear);
  };
}
