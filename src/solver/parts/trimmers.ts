import type { TrimmerFamily } from "../job/part.ts";

const rheostat = (
  id: string,
  name: string,
  spans: readonly number[],
  turns: number,
  tolerance: number,
): TrimmerFamily => ({
  id,
  kind: "trimmer",
  name,
  origin: "catalogue",
  tolerance,
  bodyLength_m: 0.0095,
  bodyDiameter_m: 0.0095,
  quantity: "ohm",
  spans,
  leastShare: 0,
  turns,
  ratedVoltage_V: 300,
});

const capacitor = (
  id: string,
  name: string,
  spans: readonly number[],
  leastShare: number,
  V: number,
): TrimmerFamily => ({
  id,
  kind: "trimmer",
  name,
  origin: "catalogue",
  tolerance: 0.1,
  bodyLength_m: 0.01,
  bodyDiameter_m: 0.008,
  quantity: "F",
  spans,
  leastShare,
  turns: 0.5,
  ratedVoltage_V: V,
});

/** Generic trimmers that are commonly sold, from memory. Rheostats end at 2 MΩ: larger ones can hardly be bought. */
export const trimmers: readonly TrimmerFamily[] = [
  rheostat(
    "trim-multiturn",
    "cermet trimmer, 25 turns",
    [100, 200, 500, 1e3, 2e3, 5e3, 1e4, 2e4, 5e4, 1e5, 1.5e5, 2e5, 2.5e5, 5e5, 1e6, 2e6],
    25,
    0.1,
  ),
  rheostat("trim-single", "cermet trimmer, one turn", [100, 500, 1e3, 5e3, 1e4, 5e4, 1e5, 5e5, 1e6], 1, 0.2),
  capacitor("trim-film", "film trimmer capacitor", [10e-12, 22e-12, 60e-12, 100e-12], 5 / 60, 200),
  capacitor("trim-air", "air trimmer capacitor", [10e-12, 30e-12], 0.1, 250),
];
