import Link from "next/link";
import type { BoardStep } from "@/lib/calc/sequence";
import { boardHref } from "./order-addresses";

type Props = { steps: readonly BoardStep[]; names: ReadonlyMap<string, string>; project: string };

/** One board after the other, with why it comes there and what the extender has to hold or leave open. */
export function StepTable({ steps, names, project }: Props) {
  return (
    <ol>
      {steps.map(({ board, units, reason, held, open }, index) => (
        <li
          key={board}
          className="grid grid-cols-[2rem_minmax(0,1fr)] gap-x-2 border-t border-rule px-4 py-3 sm:px-5 lg:grid-cols-[2rem_15rem_minmax(0,1fr)]"
        >
          <span className="mono text-ink-soft">{index + 1}</span>
          <span className="min-w-0">
            <Link href={boardHref(project, board)} className="group no-underline">
              <span className="mono font-semibold group-hover:text-copper">{board}</span>{" "}
              <span className="group-hover:text-copper">{names.get(board)}</span>
            </Link>
            {units.length > 0 && (
              <span className="block text-sm text-ink-soft">
                {units.map(({ label, proven }) => (proven ? `${label} (proven)` : label)).join(", ")}
              </span>
            )}
          </span>
          <span className="col-start-2 mt-1 flex flex-col gap-1 text-[0.9375rem] lg:col-start-3 lg:mt-0">
            <span>{reason}</span>
            {held && <span className="text-sm text-doubtful">{held.sentence}</span>}
            {open && <span className="text-sm text-doubtful">{open.sentence}</span>}
          </span>
        </li>
      ))}
    </ol>
  );
}
