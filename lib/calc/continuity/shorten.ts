import { squared } from "./squared";
import type { Route, Ways } from "./ways";

/** Stretches of at most so many ways are turned, in so many passes: the work stays in proportion to their number. */
const LONGEST_TURN = 8;
const MOST_PASSES = 2;

/** 2-opt: turns round every stretch that is shorter backwards. */
export function shorten(ways: Ways, { order, isTurned }: Route): void {
  const count = order.length;
  if (count < 3) return;
  const { inX, inY, outX, outY } = endsInOrder(ways, order, isTurned);
  let isBetter = true;
  for (let pass = 0; pass < MOST_PASSES && isBetter; pass += 1) {
    isBetter = false;
    for (let from = 0; from < count - 1; from += 1) {
      const [beforeX, beforeY] = [outX[from - 1] ?? Number.NaN, outY[from - 1] ?? Number.NaN];
      const [startX, startY] = [inX[from] ?? 0, inY[from] ?? 0];
      const before = from === 0 ? 0 : distance(beforeX, beforeY, startX, startY);
      for (let to = from + 1; to <= Math.min(from + LONGEST_TURN, count - 1); to += 1) {
        const reach = from === 0 ? 0 : distance(beforeX, beforeY, outX[to] ?? 0, outY[to] ?? 0);
        const afterX = inX[to + 1];
        const afterY = inY[to + 1] ?? 0;
        const after = afterX === undefined ? 0 : distance(outX[to] ?? 0, outY[to] ?? 0, afterX, afterY);
        // Most turns are dropped here: the way to the far end alone is longer than both ways together.
        if (reach >= before + after) continue;
        const turned = reach + (afterX === undefined ? 0 : distance(startX, startY, afterX, afterY));
        if (turned > before + after - 1e-9) continue;
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
    exchange(inX, outX, from, to);
    exchange(inY, outY, from, to);
  }
}

const distance = (ax: number, ay: number, bx: number, by: number): number => Math.sqrt(squared(ax, ay, bx, by));

/** Where each way is entered and left, by its place in the order. */
function endsInOrder({ startX, startY, endX, endY }: Ways, order: Int32Array, isTurned: Uint8Array) {
  const count = order.length;
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
  return { inX, inY, outX, outY };
}

/** Turned round, a stretch is entered where it was left. */
function exchange(entered: Float64Array, left: Float64Array, from: number, to: number): void {
  for (let near = from, far = to; near <= far; near += 1, far -= 1) {
    const [nearIn, nearOut, farIn, farOut] = [entered[near] ?? 0, left[near] ?? 0, entered[far] ?? 0, left[far] ?? 0];
    entered[near] = farOut;
    left[near] = farIn;
    entered[far] = nearOut;
    left[far] = nearIn;
  }
}
