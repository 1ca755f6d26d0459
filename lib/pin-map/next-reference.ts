/** A free reference after a known one: the letters of it with the slot's number, or else with the next free number. */
export function nextReference(like: string, position: number, taken: readonly string[]): string {
  const letters = like.replace(/\d+$/, "") || "J";
  const isFree = (reference: string) => !taken.some((one) => one.toLowerCase() === reference.toLowerCase());
  let number = position;
  while (!isFree(`${letters}${number}`)) number += 1;
  return `${letters}${number}`;
}
