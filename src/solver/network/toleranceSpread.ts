import { seededBy } from "../quantities/random.ts";
import { dcScaleFactor } from "./dcScaleFactor.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import type { ToleranceAnswer, ToleranceAsk } from "./networkForm.ts";

/**
 * How far the tolerances of elements, LV resistor and instrument move the dc scale factor: its sensitivity to each (relative change
 * over relative change, exact), the standard uncertainty with every tolerance rectangular (half-width/√3) or normal (half-width/k),
 * the corners (elements up, LV arm and instrument down, and the reverse) and, if asked, rectangular draws. An absent resistance has
 * the sensitivity 0. Null throughout where an element blocks dc.
 */
export function toleranceSpread(network: LadderNetwork, ask: ToleranceAsk): ToleranceAnswer {
  const R = network.resistance_ohm;
  const R1 = sum(R);
  const R2 = network.lv.resistance_ohm;
  const Rm = network.instrument.resistance_ohm;
  const scaleFactor = dcScaleFactor(network);
  if (!Number.isFinite(R1)) return none(network.n, ask.samples !== null);
  const F = scaleFactor.at(R1, R2, Rm);
  const perOhm = scaleFactor.perOhm(R2, Rm) / F;
  const element = Array.from(R, (each) => each * perOhm);
  const lvArm = -scaleFactor.perLvConductance(R1, Rm) / R2 / F;
  const instrument = -scaleFactor.perInstrumentConductance(R1, R2) / Rm / F;
  const spread = Math.hypot(
    ...element.map((each, i) => each * ask.element[i]!),
    lvArm * ask.lvArm,
    instrument * ask.instrument,
  );
  const corner = (sign: number) =>
    scaleFactor.at(
      sum(R.map((each, i) => each * (1 + sign * ask.element[i]!))),
      R2 * (1 - sign * ask.lvArm),
      Rm * (1 - sign * ask.instrument),
    );
  return {
    sensitivity: { element, lvArm, instrument },
    standardUncertainty: { rectangular: spread / Math.sqrt(3), normal: spread / ask.k },
    worst: { least: corner(-1), greatest: corner(1) },
    ...(ask.samples === null ? {} : { sampled: sampled(network, ask, ask.samples, F) }),
  };
}

type Sampled = NonNullable<ToleranceAnswer["sampled"]>;

const sum = (values: Float64Array): number => values.reduce((total, each) => total + each, 0);

/** Draws with the seed's Mersenne Twister, one number for each part that has a tolerance: elements from the tap, LV arm, instrument. */
function sampled(network: LadderNetwork, ask: ToleranceAsk, count: number, F: number): Sampled {
  const R = network.resistance_ohm;
  const scaleFactor = dcScaleFactor(network);
  // A draw x gives the part R (1 + h (2 (x + ½)/2³² − 1)): a fixed share of the string and one that goes with x.
  const uncertain = Float64Array.from(ask.element.flatMap((h, i) => (h > 0 ? [(R[i]! * h) / 2 ** 31] : [])));
  const fixed = sum(R.map((each, i) => each * (1 - ask.element[i]! + ask.element[i]! / 2 ** 32)));
  const random = seededBy(ask.seed);
  const shunt = (nominal: number, h: number) =>
    h > 0 ? nominal * (1 + h * ((random.next() + 0.5) / 2 ** 31 - 1)) : nominal;
  const deviation = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    let R1 = fixed;
    for (let i = 0; i < uncertain.length; i++) R1 += uncertain[i]! * random.next();
    const R2 = shunt(network.lv.resistance_ohm, ask.lvArm);
    const Rm = shunt(network.instrument.resistance_ohm, ask.instrument);
    deviation[k] = scaleFactor.at(R1, R2, Rm) / F - 1;
  }
  const mean = sum(deviation) / count;
  const squares = deviation.reduce((total, each) => total + (each - mean) ** 2, 0);
  deviation.sort();
  return {
    mean: F * (1 + mean),
    standardDeviation: count > 1 ? Math.sqrt(squares / (count - 1)) : null,
    q025: quantile(deviation, 0.025),
    q500: quantile(deviation, 0.5),
    q975: quantile(deviation, 0.975),
  };
}

/** Linear between the order statistics: at position share·(N − 1), counted from 0. */
export function quantile(sorted: Float64Array, share: number): number {
  const position = share * (sorted.length - 1);
  const below = Math.floor(position);
  const low = sorted[below]!;
  const high = sorted[Math.min(below + 1, sorted.length - 1)]!;
  return low + (position - below) * (high - low);
}

const none = (n: number, withSamples: boolean): ToleranceAnswer => ({
  sensitivity: { element: new Array<null>(n).fill(null), lvArm: null, instrument: null },
  standardUncertainty: { rectangular: null, normal: null },
  worst: { least: null, greatest: null },
  ...(withSamples ? { sampled: { mean: null, standardDeviation: null, q025: null, q500: null, q975: null } } : {}),
});
