import { fireEvent, render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { formatQuantity } from "../../../src/solver/index.ts";
import { Column } from "../../../src/ui/column/Column.tsx";
import { SessionContext } from "../../../src/ui/frame/session.ts";
import { expectRelative } from "../../support/relative.ts";
import { solvedSession } from "../../support/solvedSession.ts";

function opened() {
  const session = solvedSession("dc-supply-into-meter");
  render(
    <SessionContext value={session}>
      <Column />
    </SessionContext>,
  );
  return { session, column: screen.getByRole("slider", { name: /element of the string/ }) };
}

describe("the column", () => {
  it("is stepped along with the keyboard and says where it stands", async () => {
    const { session, column } = opened();
    column.focus();
    await userEvent.keyboard("{End}");
    const potentials = session.judged.getState().proof!.sheet.values["element.nodePotential_V"] as number[];
    expect(column).toHaveAttribute("aria-valuetext", `element 12 of 12, ${formatQuantity(potentials[11]!, "V")}`);
    await userEvent.keyboard("{ArrowUp}");
    expect(column).toHaveAttribute("aria-valuenow", "12");
    await userEvent.keyboard("{Home}{PageUp}");
    expect(session.looking.getState().element).toBe(11);
    await userEvent.keyboard("{Escape}");
    expect(session.looking.getState().element).toBeNull();
  });

  it("opens a slip whose numbers are those of the proof, and changes the element's value there", async () => {
    const { session, column } = opened();
    column.focus();
    await userEvent.keyboard("{Home}");
    const slip = within(screen.getByRole("region", { name: "element 1" }));
    const limits = session.judged.getState().proof!.sheet.values["element.voltageLimit_V"] as number[];
    expect(screen.getByRole("region", { name: "element 1" }).textContent).toContain(formatQuantity(limits[0]!, "V"));
    const field = slip.getByLabelText("resistance");
    await userEvent.clear(field);
    await userEvent.type(field, "82M");
    const { design } = session.store.getState().document;
    expect(design?.hvArm.elements[0]?.resistance_ohm).toBe(82e6);
    expect(design?.follows).toBe(false);
  });

  it("says what the ink stands for on each layer, with its numbers", async () => {
    opened();
    expect(screen.getByText(/potential of each upper end/)).toBeInTheDocument();
    await userEvent.click(screen.getByLabelText("heat"));
    expect(screen.getByText(/full ink is its derated limit/)).toBeInTheDocument();
    await userEvent.click(screen.getByLabelText("millimetres"));
    expect(screen.getByRole("slider", { name: /element of the string/ }).getAttribute("aria-valuetext")).toMatch(/mm$/);
  });

  it("has handles for the keyboard: a run of arrows on one is one step of undo", async () => {
    const { session } = opened();
    const handle = screen.getByRole("slider", { name: "length of the column" });
    const before = session.store.getState().document.design!.geometry.columnLength_m;
    handle.focus();
    await userEvent.keyboard("{ArrowUp}{ArrowUp}{Shift>}{ArrowUp}{/Shift}");
    const after = session.store.getState().document.design!.geometry.columnLength_m;
    expectRelative(after / before, 1.01 * 1.01 * 1.1, 1e-3, "four digits are kept");
    expect(handle.getAttribute("aria-valuetext")).toBe(`${Number((after * 1000).toPrecision(4))} mm`);
    session.store.getState().undo();
    expect(session.store.getState().document.design!.geometry.columnLength_m).toBe(before);
  });

  it("a drag moves the length, at most once a frame, and is one step of undo", async () => {
    const { session } = opened();
    const handle = screen.getByRole("slider", { name: "length of the column" });
    const before = session.store.getState().document.design!.geometry.columnLength_m;
    fireEvent.pointerDown(handle, { clientY: 100, pointerId: 1 });
    for (const clientY of [98, 95, 90]) fireEvent.pointerMove(handle, { clientY, pointerId: 1 });
    fireEvent.pointerUp(handle, { pointerId: 1 });
    await vi.waitFor(() =>
      expect(session.store.getState().document.design!.geometry.columnLength_m).toBeGreaterThan(before),
    );
    session.store.getState().undo();
    expect(session.store.getState().document.design!.geometry.columnLength_m).toBe(before);
  });
});
