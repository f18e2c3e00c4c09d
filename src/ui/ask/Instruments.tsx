import { useMemo, useState } from "react";
import { catalogue, type Instrument, type InstrumentFunction } from "../../solver/index.ts";
import { useDocument, useInputs } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";

/** Who reads it: instruments by range and function with their cable; one is the principal. */
export function Instruments() {
  const { instruments, principal } = useDocument();
  const [open, setOpen] = useState<string | null>(null);
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const shown = open ?? principal;
  const at = instruments.findIndex((each) => each.id === shown);
  const one = instruments[at];
  return (
    <section className="sheet" aria-labelledby="instruments-asked">
      <h2 id="instruments-asked">instruments</h2>
      <ul className="instruments">
        {instruments.map((each, i) => (
          <li key={each.id}>
            <label>
              <input
                type="radio"
                name="principal"
                checked={each.id === principal}
                disabled={locked}
                onChange={() => {
                  apply((store) => store.editAt("/principal", each.id, { step: "principal instrument" }));
                  setOpen(each.id);
                }}
              />
              {each.name}
            </label>{" "}
            {each.id === principal ? <span className="quiet">principal</span> : null}{" "}
            <button
              type="button"
              className="figure-button"
              aria-expanded={each.id === shown}
              onClick={() => setOpen(each.id)}
            >
              figures<span className="unseen"> of {each.name}</span>
            </button>{" "}
            {instruments.length > 1 && each.id !== principal ? (
              <button
                type="button"
                className="figure-button"
                disabled={locked}
                onClick={() => apply((store) => store.removeAt(`/instruments/${i}`, "remove an instrument"))}
              >
                remove<span className="unseen"> {each.name}</span>
              </button>
            ) : null}
          </li>
        ))}
      </ul>
      <AddInstrument taken={instruments} onAdded={setOpen} />
      {one === undefined ? null : <InstrumentFields key={one.id} instrument={one} at={`/instruments/${at}`} />}
    </section>
  );
}

function AddInstrument({
  taken,
  onAdded,
}: {
  readonly taken: readonly Instrument[];
  readonly onAdded: (id: string) => void;
}) {
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const free = useMemo(() => catalogue.instruments.filter((each) => !taken.some((one) => one.id === each.id)), [taken]);
  return (
    <div className="field add-instrument">
      <label htmlFor="add-instrument">add an instrument</label>
      <select
        id="add-instrument"
        value=""
        disabled={locked}
        onChange={(event) => {
          const found = free.find((each) => each.id === event.target.value);
          if (found === undefined) return;
          apply((store) => store.editAt("/instruments/-", found, { step: "add an instrument", origin: "catalogue" }));
          onAdded(found.id);
        }}
      >
        <option value="">by range and function …</option>
        {free.map((each) => (
          <option key={each.id} value={each.id}>
            {each.name}
          </option>
        ))}
      </select>
    </div>
  );
}

const functions: readonly (readonly [InstrumentFunction, string])[] = [
  ...new Set(catalogue.instruments.map((each) => each.function)),
].map((each) => [each, each] as const);

function InstrumentFields({ instrument: i, at }: { readonly instrument: Instrument; readonly at: string }) {
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
        label="its spread, ±"
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
        label="its spread, ±"
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
      <QuantityField
        label="cable length"
        pointer={`${at}/cable/length_m`}
        unit="m"
        value={i.cable.length_m}
        greatest={1000}
      />
      <QuantityField
        label="cable capacitance a metre"
        pointer={`${at}/cable/capacitance_F_per_m`}
        unit="F/m"
        value={i.cable.capacitance_F_per_m}
        greatest={1e-6}
      />
    </div>
  );
}
