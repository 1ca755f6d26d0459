/** What one stage of the tests came to. */
export type Outcome = { passed: number; failed: number; skipped: number; note?: string };

export type Stage = { name: string; run(filters: string[]): Promise<Outcome> };
export type Finished = Outcome & { name: string; seconds: number };

export const passedOne: Outcome = { passed: 1, failed: 0, skipped: 0 };
export const failedOne = (note?: string): Outcome => ({ passed: 0, failed: 1, skipped: 0, note });
export const notRun = (note: string): Outcome => ({ passed: 0, failed: 0, skipped: 1, note });

/** Runs a stage; anything it throws is its failure and not the end of the run. */
export async function runStage(stage: Stage, filters: string[]): Promise<Finished> {
  const started = Date.now();
  const outcome = await stage.run(filters).catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    return failedOne("could not run");
  });
  const finished = { ...outcome, name: stage.name, seconds: (Date.now() - started) / 1000 };
  const { passed, failed, seconds, note } = finished;
  console.log(
    `${stage.name.padEnd(12)} ${passed} passed, ${failed} failed in ${seconds.toFixed(1)} s${note === undefined ? "" : `: ${note}`}`,
  );
  return finished;
}

/** Runs stages that need nothing of each other, a few at a time, in the given order. */
export async function runTogether(stages: Stage[], filters: string[], atOnce: number): Promise<Finished[]> {
  const waiting = [...stages.entries()];
  const finished: Finished[] = [];
  const take = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) finished[next[0]] = await runStage(next[1], filters);
  };
  await Promise.all(Array.from({ length: atOnce }, take));
  return finished;
}
