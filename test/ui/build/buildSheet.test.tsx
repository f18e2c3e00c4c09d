import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { partsList, partsListCsv } from "../../../src/solver/index.ts";
import { BuildSheet, fileName } from "../../../src/ui/build/BuildSheet.tsx";
import { designatorRuns } from "../../../src/ui/build/designators.ts";
import { spreadsheetLocale } from "../../../src/ui/build/spreadsheetLocale.ts";
import { inventedDocument } from "../../support/inventedDocument.ts";
import { inventedProof } from "../../support/inventedProof.ts";

describe("parts list", () => {
  it("names the stops that stand before it is bought from", () => {
    render(<BuildSheet document={inventedDocument} proof={inventedProof} />);
    expect(screen.getByText("2 stops stand:").parentElement).toHaveTextContent("creepage along the column");
    expect(screen.getByRole("rowheader", { name: "R1–R12" })).toBeInTheDocument();
  });

  it("is downloaded as exactly the bytes that the solver writes", async () => {
    const made: Blob[] = [];
    vi.spyOn(URL, "createObjectURL").mockImplementation((blob) => {
      made.push(blob as Blob);
      return "blob:invented";
    });
    render(<BuildSheet document={inventedDocument} proof={inventedProof} />);
    await userEvent.click(screen.getByRole("button", { name: "CSV, data" }));
    const list = partsList(inventedDocument);
    expect(list.ok && (await made[0]!.text())).toBe(list.ok && partsListCsv(list.value, "data"));
  });

  it("says what to do where there is no design", () => {
    render(<BuildSheet document={{ ...inventedDocument, design: null }} proof={null} />);
    expect(screen.getByRole("status")).toHaveTextContent("There is no design yet.");
  });
});

describe("names", () => {
  it("draws runs of designators together and leaves others apart", () => {
    expect(designatorRuns(["R1", "R2", "R3", "R5", "R6"])).toBe("R1–R3, R5, R6");
    expect(designatorRuns(["R1a", "R2a", "R3a", "R1b"])).toBe("R1a–R3a, R1b");
    expect(designatorRuns(["R2a", "R2b.1"])).toBe("R2a, R2b.1");
  });

  it("makes a file name of any title", () => {
    expect(fileName("Peak of a 48 kV pulse, 100 ns!")).toBe("peak-of-a-48-kv-pulse-100-ns");
    expect(fileName("///")).toBe("divider");
  });

  it("reads the decimal mark of a locale", () => {
    expect(spreadsheetLocale("de-DE")).toEqual({ separator: ";", decimalMark: "," });
    expect(spreadsheetLocale("en-GB")).toEqual({ separator: ",", decimalMark: "." });
  });
});
