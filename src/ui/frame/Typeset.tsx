import { Fragment } from "react";

/** A formula's text set with subscripts: `R_2p` and `C_1eff` become letters with an index. */
export function Typeset({ text }: { readonly text: string }) {
  const pieces = text.split(/(_[\p{L}\p{N},']+|_\([^)]*\))/u);
  return (
    <>
      {pieces.map((piece, i) =>
        piece.startsWith("_") ? (
          // biome-ignore lint/suspicious/noArrayIndexKey: the pieces of one text never move
          <sub key={i}>{piece.slice(1).replace(/^\((.*)\)$/, "$1")}</sub>
        ) : (
          // biome-ignore lint/suspicious/noArrayIndexKey: the pieces of one text never move
          <Fragment key={i}>{piece}</Fragment>
        ),
      )}
    </>
  );
}
