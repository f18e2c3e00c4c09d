import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { SessionContext, useDocument } from "../../../src/ui/frame/session.ts";
import { QuantityField } from "../../../src/ui/inputs/QuantityField.tsx";
import { inventedSession } from "../../support/inventedSession.ts";

function SourceResistance() {
  const { source, policy } = useDocument().brief;
  return (
    <>
      <QuantityField
        label="source resistance"
        pointer="/brief/source/resistance_ohm"
        unit="ohm"
        value={source.resistance_ohm}
        series="E12"
        greatest={1e15}
      />
      <QuantityField
        label="accepted sag"
        pointer="/brief/policy/allowedSag"
        unit="1"
        value={policy.allowedSag}
        share
        blank="as wanted"
        greatest={1}
      />
    </>
  );
}

function opened() {
  const session = inventedSession();
  render(
    <SessionContext value={session}>
      <SourceResistance />
    </SessionContext>,
  );
  const brief = () => session.store.getState().document.brief;
  return { session, brief, field: screen.getByLabelText<HTMLInputElement>("source resistance") };
}

const retype = async (field: HTMLElement, text: string) => {
  await userEvent.clear(field);
  await userEvent.type(field, text);
};

describe("the quantity field", () => {
  it("keeps what was typed and says what it understood", async () => {
    const { session, brief, field } = opened();
    await retype(field, "4k7");
    expect(field.value).toBe("4k7");
    expect(brief().source.resistance_ohm).toBe(4700);
    expect(screen.getByText(/→\s*4\.7\s*kΩ/)).toBeInTheDocument();
    expect(session.store.getState().document.typed["/brief/source/resistance_ohm"]).toBe("4k7");
    expect(session.store.getState().document.origins["/brief/source/resistance_ohm"]).toBe("typed");
  });

  it("makes one step of undo of one field's typing", async () => {
    const { session, field } = opened();
    await retype(field, "4k7");
    await userEvent.tab();
    expect(session.store.getState().past).toHaveLength(1);
    await retype(field, "5k6");
    expect(session.store.getState().past).toHaveLength(2);
  });

  it("leaves invalid text in sight with its message, and the value as it was", async () => {
    const { brief, field } = opened();
    await retype(field, "4k7");
    await userEvent.type(field, "x");
    expect(field.value).toBe("4k7x");
    expect(field).toHaveAttribute("aria-invalid", "true");
    expect(field).toHaveAccessibleDescription(/\S/);
    expect(brief().source.resistance_ohm).toBe(4700);
  });

  it("asks whether 10m is milli, and takes the answer pressed", async () => {
    const { brief, field } = opened();
    const before = brief().source.resistance_ohm;
    await retype(field, "10m");
    const choice = screen.getByRole("button", { name: /10\s*MΩ/ });
    expect(brief().source.resistance_ohm).not.toBe(0.01);
    await userEvent.click(choice);
    expect(brief().source.resistance_ohm).toBe(10e6);
    expect(before).not.toBe(10e6);
  });

  it("restores what stood there on Escape, origin and all", async () => {
    const { session, brief, field } = opened();
    const { resistance_ohm } = brief().source;
    const origin = session.store.getState().document.origins["/brief/source/resistance_ohm"] ?? "typed";
    await userEvent.click(field);
    await userEvent.type(field, "{Control>}a{/Control}22k{Escape}");
    expect(brief().source.resistance_ohm).toBe(resistance_ohm);
    expect(session.store.getState().document.origins["/brief/source/resistance_ohm"] ?? "typed").toBe(origin);
  });

  it("steps through the preferred values, and by decades with Shift", async () => {
    const { brief, field } = opened();
    await retype(field, "4k7");
    await userEvent.keyboard("{ArrowUp}");
    expect(brief().source.resistance_ohm).toBe(5600);
    await userEvent.keyboard("{Shift>}{ArrowDown}{/Shift}");
    expect(brief().source.resistance_ohm).toBe(560);
    expect(field.value).toBe("560 Ω");
  });

  it("marks a value as measured by Alt M", async () => {
    const { session, field } = opened();
    await retype(field, "4k7");
    await userEvent.keyboard("{Alt>}m{/Alt}");
    expect(session.store.getState().document.origins["/brief/source/resistance_ohm"]).toBe("measured");
    expect(screen.getByText("measured")).toBeInTheDocument();
  });

  it("asks about a share above one, and takes a blank as the default", async () => {
    const { brief } = opened();
    const field = screen.getByLabelText("accepted sag");
    await retype(field, "2 %");
    expect(brief().policy.allowedSag).toBe(0.02);
    await retype(field, "80");
    await userEvent.click(screen.getByRole("button", { name: /80\s*%/ }));
    expect(brief().policy.allowedSag).toBe(0.8);
    await userEvent.clear(field);
    expect(brief().policy.allowedSag).toBeNull();
  });
});
