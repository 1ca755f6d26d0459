import { useEffect, useState } from "react";

/** Whether one's own attempt is young enough to void; false until known in the browser, and again when time is up. */
export function useMayStillVoid(recordedAt: string | undefined, windowMs: number): boolean {
  const [may, setMay] = useState(false);
  useEffect(() => {
    if (!recordedAt) return;
    const left = Date.parse(recordedAt) + windowMs - Date.now();
    if (left <= 0) return;
    const begin = setTimeout(() => setMay(true));
    const end = setTimeout(() => setMay(false), left);
    return () => {
      clearTimeout(begin);
      clearTimeout(end);
    };
  }, [recordedAt, windowMs]);
  return may;
}
