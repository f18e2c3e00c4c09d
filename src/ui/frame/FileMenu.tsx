import { type KeyboardEvent, useEffect, useRef, useState } from "react";
import {
  exampleDocument,
  exampleNames,
  inNewSlot,
  openByDialog,
  openText,
  plainName,
  saveACopy,
  saveDocument,
} from "./files.ts";
import { StartDialog } from "./StartDialog.tsx";
import { useSession } from "./session.ts";

/** New, Open, Save, Save a copy, Examples. */
export function FileMenu() {
  const session = useSession();
  const [open, setOpen] = useState(false);
  const [starting, setStarting] = useState(false);
  const box = useRef<HTMLDivElement>(null);
  const file = useRef<HTMLInputElement>(null);
  useShortcuts(() => void openByDialog(session, () => file.current?.click()));
  useEffect(() => {
    if (!open) return;
    const outside = (event: Event) => {
      if (!box.current?.contains(event.target as Node)) setOpen(false);
    };
    document.addEventListener("pointerdown", outside);
    return () => document.removeEventListener("pointerdown", outside);
  }, [open]);
  const act = (what: () => unknown) => () => {
    setOpen(false);
    void what();
  };
  const openFile = () => openByDialog(session, () => file.current?.click());
  const example = (name: string) => async () => {
    const document_ = await exampleDocument(name);
    await inNewSlot(session, () => session.store.getState().openDocument(document_, { example: true }));
    session.looking.setState({ notice: null, element: null });
  };
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: Escape closes the menu from any of its buttons
    <div
      className="menu"
      ref={box}
      onKeyDown={(event) => {
        if (open) moveInMenu(event, box.current, () => setOpen(false));
      }}
    >
      <button type="button" aria-expanded={open} onClick={() => setOpen(!open)}>
        file
      </button>
      {open ? (
        <ul aria-label="file">
          <Item text="New, from my own voltage …" onPress={act(() => setStarting(true))} />
          <Item text="Open …" keys="Ctrl O" onPress={act(openFile)} />
          <Item text="Save" keys="Ctrl S" onPress={act(() => saveDocument(session))} />
          <Item text="Save a copy …" onPress={act(() => saveACopy(session))} />
          <li className="heading">examples</li>
          {exampleNames.map((name) => (
            <Item key={name} text={plainName(name)} onPress={act(example(name))} />
          ))}
        </ul>
      ) : null}
      <input
        ref={file}
        type="file"
        accept=".json,application/json"
        hidden
        onChange={async (event) => {
          const chosen = event.target.files?.[0];
          event.target.value = "";
          if (chosen !== undefined) await openText(session, await chosen.text(), chosen.name);
        }}
      />
      {starting ? <StartDialog onClose={() => setStarting(false)} /> : null}
    </div>
  );
}

function Item({
  text,
  keys,
  onPress,
}: {
  readonly text: string;
  readonly keys?: string;
  readonly onPress: () => void;
}) {
  return (
    <li>
      <button type="button" onClick={onPress}>
        {text}
        {keys === undefined ? null : <span className="key">{keys}</span>}
      </button>
    </li>
  );
}

/** ↓ ↑ through the entries, Escape back to the button that opened them. */
function moveInMenu(event: KeyboardEvent, menu: HTMLElement | null, close: () => void): void {
  const [opener, ...entries] = [...(menu?.querySelectorAll<HTMLElement>(":scope > button, li button") ?? [])];
  const at = entries.indexOf(document.activeElement as HTMLElement);
  if (event.key === "ArrowDown") entries[Math.min(at + 1, entries.length - 1)]?.focus();
  else if (event.key === "ArrowUp") (at <= 0 ? opener : entries[at - 1])?.focus();
  else if (event.key === "Escape") {
    close();
    opener?.focus();
  } else return;
  event.preventDefault();
}

/** Ctrl+S, Ctrl+O, Ctrl+Z, Ctrl+Shift+Z; a text field keeps its own undo while it has the focus. */
function useShortcuts(openFile: () => void): void {
  const session = useSession();
  useEffect(() => {
    const onKey = (event: globalThis.KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      const inField = event.target instanceof HTMLInputElement && event.target.type === "text";
      if (key === "s") void saveDocument(session);
      else if (key === "o") openFile();
      else if (key === "z" && !inField) session.store.getState()[event.shiftKey ? "redo" : "undo"]();
      else return;
      event.preventDefault();
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  });
}
