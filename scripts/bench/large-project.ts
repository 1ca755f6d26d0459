import { createHash } from "node:crypto";
import type postgres from "postgres";

export type LargeProject = { slug: string; cookie: string; projectId: string; userId: string };

const SPEC = {
  unit: "V",
  limits: { typed: "4.75 … 5.25 V", value: { unit: "V", lower: 4.75, upper: 5.25 } },
  expected: null,
};

/**
 * A project of so many boards, each with one unit of so many reading checks, every check with `attempts` attempts; and
 * a builder who is signed in.
 */
export async function makeLargeProject(
  sql: postgres.Sql,
  size: { slug: string; boards: number; checks: number; attempts: number },
): Promise<LargeProject> {
  const { slug, boards, checks, attempts } = size;
  const [user] = await sql<{ id: string }[]>`
    insert into users (name, email, email_verified) values ('Bench', ${`${slug}@bench.example`}, now()) returning id`;
  const [project] = await sql<{ id: string }[]>`
    insert into projects (slug, name, decision_rule) values (${slug}, ${slug}, 'guarded') returning id`;
  if (!user || !project) throw new Error("the bench project was not inserted");
  const cookie = crypto.randomUUID();
  // The table keeps hashes of tokens; see sessionKey in lib/auth/session-cookie.ts.
  const key = createHash("sha256").update(cookie).digest("base64url");
  await sql`insert into memberships (project_id, user_id, role) values (${project.id}, ${user.id}, 'builder')`;
  await sql`insert into sessions (session_token, user_id, expires) values (${key}, ${user.id}, now() + interval '1 day')`;
  await sql`
    insert into boards (project_id, code, name) select ${project.id}, 'B' || n, 'Board ' || n from generate_series(1, ${boards}) n`;
  await sql`insert into revisions (board_id, letter) select id, 'A' from boards where project_id = ${project.id}`;
  await sql`
    insert into units (project_id, board_id, revision_id, serial)
    select b.project_id, b.id, r.id, b.code || '-01' from boards b join revisions r on r.board_id = b.id where b.project_id = ${project.id}`;
  await sql`
    insert into slots (project_id, position, board_id)
    select project_id, row_number() over (order by code), id from boards where project_id = ${project.id}`;
  await sql`
    insert into slot_occupancies (slot_id, unit_id)
    select s.id, u.id from slots s join units u on u.board_id = s.board_id where s.project_id = ${project.id}`;
  await sql`
    insert into procedures (board_id, number, state, issued_at) select id, 1, 'issued', now() from boards where project_id = ${project.id}`;
  await sql`
    insert into procedure_checks (procedure_id, key, position, stage, title, kind, spec, covers)
    select p.id, gen_random_uuid(), n, (array['inspection','continuity','power-on','function','integration'])[1 + (n - 1) * 5 / ${checks}::int],
      'Check ' || n, 'reading', ${sql.json(SPEC)}, '{"signals":[],"pins":[],"rails":[],"blocks":[]}'
    from procedures p join boards b on b.id = p.board_id, generate_series(1, ${checks}) n where b.project_id = ${project.id}`;
  await sql`
    insert into travelers (project_id, unit_id, procedure_id)
    select u.project_id, u.id, p.id from units u join procedures p on p.board_id = u.board_id where u.project_id = ${project.id}`;
  await sql`
    insert into checks (project_id, unit_id, traveler_id, procedure_check_id, key, position, stage, state)
    select t.project_id, t.unit_id, t.id, c.id, c.key, c.position, c.stage, ${attempts > 0 ? "passed" : "untested"}
    from travelers t join procedure_checks c on c.procedure_id = t.procedure_id where t.project_id = ${project.id}`;
  await sql`
    insert into attempts (id, project_id, unit_id, check_id, procedure_check_id, user_id, performed_at, verdict, record)
    select gen_random_uuid(), project_id, unit_id, id, procedure_check_id, ${user.id}, now(), 'conforms', '{"typed":"5.00 V"}'
    from checks, generate_series(1, ${attempts}) where project_id = ${project.id}`;
  await sql`
    update checks set last_attempt_id = (select a.id from attempts a where a.check_id = checks.id order by a.arrival desc limit 1)
    where project_id = ${project.id}`;
  await sql`analyze`;
  return { slug, cookie, projectId: project.id, userId: user.id };
}
