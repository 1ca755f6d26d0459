import { randomUUID } from "node:crypto";
import { database } from "@/db/client";
import { instruments, users, type InstrumentRange } from "@/db/schema/people";
import { grant } from "@/lib/access/grant";
import type { ProjectScope, Viewer } from "@/lib/access/scope";
import { one } from "./database";

/** A person with an address of their own, confirmed. */
export async function makeViewer({ name = "Bram", mailOnReopen = true } = {}): Promise<Viewer> {
  const email = `${name.toLowerCase().replaceAll(/\W+/g, ".")}.${randomUUID()}@example.org`;
  const user = one(
    await database()
      .insert(users)
      .values({ name, email, mailOnReopen, emailVerified: new Date() })
      .returning({ id: users.id }),
  );
  return { userId: user.id, email, name, emailVerified: true, timeZone: "UTC" };
}

/** What the person may do in the project, as every request gets it. */
export async function scopeFor(viewer: Viewer, project: { slug: string }): Promise<ProjectScope> {
  const granted = await grant(database(), viewer, project.slug, "project.see");
  if (!granted.ok) throw new Error(granted.error.message);
  return granted.value;
}

export async function makeInstrument(viewer: Viewer, ranges: InstrumentRange[] = []): Promise<string> {
  const row = one(
    await database()
      .insert(instruments)
      .values({ userId: viewer.userId, name: "Bench meter", kind: "meter", ranges })
      .returning({ id: instruments.id }),
  );
  return row.id;
}
