import { fireEvent, render, screen } from "@testing-library/react";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { ElementChart } from "../../../src/ui/charts/ElementChart.tsx";
import { FrequencyChart } from "../../../src/ui/charts/FrequencyChart.tsx";
import { StepChart } from "../../../src/ui/charts/StepChart.tsx";
import { inventedResponse, inventedStep } from "../../support/inventedProof.ts";

beforeAll(() => vi.stubGlobal("IntersectionObserver", undefined));

const frequency = (
  <FrequencyChart
    response={inventedResponse}
    tolerance={0.03}
    band_Hz={[0, 3.5e6]}
    bandwidth_Hz={30e6}
    file="frequency"
  />
);

const drawn = async (container: HTMLElement, traces: number) =>
  vi.waitFor(() => {
    const paths = [...container.querySelectorAll(".recharts-line-curve")];
    expect(paths).toHaveLength(traces);
    for (const path of paths) expect(path.getAttribute("d")).toMatch(/^M[\d.]+,-?[\d.]+L/);
  });

describe("frequency response", () => {
  it("draws magnitude, phase and input impedance with their end labels, decade ticks, band limit and −3 dB mark", async () => {
    const { container } = render(frequency);
    await drawn(container, 3);
    for (const text of ["magnitude", "phase", "band to 3.5 MHz", "−3 dB at 30 MHz", "wanted ±3 %"])
      expect(screen.getByText(text)).toBeInTheDocument();
    for (const tick of ["1", "10 k", "1 G"]) expect(screen.getAllByText(tick)[0]).toBeInTheDocument();
  });

  it("reads out the point under a cursor moved by keyboard", async () => {
    const { container } = render(frequency);
    await drawn(container, 3);
    const cursor = screen.getByRole("slider");
    fireEvent.keyDown(cursor, { key: "End" });
    expect(cursor.getAttribute("aria-valuetext")).toMatch(/^1\u2009GHz: −30\.\d+\u2009dB/);
    fireEvent.keyDown(cursor, { key: "Home" });
    fireEvent.keyDown(cursor, { key: "ArrowRight", shiftKey: true });
    expect(cursor.getAttribute("aria-valuetext")).toMatch(/^1\.778\u2009Hz/);
  });

  it("copies the cursor's values with every digit", async () => {
    const { container } = render(frequency);
    await drawn(container, 3);
    const cursor = screen.getByRole("slider");
    fireEvent.keyDown(cursor, { key: "End" });
    const set = vi.fn();
    fireEvent.copy(cursor, { clipboardData: { setData: set } });
    expect(set).toHaveBeenCalledWith(
      "text/plain",
      expect.stringContaining(`\n1000000000\t${inventedResponse.magnitude_dB[360]}`),
    );
  });

  it("shows its numbers as a table on request", async () => {
    const { container } = render(frequency);
    const details = container.querySelector("details")!;
    details.open = true;
    fireEvent(details, new Event("toggle"));
    expect(await screen.findByRole("columnheader", { name: "magnitude / dB" })).toBeInTheDocument();
    expect(screen.getByText("every 4th of 361 rows; the data file has all")).toBeInTheDocument();
  });
});

describe("step response", () => {
  it("draws fast and slow with one height, and the cursor walks from one into the other", async () => {
    const { container } = render(<StepChart step={inventedStep} tolerance={0.03} file="step" />);
    await drawn(container, 2);
    const cursor = screen.getByRole("slider");
    expect(Number(cursor.getAttribute("aria-valuemax"))).toBe(161 + 241 - 1);
    fireEvent.keyDown(cursor, { key: "End" });
    expect(cursor.getAttribute("aria-valuetext")).toMatch(/^1\u2009s after the step: 100\u2009%/);
  });
});

describe("stress per element", () => {
  it("draws a bar past its limit apart from those within it", async () => {
    const { container } = render(
      <ElementChart
        title="voltage per element"
        quantity="voltage"
        unit="V"
        file="voltage"
        bases={[
          {
            id: "peak",
            name: "peak",
            values: [1000, 2500, 900],
            limits: [2000, 2000, 2000],
            rated: [3000, 3000, 3000],
          },
        ]}
      />,
    );
    await vi.waitFor(() => expect(container.querySelectorAll(".recharts-bar-rectangle path")).toHaveLength(3));
    expect(container.querySelectorAll('.recharts-bar-rectangle path[fill="url(#plot-past)"]')).toHaveLength(1);
    expect(screen.getByText("derated 2 kV")).toBeInTheDocument();
  });
});
