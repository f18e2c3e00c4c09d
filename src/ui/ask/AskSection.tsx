import { type ReactNode, useId } from "react";
import { Figure } from "../frame/Figure.tsx";
import { useJudged } from "../frame/session.ts";

export interface Following {
  readonly label: string;
  readonly path: string;
  readonly digits?: number;
  readonly index?: number;
}

interface Props {
  readonly heading: string;
  /** What follows from these inputs, on one line with them. */
  readonly follows: readonly Following[];
  /** A picture above what follows. */
  readonly picture?: ReactNode;
  readonly children: ReactNode;
}

/** One thing asked: inputs left, what follows from them right. */
export function AskSection({ heading, follows, picture, children }: Props) {
  const id = useId();
  const values = useJudged((state) => state.proof?.sheet.values);
  const stale = useJudged((state) => state.stale);
  const shown = follows.filter(({ path }) => (values?.[path] ?? null) !== null);
  return (
    <section className="sheet asked" aria-labelledby={id}>
      <h2 id={id}>{heading}</h2>
      <div className="inputs">{children}</div>
      <div className="follows">
        {picture}
        {shown.length === 0 ? null : (
          <dl className={stale ? "stale" : ""}>
            {shown.map(({ label, path, digits, index }) => (
              <div key={path}>
                <dt>{label}</dt>
                <dd>
                  <Figure
                    path={path}
                    label={label}
                    {...(digits === undefined ? {} : { digits })}
                    {...(index === undefined ? {} : { index })}
                  />
                </dd>
              </div>
            ))}
          </dl>
        )}
      </div>
    </section>
  );
}
