import { describe, expect, it } from "vitest";
import { readWaveformCsv } from "../../src/file/waveformCsv.ts";

const read = (text: string) => {
  const found = readWaveformCsv(text);
  if (!found.ok) throw new Error(`${found.error.where}: ${found.error.why}`);
  return found.value;
};
const refusal = (text: string) => {
  const found = readWaveformCsv(text);
  return found.ok ? "" : `${found.error.where}: ${found.error.why}`;
};

describe("a recorded waveform as CSV", () => {
  it("two columns, times from the first one, seconds without a unit", () => {
    expect(read("1e-3,5\n2e-3,7\n")).toEqual({ time_s: [0, 1e-3], value: [5, 7] });
  });
  it.each<[string, string, number[]]>([
    ["a head with a unit", "Time (us),Channel 1 (V)\r\n0,0\r\n2,1\r\n", [0, 2e-6]],
    ["several head lines, the last with the unit", "Model,x\nDate,y\n\nt [ms],v\n0,0\n2,1", [0, 2e-3]],
    ["semicolons and decimal commas", "t (s);v\n0,0;1,5\n0,5;2,5", [0, 0.5]],
    ["tabs", "0\t1\n1e-6\t2", [0, 1e-6]],
    ["quoted cells, a byte-order mark, more columns", '\uFEFF"t(ns)","a","b"\n"0","1","9"\n"4","2","9"', [0, 4e-9]],
    ["blank lines between", "0,1\n\n3,2\n", [0, 3]],
  ])("%s", (_, text, times) => {
    const found = read(text);
    expect(found.time_s.map((t) => Number(t.toPrecision(12)))).toEqual(times);
    expect(found.value).toHaveLength(times.length);
  });
  it.each<[string, string, RegExp]>([
    ["nothing", "", /No row of two numbers/],
    ["one point", "0,1", /one point only/],
    ["words below numbers", "0,1\n1,2\n2,end", /line 3: .* is not two numbers/],
    ["times that fall", "0,1\n2,1\n1,1", /line 3: Its time lies before/],
    ["infinities", "0,1\n1,1e999", /line 2/],
    ["binary", "PK\0\0", /no plain text/],
    ["too many rows", `${"1,1\n".repeat(100_001)}`, /more than 100000 rows/],
  ])("refuses %s, and says where", (_, text, why) => {
    expect(refusal(text)).toMatch(why);
  });
});
