import { forecastWork } from "@/lib/forecast/forecast-work";
import { sayForecast } from "@/lib/forecast/say-forecast";
import type { ProjectWeek, Span } from "./project-week";

/** "When will it run? About 9 evenings left: …"; empty while no traveler was started and when everything holds. */
export function outlookSentence({ project, checks, history }: ProjectWeek, { until }: Span, zone: string): string {
  const remaining = checks.filter(({ state }) => state !== "passed" && state !== "conceded").length;
  if (remaining === 0) return "";
  const found = forecastWork({ projectId: project.id, history, remaining, now: until });
  return `When will it run? ${sayForecast(found, zone).line}`;
}
