import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { LvShareBar } from "../../../src/ui/size/LvShareBar.tsx";
import { Matches } from "../../../src/ui/size/Matches.tsx";
import { ReachBars } from "../../../src/ui/size/ReachBars.tsx";
import { inventedDocument } from "../../support/inventedDocument.ts";
import { inventedProof } from "../../support/inventedProof.ts";

const { sheet, matches, reach } = inventedProof;
const lvArm = inventedDocument.design!.lvArm;

describe("the three matches", () => {
  const shown = (onCure = vi.fn()) => {
    render(<Matches matches={matches} sheet={sheet} lvArm={lvArm} wanted={0.03} onWhy={vi.fn()} onCure={onCure} />);
    return onCure;
  };
  it("stand side by side, the chosen one without a button", () => {
    shown();
    const chosen = screen.getByRole("region", { name: "flattest over the band" });
    expect(chosen).toHaveTextContent("chosen");
    expect(within(chosen).queryByRole("button", { name: /^choose/ })).toBeNull();
    expect(screen.getByText(/6\.59\s%\s*apart/)).toBeInTheDocument();
  });

  it("are chosen with links and trimmer set for them, and say what is out of reach", async () => {
    const onCure = shown();
    await userEvent.click(screen.getByRole("button", { name: "choose edge equal to dc" }));
    // 18.2 nF: the 18 nF alone and 60 pF is the nearest that the invented links and trimmer reach.
    expect(onCure).toHaveBeenCalledWith({
      label: "LV capacitance: edge equal to dc",
      edits: [
        { pointer: "/design/lvArm/capacitanceBy", value: "highFrequency" },
        { pointer: "/design/lvArm/branches/3/fitted", value: false },
        { pointer: "/design/lvArm/branches/5/trimmer/setting", value: 1 },
      ],
    });
    expect(screen.getByText(/end 140\spF below it/)).toBeInTheDocument();
  });
});

describe("what the LV capacitance is made of", () => {
  it("names each share and opens its why", async () => {
    const onWhy = vi.fn();
    render(<LvShareBar sheet={sheet} onWhy={onWhy} />);
    expect(screen.getByText(/0\.62\s%\s*of it is cable and instrument/)).toBeInTheDocument();
    expect(screen.queryByText(/protectors/)).toBeNull();
    await userEvent.click(screen.getByRole("button", { name: /^100\spF$/ }));
    expect(onWhy).toHaveBeenCalledWith("lvArm.share.cable_F");
  });
});

describe("what can be set against what may be needed", () => {
  it("names the hole and the instrument that is not sure of its match", () => {
    render(<ReachBars reach={reach!} fitted_F={18.5e-9} />);
    expect(screen.getByText(/1 hole between links: before 1\snF, 400\spF wide/)).toBeInTheDocument();
    expect(screen.getByText(/^bench oscilloscope: may need/)).toBeInTheDocument();
    expect(screen.getByText(/^17\.9 … 19\.2\snF$/)).toBeInTheDocument();
  });
});
