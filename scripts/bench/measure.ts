export type Times = { median: number; p95: number; count: number };

export function summarise(milliseconds: number[]): Times {
  const sorted = [...milliseconds].sort((a, b) => a - b);
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? Number.NaN;
  return { median: at(0.5), p95: at(0.95), count: sorted.length };
}

/** Runs `work` from so many clients at once, each so many times after a warm-up, and times every call. */
export async function timeConcurrently(
  clients: number,
  timesEach: number,
  work: (client: number, round: number) => Promise<void>,
  warmUp = 5,
): Promise<Times> {
  const times: number[] = [];
  await Promise.all(
    Array.from({ length: clients }, async (_, client) => {
      for (let round = -warmUp; round < timesEach; round += 1) {
        const start = performance.now();
        await work(client, round + warmUp);
        if (round >= 0) times.push(performance.now() - start);
      }
    }),
  );
  return summarise(times);
}

export async function fetchOk(url: string, init?: RequestInit): Promise<void> {
  const response = await fetch(url, init);
  const body = await response.text();
  if (!response.ok) throw new Error(`${url} answered ${response.status}: ${body.slice(0, 200)}`);
}
