/** A line of text around the first word that was found, so that one sees why it is listed. */
export function excerpt(text: string, words: readonly string[], length = 90): string {
  const flat = text
    .replace(/[#*_`>[\]()!]+/g, " ")
    .replace(/\s+/g, " ")
    .trim();
  const lower = flat.toLowerCase();
  const places = words.map((word) => lower.indexOf(word.toLowerCase())).filter((place) => place >= 0);
  const at = places.length === 0 ? 0 : Math.min(...places);
  const from = Math.max(0, at - Math.floor(length / 3));
  const start = from === 0 ? 0 : flat.indexOf(" ", from) + 1;
  const cut = flat.slice(start, start + length);
  return `${start > 0 ? "… " : ""}${cut}${start + length < flat.length ? " …" : ""}`;
}
