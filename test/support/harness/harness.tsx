import { StrictMode, useState } from "react";
import { createRoot } from "react-dom/client";
import "./harness.css";
import { prove } from "../../../src/solver/index.ts";
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
function Real() {
  const proof = prove(inventedDocument);
  if (!proof.ok) return <pre>{JSON.stringify(proof.error, null, 2)}</pre>;
  return (
    <>
      <SizeSheet
        document={inventedDocument}
        sizing={inventedSizing}
        proof={proof.value}
        actions={{ onTake: console.log, onSizeAgain: console.log, onCure: console.log, onWhy: console.log }}
      />
      <ProveSheet document={inventedDocument} proof={proof.value} actions={actions} />
    </>
  );
}

const screens: Record<string, () => React.ReactNode> = {
  "#size": () => <Size shut={false} />,
  "#shut": () => <Size shut />,
  "#prove": () => <ProveSheet document={inventedDocument} proof={inventedProof} actions={actions} />,
  "#real": () => <Real />,
  "#build": () => <BuildSheet document={inventedDocument} proof={inventedProof} />,
};

createRoot(document.getElementById("root")!).render(
  <StrictMode>
    <main>{screens[location.hash]?.()}</main>
  </StrictMode>,
);
