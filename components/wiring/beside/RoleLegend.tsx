import { useId } from "react";
import { ConnectorPin } from "@/components/ui/glyphs/ConnectorPin";
import { PinPatterns } from "@/components/ui/glyphs/pin-look";
import { PIN_ROLES, type PinRole } from "@/lib/calc/interconnect";

/** What the letters and fills of the face mean; only those that are there. */
export function RoleLegend({ roles, className }: { roles: readonly PinRole[]; className?: string }) {
  const id = useId();
  return (
    <ul className={className ?? "flex flex-wrap gap-x-3.5 gap-y-1 text-xs text-ink-soft"}>
      {PIN_ROLES.filter((role) => roles.includes(role)).map((role) => (
        <li key={role} className="flex items-center gap-1.5">
          <RoleSwatch role={role} id={`${id}-${role.slice(0, 2)}`} />
          {role}
        </li>
      ))}
    </ul>
  );
}

export function RoleSwatch({ role, id }: { role: PinRole; id: string }) {
  return (
    <svg aria-hidden="true" viewBox="-1.3 -1.05 2.6 2.1" width="21" height="17" className="shrink-0">
      <PinPatterns id={id} unit={2.54} roles={[role]} />
      <ConnectorPin x={0} y={0} room={2.54} isLying={false} isLit={false} isMarked={false} role={role} patterns={id} />
    </svg>
  );
}
