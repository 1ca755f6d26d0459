import type { Machine, SignalClass, SignalFacts } from "./machine";
import { sortedOnce } from "./order";

/** What is known of signals by name. */
export type SignalBook = {
  signal(name: string): SignalFacts | undefined;
  classOf(name: string): SignalClass | undefined;
  /**
   * Whether somebody agreed that both mean the same. Not carried further: SEL_N may be an alias of SELM2_N and of
   * SELS2_N without joining these.
   */
  areAliases(one: string, other: string): boolean;
};

export function signalBook(machine: Machine): SignalBook {
  const facts = new Map(sortedOnce(machine.signals, ({ name }) => name).map((one) => [one.name, one]));
  const says = (name: string, alias: string) => facts.get(name)?.aliases.includes(alias) ?? false;
  return {
    signal: (name) => facts.get(name),
    classOf: (name) => facts.get(name)?.class,
    areAliases: (one, other) => one === other || says(one, other) || says(other, one),
  };
}
