import type postgres from "postgres";
import { makeLargeProject } from "./large-project";
import { fetchOk, timeConcurrently } from "./measure";
import { milliseconds, times, type Row } from "./row";

const CLIENTS = 50;
const EACH = 30;

/** Recording over HTTP, signed in, against the same server's empty route plus the same rows in plain SQL. */
export async function benchRecordAttempt(app: string, cookieName: string, sql: postgres.Sql): Promise<Row[]> {
  const project = await makeLargeProject(sql, { slug: "bench-record", boards: CLIENTS, checks: 20, attempts: 0 });
  const checks = await sql<{ id: string; unit_id: string; procedure_check_id: string }[]>`
    select id, unit_id, procedure_check_id from checks where project_id = ${project.projectId} order by unit_id, position`;
  const checkFor = (client: number, round: number) => {
    const check = checks[client * 20 + (round % 20)];
    if (!check) throw new Error("the bench has too few checks");
    return check;
  };
  const headers = {
    "content-type": "application/json",
    cookie: `${cookieName}=${project.cookie}`,
    origin: app,
    "sec-fetch-site": "same-origin",
  };
  const empty = await timeConcurrently(CLIENTS, EACH, () => fetchOk(`${app}/api/health/live`, { headers }));
  const plain = await timeConcurrently(CLIENTS, EACH, async (client, round) => {
    const check = checkFor(client, round);
    const id = crypto.randomUUID();
    await sql.begin(async (tx) => {
      await tx`insert into writes (id, user_id, action, answer) values (${id}, ${project.userId}, 'plain', '{}')`;
      await tx`insert into attempts (id, project_id, unit_id, check_id, procedure_check_id, user_id, performed_at, verdict, record)
        values (${id}, ${project.projectId}, ${check.unit_id}, ${check.id}, ${check.procedure_check_id}, ${project.userId}, now(), 'conforms', '{"typed":"5.01"}')`;
      await tx`insert into readings (attempt_id, position, typed, value, unit, verdict) values (${id}, 0, '5.01', 5.01, 'V', 'conforms')`;
      await tx`update checks set state = 'passed', last_attempt_id = ${id}, state_since = now() where id = ${check.id}`;
      await tx`insert into events (project_id, actor_id, kind, unit_id, check_id, subject_id, payload)
        values (${project.projectId}, ${project.userId}, 'attempt.recorded', ${check.unit_id}, ${check.id}, ${id}, '{}')`;
    });
  });
  const ours = await timeConcurrently(CLIENTS, EACH, (client, round) => {
    const body = JSON.stringify({
      id: crypto.randomUUID(),
      checkId: checkFor(client, round).id,
      performedAt: new Date().toISOString(),
      record: { typed: "5.01" },
    });
    return fetchOk(`${app}/api/projects/${project.slug}/attempts`, { method: "POST", headers, body });
  });
  return (["median", "p95"] as const).map((figure) => {
    const floor = empty[figure] + plain[figure];
    const ratio = ours[figure] / floor;
    const most = figure === "median" ? 2.5 : 4;
    return {
      work: `record an attempt, ${CLIENTS} clients, ${figure}`,
      ours: milliseconds(ours[figure]),
      floor: milliseconds(floor),
      ratio: times(ratio),
      toReach: `${most} ×`,
      reached: ratio <= most,
    };
  });
}
