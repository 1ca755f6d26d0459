import { count, endSentence } from "./words";
import type { Writers } from "./writer";

/** Blocks, parts, plans and delay paths. */
export const PARTS: Writers<"block" | "part" | "plan" | "delay"> = {
  "block.created": ({ name }, { who, block }) => [who, " added the block ", block(name), "."],
  "block.edited": ({ name, outdated }, { who, block }) => [
    who,
    " changed the block ",
    block(name),
    outdated === 0 ? "." : `; ${count(outdated, "unit")} built before ${outdated === 1 ? "is" : "are"} not as it says.`,
  ],
  "block.archived": ({ name }, { who, block }) => [who, " archived the block ", block(name), "."],
  "block.restored": ({ name }, { who, block }) => [who, " restored the block ", block(name), "."],
  "part.added": ({ number }, { who, parts }) => [who, " added the part ", parts(number, "/logic"), "."],
  "part.edited": ({ number }, { who, parts }) => [who, " changed the part ", parts(number, "/logic"), "."],
  "part.stocked": ({ number, stock, price }, { who, parts }) => [
    who,
    " wrote down ",
    parts(number),
    `: ${stock} in stock, ${price === "" ? "no price" : `${price} each`}.`,
  ],
  "part.archived": ({ number }, { who, parts }) => [who, " archived the part ", parts(number, "/logic"), "."],
  "part.restored": ({ number }, { who, parts }) => [who, " restored the part ", parts(number, "/logic"), "."],
  "plan.edited": ({ code, what }, { who, parts }) => [
    who,
    " changed the ",
    parts(`plan of ${code}`, `/boards/${encodeURIComponent(code)}`),
    `: ${endSentence(what)}`,
  ],
  "plan.spares": ({ percent }, { who, parts }) => [who, " set the ", parts("spares to order"), ` to ${percent} %.`],
  "plan.conditions": ({ what }, { who, wiring }) => [
    who,
    " changed the ",
    wiring("conditions of the plan", "/power"),
    `: ${endSentence(what)}`,
  ],
  "delay.created": ({ name }, { who, parts }) => [who, " added the delay path ", parts(name, "/delay"), "."],
  "delay.edited": ({ name }, { who, parts }) => [who, " changed the delay path ", parts(name, "/delay"), "."],
  "delay.archived": ({ name }, { who, parts }) => [who, " archived the delay path ", parts(name, "/delay"), "."],
  "delay.restored": ({ name }, { who, parts }) => [who, " restored the delay path ", parts(name, "/delay"), "."],
};
