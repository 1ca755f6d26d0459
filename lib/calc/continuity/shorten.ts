import { squared } from "./squared";
import type { Route, Ways } from "./ways";

/** 2-opt turns stretches of at most so many ways, in so many passes: the work stays in proportion to their number. */
const LONGEST_TURN = 24;
const MOST_PASSES = 3;

/** 2-opt: turns round every stretch that is shorter backwards. */
export function shorten({ startX, startY, endX, endY }: Ways, { order, isTurned }: Route): void {
  const count = order.length;
  if (count < 3) return;
  // Where each stretch is entered and left, by its place in the order.
  const [inX, inY] = [new Float64Array(count), new Float64Array(count)];
  const [outX, outY] = [new Float64Array(count), new Float64Array(count)];
  for (let at = 0; at < count; at += 1) {
    const way = order[at] ?? 0;
    const turned = isTurned[way] === 1;
    inX[at] = (turned ? endX : startX)[way] ?? 0;
    inY[at] = (turned ? endY : startY)[way] ?? 0;
    outX[at] = (turned ? startX : endX)[way] ?? 0;
    outY[at] = (turned ? startY : endY)[way] ?? 0;
  }
  const gap = (ax: Float64Array, ay: Float64Array, a: number, bx: Float64Array, by: Float64Array, b: number) =>
    Math.sqrt(squared(ax[a], ay[a], bx[b] ?? 0, by[b] ?? 0));
  for (let pass = 0, isBetter = true; pass < MOST_PASSES && isBetter; pass += 1) {
    isBetter = false;
    for (let from = 0; from < count - 1; from += 1) {
      const before = from === 0 ? 0 : gap(outX, outY, from - 1, inX, inY, from);
      for (let to = from + 1; to <= Math.min(from + LONGEST_TURN, count - 1); to += 1) {
        const isLast = to === count - 1;
        const now = before + (isLast ? 0 : gap(outX, outY, to, inX, inY, to + 1));
        const turned =
          (from === 0 ? 0 : gap(outX, outY, from - 1, outX, outY, to)) +
          (isLast ? 0 : gap(inX, inY, from, inX, inY, to + 1));
        if (turned > now - 1e-9) continue;
        turn(from, to);
        isBetter = true;
        break;
      }
    }
  }

  function turn(from: number, to: number): void {
    order.subarray(from, to + 1).reverse();
    for (let at = from; at <= to; at += 1) {
      const way = order[at] ?? 0;
      isTurned[way] = isTurned[way] === 1 ? 0 : 1;
    }
    const [enterX, enterY] = [inX.slice(from, to + 1).reverse(), inY.slice(from, to + 1).reverse()];
    inX.set(outX.subarray(from, to + 1).reverse(), from);
    inY.set(outY.subarray(from, to + 1).reverse(), from);
    outX.set(enterX, from);
    outY.set(enterY, from);
  }
}
