/** What a calculation follows and what it does not see: beside its result, small, always there. */
export function Basis({ follows, leavesOut }: { follows: string; leavesOut: string }) {
  return (
    <p className="mt-3 border-t border-rule pt-2 text-xs text-ink-soft">
      Follows {follows} Leaves out {leavesOut}
    </p>
  );
}
