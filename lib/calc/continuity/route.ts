import { goToNearest } from "./go-to-nearest";
import { shorten } from "./shorten";
import type { Route, Ways } from "./ways";

/**
 * Goes through all ways with little walking between them: always the nearest end that is left, then 2-opt, which turns round
 * stretches that are shorter backwards. A good order, not the best one; the work grows in proportion to the number of ways.
 */
export function route(ways: Ways): Route {
  const found = goToNearest(ways);
  shorten(ways, found);
  return found;
}
