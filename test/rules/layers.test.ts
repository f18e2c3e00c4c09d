/** The arrows between rooms, read against every import line of src. */
import { readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";

const src = fileURLToPath(new URL("../../src", import.meta.url));
const files = readdirSync(src, { recursive: true, encoding: "utf8" }).filter((file) => /\.tsx?$/.test(file));
const imports = files.flatMap((file) => {
  const text = readFileSync(join(src, file), "utf8");
  const found = [
    ...text.matchAll(/^(?:import|export)\b[^;"]*?\bfrom "([^"]+)"|^import "([^"]+)"|\bimport\("([^"]+)"\)/gm),
  ].map((match) => (match[1] ?? match[2] ?? match[3])!);
  return found.map((to) => ({
    from: file.replaceAll("\\", "/"),
    to: to.startsWith(".") ? relative(src, resolve(src, dirname(file), to)).replaceAll("\\", "/") : to,
    own: to.startsWith("."),
  }));
});

const rooms = ["quantities", "standards", "parts", "job", "network", "field", "checks", "sizing", "proof", "build"];
/** `parts` reads the shapes of `job`, which hold no arithmetic. */
const roomOf = (path: string) => /^solver\/([a-z]+)\//.exec(path)?.[1];
const top = (path: string) => path.split("/")[0]!;
const outside: Record<string, string[]> = {
  work: ["work", "solver"],
  file: ["file", "solver"],
  store: ["store", "file", "solver"],
  ui: ["ui", "store", "work", "file", "solver"],
  cli: ["cli", "work", "file", "solver"],
};

describe("the rooms", () => {
  it("of the solver import only rooms above them", () => {
    const wrong = imports.filter(({ from, to, own }) => {
      const [a, b] = [roomOf(from), roomOf(to)];
      if (!own || a === undefined || b === undefined) return false;
      const shapes = b === "job" && (a === "parts" || a === "standards");
      return rooms.indexOf(b) > rooms.indexOf(a) && !shapes;
    });
    expect(wrong).toEqual([]);
  });
  it("of the solver are entered through its door alone", () => {
    const wrong = imports.filter(
      ({ from, to, own }) => own && top(from) !== "solver" && top(to) === "solver" && to !== "solver/index.ts",
    );
    expect(wrong).toEqual([]);
  });
  it("outside keep their arrows", () => {
    const wrong = imports.filter(
      ({ from, to, own }) => own && outside[top(from)] !== undefined && !outside[top(from)]!.includes(top(to)),
    );
    expect(wrong).toEqual([]);
    expect(imports.filter(({ from, to, own }) => own && top(from) === "solver" && top(to) !== "solver")).toEqual([]);
  });
  it.each([
    ["mathjs", /^solver\/quantities\/arithmetic\.ts$/],
    ["recharts", /^ui\/charts\//],
    ["react", /^ui\//],
    ["react-dom", /^ui\//],
    ["idb", /^store\//],
    ["zustand", /^(store|ui)\//],
    ["papaparse", /^(file|ui\/families)\//],
  ])("load %s only where it belongs", (name, where) => {
    const users = imports.filter(({ to }) => to === name || to.startsWith(`${name}/`));
    expect(users.length).toBeGreaterThan(0);
    expect(users.filter(({ from }) => !where.test(from))).toEqual([]);
  });
  it("of the solver and the file load nothing else from outside", () => {
    const wrong = imports.filter(
      ({ from, to, own }) => !own && /^(solver|file|work)\//.test(from) && !["mathjs", "papaparse"].includes(to),
    );
    expect(wrong).toEqual([]);
  });
});
