import { pinNamed } from "../connector";
import type { Edit } from "./finding";
import type { BoardDesign, DesignConnector, DesignPin, Machine, SignalFacts } from "./machine";

type PinEdit = Extract<Edit, { kind: "pin" }>;

/**
 * The machine as the edits make it; the given one stays as it is. A pin that is not listed yet is added. Edits of
 * boards, connectors or pins that are not there change nothing.
 */
export function applyEdits(machine: Machine, edits: readonly Edit[]): Machine {
  const pins = edits.filter((edit) => edit.kind === "pin");
  const spares = new Set(edits.flatMap((edit) => (edit.kind === "tie-spares" ? [edit.board] : [])));
  const aliases = edits.flatMap((edit) => (edit.kind === "alias" ? [edit] : []));
  const touched = new Set(pins.map(({ board }) => board));
  const boards = machine.boards.map((board) => {
    if (!touched.has(board.code) && !spares.has(board.code)) return board;
    const own = pins.filter((edit) => edit.board === board.code);
    const edited: BoardDesign = { ...board, connectors: board.connectors.map((one) => editConnector(one, own)) };
    return spares.has(board.code) ? { ...edited, untiedSpares: [] } : edited;
  });
  return { ...machine, boards, signals: aliases.reduce(addAlias, machine.signals) };
}

function editConnector(connector: DesignConnector, edits: readonly PinEdit[]): DesignConnector {
  const { face } = connector;
  const nameOf = (pin: string) => pinNamed(face, pin)?.name ?? pin.trim();
  const changes = new Map<string, PinEdit["set"]>();
  for (const { connectorId, pin, set } of edits) {
    if (connectorId === connector.id) changes.set(nameOf(pin), { ...changes.get(nameOf(pin)), ...set });
  }
  if (changes.size === 0) return connector;
  const listed = new Set(connector.pins.map((pin) => nameOf(pin.pin)));
  const added = [...changes].filter(([name]) => !listed.has(name) && pinNamed(face, name) !== undefined);
  return {
    ...connector,
    pins: [
      ...connector.pins.map((pin) => ({ ...pin, ...changes.get(nameOf(pin.pin)) })),
      ...added.map(([name, set]) => ({ ...emptyPin(name), ...set })),
    ],
  };
}

const emptyPin = (pin: string): DesignPin => ({
  pin,
  signal: "",
  role: "passive",
  family: "",
  loads: 0,
  enableGroup: "",
  pullUpOhm: null,
});

function addAlias(signals: SignalFacts[], { signal, alias }: Extract<Edit, { kind: "alias" }>): SignalFacts[] {
  const isKnown = signals.some((one) => one.name === signal);
  const all = isKnown
    ? signals
    : [...signals, { name: signal, class: "data" as const, aliases: [], frequencyHz: null }];
  return all.map((one) =>
    one.name !== signal || one.aliases.includes(alias) ? one : { ...one, aliases: [...one.aliases, alias] },
  );
}
