export const PREFIXES = ["M", "k", "m", "µ"] as const;
export type Prefix = (typeof PREFIXES)[number];

/** A key of the numeric pad. "plain" takes the prefix away; "OL" is the meter's overload, an open circuit in Ω. */
export type PadKey =
  `${0 | 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9}` | "." | "sign" | "OL" | "plain" | Prefix | "backspace" | "clear";

const PATTERN = /^([-−]?)(\d*\.?\d*)\s*([MkmµuμK]?)$/;
const MOST_DIGITS = 12;

type Parts = { sign: string; figure: string; prefix: string };

/** Sign, figure and prefix of what the pad writes; undefined for what only a keyboard writes, such as 4k7 or 1e-3. */
function parts(typed: string): Parts | undefined {
  const found = PATTERN.exec(typed.trim());
  return found ? { sign: found[1] ? "-" : "", figure: found[2] ?? "", prefix: found[3] ?? "" } : undefined;
}

const join = ({ sign, figure, prefix }: Parts) => `${sign}${figure}${prefix}`;

export function prefixOf(typed: string): Prefix | undefined {
  const prefix = parts(typed)?.prefix;
  const plain = prefix === "u" || prefix === "μ" ? "µ" : prefix === "K" ? "k" : prefix;
  return PREFIXES.find((one) => one === plain);
}

/** What stands in the field after a touch on the pad. Digits go before the prefix, wherever it was touched in between. */
export function press(typed: string, key: PadKey): string {
  if (key === "clear") return "";
  if (key === "OL") return "OL";
  const before = typed.trim().toUpperCase() === "OL" ? "" : typed;
  if (key === "backspace") return before.slice(0, -1);
  const now = parts(before);
  if (!now) return key === "sign" || key === "plain" ? before : `${before}${key}`;
  switch (key) {
    case "sign":
      return join({ ...now, sign: now.sign ? "" : "-" });
    case "plain":
      return join({ ...now, prefix: "" });
    case ".":
      return now.figure.includes(".") ? before : join({ ...now, figure: `${now.figure || "0"}.` });
    case "M":
    case "k":
    case "m":
    case "µ":
      return join({ ...now, prefix: prefixOf(before) === key ? "" : key });
    default: {
      if (now.figure.replace(".", "").length >= MOST_DIGITS) return before;
      const figure = now.figure === "0" ? key : `${now.figure}${key}`;
      return join({ ...now, figure });
    }
  }
}
