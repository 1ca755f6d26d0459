/**
 * How many isolation tests tell that none of so many nets touch: every pair, each net against all earlier ones tied together,
 * or halves against halves. The last two need a fixture, and halves find a short without saying where.
 */
export function isolationWays(nets: number): { everyPair: number; againstTheRest: number; inHalves: number } {
  if (!(nets >= 2)) return { everyPair: 0, againstTheRest: 0, inHalves: 0 };
  return { everyPair: (nets * (nets - 1)) / 2, againstTheRest: nets - 1, inHalves: Math.ceil(Math.log2(nets)) };
}
