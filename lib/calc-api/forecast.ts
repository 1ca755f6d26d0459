import { z } from "zod";
import { forecast as forecastWork, inferSessions } from "@/lib/calc/forecast";
import { defineCalculation, type Outcome } from "./define-calculation";
import { name } from "./fields";

const MOST_EVENTS = 20_000;
const DAY_MS = 86_400_000;

/** From 1970 to the year 2200. */
const instant = z.int().min(0).max(7_258_118_400_000).describe("Milliseconds since 1970, UTC.");

const event = z.strictObject({
  atMs: instant,
  checkId: name,
  what: z.enum(["conforms", "does-not-conform", "conceded", "withdrawn", "doubtful", "reopened"]),
  builder: name
    .default("somebody")
    .describe("Who did it: attempts of one builder that lie close together are a session."),
});

const input = z.strictObject({
  events: z.array(event).max(MOST_EVENTS).describe("What happened to the checks, in any order."),
  remaining: z.int().min(0).max(1_000_000).describe("Checks that do not hold now."),
  nowMs: instant,
  gapS: z.int().min(60).max(86_400).default(5400).describe("A longer gap between attempts ends a session, s."),
  seed: z.int().min(0).max(4_294_967_295).default(1).describe("The same seed gives the same dates."),
});

const START_MS = Date.UTC(2026, 8, 1, 18);

export const forecast = defineCalculation({
  name: "forecast",
  about: "By when the checks that are left will hold: in half of all re-drawn histories, and in 85 of 100.",
  source: "Bootstrap over the weeks of the past: Efron, Ann. Statist. 7, 1979. The paper was not opened.",
  leavesOut: "Checks that will still be added, and that weeks follow each other with reason.",
  most: `${MOST_EVENTS} events; of them the last 26 weeks are drawn from.`,
  input,
  example: {
    events: Array.from({ length: 12 }, (_, index) => ({
      atMs: START_MS + Math.floor(index / 2) * 5 * DAY_MS + (index % 2) * 600_000,
      checkId: `check ${index + 1}`,
      what: "conforms" as const,
      builder: "ada",
    })),
    remaining: 20,
    nowMs: START_MS + 30 * DAY_MS,
  },
  run: ({ events, remaining, nowMs, gapS, seed }): Outcome => {
    const attempts = events.filter(({ what }) => what === "conforms" || what === "does-not-conform");
    const sessions = inferSessions(
      // What stage it was does not matter to where a session begins.
      attempts.map(({ atMs, checkId, builder }) => ({ atMs, checkId, builder, stage: "function" as const })),
      { gapS },
    );
    return { ok: true, result: forecastWork({ events, sessions, remaining, nowMs, seed }) };
  },
});
