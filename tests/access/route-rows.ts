import { randomUUID } from "node:crypto";
import type { Permission } from "@/lib/access/permissions";
import { pinList, said, SIX_NETS } from "../support/probing";
import type { Place } from "./place";

type Asking = { path: string; data?: object; headers?: Record<string, string> };

export type RouteRow = {
  permission: Permission | "public";
  ask: (place: Place) => Asking;
  /** What those get who may. */
  status: number;
};

const of = (place: Place, path: string) => `/api/projects/${place.slug}${path}`;

/** Every method of every route handler, by "METHOD file". */
export const routes: Record<string, RouteRow> = {
  "GET app/api/auth/[...nextauth]/route.ts": {
    permission: "public",
    // A link that was never sent; only who holds a good one gets in.
    ask: () => ({ path: "/api/auth/callback/link?email=a%40example.org&token=none" }),
    status: 302,
  },
  "GET app/api/health/route.ts": { permission: "public", ask: () => ({ path: "/api/health" }), status: 200 },
  "GET app/api/health/live/route.ts": { permission: "public", ask: () => ({ path: "/api/health/live" }), status: 204 },
  "POST app/api/projects/[project]/attempts/route.ts": {
    permission: "attempt.record",
    ask: (place) => ({
      path: of(place, "/attempts"),
      data: {
        id: randomUUID(),
        checkId: place.checks.untested,
        performedAt: new Date().toISOString(),
        record: { conforms: true },
      },
    }),
    status: 200,
  },
  "GET app/api/projects/[project]/files/[file]/route.ts": {
    permission: "project.see",
    ask: (place) => ({ path: of(place, `/files/${place.file}`) }),
    // The row is there, its object is not: the store is asked, so the permission was granted.
    status: 410,
  },
  "POST app/api/projects/[project]/netlists/route.ts": {
    permission: "wiring.edit",
    ask: (place) => ({
      path: of(place, "/netlists"),
      data: { writeId: randomUUID(), revisionId: place.board.revisionId, given: pinList(SIX_NETS) },
    }),
    status: 200,
  },
  "GET app/api/projects/[project]/probings/[plan]/results/route.ts": {
    permission: "project.see",
    ask: (place) => ({ path: of(place, `/probings/${place.round}/results`) }),
    status: 200,
  },
  "POST app/api/projects/[project]/probings/[plan]/results/route.ts": {
    permission: "attempt.record",
    ask: (place) => ({
      path: of(place, `/probings/${place.round}/results`),
      data: { results: [said(0, true)], voids: [] },
    }),
    status: 200,
  },
  "GET app/api/projects/[project]/pin-map/route.ts": {
    permission: "project.see",
    ask: (place) => ({ path: of(place, "/pin-map") }),
    status: 200,
  },
  "GET app/api/projects/[project]/parts-list/route.ts": {
    permission: "project.see",
    ask: (place) => ({ path: of(place, "/parts-list") }),
    status: 200,
  },
  "GET app/api/projects/[project]/search/route.ts": {
    permission: "project.see",
    ask: (place) => ({ path: of(place, "/search?q=clock") }),
    status: 200,
  },
  "GET app/api/projects/[project]/units/[unit]/traveler/route.ts": {
    permission: "project.see",
    ask: (place) => ({ path: of(place, "/units/TIM-01/traveler") }),
    status: 200,
  },
  "GET app/api/v1/calc/[calculation]/route.ts": {
    permission: "public",
    ask: () => ({ path: "/api/v1/calc/conformity" }),
    status: 200,
  },
  "POST app/api/v1/calc/[calculation]/route.ts": {
    permission: "public",
    ask: () => ({ path: "/api/v1/calc/conformity", data: { reading: 4.98, limits: { lower: 4.75, upper: 5.25 } } }),
    status: 200,
  },
  "POST app/api/unsubscribe/[subscription]/[token]/route.ts": {
    permission: "public",
    // The mail's address is the proof; one that was made up ends nothing.
    ask: () => ({ path: `/api/unsubscribe/${randomUUID()}/${"u".repeat(43)}` }),
    status: 404,
  },
  "POST app/api/uploadthing/route.ts": {
    permission: "evidence.attach",
    ask: (place) => ({
      path: "/api/uploadthing?actionType=upload&slug=evidence",
      data: {
        files: [{ name: "bench.png", size: 1000, type: "image/png" }],
        input: { project: place.slug, uploadId: randomUUID(), kinds: ["photo"], checkId: place.checks.untested },
      },
    }),
    status: 200,
  },
};
