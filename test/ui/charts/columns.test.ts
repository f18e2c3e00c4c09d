import { describe, expect, it } from "vitest";
import { columnsCsv } from "../../../src/ui/charts/columns.ts";

describe("data of a chart as CSV", () => {
  it("has plain decimals in base units, CRLF and empty cells for what does not exist", () => {
    const csv = columnsCsv([
      { key: "time_s", head: "time / s", values: [1e-9, 2.5e-7, 1e21] },
      { key: "value", head: "value", values: [1, null, Number.NaN] },
    ]);
    expect(csv).toBe("time_s,value\r\n0.000000001,1\r\n0.00000025,\r\n1000000000000000000000,\r\n");
  });
});
