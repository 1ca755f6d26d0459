import clsx from "clsx";
import type { ReactNode } from "react";
import { StateGlyph, type GlyphState } from "./glyphs/StateGlyph";
import { Icon, type IconName } from "./Icon";
import { TONES, type Tone } from "./tone";

export type NoticeKind = "caution" | "error" | "info" | GlyphState;

type Look = { tone: Tone; icon?: IconName; role?: "alert" | "status" };

const LOOKS: Record<NoticeKind, Look> = {
  caution: { tone: "doubtful", icon: "caution" },
  error: { tone: "failed", icon: "caution", role: "alert" },
  info: { tone: "conceded", icon: "info" },
  passed: { tone: "passed", role: "status" },
  failed: { tone: "failed", role: "alert" },
  reopened: { tone: "reopened" },
  doubtful: { tone: "doubtful" },
  conceded: { tone: "conceded" },
  waiting: { tone: "waiting" },
  untested: { tone: "untested" },
};

export type NoticeProps = {
  kind: NoticeKind;
  title?: ReactNode;
  children?: ReactNode;
  /** Buttons or links that answer it. */
  actions?: ReactNode;
  /** "error" and "failed" interrupt a screen reader, "passed" waits its turn; the others are plain text unless set. */
  role?: "alert" | "status" | "note" | "none";
  className?: string;
};

/** A strip beside the thing it speaks of: bar, glyph, sentence. */
export function Notice({ kind, title, children, actions, role, className }: NoticeProps) {
  const look = LOOKS[kind];
  const shownRole = role === "none" ? undefined : (role ?? look.role);
  return (
    <div
      role={shownRole}
      className={clsx(
        "flex gap-3 rounded-r border-l-4 px-3.5 py-2.5 text-[0.9375rem] text-ink",
        TONES[look.tone].ground,
        TONES[look.tone].bar,
        className,
      )}
    >
      <Mark kind={kind} look={look} />
      <div className="flex min-w-0 flex-1 flex-col gap-1">
        {title && <p className="font-semibold">{title}</p>}
        {children && <div className="min-w-0 [&_p+p]:mt-1">{children}</div>}
        {actions && <div className="mt-1.5 flex flex-wrap gap-2">{actions}</div>}
      </div>
    </div>
  );
}

function Mark({ kind, look }: { kind: NoticeKind; look: Look }) {
  if (look.icon) return <Icon name={look.icon} size={18} className={clsx("mt-[0.15em]", TONES[look.tone].text)} />;
  if (kind === "caution" || kind === "error" || kind === "info") return null;
  return <StateGlyph state={kind} size={14} className="mt-[0.25em]" />;
}
