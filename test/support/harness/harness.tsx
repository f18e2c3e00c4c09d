import { StrictMode } from "react";
import { createRoot } from "react-dom/client";
import "./harness.css";
import { ElementChart } from "../../../src/ui/charts/ElementChart.tsx";
import { FrequencyChart } from "../../../src/ui/charts/FrequencyChart.tsx";
import { StepChart } from "../../../src/ui/charts/StepChart.tsx";
import { inventedProof } from "../inventedProof.ts";

const values = inventedProof.sheet.values;
const list = (path: string) => values[path] as readonly number[];

createRoot(document.getElementById("root")!).render(
  <StrictMode>
    <main>
      <FrequencyChart
        response={inventedProof.frequency}
        tolerance={0.03}
        band_Hz={[0, 3.5e6]}
        bandwidth_Hz={30e6}
        file="invented-frequency"
      />
      <StepChart step={inventedProof.step} tolerance={0.03} file="invented-step" />
      <ElementChart
        title="voltage per element"
        quantity="voltage"
        unit="V"
        file="invented-voltage"
        bases={[
          {
            id: "peak",
            name: "peak",
            values: list("element.greatest_Vpeak"),
            limits: list("element.voltageLimit_Vpeak"),
          },
          {
            id: "rms",
            name: "dc or rms",
            values: list("element.greatestRms_V"),
            limits: list("element.voltageLimit_V"),
          },
        ]}
      />
    </main>
  </StrictMode>,
);
