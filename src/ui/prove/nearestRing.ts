import type { Ring } from "../../solver/index.ts";

/** Within this share of it a measured ring may be the predicted one: strays and lengths are not known better. */
const close = 0.25;

/** The ring nearest to a measured one on a log scale; null where there is none. One that is damped out is not asked. */
export function nearestRing(
  rings: readonly Ring[],
  measured_Hz: number,
): { readonly ring: Ring; readonly close: boolean } | null {
  const far = (ring: Ring) => Math.abs(Math.log(measured_Hz / ring.frequency_Hz));
  const ring = rings
    .filter((each) => each.damping === null || each.damping < 1)
    .reduce<Ring | null>((best, each) => (best === null || far(each) < far(best) ? each : best), null);
  return ring === null ? null : { ring, close: far(ring) <= Math.log(1 + close) };
}
