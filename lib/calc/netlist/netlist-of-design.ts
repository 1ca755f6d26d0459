import { pinNamed, viewFace } from "../connector";
import type { BoardDesign, DesignConnector } from "../interconnect";
import { BARE_PIN } from "./bare-pin";
import { NetCollector } from "./net-collector";
import type { Netlist, NetPoint } from "./netlist";
import { pinKey } from "./pin-name";

/** Between two connectors where they are set side by side: well beyond what counts as beside each other. */
const APART_MM = 20;

/**
 * The project's own pin map as a netlist: pins of one board with the same signal are one net. Only connectors are known, nothing
 * between them; the places are those of their faces, seen from the card and set side by side in the order of the design,
 * not those on the board.
 */
export function netlistOfDesign({ connectors }: Pick<BoardDesign, "connectors">): Netlist {
  const nets = new NetCollector();
  let left = 0;
  let hasPlaces = false;
  for (const connector of connectors) {
    const view = viewFace(connector.face, "card");
    const places = new Map(
      view.pins.map(({ name, xMm, yMm }) => [name, { xMm: left + xMm, yMm: view.heightMm - yMm }]),
    );
    for (const { signal, point } of pinsOf(connector)) {
      const place = places.get(point.pin);
      hasPlaces ||= place !== undefined;
      nets.add(signal, { ...point, ...place });
    }
    left += view.widthMm + APART_MM;
  }
  return {
    source: "pin-map",
    nets: nets.finish(),
    unconnected: nets.unconnected,
    adjacent: [],
    outlines: [],
    toolingHoles: [],
    places: hasPlaces ? "faces" : "none",
    facts: [],
  };
}

/** A pin that the map lists twice with one signal is one pin. */
function pinsOf({ face, reference, pins }: DesignConnector): { signal: string; point: NetPoint }[] {
  const seen = new Set<string>();
  const found: { signal: string; point: NetPoint }[] = [];
  for (const { pin, signal } of pins) {
    const name = pinNamed(face, pin)?.name ?? pin.trim();
    const point: NetPoint = { ...BARE_PIN, part: reference, pin: name, xMm: null, yMm: null, line: 0 };
    const key = `${pinKey(point)}\n${signal.trim()}`;
    if (!seen.has(key)) found.push({ signal: signal.trim(), point });
    seen.add(key);
  }
  return found;
}
