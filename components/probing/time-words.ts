/** "about 25 min", "about 1 h 40 min"; of a few seconds, "under a minute". */
export function timeWords(seconds: number): string {
  const minutes = Math.round(seconds / 60);
  if (minutes < 1) return "under a minute";
  if (minutes < 60) return `about ${minutes} min`;
  const rest = minutes % 60;
  return `about ${Math.floor(minutes / 60)} h${rest === 0 ? "" : ` ${rest} min`}`;
}
