import type { Database } from "@/db/client";
import { instruments, users } from "@/db/schema/people";
import { hashPassword } from "@/lib/account/password";
import type { Viewer } from "@/lib/access/scope";
import { DEMO_ACCOUNTS } from "../accounts";
import { PROJECT } from "./machine";

/** The three demo people, their addresses confirmed. */
export async function writePeople(db: Database): Promise<Map<string, Viewer>> {
  const people = new Map<string, Viewer>();
  for (const account of DEMO_ACCOUNTS) {
    const [user] = await db
      .insert(users)
      .values({
        name: account.name,
        email: account.email,
        emailVerified: new Date(),
        passwordHash: await hashPassword(account.password),
        timeZone: PROJECT.timeZone,
      })
      .returning({ id: users.id });
    if (!user) throw new Error("inserting a demo person returned no row");
    people.set(account.role, {
      userId: user.id,
      email: account.email,
      name: account.name,
      emailVerified: true,
      timeZone: PROJECT.timeZone,
    });
  }
  return people;
}

const meterRange = (unit: string, fullScale: number, resolution: number, percentOfReading: number, counts: number) => ({
  unit,
  fullScale,
  resolution,
  percentOfReading,
  counts,
  percentOfRange: 0,
});

/** A 6,000-count meter with a four-wire ohm range, and a 100 MHz scope; figures of the ordinary sort, of no maker in particular. */
export async function writeInstruments(db: Database, userId: string): Promise<{ meter: string; scope: string }> {
  const [meter] = await db
    .insert(instruments)
    .values({
      userId,
      name: "Bench meter",
      kind: "meter",
      calibrationNote: "Compared with the club's reference in spring; 5 V reads 5.001 V.",
      ranges: [
        meterRange("V", 0.6, 0.0001, 0.5, 2),
        meterRange("V", 6, 0.001, 0.5, 2),
        meterRange("V", 60, 0.01, 0.5, 2),
        meterRange("A", 0.06, 0.00001, 1, 3),
        meterRange("A", 0.6, 0.0001, 1, 3),
        meterRange("A", 6, 0.001, 1.5, 5),
        meterRange("Ω", 1, 0.0001, 0.5, 5),
        meterRange("Ω", 600, 0.1, 0.8, 3),
        meterRange("Ω", 6000, 1, 0.8, 2),
        meterRange("Ω", 60_000, 10, 0.8, 2),
        meterRange("Ω", 6_000_000, 1000, 1.5, 3),
        meterRange("Ω", 60_000_000, 10_000, 3, 5),
        meterRange("Hz", 10_000, 0.001, 0.001, 1),
        meterRange("Hz", 10_000_000, 1, 0.001, 1),
      ],
    })
    .returning({ id: instruments.id });
  const [scope] = await db
    .insert(instruments)
    .values({
      userId,
      name: "Scope, 100 MHz",
      kind: "scope",
      calibrationNote: "Probe compensated every evening.",
      ranges: [
        meterRange("s", 1e-6, 1e-10, 1, 2),
        meterRange("s", 1, 1e-4, 0.5, 2),
        { unit: "V", fullScale: 0.5, resolution: 0.001, percentOfReading: 3, counts: 1, percentOfRange: 0.5 },
        { unit: "V", fullScale: 8, resolution: 0.02, percentOfReading: 3, counts: 1, percentOfRange: 0.5 },
      ],
    })
    .returning({ id: instruments.id });
  if (!meter || !scope) throw new Error("inserting a demo instrument returned no row");
  return { meter: meter.id, scope: scope.id };
}
