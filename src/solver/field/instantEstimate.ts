import { estimateFormulas } from "./estimateFormulas.ts";
import type { FieldGeometry } from "./fieldGeometry.ts";

/** Figures by closed formulas alone; null where none was fitted. */
export interface InstantEstimate {
  readonly ceEff_F: number | null;
  readonly chEff_F: number | null;
  readonly m_F: number | null;
  /** What the figures are and how far they hold. */
  readonly holds: string;
}

/**
 * Ce_eff and M of the bare graded column of this length, diameter and foot height. Electrode, shield, box and wall are not in them,
 * and no closed formula is known here for Ch_eff.
 */
export function instantEstimate(geometry: FieldGeometry): InstantEstimate {
  const [l, d, h] = [geometry.columnLength_m, geometry.columnDiameter_m, geometry.footHeight_m];
  const Φ = estimateFormulas.floor.compute({ l, h });
  const Ce = Φ === null ? null : estimateFormulas.bareEarth.compute({ l, d, h, Φ });
  const M = Φ === null || Ce === null ? null : estimateFormulas.bareM.compute({ l, d, h, Φ, Ce });
  return { ceEff_F: Ce, chEff_F: null, m_F: M, holds: holdsFor(geometry, Ce) };
}

function holdsFor(geometry: FieldGeometry, Ce: number | null): string {
  if (Ce === null)
    return "No estimate: length over diameter outside 4 to 100 or foot height outside 0.02 to 5 lengths.";
  const bare =
    "Bare graded column: Ce_eff within 1.1 %, M within 1.8 % of a graded film; bands of 0.4 pitch lie 2 to 20 % lower at 20 elements.";
  const around = [
    geometry.electrode.kind !== "none" && "the electrode, which takes both down and may turn the sign of M",
    geometry.shield !== null && "the shield, which adds",
    geometry.box !== null && "the box",
    geometry.wallDistance_m !== null && "the wall, which adds",
  ].filter((part) => part !== false);
  return around.length === 0 ? bare : `${bare} Not counted: ${around.join("; ")}.`;
}
