import type { ReactNode } from "react";
import type { PinRole } from "@/lib/calc/interconnect";

/**
 * How a role is drawn in a connector's face: a letter, and a fill of its own that differs from the others without its
 * colour, too (solid, hatch one way, the other way, crossed, dots, lines, none).
 */
export type PinLook = { letter: string; hue: string; isSolid?: true; pattern?: ReactNode };

/** Patterns are drawn on a square of one unit, the hue is the current colour. */
export const PIN_LOOKS: Record<PinRole, PinLook> = {
  power: { letter: "P", hue: "text-failed", isSolid: true },
  ground: { letter: "G", hue: "text-ink", isSolid: true },
  "push-pull output": {
    letter: "O",
    hue: "text-ink-soft",
    pattern: <path d="M-.25.25.25-.25M0 1 1 0M.75 1.25 1.25.75" />,
  },
  "three-state output": {
    letter: "T",
    hue: "text-passed",
    pattern: <path d="M0 1 1 0M0 0 1 1M-.25.25.25-.25M.75 1.25 1.25.75M.75-.25 1.25.25M-.25.75.25 1.25" />,
  },
  "open-drain output": {
    letter: "D",
    hue: "text-reopened",
    pattern: <circle cx=".5" cy=".5" r=".24" fill="currentColor" stroke="none" />,
  },
  input: { letter: "I", hue: "text-conceded", pattern: <path d="M0 .5H1" /> },
  bidirectional: { letter: "B", hue: "text-doubtful", pattern: <path d="M.5 0V1" /> },
  passive: { letter: "C", hue: "text-ink-faint" },
  "no connection": { letter: "×", hue: "text-ink-faint" },
};

/** The patterns of the roles that a drawing shows, under ids of its own. */
export function PinPatterns({ id, unit, roles }: { id: string; unit: number; roles: readonly PinRole[] }) {
  return (
    <defs>
      {roles.map((role) => {
        const { pattern, hue } = PIN_LOOKS[role];
        if (!pattern) return null;
        return (
          <pattern
            key={role}
            id={patternId(id, role)}
            width="1"
            height="1"
            patternUnits="userSpaceOnUse"
            patternTransform={`scale(${unit * 0.24})`}
            className={hue}
            fill="none"
            stroke="currentColor"
            strokeWidth=".2"
          >
            {pattern}
          </pattern>
        );
      })}
    </defs>
  );
}

export const patternId = (id: string, role: PinRole): string => `${id}-${role.replace(/\W/g, "-")}`;
