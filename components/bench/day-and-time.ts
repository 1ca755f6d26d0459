/** "Tue 3 Feb, 19:40" in the reader's zone, by the browser's own calendar: the bench is too small for a date library. */
export function dayAndTime(at: string, zone: string): string {
  const instant = new Date(at);
  if (Number.isNaN(instant.getTime())) return "unknown";
  const format = new Intl.DateTimeFormat("en-GB", {
    timeZone: zone,
    weekday: "short",
    day: "numeric",
    month: "short",
    hour: "2-digit",
    minute: "2-digit",
    hourCycle: "h23",
  });
  const part = Object.fromEntries(format.formatToParts(instant).map(({ type, value }) => [type, value]));
  return `${part.weekday} ${part.day} ${part.month}, ${part.hour}:${part.minute}`;
}
