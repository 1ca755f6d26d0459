export type RoleName = "maintainer" | "builder" | "collaborator";

/** What each role may do, in one sentence; the whole table is lib/access/permissions.ts. */
export const ROLE_WORDS: Record<RoleName, { name: string; may: string }> = {
  maintainer: {
    name: "Maintainer",
    may: "Everything: writes procedures, reopens checks, grants concessions, edits boards, invites people.",
  },
  builder: {
    name: "Builder",
    may: "Records checks at the bench, attaches photos and captures, writes log entries, places units in slots.",
  },
  collaborator: {
    name: "Collaborator",
    may: "Sees everything and gets the weekly e-mail. Changes nothing.",
  },
};

export const ROLE_OPTIONS = (["collaborator", "builder", "maintainer"] as const).map((id) => ({
  id,
  label: ROLE_WORDS[id].name,
  description: ROLE_WORDS[id].may,
}));
