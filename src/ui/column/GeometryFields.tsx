import { useEffect, useRef } from "react";
import type { Design } from "../../solver/index.ts";
import { useJudged, useLooking } from "../frame/session.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";

const kinds = [
  ["none", "none"],
  ["sphere", "sphere"],
  ["toroid", "toroid"],
  ["disc", "disc"],
] as const;
const sources = [
  ["formula", "closed formula of a bare column"],
  ["field", "field of the drawing"],
  ["typed", "as typed in the file"],
] as const;
const at = "/design/geometry";

/** The millimetres of the column to change: typed here, the design no longer follows the brief. */
export function GeometryFields({ design }: { readonly design: Design }) {
  const box = useRef<HTMLDetailsElement>(null);
  const solving = useJudged((state) => state.solving);
  const said = useJudged((state) => state.proof?.findings.find(({ id }) => id === "strays.field")?.reason ?? null);
  const asked = useLooking((state) => state.field?.startsWith(at) === true);
  useEffect(() => {
    if (asked && box.current !== null) box.current.open = true;
  }, [asked]);
  const { geometry } = design;
  const { electrode } = geometry;
  const metres = (label: string, key: string, value: number, least: number) => (
    <QuantityField label={label} pointer={`${at}/${key}`} unit="m" value={value} least={least} greatest={100} />
  );
  return (
    <details ref={box} className="geometry">
      <summary>geometry</summary>
      {metres("foot above the floor", "footHeight_m", geometry.footHeight_m, 0)}
      {metres("length of the column", "columnLength_m", geometry.columnLength_m, 0.001)}
      {metres("diameter over the bodies", "columnDiameter_m", geometry.columnDiameter_m, 0.0001)}
      <ChoiceField label="strays from" pointer="/design/strays/from" value={design.strays.from} options={sources} />
      {design.strays.from !== "field" ? null : (
        <p className="quiet small" role="status">
          {solving ? "The field is being solved; the closed formula answers meanwhile." : said}
        </p>
      )}
      <ChoiceField label="top electrode" pointer={`${at}/electrode/kind`} value={electrode.kind} options={kinds} />
      {electrode.kind === "none" ? null : metres("its radius", "electrode/radius_m", electrode.radius_m, 0)}
      {electrode.kind === "toroid"
        ? metres("radius of its tube", "electrode/tubeRadius_m", electrode.tubeRadius_m, 0)
        : null}
      {electrode.kind === "toroid"
        ? metres("its middle over the column", "electrode/offset_m", electrode.offset_m, -1)
        : null}
      {electrode.kind === "disc" ? metres("its thickness", "electrode/thickness_m", electrode.thickness_m, 0) : null}
      {geometry.wallDistance_m === null
        ? null
        : metres("nearest wall", "wallDistance_m", geometry.wallDistance_m, 0.001)}
    </details>
  );
}
