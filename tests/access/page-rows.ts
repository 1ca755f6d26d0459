import type { Permission } from "@/lib/access/permissions";
import type { Place } from "./place";

export type PageRow = {
  permission: Permission | "public" | "own";
  path: (place: Place) => string;
  /** Where somebody who is signed in is sent on, when the page has nothing to say to them. */
  onward?: (place: Place) => string;
};

const of = (path: string) => (place: Place) => `/projects/${place.slug}${path}`;
const signedInGoOn = { onward: () => "/projects" };

/** Every page of the program, by its file. */
export const pages: Record<string, PageRow> = {
  "app/(public)/page.tsx": { permission: "public", path: () => "/" },
  "app/(public)/safety/page.tsx": { permission: "public", path: () => "/safety" },

  "app/(account)/(entry)/check-email/page.tsx": { permission: "public", path: () => "/check-email" },
  "app/(account)/(entry)/confirm/[token]/page.tsx": { permission: "public", path: () => `/confirm/${"c".repeat(43)}` },
  "app/(account)/(entry)/forgot/page.tsx": { permission: "public", path: () => "/forgot" },
  "app/(account)/(entry)/invitation/[token]/page.tsx": {
    permission: "public",
    path: ({ invitation }) => `/invitation/${invitation}`,
  },
  "app/(account)/(entry)/reset/[token]/page.tsx": { permission: "public", path: () => `/reset/${"r".repeat(43)}` },
  "app/(account)/(entry)/sign-in/link/page.tsx": { permission: "public", path: () => "/sign-in/link" },
  "app/(account)/(entry)/sign-in/page.tsx": { permission: "public", path: () => "/sign-in", ...signedInGoOn },
  "app/(account)/(entry)/sign-up/page.tsx": { permission: "public", path: () => "/sign-up", ...signedInGoOn },
  "app/(account)/(entry)/unsubscribe/[subscription]/[token]/page.tsx": {
    permission: "public",
    path: () => `/unsubscribe/${"0".repeat(8)}-0000-4000-8000-${"0".repeat(12)}/${"u".repeat(43)}`,
  },
  "app/(account)/settings/page.tsx": { permission: "own", path: () => "/settings" },
  "app/(account)/settings/digest/page.tsx": { permission: "own", path: () => "/settings/digest" },
  "app/(account)/settings/instruments/page.tsx": { permission: "own", path: () => "/settings/instruments" },
  "app/(account)/settings/password/page.tsx": { permission: "own", path: () => "/settings/password" },

  "app/(workshop)/projects/(mine)/page.tsx": { permission: "own", path: () => "/projects" },
  "app/(workshop)/projects/(mine)/new/page.tsx": { permission: "own", path: () => "/projects/new" },
  "app/(workshop)/projects/[project]/page.tsx": {
    permission: "project.see",
    path: of(""),
    onward: of("/rack"),
  },
  "app/(workshop)/projects/[project]/rack/page.tsx": { permission: "project.see", path: of("/rack") },
  "app/(workshop)/projects/[project]/boards/page.tsx": { permission: "project.see", path: of("/boards") },
  "app/(workshop)/projects/[project]/boards/[board]/page.tsx": { permission: "project.see", path: of("/boards/TIM") },
  "app/(workshop)/projects/[project]/boards/[board]/procedure/page.tsx": {
    permission: "project.see",
    path: of("/boards/TIM/procedure"),
  },
  "app/(workshop)/projects/[project]/boards/[board]/procedure/[number]/page.tsx": {
    permission: "project.see",
    path: of("/boards/TIM/procedure/1"),
  },
  "app/(workshop)/projects/[project]/boards/[board]/netlists/page.tsx": {
    permission: "project.see",
    path: of("/boards/TIM/netlists"),
  },
  "app/(workshop)/projects/[project]/units/[unit]/probing/page.tsx": {
    permission: "project.see",
    path: of("/units/TIM-01/probing"),
  },
  "app/(workshop)/projects/[project]/units/[unit]/probing/[plan]/page.tsx": {
    permission: "project.see",
    path: (place) => of(`/units/TIM-01/probing/${place.round}`)(place),
  },
  "app/(bench)/projects/[project]/probe/[plan]/page.tsx": {
    permission: "project.see",
    path: (place) => of(`/probe/${place.round}`)(place),
  },
  "app/(workshop)/projects/[project]/units/[unit]/page.tsx": { permission: "project.see", path: of("/units/TIM-01") },
  "app/(workshop)/projects/[project]/units/[unit]/print/page.tsx": {
    permission: "project.see",
    path: of("/units/TIM-01/print"),
  },
  "app/(workshop)/projects/[project]/bench/page.tsx": { permission: "project.see", path: of("/bench") },
  "app/(bench)/projects/[project]/bench/[unit]/page.tsx": { permission: "project.see", path: of("/bench/TIM-01") },
  "app/(workshop)/projects/[project]/wiring/families/page.tsx": {
    permission: "project.see",
    path: of("/wiring/families"),
  },
  "app/(workshop)/projects/[project]/wiring/findings/page.tsx": {
    permission: "project.see",
    path: of("/wiring/findings"),
  },
  "app/(workshop)/projects/[project]/wiring/nets/page.tsx": { permission: "project.see", path: of("/wiring/nets") },
  "app/(workshop)/projects/[project]/wiring/signals/page.tsx": {
    permission: "project.see",
    path: of("/wiring/signals"),
  },
  "app/(workshop)/projects/[project]/wiring/take/page.tsx": { permission: "wiring.edit", path: of("/wiring/take") },
  "app/(workshop)/projects/[project]/wiring/page.tsx": { permission: "project.see", path: of("/wiring") },
  "app/(workshop)/projects/[project]/order/page.tsx": { permission: "project.see", path: of("/order") },
  "app/(workshop)/projects/[project]/order/boards/page.tsx": { permission: "project.see", path: of("/order/boards") },
  "app/(workshop)/projects/[project]/order/checks/page.tsx": { permission: "project.see", path: of("/order/checks") },
  "app/(workshop)/projects/[project]/order/sessions/page.tsx": {
    permission: "project.see",
    path: of("/order/sessions"),
  },
  "app/(workshop)/projects/[project]/captures/page.tsx": { permission: "project.see", path: of("/captures") },
  "app/(workshop)/projects/[project]/parts/page.tsx": { permission: "project.see", path: of("/parts") },
  "app/(workshop)/projects/[project]/parts/boards/page.tsx": { permission: "project.see", path: of("/parts/boards") },
  "app/(workshop)/projects/[project]/parts/boards/[board]/page.tsx": {
    permission: "project.see",
    path: of("/parts/boards/TIM"),
  },
  "app/(workshop)/projects/[project]/parts/blocks/page.tsx": { permission: "project.see", path: of("/parts/blocks") },
  "app/(workshop)/projects/[project]/parts/blocks/[block]/page.tsx": {
    permission: "project.see",
    path: (place) => of(`/parts/blocks/${place.block}`)(place),
  },
  "app/(workshop)/projects/[project]/parts/logic/page.tsx": { permission: "project.see", path: of("/parts/logic") },
  "app/(workshop)/projects/[project]/parts/delay/page.tsx": { permission: "project.see", path: of("/parts/delay") },
  "app/(workshop)/projects/[project]/faults/page.tsx": { permission: "project.see", path: of("/faults") },
  "app/(workshop)/projects/[project]/faults/new/page.tsx": { permission: "fault.write", path: of("/faults/new") },
  "app/(workshop)/projects/[project]/faults/[number]/page.tsx": {
    permission: "project.see",
    path: (place) => of(`/faults/${place.fault}`)(place),
  },
  "app/(workshop)/projects/[project]/units/[unit]/reworks/page.tsx": {
    permission: "project.see",
    path: of("/units/TIM-01/reworks"),
  },
  "app/(workshop)/projects/[project]/units/[unit]/reworks/new/page.tsx": {
    permission: "rework.record",
    path: of("/units/TIM-01/reworks/new"),
  },
  "app/(workshop)/projects/[project]/units/[unit]/reworks/print/page.tsx": {
    permission: "project.see",
    path: of("/units/TIM-01/reworks/print"),
  },
  "app/(workshop)/projects/[project]/log/page.tsx": { permission: "project.see", path: of("/log") },
  "app/(workshop)/projects/[project]/log/new/page.tsx": { permission: "log.write", path: of("/log/new") },
  "app/(workshop)/projects/[project]/log/[entry]/page.tsx": {
    permission: "project.see",
    path: (place) => of(`/log/${place.entry}`)(place),
  },
  "app/(workshop)/projects/[project]/log/[entry]/edit/page.tsx": {
    permission: "log.write",
    path: (place) => of(`/log/${place.entry}/edit`)(place),
  },
  "app/(workshop)/projects/[project]/people/page.tsx": { permission: "project.see", path: of("/people") },
  "app/(workshop)/projects/[project]/digest/page.tsx": { permission: "digest.preview", path: of("/digest") },
  "app/(workshop)/projects/[project]/search/page.tsx": { permission: "project.see", path: of("/search") },
  "app/(workshop)/projects/[project]/wiring/power/page.tsx": { permission: "project.see", path: of("/wiring/power") },
  "app/(workshop)/projects/[project]/settings/page.tsx": { permission: "project.archive", path: of("/settings") },
};
