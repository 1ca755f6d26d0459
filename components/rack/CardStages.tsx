import { StageStrip } from "@/components/ui/glyphs/StageStrip";
import { STAGES } from "@/lib/procedure/stages";
import type { RackUnit } from "@/lib/rack/rack-view";

/** Room that lets the strips of all units stand in columns. */
export function stageRoom(units: readonly (RackUnit | null | undefined)[]): number[] {
  return STAGES.map((_, index) => Math.max(0, ...units.map((unit) => unit?.stages[index]?.states.length ?? 0)));
}

/** The five strips of a unit, or one sentence on why there are none. */
type Props = {
  unit: RackUnit;
  layout?: "fill" | "flow";
  /** Longest strip of each stage in the machine. */
  room?: readonly number[];
  className?: string;
};

export function CardStages({ unit, layout = "fill", room, className }: Props) {
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
      {...(room ? { room } : {})}
      {...(className ? { className } : {})}
    />
  );
}
