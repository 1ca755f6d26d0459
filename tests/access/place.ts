import { randomUUID } from "node:crypto";
import type { APIRequestContext, PlaywrightWorkerArgs } from "@playwright/test";
import type { Role } from "@/db/schema/projects";
import { tokenFor } from "@/lib/auth/token";
import { invitePerson } from "@/lib/invitation/invite-person";
import { must } from "../support/bench";
import { FULL_ADDER, keepBlock } from "../support/parts";
import { startedRound } from "../support/probing";
import { makeEvidence } from "../support/project";
import { appUrl, sessionCookie } from "../support/session";
import { makeFault, makeLogEntry, makeMachine } from "./machine";

export type Asker = Role | "stranger" | "nobody";
export const ASKERS: readonly Asker[] = ["maintainer", "builder", "collaborator", "stranger", "nobody"];

/** A machine with a log entry, a file and an open invitation: something behind every address. */
export async function makePlace() {
  const machine = await makeMachine();
  const { slug, scopes } = machine;
  const to = { email: `${randomUUID()}@example.org`, role: "builder" as const };
  const invited = await must(invitePerson(scopes.maintainer, { project: slug, writeId: randomUUID(), ...to }));
  return {
    ...machine,
    entry: await makeLogEntry(machine),
    fault: (await makeFault(machine)).number,
    block: (await must(keepBlock(scopes.maintainer, FULL_ADDER))).id,
    round: (await startedRound(scopes.maintainer, machine.unit.serial, machine.board.revisionId)).id,
    file: await makeEvidence(machine),
    invitation: tokenFor("invitation", invited.id),
  };
}

export type Place = Awaited<ReturnType<typeof makePlace>>;

/** One HTTP client for each kind of person, with nothing but their session. */
export async function makeClients(playwright: PlaywrightWorkerArgs["playwright"], place: Place) {
  const client = async (viewer?: { userId: string }): Promise<APIRequestContext> => {
    const cookie = viewer ? await sessionCookie(viewer) : undefined;
    const extraHTTPHeaders: Record<string, string> = cookie ? { cookie: `${cookie.name}=${cookie.value}` } : {};
    return playwright.request.newContext({ baseURL: appUrl, extraHTTPHeaders, maxRedirects: 0 });
  };
  const { maintainer, builder, collaborator } = place.viewers;
  return {
    maintainer: await client(maintainer),
    builder: await client(builder),
    collaborator: await client(collaborator),
    stranger: await client(place.stranger),
    nobody: await client(),
  } satisfies Record<Asker, APIRequestContext>;
}
