/** A block as an outline with smaller ones inside it; stands where there is none yet. */
export function BlockDrawing() {
  return (
    <svg
      width="88"
      height="64"
      viewBox="0 0 88 64"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
    >
      <rect x="6" y="4" width="76" height="56" strokeDasharray="4 3" />
      <rect x="16" y="13" width="24" height="16" />
      <rect x="48" y="13" width="24" height="16" />
      <rect x="16" y="36" width="24" height="16" />
      <path d="M0 20h16M40 20h8M72 20h16M0 44h16M40 44h20v-15" />
    </svg>
  );
}
