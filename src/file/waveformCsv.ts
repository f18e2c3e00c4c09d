/** A recorded waveform, as oscilloscopes export it: two columns, time and value, with or without lines above them. */
import type { Refusal, Result } from "../solver/index.ts";

export interface RecordedWaveform {
  readonly time_s: readonly number[];
  readonly value: readonly number[];
}

const most = { characters: 12_000_000, rows: 100_000, headLines: 60 } as const;

const refused = (where: string, why: string, cure: string): Result<never> => ({
  ok: false,
  error: { where, why, cure } satisfies Refusal,
});

const timeUnits: Readonly<Record<string, number>> = {
  s: 1,
  ms: 1e-3,
  us: 1e-6,
  µs: 1e-6,
  μs: 1e-6,
  ns: 1e-9,
  ps: 1e-12,
};

/**
 * Separator comma, semicolon or tab; a decimal comma only beside the other two. Lines above the first row of two numbers are its head;
 * a unit of time in the head's last line, in brackets, is heeded, else the times are seconds. Times may start anywhere, and must not
 * fall; they are counted from the first one. Never throws.
 * @example readWaveformCsv("time (us),ch1\n0,0\n1,1000") // 0 and 1 µs, 0 and 1000
 */
export function readWaveformCsv(text: string): Result<RecordedWaveform> {
  if (text.length > most.characters)
    return refused("the file", `It has more than ${most.characters} characters.`, "Export a shorter record.");
  if (text.includes("\0")) return refused("the file", "It is no plain text.", "Export it as CSV.");
  const lines = text.replace(/^\uFEFF/, "").split(/\r\n|\r|\n/);
  const separator = separatorOf(lines);
  const cells = (line: string) => line.split(separator).map((cell) => cell.trim().replace(/^"(.*)"$/, "$1"));
  const numbers = (line: string) =>
    cells(line)
      .slice(0, 2)
      .map((cell) => numberOf(cell, separator !== ","));
  const first = lines.findIndex(
    (line) => line.trim() !== "" && numbers(line).length === 2 && numbers(line).every(Number.isFinite),
  );
  if (first < 0 || first > most.headLines)
    return refused("the file", "No row of two numbers was found.", "Give two columns: time, then value.");
  const factor = unitOf(first === 0 ? "" : (cells(lines[first - 1]!)[0] ?? ""));
  const time_s: number[] = [];
  const value: number[] = [];
  for (let i = first; i < lines.length; i++) {
    if (lines[i]!.trim() === "") continue;
    const [t, v] = numbers(lines[i]!);
    if (t === undefined || v === undefined || !Number.isFinite(t) || !Number.isFinite(v))
      return refused(`line ${i + 1}`, `"${lines[i]!.slice(0, 60)}" is not two numbers.`, "Mend or delete the line.");
    if (time_s.length === most.rows)
      return refused("the file", `It has more than ${most.rows} rows.`, "Export a shorter record, or fewer points.");
    time_s.push(t * factor);
    value.push(v);
    if (time_s.length > 1 && time_s.at(-1)! < time_s.at(-2)!)
      return refused(`line ${i + 1}`, "Its time lies before the one above.", "Sort the rows by time.");
  }
  if (time_s.length < 2) return refused("the file", "It has one point only.", "Export a record of two points or more.");
  const start = time_s[0]!;
  return { ok: true, value: { time_s: time_s.map((t) => t - start), value } };
}

/** The first separator that stands in any of the lines looked at; semicolon and tab before comma, which may be a decimal mark. */
function separatorOf(lines: readonly string[]): "," | ";" | "\t" {
  const looked = lines.slice(0, most.headLines + 1).filter((line) => /\d/.test(line));
  const last = looked.at(-1) ?? "";
  return last.includes("\t") ? "\t" : last.includes(";") ? ";" : ",";
}

function numberOf(cell: string, decimalComma: boolean): number {
  const text = decimalComma ? cell.replace(",", ".") : cell;
  return /^[-+]?(\d+\.?\d*|\.\d+)([eE][-+]?\d+)?$/.test(text) ? Number(text) : Number.NaN;
}

/** `Time (us)`, `t [ms]`, `ns`: the unit named; none: seconds. */
function unitOf(head: string): number {
  const named = /[([]\s*([a-zµμ]+)\s*[)\]]/i.exec(head)?.[1] ?? head.trim();
  return timeUnits[named] ?? 1;
}
