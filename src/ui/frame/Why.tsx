import { useEffect, useRef } from "react";
import { citation, filled, type SheetValue, type WhyInput, type Why as WhyOf, why } from "../../solver/index.ts";
import { numberText } from "./figureText.ts";
import { useJudged, useLooking, useSession } from "./session.ts";
import { Typeset } from "./Typeset.tsx";

/** The why of a number, opened in place: formula, the same with its numbers, result, origins, source. */
export function Why() {
  const session = useSession();
  const asked = useLooking((state) => state.why);
  const proof = useJudged((state) => state.proof);
  const sizing = useJudged((state) => state.sizing);
  const box = useRef<HTMLElement>(null);
  const back = useRef<Element | null>(null);
  const open = asked !== null;
  const path = asked?.path;
  useEffect(() => {
    if (!open) return;
    back.current = document.activeElement;
    return () => (back.current as HTMLElement | null)?.focus?.();
  }, [open]);
  useEffect(() => {
    if (path !== undefined) box.current?.focus();
  }, [path]);
  if (asked === null) return null;
  const sheet = asked.from === "sizing" ? sizing?.sheet : proof?.sheet;
  const close = () => session.looking.setState({ why: null });
  const found = sheet === undefined ? null : why(asked.path, sheet, proof?.origins ?? {}, asked.index);
  const go = (path: string) => session.looking.setState({ why: { ...asked, path } });
  return (
    <section
      ref={box}
      className="why"
      aria-label="why this number"
      tabIndex={-1}
      style={{ left: asked.left, top: asked.top }}
      onKeyDown={(event) => {
        if (event.key !== "Escape") return;
        event.stopPropagation();
        close();
      }}
    >
      {found === null ? <p>This number has no trace here.</p> : <Laid found={found} onGo={go} />}
      <p className="end">
        <button type="button" className="plain-button" onClick={close}>
          close
        </button>
      </p>
    </section>
  );
}

function Laid({ found, onGo }: { readonly found: WhyOf; readonly onGo: (path: string) => void }) {
  if (found.kind === "given") {
    return (
      <>
        <h2>{found.path}</h2>
        <p>
          {valueText(found.value, "1")}, {found.origin}
        </p>
      </>
    );
  }
  const symbols = Object.fromEntries(found.inputs.map((input) => [input.name, input.symbol]));
  const numbers = Object.fromEntries(found.inputs.map((input) => [input.name, inputText(input)]));
  const result = valueText(found.value, found.unit);
  const formula = found.kind === "formula";
  return (
    <>
      <h2>
        {found.title}
        {found.index === null ? "" : `, element ${found.index + 1}`}
      </h2>
      <p className="statement">
        <Typeset text={filled(found.statement, { ...symbols, "=": found.symbol })} />
      </p>
      {formula ? <p className="numbers">{filled(found.statement, { ...numbers, "=": result })}</p> : null}
      <p>
        <strong>{result}</strong> {found.meaning}
      </p>
      <table>
        <tbody>
          {found.inputs.map((input) => (
            <tr key={input.name}>
              <td>
                <Typeset text={input.symbol} />
              </td>
              <td>
                {input.origin === null ? (
                  <button type="button" className="figure-button" onClick={() => onGo(input.path)}>
                    {inputText(input)}
                  </button>
                ) : (
                  inputText(input)
                )}
              </td>
              <td>{input.meaning}</td>
              <td className="quiet">{input.origin ?? "computed"}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {found.method === null ? null : (
        <p>
          {found.method} Residual {found.residual?.toExponential(1)}, bound {found.residualBound?.toExponential(0)}.
        </p>
      )}
      <p className="quiet">Holds: {found.holds}</p>
      <p className="quiet">{citation(found.source)}</p>
    </>
  );
}

const inputText = (input: WhyInput): string => valueText(input.value, input.unit);

function valueText(value: SheetValue, unit: string): string {
  if (value === null) return "–";
  if (typeof value === "number") return numberText(value, unit, 6, false);
  const list = value as readonly (number | null)[];
  const first = list[0];
  const same = typeof first === "number" && list.every((each) => each === first);
  return same ? `${list.length} × ${numberText(first, unit, 5, false)}` : `${list.length} values`;
}
