import { database } from "@/db/client";
import { findStandingChecks } from "@/db/queries/travelers";
import { findWorkHistory } from "@/db/queries/work-history";
import type { ProjectScope } from "@/lib/access/scope";
import { loadBenchSessions } from "@/lib/bench-session/load-bench-sessions";
import { holds } from "@/lib/calc/check-graph";
import { orderChecks, scheduleChecks, type Schedule } from "@/lib/calc/sequence";
import { standingFromRow } from "@/lib/check/standing-from-row";
import { forecastWork } from "@/lib/forecast/forecast-work";
import { sayForecast } from "@/lib/forecast/say-forecast";
import { readEvening } from "./read-evening";
import type { CheckName, NowLine, PlannedLine, TonightView } from "./tonight-view";

type Asked = { time: string; builders: 1 | 2 };

const MOST_NOW = 12;

/** What to do next and why, for the time there is; with one's own pace where it is known. */
export async function loadTonight(scope: ProjectScope, { time, builders }: Asked, now = new Date()) {
  const db = database();
  const [rows, sessions, history] = await Promise.all([
    findStandingChecks(db, scope.projectId),
    loadBenchSessions(scope, now),
    findWorkHistory(db, scope),
  ]);
  const checks = rows.map(standingFromRow);
  const byId = new Map(checks.map((check) => [check.id, check]));
  const named = (checkId: string): CheckName[] => {
    const check = byId.get(checkId);
    return check ? [{ checkId, serial: check.serial, title: check.title, stage: check.stage, state: check.state }] : [];
  };
  const { paces, running, paceLines } = sessions;
  const order = orderChecks(checks, paces);
  const evening = readEvening(time);
  const schedule = evening.ok ? scheduleChecks(checks, { builders, seconds: evening.seconds }, paces) : undefined;
  const openById = new Map(order.ok ? order.value.open.map((open) => [open.checkId, open]) : []);
  const nowIds = order.ok ? order.value.now : [];
  const critical = order.ok ? order.value.critical : null;
  const remaining = checks.filter(({ state }) => !holds(state)).length;
  const found = forecastWork({ projectId: scope.projectId, history, remaining, now });
  const view: TonightView = {
    ...{ time, builders, timeError: evening.ok ? null : evening.message },
    plan: schedule?.ok ? planOf(schedule.value, builders, named) : null,
    now: nowIds.slice(0, MOST_NOW).flatMap((id) =>
      named(id).map((name): NowLine => {
        const { reason = "", holdsBack = 0 } = openById.get(id) ?? {};
        return { ...name, reason, holdsBack, expectedS: paces[name.stage] };
      }),
    ),
    moreNow: Math.max(0, nowIds.length - MOST_NOW),
    ...{ open: remaining, total: checks.length },
    critical: critical && {
      sentence: critical.sentence,
      steps: critical.steps.flatMap(({ checkId, expectedS }) => named(checkId).map((name) => ({ ...name, expectedS }))),
    },
    circle: order.ok ? null : order.message,
    outlook: checks.length === 0 ? null : sayForecast(found, scope.viewer.timeZone),
  };
  return { view, running, paceLines };
}

function planOf({ lines, sentence }: Schedule, builders: 1 | 2, named: (id: string) => CheckName[]) {
  const listOf = (number: 1 | 2) =>
    lines
      .filter(({ builder }) => builder === number)
      .flatMap(({ checkId, startS, endS, reason }) =>
        named(checkId).map((name): PlannedLine => ({ ...name, startS, endS, reason })),
      );
  return { lists: builders === 1 ? [listOf(1)] : [listOf(1), listOf(2)], sentence };
}
