import { env } from "@/lib/env";

/** The full address of one of our pages; a path is encoded already. */
export const appLink = (path: string): string => new URL(path, env().APP_URL).toString();

/** Where a check stands on its traveler, opened and scrolled to. */
export function checkLink(project: string, serial: string, checkId: string): string {
  const unit = `/projects/${encodeURIComponent(project)}/units/${encodeURIComponent(serial)}`;
  return appLink(`${unit}?check=${checkId}#check-${checkId}`);
}
