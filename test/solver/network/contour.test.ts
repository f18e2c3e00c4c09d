import { describe, it } from "vitest";
import { decadeContour, invert, weighted, wideContour } from "../../../src/solver/network/contour.ts";
import { over } from "../../../src/solver/network/decade.ts";
import { expectRelative } from "../../support/relative.ts";

// Transform pairs of any table of Laplace transforms.
describe("inverse transforms on a contour", () => {
  it("a decade's contour gives exp(−at) over its decade, whatever a", () => {
    const contour = decadeContour(1);
    for (const a of [0, 1e-6, 0.3, 3, 30, 1e6]) {
      const F = weighted(contour, (k) => over(1, 0, contour.sre[k]! + a, contour.sim[k]!));
      for (const t of [0.1, 0.2, 0.5, 1])
        expectRelative(invert(contour, F, t), Math.exp(-a * t), 1e-10, "24 nodes leave about 3e-11", 1);
    }
  });
  it("a wide contour gives cos(ωt) up to its reach, and exp(−at) as well", () => {
    for (const reach of [8, 50, 300, 2000]) {
      const contour = wideContour(1, reach);
      for (const omega of [reach, reach / 2, 1]) {
        const F = weighted(contour, (k) => {
          const [a, b] = [contour.sre[k]!, contour.sim[k]!];
          return over(a, b, a * a - b * b + omega * omega, 2 * a * b);
        });
        for (const t of [0.7, 0.85, 1])
          expectRelative(invert(contour, F, t), Math.cos(omega * t), 3e-9, "tried up to reach·t = 3000", 1);
      }
      for (const a of [0.5, 50, 1e5]) {
        const F = weighted(contour, (k) => over(1, 0, contour.sre[k]! + a, contour.sim[k]!));
        expectRelative(invert(contour, F, 1), Math.exp(-a), 3e-9, "poles on the negative real axis", 1);
      }
    }
  });
});
