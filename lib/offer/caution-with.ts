import type { CautionLine } from "./schema";

/** The caution with the offered line in it: in place of the one that begins the same, else on top of the others. */
export function cautionWith(caution: string, offered: CautionLine): string {
  const lines = caution === "" ? [] : caution.split("\n");
  const at = lines.findIndex((line) => line.startsWith(offered.begins));
  if (at < 0) return [offered.text, ...lines].join("\n");
  return lines.map((line, index) => (index === at ? offered.text : line)).join("\n");
}
