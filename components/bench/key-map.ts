/** What a key does at the bench. A foot pedal is a keyboard that sends one of them. */
export type BenchKey = "conforms" | "does-not-conform" | "note" | "photo" | "previous" | "next" | "record" | "keys";

const KEYS: Record<string, BenchKey> = {
  " ": "conforms",
  x: "does-not-conform",
  n: "note",
  p: "photo",
  ArrowLeft: "previous",
  ArrowRight: "next",
  // Pedals made for turning pages send these.
  PageUp: "previous",
  PageDown: "next",
  Enter: "record",
  "?": "keys",
};

export const KEYS_FOR_PEOPLE: readonly { keys: string; does: string }[] = [
  { keys: "Space", does: "conforms" },
  { keys: "x", does: "does not conform" },
  { keys: "Enter", does: "record the reading" },
  { keys: "n", does: "write a note" },
  { keys: "p", does: "take a photo" },
  { keys: "← →", does: "the check before, the next check" },
  { keys: "?", does: "show or hide the keys" },
];

type Pressed = {
  key: string;
  ctrlKey: boolean;
  metaKey: boolean;
  altKey: boolean;
  repeat: boolean;
  isComposing: boolean;
  target: { tagName?: string; type?: string; isContentEditable?: boolean } | null;
};

/** Inputs in which no character is typed. */
const NOT_TYPED_IN = new Set(["button", "checkbox", "radio", "file", "submit", "reset", "range", "color", "image"]);

export function isTyping(target: Pressed["target"]): boolean {
  if (!target) return false;
  if (target.isContentEditable) return true;
  const tag = target.tagName?.toLowerCase();
  if (tag === "textarea" || tag === "select") return true;
  return tag === "input" && !NOT_TYPED_IN.has(target.type ?? "text");
}

/** A focused button, link or summary has its own use for space and Enter. */
function actsOnItsOwn(target: Pressed["target"]): boolean {
  const tag = target?.tagName?.toLowerCase();
  return tag === "button" || tag === "a" || tag === "summary" || tag === "input";
}

/**
 * What the key means, or undefined when it is not ours: with a modifier, while typing in a field, on a focused
 * button (space, Enter), or held down (a pedal under a resting foot must not record twice).
 */
export function benchKey(pressed: Pressed): BenchKey | undefined {
  if (pressed.ctrlKey || pressed.metaKey || pressed.altKey || pressed.isComposing || isTyping(pressed.target))
    return undefined;
  const key = KEYS[pressed.key.length === 1 ? pressed.key.toLowerCase() : pressed.key];
  if (!key) return undefined;
  if ((pressed.key === " " || pressed.key === "Enter") && actsOnItsOwn(pressed.target)) return undefined;
  const walks = key === "previous" || key === "next";
  return pressed.repeat && !walks ? undefined : key;
}
