import { valueAt } from "../../file/pointer.ts";
import { plainPointer } from "../../solver/index.ts";
import { pointerUnit, valueText } from "../frame/figureText.ts";
import { goToField, hasField, useInputs, useJudged, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";

/** Everything that is assumed, counted in one place; each accepted as it stands, or typed in its field. */
export function Assumed() {
  const assumed = useJudged((state) => state.proof?.assumed);
  const origins = useInputs((state) => state.document.origins);
  const pointers = (assumed ?? Object.keys(origins)).filter((pointer) => origins[pointer] === "assumed");
  if (pointers.length === 0)
    return <p className="quiet">assumed: 0. Every input is typed, measured or from the catalogue.</p>;
  return (
    <details className="assumed-count">
      <summary>assumed: {pointers.length}. Accept each, or type it.</summary>
      <table>
        <tbody>
          {pointers.map((pointer) => (
            <Row key={pointer} pointer={pointer} />
          ))}
        </tbody>
      </table>
      {pointers.length > 1 ? <AcceptAll pointers={pointers} /> : null}
    </details>
  );
}

function Row({ pointer }: { readonly pointer: string }) {
  const session = useSession();
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const value = useInputs((state) => valueAt(state.document, pointer));
  const name = plainPointer(pointer);
  return (
    <tr>
      <th scope="row">{name}</th>
      <td className="assumed-value">{textOf(value, pointer)}</td>
      <td>
        {hasField(pointer) ? (
          <button type="button" className="figure-button" onClick={() => goToField(session, pointer)}>
            type<span className="unseen"> {name}</span>
          </button>
        ) : null}
      </td>
      <td>
        <button
          type="button"
          className="figure-button"
          disabled={locked}
          onClick={() => apply((store) => store.acceptAssumed(pointer))}
        >
          accept<span className="unseen"> {name}</span>
        </button>
      </td>
    </tr>
  );
}

function AcceptAll({ pointers }: { readonly pointers: readonly string[] }) {
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const accept = () => {
    for (const pointer of pointers) apply((store) => store.acceptAssumed(pointer));
  };
  return (
    <button type="button" className="plain-button" disabled={locked} onClick={accept}>
      accept all {pointers.length}
    </button>
  );
}

function textOf(value: unknown, pointer: string): string {
  if (typeof value === "number") return valueText(value, pointerUnit(pointer));
  if (Array.isArray(value)) return value.map((each) => textOf(each, pointer)).join(" – ");
  if (typeof value === "boolean") return value ? "yes" : "no";
  return value === null || value === undefined ? "not stated" : String(value);
}
