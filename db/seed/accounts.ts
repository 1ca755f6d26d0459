import type { Role } from "../schema/projects";

export type DemoAccount = { name: string; email: string; password: string; role: Role; does: string };

/** Invented people of the tide computer, one for each role. Seeded and offered in demo mode only. */
export const DEMO_ACCOUNTS: readonly DemoAccount[] = [
  {
    name: "Maud Okonedo",
    email: "maud@tide.example",
    password: "springs-and-neaps",
    role: "maintainer",
    does: "writes the procedures, reopens checks, invites people",
  },
  {
    name: "Bram Tielen",
    email: "bram@tide.example",
    password: "slack-water-bench",
    role: "builder",
    does: "walks travelers at the bench, records readings and photos",
  },
  {
    name: "Ines Farrow",
    email: "ines@tide.example",
    password: "harbour-wall-log",
    role: "collaborator",
    does: "follows along and gets the weekly e-mail",
  },
];
