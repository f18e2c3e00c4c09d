import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { ProveSheet } from "../../../src/ui/prove/ProveSheet.tsx";
import { inventedDocument } from "../../support/inventedDocument.ts";
import { inventedProof } from "../../support/inventedProof.ts";

beforeAll(() => vi.stubGlobal("IntersectionObserver", undefined));
const actions = () => ({ onWhy: vi.fn(), onCure: vi.fn() });
const sheet = (on = actions()) => <ProveSheet document={inventedDocument} proof={inventedProof} actions={on} />;

describe("fault table", () => {
  it("sets dc and edge side by side, worst first, and marks what the reading does not show", () => {
    render(sheet());
    const rows = within(screen.getByRole("region", { name: "table of faults" }))
      .getAllByRole("row")
      .slice(1);
    expect(rows[0]).toHaveTextContent("198 V");
    expect(rows[0]).toHaveTextContent("5.70 kV");
    expect(rows.find((row) => row.textContent?.includes("earth bond open"))).toHaveTextContent("silent");
    expect(rows.find((row) => row.textContent?.includes("an element open"))).toHaveTextContent("reads zero while live");
    expect(rows.find((row) => row.textContent?.includes("element 12 shorted"))).not.toHaveTextContent("silent");
  });
});

describe("findings in full", () => {
  it("give number, limit, margin, reason, clause and cure", async () => {
    const on = actions();
    render(sheet(on));
    const found = screen.getByText("creepage along the column", { selector: "strong" }).closest("li")!;
    for (const text of ["300 mm", "of at least 500 mm", "67 % past its limit", "table F.5", "pollution degree 2"])
      expect(found).toHaveTextContent(text);
    await userEvent.click(within(found).getByRole("button", { name: "add 8 elements" }));
    expect(on.onCure).toHaveBeenCalledWith(inventedProof.findings[0]!.cure);
    await userEvent.click(within(found).getByRole("button", { name: /^300\smm$/ }));
    expect(on.onWhy).toHaveBeenCalledWith("insulation.creepage_m", null);
  });
});

describe("the sheet", () => {
  it("stands under its cautions", () => {
    render(sheet());
    expect(screen.getByRole("region", { name: "cautions" })).toHaveTextContent("A zero reading does not mean");
  });

  it("says how short the shortest distance is", () => {
    render(sheet());
    expect(screen.getByText("Short: creepage along the column offers 300 mm of 500 mm required.")).toBeInTheDocument();
  });
});
