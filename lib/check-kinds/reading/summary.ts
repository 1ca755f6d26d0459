import type { JudgedReading } from "../kind";
import { figure } from "../reading-limits";
import type { Entry, Spec } from "./schema";

export function summary(spec: Spec, entry: Entry, readings: readonly JudgedReading[]): string {
  const [reading] = readings;
  return reading ? figure(reading.value, reading.unit) : `${entry.typed} ${spec.unit}`;
}
