import type { Permission } from "@/lib/access/permissions";
import type { Machine } from "../machine";

/** An action on a project, with what a person sends who means it: so a refusal is one of a real change. */
export type ProjectRow = { permission: Permission; input: (machine: Machine) => object | Promise<object> };

/** An action outside of projects: nobody signed in, or one's own things. */
export type PersonalRow = { permission: "public" | "own" };

export type Row = ProjectRow | PersonalRow;
/** Rows by the name under which the action is exported. */
export type Rows = Record<string, Row>;
