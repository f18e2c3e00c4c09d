import { StrictMode, useMemo, useState } from "react";
import { createRoot } from "react-dom/client";
import "./harness.css";
import { type Candidate, type Part, prove, size, takeCandidate } from "../../../src/solver/index.ts";
import { BuildSheet } from "../../../src/ui/build/BuildSheet.tsx";
import { OwnFamilies } from "../../../src/ui/families/OwnFamilies.tsx";
import { ProveSheet } from "../../../src/ui/prove/ProveSheet.tsx";
import { SizeSheet } from "../../../src/ui/size/SizeSheet.tsx";
import { inventedDocument } from "../inventedDocument.ts";
import { inventedProof } from "../inventedProof.ts";
import { closedWindow, inventedSizing } from "../inventedSizing.ts";

function Size({ shut }: { readonly shut: boolean }) {
  const [document, setDocument] = useState(inventedDocument);
  const actions = {
    onTake: (c: (typeof inventedSizing.candidates)[number]) => setDocument({ ...document, design: c.design }),
    onSizeAgain: () => setDocument(inventedDocument),
    onCure: console.log,
    onWhy: console.log,
  };
  const sizing = shut ? { ...inventedSizing, window: closedWindow, candidates: [] } : inventedSizing;
  return <SizeSheet document={document} sizing={sizing} proof={inventedProof} actions={actions} />;
}

const actions = { onWhy: console.log, onCure: console.log };
function Real() {
  const [document, setDocument] = useState(inventedDocument);
  const sizing = useMemo(() => size(document, { top: 24 }), [document]);
  const proof = useMemo(() => prove(document), [document]);
  if (!sizing.ok) return <pre>{JSON.stringify(sizing.error, null, 2)}</pre>;
  if (!proof.ok) return <pre>{JSON.stringify(proof.error, null, 2)}</pre>;
  const onTake = (c: Candidate) => setDocument(takeCandidate(document, c));
  return (
    <>
      <SizeSheet
        document={document}
        sizing={sizing.value}
        proof={proof.value}
        actions={{ onTake, onSizeAgain: console.log, onCure: console.log, onWhy: console.log }}
      />
      <ProveSheet document={document} proof={proof.value} actions={actions} />
      <BuildSheet document={document} proof={proof.value} />
    </>
  );
}

function Families() {
  const [document, setDocument] = useState(inventedDocument);
  const families = {
    onInHandOnly: console.log,
    onAddFamilies: (added: readonly { part: Part }[]) => {
      setDocument({ ...document, parts: [...document.parts, ...added.map((each) => each.part)] });
      return null;
    },
    onRemoveFamily: (i: number) => setDocument({ ...document, parts: document.parts.filter((_, k) => k !== i) }),
  };
  return <OwnFamilies document={document} actions={families} />;
}

const screens: Record<string, () => React.ReactNode> = {
  "#size": () => <Size shut={false} />,
  "#shut": () => <Size shut />,
  "#prove": () => <ProveSheet document={inventedDocument} proof={inventedProof} actions={actions} />,
  "#families": () => <Families />,
  "#real": () => <Real />,
  "#build": () => <BuildSheet document={inventedDocument} proof={inventedProof} />,
};

createRoot(document.getElementById("root")!).render(
  <StrictMode>
    <main>{screens[location.hash]?.()}</main>
  </StrictMode>,
);
