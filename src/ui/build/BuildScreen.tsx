import { useDocument, useJudged } from "../frame/session.ts";
import { BuildSheet } from "./BuildSheet.tsx";

/** What to buy: always the parts list of the document as it stands now. */
export function BuildScreen() {
  const document = useDocument();
  const proof = useJudged((state) => state.proof);
  return <BuildSheet document={document} proof={proof} />;
}

export default BuildScreen;
