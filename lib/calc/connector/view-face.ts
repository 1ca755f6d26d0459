import type { Connector, ConnectorPin } from "./connector";

/**
 * "card": one stands where the cards are and looks into the backplane's connectors, at their mating faces.
 * "solder": one stands behind the backplane, where the tails are soldered; left and right are exchanged.
 * For a card's own plug the same two places hold: "card" is seen from the card, "solder" looks into the plug.
 */
export type Side = "card" | "solder";

/** "standing": position 1 on top, as in a rack. "lying": the same turned a quarter to the left, position 1 at left. */
export type Orientation = "standing" | "lying";

export type PinInView = ConnectorPin & { xMm: number; yMm: number };

export type FaceView = {
  /** The body's outline; its upper left corner is the origin, y goes down as in SVG. */
  widthMm: number;
  heightMm: number;
  pins: PinInView[];
};

/**
 * Where each pin is seen, mm. Standing and seen from the card side, the row that is named first is at the left. Turning
 * never mirrors, so that a drawing held against the board is right in either orientation; only changing sides mirrors.
 * Which way round a row's letter stands is the convention of racks with the component side to the right (common
 * practice, no source).
 */
export function viewFace(connector: Connector, side: Side, orientation: Orientation = "standing"): FaceView {
  const { lengthMm, widthMm } = connector.outline;
  const across = Math.max(0, ...connector.rows.map((row) => row.offsetMm));
  const left = (widthMm - across) / 2;
  const top = (lengthMm - (connector.positions - 1) * connector.pitchMm) / 2;
  const pins = connector.pins.map((pin) => {
    const fromCard = left + (connector.rows[pin.row]?.offsetMm ?? 0);
    const x = side === "card" ? fromCard : widthMm - fromCard;
    const y = top + (pin.position - 1) * connector.pitchMm;
    return orientation === "standing" ? { ...pin, xMm: x, yMm: y } : { ...pin, xMm: y, yMm: widthMm - x };
  });
  return orientation === "standing"
    ? { widthMm, heightMm: lengthMm, pins }
    : { widthMm: lengthMm, heightMm: widthMm, pins };
}

/** Distance of two pins of one face, mm, between centres. */
export function pinsApartMm(connector: Connector, one: ConnectorPin, other: ConnectorPin): number {
  const row = (pin: ConnectorPin) => connector.rows[pin.row]?.offsetMm ?? 0;
  return Math.hypot(row(one) - row(other), (one.position - other.position) * connector.pitchMm);
}
