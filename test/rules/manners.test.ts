/** Manners of the code: words, tolerances, doors that stay shut, sizes, the lock. */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";

const root = fileURLToPath(new URL("../..", import.meta.url));
const read = (folder: string) =>
  readdirSync(join(root, folder), { recursive: true, encoding: "utf8" })
    .filter((file) => /\.(tsx?|mjs|js|css)$/.test(file))
    .map((file) => ({
      file: join(folder, file).replaceAll("\\", "/"),
      text: readFileSync(join(root, folder, file), "utf8"),
    }));
const source = read("src");
const tests = read("test").filter(({ file }) => !file.endsWith("manners.test.ts"));
const hits = (from: typeof source, pattern: RegExp) =>
  from.flatMap(({ file, text }) => (pattern.exec(text) === null ? [] : [`${file}: ${pattern.exec(text)![0]}`]));

describe("manners", () => {
  it("compare numbers with a stated relative tolerance only, and skip nothing", () => {
    expect(hits(tests, /toBeCloseTo\(|\.(skip|only|todo)\(/)).toEqual([]);
  });
  it("leave nothing unfinished and no door open", () => {
    expect(hits(source, /TODO|FIXME|XXX|HACK|dangerouslySetInnerHTML|innerHTML|new Function|\beval\(/)).toEqual([]);
  });
  it("keep the clock, chance and the page out of the solver", () => {
    const solver = source.filter(({ file }) => file.startsWith("src/solver/"));
    expect(hits(solver, /Math\.random|Date\.now|new Date|performance\.now|\bglobalThis\b|\bprocess\./)).toEqual([]);
  });
  it("never call a design safe", () => {
    expect(hits(source, /\b(is|are|be|design) safe\b/i)).toEqual([]);
  });
  it("keep a file to one idea: 250 lines at most, tables excepted", () => {
    const long = source.filter(({ file, text }) => /\.tsx?$/.test(file) && text.split("\n").length > 251);
    expect(
      long
        .map(({ file, text }) => `${file} ${text.split("\n").length}`)
        .filter((each) => !each.startsWith("src/solver/parts/resistorFamilies.ts")),
    ).toEqual([]);
  });
  it("lock every package to an exact version and a checksum, and name no host", () => {
    const lock = JSON.parse(readFileSync(join(root, "package-lock.json"), "utf8")) as {
      packages: Record<string, { version?: string; integrity?: string; resolved?: string; link?: boolean }>;
    };
    const bad = Object.entries(lock.packages).filter(
      ([path, each]) => path !== "" && (each.resolved !== undefined || !each.integrity?.startsWith("sha512-")),
    );
    expect(bad.map(([path]) => path)).toEqual([]);
    const { dependencies, devDependencies } = JSON.parse(readFileSync(join(root, "package.json"), "utf8")) as Record<
      string,
      Record<string, string>
    >;
    for (const version of Object.values({ ...dependencies, ...devDependencies }))
      expect(version).toMatch(/^\d+\.\d+\.\d+$/);
  });
});

describe("colours", () => {
  const css = source.find(({ file }) => file === "src/ui/theme.css")!.text;
  const pair = (name: string) => {
    const found = new RegExp(`--${name}: light-dark\\((#[0-9a-f]{6}), (#[0-9a-f]{6})\\)`).exec(css)!;
    return [found[1]!, found[2]!] as const;
  };
  const luminance = (hex: string) => {
    const [r, g, b] = [1, 3, 5].map((at) => {
      const c = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
      return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
  };
  // WCAG 2.2, success criterion 1.4.3: contrast (L1 + 0.05)/(L2 + 0.05) of at least 4.5.
  it.each(["ink", "quiet", "accent", "clear", "caution", "stop"])(
    "%s on paper keeps 4.5 : 1, light and dark",
    (name) => {
      for (const theme of [0, 1] as const) {
        const [a, b] = [luminance(pair(name)[theme]), luminance(pair("paper")[theme])].sort((x, y) => y - x);
        expect((a! + 0.05) / (b! + 0.05)).toBeGreaterThanOrEqual(4.5);
      }
    },
  );
});
