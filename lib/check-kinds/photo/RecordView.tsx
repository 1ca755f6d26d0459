import type { RecordViewProps } from "../kind";
import { summariseStated, type StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

export function RecordView({ record }: RecordViewProps<Spec, StatedEntry>) {
  return <span>{record ? summariseStated(record) : ""}</span>;
}
