import { count, endSentence } from "./words";
import type { Writers } from "./writer";

/** Faults, reworks, probing and what the next revision takes over. */
export const FAULTS: Writers<"fault" | "rework" | "netlist" | "probing" | "punch"> = {
  "fault.opened": ({ number, title, serial }, { who, fault, unit }) => [
    who,
    " opened the fault ",
    fault(number, title),
    " of ",
    unit(serial),
    ".",
  ],
  "fault.edited": ({ number, title, what }, { who, fault }) => [
    who,
    " wrote on the fault ",
    fault(number, title),
    `: ${endSentence(what)}`,
  ],
  "fault.stated": ({ number, title, from, to }, { who, fault }) => [
    who,
    " called the fault ",
    fault(number, title),
    ` ${to}, before ${from}.`,
  ],
  "rework.recorded": ({ serial, number, what, fault, doubtful, spared }, { who, rework, unit }) => [
    who,
    " recorded ",
    rework(number),
    " of ",
    unit(serial),
    `${fault === null ? "" : ` for F${fault}`}: ${what}. `,
    doubtful === 0 ? "It puts no further check in doubt" : `It puts ${count(doubtful, "check")} in doubt`,
    spared === 0 ? "." : `; ${count(spared, "check")} spared.`,
  ],
  "netlist.kept": ({ code, letter, number, nets }, { who, netlists }) => [
    who,
    " took ",
    netlists(`netlist ${number} of ${code} rev ${letter}`, code),
    ` with ${count(nets, "net")}.`,
  ],
  "probing.started": ({ serial, probes }, { who, unit, probing }) => [
    who,
    " started ",
    probing("a round of probing"),
    " of ",
    unit(serial),
    `: ${count(probes, "probe")}.`,
  ],
  "probing.closed": ({ serial, said }, { who, unit, probing }) => [
    who,
    " closed ",
    probing("a round of probing"),
    " of ",
    unit(serial),
    `: ${endSentence(said)}`,
  ],
  "punch.taken": ({ code, letter, items }, { who, punchList }) => [
    who,
    ` took ${count(items, "item")} into the `,
    punchList(code, letter),
    ".",
  ],
  "punch.dealt": ({ code, letter, item, how }, { who, punchList }) => [
    who,
    ` ticked “${item}” off the `,
    punchList(code, letter),
    `: ${endSentence(how)}`,
  ],
  "punch.reopened": ({ code, letter, item }, { who, punchList }) => [
    who,
    ` put “${item}” back on the `,
    punchList(code, letter),
    ".",
  ],
};
