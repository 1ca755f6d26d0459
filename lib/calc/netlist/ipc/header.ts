import type { NetlistFact } from "../netlist";
import { readUnits, USUAL_UNITS, type IpcUnits } from "./scale";

/** "NNAME12  A LONG NAME": in a P record by the standard, in a C record by one widespread writer. */
const ALIAS = /^(NNAME\S+)\s+(\S.*)$/;
const MOST_FACTS = 200;

type Warn = (line: number, reason: string) => void;

/** What the C and P records say, as they come. */
export class IpcHeader {
  readonly facts: NetlistFact[] = [];
  readonly longNames = new Map<string, string>();
  units: IpcUnits = USUAL_UNITS;
  unitsLine = 0;
  /** Why the units may be others than they seem; empty when there is no doubt. */
  unitsDoubt = "";
  /** Between IMAGE PANEL and the next IMAGE: points of the panel, not of the board. */
  isInPanel = false;

  constructor(private readonly warn: Warn) {}

  take(line: string, number: number): void {
    const text = line.slice(1).trim();
    const [, alias, longName] = ALIAS.exec(text) ?? [];
    if (alias !== undefined && longName !== undefined) this.takeAlias(alias, longName, number);
    else if (line.startsWith("C")) this.takeFact("comment", text);
    else this.takeParameter(text, number);
  }

  private takeParameter(text: string, number: number): void {
    const [, name = "", value = ""] = /^(\S*?):?(?:\s+(.*))?$/.exec(text) ?? [];
    this.takeFact(name, value);
    if (name.toUpperCase() === "UNITS") this.takeUnits(value, number);
    if (name.toUpperCase() === "IMAGE") this.isInPanel = /^PANEL\b/i.test(value);
  }

  private takeUnits(words: string, number: number): void {
    const read = readUnits(words);
    if (!read) return this.warn(number, `“${words}” are no units of this format; 0.0001 inch is taken.`);
    if (this.unitsLine > 0)
      this.warn(number, `Units stand in line ${this.unitsLine} already; these hold from here on.`);
    this.units = read.units;
    this.unitsDoubt = read.doubt;
    this.unitsLine = number;
  }

  private takeAlias(alias: string, longName: string, number: number): void {
    const before = this.longNames.get(alias);
    if (before === undefined) this.longNames.set(alias, longName);
    else if (before !== longName) this.warn(number, `${alias} is the net ${before} already; the first name is kept.`);
  }

  private takeFact(name: string, value: string): void {
    if (name !== "" && this.facts.length < MOST_FACTS) this.facts.push({ name, value });
  }
}
