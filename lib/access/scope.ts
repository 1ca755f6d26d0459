import type { Role } from "@/db/schema/projects";

/** Who asks. Loaded from the session row on every request. */
export type Viewer = {
  userId: string;
  email: string;
  name: string;
  emailVerified: boolean;
  timeZone: string;
};

/** A granted look into one project. Every query takes one and filters by projectId in SQL: no grant, no row. */
export type ProjectScope = {
  projectId: string;
  slug: string;
  projectName: string;
  timeZone: string;
  decisionRule: "simple" | "guarded";
  archived: boolean;
  viewer: Viewer;
  role: Role;
};

/** A person's own things: settings, instruments, sessions. */
export type OwnScope = { viewer: Viewer };
