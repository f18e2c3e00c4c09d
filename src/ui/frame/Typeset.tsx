import { Fragment, type ReactNode } from "react";

/** `_2p`, `_(a,b)` lowered; `^2`, `^(n-1)` raised; a letter that stands alone is a quantity and slants (ISO 80000-1). */
const pieces =
  /(_\([^)]*\)|_[\p{L}\p{Nd},']+|\^\([^)]*\)|\^[-−+]?[\p{L}\p{Nd}]+|(?<![\p{L}\p{Nd}_]|table |case )\p{L}(?![\p{L}\p{Nd}]))/u;

/** A formula's text set as a formula. */
export function Typeset({ text }: { readonly text: string }) {
  return (
    <>
      {text.split(pieces).map((piece, i) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: the pieces of one text never move
        <Fragment key={i}>{i % 2 === 0 ? piece : set(piece)}</Fragment>
      ))}
    </>
  );
}

function set(piece: string): ReactNode {
  const bare = piece.slice(1).replace(/^\((.*)\)$/, "$1");
  if (piece.startsWith("_")) return <sub>{bare}</sub>;
  if (piece.startsWith("^")) return <sup>{bare}</sup>;
  return <i>{piece}</i>;
}
