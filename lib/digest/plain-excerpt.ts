/** The beginning of a Markdown text as plain words, for a mail. */
export function plainExcerpt(markdown: string, most = 280): string {
  const words = markdown
    .replace(/```[\s\S]*?(```|$)/g, " ")
    .replace(/!\[[^\]]*\]\([^)]*\)/g, " ")
    .replace(/\[([^\]]*)\]\([^)]*\)/g, "$1")
    // The points of a list come one after the other with a semicolon; paragraphs end.
    .replace(/(?<![.:;!?…\s])[ \t]*\n+\s*([-*+]|\d+[.)])\s+/g, "; ")
    .replace(/(?<![.:;!?…\s])[ \t]*\n\s*\n/g, ".\n\n")
    .replace(/^\s{0,3}(#{1,6}|>|[-*+]|\d+[.)])\s+/gm, "")
    .replace(/[*_`~]{1,3}(?=\S)|(?<=\S)[*_`~]{1,3}/g, "")
    .replace(/\s+/g, " ")
    .trim()
    .replace(/^[;.] /, "");
  if (words.length <= most) return words;
  const head = words.slice(0, most);
  const end = head.lastIndexOf(" ");
  return `${head.slice(0, end > most / 2 ? end : most)}…`;
}
