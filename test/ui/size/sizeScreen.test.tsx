import { act, fireEvent, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { SessionContext } from "../../../src/ui/frame/session.ts";
import { SizeScreen } from "../../../src/ui/size/SizeScreen.tsx";
import { inventedSession } from "../../support/inventedSession.ts";

function opened() {
  const session = inventedSession();
  const { container } = render(
    <SessionContext value={session}>
      <SizeScreen />
    </SessionContext>,
  );
  return { session, container, document: () => session.store.getState().document };
}

describe("Size on a session", () => {
  it("takes a candidate as one step that undo brings back", async () => {
    const { session, document } = opened();
    await userEvent.click(screen.getByRole("button", { name: "take candidate 3" }));
    expect(document().design?.hvArm.elements).toHaveLength(16);
    expect(document().design?.follows).toBe(false);
    act(() => session.store.getState().undo());
    expect(document().design?.hvArm.elements).toHaveLength(12);
    expect(document().design?.follows).toBe(true);
  });

  it("greys the last answer while a newer one is awaited", () => {
    const { session, container } = opened();
    expect(container.querySelector("[aria-busy=true]")).toBeNull();
    act(() => session.judged.setState({ stale: true }));
    expect(container.querySelector(".stale[aria-busy=true]")).not.toBeNull();
  });

  it("opens the why of a bound in the search's own sheet", async () => {
    const { session } = opened();
    await userEvent.click(screen.getAllByRole("button", { name: /^999\sMΩ$/ })[0]!);
    expect(session.looking.getState().why).toMatchObject({ path: "window.existence_ohm", from: "sizing" });
  });

  it("adds an own family with its stand-ins marked assumed, as one step", async () => {
    const { session, document } = opened();
    const type = (label: string, text: string) => userEvent.type(screen.getByLabelText(label), text);
    await type("plain name", "my film");
    await type("least value", "100k");
    await type("greatest value", "10M");
    await type("tolerance", "1");
    await type("rated dissipation at 70 °C", "0.6");
    await type("limiting element voltage", "350");
    await type("body length", "6.5");
    await type("body diameter", "2.5");
    await type("in hand", "20 x 10M");
    await userEvent.click(screen.getByRole("button", { name: "add family" }));
    const at = document().parts.length - 1;
    expect(document().parts[at]).toMatchObject({
      name: "my film",
      limitingVoltage_V: 350,
      inHand: [{ value: 10e6, count: 20 }],
    });
    expect(document().origins[`/parts/${at}/temperatureCoefficient_per_K`]).toBe("assumed");
    expect(session.store.getState().past).toHaveLength(1);
    expect(screen.getByRole("rowheader", { name: "my film" })).toBeInTheDocument();
  });
});

describe("families from a file", () => {
  it("are previewed row by row and added together as one step", async () => {
    const { session, document } = opened();
    const details = screen.getByText("families from a CSV file").closest("details")!;
    details.open = true;
    fireEvent(details, new Event("toggle"));
    const head =
      "kind,name,least_ohm,greatest_ohm,tolerance,ratedDissipation_W,limitingVoltage_V,bodyLength_m,bodyDiameter_m";
    const rows = ["a", "b", ""].map((name) => `resistor,${name},1k,1M,0.01,0.6,350,0.0065,0.0025`);
    const input = await screen.findByLabelText<HTMLInputElement>("CSV file, one family a row");
    await userEvent.upload(input, new File([[head, ...rows].join("\n")], "families.csv", { type: "text/csv" }));
    expect(await screen.findByText(/name: A plain name is needed/)).toBeInTheDocument();
    const before = document().parts.length;
    await userEvent.click(screen.getByRole("button", { name: "add 2 of 3" }));
    expect(document().parts).toHaveLength(before + 2);
    expect(session.store.getState().past).toHaveLength(1);
  });
});
