/** Names a check from the point of view of a unit: the serial only when it is another one. */
export const nameCheck = (check: { serial: string; title: string }, fromSerial: string): string =>
  check.serial === fromSerial ? `“${check.title}”` : `“${check.title}” of ${check.serial}`;

/** "“A” waits for “B”, which waits for “C” of TIM-01, which waits for “A”."; "would wait" of a circle that is not made. */
export function describeCircle(
  members: readonly { serial: string; title: string }[],
  waits: "waits" | "would wait" = "waits",
): string {
  const [first, ...rest] = members;
  if (!first) return "";
  const name = (check: { serial: string; title: string }) => nameCheck(check, first.serial);
  if (rest.length === 0) return `${name(first)} ${waits} for itself.`;
  return `${name(first)} ${waits} for ${[...rest, first].map(name).join(", which waits for ")}.`;
}
