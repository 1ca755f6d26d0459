import { because, count, endSentence } from "./words";
import type { Writers } from "./writer";

/** Connectors, pin maps, findings, signals, families and power. */
export const WIRING: Writers<"connector" | "pin-map" | "finding" | "signal" | "family" | "rail" | "power"> = {
  "connector.added": ({ code, reference }, { who, pinMap }) => [
    who,
    " added the connector ",
    pinMap(code, reference),
    ".",
  ],
  "connector.edited": ({ code, reference }, { who, pinMap }) => [
    who,
    " changed the connector ",
    pinMap(code, reference),
    ".",
  ],
  "connector.removed": ({ code, reference, pins }, { who, wiring }) => [
    who,
    ` removed the connector ${code} ${reference} with ${count(pins, "pin")} from `,
    wiring("the wiring"),
    ".",
  ],
  "pin-map.edited": ({ code, reference, pins }, { who, pinMap }) => [
    who,
    ` changed ${count(pins, "pin")} of `,
    pinMap(code, reference),
    ".",
  ],
  "pin-map.copied": ({ code, reference, to, pins }, { who, pinMap }) => [
    who,
    ` copied ${count(pins, "pin")} of `,
    pinMap(code, reference),
    ` to ${to.join(", ")}.`,
  ],
  "finding.accepted": ({ title, reason }, { who, wiring }) => [
    who,
    " accepted the finding ",
    wiring(`“${title}”`, "/findings"),
    because(reason),
  ],
  "finding.acceptance-withdrawn": ({ title, reason }, { who, wiring }) => [
    who,
    " no longer accepts the finding ",
    wiring(`“${title}”`, "/findings"),
    because(reason),
  ],
  "signal.saved": ({ name }, { who, wiring }) => [who, " said more of the signal ", wiring(name, "/signals"), "."],
  "signal.removed": ({ name }, { who, wiring }) => [
    who,
    " took away what was said of the signal ",
    wiring(name, "/signals"),
    ".",
  ],
  "family.saved": ({ name }, { who, wiring }) => [
    who,
    " kept own figures of the family ",
    wiring(name, "/families"),
    ".",
  ],
  "family.removed": ({ name }, { who, wiring }) => [
    who,
    " removed the own figures of the family ",
    wiring(name, "/families"),
    ".",
  ],
  "rail.saved": ({ name, isNew }, { who, wiring }) => [
    who,
    isNew ? " added the rail " : " changed the rail ",
    wiring(name, "/power"),
    ".",
  ],
  "rail.removed": ({ name }, { who, wiring }) => [who, " removed the rail ", wiring(name, "/power"), "."],
  "power.line-saved": ({ code, what }, { who, wiring }) => [
    who,
    " wrote down what ",
    wiring(code, `/power?board=${encodeURIComponent(code)}`),
    ` draws: ${endSentence(what)}`,
  ],
  "power.line-removed": ({ code, what }, { who, wiring }) => [
    who,
    " took a line off what ",
    wiring(code, `/power?board=${encodeURIComponent(code)}`),
    ` draws: ${endSentence(what)}`,
  ],
};
