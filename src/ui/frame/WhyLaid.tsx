import {
  citation,
  type FigurePath,
  figures,
  filled,
  plainPointer,
  type WhyInput,
  type Why as WhyOf,
} from "../../solver/index.ts";
import { valueText } from "./figureText.ts";
import { Typeset } from "./Typeset.tsx";

type Laid = Exclude<WhyOf, { readonly kind: "given" }>;

interface Props {
  readonly found: Laid;
  readonly onGo: (path: string) => void;
}

/** A figure that was computed: statement, numbers, result, inputs, where it holds, source. */
export function WhyLaid({ found, onGo }: Props) {
  const symbols = Object.fromEntries(found.inputs.map((input) => [input.name, input.symbol]));
  const numbers = Object.fromEntries(found.inputs.map((input) => [input.name, inputText(input)]));
  const result = valueText(found.value, found.unit);
  return (
    <>
      <h2>
        {found.title}
        {found.index === null ? "" : `, element ${found.index + 1}`}
      </h2>
      <p className="statement">
        <Typeset text={filled(found.statement, { ...symbols, "=": found.symbol })} />
      </p>
      {found.kind === "formula" ? (
        <p className="numbers">{filled(found.statement, { ...numbers, "=": result })}</p>
      ) : null}
      <p>
        <strong>{result}</strong> {found.kind === "formula" ? found.meaning : nameOf(found.path)}
      </p>
      {found.inputs.length === 0 ? null : <Inputs inputs={found.inputs} onGo={onGo} />}
      {found.method === null ? null : (
        <p>
          {found.method} Residual {exponential(found.residual, 1)}, bound {exponential(found.residualBound, 0)}.
        </p>
      )}
      <p className="quiet">Holds: {found.holds}</p>
      <p className="quiet">{citation(found.source)}</p>
    </>
  );
}

function Inputs({ inputs, onGo }: { readonly inputs: readonly WhyInput[]; readonly onGo: Props["onGo"] }) {
  return (
    <table>
      <tbody>
        {inputs.map((input) => (
          <tr key={input.name}>
            <th scope="row">
              <Typeset text={input.symbol.replace(/^(\p{L})(\d)/u, "$1_$2")} />
            </th>
            <td className="number">
              <button type="button" className="figure-button" onClick={() => onGo(input.path)}>
                {inputText(input)}
              </button>
            </td>
            <td>{input.meaning === input.path ? nameOf(input.path) : input.meaning}</td>
            <td className={input.origin === "assumed" ? "quiet assumed" : "quiet"}>{input.origin ?? "computed"}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const inputText = (input: WhyInput): string => valueText(input.value, input.unit);
/** A figure or an input in words: what a solution starts from has no other name. */
function nameOf(path: string): string {
  if (path.startsWith("/")) return plainPointer(path.replaceAll("/*", "")).replace(/^hv arm /, "HV arm, ");
  return path in figures ? figures[path as FigurePath] : plainPointer(`//${path.replaceAll(".", "/")}`);
}

const exponential = (value: number | null, digits: number): string =>
  value === null ? "–" : value === 0 ? "0" : value.toExponential(digits).replaceAll("-", "\u2212");
