import { describe, expect, it } from "vitest";
import { solveField } from "../../../src/solver/field/solveField.ts";
import { idealSource } from "../../../src/solver/network/ladderNetwork.ts";
import { responseTime } from "../../../src/solver/network/stepFigures.ts";
import { expectRelative } from "../../support/relative.ts";
import { column, drawn, sphere } from "./invented.ts";

const none = { resistance_ohm: Number.POSITIVE_INFINITY, capacitance_F: 0 };

describe.each(drawn)("the ladder of: %s", (_, geometry) => {
  const strays = solveField(geometry);
  const { toEarth_F, toElectrode_F, series_F, electrodeToTap_F } = strays.ladder;
  const n = geometry.elements;
  const inner = Array.from({ length: n - 1 }, (_, k) => (k + 1) / n);
  it("has one value an inner node or an element, all positive", () => {
    expect([toEarth_F.length, toElectrode_F.length, series_F.length]).toEqual([n - 1, n - 1, n]);
    for (const each of [...toEarth_F, ...toElectrode_F, ...series_F.slice(0, -1), electrodeToTap_F])
      expect(each).toBeGreaterThan(0);
    expect(series_F.at(-1), "the last coupling stands in toElectrode_F").toBe(0);
  });
  it("has the charges of the whole matrix with the linear profile: the same M and the same energy", () => {
    let M = -electrodeToTap_F;
    let energy = electrodeToTap_F;
    inner.forEach((x, k) => {
      M += (toEarth_F[k]! * x - toElectrode_F[k]! * (1 - x)) * (1 - x);
      energy += toEarth_F[k]! * x * x + toElectrode_F[k]! * (1 - x) ** 2;
    });
    for (const each of series_F) {
      M -= each / n ** 2;
      energy += each / n ** 2;
    }
    const electrodeToEarth =
      strays.electrodeSelf_F - strays.tapToElectrode_F - toElectrode_F.reduce((sum, each) => sum + each, 0);
    expectRelative(M, strays.m_F, 1e-9, "Σ q_i (1 − x_i)", strays.ceEff_F / 6);
    expectRelative(energy + electrodeToEarth, strays.inputLow_F, 1e-9, "xᵀCx");
  });
  it("responds in R·M into a low-ohmic tap, by the network's own elimination", () => {
    const R = 1e9;
    const T = responseTime({
      n,
      resistance_ohm: new Float64Array(n).fill(R / n),
      capacitance_F: Float64Array.from(series_F),
      toEarth_F: Float64Array.from(toEarth_F),
      toElectrode_F: Float64Array.from(toElectrode_F),
      electrodeToTap_F,
      lv: { resistance_ohm: R * 1e-9, capacitance_F: 0, inductance_H: 0 },
      protector: none,
      cable: { capacitance_F: 0, line: null },
      source: idealSource,
      instrument: { ...none, protector: none },
      seriesProtector: { resistance_ohm: 0, at: "divider" },
    });
    expectRelative(T, R * strays.m_F, 1e-6, "T = R·M", R * (strays.ceEff_F / 6 + strays.chEff_F / 3));
  });
});

describe("a column deep in a shield", () => {
  it("has couplings of none, not of the wrong sign", () => {
    const geometry = column(40, 0.5, 12, 0.2, { shield: { radius_m: 0.03, from_m: 0.05, to_m: 0.75 } });
    const { toEarth_F, toElectrode_F, adjacent_F, ladder } = solveField({ ...geometry, electrode: sphere(0.025) });
    for (const each of [...toEarth_F, ...toElectrode_F, ...adjacent_F, ...ladder.series_F, ladder.electrodeToTap_F])
      expect(each).toBeGreaterThanOrEqual(0);
  });
});
