"use client";

import { useMemo, useState } from "react";
import type { RoundView } from "@/lib/probing/round-view";
import { isGood } from "../said-words";
import { readTyped } from "./read-typed";
import { useResults } from "./use-results";
import { nextOpen, placeOf, walkOf, type Half } from "./walk";

type Asked = { project: string; round: RoundView; userId: string };

/** Where one is on the walk, and what an answer does: it is said, and the next open probe comes up. */
export function useProbing({ project, round, userId }: Asked) {
  const count = round.probes.length;
  const results = useResults({ project, round, userId });
  const { said } = results;
  const [half, setHalf] = useState<Half>("all");
  const isAnswered = (probe: number) => said.has(probe);
  const [current, setCurrent] = useState(() => {
    const answered = new Set(round.results.map(({ probe }) => probe));
    return nextOpen(count, "all", (probe) => answered.has(probe), -1) ?? count - 1;
  });
  const [last, setLast] = useState<number>();
  const [trail, setTrail] = useState<readonly number[]>([]);
  const [typed, setTyped] = useState("");
  const [problem, setProblem] = useState<string>();
  const probe = round.probes[current];
  const walk = walkOf(count, half);
  const place = placeOf(count, half, current) ?? 0;

  const goTo = (number: number) => {
    setCurrent(number);
    setTyped("");
    setProblem(undefined);
  };

  function answer(given: { beeps: boolean } | { typed: string }) {
    if (!probe) return;
    const text = "typed" in given ? given.typed.trim() : "";
    if ("typed" in given) {
      const read = readTyped(text);
      if (!read.ok) return setProblem(read.sentence);
    }
    results.say({
      id: crypto.randomUUID(),
      probe: current,
      beeps: "beeps" in given ? given.beeps : null,
      typed: text,
      performedAt: new Date().toISOString(),
    });
    setLast(current);
    setTrail((before) => [...before.filter((number) => number !== current), current]);
    const next = nextOpen(count, half, (number) => number === current || said.has(number), place);
    goTo(next ?? current);
  }

  /** To the one answered before on this device, or to the one before on the walk; answering it again corrects it. */
  function back() {
    const at = trail.indexOf(current);
    const before = at === -1 ? trail.at(-1) : trail[at - 1];
    goTo(before ?? walk.at(Math.max(0, place - 1)));
  }

  function changeHalf(next: Half) {
    setHalf(next);
    const open = nextOpen(count, next, isAnswered, -1);
    goTo(open ?? walkOf(count, next).at(0));
  }

  const done = useMemo(() => {
    let [answered, wrong] = [0, 0];
    for (const [number, one] of said) {
      if (placeOf(count, half, number) !== undefined) answered += 1;
      const planned = round.probes[number];
      if (planned && !isGood(planned, one, round.limits)) wrong += 1;
    }
    return { answered, wrong };
  }, [said, half, count, round.probes, round.limits]);

  return {
    ...{ half, changeHalf, current, probe, last, typed, setTyped, problem, answer, back, results },
    next: () => goTo(walk.at(Math.min(walk.length - 1, place + 1))),
    standing: said.get(current),
    total: walk.length,
    ...done,
  };
}

export type Probing = ReturnType<typeof useProbing>;
