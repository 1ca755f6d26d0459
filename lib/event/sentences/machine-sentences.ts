import { count, whatWent } from "./words";
import type { Writers } from "./writer";

/** Boards, revisions, units and slots. */
export const MACHINE: Writers<"board" | "revision" | "unit" | "slot"> = {
  "board.created": ({ code, name }, { who, board }) => [who, " added the board ", board(code, name), "."],
  "board.edited": ({ code, name }, { who, board }) => [who, " changed the board ", board(code, name), "."],
  "board.archived": ({ code, name }, { who, board }) => [who, " archived the board ", board(code, name), "."],
  "board.restored": ({ code, name }, { who, board }) => [who, " restored the board ", board(code, name), "."],
  "board.purged": ({ code, name, units, ...gone }, { who }) => [
    who,
    ` purged the board ${code} ${name} for good: ${count(units, "unit")}, ${whatWent(gone)}.`,
  ],
  "revision.created": ({ code, letter }, { who, board }) => [who, ` added revision ${letter} of `, board(code), "."],
  "revision.released": ({ code, letter }, { who, board }) => [
    who,
    ` released revision ${letter} of `,
    board(code),
    ".",
  ],
  "unit.created": ({ serial }, { who, unit }) => [who, " added the unit ", unit(serial), "."],
  "unit.edited": ({ serial }, { who, unit }) => [who, " changed the unit ", unit(serial), "."],
  "unit.archived": ({ serial }, { who, unit }) => [who, " archived the unit ", unit(serial), "."],
  "unit.restored": ({ serial }, { who, unit }) => [who, " restored the unit ", unit(serial), "."],
  "unit.purged": ({ serial, ...gone }, { who }) => [who, ` purged the unit ${serial} for good: ${whatWent(gone)}.`],
  "slot.created": ({ position }, { who, slots }) => [who, " added ", slots(`slot ${position}`), "."],
  "slot.edited": ({ position }, { who, slots }) => [who, " changed ", slots(`slot ${position}`), "."],
  "slot.archived": ({ position }, { who, slots }) => [who, " archived ", slots(`slot ${position}`), "."],
  "unit.placed": ({ serial, position }, { who, unit, slots }) => [
    who,
    " put ",
    unit(serial),
    " into ",
    slots(`slot ${position}`),
    ".",
  ],
  "unit.removed": ({ serial, position }, { who, unit, slots }) => [
    who,
    " took ",
    unit(serial),
    " out of ",
    slots(`slot ${position}`),
    ".",
  ],
};
