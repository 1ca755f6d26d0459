import type { Connector, PinInView } from "@/lib/calc/connector";

type Drawn = { pins: readonly PinInView[]; widthMm: number; heightMm: number; isLying: boolean };
type AxisText = { text: string; x: number; y: number; anchor: "middle" | "end" };

/** Distance of the two nearest pins, mm: what letters and pins are measured by. */
export function roomOf(face: Connector): number {
  const gaps = face.rows.flatMap((row, index) => {
    const next = face.rows[index + 1];
    return next ? [Math.abs(next.offsetMm - row.offsetMm)] : [];
  });
  return Math.min(face.positions > 1 ? face.pitchMm : Infinity, ...gaps, 5.08);
}

/**
 * Rows by letter at the side of position 1, positions along the body. Where pins only count (headers, lettered edges),
 * each row says its first pin, and the axis names the pins of the first row.
 */
export function axisOf(face: Connector, { pins, widthMm, heightMm, isLying }: Drawn): AxisText[] {
  const room = roomOf(face);
  const isByLetter = face.rows.every(({ name }) => /^[a-z]{1,3}$/i.test(name)) && face.pins[0]?.name !== "1";
  const step = isLying ? 8 : 4;
  const rows = face.rows.flatMap(({ name }, index): AxisText[] => {
    const first = pins.find((pin) => pin.row === index && pin.position === 1);
    if (!first || (face.rows.length === 1 && !isByLetter)) return [];
    const isAtLeft = first.xMm < widthMm / 2;
    const text = isByLetter ? name : first.name;
    return isLying
      ? [{ text, x: isAtLeft ? -room * 0.7 : widthMm + room * 0.7, y: first.yMm + room * 0.3, anchor: "middle" }]
      : [{ text, x: first.xMm, y: -room * 0.55, anchor: "middle" }];
  });
  const along = pins
    .filter(
      ({ row, position }) => row === 0 && (position === 1 || position === face.positions || position % step === 0),
    )
    .filter(({ position }) => position === face.positions || position === 1 || face.positions - position > 2)
    .map(({ name, position, xMm, yMm }): AxisText => {
      const text = isByLetter ? String(position) : name;
      return isLying
        ? { text, x: xMm, y: heightMm + room * 1.1, anchor: "middle" }
        : { text, x: -room * 0.4, y: yMm + room * 0.3, anchor: "end" };
    });
  return [...rows, ...along];
}
