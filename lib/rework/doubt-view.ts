import type { RepeatWork } from "@/lib/calc/doubt";
import type { Stage } from "@/db/schema/procedures";
import type { CheckState } from "@/db/schema/travelers";
import type { ReworkUnit } from "@/db/queries/reworks";
import type { Judged } from "./judge-doubt";

export type DoubtLineView = {
  checkId: string;
  serial: string;
  stage: Stage;
  title: string;
  state: CheckState;
  /** When it was last carried out. */
  lastAt: string | null;
  /** Why, a sentence each; for what is untouched the sentence that says so. */
  sentences: string[];
  /** Put in doubt by hand. */
  isAdded: boolean;
};

export type DoubtPreview = {
  doubtful: DoubtLineView[];
  spared: DoubtLineView[];
  /** Touched, but with no pass to doubt. */
  open: DoubtLineView[];
  /** Checks of the reworked unit that it does not touch. */
  untouched: DoubtLineView[];
  /** How many checks of other units it does not touch. */
  untouchedElsewhere: number;
  repeat: RepeatWork;
  remarks: string[];
};

export function doubtPreview(unit: ReworkUnit, { lines, byId, repeat, remarks }: Judged): DoubtPreview {
  const view = (line: Judged["lines"][number]): DoubtLineView[] => {
    const row = byId.get(line.checkId);
    if (!row) return [];
    const { serial, stage, title, state, last_at: lastAt } = row;
    const reasons = line.outcome === "untouched" ? [] : line.reasons;
    return [
      {
        ...{ checkId: line.checkId, serial, stage, title, state, lastAt },
        sentences:
          line.outcome === "untouched" || line.outcome === "open"
            ? [line.sentence]
            : reasons.map(({ sentence }) => sentence),
        isAdded: reasons.some(({ why }) => why === "added"),
      },
    ];
  };
  const of = (outcome: Judged["lines"][number]["outcome"]) =>
    lines.filter((line) => line.outcome === outcome).flatMap(view);
  const untouched = of("untouched");
  const own = untouched.filter(({ serial }) => serial === unit.serial);
  return {
    doubtful: of("doubtful"),
    spared: of("spared"),
    open: of("open"),
    untouched: own,
    untouchedElsewhere: untouched.length - own.length,
    repeat,
    remarks,
  };
}
