/** Distance of two places, squared. */
export const squared = (ax = 0, ay = 0, bx: number, by: number): number =>
  (ax - bx) * (ax - bx) + (ay - by) * (ay - by);
