import { eq } from "drizzle-orm";
import { closeDatabase, database, type Database } from "@/db/client";
import { digestSubscriptions, memberships, projects } from "@/db/schema/projects";
import { grant } from "@/lib/access/grant";
import type { Viewer } from "@/lib/access/scope";
import { nextDue } from "@/lib/digest/next-due";
import { createProject } from "@/lib/project/create-project";
import { recomputeAll } from "@/lib/check/recompute-all";
import { eveningAt, play } from "./tide/calendar";
import { granted } from "./tide/granted";
import { PROJECT } from "./tide/machine";
import { storyHappenings, type Cast } from "./tide/tell-story";
import { uploadPicture, uploadRipple, type Upload } from "./tide/upload-picture";
import { faultHappenings } from "./tide/write-faults";
import { machineHappenings } from "./tide/write-machine";
import { partsHappenings } from "./tide/write-parts";
import { powerHappenings } from "./tide/write-power";
import { probingHappenings } from "./tide/write-probing";
import { wiringHappenings } from "./tide/write-wiring";
import { logHappenings } from "./tide/write-log";
import { writeInstruments, writePeople } from "./tide/write-people";

/** Seeds the tide computer. Does nothing when it is there already. */
async function seed(db: Database, now: Date): Promise<void> {
  const [there] = await db.select({ id: projects.id }).from(projects).where(eq(projects.slug, PROJECT.slug));
  if (there) {
    console.log("The tide computer is there already.");
    return;
  }
  const people = await writePeople(db);
  const maud = person(people, "maintainer");
  const bram = person(people, "builder");
  const ines = person(people, "collaborator");

  const begun = eveningAt(now, PROJECT.startedDaysAgo, 0, PROJECT.timeZone);
  await play(db, [{ at: begun, work: () => begin(db, maud, bram, ines) }]);
  await subscribe(db, [maud, bram, ines], now);

  const scope = granted(await grant(db, maud, PROJECT.slug, "board.edit"));
  const cast = await castFor(db, { maud, bram });
  const upload: Upload = (who, target, name) =>
    name === "scope-ripple" ? uploadRipple(who, target, name) : uploadPicture(who, target, name);
  await play(db, [
    ...machineHappenings(db, scope, now),
    ...wiringHappenings(db, scope, now),
    ...partsHappenings(db, scope, now),
    ...powerHappenings(db, scope, now),
    ...storyHappenings(db, cast, now, upload),
    ...faultHappenings(db, cast, now, upload),
    ...probingHappenings(db, cast, now),
    ...logHappenings(cast, now),
  ]);

  const differences = await recomputeAll(db, scope.projectId);
  if (differences.length > 0) throw new Error(`states differ from history: ${JSON.stringify(differences.slice(0, 3))}`);
  console.log("The tide computer is seeded.");
}

async function begin(db: Database, maud: Viewer, bram: Viewer, ines: Viewer): Promise<void> {
  const { name, summary, timeZone } = PROJECT;
  const form = {
    writeId: crypto.randomUUID(),
    name,
    summary,
    timeZone,
    decisionRule: "guarded",
    layout: "tower",
  } as const;
  granted(await createProject({ viewer: maud }, form));
  await join(db, bram, "builder");
  await join(db, ines, "collaborator");
}

function person(people: Map<string, Viewer>, role: string): Viewer {
  const found = people.get(role);
  if (!found) throw new Error(`the demo has no ${role}`);
  return found;
}

async function projectId(db: Database): Promise<string> {
  const [row] = await db.select({ id: projects.id }).from(projects).where(eq(projects.slug, PROJECT.slug));
  if (!row) throw new Error("the demo project is missing");
  return row.id;
}

async function join(db: Database, viewer: Viewer, role: "builder" | "collaborator"): Promise<void> {
  await db.insert(memberships).values({ projectId: await projectId(db), userId: viewer.userId, role });
}

async function subscribe(db: Database, viewers: Viewer[], now: Date): Promise<void> {
  const due = { weekday: 7, hour: 18, zone: PROJECT.timeZone };
  const id = await projectId(db);
  const chosen = { ...due, enabled: true, nextDueAt: nextDue(due, now) };
  for (const { userId } of viewers) {
    // Whoever set up the project has one already, switched off.
    await db
      .insert(digestSubscriptions)
      .values({ projectId: id, userId, ...chosen })
      .onConflictDoUpdate({ target: [digestSubscriptions.projectId, digestSubscriptions.userId], set: chosen });
  }
}

async function castFor(db: Database, people: { maud: Viewer; bram: Viewer }): Promise<Cast> {
  const member = async (viewer: Viewer) => {
    const { meter, scope } = await writeInstruments(db, viewer.userId);
    return { scope: granted(await grant(db, viewer, PROJECT.slug, "attempt.record")), meter, scope100: scope };
  };
  return { maud: await member(people.maud), bram: await member(people.bram) };
}

seed(database(), new Date())
  .catch((error: unknown) => {
    console.error(error);
    process.exitCode = 1;
  })
  .finally(() => closeDatabase());
