import { inAir } from "../field/potting.ts";
import { formatQuantity, formatShare } from "../quantities/format.ts";
import { capacitiveLadder } from "./capacitiveLadder.ts";
import { type Judging, plainFinding } from "./judging.ts";
import { handRadius_m, proximityFormulas, proximityRecord } from "./proximityFormulas.ts";
import type { StringCapacitance } from "./stringCapacitance.ts";
import { wantedOf } from "./wanted.ts";

/** What stands near, or round, the column, and what it does to the reading of a fast edge. Plain data. */
export interface ProximityRow {
  readonly what: "wall" | "hand" | "compound";
  /** From the column's axis; null: it is round the column. */
  readonly distance_m: number | null;
  /** Relative change of the stray to earth. */
  readonly strayChange: number | null;
  /** Relative change of what is read at the first instant of an edge. */
  readonly readingChange: number | null;
}

/** Distances in column lengths. */
const walls = [2, 1, 0.5] as const;
const hands = [1, 0.5, 0.25] as const;
/** An epoxy compound to twice the column's diameter. */
const compound = { permittivity: 3.5, diameters: 2 } as const;
/** Share of the wanted uncertainty that something near may take. */
const share = 0.2;

/**
 * The table of what a wall, a hand or a potting compound does to the edge, the distance at which a wall takes a fifth of the wanted
 * uncertainty, and the keep-out distance: the larger of it and the approach distance that was typed. Writes `proximity.*`, `keepOut.*`.
 */
export function proximityOf(j: Judging, string: StringCapacitance): ProximityRow[] {
  const { sheet, design } = j;
  const l = design.geometry.columnLength_m;
  const Ce = sheet.number("strays.toEarth_F");
  sheet.given("/design/geometry/columnLength_m", l);
  const read = edgeReading(j, string);
  const shifted = (change: number | null) => (change === null ? null : read(1 + change) / read(1) - 1);
  const rows = [
    ...listed(
      j,
      "wall",
      walls.map((k) => k * l),
      shifted,
    ),
    ...listed(
      j,
      "hand",
      hands.map((k) => k * l),
      shifted,
    ),
    potted(j, Ce, shifted),
  ];
  keepOut(j, Ce, shifted);
  return rows;
}

type Shifted = (change: number | null) => number | null;

function listed(j: Judging, what: "wall" | "hand", distances: readonly number[], shifted: Shifted): ProximityRow[] {
  const { sheet } = j;
  const paths = { l: "/design/geometry/columnLength_m", Ce: "strays.toEarth_F", D: `proximity.${what}Distance_m` };
  const foot = "/design/geometry/footHeight_m";
  sheet.given(foot, j.design.geometry.footHeight_m);
  sheet.given(paths.D, distances);
  sheet.given("proximity.handRadius_m", handRadius_m);
  const count = distances.length;
  const changes =
    what === "wall"
      ? sheet.deriveEach("proximity.wallStray", proximityFormulas.wall, { ...paths, h: foot }, count)
      : sheet.deriveEach(
          "proximity.handStray",
          proximityFormulas.hand,
          { ...paths, r: "proximity.handRadius_m" },
          count,
        );
  const readings = changes.map(shifted);
  const inputs = { k: `proximity.${what}Stray`, C: "element.capacitance_F", Ce: "strays.eachToEarth_F" };
  sheet.solved(`proximity.${what}Reading`, proximityRecord, readings, inputs, 0);
  return distances.map((distance_m, i) => ({
    what,
    distance_m,
    strayChange: changes[i] ?? null,
    readingChange: readings[i] ?? null,
  }));
}

/** A compound counts as the wider column that it is taken for: the stray goes as 1/ln of the diameter. */
function potted(j: Judging, Ce: number | null, shifted: Shifted): ProximityRow {
  const { columnLength_m: l, columnDiameter_m: d } = j.design.geometry;
  const wide = inAir({
    ...j.design.geometry,
    elements: 2,
    potting: { permittivity: compound.permittivity, radius_m: (compound.diameters * d) / 2 },
  }).columnDiameter_m;
  const slender = (diameter: number) => Math.log((2 * l) / diameter);
  const strayChange = Ce === null || !(slender(wide) > 0.5) ? null : slender(d) / slender(wide) - 1;
  return { what: "compound", distance_m: null, strayChange, readingChange: shifted(strayChange) };
}

/** v/V at the first instant of an edge with every stray to earth multiplied. */
function edgeReading(j: Judging, { element_F, strays }: StringCapacitance): (factor: number) => number {
  const C2p = j.sheet.number("lvArm.capacitanceTotal_F") ?? 0;
  return (factor) => {
    const toEarth = strays.toEarth_F.map((each) => factor * each);
    const port = capacitiveLadder(element_F, toEarth, strays.toElectrode_F, strays.electrodeToTap_F);
    return port.transfer_F / (port.tap_F + C2p);
  };
}

const nearest = 0.25;
const farthest = 20;

/** Where a wall takes a fifth of the wanted uncertainty: by halving, since it does less the farther it stands. */
function proximityDistance(j: Judging, Ce: number | null, shifted: Shifted): number | null {
  const wanted = wantedOf(j.document.brief);
  if (Ce === null || wanted === null || j.document.brief.waveform.kind === "dc") return null;
  const { columnLength_m: l, footHeight_m: h } = j.design.geometry;
  const beyond = (D: number) => {
    const change = shifted(proximityFormulas.wall.compute({ l, Ce, h, D }));
    return change === null || Math.abs(change) > share * wanted;
  };
  if (beyond(farthest * l)) return null;
  if (!beyond(nearest * l)) return nearest * l;
  let near = nearest * l;
  let far = farthest * l;
  for (let step = 0; step < 40; step++) {
    const middle = Math.sqrt(near * far);
    if (beyond(middle)) near = middle;
    else far = middle;
  }
  return far;
}

function keepOut(j: Judging, Ce: number | null, shifted: Shifted): void {
  const { sheet, document } = j;
  const approach = document.brief.surroundings.approachDistance_m;
  const proximity = proximityDistance(j, Ce, shifted);
  const pointer = "/brief/surroundings/approachDistance_m";
  sheet.given(pointer, approach);
  const inputs = { l: "/design/geometry/columnLength_m", Ce: "strays.toEarth_F", C: "element.capacitance_F" };
  sheet.solved("keepOut.proximity_m", proximityRecord, proximity, inputs, 0);
  // Without a proximity distance the typed one stands alone.
  const distance = sheet.derive("keepOut.distance_m", proximityFormulas.keepOut, {
    approach: pointer,
    proximity: proximity === null ? pointer : "keepOut.proximity_m",
  });
  const reading =
    proximity === null
      ? "Nothing near moves the reading by as much as counts here, or the waveform is dc."
      : `A wall nearer than ${formatQuantity(proximity, "m")} takes more than ${formatShare(share)} of the wanted uncertainty from an edge.`;
  plainFinding(j, {
    id: "keepOut.distance",
    level: approach === null ? "caution" : "clear",
    what: "keep-out distance",
    actual: distance,
    unit: "m",
    reason:
      approach === null
        ? `${reading} The approach distance that local rules set is not stated: this alone keeps no person away. Type it under surroundings.`
        : `${reading} ${formatQuantity(approach, "m")} is the approach distance typed; the larger of the two is printed.`,
    source: proximityFormulas.keepOut.source,
    path: "keepOut.distance_m",
  });
}
