/** Designators with runs drawn together: R1, R2, R3, R5 → "R1–R3, R5". The CSV names every one. */
export function designatorRuns(designators: readonly string[]): string {
  const runs: string[][] = [];
  for (const name of designators) {
    const run = runs[runs.length - 1];
    if (run !== undefined && follows(run[run.length - 1]!, name)) run.push(name);
    else runs.push([name]);
  }
  return runs.map((run) => (run.length > 2 ? `${run[0]}–${run[run.length - 1]}` : run.join(", "))).join(", ");
}

const numbered = /^(\D*)(\d+)(\D*)$/;

function follows(before: string, after: string): boolean {
  const [a, b] = [numbered.exec(before), numbered.exec(after)];
  return a !== null && b !== null && a[1] === b[1] && a[3] === b[3] && Number(b[2]) === Number(a[2]) + 1;
}
