import { StageStrip } from "@/components/ui/glyphs/StageStrip";
import { STAGES } from "@/lib/procedure/stages";
import type { RackUnit } from "@/lib/rack/rack-view";

/** The five strips of a unit, or one sentence on why there are none. */
export function CardStages({
  unit,
  layout = "fill",
  className,
}: {
  unit: RackUnit;
  layout?: "fill" | "flow";
  className?: string;
}) {
  if (unit.total === 0) {
    return (
      <p className="text-sm text-ink-soft">
        {unit.board.procedureNumber === null ? "No procedure yet." : "No traveler yet."}
      </p>
    );
  }
  const groups = STAGES.map(({ short }, index) => ({ name: short, states: unit.stages[index]?.states ?? [] }));
  return (
    <StageStrip
      groups={groups}
      layout={layout}
      {...(unit.marked ? { marked: unit.marked } : {})}
      {...(className ? { className } : {})}
    />
  );
}
