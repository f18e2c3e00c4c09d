import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { type SizeActions, SizeSheet } from "../../../src/ui/size/SizeSheet.tsx";
import { inventedDocument } from "../../support/inventedDocument.ts";
import { inventedProof } from "../../support/inventedProof.ts";
import { closedWindow, inventedSizing } from "../../support/inventedSizing.ts";

const actions = (): SizeActions => ({ onTake: vi.fn(), onSizeAgain: vi.fn(), onCure: vi.fn(), onWhy: vi.fn() });
const sheet = (on: SizeActions, over: object = {}) => (
  <SizeSheet document={inventedDocument} sizing={inventedSizing} proof={inventedProof} actions={on} {...over} />
);
const ranks = () => {
  const rows = within(screen.getByRole("region", { name: "table of candidates" }))
    .getAllByRole("row")
    .slice(1);
  return rows.map((row) => within(row).getAllByRole("cell")[1]!.textContent);
};

describe("candidates", () => {
  it("are sorted by a pressed column, the better end first, and turned by a second press", async () => {
    render(sheet(actions()));
    expect(ranks()).toEqual(["1", "2", "3", "4", "5", "6"]);
    await userEvent.click(screen.getByRole("button", { name: "margin" }));
    expect(ranks()).toEqual(["1", "2", "3", "4", "5", "6"]);
    expect(screen.getByRole("columnheader", { name: /^margin/ })).toHaveAttribute("aria-sort", "descending");
    await userEvent.click(screen.getByRole("button", { name: /^margin/ }));
    expect(ranks()).toEqual(["6", "5", "4", "3", "2", "1"]);
  });

  it("are taken by row or by drawing; the one in the design is marked", async () => {
    const on = actions();
    render(sheet(on));
    await userEvent.click(screen.getByRole("button", { name: "take candidate 3" }));
    expect(on.onTake).toHaveBeenLastCalledWith(inventedSizing.candidates[2]);
    await userEvent.click(screen.getByRole("button", { name: /^4\s*2 strings, 40/ }));
    expect(on.onTake).toHaveBeenLastCalledWith(inventedSizing.candidates[3]);
    expect(screen.queryByRole("button", { name: "take candidate 1" })).toBeNull();
  });

  it("offer to size again once the design was picked", async () => {
    const on = actions();
    const picked = { ...inventedDocument, design: { ...inventedDocument.design!, follows: false } };
    render(sheet(on, { document: picked }));
    await userEvent.click(screen.getByRole("button", { name: "size again" }));
    expect(on.onSizeAgain).toHaveBeenCalledOnce();
  });
});

describe("window", () => {
  it("opens the why of a bound", async () => {
    const on = actions();
    render(sheet(on));
    await userEvent.click(screen.getAllByRole("button", { name: /^2\.4\sMΩ$/ })[0]!);
    expect(on.onWhy).toHaveBeenCalledWith("window.currentLimit_ohm", "sizing");
  });

  it("that is shut names the collision and offers its cures", async () => {
    const on = actions();
    render(sheet(on, { sizing: { ...inventedSizing, window: closedWindow, candidates: [] } }));
    expect(screen.getByText("No resistance window.")).toBeInTheDocument();
    await userEvent.click(screen.getByRole("button", { name: "scale factor 100" }));
    expect(on.onCure).toHaveBeenCalledWith(closedWindow.cures[0]);
  });

  it("says why each other family lost", () => {
    render(sheet(actions()));
    expect(screen.getByText("2 families ruled out, and why")).toBeInTheDocument();
    expect(screen.getByText("No limiting element voltage is stated.")).toBeInTheDocument();
  });
});

describe("LV arm", () => {
  it("sets exact beside fitted, and the three matches beside what is fitted", () => {
    render(sheet(actions()));
    const exact = screen.getByRole("row", { name: /^fitted 137/ });
    expect(exact).toHaveTextContent("+14.3 % off the exact value");
    const chosen = screen.getByRole("row", { name: /flattest over the band/ });
    expect(chosen).toHaveTextContent("chosen");
    expect(chosen).toHaveTextContent("18.6 nF");
  });

  it("gives every instrument a scale factor of its own and the error of using another's", () => {
    render(sheet(actions()));
    expect(screen.getByRole("row", { name: /hand meter/ })).toHaveTextContent("891.2");
    expect(screen.getByRole("row", { name: /hand meter/ })).toHaveTextContent("+12.3 %");
  });
});
