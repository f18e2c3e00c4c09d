import { plainPointer, type Why as WhyOf } from "../../solver/index.ts";
import { pointerUnit, valueText } from "./figureText.ts";
import { goToField, hasField, useDocument, useSession } from "./session.ts";

type Given = Extract<WhyOf, { readonly kind: "given" }>;

const told: Record<Given["origin"], string> = {
  typed: "typed in this document",
  measured: "measured, so stated in this document",
  catalogue: "copied from the part or instrument in this document",
  assumed: "assumed: nobody has stated it yet",
};

/** An input: what it is, what was typed, where it came from, and the way to its field. */
export function WhyGiven({ found }: { readonly found: Given }) {
  const session = useSession();
  const { typed } = useDocument();
  const pointer = found.path.replace(/:.*$/, "");
  const text = typed[pointer];
  return (
    <>
      <h2>{plainPointer(pointer)}</h2>
      <p>
        <strong>{valueText(found.value, pointerUnit(pointer))}</strong>
        {text === undefined ? "" : `, written “${text}”`}
      </p>
      <p className="quiet">An input: {told[found.origin]}.</p>
      {hasField(pointer) ? (
        <button type="button" className="figure-button" onClick={() => goToField(session, pointer)}>
          go to its field
        </button>
      ) : null}
    </>
  );
}
