import { useEffect, useLayoutEffect, useRef, useState } from "react";
import { why } from "../../solver/index.ts";
import { type Session, useJudged, useLooking, useSession, type WhyAsked } from "./session.ts";
import { WhyGiven } from "./WhyGiven.tsx";
import { WhyLaid } from "./WhyLaid.tsx";

/** The why of a number, opened in place: formula, the same with its numbers, result, origins, source. */
export function Why() {
  const asked = useLooking((state) => state.why);
  if (asked === null) return null;
  return <Opened key={`${asked.at.left} ${asked.at.top}`} asked={asked} />;
}

function Opened({ asked }: { readonly asked: WhyAsked }) {
  const session = useSession();
  const proof = useJudged((state) => state.proof);
  const sizing = useJudged((state) => state.sizing);
  const box = useFocus(asked.path);
  const place = usePlace(box, asked);
  const sheet = asked.from === "sizing" ? sizing?.sheet : proof?.sheet;
  const found = sheet === undefined ? null : why(asked.path, sheet, proof?.origins ?? {}, asked.index);
  const go = (path: string) =>
    session.looking.setState({ why: { ...asked, path, trail: [...asked.trail, asked.path] } });
  return (
    <section
      ref={box}
      className="why"
      aria-label="why this number"
      tabIndex={-1}
      style={place}
      onKeyDown={(event) => {
        if (event.key !== "Escape") return;
        event.stopPropagation();
        close(session);
      }}
    >
      {found === null ? (
        <p>This number has no trace here.</p>
      ) : found.kind === "given" ? (
        <WhyGiven found={found} />
      ) : (
        <WhyLaid found={found} onGo={go} />
      )}
      <p className="end">
        {asked.trail.length === 0 ? null : (
          <button type="button" className="plain-button" onClick={() => back(session, asked)}>
            back
          </button>
        )}
        <button type="button" className="plain-button" onClick={() => close(session)}>
          close
        </button>
      </p>
    </section>
  );
}

const close = (session: Session) => session.looking.setState({ why: null });

function back(session: Session, asked: WhyAsked): void {
  const path = asked.trail.at(-1);
  if (path !== undefined) session.looking.setState({ why: { ...asked, path, trail: asked.trail.slice(0, -1) } });
}

/** The focus goes into what opened, and back to the number pressed when it closes. */
function useFocus(path: string) {
  const box = useRef<HTMLElement>(null);
  const pressed = useRef<Element | null>(null);
  useEffect(() => {
    pressed.current = document.activeElement;
    return () => {
      const from = pressed.current as HTMLElement | null;
      if (document.activeElement === document.body || document.activeElement === null) from?.focus?.();
    };
  }, []);
  // biome-ignore lint/correctness/useExhaustiveDependencies: each further figure takes the focus anew
  useEffect(() => box.current?.focus({ preventScroll: true }), [path]);
  return box;
}

/** Under the number pressed; above it where there is no room under it; always within the window. */
function usePlace(box: React.RefObject<HTMLElement | null>, { at }: WhyAsked) {
  const [place, setPlace] = useState({ left: at.left, top: at.bottom + 6 });
  useLayoutEffect(() => {
    const { offsetWidth: wide, offsetHeight: tall } = box.current!;
    const { scrollX, scrollY, innerHeight } = window;
    const right = scrollX + document.documentElement.clientWidth - wide - 8;
    const under = at.bottom + 6;
    const over = at.top - 6 - tall;
    const fits = under + tall <= scrollY + innerHeight - 8;
    const top =
      fits || over < scrollY ? Math.min(under, Math.max(scrollY + 8, scrollY + innerHeight - tall - 8)) : over;
    setPlace({ left: Math.max(scrollX + 8, Math.min(at.left, right)), top });
  }, [box, at]);
  return place;
}
