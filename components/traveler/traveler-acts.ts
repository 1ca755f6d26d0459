import type { z } from "zod";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import type { Reply } from "@/components/ui/form/reply";
import type { voidAttemptInput } from "@/lib/attempt/schema";
import type { liftHoldInput, reopenCheckInput } from "@/lib/check/schema";
import type { grantConcessionInput, withdrawConcessionInput } from "@/lib/concession/schema";
import type { prerequisiteInput } from "@/lib/prerequisite/schema";
import type { moveTravelerInput } from "@/lib/traveler/schema";

type Act<Schema extends z.ZodType> = (input: z.input<Schema>) => Promise<Reply<unknown>>;

/** The server actions of the traveler; the page hands in those that the person may use. */
export type TravelerActs = {
  reopen: Act<typeof reopenCheckInput>;
  concede: Act<typeof grantConcessionInput>;
  withdraw: Act<typeof withdrawConcessionInput>;
  lift: Act<typeof liftHoldInput>;
  void: Act<typeof voidAttemptInput>;
  addPrerequisite: Act<typeof prerequisiteInput>;
  removePrerequisite: Act<typeof prerequisiteInput>;
  move: Act<typeof moveTravelerInput>;
  evidence: EvidenceActions;
};

/** Asked of can() by the page. */
export type TravelerMay = {
  record: boolean;
  attach: boolean;
  reopen: boolean;
  concede: boolean;
  lift: boolean;
  voidOwn: boolean;
  voidAny: boolean;
  prerequisites: boolean;
  move: boolean;
  fault: boolean;
  rework: boolean;
};

export type TravelerFrame = {
  project: string;
  serial: string;
  viewerId: string;
  zone: string;
  rule: "simple" | "guarded";
  /** How long one may void an attempt of one's own. */
  voidWindowMs: number;
  may: TravelerMay;
  acts: TravelerActs;
};
