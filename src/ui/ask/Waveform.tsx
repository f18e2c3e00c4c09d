import { useMemo } from "react";
import type { Brief } from "../../solver/index.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { AskSection } from "./AskSection.tsx";
import { WaveformSketch } from "./WaveformSketch.tsx";

const follows = [{ label: "greatest peak, sizes are judged by", path: "working.greatest_Vpeak" }] as const;

const kinds = [
  ["dc", "dc"],
  ["sine", "sine"],
  ["pulse", "pulse"],
  ["square", "square wave"],
  ["recorded", "recorded"],
] as const;

/** What stands at the source: kind, voltage, edges, with a sketch of it. */
export function Waveform({ brief }: { readonly brief: Brief }) {
  const { waveform: w } = brief;
  const at = "/brief/waveform";
  const stated = useMemo(
    () =>
      w.kind === "dc"
        ? ([["dc", "dc"]] as const)
        : ([
            ["rms", "rms"],
            ["peak", "peak"],
          ] as const),
    [w.kind],
  );
  return (
    <AskSection heading="waveform" follows={follows} picture={<WaveformSketch waveform={w} />}>
      <div className="fields">
        <ChoiceField label="kind" pointer={`${at}/kind`} value={w.kind} options={kinds} />
        <QuantityField
          label="working voltage"
          pointer={`${at}/nominal_V`}
          unit="V"
          value={w.nominal_V}
          signed
          least={-1e7}
          greatest={1e7}
        />
        <ChoiceField label="stated as" pointer={`${at}/statedAs`} value={w.statedAs} options={stated} />
        <QuantityField
          label="greatest peak"
          pointer={`${at}/greatest_Vpeak`}
          unit="V"
          value={w.greatest_Vpeak}
          signed
          blank="by default rule"
          greatest={1e7}
        />
        {w.kind === "sine" || w.kind === "square" ? (
          <QuantityField
            label="frequency"
            pointer={`${at}/frequency_Hz`}
            unit="Hz"
            value={w.frequency_Hz}
            blank="not stated"
            greatest={1e10}
          />
        ) : null}
        {w.kind === "pulse" || w.kind === "square" || w.kind === "recorded" ? (
          <QuantityField
            label="rise time, 10-90 %"
            pointer={`${at}/riseTime_s`}
            unit="s"
            value={w.riseTime_s}
            blank="not stated"
          />
        ) : null}
        {w.kind === "pulse" ? (
          <>
            <QuantityField
              label="pulse width"
              pointer={`${at}/width_s`}
              unit="s"
              value={w.width_s}
              blank="not stated"
            />
            <QuantityField
              label="repetition"
              pointer={`${at}/repetition_Hz`}
              unit="Hz"
              value={w.repetition_Hz}
              blank="single shots"
            />
          </>
        ) : null}
      </div>
    </AskSection>
  );
}
