import type { Design } from "../../solver/index.ts";
import { QuantityField } from "../inputs/QuantityField.tsx";

/** The inductances of the connections and what damps them: typed here they stay when the design is chosen again. */
export function Connections({ design }: { readonly design: Design }) {
  return (
    <section className="sheet-section" aria-labelledby="connections-heading">
      <h2 id="connections-heading">connections</h2>
      <p className="finding-sentence">
        Left out while 0. A straight wire has about 1&#8201;µH a metre (from memory); measure the loop, or type what its
        ring tells.
      </p>
      <div className="fields">
        <QuantityField
          label="HV lead, inductance of its loop"
          pointer="/design/lead/inductance_H"
          unit="H"
          value={design.lead.inductance_H}
          greatest={1}
        />
        <QuantityField
          label="damping resistor at the top electrode"
          pointer="/design/lead/damping_ohm"
          unit="ohm"
          value={design.lead.damping_ohm}
          greatest={1e9}
          series="E12"
        />
        <QuantityField
          label="LV capacitors, inductance of them all"
          pointer="/design/lvArm/inductance_H"
          unit="H"
          value={design.lvArm.inductance_H}
          greatest={1}
        />
      </div>
    </section>
  );
}
