import { faceOf, pinNamed, type Connector } from "@/lib/calc/connector";
import type { BoardDesign, ConnectorAt, Machine } from "@/lib/calc/interconnect";
import { FAMILIES } from "@/lib/calc/levels";
import { MOST_CONNECTORS, type MachineGiven } from "./interconnect-input";

type Fields = Record<string, string>;
type Read = { ok: true; machine: Machine } | { ok: false; fields: Fields };

/** The machine of a request, or what names something that is not there, each by its path. */
export function readMachineInput(given: MachineGiven): Read {
  const fields: Fields = {};
  const say = (path: string, message: string) => void (fields[path] ??= message);
  const boards = given.boards.map((board, index) => readBoard(board, `boards.${index}`, say));
  given.boards.forEach(({ code }, index) => {
    if (given.boards.findIndex((one) => one.code === code) < index)
      say(`boards.${index}.code`, `${code} is there twice.`);
  });
  const placed = given.placements.length > 0 ? given.placements : boards.map(({ code }) => standing(code));
  const places = new Map(placed.map((one) => [one.id, boards.find(({ code }) => code === one.board)]));
  placed.forEach(({ id, board }, index) => {
    if (!places.get(id)) say(`placements.${index}.board`, `There is no board ${board}.`);
    if (placed.findIndex((one) => one.id === id) < index) say(`placements.${index}.id`, `${id} is there twice.`);
  });
  const connectors = placed.reduce((sum, { id }) => sum + (places.get(id)?.connectors.length ?? 0), 0);
  if (connectors > MOST_CONNECTORS) {
    say("placements", `Together they have ${connectors} connectors; at most ${MOST_CONNECTORS} are checked at once.`);
  }
  const end = (at: { placement: string; connector: string }, path: string): ConnectorAt => {
    const board = places.get(at.placement);
    if (!board) say(`${path}.placement`, `There is no placement ${at.placement}.`);
    const found = board?.connectors.find(({ reference }) => reference === at.connector);
    if (board && !found) say(`${path}.connector`, `${board.code} has no connector ${at.connector}.`);
    return { placement: at.placement, connector: found?.id ?? "" };
  };
  const matings = given.matings.map(({ from, to }, index) => ({
    from: end(from, `matings.${index}.from`),
    to: end(to, `matings.${index}.to`),
  }));
  given.draws.forEach(({ placement }, index) => {
    if (!places.has(placement)) say(`draws.${index}.placement`, `There is no placement ${placement}.`);
  });
  if (Object.keys(fields).length > 0) return { ok: false, fields };
  const { signals, rails, draws, conditions } = given;
  const placements = placed.map((one) => ({ ...one, label: one.id }));
  return { ok: true, machine: { boards, placements, matings, signals, rails, draws, families: FAMILIES, conditions } };
}

const standing = (code: string) => ({ id: code, board: code, slot: null });

type Say = (path: string, message: string) => void;

function readBoard({ code, kind, connectors }: MachineGiven["boards"][number], path: string, say: Say): BoardDesign {
  const designs = connectors.flatMap((connector, index): BoardDesign["connectors"] => {
    const at = `${path}.connectors.${index}`;
    const { reference, pins } = connector;
    if (connectors.findIndex((one) => one.reference === reference) < index)
      say(`${at}.reference`, `${reference} is there twice.`);
    const face = faceOf(connector);
    if (!face) {
      say(`${at}.grid`, "A connector of one's own needs a grid: rows by letters, positions, a pitch in mm.");
      return [];
    }
    checkPins(pins, face, at, say);
    return [{ id: `${code} ${reference}`, reference, face, pins }];
  });
  return { code, name: code, kind, connectors: designs, untiedSpares: [] };
}

function checkPins(pins: readonly { pin: string }[], face: Connector, path: string, say: Say): void {
  const seen = new Set<string>();
  pins.forEach(({ pin }, index) => {
    const found = pinNamed(face, pin);
    if (!found) say(`${path}.pins.${index}.pin`, `${face.label} has no pin ${pin}.`);
    else if (seen.has(found.name)) say(`${path}.pins.${index}.pin`, `Pin ${pin} is there twice.`);
    else seen.add(found.name);
  });
}
