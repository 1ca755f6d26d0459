/** Whether a key press belongs to a field, so that single-key shortcuts stay out of the way. */
export function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    (target.isContentEditable || target.closest("input, textarea, select, [role=textbox], [role=dialog]") !== null)
  );
}
