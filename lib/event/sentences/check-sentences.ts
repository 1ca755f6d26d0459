import { because, count, endSentence } from "./words";
import type { Writers } from "./writer";

const VERDICTS = {
  conforms: "conforms",
  "guard-band": "conforms, inside the guard band",
  "does-not-conform": "does not conform",
} as const;

/** Procedures, travelers and what is recorded on them. */
export const CHECKS: Writers<
  "procedure" | "traveler" | "attempt" | "check" | "concession" | "hold" | "prerequisite" | "order"
> = {
  "procedure.issued": ({ code, number, note }, { who, procedure }) => [
    who,
    " issued ",
    procedure(code, number),
    because(note),
  ],
  "traveler.started": ({ serial, number }, { who, unit }) => [
    who,
    " started the traveler of ",
    unit(serial),
    ` from procedure version ${number}.`,
  ],
  "traveler.moved": ({ serial, from, to, kept, changed }, { who, unit }) => [
    who,
    " moved the traveler of ",
    unit(serial),
    ` from procedure version ${from} to ${to}: ${count(kept, "check")} kept, ${changed} changed.`,
  ],
  "attempt.recorded": ({ serial, title, verdict, reading }, { who, check, unit }) => {
    const words = VERDICTS[verdict];
    const result = reading === "" || reading === words ? words : `${reading}, ${words}`;
    return [who, " recorded ", check(title), " on ", unit(serial), `: ${endSentence(result)}`];
  },
  "attempt.voided": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " voided an attempt at ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "check.reopened": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " reopened ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "check.doubted": ({ serial, title, reason }, { check, unit }) => [
    check(title),
    " on ",
    unit(serial),
    " is in doubt",
    because(reason),
  ],
  "concession.granted": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " granted a concession for ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "concession.withdrawn": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " withdrew the concession for ",
    check(title),
    " on ",
    unit(serial),
    because(reason),
  ],
  "hold.lifted": ({ serial, title, reason }, { who, check, unit }) => [
    who,
    " lifted the hold point ",
    check(title),
    " for ",
    unit(serial),
    because(reason),
  ],
  "prerequisite.added": ({ check: title, needs }, { who, check }) => [
    who,
    " made ",
    check(title),
    ` wait for ${needs}.`,
  ],
  "prerequisite.removed": ({ check: title, needs }, { who, check }) => [
    who,
    " let ",
    check(title),
    ` no longer wait for ${needs}.`,
  ],
  "order.said": ({ board, other, rule, reason }, { who, order }) => [
    who,
    " said in the ",
    order("order of the boards"),
    rule === "needs" ? ` that ${board} waits for ${other}` : ` that ${board} may come before ${other}`,
    reason === "" ? "." : `: ${endSentence(reason)}`,
  ],
  "order.withdrawn": ({ board, other, rule }, { who, order }) => [
    who,
    " withdrew from the ",
    order("order of the boards"),
    rule === "needs" ? ` that ${board} waits for ${other}.` : ` that ${board} may come before ${other}.`,
  ],
};
