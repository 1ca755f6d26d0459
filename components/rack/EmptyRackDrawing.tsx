/** A spine with three places for cards, none taken. */
export function EmptyRackDrawing() {
  return (
    <svg aria-hidden="true" viewBox="0 0 96 72" width="96" height="72" fill="none" stroke="currentColor">
      <path d="M8 2h8v68H8z" fill="var(--mask)" stroke="none" />
      <path d="M20.5 6.500h68v14h-68zM20.500 29.500h68v14h-68zM20.500 52.500h68v14h-68z" strokeDasharray="3 2.500" />
      <path d="M13 9.500h6v8h-6zM13 32.500h6v8h-6zM13 55.500h6v8h-6z" fill="var(--sheet)" />
    </svg>
  );
}
