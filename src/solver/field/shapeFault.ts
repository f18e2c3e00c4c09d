import type { Refusal } from "../quantities/result.ts";
import { type Curve, heightAt, lengthOf, nearestOn, radiusAt } from "./curve.ts";
import { electrodePieces, sphereRise } from "./electrodePieces.ts";
import { type FieldAsk, type FieldGeometry, highestOf, topOf } from "./fieldGeometry.ts";
import { inAir } from "./potting.ts";

type Fault = Refusal | null;
const fault = (where: string, why: string, cure: string): Refusal => ({ where, why, cure });

/** Why bodies of this geometry cannot stand as drawn, or null; `where` is the key under the geometry that is meant. */
export function shapeFault(drawn: FieldGeometry, ask: Pick<FieldAsk, "idealisation">): Fault {
  const geometry = inAir(drawn);
  return (
    pottingFault(drawn) ??
    electrodeFault(geometry) ??
    toroidFault(geometry, ask) ??
    boxFault(geometry) ??
    shieldFault(geometry) ??
    meetings(geometry) ??
    wallFault(geometry)
  );
}

function pottingFault({ potting, columnDiameter_m, shield }: FieldGeometry): Fault {
  if (potting === undefined || potting === null) return null;
  if (!(potting.permittivity >= 1))
    return fault("/potting/permittivity", "A compound's permittivity is not below that of air.", "Give 1 or more.");
  if (potting.radius_m < columnDiameter_m / 2)
    return fault("/potting/radius_m", "The compound is narrower than the column in it.", "Make it wider.");
  if (shield !== null && potting.radius_m > shield.radius_m)
    return fault(
      "/potting/radius_m",
      "The compound reaches past the shield.",
      "Make it narrower, or the shield wider.",
    );
  return null;
}

function electrodeFault({ electrode, columnDiameter_m, wire }: FieldGeometry): Fault {
  const rim = columnDiameter_m / 2;
  const { kind, radius_m, tubeRadius_m, thickness_m } = electrode;
  if (kind === "sphere" && radius_m < rim)
    return fault("/electrode/radius_m", "The sphere falls into the column on whose rim it rests.", "Make it wider.");
  if (kind === "disc" && radius_m < rim)
    return fault("/electrode/radius_m", "The disc is narrower than the column it covers.", "Make it wider.");
  if (kind === "disc" && thickness_m > 2 * radius_m)
    return fault("/electrode/thickness_m", "The half-round rim is thicker than the disc is wide.", "Make it thinner.");
  if (kind === "toroid" && tubeRadius_m >= radius_m)
    return fault("/electrode/tubeRadius_m", "The tube closes the toroid's hole: it meets itself.", "Make it thinner.");
  if (wire && wire.radius_m >= (kind === "sphere" ? radius_m : rim))
    return fault("/wire/radius_m", "The HV wire is as wide as what it stands on.", "Make it thinner.");
  return null;
}

/** Least distance of a toroid's tube centre from the column's wall between two heights. */
const toWall = (r: number, z: number, rim: number, from: number, to: number): number =>
  from > to ? Number.POSITIVE_INFINITY : Math.hypot(r - rim, z - Math.min(to, Math.max(from, z)));

function toroidFault(geometry: FieldGeometry, { idealisation }: Pick<FieldAsk, "idealisation">): Fault {
  const { electrode, elements, bandFraction, columnDiameter_m, columnLength_m, footHeight_m } = geometry;
  if (electrode.kind !== "toroid") return null;
  const top = topOf(geometry);
  const rim = columnDiameter_m / 2;
  const pitch = columnLength_m / elements;
  const own = idealisation === "bands" ? (bandFraction * pitch) / 2 : 0;
  const z = top + electrode.offset_m;
  const solid = idealisation === "bands" ? top - pitch + own : top - 1e-9 * pitch;
  if (toWall(electrode.radius_m, z, rim, footHeight_m, solid) <= electrode.tubeRadius_m)
    return fault("/electrode", "The toroid cuts into the column below its top node.", "Raise it or make it wider.");
  const inside = electrode.radius_m - electrode.tubeRadius_m < rim;
  if (
    inside &&
    z - electrode.tubeRadius_m < top - own &&
    z - electrode.tubeRadius_m > footHeight_m &&
    electrode.offset_m < 0
  )
    return fault("/electrode/offset_m", "The toroid sits inside the column.", "Raise it or make it wider.");
  if (z - electrode.tubeRadius_m <= 0)
    return fault("/electrode/offset_m", "The toroid reaches the floor.", "Raise it.");
  return null;
}

function boxFault({ box, footHeight_m }: FieldGeometry): Fault {
  if (box === null || box.top_m < footHeight_m) return null;
  return fault("/box/top_m", "The box reaches the column's foot: the tap would be at earth.", "Lower it.");
}

function shieldFault({ shield, box, columnDiameter_m }: FieldGeometry): Fault {
  if (shield === null) return null;
  if (shield.radius_m <= columnDiameter_m / 2)
    return fault("/shield/radius_m", "The shield is no wider than the column it goes round.", "Make it wider.");
  if (shield.to_m <= shield.from_m)
    return fault("/shield/to_m", "The shield ends below its beginning.", "Give the higher end as to_m.");
  if (box === null || shield.from_m >= box.top_m || shield.radius_m > box.radius_m) return null;
  if (shield.radius_m === box.radius_m)
    return fault("/shield/from_m", "The shield lies on the side of the box.", "Begin it at the top of the box.");
  if (shield.to_m <= box.top_m)
    return fault("/shield/to_m", "The whole shield is inside the box.", "Leave it out or raise it.");
  return null;
}

/** The electrode against shield and box. */
function meetings(geometry: FieldGeometry): Fault {
  const { shield, box, electrode, columnDiameter_m } = geometry;
  if (electrode.kind === "none") return null;
  const surfaces = electrodePieces({ ...geometry, wire: null }).map(({ curve }) => curve);
  const centre =
    electrode.kind === "sphere" ? [0, topOf(geometry) + sphereRise(electrode.radius_m, columnDiameter_m)] : null;
  const inBody = (r: number, z: number) =>
    centre !== null ? Math.hypot(r, z - centre[1]!) <= electrode.radius_m : touches(surfaces, r, z);
  if (shield !== null) {
    for (let k = 0; k <= 400; k++) {
      if (inBody(shield.radius_m, shield.from_m + ((shield.to_m - shield.from_m) * k) / 400))
        return fault("/shield", "The shield meets the electrode.", "Shorten it or make it wider.");
    }
  }
  if (box === null) return null;
  const low = surfaces.some((curve) =>
    Array.from({ length: 65 }, (_, k) => k / 64).some(
      (s) => radiusAt(curve, s) <= box.radius_m && heightAt(curve, s) <= box.top_m,
    ),
  );
  return low ? fault("/box", "The box meets the electrode.", "Lower it or make it narrower.") : null;
}

/** Whether a point lies on a surface or is cut off by it from the far outside (odd number of surfaces above it). */
function touches(surfaces: readonly Curve[], r: number, z: number): boolean {
  let above = 0;
  for (const curve of surfaces) {
    const s = nearestOn(curve, r, z);
    if (Math.hypot(r - radiusAt(curve, s), z - heightAt(curve, s)) < 1e-9 * lengthOf(curve)) return true;
    const steps = 64;
    for (let k = 0; k < steps; k++) {
      const [a, b] = [radiusAt(curve, k / steps), radiusAt(curve, (k + 1) / steps)];
      if (a <= r === b <= r) continue;
      if ((heightAt(curve, k / steps) + heightAt(curve, (k + 1) / steps)) / 2 > z) above += 1;
    }
  }
  return above % 2 === 1;
}

function wallFault(geometry: FieldGeometry): Fault {
  const { wallDistance_m, columnDiameter_m, electrode, shield, box } = geometry;
  if (wallDistance_m === null) return null;
  const widest = Math.max(
    columnDiameter_m / 2,
    electrode.kind === "none" ? 0 : electrode.radius_m + (electrode.kind === "toroid" ? electrode.tubeRadius_m : 0),
    shield?.radius_m ?? 0,
    box?.radius_m ?? 0,
  );
  if (wallDistance_m > widest * 1.001 && Number.isFinite(highestOf(geometry))) return null;
  return fault("/wallDistance_m", "The wall stands inside what is drawn.", "Measure it from the axis.");
}
