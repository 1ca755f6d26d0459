"use client";

import { useEffect, useRef, useState } from "react";
import type { Machine, MachineCheck } from "@/lib/calc/interconnect";
import type { ChangedPins } from "./check-messages";
import { startChecker, type Checker } from "./start-checker";

/** Long enough that a word is typed before it is checked, short enough to feel at once. */
const PAUSE_MS = 120;

/** The newest answer of the rule check over the machine and what was typed; undefined until the first one. */
export function useMachineCheck(machine: Machine, changed: ChangedPins): MachineCheck | undefined {
  const [check, setCheck] = useState<MachineCheck>();
  const checker = useRef<Checker>(undefined);
  const isFirst = useRef(true);

  useEffect(() => {
    const started = startChecker(setCheck);
    checker.current = started;
    isFirst.current = true;
    return () => started.stop();
  }, []);

  useEffect(() => checker.current?.useMachine(machine), [machine]);

  useEffect(() => {
    const pause = isFirst.current ? 0 : PAUSE_MS;
    isFirst.current = false;
    const waiting = setTimeout(() => checker.current?.check(changed), pause);
    return () => clearTimeout(waiting);
  }, [machine, changed]);

  return check;
}
