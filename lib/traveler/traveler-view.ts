import type { ConnectorGrid } from "@/lib/calc/connector";
import type { Coverage, Stage } from "@/db/schema/procedures";
import type { FaultState } from "@/db/schema/faults";
import type { CheckState, Verdict } from "@/db/schema/travelers";
import type { AttachmentKind } from "@/db/schema/evidence";
import type { JudgedReading } from "@/lib/check-kinds/kind";

/** Shapes that the traveler page, the bench and the API show. Instants are ISO strings so that they cross to the client. */
export type PersonView = { id: string | null; name: string };

export type EvidenceView = {
  id: string;
  kind: AttachmentKind;
  fileName: string;
  caption: string;
  bytes: number;
  width: number | null;
  height: number | null;
  /** False until the worker has made the thumbnails. */
  hasThumbnails: boolean;
  by: PersonView;
  at: string;
};

export type AttemptView = {
  id: string;
  /** Order of arrival at the server. */
  arrival: number;
  by: PersonView;
  performedAt: string;
  recordedAt: string;
  verdict: Verdict;
  record: unknown;
  /** In a few characters, by the kind: "4.983 V". */
  summary: string;
  readings: JudgedReading[];
  sentences: string[];
  note: string;
  instrument: string | null;
  evidence: EvidenceView[];
  /** Present when voided; the attempt stays and does not count. */
  voided: { by: PersonView; at: string; reason: string } | null;
};

export type ReopeningView = { id: string; by: PersonView; at: string; reason: string };
export type ConcessionView = {
  id: string;
  by: PersonView;
  at: string;
  reason: string;
  withdrawn: { by: PersonView; at: string; reason: string } | null;
};
export type HoldLiftView = { id: string; by: PersonView; at: string; reason: string };

/** A rework that put the check in doubt, or that spared it. */
export type CheckDoubtView = {
  id: string;
  /** "Bodge wire W3", with the unit when it is another one's. */
  rework: string;
  serial: string;
  number: number;
  isSpared: boolean;
  reason: string;
  by: PersonView;
  at: string;
};

/** Another check that this one waits for. */
export type BlockerView = {
  checkId: string;
  serial: string;
  title: string;
  state: CheckState;
  why: "hold point" | "prerequisite";
};

export type CheckView = {
  id: string;
  key: string;
  /** 1-based place on the traveler. */
  number: number;
  stage: Stage;
  title: string;
  instruction: string;
  caution: string;
  reference: string;
  holdPoint: boolean;
  kind: string;
  spec: unknown;
  /** "4.75 … 5.25 V", by the kind. */
  expectation: string;
  covers: Coverage;
  state: CheckState;
  /** Why it is reopened, doubtful, waiting …, in one sentence; empty when there is nothing to say. */
  stateReason: string;
  stateSince: string;
  insideGuardBand: boolean;
  blockers: BlockerView[];
  /** Prerequisites across the traveler and across units, passed or not. */
  prerequisites: BlockerView[];
  /** Newest first. */
  attempts: AttemptView[];
  reopenings: ReopeningView[];
  concessions: ConcessionView[];
  holdLifts: HoldLiftView[];
  /** Newest first. */
  doubts: CheckDoubtView[];
  /** Faults that were seen at it, the newest first. */
  faults: { number: number; title: string; state: FaultState }[];
  /** Evidence attached to the check but to no attempt. */
  evidence: EvidenceView[];
};

export type TravelerView = {
  unit: { id: string; serial: string; note: string; archived: boolean; version: number };
  board: {
    id: string;
    code: string;
    name: string;
    connectorType: string | null;
    connectorGrid: ConnectorGrid | null;
    connectorReference: string;
  };
  revision: { id: string; letter: string };
  slot: { position: number; label: string } | null;
  /** How often it was reworked, and how many faults of it are not mended. */
  reworks: number;
  faults: number;
  procedure: { id: string; number: number; newestNumber: number };
  checks: CheckView[];
  /** Checks of earlier procedure versions that were changed or dropped, with their history. */
  retired: CheckView[];
};

/** A unit that has no traveler yet: newestNumber is the issued procedure it could start with, if there is one. */
export type UnitWithoutTraveler = Pick<TravelerView, "unit" | "board" | "revision" | "slot" | "reworks" | "faults"> & {
  newestNumber: number | null;
};

export type LoadedTraveler =
  { kind: "traveler"; traveler: TravelerView } | { kind: "none"; unit: UnitWithoutTraveler } | { kind: "missing" };
