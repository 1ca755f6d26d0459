import clsx from "clsx";

const SIZES = { sm: "size-6 text-[0.625rem]", md: "size-8 text-xs", lg: "size-11 text-sm" };

/** Initials on solder mask. The name stands beside it or is given by the control around it. */
export function Avatar({
  name,
  size = "md",
  className,
}: {
  name: string;
  size?: keyof typeof SIZES;
  className?: string;
}) {
  return (
    <span
      aria-hidden="true"
      className={clsx(
        "mono inline-flex shrink-0 select-none items-center justify-center rounded-md bg-mask font-semibold text-mask-ink",
        SIZES[size],
        className,
      )}
    >
      {initials(name)}
    </span>
  );
}

export function initials(name: string): string {
  const words = name
    .trim()
    .split(/[\s._@-]+/u)
    .filter(Boolean);
  const letters = [words[0], words.length > 1 ? words.at(-1) : undefined].map(
    (word) => Array.from(word ?? "")[0] ?? "",
  );
  return letters.join("").toLocaleUpperCase("en-GB") || "?";
}
