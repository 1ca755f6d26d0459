import clsx from "clsx";
import { useId, type ReactNode } from "react";

export type PanelProps = {
  title?: ReactNode;
  /** Beside the title, quieter: "4 of 4 hold". */
  note?: ReactNode;
  actions?: ReactNode;
  level?: 2 | 3;
  /** "none" lets a table or drawing run to the edges. */
  padding?: "md" | "none";
  className?: string;
  children: ReactNode;
};

/** A sheet of paper on the bench. With a title it is a section that assistive technology can jump to. */
export function Panel({ title, note, actions, level = 2, padding = "md", className, children }: PanelProps) {
  const id = useId();
  const Title = level === 2 ? "h2" : "h3";
  const Box = title ? "section" : "div";
  return (
    <Box
      aria-labelledby={title ? id : undefined}
      className={clsx("min-w-0 rounded-lg border border-rule bg-sheet", className)}
    >
      {(title || actions) && (
        <header
          className={clsx(
            "flex flex-wrap items-center justify-between gap-x-4 gap-y-2 px-4 pt-3.5 sm:px-5",
            padding === "none" && "pb-3",
          )}
        >
          <div className="flex flex-wrap items-baseline gap-x-3">
            {title && (
              <Title id={id} className={level === 2 ? "text-lg" : "text-base"}>
                {title}
              </Title>
            )}
            {note && <span className="text-sm text-ink-soft">{note}</span>}
          </div>
          {actions && <div className="flex flex-wrap gap-2 print:hidden">{actions}</div>}
        </header>
      )}
      <div
        className={
          padding === "md" ? clsx("px-4 pb-4 sm:px-5 sm:pb-5", title || actions ? "pt-3" : "pt-4 sm:pt-5") : ""
        }
      >
        {children}
      </div>
    </Box>
  );
}
