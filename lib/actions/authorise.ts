import { database } from "@/db/client";
import { grant } from "@/lib/access/grant";
import type { Permission, Requirement } from "@/lib/access/permissions";
import type { OwnScope, ProjectScope, Viewer } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "./answer";

export type PublicScope = { viewer?: Viewer };

/** What a use case is handed, by what it requires. */
export type ScopeFor<Need extends Requirement> = Need extends "public"
  ? PublicScope
  : Need extends "own"
    ? OwnScope
    : ProjectScope;

/** Turns the viewer and the named project into the scope that the requirement promises, or says why not. */
export async function authorise(need: Requirement, viewer: Viewer | undefined, slug: string | undefined) {
  if (need === "public") return ok({ viewer });
  if (!viewer) return refuse("signed-out", "Sign in first. What you typed is still here.");
  if (need === "own") return ok({ viewer });
  return grantProject(viewer, slug, need);
}

async function grantProject(viewer: Viewer, slug: string | undefined, need: Permission): Promise<Answer<ProjectScope>> {
  if (!slug) return refuse("invalid", "The project is missing.", { fields: { project: "Name the project." } });
  return grant(database(), viewer, slug, need);
}
