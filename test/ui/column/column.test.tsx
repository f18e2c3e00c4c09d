import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { formatQuantity } from "../../../src/solver/index.ts";
import { Column } from "../../../src/ui/column/Column.tsx";
import { SessionContext } from "../../../src/ui/frame/session.ts";
import { solvedSession } from "../../support/solvedSession.ts";

function opened() {
  const session = solvedSession("dc-supply-into-meter");
  render(
    <SessionContext value={session}>
      <Column />
    </SessionContext>,
  );
  return { session, column: screen.getByRole("slider") };
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
    expect(screen.getByRole("slider").getAttribute("aria-valuetext")).toMatch(/mm$/);
  });
});
