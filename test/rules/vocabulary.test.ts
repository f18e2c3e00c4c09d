/** One word a thing: identifiers say scale factor; nothing names where or how the program was made. */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";

const root = fileURLToPath(new URL("../..", import.meta.url));
const text = /\.(tsx?|mjs|js|css|html|json|md|webmanifest)$/;
const below = (folder: string) =>
  readdirSync(join(root, folder), { recursive: true, encoding: "utf8" }).map((file) => join(folder, file));
const top = readdirSync(root).filter((file) => file !== "package-lock.json");
const files = [...["src", "test", "demo", "public"].flatMap(below), ...top]
  .filter((file) => text.test(file) && !file.endsWith("vocabulary.test.ts"))
  .map((file) => ({ file: file.replaceAll("\\", "/"), text: readFileSync(join(root, file), "utf8") }));
const code = files.filter(({ file }) => /^src\/.*\.tsx?$/.test(file));

/** Code alone: comments, texts and JSX words taken out, since prose may say what it likes. */
const bare = (source: string) =>
  source.replace(/\/\*[\s\S]*?\*\/|\/\/.*$|"(?:[^"\\\n]|\\.)*"|'(?:[^'\\\n]|\\.)*'|`[^`]*`|>[^<>{}=;]*</gm, " ");
/** camelCase, snake_case and UPPER words of an identifier, in small letters. */
const words = (identifier: string) =>
  identifier
    .replace(/([a-z0-9])([A-Z])/g, "$1 $2")
    .toLowerCase()
    .split(/[\s_$]+/);

/** Keys of the raw network's published form, where a fault is compared with the undisturbed divider. */
const keysOfTheForm = ["outputRatio", "greatestElementRatio"];

describe("identifiers", () => {
  it("say scale factor, never attenuation, gain or ratio; share for a part of a whole", () => {
    const wrong = code.flatMap(({ file, text }) =>
      [...new Set(bare(text).match(/[A-Za-z_$][\w$]*/g) ?? [])]
        .filter((each) => !(file.startsWith("src/solver/network/") && keysOfTheForm.includes(each)))
        .filter((each) => words(each).some((word) => /^(attenuat|gain|ratio)(s|or|ors|ion|ions)?$/.test(word)))
        .map((each) => `${file}: ${each}`),
    );
    expect(wrong).toEqual([]);
  });
  it("use no room for odds and ends", () => {
    expect(
      files.map(({ file }) => file).filter((file) => /(^|\/)(utils?|helpers?|common|misc)(\/|\.)/i.test(file)),
    ).toEqual([]);
  });
});

describe("every file", () => {
  it.each([
    ["a path of one machine", /(?<![\w.])\/(work|tmp|home|root|Users)\/|[A-Z]:\\Users/],
    [
      "a plan that a user has not seen",
      /job ?map|seed document|\bscenarios? W\d|\b(?:W|S|B|F)\d{1,2}[:.,]? (?:of|in) the (?:map|plan)/i,
    ],
    ["how it was written", /\b(?:sub-?agents?|language model|prompt engineering|co-authored-by)\b/i],
    ["a registry", /registry\.(?:npmjs|yarnpkg)\.|npm\.pkg\.|\.shared\/|\.\.\/shared/],
  ])("names nothing of %s", (_, pattern) => {
    expect(
      files.flatMap(({ file, text }) => (pattern.test(text) ? [`${file}: ${pattern.exec(text)![0]}`] : [])),
    ).toEqual([]);
  });
});
