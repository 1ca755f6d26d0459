import { LimitBar } from "@/components/ui/glyphs/LimitBar";
import { VerdictFigure } from "@/components/traveler/VerdictFigure";
import type { RecordViewProps } from "../kind";
import { drawnLimits } from "../reading-limits";
import type { Entry, Spec } from "./schema";
import { summary } from "./summary";

/** The figure in its verdict's hue beside its limits; without a record, the limits alone. */
export function RecordView({ spec, record, readings, rule }: RecordViewProps<Spec, Entry>) {
  const [reading] = readings;
  const drawn = drawnLimits(reading ?? spec.limits.value, spec.unit, reading?.expandedUncertainty ?? null, rule);
  const value = reading && Number.isFinite(reading.value) ? reading.value : undefined;
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
      {reading ? (
        <VerdictFigure verdict={reading.verdict}>{summary(spec, { typed: reading.typed })}</VerdictFigure>
      ) : (
        record && <span className="mono">{record.typed}</span>
      )}
      <LimitBar {...drawn} value={value} className="w-40" />
    </div>
  );
}
