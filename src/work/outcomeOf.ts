import type {
  Candidate,
  ColumnField,
  DividerDocument,
  FieldGeometry,
  Proof,
  Result,
  Sizing,
  Speed,
  Through,
} from "../solver/index.ts";
import type { FieldGiven, Job, Outcome } from "./job.ts";

/** What a job needs of the solver. */
export interface SolverDoor {
  readonly size: (document: DividerDocument, options: { readonly top: number }) => Result<Sizing>;
  readonly prove: (document: DividerDocument, field: ColumnField | null) => Result<Proof>;
  readonly speed: (document: DividerDocument, field: ColumnField | null) => Result<Speed>;
  readonly fieldAsked: (document: DividerDocument) => Result<FieldGeometry | null>;
  readonly isFieldOf: (field: ColumnField, geometry: FieldGeometry) => boolean;
  readonly solveField: (geometry: FieldGeometry) => ColumnField;
  readonly through: (
    document: DividerDocument,
    record: { readonly time_s: readonly number[]; readonly value: readonly number[] },
    field: ColumnField | null,
    reference: "electrode" | "source",
  ) => Through;
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
        return provenOf(door, job.document, null, job.field ?? null);
      case "speed":
        return speedOf(door, job.document, job.field ?? null);
      case "field":
        return fieldOf(door, job.document);
      case "through":
        return throughOf(door, job);
      case "size": {
        const sizing = door.size(job.document, { top: job.top });
        return sizing.ok ? ok({ document: job.document, sizing: sizing.value }) : sizing;
      }
      case "follow":
        return followed(door, job, progress);
    }
  };

const nothing = { sizing: null, proof: null, field: null, awaitsField: false, through: null };
const ok = (found: Pick<Outcome, "document"> & Partial<Outcome>): Result<Outcome> => ({
  ok: true,
  value: { ...nothing, ...found },
});

/** The proof, with the field of the drawing where the document asks for it and it is at hand. */
function provenOf(
  door: SolverDoor,
  document: DividerDocument,
  sizing: Sizing | null,
  given: FieldGiven,
): Result<Outcome> {
  const { geometry, field } = fieldFor(door, document, given);
  const proof = door.prove(document, field);
  if (!proof.ok) return proof;
  return ok({ document, sizing, proof: proof.value, field, awaitsField: geometry !== null && field === null });
}

function throughOf(door: SolverDoor, job: Extract<Job, { kind: "through" }>): Result<Outcome> {
  const proven = provenOf(door, job.document, null, job.field);
  if (!proven.ok) return proven;
  const { document, field } = proven.value;
  return ok({ document, field, through: door.through(document, job.record, field, job.reference) });
}

/** The geometry that the document asks a field for, and the field of it where it is at hand. */
function fieldFor(door: SolverDoor, document: DividerDocument, given: FieldGiven) {
  const asked = door.fieldAsked(document);
  const geometry = asked.ok ? asked.value : null;
  const held = given === "solve" ? (geometry === null ? null : door.solveField(geometry)) : given;
  return { geometry, field: held !== null && geometry !== null && door.isFieldOf(held, geometry) ? held : null };
}

function speedOf(door: SolverDoor, document: DividerDocument, given: FieldGiven): Result<Outcome> {
  const { field } = fieldFor(door, document, given);
  const speed = door.speed(document, field);
  return speed.ok ? ok({ document, field, speed: speed.value }) : speed;
}

function fieldOf(door: SolverDoor, document: DividerDocument): Result<Outcome> {
  const asked = door.fieldAsked(document);
  if (!asked.ok) return asked;
  return ok({ document, field: asked.value === null ? null : door.solveField(asked.value) });
}

/** A design that stands is proved as it is; one that follows is chosen first. Without a candidate the old one is judged. */
function followed(door: SolverDoor, job: Extract<Job, { kind: "follow" }>, progress: Progress): Result<Outcome> {
  const { document, top, field = null } = job;
  const { design } = document;
  if (design !== null && !design.follows) return provenOf(door, document, null, field);
  const sizing = door.size(document, { top });
  if (!sizing.ok) return sizing;
  progress(0.5);
  const best = sizing.value.candidates[0];
  if (best !== undefined) return provenOf(door, following(door.takeCandidate(document, best)), sizing.value, field);
  if (design !== null) return provenOf(door, document, sizing.value, field);
  return ok({ document, sizing: sizing.value });
}

const following = (document: DividerDocument): DividerDocument =>
  document.design === null ? document : { ...document, design: { ...document.design, follows: true } };
