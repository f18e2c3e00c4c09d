import type { Candidate, DividerDocument, Proof, Result, Sizing } from "../solver/index.ts";
import type { Job, Outcome } from "./job.ts";

/** What a job needs of the solver. */
export interface SolverDoor {
  readonly size: (document: DividerDocument, options: { readonly top: number }) => Result<Sizing>;
  readonly prove: (document: DividerDocument) => Result<Proof>;
  readonly takeCandidate: (document: DividerDocument, candidate: Candidate) => DividerDocument;
}

export type Progress = (share: number) => void;
type RunJob = (job: Job, progress?: Progress) => Result<Outcome>;

/** One job, one outcome; the same function in a worker, in the shell and in a test. */
export const jobsOf =
  (door: SolverDoor): RunJob =>
  (job, progress = () => {}) => {
    switch (job.kind) {
      case "prove":
        return provenOf(door, job.document, null);
      case "size": {
        const sizing = door.size(job.document, { top: job.top });
        return sizing.ok ? { ok: true, value: { document: job.document, sizing: sizing.value, proof: null } } : sizing;
      }
      case "follow":
        return followed(door, job.document, job.top, progress);
    }
  };

function provenOf(door: SolverDoor, document: DividerDocument, sizing: Sizing | null): Result<Outcome> {
  const proof = door.prove(document);
  return proof.ok ? { ok: true, value: { document, sizing, proof: proof.value } } : proof;
}

/** A design that stands is proved as it is; one that follows is chosen first. Without a candidate the old one is judged. */
function followed(door: SolverDoor, document: DividerDocument, top: number, progress: Progress): Result<Outcome> {
  const { design } = document;
  if (design !== null && !design.follows) return provenOf(door, document, null);
  const sizing = door.size(document, { top });
  if (!sizing.ok) return sizing;
  progress(0.5);
  const best = sizing.value.candidates[0];
  if (best !== undefined) return provenOf(door, following(door.takeCandidate(document, best)), sizing.value);
  if (design !== null) return provenOf(door, document, sizing.value);
  return { ok: true, value: { document, sizing: sizing.value, proof: null } };
}

const following = (document: DividerDocument): DividerDocument =>
  document.design === null ? document : { ...document, design: { ...document.design, follows: true } };
