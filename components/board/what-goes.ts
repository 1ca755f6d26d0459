import { counted } from "@/components/workshop/counted";
import type { BoardView } from "@/lib/board/load-board";
import { addHoldings, type Holdings } from "@/lib/unit/holdings";

const LOG = "Log entries stay with their pictures, and so does what the log says of it.";

/** What goes with one unit, a sentence a line. */
export function whatGoesWithUnit(holds: Holdings): string[] {
  return [...recorded(holds), ...waits(holds.waitsOfOtherUnits), LOG];
}

/** What goes with a board: it is archived, so all of its units are. */
export function whatGoesWithBoard({ units, revisions }: BoardView): string[] {
  const holds = addHoldings(units.flatMap((unit) => unit.holds ?? []));
  return [
    `${counted(units.length, "unit goes", "units go")}, with ${counted(revisions.length, "revision")} and every version of the procedure.`,
    ...recorded(holds),
    ...waits(holds.waitsOfOtherBoards),
    "Slots wired for it stay and take any card.",
    LOG,
  ];
}

const recorded = ({ checks, attempts, files, faults, reworks }: Holdings) => [
  attempts === 0
    ? `${counted(checks, "check goes", "checks go")}; nothing was recorded on ${checks === 1 ? "it" : "them"}.`
    : `${counted(checks, "check")} and ${counted(attempts, "attempt")} with every reading go. They are kept nowhere else.`,
  ...(faults + reworks === 0 ? [] : [`${counted(faults, "fault")} and ${counted(reworks, "rework")} go.`]),
  ...(files === 0 ? [] : [`${counted(files, "file goes", "files go")}.`]),
];

const waits = (count: number) =>
  count === 0 ? [] : [`${counted(count, "prerequisite of another unit goes", "prerequisites of other units go")}.`];
