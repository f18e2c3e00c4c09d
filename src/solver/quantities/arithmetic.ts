import type { MathNode } from "mathjs";
import { formatQuantity } from "./format.ts";
import { type Parsed, type ParseOptions, parseQuantity } from "./parse.ts";
import { type UnitName, units } from "./unit.ts";

/** Kinds of syntax node that an expression may be made of; anything else is refused before it is run. */
const allowedNodes = new Set(["ConstantNode", "ParenthesisNode", "OperatorNode", "FunctionNode", "SymbolNode"]);
const allowedOperators = new Set(["add", "subtract", "multiply", "divide", "pow", "unaryMinus", "unaryPlus"]);
const longest = 200;

const refused = (why: string, cure: string): Parsed => ({ kind: "refused", at: 0, why, cure });

/**
 * Arithmetic longer than one product or quotient, in the base unit or with letter codes and prefixes between the signs:
 * `2*6.8M + 470k`. mathjs is loaded on first use; its tree is checked against a short list before anything runs.
 */
export async function evaluateArithmetic(text: string, unit: UnitName, options: ParseOptions = {}): Promise<Parsed> {
  if (text.length > longest) return refused(`The expression is longer than ${longest} characters.`, "Shorten it.");
  const plain = inBaseUnits(text, unit);
  if (plain === null)
    return refused("A part of the expression is not a quantity.", "Use numbers, + − * / and parentheses.");
  try {
    const { create, parseDependencies } = await import("mathjs");
    const math = create({ parseDependencies } as never);
    const tree = (math as unknown as { parse(text: string): MathNode }).parse(plain);
    const value = worth(tree);
    if (value === null)
      return refused("The expression holds more than arithmetic.", "Use numbers, + − * / ^ and parentheses.");
    if (!Number.isFinite(value)) return refused("The expression has no finite value.", "Look for a division by zero.");
    return checked(value, unit, options);
  } catch {
    return refused("The expression cannot be read.", "Look for a missing number or parenthesis.");
  }
}

function checked(value: number, unit: UnitName, options: ParseOptions): Parsed {
  const { least = Number.NEGATIVE_INFINITY, greatest = Number.POSITIVE_INFINITY, signed = false } = options;
  if (value < 0 && !signed) return refused("The value is negative.", "Change the expression.");
  if (value < least || value > greatest) {
    return refused(`${formatQuantity(value, unit)} is outside what is allowed here.`, "Change the expression.");
  }
  return { kind: "value", value, understood: formatQuantity(value, unit, { digits: 6, trailing: false }) };
}

/** Every number with its prefix or letter code rewritten as a plain decimal; null when one is no quantity. */
function inBaseUnits(text: string, unit: UnitName): string | null {
  let fine = true;
  const symbol = units[unit].symbol;
  const rewritten = text.replace(/(?:\d[\d.,]*|[.,]\d+)(?:[eE][-+]?\d+)?\s*[A-Za-zΩµ°%]*\d*/g, (token) => {
    const read = parseQuantity(token, /[A-Za-zΩµ%]/.test(token.replace(/[eE][-+]?\d+/, "")) ? unit : "1");
    if (read.kind !== "value") fine = false;
    return read.kind === "value" ? `(${read.value})` : token;
  });
  return fine && !/[A-Za-zΩµ]/.test(rewritten.replaceAll(symbol || "\0", "").replace(/\d[eE][-+]?\d/g, ""))
    ? rewritten
    : null;
}

/** The tree's own value, by the few operators allowed; null for any other node. mathjs reads, it never runs. */
function worth(node: MathNode): number | null {
  if (!allowedNodes.has(node.type)) return null;
  const any = node as unknown as { value?: unknown; content?: MathNode; fn?: string; args?: MathNode[] };
  if (node.type === "ConstantNode") return typeof any.value === "number" ? any.value : null;
  if (node.type === "ParenthesisNode") return worth(any.content as MathNode);
  if (node.type !== "OperatorNode" || !allowedOperators.has(String(any.fn))) return null;
  const [a, b] = (any.args ?? []).map(worth);
  if (a === null || a === undefined || b === null) return null;
  if (b === undefined) return any.fn === "unaryMinus" ? -a : any.fn === "unaryPlus" ? a : null;
  switch (any.fn) {
    case "add":
      return a + b;
    case "subtract":
      return a - b;
    case "multiply":
      return a * b;
    case "divide":
      return a / b;
    default:
      return a ** b;
  }
}
