import { fieldRecord } from "../field/fieldRecord.ts";
import { formatQuantity, formatShare } from "../quantities/format.ts";
import { fieldAsked, isFieldOf, ladderOf } from "./columnField.ts";
import { type ColumnStrays, columnStrays } from "./columnStrays.ts";
import { type Judging, plainFinding } from "./judging.ts";

/**
 * Strays from the solved field. Writes `strays.toEarth_F`, `strays.toElectrode_F`, `strays.m_F`, `strays.input_F`, `field.electrode_V_per_m`
 * and `strays.formula_F` with the difference to it. null, and a finding that says so, while the field of this drawing is not solved.
 */
export function solvedStrays(j: Judging, n: number): ColumnStrays | null {
  const asked = fieldAsked(j.document);
  if (!asked.ok) {
    unsolved(
      j,
      `The field cannot be solved as drawn: ${asked.error.why} ${asked.error.cure} The closed formula is used.`,
    );
    return null;
  }
  const { field } = j;
  if (asked.value === null) return null;
  if (field === null || !isFieldOf(field, asked.value)) {
    unsolved(j, "The field of the drawing is being solved; until then the closed formula of a bare column is used.");
    return null;
  }
  // The closed formula first: what it would have given stays on the sheet beside the solve.
  columnStrays(j.design.geometry, n, j.sheet);
  const byFormula = j.sheet.number("strays.toEarth_F");
  const { strays } = field;
  const inputs = {
    l: "/design/geometry/columnLength_m",
    d: "/design/geometry/columnDiameter_m",
    h: "/design/geometry/footHeight_m",
  };
  const put = (path: string, value: number | null, residual: number) =>
    j.sheet.solved(path, fieldRecord, value, inputs, residual);
  const { uncertainty } = strays;
  put("strays.toEarth_F", strays.ceEff_F, uncertainty?.ceEff ?? 0);
  put("strays.toElectrode_F", strays.chEff_F, uncertainty?.chEff ?? 0);
  put("strays.m_F", strays.m_F, uncertainty?.m ?? 0);
  put("strays.inputAtEdge_F", strays.inputHigh_F, uncertainty?.inputHigh ?? 0);
  const greatest = j.sheet.values["working.greatest_Vpeak"] as number | null | undefined;
  const share = strays.fieldMax_per_m;
  put(
    "field.electrode_V_per_m",
    typeof greatest !== "number" || share === null ? null : greatest * share,
    uncertainty?.fieldMax ?? 0,
  );
  j.sheet.given("strays.formula_F", byFormula);
  told(j, byFormula, strays.ceEff_F, strays.chEff_F);
  const ladder = ladderOf(field, n);
  return { ...ladder, tapToEarth_F: strays.tapToEarth_F };
}

/** What the solve says against the first look. */
function told(j: Judging, byFormula: number | null, Ce: number, Ch: number): void {
  const off = byFormula === null ? null : byFormula / Ce - 1;
  const against =
    off === null
      ? ""
      : ` The closed formula of a bare column says ${formatQuantity(byFormula!, "F")}, ${formatShare(Math.abs(off))} ${off < 0 ? "less" : "more"}.`;
  plainFinding(j, {
    id: "strays.field",
    level: "clear",
    what: "stray capacitance by the field solve",
    actual: Ce,
    unit: "F",
    reason: `The drawn column has ${formatQuantity(Ce, "F")} to earth and ${formatQuantity(Ch, "F")} to the electrode.${against}`,
    source: fieldRecord.source,
    path: "strays.toEarth_F",
  });
}

function unsolved(j: Judging, reason: string): void {
  plainFinding(j, {
    id: "strays.field",
    level: "caution",
    what: "stray capacitance by the field solve",
    reason,
    source: fieldRecord.source,
  });
}
