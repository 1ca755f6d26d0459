import clsx from "clsx";
import { glyphRuns } from "./glyph-runs";
import { MiniGlyph } from "./MiniGlyph";
import { GLYPH_STATES, STATE_TEXT, type GlyphState } from "./StateGlyph";

export type StripGroup = { name: string; states: readonly GlyphState[] };

export type StageStripProps = {
  groups: readonly StripGroup[];
  /** Room for so many checks in each group, the same for every strip that stands in one column with others. */
  room?: readonly number[];
  /** The one check that is next: index of the group and of the check in it. */
  marked?: { group: number; check: number };
  /** "fill" shares the width as a table does; "flow" wraps, for phones and narrow panels. */
  layout?: "fill" | "flow";
  className?: string;
};

/** What a group is about, worst first: it colours its rule, its name and its figure. */
const WEIGHT: readonly GlyphState[] = ["failed", "reopened", "doubtful"];

const RULES: Record<GlyphState, string> = {
  passed: "border-l-passed",
  failed: "border-l-failed",
  reopened: "border-l-reopened",
  doubtful: "border-l-doubtful",
  waiting: "border-l-rule-strong",
  untested: "border-l-rule-strong",
  conceded: "border-l-passed",
};

const holds = (state: GlyphState) => state === "passed" || state === "conceded";

/** Words for a screen reader: "Continuity: 7 of 9 hold, 2 doubtful". */
export function stripWords(group: StripGroup): string {
  const counts = GLYPH_STATES.filter((state) => !holds(state)).flatMap((state) => {
    const count = group.states.filter((entry) => entry === state).length;
    return count > 0 ? [`${count} ${state}`] : [];
  });
  const held = group.states.filter(holds).length;
  return [`${group.name}: ${held} of ${group.states.length} hold`, ...counts].join(", ");
}

export function StageStrip({ groups, room, marked, layout = "fill", className }: StageStripProps) {
  return (
    <ul
      className={clsx(
        "flex flex-wrap gap-y-2.5",
        layout === "fill" ? "gap-x-3 sm:grid" : "gap-x-2 sm:gap-x-3",
        className,
      )}
      style={
        layout === "fill"
          ? {
              gridTemplateColumns: groups
                .map((group, index) => columnWidth(room?.[index] ?? group.states.length))
                .join(" "),
            }
          : undefined
      }
    >
      {groups.map((group, index) => (
        <StripColumn key={group.name} group={group} marked={marked?.group === index ? marked.check : undefined} />
      ))}
    </ul>
  );
}

/** Room in proportion to the checks, never narrower than the name. */
const columnWidth = (checks: number) => `minmax(4.25rem, ${Math.max(checks, 4)}fr)`;

function StripColumn({ group, marked }: { group: StripGroup; marked: number | undefined }) {
  const held = group.states.filter(holds).length;
  const trouble = WEIGHT.find((state) => group.states.includes(state));
  const mood = trouble ?? (held === group.states.length && held > 0 ? "passed" : "untested");
  const emphasis = trouble ? clsx(STATE_TEXT[trouble], "font-semibold") : "text-ink-soft";
  return (
    <li className={clsx("flex min-w-0 flex-col gap-1.5 border-l-2 pl-1.5 leading-none sm:pl-2", RULES[mood])}>
      <span className="sr-only">{stripWords(group)}</span>
      <span aria-hidden="true" className={clsx("text-2xs leading-none", emphasis)}>
        {group.name}
      </span>
      <span aria-hidden="true" className="flex min-h-3 flex-wrap gap-x-[2px] gap-y-1">
        {glyphRuns(group.states, marked).map(({ start, ...run }) => (
          <MiniGlyph key={start} {...run} />
        ))}
      </span>
      <span aria-hidden="true" className={clsx("mono text-xs leading-none", emphasis)}>
        {held}/{group.states.length}
      </span>
    </li>
  );
}
