import { describe, expect, it } from "vitest";
import { balancingElectrode } from "../../../src/solver/field/balancingElectrode.ts";
import { estimateFormulas } from "../../../src/solver/field/estimateFormulas.ts";
import type { FieldElectrode } from "../../../src/solver/field/fieldGeometry.ts";
import { instantEstimate } from "../../../src/solver/field/instantEstimate.ts";
import { proximity } from "../../../src/solver/field/proximity.ts";
import { solveField } from "../../../src/solver/field/solveField.ts";
import { metre } from "../../../src/solver/quantities/quantity.ts";
import { verticalCylinderCapacitance } from "../../../src/solver/standards/strayCapacitance.ts";
import { expectRelative } from "../../support/relative.ts";
import { column, disc, sphere, toroid } from "./invented.ts";

const film = { idealisation: "distributed" } as const;
const grid = [4, 10, 30, 100].flatMap((slender) => [0.02, 0.2, 1, 5].map((foot) => [slender, foot] as const));

/** The formulas were fitted to another solve of the same column, made independently of this one. */
describe("fitted formulas against the solve", () => {
  it.each(grid)("bare graded column, l/d %f, h/l %f: Ce_eff within 1.1 %, M within 1.8 %", (slender, foot) => {
    const solved = solveField(column(20, 1, slender, foot), film);
    const { ceEff_F, m_F } = instantEstimate(column(20, 1, slender, foot));
    expectRelative(solved.ceEff_F, ceEff_F!, 0.011, "as its record says");
    expectRelative(solved.m_F, m_F!, 0.018, "as its record says");
  });
  it.each([
    [10, 0.1],
    [10, 1],
    [30, 0.3],
    [30, 1],
  ])("the textbook's vertical cylinder is within -2 … +3 % of it, l/d %f, h/l %f", (slender, foot) => {
    // Kuffel, Zaengl, Kuffel, 2nd ed. (2000), ch. 3, from memory.
    const textbook = verticalCylinderCapacitance(metre(1), metre(1 / slender), metre(foot));
    const { ceEff_F } = solveField(column(20, 1, slender, foot), film);
    expect(textbook / ceEff_F - 1).toBeGreaterThan(-0.025);
    expect(textbook / ceEff_F - 1).toBeLessThan(0.035);
  });
  const balances = (electrode: FieldElectrode, slender: number, foot: number) => {
    const { m_F, ceEff_F, chEff_F } = solveField(column(20, 1, slender, foot, { electrode }), film);
    return { share: m_F / (ceEff_F / 6 + chEff_F / 3), chOverCe: chEff_F / ceEff_F };
  };
  it.each([
    [8, 0.5],
    [20, 0.4],
    [20, 2],
    [100, 0.5],
  ])("the fitted sphere balances within 0.8 % of its size, l/d %f, h/l %f", (l_d, h) => {
    const Φ = estimateFormulas.floor.compute({ l: 1, h })!;
    const a = estimateFormulas.balancingSphere.compute({ l: 1, d: 1 / l_d, h, Φ })!;
    expect(balances(sphere(a * 0.991), l_d, h).share).toBeGreaterThan(0);
    expect(balances(sphere(a * 1.009), l_d, h).share).toBeLessThan(0);
  });
  it.each([
    [8, 0.5],
    [10, 0.1],
    [40, 1],
    [100, 0.5],
  ])("the fitted toroid balances within 1.7 % of its size, l/d %f, h/l %f", (l_d, h) => {
    const Φ = estimateFormulas.floor.compute({ l: 1, h })!;
    const R = estimateFormulas.balancingToroid.compute({ l: 1, d: 1 / l_d, h, Φ })!;
    const of = (size: number) => balances(toroid(size * 0.8, size * 0.2), l_d, h).share;
    expect(of(R * 0.982)).toBeGreaterThan(0);
    expect(of(R * 1.018)).toBeLessThan(0);
  });
  it("balance lies near Ch = 0.38 Ce; Ch = Ce/2 would over-balance", () => {
    const Φ = estimateFormulas.floor.compute({ l: 1, h: 0.5 })!;
    const a = estimateFormulas.balancingSphere.compute({ l: 1, d: 1 / 40, h: 0.5, Φ })!;
    expectRelative(balances(sphere(a), 40, 0.5).chOverCe, 0.38, 0.05, "independent solve, two digits");
  });
  it.each([
    [8, 0.5, 0.5],
    [20, 0.4, 1],
    [20, 2, 0.3],
    [60, 1, 0.8],
  ])("under a sphere and a toroid, l/d %f, h/l %f, %f of the balancing size", (l_d, h, s) => {
    const Φ = estimateFormulas.floor.compute({ l: 1, h })!;
    const of = { l: 1, d: 1 / l_d, h, Φ };
    const a = s * estimateFormulas.balancingSphere.compute(of)!;
    const R = s * estimateFormulas.balancingToroid.compute(of)!;
    for (const [electrode, allowed] of [
      [sphere(a), 0.04],
      [toroid(0.8 * R, 0.2 * R), 0.07],
    ] as const) {
      const drawn = column(20, 1, l_d, h, { electrode });
      const estimate = instantEstimate(drawn);
      const solved = solveField(drawn, film);
      const under = estimate.underElectrode!;
      expectRelative(solved.ceEff_F, under.ceEff_F, allowed, "Ce_eff");
      expectRelative(solved.chEff_F, under.chEff_F, 0.02, "Ch_eff, of the bare Ce_eff", estimate.ceEff_F!);
      expectRelative(solved.m_F, under.m_F, allowed, "M, of the bare M", estimate.m_F!);
    }
  });
  it("are none outside where they were fitted", () => {
    expect(instantEstimate(column(20, 1, 3, 0.3))).toMatchObject({ ceEff_F: null, chEff_F: null, m_F: null });
    expect(instantEstimate(column(20, 1, 10, 6)).ceEff_F).toBeNull();
    expect(instantEstimate(column(20, 1, 10, 0.3, { electrode: sphere(0.1) })).holds).toMatch(/electrode/);
  });
});

describe("the balancing electrode", () => {
  const geometry = column(20, 0.5, 16, 0.5);
  it.each(["sphere", "toroid", "disc"] as const)("%s: M is nothing", (kind) => {
    const found = balancingElectrode(geometry, kind);
    if (!found.ok) throw new Error(found.error.why);
    const { electrode, strays, solves } = found.value;
    const again = solveField({ ...geometry, electrode });
    expect(again.m_F).toBe(strays.m_F);
    expectRelative(again.m_F, 0, 1e-3, "within 0.1 % of Ce/6 + Ch/3", again.ceEff_F / 6 + again.chEff_F / 3);
    expect(solves).toBeLessThan(8);
  });
  it("keeps the thickness of a disc that is drawn", () => {
    const found = balancingElectrode({ ...geometry, electrode: disc(0.1, 0.004) }, "disc");
    expect(found.ok && found.value.electrode.thickness_m).toBe(0.004);
  });
  it("is refused where the surroundings leave no room", () => {
    const found = balancingElectrode({ ...geometry, wallDistance_m: 0.15 }, "sphere");
    expect(found.ok).toBe(false);
  });
});

describe("what stands near a balanced column", () => {
  const found = balancingElectrode(column(20, 0.5, 16, 0.5), "toroid", film);
  if (!found.ok) throw new Error(found.error.why);
  const geometry = column(20, 0.5, 16, 0.5, { electrode: found.value.electrode });
  const rows = proximity(geometry, film);
  const alone = rows.find(({ what }) => what === "as drawn")!;
  const shift = (what: string, distance: number) =>
    (rows.find((row) => row.what === what && row.distance_m === distance)!.m_F - alone.m_F) / (alone.ceEff_F / 6);
  it("walls all round add 42 % of Ce/6 to M at one length, 9 % at two (independent axisymmetric solve, two digits)", () => {
    expectRelative(shift("wall all round", 0.5), 0.42, 0.1, "geometry not stated with it");
    expectRelative(shift("wall all round", 1), 0.09, 0.15, "geometry not stated with it");
  });
  it("a plane wall adds less than walls all round, and less the farther it is", () => {
    expect(shift("plane wall", 0.5)).toBeLessThan(shift("wall all round", 0.5) / 2);
    expect(shift("plane wall", 1)).toBeLessThan(shift("plane wall", 0.5) / 2);
    expect(shift("plane wall", 1)).toBeGreaterThan(0);
  });
  it("an HV wire takes from M", () => {
    expect(shift("HV wire", 0.5)).toBeLessThan(0);
    expect(shift("HV wire", 1.5)).toBeLessThan(shift("HV wire", 0.5));
  });
});
