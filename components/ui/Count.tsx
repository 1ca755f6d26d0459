import clsx from "clsx";

/** A small figure beside a word, e.g. how many are open. Nothing for zero. */
export function Count({ value, tone = "soft", label }: { value: number; tone?: "soft" | "failed"; label?: string }) {
  if (value === 0) return null;
  return (
    <span className={clsx("mono text-xs font-semibold", tone === "failed" ? "text-failed" : "text-ink-soft")}>
      {value}
      {label && <span className="sr-only"> {label}</span>}
    </span>
  );
}
