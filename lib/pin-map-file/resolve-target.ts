import { pinNamed, type Connector } from "@/lib/calc/connector";
import type { PinTexts } from "@/lib/pin-map/pin-columns";

/** A connector that rows of a file can be for, with what its pins carry now. */
export type TakeTarget = {
  id: string;
  /** Code of the board. */
  board: string;
  reference: string;
  version: number;
  face: Connector;
  kept: Readonly<Record<string, PinTexts>>;
};

export const nameOf = ({ board, reference }: Pick<TakeTarget, "board" | "reference">): string =>
  `${board} ${reference}`;

export type FoundTarget = { ok: true; target: TakeTarget; pin: string } | { ok: false; sentence: string };

type Where = { board: string; connector: string; pin: string };

const same = (one: string, other: string) => one.toLowerCase() === other.toLowerCase();
const isFor = ({ board, reference }: TakeTarget, { board: code, connector }: Where): boolean => {
  const [first = "", second = ""] = connector.split(/[\s./:_-]+(?=[^\s./:_-]+$)/);
  const joined = second !== "" && same(first, board) && same(second, reference);
  return (
    (code === "" || same(code, board) || (joined && same(code, first))) &&
    (connector === "" || joined || same(connector, reference))
  );
};

/**
 * The connector that a row is for: by its own words (board, connector, both in one cell, or before the pin: "J1.a4"),
 * or the one that was chosen. Words that name another connector than the chosen one are refused, not bent.
 */
export function findTarget(where: Where, targets: readonly TakeTarget[], chosen: TakeTarget | undefined): FoundTarget {
  const inPin = /^(.*\S)[\s./:-]+([a-z]{0,3}\d{1,3}|[a-z])$/i.exec(where.pin);
  const named = where.connector === "" && inPin && isReference(inPin[1] ?? "", targets);
  const asked = named ? { ...where, connector: inPin[1] ?? "", pin: inPin[2] ?? "" } : where;
  const words = [asked.board, asked.connector].filter((word) => word !== "").join(" ");
  const matching = words === "" ? (chosen ? [chosen] : targets) : targets.filter((target) => isFor(target, asked));
  const [first] = matching;
  if (chosen && words !== "" && !matching.includes(chosen)) {
    return { ok: false, sentence: `It is for ${words}; only ${nameOf(chosen)} is taken here.` };
  }
  if (chosen) return { ok: true, target: chosen, pin: asked.pin };
  if (!first) return { ok: false, sentence: `There is no connector ${words} in this project.` };
  if (matching.length === 1) return { ok: true, target: first, pin: asked.pin };
  if (words === "") return { ok: false, sentence: "It names no connector. Choose one above, or add a column with it." };
  const some = matching.slice(0, 4).map(nameOf).join(", ");
  return {
    ok: false,
    sentence: `${words} can be ${some}${matching.length > 4 ? " and more" : ""}. Name the board, too.`,
  };
}

const isReference = (text: string, targets: readonly TakeTarget[]): boolean =>
  targets.some((target) => isFor(target, { board: "", connector: text, pin: "" }));

export type FoundPins = { ok: true; pins: { name: string; written: string }[] } | { ok: false; sentence: string };

/** One pin, or a range of them in one row of the face: a4:a11, a4 … a11, a4-a11, 1 to 8. */
export function findPins(target: TakeTarget, text: string): FoundPins {
  const single = pinNamed(target.face, text);
  if (single) return { ok: true, pins: [{ name: single.name, written: text }] };
  const range = /^\s*([a-z]{0,3}\d{1,3})\s*(?::|\.\.\.?|…|-|–|to)\s*([a-z]{0,3})(\d{1,3})\s*$/i.exec(text);
  const missing = (pin: string) => ({
    ok: false as const,
    sentence: `${nameOf(target)} has no pin ${pin} (${target.face.label}).`,
  });
  if (!range) return missing(text);
  const [, from = "", letters = "", to = ""] = range;
  const [, row = "", start = ""] = /^([a-z]*)(\d+)$/i.exec(from) ?? [];
  if (letters !== "" && !same(letters, row)) {
    return { ok: false, sentence: `${text} runs over two rows of the connector. Write one row of the file for each.` };
  }
  const step = Number(start) <= Number(to) ? 1 : -1;
  const names = Array.from(
    { length: Math.abs(Number(to) - Number(start)) + 1 },
    (_, at) => `${row}${Number(start) + at * step}`,
  );
  const pins = names.map((written) => ({ written, name: pinNamed(target.face, written)?.name }));
  const stray = pins.find(({ name }) => name === undefined);
  if (stray) return missing(stray.written);
  return { ok: true, pins: pins.map(({ written, name }) => ({ written, name: name ?? written })) };
}
