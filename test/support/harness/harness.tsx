import { StrictMode, useState } from "react";
import { createRoot } from "react-dom/client";
import "./harness.css";
import { BuildSheet } from "../../../src/ui/build/BuildSheet.tsx";
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
const screens: Record<string, () => React.ReactNode> = {
  "#size": () => <Size shut={false} />,
  "#shut": () => <Size shut />,
  "#prove": () => <ProveSheet document={inventedDocument} proof={inventedProof} actions={actions} />,
  "#build": () => <BuildSheet document={inventedDocument} proof={inventedProof} />,
};

createRoot(document.getElementById("root")!).render(
  <StrictMode>
    <main>{screens[location.hash]?.()}</main>
  </StrictMode>,
);
