import { figureText } from "./figureText.ts";
import { openWhy, useJudged, useSession } from "./session.ts";

interface Props {
  readonly path: string;
  readonly digits?: number;
  readonly index?: number;
  /** Said before the number by a screen reader. */
  readonly label?: string;
}

/** A figure of the proof: its number with unit; pressed, it opens its why. */
export function Figure({ path, digits = 3, index, label }: Props) {
  const session = useSession();
  const all = useJudged((state) => state.proof?.sheet.values[path]);
  const value = index !== undefined && Array.isArray(all) ? all[index] : all;
  const text = value === undefined ? "–" : figureText(path, value, digits);
  return (
    <button
      type="button"
      className="figure-button"
      title="why this number"
      onClick={() => openWhy(session, path, index ?? null)}
    >
      {label === undefined ? null : <span className="unseen">{label} </span>}
      {text}
    </button>
  );
}
