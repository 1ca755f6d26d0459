import { PIN_ROLES, type PinRole } from "@/lib/calc/interconnect";
import { formatQuantity, parseQuantity } from "@/lib/calc/units";
import { busNames } from "@/lib/calc/signal-names";
import type { PinColumn } from "./pin-columns";
import { readRole } from "./pin-role";

/** What the project knows: names of families (its own among them) and of the rails. */
export type KnownNames = { families: readonly string[]; rails: readonly string[] };

/** The value of a cell with the text that stands for it from now on, or the sentence that says why there is none. */
export type ReadCell<Value> = { ok: true; value: Value; text: string } | { ok: false; sentence: string };

const MOST_SIGNAL = 40;
const MOST_GROUP = 40;
const MOST_NOTE = 200;
const MOST_LOADS = 1000;
const LEAST_OHM = 1;
const MOST_OHM = 100e6;

const SIGNAL_CHARACTER = /^[\p{L}\p{N}+\-_/.#~!*&$:[\]<>()]$/u;
const CONTROL = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/;

const value = <Value>(read: Value, text: string): ReadCell<Value> => ({ ok: true, value: read, text });
const wrong = (sentence: string): { ok: false; sentence: string } => ({ ok: false, sentence });

function plainLine(text: string, most: number): ReadCell<string> {
  if (CONTROL.test(text)) return wrong("There is a control character in it that nobody can see. Type it again.");
  if (text.length > most) return wrong(`It has ${text.length} characters; at most ${most} fit here.`);
  return value(text, text);
}

function readSignal(text: string): ReadCell<string> {
  if (/\s/.test(text)) return wrong(`“${text}” has a blank in it. Write a signal in one word, such as CARRY_N.`);
  const strange = [...text].find((letter) => !SIGNAL_CHARACTER.test(letter));
  if (strange !== undefined) {
    return wrong(`“${strange}” cannot stand in a signal. Use letters, digits and + - _ / . # ~ ! * & $ : or brackets.`);
  }
  const bus = busNames(text);
  if (bus && bus.length > 1) {
    return wrong(
      `${text} names ${bus.length} signals, and a pin carries one. Type it over ${bus.length} selected pins.`,
    );
  }
  return plainLine(text, MOST_SIGNAL);
}

function readRoleCell(text: string): ReadCell<PinRole | null> {
  if (text === "") return value(null, "");
  const role = readRole(text);
  return role ? value(role, role) : wrong(`“${text}” is no role. Write ${PIN_ROLES.join(", ")}.`);
}

function readFamily(text: string, { families }: KnownNames): ReadCell<string> {
  if (text === "") return value("", "");
  const family = families.find((name) => name.toLowerCase() === text.toLowerCase());
  return family === undefined
    ? wrong(`“${text}” is no logic family of this project. Known: ${families.join(", ")}.`)
    : value(family, family);
}

function readLoads(text: string): ReadCell<number> {
  if (text === "") return value(0, "");
  const loads = /^\d{1,6}$/.test(text) ? Number(text) : Number.NaN;
  if (Number.isNaN(loads)) return wrong(`“${text}” is no number of loads. Write a whole number, 0 to ${MOST_LOADS}.`);
  return loads > MOST_LOADS
    ? wrong(`${loads} loads are more than the ${MOST_LOADS} that fit here.`)
    : value(loads, loads === 0 ? "" : String(loads));
}

function readPullUp(text: string): ReadCell<number | null> {
  if (text === "") return value(null, "");
  const read = parseQuantity(text, "Ω");
  if (!read.ok) return wrong(`The pull-up was not understood: ${read.message}`);
  // Six digits are more than any resistor is sold with, and what the text that stands for it keeps.
  const ohm = Number(read.value.value.toPrecision(6));
  if (ohm < LEAST_OHM || ohm > MOST_OHM) return wrong("A pull-up is 1 Ω to 100 MΩ. Leave the cell empty for none.");
  return value(ohm, writeOhm(ohm));
}

/** "4.7 kΩ", with a plain blank that survives every spreadsheet. */
export const writeOhm = (ohm: number): string => formatQuantity({ value: ohm, unit: "Ω" }).replace(/\s/gu, " ");

export const READERS = {
  signal: readSignal,
  role: readRoleCell,
  family: readFamily,
  loads: readLoads,
  enableGroup: (text: string) => plainLine(text, MOST_GROUP),
  pullUpOhm: readPullUp,
  note: (text: string) => plainLine(text, MOST_NOTE),
} satisfies Record<PinColumn, (text: string, known: KnownNames) => ReadCell<unknown>>;

/** The text that stands for what was typed, pasted or imported into one cell, or why it cannot. */
export function readCell(column: PinColumn, typed: string, known: KnownNames): ReadCell<unknown> {
  return READERS[column](typed.trim(), known);
}
