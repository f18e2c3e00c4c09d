import { describe, expect, it } from "vitest";
import { inAir, pottingFormulas } from "../../../src/solver/field/potting.ts";
import { shapeFault } from "../../../src/solver/field/shapeFault.ts";
import { solveField } from "../../../src/solver/field/solveField.ts";
import { epsilon0 } from "../../../src/solver/standards/constants.ts";
import { expectRelative } from "../../support/relative.ts";
import { drawn } from "./invented.ts";

const bare = drawn.find(([name]) => name.startsWith("bare"))![1];
const potted = (permittivity: number, share = 2) => ({
  ...bare,
  potting: { permittivity, radius_m: (share * bare.columnDiameter_m) / 2 },
});

describe("a potted column", () => {
  it("of permittivity 1, or of no thickness, is the column in air", () => {
    expectRelative(inAir(potted(1)).columnDiameter_m, bare.columnDiameter_m, 1e-12, "nothing there");
    expectRelative(inAir(potted(3.5, 1)).columnDiameter_m, bare.columnDiameter_m, 1e-12, "nothing there");
    expectRelative(solveField(potted(1)).ceEff_F, solveField(bare).ceEff_F, 1e-9, "the same solve");
  });
  it("tends to a column as wide as the compound, and has more stray the more the compound holds", () => {
    expectRelative(inAir(potted(100)).columnDiameter_m, 2 * bare.columnDiameter_m, 0.01, "the compound conducts");
    const strays = [1, 2, 3.5, 10].map((each) => solveField(potted(each)).ceEff_F);
    for (let i = 1; i < strays.length; i++) expect(strays[i]).toBeGreaterThan(strays[i - 1]!);
  });
  it("is two coaxial layers in series between long cylinders (any field theory text)", () => {
    const [a, b, c, εr] = [0.01, 0.02, 0.05, 3.5];
    const aEff = pottingFormulas.equivalentRadius.compute({ a, b, εr }) as number;
    const layers = (2 * Math.PI * epsilon0) / (Math.log(b / a) / εr + Math.log(c / b));
    expectRelative((2 * Math.PI * epsilon0) / Math.log(c / aEff), layers, 1e-12, "the same series");
  });
  it("within a long shield has per pitch in its middle what two coaxial layers have", () => {
    const long = {
      ...bare,
      elements: 40,
      columnDiameter_m: 0.02,
      columnLength_m: 0.8,
      footHeight_m: 0.5,
      shield: { radius_m: 0.05, from_m: 0.3, to_m: 1.5 },
      potting: { permittivity: 3.5, radius_m: 0.02 },
    };
    const { toEarth_F } = solveField(long, { idealisation: "distributed" });
    const perPitch = ((2 * Math.PI * epsilon0) / (Math.log(2) / 3.5 + Math.log(2.5))) * 0.02;
    expectRelative(toEarth_F[19]!, perPitch, 0.01, "far from both ends of the shield");
  });
  it("that cannot stand is refused by name", () => {
    expect(shapeFault(potted(3.5, 0.5), { idealisation: "bands" })?.where).toBe("/potting/radius_m");
    expect(shapeFault(potted(0.5), { idealisation: "bands" })?.where).toBe("/potting/permittivity");
  });
});
