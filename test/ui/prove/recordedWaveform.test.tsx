import { fireEvent, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { SessionContext } from "../../../src/ui/frame/session.ts";
import { RecordedWaveform } from "../../../src/ui/prove/RecordedWaveform.tsx";
import { inlineWorker } from "../../../src/work/inline.ts";
import { Lane } from "../../../src/work/lane.ts";
import { runJob } from "../../../src/work/runJob.ts";
import { solvedSession } from "../../support/solvedSession.ts";

beforeAll(() => vi.stubGlobal("IntersectionObserver", undefined));

const file = (text: string, name = "shot.csv") => new File([text], name, { type: "text/csv" });

function shown() {
  const solved = solvedSession("pulse-into-scope");
  const through = new Lane({ startWorker: () => inlineWorker(runJob), now: () => 0, patience_ms: 0 });
  const session = { ...solved, runner: { ...solved.runner, through } };
  render(
    <SessionContext.Provider value={session}>
      <RecordedWaveform />
    </SessionContext.Provider>,
  );
  return screen.getByLabelText<HTMLInputElement>("open a CSV");
}

describe("a recorded waveform on the screen", () => {
  it("is read, sent through the divider, and told in a sentence", async () => {
    const input = shown();
    await userEvent.upload(input, file("time (us),V\n0,0\n10,1000\n2000,1000\n"));
    expect(await screen.findByText("shot.csv, 3 points")).toBeInTheDocument();
    expect(await screen.findByText(/^The peak is read .*; the reading is off by .* % of the peak/)).toBeInTheDocument();
    fireEvent.change(screen.getByRole("combobox"), { target: { value: "source" } });
    expect(await screen.findByText(/of the peak at the worst/)).toBeInTheDocument();
  });
  it("that cannot be read is refused with its line, and the one before stays", async () => {
    const input = shown();
    await userEvent.upload(input, file("0,0\n1,1\n"));
    expect(await screen.findByText("shot.csv, 2 points")).toBeInTheDocument();
    await userEvent.upload(input, file("0,0\n1,1\n2,end\n", "bad.csv"));
    expect(await screen.findByRole("alert")).toHaveTextContent(/line 3: .* is not two numbers/);
    expect(screen.getByText("shot.csv, 2 points")).toBeInTheDocument();
  });
});
