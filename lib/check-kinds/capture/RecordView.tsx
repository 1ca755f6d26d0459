import { VerdictFigure } from "@/components/traveler/VerdictFigure";
import type { RecordViewProps } from "../kind";
import { summariseStated, type StatedEntry } from "../stated-verdict";
import { windowText } from "./expected-text";
import type { Spec } from "./schema";

export function RecordView({ spec, record }: RecordViewProps<Spec, StatedEntry>) {
  const window = windowText(spec);
  if (!record || record.conforms === null) {
    if (!spec.expects && !window) return null;
    return (
      <span className="text-ink-soft">
        {spec.expects}
        {window && <span className="block">{window}</span>}
      </span>
    );
  }
  return (
    <VerdictFigure verdict={record.conforms ? "conforms" : "does-not-conform"}>{summariseStated(record)}</VerdictFigure>
  );
}
