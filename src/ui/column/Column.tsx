import { useMemo, useState } from "react";
import { useDocument, useJudged, useLooking } from "../frame/session.ts";
import { columnScale, middleOf } from "./columnScale.ts";
import { Drawing, height } from "./Drawing.tsx";
import { GeometryFields } from "./GeometryFields.tsx";
import { Handles } from "./Handles.tsx";
import { type Layer, type LayerView, layers, layerView } from "./layers.ts";
import { Slip } from "./Slip.tsx";
import "./column.css";

/** The divider to scale, from the top electrode to earth, always there, with its layers and the slip of the selected element. */
export function Column() {
  const document_ = useDocument();
  const proof = useJudged((state) => state.proof);
  const stale = useJudged((state) => state.stale);
  const element = useLooking((state) => state.element);
  const [layer, setLayer] = useState<Layer>("voltage");
  const { design } = document_;
  const view = useMemo(() => (design === null ? null : layerView(layer, design, proof)), [layer, design, proof]);
  if (design === null || view === null)
    return (
      <section aria-label="the column">
        <h2>THE COLUMN</h2>
        <p className="quiet">Drawn once a design stands.</p>
      </section>
    );
  const at = element === null ? null : middleOf(columnScale(design, height), element) / height;
  return (
    <section aria-label="the column">
      <h2>THE COLUMN</h2>
      <div className="column-place">
        <div className={stale ? "stale" : ""}>
          <Drawing document={document_} design={design} view={view} />
        </div>
        <Handles design={design} />
        {at === null ? null : <Slip at={at} />}
      </div>
      <fieldset className="layers">
        <legend>layer</legend>
        {layers.map((each) => (
          <label key={each}>
            <input type="radio" name="layer" checked={layer === each} onChange={() => setLayer(each)} />
            {each}
          </label>
        ))}
      </fieldset>
      <InkScale view={view} />
      <GeometryFields design={design} />
    </section>
  );
}

/** What the ink of the bodies and the labels stand for, with the numbers at both ends. */
function InkScale({ view }: { readonly view: LayerView }) {
  return (
    <div className="ink-scale">
      {view.scale === null ? null : (
        <p className="ends">
          <span>{view.scale.low}</span>
          <span className="ink" aria-hidden="true" />
          <span>{view.scale.high}</span>
        </p>
      )}
      <p className="quiet">{view.caption}</p>
    </div>
  );
}
