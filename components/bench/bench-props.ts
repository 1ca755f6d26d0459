import type { InstrumentRange } from "@/db/schema/people";
import type { DecisionRule } from "@/db/schema/projects";
import type { TravelerView } from "@/lib/traveler/traveler-view";

export type BenchInstrument = { id: string; name: string; ranges: InstrumentRange[] };

/** What voiding a slip answers; the page passes the server action. */
export type VoidAttempt = (input: {
  project: string;
  writeId: string;
  attemptId: string;
  reason: string;
}) => Promise<{ ok: true } | { ok: false; error: { message: string } }>;

export type BenchProps = {
  project: { slug: string; name: string; rule: DecisionRule };
  viewer: { id: string; name: string; timeZone: string };
  /** Asked of can() by the page. */
  may: { record: boolean; attach: boolean };
  traveler: TravelerView;
  instruments: BenchInstrument[];
  /** The check that the address asked for. */
  openCheck: string | undefined;
  voidAttempt: VoidAttempt;
};
