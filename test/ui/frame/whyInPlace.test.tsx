import { act, render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { figures } from "../../../src/solver/index.ts";
import { InShort } from "../../../src/ui/frame/InShort.tsx";
import { openWhy, SessionContext } from "../../../src/ui/frame/session.ts";
import { Typeset } from "../../../src/ui/frame/Typeset.tsx";
import { Why } from "../../../src/ui/frame/Why.tsx";
import { solvedSession } from "../../support/solvedSession.ts";

function opened(demo = "pulse-into-scope") {
  const session = solvedSession(demo);
  const { container } = render(
    <SessionContext value={session}>
      <InShort />
      <Why />
    </SessionContext>,
  );
  return { session, container };
}
const panel = () => screen.getByRole("region", { name: "why this number" });

describe("the why of a number", () => {
  it("opens from the figure, goes down to an input and its field, and back", async () => {
    const { session } = opened();
    const pressed = within(screen.getByRole("region", { name: "in short" })).getAllByRole("button")[0]!;
    await userEvent.click(pressed);
    expect(panel()).toHaveTextContent(/Scale factor, predicted/);
    expect(panel()).toHaveTextContent(/IEC 60060-2/);
    const row = within(panel()).getByText("input resistance of the instrument").closest("tr")!;
    await userEvent.click(within(row).getByRole("button"));
    expect(panel()).toHaveTextContent(/An input: (typed|copied|assumed)/);
    expect(screen.getByRole("button", { name: "go to its field" })).toBeInTheDocument();
    await userEvent.click(screen.getByRole("button", { name: "back" }));
    expect(panel()).toHaveTextContent(/Scale factor, predicted/);
    await userEvent.keyboard("{Escape}");
    expect(session.looking.getState().why).toBeNull();
    expect(pressed).toHaveFocus();
  });

  it("lays out every figure that a screen shows, with its source", () => {
    const { session } = opened();
    const { sheet } = session.judged.getState().proof!;
    for (const path of Object.keys(figures).filter((each) => sheet.values[each] !== undefined)) {
      act(() => openWhy(session, path, Array.isArray(sheet.values[path]) ? 0 : null));
      expect(panel().textContent, path).not.toMatch(/NaN|Infinity|undefined|\{|no trace|\w_(ohm|F|V|Hz)\b/);
      expect(panel().querySelector("h2")?.textContent, path).toMatch(/\S/);
    }
  });
});

describe("a formula", () => {
  const html = (text: string) => render(<Typeset text={text} />).container.innerHTML;
  it("is set with lowered and raised parts, quantities slanted, units upright", () => {
    expect(html("R_2p = V_e² / P")).toBe("<i>R</i><sub>2p</sub> = <i>V</i><sub>e</sub>² / <i>P</i>");
    expect(html("10^-6 · 2 kV")).toBe("10<sup>-6</sup> · 2 kV");
    expect(html("v_(i−1) + ln 2")).toBe("<i>v</i><sub>i−1</sub> + ln 2");
  });
});
