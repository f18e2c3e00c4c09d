import { type KeyboardEvent, useEffect, useRef, useState } from "react";
import { type Choice, evaluateArithmetic, type Origin, type Parsed, type SeriesName } from "../../solver/index.ts";
import { useDocument, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { originAt } from "./originAt.ts";
import { limitsOf, type Reading, stepped, textOf, understood } from "./reading.ts";

export interface QuantityProps extends Reading {
  readonly label: string;
  readonly pointer: string;
  readonly value: number | null;
  /** May be left blank; what stands then. */
  readonly blank?: string;
  /** ↑ and ↓ step through this series instead of tenths. */
  readonly series?: SeriesName;
}

/** The state of one quantity field: the text as typed, what was understood, and the keys. */
export function useQuantity(props: QuantityProps) {
  const { label, pointer, unit, value, share = false, blank } = props;
  const session = useSession();
  const apply = useApply();
  const document_ = useDocument();
  const origin = originAt(document_.origins, pointer);
  const kept = document_.typed[pointer] ?? textOf(value, unit, share);
  const [text, setText] = useState(kept);
  const [parsed, setParsed] = useState<Parsed | null>(null);
  const focused = useRef(false);
  const newest = useRef("");
  const before = useRef({ text: kept, value, origin });
  useEffect(() => {
    if (focused.current) return;
    setText(kept);
    setParsed(null);
  }, [kept]);

  const put = (next: number, typed: string, from: Origin = "typed") =>
    apply((store) => store.editAt(pointer, next, { step: label, typed, origin: from }));
  const show = (typed: string, found: Parsed | null) => {
    newest.current = typed;
    setText(typed);
    setParsed(found);
  };
  const read = (typed: string) => {
    if (typed.trim() === "" && blank !== undefined) {
      show(typed, null);
      apply((store) => store.clearAt(pointer, label));
      return;
    }
    const found = understood(typed, props);
    show(typed, found);
    if (found.kind === "value") put(found.value, typed);
    if (found.kind === "arithmetic") {
      void evaluateArithmetic(found.expression, unit, limitsOf(props)).then((answer) => {
        if (newest.current !== typed) return;
        setParsed(answer);
        if (answer.kind === "value") put(answer.value, typed);
      });
    }
  };
  const choose = (choice: Choice) => {
    const typed = textOf(choice.value, unit, share);
    show(typed, null);
    put(choice.value, typed);
  };
  const restore = () => {
    const was = before.current;
    show(was.text, null);
    if (was.value === null) apply((store) => store.clearAt(pointer, label));
    else put(was.value, was.text, was.origin);
  };
  const step = (up: boolean, decade: boolean) => {
    if (value === null || value === 0) return;
    const next = stepped(value, up, decade, props.series);
    const typed = textOf(next, unit, share);
    const found = understood(typed, props);
    show(typed, found.kind === "value" ? null : found);
    if (found.kind === "value") put(next, typed);
  };
  const measured = () => {
    if (value !== null) put(value, text, origin === "measured" ? "typed" : "measured");
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const { key, altKey } = event;
    if (key === "Escape" && text !== before.current.text) restore();
    else if (key === "ArrowUp" || key === "ArrowDown") step(key === "ArrowUp", event.shiftKey);
    else if (altKey && event.code === "KeyM") measured();
    else return;
    event.preventDefault();
    event.stopPropagation();
  };
  const onFocus = () => {
    focused.current = true;
    before.current = { text, value, origin };
  };
  const onBlur = () => {
    focused.current = false;
    session.store.getState().leaveField();
  };
  return { text, parsed, origin, read, choose, onKeyDown, onFocus, onBlur };
}
