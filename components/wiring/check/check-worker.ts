import type { Machine } from "@/lib/calc/interconnect";
import { checkChanged } from "./check-changed";
import type { FromChecker, ToChecker } from "./check-messages";

/** Runs beside the page, so that the check of a large machine never holds up a key press. */
let machine: Machine | undefined;

self.onmessage = ({ data }: MessageEvent<ToChecker>) => {
  if (data.kind === "machine") {
    machine = data.machine;
    return;
  }
  if (!machine) return;
  const answer: FromChecker = { run: data.run, check: checkChanged(machine, data.pins) };
  self.postMessage(answer);
};
