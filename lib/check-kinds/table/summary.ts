import type { JudgedReading } from "../kind";

export function summary(readings: readonly JudgedReading[]): string {
  const wrong = readings.filter((reading) => reading.verdict === "does-not-conform").length;
  return wrong === 0 ? `all ${readings.length} conform` : `${wrong} of ${readings.length} do not conform`;
}
