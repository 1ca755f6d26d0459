import clsx from "clsx";
import { stageName } from "@/lib/procedure/stages";
import type { Stage } from "@/db/schema/procedures";

export type Filter = "all" | "attention" | Stage;

type Props = { filter: Filter; onFilter: (filter: Filter) => void; stages: readonly Stage[]; attention: number };

export function FilterBar({ filter, onFilter, stages, attention }: Props) {
  const choices: { id: Filter; label: string }[] = [
    { id: "all", label: "All" },
    { id: "attention", label: `Needs attention (${attention})` },
    ...stages.map((stage) => ({ id: stage, label: stageName(stage) })),
  ];
  return (
    <div role="group" aria-label="Which checks" className="mb-3 flex flex-wrap gap-1.5">
      {choices.map(({ id, label }) => (
        <button
          key={id}
          type="button"
          aria-pressed={filter === id}
          onClick={() => onFilter(id)}
          className={clsx(
            "min-h-10 rounded-md border px-3 text-sm font-semibold",
            filter === id
              ? "border-copper bg-copper-ground text-copper"
              : "border-rule-strong bg-sheet text-ink-soft hover:border-ink-soft",
          )}
        >
          {label}
        </button>
      ))}
    </div>
  );
}
