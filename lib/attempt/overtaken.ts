import type { Standing } from "@/db/queries/checks";
import type { CheckKind, JudgedReading } from "@/lib/check-kinds/kind";
import type { RecordedAttempt } from "./recorded-attempt";

const AT_ONCE_S = 120;

/** The attempt of somebody else that this one came on top of, if it came within two minutes or was not seen before. */
export function overtaken(
  { other }: Standing,
  seenArrival: number | undefined,
  kind: CheckKind,
  spec: unknown,
): RecordedAttempt["overtook"] {
  if (!other) return null;
  const unseen = seenArrival !== undefined && other.arrival > seenArrival;
  if (!unseen && other.secondsAgo > AT_ONCE_S) return null;
  const readings = other.readings.map(({ label, typed, unit, verdict, value }): JudgedReading => {
    return { label, typed, unit, verdict, value: Number(value), lower: null, upper: null, expandedUncertainty: null };
  });
  return {
    by: other.name ?? "Somebody who left",
    at: new Date(other.recordedAt).toISOString(),
    summary: kind.summary(spec, other.record, readings),
  };
}
