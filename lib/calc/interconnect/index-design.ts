import { pinNamed, type Connector } from "../connector";
import { DisjointSets } from "./disjoint-sets";
import type { BoardDesign, DesignConnector, DesignPin } from "./machine";
import { byName, sortedOnce } from "./order";

export type IndexedPin = {
  design: DesignPin;
  connector: IndexedConnector;
  /** In the face's own writing; as it came where the face has no such pin. */
  name: string;
  /** The name in small letters, by which two pins meet. */
  key: string;
  /** Whether the face has it. */
  isOnFace: boolean;
  /** What the pin carries; empty for a pin that is joined to nothing. */
  signal: string;
  /** Number of the piece of copper on the board. */
  copper: number;
};

export type IndexedConnector = {
  id: string;
  reference: string;
  face: Connector;
  board: string;
  /** In the face's order. */
  pins: IndexedPin[];
  /** By name in small letters; more than one when a pin is listed twice. */
  byName: Map<string, IndexedPin[]>;
};

export type IndexedBoard = {
  design: BoardDesign;
  connectors: IndexedConnector[];
  byConnector: Map<string, IndexedConnector>;
  pins: IndexedPin[];
  coppers: number;
  /** Whether a pin of it needs its connector's reference to be found. */
  hasSeveralConnectors: boolean;
};

/** Pins of one board with one signal are one piece of copper, and so is a pin that is listed twice. */
export function indexDesign(design: BoardDesign): IndexedBoard {
  const connectors = sortedOnce(design.connectors, ({ reference, id }) => `${reference}\u0000${id}`).map((connector) =>
    indexConnector(connector, design.code),
  );
  const pins = connectors.flatMap((connector) => connector.pins);
  const copper = new DisjointSets(pins.length);
  const firstOf = new Map<string, number>();
  pins.forEach(({ signal }, at) => {
    if (signal === "") return;
    const first = firstOf.get(signal);
    if (first === undefined) firstOf.set(signal, at);
    else copper.join(first, at);
  });
  // Pins listed twice follow each other.
  pins.forEach((pin, at) => {
    const before = pins[at - 1];
    if (before?.connector === pin.connector && before.key === pin.key) copper.join(at - 1, at);
  });
  const numbers = new Map<number, number>();
  pins.forEach((pin, at) => {
    const root = copper.find(at);
    if (!numbers.has(root)) numbers.set(root, numbers.size);
    pin.copper = numbers.get(root) ?? 0;
  });
  return {
    design,
    connectors,
    byConnector: new Map(connectors.map((connector) => [connector.id, connector])),
    pins,
    coppers: numbers.size,
    hasSeveralConnectors: connectors.filter((connector) => connector.pins.length > 0).length > 1,
  };
}

function indexConnector({ id, reference, face, pins }: DesignConnector, board: string): IndexedConnector {
  const connector: IndexedConnector = { id, reference, face, board, pins: [], byName: new Map() };
  const order = faceOrder(face);
  const placed = pins.map((design) => {
    const onFace = pinNamed(face, design.pin);
    const name = onFace?.name ?? design.pin.trim();
    return { design, name, onFace, at: order.get(name) ?? Infinity };
  });
  // Compared without subtraction: Infinity − Infinity is no number.
  placed.sort((a, b) =>
    a.at === b.at
      ? byName(a.name.toLowerCase(), b.name.toLowerCase()) || byContent(a.design, b.design)
      : a.at < b.at
        ? -1
        : 1,
  );
  for (const { design, name, onFace } of placed) {
    const signal = design.role === "no connection" ? "" : design.signal.trim();
    const key = name.toLowerCase();
    const pin = { design, connector, name, key, isOnFace: onFace !== undefined, signal, copper: 0 };
    connector.pins.push(pin);
    const same = connector.byName.get(key);
    if (same) same.push(pin);
    else connector.byName.set(key, [pin]);
  }
  return connector;
}

/** Two lines for one pin: their order must not come from the list's. */
const byContent = (one: DesignPin, other: DesignPin): number => {
  const [a, b] = [JSON.stringify(one), JSON.stringify(other)];
  return a < b ? -1 : a > b ? 1 : 0;
};

const orders = new WeakMap<Connector, Map<string, number>>();

function faceOrder(face: Connector): Map<string, number> {
  let order = orders.get(face);
  if (!order) {
    order = new Map(face.pins.map((pin, at) => [pin.name, at]));
    orders.set(face, order);
  }
  return order;
}
