/**
 * Where a text stops being JSON (RFC 8259): index of the first character that cannot stand, or null when the whole text is JSON.
 * The engines name the place each in their own words or not at all. No recursion.
 */
const space = /[\t\n\r ]*/y;
const atom =
  /"(?:[ !#-[\]-\uFFFF]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"|-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null/y;

type Wants = "value" | "valueOrEnd" | "key" | "keyOrEnd" | "colon" | "commaOrEnd";

export function syntaxFault(text: string): number | null {
  const open: ("{" | "[")[] = [];
  let wants: Wants = "value";
  let at = 0;
  const match = (pattern: RegExp): string | null => {
    pattern.lastIndex = at;
    return pattern.exec(text)?.[0] ?? null;
  };
  for (;;) {
    at += match(space)!.length;
    const done = wants === "commaOrEnd" && open.length === 0;
    if (done || at >= text.length) return done && at >= text.length ? null : at;
    const c = text[at]!;
    const closes = c === (open.at(-1) === "{" ? "}" : "]");
    if (closes && open.length > 0 && (wants === "commaOrEnd" || wants === "valueOrEnd" || wants === "keyOrEnd")) {
      open.pop();
      wants = "commaOrEnd";
      at += 1;
    } else if (wants === "commaOrEnd" || wants === "colon") {
      if (c !== (wants === "colon" ? ":" : ",")) return at;
      wants = wants === "colon" || open.at(-1) === "[" ? "value" : "key";
      at += 1;
    } else if ((c === "{" || c === "[") && (wants === "value" || wants === "valueOrEnd")) {
      open.push(c);
      wants = c === "{" ? "keyOrEnd" : "valueOrEnd";
      at += 1;
    } else {
      const token = match(atom);
      const key: boolean = wants === "key" || wants === "keyOrEnd";
      if (token === null || (key && c !== '"')) return at;
      wants = key ? "colon" : "commaOrEnd";
      at += token.length;
    }
  }
}

/** `line 2, column 13` of an index. */
export function lineAndColumn(text: string, index: number): string {
  const before = text.slice(0, index).split("\n");
  return `line ${before.length}, column ${before.at(-1)!.length + 1}`;
}
