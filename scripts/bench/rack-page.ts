import type postgres from "postgres";
import { makeLargeProject } from "./large-project";
import { fetchOk, timeConcurrently } from "./measure";
import { milliseconds, times, type Row } from "./row";

/** The rack of 40 boards × 60 checks with three attempts each, against the same server's page without data. */
export async function benchRackPage(app: string, cookieName: string, sql: postgres.Sql): Promise<Row[]> {
  const project = await makeLargeProject(sql, { slug: "bench-rack", boards: 40, checks: 60, attempts: 3 });
  const headers = { cookie: `${cookieName}=${project.cookie}` };
  const page = (path: string) => timeConcurrently(1, 40, () => fetchOk(`${app}${path}`, { headers }));
  const empty = await page("/safety");
  const ours = await page(`/projects/${project.slug}/rack`);
  const ratio = ours.median / empty.median;
  return [
    {
      work: "rack page, 40 boards × 60 checks with history, median",
      ours: milliseconds(ours.median),
      floor: milliseconds(empty.median),
      ratio: times(ratio),
      toReach: "4 ×",
      reached: ratio <= 4,
    },
  ];
}
