import clsx from "clsx";
import { WeightMark } from "@/components/wiring/WeightMark";
import type { RackBoard } from "@/lib/rack/rack-view";

/** "2 to mend": what the rule check found in the wiring of the card's board. Nothing when nothing must be mended. */
export function ToMend({ board, className }: { board: RackBoard | null; className?: string }) {
  if (!board || board.toMend === 0) return null;
  return (
    <span
      className={clsx("inline-flex items-center gap-1 whitespace-nowrap text-xs font-semibold text-failed", className)}
    >
      <WeightMark weight="must" size={12} />
      {board.toMend} to mend<span className="sr-only"> in the wiring</span>
    </span>
  );
}
