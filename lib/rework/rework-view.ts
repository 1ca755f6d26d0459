import type { DoubtRow, ReworkRow } from "@/db/queries/reworks";
import type { ReworkKind, TouchKind, Wire } from "@/db/schema/faults";
import type { EvidenceView, PersonView } from "@/lib/traveler/traveler-view";

export type ReworkDoubtView = {
  checkId: string;
  serial: string;
  title: string;
  reason: string;
  /** Repeated since. */
  isAnswered: boolean;
  /** Belongs to an earlier version of the procedure. */
  isRetired: boolean;
};

export type ReworkView = {
  id: string;
  number: number;
  kind: ReworkKind;
  what: string;
  why: string;
  wire: Wire | null;
  touches: { kind: TouchKind; name: string }[];
  fault: { number: number; title: string } | null;
  /** The rework of another unit that it repeats. */
  carriedFrom: { serial: string; number: number } | null;
  doubts: ReworkDoubtView[];
  spared: ReworkDoubtView[];
  before: EvidenceView[];
  after: EvidenceView[];
  by: PersonView;
  performedAt: string;
};

type Parts = {
  touches: ReworkView["touches"];
  doubts: readonly DoubtRow[];
  carriedFrom: ReworkView["carriedFrom"];
  before: EvidenceView[];
  after: EvidenceView[];
};

/** What was only touched, without a pass to doubt, is kept in the database and not shown. */
export function reworkView(row: ReworkRow, { doubts, ...parts }: Parts): ReworkView {
  const view = ({ check_id: checkId, serial, title, reason, answered, retired }: DoubtRow): ReworkDoubtView => ({
    ...{ checkId, serial, title, reason },
    isAnswered: answered,
    isRetired: retired,
  });
  return {
    ...{ id: row.id, number: row.number, kind: row.kind, what: row.what, why: row.why, wire: row.wire },
    fault: row.faultNumber === null ? null : { number: row.faultNumber, title: row.faultTitle ?? "" },
    doubts: doubts.filter(({ origin, had_pass }) => origin !== "spared" && had_pass).map(view),
    spared: doubts.filter(({ origin }) => origin === "spared").map(view),
    by: { id: row.userId, name: row.byName ?? "Somebody who left" },
    performedAt: row.performedAt.toISOString(),
    ...parts,
  };
}
