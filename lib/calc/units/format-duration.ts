/** "40 s", "43 min", "2 h", "2 h 10 min": to the second below a minute, to the minute above. Negative counts as 0. */
export function formatDuration(seconds: number): string {
  const whole = Math.max(0, Math.round(seconds));
  if (whole < 60) return `${whole}\u202fs`;
  const minutes = Math.round(whole / 60);
  if (minutes < 60) return `${minutes}\u202fmin`;
  const rest = minutes % 60;
  return `${Math.floor(minutes / 60)}\u202fh${rest === 0 ? "" : ` ${rest}\u202fmin`}`;
}
