import { err, ok, type Result, refuse } from "../quantities/result.ts";
import { estimateFormulas } from "./estimateFormulas.ts";
import { type FieldElectrode, type FieldGeometry, noElectrode } from "./fieldGeometry.ts";
import { shapeFault } from "./shapeFault.ts";
import { type FieldOptions, type FieldStrays, solveField } from "./solveField.ts";

export interface BalancingElectrode {
  readonly electrode: FieldElectrode;
  /** Strays with it; their M is 0 within 0.1 % of Ce/6 + Ch/3. */
  readonly strays: FieldStrays;
  readonly solves: number;
}

/** An electrode of a given outer radius: a toroid with the tube a quarter of the ring radius, a disc of the thickness drawn. */
function electrodeOf(kind: "sphere" | "toroid" | "disc", size: number, drawn: FieldElectrode): FieldElectrode {
  if (kind === "sphere") return { ...noElectrode, kind, radius_m: size };
  if (kind === "disc") {
    const thickness_m = drawn.kind === "disc" ? drawn.thickness_m : size / 10;
    return { ...noElectrode, kind, radius_m: size, thickness_m };
  }
  const offset_m = drawn.kind === "toroid" ? drawn.offset_m : 0;
  return { ...noElectrode, kind, radius_m: size * 0.8, tubeRadius_m: size * 0.2, offset_m };
}

const enough = 1e-3;
const mostSolves = 24;

/**
 * The electrode with which M = 0: strays to earth and to the electrode balance, and an equal-resistor string needs no capacitors
 * of its own. Found on the solve itself, from the fitted formula on: steps until M changes its sign, then false position
 * (Illinois). Refused where no size that fits the surroundings does it.
 */
export function balancingElectrode(
  geometry: FieldGeometry,
  kind: "sphere" | "toroid" | "disc",
  options: FieldOptions = {},
): Result<BalancingElectrode> {
  let solves = 0;
  const ask = { idealisation: options.idealisation ?? ("bands" as const) };
  const at = (size: number): Result<BalancingElectrode & { readonly size: number; readonly m: number }> => {
    const electrode = electrodeOf(kind, size, geometry.electrode);
    const drawn = { ...geometry, electrode };
    const fault = shapeFault(drawn, ask);
    if (fault !== null) return err(fault);
    solves += 1;
    const strays = solveField(drawn, options);
    return ok({ electrode, strays, solves, size, m: strays.m_F / (strays.ceEff_F / 6 + strays.chEff_F / 3) });
  };
  const first = at(startOf(geometry, kind));
  if (!first.ok) return first;
  let low = first.value;
  let high = first.value;
  const step = 1.15;
  while (low.m * high.m > 0 && solves < mostSolves) {
    const next = at(high.m > 0 ? high.size * step : low.size / step);
    if (!next.ok) return refuse(next.error.where, `No size balances the string: ${next.error.why}`, next.error.cure);
    if (high.m > 0) [low, high] = [high, next.value];
    else [high, low] = [low, next.value];
  }
  if (low.m * high.m > 0)
    return refuse("/electrode", "No electrode of a sensible size balances the string.", "Clear the surroundings.");
  let [ml, mh] = [low.m, high.m];
  let best = Math.abs(ml) < Math.abs(mh) ? low : high;
  while (Math.abs(best.m) > enough && solves < mostSolves) {
    const tried = at((low.size * mh - high.size * ml) / (mh - ml));
    if (!tried.ok) return tried;
    best = tried.value;
    if (best.m > 0) {
      low = best;
      ml = best.m;
      mh /= 2;
    } else {
      high = best;
      mh = best.m;
      ml /= 2;
    }
  }
  return ok({ electrode: best.electrode, strays: best.strays, solves });
}

/** The fitted size, or 0.35 lengths where none was fitted; never narrower than the column. */
function startOf(geometry: FieldGeometry, kind: "sphere" | "toroid" | "disc"): number {
  const [l, d, h] = [geometry.columnLength_m, geometry.columnDiameter_m, geometry.footHeight_m];
  const Φ = estimateFormulas.floor.compute({ l, h });
  const record = kind === "sphere" ? estimateFormulas.balancingSphere : estimateFormulas.balancingToroid;
  const fitted = Φ === null ? null : record.compute({ l, d, h, Φ });
  return Math.max(fitted ?? 0.35 * l, 0.9 * d);
}
