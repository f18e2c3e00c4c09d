import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { SourceAsked } from "../../../src/ui/ask/SourceAsked.tsx";
import { Findings } from "../../../src/ui/frame/Findings.tsx";
import { SessionContext, useDocument } from "../../../src/ui/frame/session.ts";
import { solvedSession } from "../../support/solvedSession.ts";

function Both() {
  return (
    <>
      <SourceAsked brief={useDocument().brief} />
      <Findings />
    </>
  );
}

/** The supply floats: the divider would earth it. */
function floating() {
  const session = solvedSession("dc-supply-into-meter", (document) => ({
    ...document,
    brief: { ...document.brief, source: { ...document.brief.source, earth: "floating" } },
  }));
  render(
    <SessionContext value={session}>
      <Both />
    </SessionContext>,
  );
  return session;
}

describe("the findings", () => {
  it("stand worst first, each with its level as a word", () => {
    floating();
    const items = screen.getAllByRole("listitem");
    expect(items[0]).toHaveTextContent(/^stop/);
    expect(items.at(-1)).toHaveTextContent(/clear$/);
  });

  it("open their reason with its source in place", async () => {
    floating();
    const [line] = screen.getAllByRole("button", { expanded: false });
    await userEvent.click(line!);
    expect(line).toHaveAttribute("aria-expanded", "true");
    expect(screen.getAllByRole("listitem")[0]!.querySelector(".reason")?.textContent).toMatch(/\.\s.+/);
  });

  it("say a certain cure under the field it changes, and make it as one step", async () => {
    const session = floating();
    const buttons = screen.getAllByRole("button", { name: /^one side is earthed/ });
    expect(buttons).toHaveLength(2);
    expect(buttons[0]!.closest(".field")?.querySelector("label")).toHaveTextContent("which point is earth");
    await userEvent.click(buttons[0]!);
    expect(session.store.getState().document.brief.source.earth).toBe("oneSide");
    session.store.getState().undo();
    expect(session.store.getState().document.brief.source.earth).toBe("floating");
  });
});
