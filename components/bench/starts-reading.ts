import { isTyping } from "./key-map";

/** Characters with which a reading can begin. Letters are not among them: n and p are keys of the bench. */
const BEGINS = /^[0-9.,+\-−]$/;

/**
 * Typing a figure anywhere begins the reading. The character is handed over instead of left to the browser, which
 * would give it to whatever had the focus before. Returns how to stop listening.
 */
export function startsReading(begin: (character: string) => void): () => void {
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey || !BEGINS.test(event.key)) return;
    if (event.target instanceof HTMLElement && (isTyping(event.target) || event.target.closest("dialog"))) return;
    if (document.querySelector("dialog[open]")) return;
    event.preventDefault();
    begin(event.key);
  };
  addEventListener("keydown", onKeyDown);
  return () => removeEventListener("keydown", onKeyDown);
}
