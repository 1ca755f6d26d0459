import type { Stage } from "@/db/schema/procedures";
import type { CheckState } from "@/db/schema/travelers";
import type { Outlook } from "@/lib/forecast/say-forecast";

export type CheckName = { checkId: string; serial: string; title: string; stage: Stage; state: CheckState };

export type PlannedLine = CheckName & { startS: number; endS: number; reason: string };

export type NowLine = CheckName & { reason: string; holdsBack: number; expectedS: number | null };

export type TonightView = {
  /** As it was typed. */
  time: string;
  /** What is wrong with what was typed. */
  timeError: string | null;
  builders: 1 | 2;
  /** One list a builder; null: the time could not be read or prerequisites go round in a circle. */
  plan: { lists: PlannedLine[][]; sentence: string } | null;
  now: NowLine[];
  /** How many more can be done now than are listed. */
  moreNow: number;
  open: number;
  total: number;
  critical: { sentence: string; steps: (CheckName & { expectedS: number })[] } | null;
  circle: string | null;
  outlook: Outlook | null;
};
