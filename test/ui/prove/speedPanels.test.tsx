import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { prove, speed } from "../../../src/solver/index.ts";
import { StepChart } from "../../../src/ui/charts/StepChart.tsx";
import { SessionContext } from "../../../src/ui/frame/session.ts";
import { InstrumentSpeedTable } from "../../../src/ui/prove/InstrumentSpeedTable.tsx";
import { nearestRing } from "../../../src/ui/prove/nearestRing.ts";
import { RingPanel } from "../../../src/ui/prove/RingPanel.tsx";
import { SlowFastPanel } from "../../../src/ui/prove/SlowFastPanel.tsx";
import { SpeedSections } from "../../../src/ui/prove/SpeedSections.tsx";
import { solvedSession } from "../../support/solvedSession.ts";

beforeAll(() => vi.stubGlobal("IntersectionObserver", undefined));
const session = solvedSession("pulse-into-scope", (document) => ({
  ...document,
  design: { ...document.design!, lead: { inductance_H: 1e-6, damping_ohm: 0 } },
}));
const { document } = session.store.getState();
const found = speed(document);
const proof = prove(document);
if (!found.ok || !proof.ok) throw new Error("the demo is not usable");
const answer = found.value;

describe("slow/fast check", () => {
  it("draws four pictures at each of two frequencies, with their divisions, and the table of them", () => {
    render(<SlowFastPanel check={answer.slowFast!} />);
    expect(screen.getAllByRole("img")).toHaveLength(8);
    for (const name of ["as designed", "good match", "5.% too small", "5.% too large"])
      expect(screen.getAllByRole("img", { name: new RegExp(name) })).toHaveLength(2);
    const rows = within(screen.getByRole("region", { name: "table of the slow/fast check" })).getAllByRole("row");
    expect(rows).toHaveLength(1 + answer.slowFast!.rows.length);
    expect(screen.getByText(/The two amplitudes must agree/)).toBeInTheDocument();
  });
});

describe("rings", () => {
  it("tell which of them a measured one is nearest to", async () => {
    render(<RingPanel rings={answer.rings} />);
    const lead = answer.rings.find((ring) => ring.id === "lead")!;
    await userEvent.type(screen.getByLabelText("ring seen on the screen"), `${(lead.frequency_Hz * 1.04) / 1e6} MHz`);
    expect(screen.getByText(/It may be the divider/)).toBeInTheDocument();
    await userEvent.clear(screen.getByLabelText("ring seen on the screen"));
    await userEvent.type(screen.getByLabelText("ring seen on the screen"), "1 MHz");
    expect(screen.getByText(/Not likely the divider/)).toBeInTheDocument();
    await userEvent.clear(screen.getByLabelText("ring seen on the screen"));
    await userEvent.type(screen.getByLabelText("ring seen on the screen"), "thirty");
    expect(screen.getByText(/not understood/)).toBeInTheDocument();
  });
  it("leave out what is damped", () => {
    const ring = { name: "", how: "", cure: "", counted: true };
    const rings = [
      { ...ring, id: "a", frequency_Hz: 1e7, damping: 1 },
      { ...ring, id: "b", frequency_Hz: 4e7, damping: 0.1 },
    ];
    expect(nearestRing(rings, 1e7)).toMatchObject({ ring: { id: "b" }, close: false });
    expect(nearestRing(rings, 4.9e7)).toMatchObject({ ring: { id: "b" }, close: true });
    expect(nearestRing([], 1e7)).toBeNull();
  });
});

describe("instruments side by side", () => {
  it("mark the principal one", () => {
    render(<InstrumentSpeedTable rows={answer.instruments} wantedUncertainty={0.03} />);
    expect(screen.getByRole("rowheader", { name: /principal/ })).toHaveTextContent(answer.instruments[0]!.name);
  });
});

describe("the step chart with what is answered when looked at", () => {
  it("offers the brief's edge, the source and the spread, each with its traces", async () => {
    const { container } = render(
      <StepChart step={proof.value.step} tolerance={0.03} traces={answer.traces} file="step" />,
    );
    const lines = (count: number) =>
      vi.waitFor(() => expect(container.querySelectorAll(".recharts-line-curve")).toHaveLength(2 * count));
    await lines(1);
    await userEvent.click(screen.getByRole("button", { name: /^edge of 100/ }));
    await lines(1);
    expect(screen.getByText(/A straight edge of 100/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole("button", { name: "from the source" }));
    await lines(2);
    await userEvent.click(screen.getByRole("button", { name: "spread of parts" }));
    await lines(3);
    expect(screen.queryByRole("button", { name: "with echoes" })).toBeNull();
  });
});

describe("the sections on speed", () => {
  it("say that they are being computed until the answer comes, with the signal's figures at once", () => {
    render(
      <SessionContext value={session}>
        <SpeedSections document={document} proof={proof.value} speed={null} />
      </SessionContext>,
    );
    expect(screen.getAllByText("Being computed.")).toHaveLength(3);
    expect(screen.getByRole("button", { name: /signal at the instrument/ })).toHaveTextContent(/mV/);
  });
});
