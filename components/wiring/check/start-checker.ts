import type { Machine, MachineCheck } from "@/lib/calc/interconnect";
import { checkChanged } from "./check-changed";
import type { ChangedPins, FromChecker, ToChecker } from "./check-messages";

export type Checker = {
  useMachine: (machine: Machine) => void;
  check: (pins: ChangedPins) => void;
  stop: () => void;
};

/**
 * Checks beside the page in a worker; where there is none, or it fails, on the page itself when it is idle. Only the
 * answer to the newest question is told.
 */
export function startChecker(tell: (check: MachineCheck) => void): Checker {
  let machine: Machine | undefined;
  let asked: ChangedPins | undefined;
  let run = 0;
  let worker: Worker | undefined;
  let waiting: number | undefined;

  function onPage() {
    cancelIdle(waiting);
    waiting = whenIdle(() => {
      if (machine && asked) tell(checkChanged(machine, asked));
    });
  }

  function send(message: ToChecker) {
    worker?.postMessage(message);
  }

  try {
    worker = new Worker(new URL("./check-worker.ts", import.meta.url), { type: "module" });
    worker.onmessage = ({ data }: MessageEvent<FromChecker>) => {
      if (data.run === run) tell(data.check);
    };
    worker.onerror = () => {
      worker?.terminate();
      worker = undefined;
      onPage();
    };
  } catch {
    worker = undefined;
  }

  return {
    useMachine(next) {
      machine = next;
      send({ kind: "machine", machine: next });
    },
    check(pins) {
      asked = pins;
      run += 1;
      if (worker) send({ kind: "check", run, pins });
      else onPage();
    },
    stop() {
      worker?.terminate();
      cancelIdle(waiting);
      run = -1;
    },
  };
}

/** Safari has no requestIdleCallback yet. */
const hasIdle = () => typeof window.requestIdleCallback === "function";

const whenIdle = (work: () => void): number =>
  hasIdle() ? window.requestIdleCallback(work) : window.setTimeout(work, 50);

function cancelIdle(id: number | undefined) {
  if (id === undefined) return;
  if (hasIdle()) window.cancelIdleCallback(id);
  else window.clearTimeout(id);
}
