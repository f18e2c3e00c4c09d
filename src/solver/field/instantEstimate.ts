import { estimateFormulas } from "./estimateFormulas.ts";
import type { FieldGeometry } from "./fieldGeometry.ts";
import { underElectrode } from "./underElectrode.ts";

/** Figures by closed formulas alone; null where none was fitted. */
export interface InstantEstimate {
  /** Of the bare graded column. */
  readonly ceEff_F: number | null;
  /** No closed formula is known here for a bare column's. */
  readonly chEff_F: number | null;
  /** Of the bare graded column. */
  readonly m_F: number | null;
  /** The same column under its sphere or toroid; null for other electrodes and outside the fits. */
  readonly underElectrode: { readonly ceEff_F: number; readonly chEff_F: number; readonly m_F: number } | null;
  /** What the figures are and how far they hold. */
  readonly holds: string;
}

/** Strays by closed formulas. Shield, box and wall are not in them, the electrode only in `underElectrode`. */
export function instantEstimate(geometry: FieldGeometry): InstantEstimate {
  const [l, d, h] = [geometry.columnLength_m, geometry.columnDiameter_m, geometry.footHeight_m];
  const Φ = estimateFormulas.floor.compute({ l, h });
  const Ce = Φ === null ? null : estimateFormulas.bareEarth.compute({ l, d, h, Φ });
  const M = Φ === null || Ce === null ? null : estimateFormulas.bareM.compute({ l, d, h, Φ, Ce });
  return {
    ceEff_F: Ce,
    chEff_F: null,
    m_F: M,
    underElectrode: Φ === null || Ce === null || M === null ? null : capped(geometry, Φ, Ce, M),
    holds: holdsFor(geometry, Ce),
  };
}

function capped({ electrode, ...geometry }: FieldGeometry, Φ: number, Ce: number, M: number) {
  const [l, d, h] = [geometry.columnLength_m, geometry.columnDiameter_m, geometry.footHeight_m];
  const { kind, radius_m: R, tubeRadius_m: a, offset_m } = electrode;
  const asFitted =
    kind === "sphere" || (kind === "toroid" && a > 0.2 * R && a < 0.3 * R && offset_m === 0 && h >= 0.1 * l);
  if (!asFitted) return null;
  const sphere = kind === "sphere";
  const balancing = (sphere ? estimateFormulas.balancingSphere : estimateFormulas.balancingToroid).compute({
    l,
    d,
    h,
    Φ,
  });
  if (balancing === null) return null;
  const s = (sphere ? R : R + a) / balancing;
  const of = sphere
    ? [underElectrode.sphereEarth, underElectrode.sphereElectrode, underElectrode.sphereM]
    : [underElectrode.toroidEarth, underElectrode.toroidElectrode, underElectrode.toroidM];
  const [ceEff_F, chEff_F, m_F] = of.map((each, k) => each.compute({ X: k === 2 ? M : Ce, s, l, d, Φ }));
  if (typeof ceEff_F !== "number" || typeof chEff_F !== "number" || typeof m_F !== "number") return null;
  return { ceEff_F, chEff_F, m_F };
}

function holdsFor(geometry: FieldGeometry, Ce: number | null): string {
  if (Ce === null)
    return "No estimate: length over diameter outside 4 to 100 or foot height outside 0.02 to 5 lengths.";
  const bare =
    "Bare graded column: Ce_eff within 1.1 %, M within 1.8 % of a graded film; bands of 0.4 pitch lie 2 to 20 % lower at 20 elements.";
  const around = [
    geometry.electrode.kind !== "none" &&
      "the electrode, which takes both down and may turn the sign of M (underElectrode)",
    geometry.shield !== null && "the shield, which adds",
    geometry.box !== null && "the box",
    geometry.wallDistance_m !== null && "the wall, which adds",
  ].filter((part) => part !== false);
  return around.length === 0 ? bare : `${bare} Not counted: ${around.join("; ")}.`;
}
