import { type CableEnd, catalogue, type Instrument, type InstrumentFunction } from "../../solver/index.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";

const functions: readonly (readonly [InstrumentFunction, string])[] = [
  ...new Set(catalogue.instruments.map((each) => each.function)),
].map((each) => [each, each] as const);

const ends: readonly (readonly [CableEnd, string])[] = [
  ["lumped", "its capacitance"],
  ["open", "a line, open"],
  ["matchedAtTap", "a line, matched at the tap"],
  ["terminated", "a line, terminated"],
];

/** Every figure of one instrument on one range, with its cable. */
export function InstrumentFields({ instrument: i, at }: { readonly instrument: Instrument; readonly at: string }) {
  return (
    <div className="fields">
      <ChoiceField label="function" pointer={`${at}/function`} value={i.function} options={functions} />
      <QuantityField
        label="range, locked"
        pointer={`${at}/range_V`}
        unit="V"
        value={i.range_V}
        least={1e-6}
        greatest={1e6}
      />
      <QuantityField
        label="input resistance"
        pointer={`${at}/resistance_ohm`}
        unit="ohm"
        value={i.resistance_ohm}
        least={1}
        greatest={1e15}
        series="E6"
      />
      <QuantityField
        label="resistance, ±"
        pointer={`${at}/resistanceSpread`}
        unit="1"
        value={i.resistanceSpread}
        share
        greatest={1}
      />
      <QuantityField
        label="input capacitance"
        pointer={`${at}/capacitance_F`}
        unit="F"
        value={i.capacitance_F}
        greatest={1e-3}
      />
      <QuantityField
        label="capacitance, ±"
        pointer={`${at}/capacitanceSpread_F`}
        unit="F"
        value={i.capacitanceSpread_F}
        greatest={1e-3}
      />
      <QuantityField
        label="greatest input, peak"
        pointer={`${at}/greatestInput_Vpeak`}
        unit="V"
        value={i.greatestInput_Vpeak}
        least={1e-6}
        greatest={1e6}
      />
      <QuantityField
        label="accuracy of the reading"
        pointer={`${at}/readingAccuracy`}
        unit="1"
        value={i.readingAccuracy}
        share
        greatest={1}
      />
      <QuantityField label="resolution" pointer={`${at}/resolution_V`} unit="V" value={i.resolution_V} />
      <QuantityField label="noise, rms" pointer={`${at}/noise_Vrms`} unit="V" value={i.noise_Vrms} greatest={1e3} />
      <QuantityField
        label="cable length"
        pointer={`${at}/cable/length_m`}
        unit="m"
        value={i.cable.length_m}
        greatest={1000}
      />
      <QuantityField
        label="cable, a metre"
        pointer={`${at}/cable/capacitance_F_per_m`}
        unit="F/m"
        value={i.cable.capacitance_F_per_m}
        greatest={1e-6}
      />
      <QuantityField
        label="cable impedance"
        pointer={`${at}/cable/impedance_ohm`}
        unit="ohm"
        value={i.cable.impedance_ohm}
        least={1}
        greatest={1e4}
      />
      <QuantityField
        label="cable delay, a metre"
        pointer={`${at}/cable/delay_s_per_m`}
        unit="s/m"
        value={i.cable.delay_s_per_m}
        least={1e-9}
        greatest={1e-6}
      />
      <ChoiceField label="cable counts as" pointer={`${at}/cable/end`} value={i.cable.end} options={ends} />
    </div>
  );
}
