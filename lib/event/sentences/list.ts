import type { EventKind } from "../schema";
import { CHECKS } from "./check-sentences";
import { FAULTS } from "./fault-sentences";
import { JOURNAL } from "./journal-sentences";
import { MACHINE } from "./machine-sentences";
import { PARTS } from "./parts-sentences";
import { PEOPLE } from "./people-sentences";
import { WIRING } from "./wiring-sentences";
import type { Writer } from "./writer";

/** One sentence a kind of event, in the past tense, with the person first. A new kind does not compile without one. */
export const WRITERS: { [Kind in EventKind]: Writer<Kind> } = {
  ...PEOPLE,
  ...MACHINE,
  ...CHECKS,
  ...JOURNAL,
  ...WIRING,
  ...PARTS,
  ...FAULTS,
};
