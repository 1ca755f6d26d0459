import clsx from "clsx";

/** A figure under its name. */
export function Figure({ label, value, isWrong = false }: { label: string; value: string; isWrong?: boolean }) {
  return (
    <p className="min-w-0">
      <span className="block text-sm text-ink-soft">{label}</span>
      <span className={clsx("mono text-lg font-semibold", isWrong && "text-failed")}>{value}</span>
    </p>
  );
}
