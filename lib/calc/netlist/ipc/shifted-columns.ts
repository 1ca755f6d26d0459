/** Access and place, as they follow each other whatever column they begin in. */
const ACCESS_AND_PLACE = /A[\d ]\dX[ +-][\d ]{5}\dY[ +-][\d ]{5}\d/g;
const ACCESS_COLUMN = 38;

/**
 * By how many columns a record is shifted to the right, because its part's name is longer than six letters (seen: a writer that does
 * not cut it). Undefined when no access and place follow each other, or when the net's name may be what is too long.
 */
export function findShift(line: string): number | undefined {
  if (line.slice(17, 20).trim() !== "") return undefined;
  ACCESS_AND_PLACE.lastIndex = ACCESS_COLUMN + 1;
  const found = ACCESS_AND_PLACE.exec(line);
  return found === null ? undefined : found.index - ACCESS_COLUMN;
}
