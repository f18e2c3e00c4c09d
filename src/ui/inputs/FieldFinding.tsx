import { CureButton } from "../frame/Findings.tsx";
import { useJudged } from "../frame/session.ts";
import { LevelMark } from "../prove/LevelMark.tsx";

/** An open finding that a change of just this field would clear, said under the field with its cure. */
export function FieldFinding({ pointer }: { readonly pointer: string }) {
  const finding = useJudged((state) =>
    state.proof?.findings.find(
      (each) => each.level !== "clear" && each.cure?.edits.length === 1 && each.cure.edits[0]!.pointer === pointer,
    ),
  );
  if (finding === undefined || finding.cure === null) return null;
  return (
    <span className="field-finding">
      <LevelMark level={finding.level} word={false} /> {finding.reason}{" "}
      <CureButton cure={finding.cure} what={finding.what} />
    </span>
  );
}
