import type { LadderNetwork } from "../../src/solver/network/ladderNetwork.ts";
import { nodeVoltages } from "../../src/solver/network/nodeVoltages.ts";
import { stepFigures } from "../../src/solver/network/stepFigures.ts";
import { sweep } from "../../src/solver/network/sweep.ts";
import { stepResponse } from "../../src/solver/network/timeResponse.ts";
import { add, type Complex, complex, divide, multiply } from "../../src/solver/quantities/complex.ts";
import { sketch } from "../solver/network/invented.ts";
import type { Benchmark } from "./benchmark.ts";

const network = (n: number) =>
  sketch({ n, R: 1e9 / n, C: 1e-11 * n, Ce: 1e-11, Ch: 2e-12, R2: 1e6, C2: 2e-8, Rm: 1e7, Cm: 1e-11, cable: 1e-10 });
const frequencies = Float64Array.from({ length: 400 }, (_, i) => 10 ** (i / 50 - 1));
const times = Float64Array.from({ length: 1000 }, (_, i) => 10 ** (i / 100 - 9));

/** Reference: the plain recursion on records, one frequency at a time, as one would write it first. */
function plainSweep(ladder: LadderNetwork): number {
  let sum = 0;
  for (const f of frequencies) {
    const w = 2 * Math.PI * f;
    const y = (i: number): Complex => complex(1 / ladder.resistance_ohm[i]!, w * ladder.capacitance_F[i]!);
    let E: Complex = complex(0, 0);
    let H: Complex = y(ladder.n - 1);
    for (let i = ladder.n - 2; i >= 0; i--) {
      E = add(E, complex(0, w * ladder.toEarth_F[i]!));
      H = add(H, complex(0, w * ladder.toElectrode_F[i]!));
      const S = add(add(E, H), y(i));
      const share = divide(y(i), S);
      E = multiply(E, share);
      H = multiply(H, share);
    }
    const lv = complex(
      1 / ladder.lv.resistance_ohm + 1 / ladder.instrument.resistance_ohm,
      w * (ladder.lv.capacitance_F + ladder.cable.capacitance_F + ladder.instrument.capacitance_F),
    );
    sum += divide(H, add(add(E, H), lv)).re;
  }
  return sum;
}

/** Reference: dense complex elimination of the nodal matrix at each frequency. */
function denseSweep(ladder: LadderNetwork): number {
  const { n } = ladder;
  let sum = 0;
  for (const f of frequencies) {
    const w = 2 * Math.PI * f;
    const re = Array.from({ length: n }, () => new Float64Array(n));
    const im = Array.from({ length: n }, () => new Float64Array(n));
    const bre = new Float64Array(n);
    const bim = new Float64Array(n);
    const put = (i: number, j: number, g: number, b: number) => {
      re[i]![j] = re[i]![j]! + g;
      im[i]![j] = im[i]![j]! + b;
    };
    for (let i = 0; i < n; i++) {
      const g = 1 / ladder.resistance_ohm[i]!;
      const b = w * ladder.capacitance_F[i]!;
      put(i, i, g, b);
      if (i < n - 1) {
        put(i + 1, i + 1, g, b);
        put(i, i + 1, -g, -b);
        put(i + 1, i, -g, -b);
        put(i + 1, i + 1, 0, w * (ladder.toEarth_F[i]! + ladder.toElectrode_F[i]!));
        bim[i + 1] = bim[i + 1]! + w * ladder.toElectrode_F[i]!;
      } else {
        bre[i] = bre[i]! + g;
        bim[i] = bim[i]! + b;
      }
    }
    put(0, 0, 1 / ladder.lv.resistance_ohm, w * ladder.lv.capacitance_F);
    for (let k = n - 1; k > 0; k--) {
      const d = re[k]![k]! ** 2 + im[k]![k]! ** 2;
      for (let i = 0; i < k; i++) {
        const [a, b] = [re[i]![k]!, im[i]![k]!];
        if (a === 0 && b === 0) continue;
        const fr = (a * re[k]![k]! + b * im[k]![k]!) / d;
        const fi = (b * re[k]![k]! - a * im[k]![k]!) / d;
        for (let j = 0; j <= k; j++)
          put(i, j, -(fr * re[k]![j]! - fi * im[k]![j]!), -(fr * im[k]![j]! + fi * re[k]![j]!));
        bre[i] = bre[i]! - (fr * bre[k]! - fi * bim[k]!);
        bim[i] = bim[i]! - (fr * bim[k]! + fi * bre[k]!);
      }
    }
    sum += (bre[0]! * re[0]![0]! + bim[0]! * im[0]![0]!) / (re[0]![0]! ** 2 + im[0]![0]! ** 2);
  }
  return sum;
}

const [n60, n400, n4000] = [network(60), network(400), network(4000)];
const plain = "one frequency at a time on records";

export const networkBenchmarks: readonly Benchmark[] = [
  {
    name: "sweep, 400 frequencies × 60 elements",
    run: () => sweep(n60, frequencies),
    referenceName: plain,
    reference: () => plainSweep(n60),
    bar: 0.7,
  },
  {
    name: "sweep, 400 frequencies × 400 elements",
    run: () => sweep(n400, frequencies),
    referenceName: plain,
    reference: () => plainSweep(n400),
    bar: 0.7,
  },
  {
    name: "sweep, 400 frequencies × 4000 elements",
    run: () => sweep(n4000, frequencies),
    referenceName: "the same × 400 elements: linear is 10",
    reference: () => sweep(n400, frequencies),
    bar: 12,
  },
  {
    name: "sweep, 400 frequencies × 4000 elements, against records",
    run: () => sweep(n4000, frequencies),
    referenceName: plain,
    reference: () => plainSweep(n4000),
    bar: 0.7,
  },
  {
    name: "sweep, 400 frequencies × 60 elements, dense",
    run: () => sweep(n60, frequencies),
    referenceName: "dense complex elimination",
    reference: () => denseSweep(n60),
    bar: 0.05,
  },
  {
    name: "all nodes, 400 frequencies × 60 elements",
    run: () => nodeVoltages(n60, frequencies),
    referenceName: "dense complex elimination, output alone",
    reference: () => denseSweep(n60),
    bar: 0.05,
  },
  {
    name: "all nodes, 400 frequencies × 400 elements",
    run: () => nodeVoltages(n400, frequencies),
    referenceName: `${plain}, output alone`,
    reference: () => plainSweep(n400),
    bar: 0.7,
  },
  {
    name: "all nodes, 400 frequencies × 4000 elements",
    run: () => nodeVoltages(n4000, frequencies),
    referenceName: "the same × 400 elements: linear is 10",
    reference: () => nodeVoltages(n400, frequencies),
    bar: 12,
  },
  {
    name: "step, 1000 times × 60 elements",
    run: () => stepResponse(n60, times),
    referenceName: "sweep on records, 400 × 60",
    reference: () => plainSweep(n60),
    bar: 3,
  },
  {
    name: "step, 1000 times × 400 elements",
    run: () => stepResponse(n400, times),
    referenceName: "sweep on records, 400 × 400",
    reference: () => plainSweep(n400),
    bar: 1.5,
  },
  {
    name: "figures of the step, 60 elements",
    run: () => stepFigures(n60),
    referenceName: "sweep on records, 400 × 60",
    reference: () => plainSweep(n60),
    bar: 10,
  },
];
export const frameReference = { name: "sweep on records, 400 × 400", run: () => plainSweep(n400) };
export const denseReference = { name: "dense complex elimination, 400 × 60", run: () => denseSweep(n60) };
