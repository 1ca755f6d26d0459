const entities: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };

const escapeHtml = (text: string) => text.replace(/[&<>"']/g, (letter) => entities[letter] ?? letter);

class Safe {
  constructor(readonly text: string) {}
}

type Part = string | number | Safe | Safe[] | undefined;

function render(part: Part): string {
  if (part === undefined) return "";
  if (Array.isArray(part)) return part.map((one) => one.text).join("");
  return part instanceof Safe ? part.text : escapeHtml(String(part));
}

/** HTML whose every inserted value is escaped unless it is HTML itself. */
export function html(strings: TemplateStringsArray, ...parts: Part[]): Safe {
  return new Safe(strings.map((text, index) => text + render(parts[index])).join(""));
}

export type Html = Safe;
