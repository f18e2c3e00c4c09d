import type { Brief } from "../../solver/index.ts";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { AskSection } from "./AskSection.tsx";

const follows = [
  { label: "scale factor, predicted", path: "scaleFactor.predicted", digits: 6 },
  { label: "off the one wanted", path: "scaleFactor.deviation" },
  { label: "uncertainty from parts, k = 2", path: "scaleFactor.uncertainty", digits: 2 },
  { label: "greatest deviation over the band", path: "response.bandDeviation_dB" },
] as const;

/** Scale factor, uncertainty and band that are wanted. */
export function Wanted({ brief }: { readonly brief: Brief }) {
  return (
    <AskSection heading="what is wanted" follows={follows}>
      <div className="fields">
        <QuantityField
          label="scale factor"
          pointer="/brief/scaleFactor"
          unit="1"
          value={brief.scaleFactor}
          least={1.0001}
          greatest={1e9}
        />
        <QuantityField
          label="uncertainty, k = 2"
          pointer="/brief/wantedUncertainty"
          unit="1"
          value={brief.wantedUncertainty}
          share
          least={1e-6}
          greatest={1}
        />
        <QuantityField
          label="band from"
          pointer="/brief/band_Hz/0"
          unit="Hz"
          value={brief.band_Hz[0]}
          greatest={1e10}
        />
        <QuantityField label="band to" pointer="/brief/band_Hz/1" unit="Hz" value={brief.band_Hz[1]} greatest={1e10} />
      </div>
    </AskSection>
  );
}
