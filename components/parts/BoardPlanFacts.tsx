import type { ReactNode } from "react";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";

/** The plan for those who may only read it. */
export function BoardPlanFacts({ view }: { view: BoardPlanView }) {
  const { plan, choices, units } = view;
  const nameOf = (id: string) => choices.find((choice) => choice.id === id)?.label ?? "";
  return (
    <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-5 gap-y-1.5 text-[0.9375rem]">
      <Fact name="Blocks">
        {plan.blocks.length === 0
          ? "none yet"
          : plan.blocks.map(({ block, count }) => (
              <span key={block} className="block">
                <span className="mono text-sm">{count} ×</span> {nameOf(block)}
              </span>
            ))}
      </Fact>
      <Fact name="Packages">{plan.packing === "pooled" ? "shared by all blocks" : "each block’s own"}</Fact>
      <Fact name="Family">{plan.family}</Fact>
      <Fact name="Units to build">{plan.unitsPlanned || `as many as there are, ${units.length}`}</Fact>
      <Fact name="Clock">{plan.clockHz}</Fact>
      <Fact name="Outputs that move">{plan.activity}</Fact>
      <Fact name="Load of an output">{plan.loadPf}</Fact>
    </dl>
  );
}

const Fact = ({ name, children }: { name: string; children: ReactNode }) => (
  <>
    <dt className="text-ink-soft">{name}</dt>
    <dd>{children}</dd>
  </>
);
