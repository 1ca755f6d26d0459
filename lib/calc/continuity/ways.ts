/** Ways to go, each from one end to the other; a place has both ends in one. */
export type Ways = {
  startX: Float64Array;
  startY: Float64Array;
  endX: Float64Array;
  endY: Float64Array;
};

export type Route = {
  /** Numbers of the ways, in the order in which to go them. */
  order: Int32Array;
  /** By number of the way: gone from its end to its start. */
  isTurned: Uint8Array;
};
