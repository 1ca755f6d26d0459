/** A current running along the lower edge of a pending control. */
export function Pulse() {
  return (
    <>
      <span aria-hidden="true" className="absolute inset-x-2 bottom-1 h-0.5 overflow-hidden rounded-full">
        <span className="motion-travel block h-full w-2/5 rounded-full bg-current" />
      </span>
      <span role="status" className="sr-only">
        , working
      </span>
    </>
  );
}
