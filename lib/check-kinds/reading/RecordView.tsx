import type { RecordViewProps } from "../kind";
import type { Entry, Spec } from "./schema";

export function RecordView({ record, readings }: RecordViewProps<Spec, Entry>) {
  return <span>{readings[0]?.typed ?? record?.typed ?? ""}</span>;
}
