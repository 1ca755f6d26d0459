type Point = { xMm: number | null; yMm: number | null };
type Place = { xMm: number; yMm: number };

export type Drawn = {
  view: { x: number; y: number; width: number; height: number };
  /** A hundredth of the longer side: strokes and marks are as large on every board. */
  unit: number;
  outline: string;
  dots: string;
  dotRadius: number;
};

/** More dots than this are a grey patch on any screen. */
const MOST_DOTS = 4000;

/** y points away from the reader in a netlist and towards the reader on a screen. Undefined where nothing has a place. */
export function drawnBoard(points: readonly Point[], outline: readonly (readonly Place[])[]): Drawn | undefined {
  const placed = points.flatMap(({ xMm, yMm }) => (xMm === null || yMm === null ? [] : [{ xMm, yMm }]));
  const all = outline.some((path) => path.length > 1) ? [...outline.flat(), ...thinned(placed)] : placed;
  if (placed.length === 0) return undefined;
  let [left, right, low, high] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { xMm, yMm } of all) {
    [left, right] = [Math.min(left, xMm), Math.max(right, xMm)];
    [low, high] = [Math.min(low, yMm), Math.max(high, yMm)];
  }
  const longer = Math.max(right - left, high - low, 1);
  const unit = longer / 100;
  const margin = unit * 4;
  return {
    view: { x: left - margin, y: -high - margin, width: right - left + 2 * margin, height: high - low + 2 * margin },
    unit,
    outline: outline.map((path) => `M${path.map(at).join("L")}`).join(""),
    dots: thinned(placed)
      .map((place) => `M${at(place)}h0`)
      .join(""),
    dotRadius: unit * (placed.length > 800 ? 0.3 : 0.6),
  };
}

const at = ({ xMm, yMm }: Place) => `${Math.round(xMm * 100) / 100} ${Math.round(-yMm * 100) / 100}`;

function thinned(places: readonly Place[]): readonly Place[] {
  if (places.length <= MOST_DOTS) return places;
  const step = Math.ceil(places.length / MOST_DOTS);
  return places.filter((_, index) => index % step === 0);
}
