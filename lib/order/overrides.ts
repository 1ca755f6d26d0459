import type { BoardOrderRow } from "@/db/queries/order";
import type { BoardOverride } from "@/lib/calc/sequence";

type Said = Pick<BoardOrderRow, "board" | "other" | "rule" | "reason">;

/** What people say as the calculation takes it: which board comes before which. */
export const overrideOf = ({ board, other, rule, reason }: Said): BoardOverride =>
  rule === "needs" ? { board: other, before: board, reason } : { board, before: other, reason };

/** "CON waits for TIM", "CON may come before SUP": without the reason and the full stop. */
export const saySaid = ({ board, other, rule }: Omit<Said, "reason">): string =>
  rule === "needs" ? `${board} waits for ${other}` : `${board} may come before ${other}`;
