import { VerdictFigure } from "@/components/traveler/VerdictFigure";
import type { RecordViewProps } from "../kind";
import { summariseStated, type StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

export function RecordView({ spec, record }: RecordViewProps<Spec, StatedEntry>) {
  if (!record || record.conforms === null)
    return spec.expects ? <span className="text-ink-soft">{spec.expects}</span> : null;
  return (
    <VerdictFigure verdict={record.conforms ? "conforms" : "does-not-conform"}>{summariseStated(record)}</VerdictFigure>
  );
}
