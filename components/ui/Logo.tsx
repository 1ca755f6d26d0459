/** A backplane with three cards in it, one of them not yet there in full. */
export function Logo({ size = 28 }: { size?: number }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 28 28" width={size} height={size} className="shrink-0">
      <path d="M3 2h5v24H3z" fill="var(--copper)" />
      <path d="M5 5.5h1v4H5zM5 12h1v4H5zM5 18.5h1v4H5z" fill="var(--sheet)" />
      <path d="M8 4h17v7H8z" fill="var(--ink)" />
      <path d="M8 13h11v3H8z" fill="var(--copper)" />
      <path d="M8.75 18.75h15.5v5.5H8.75z" fill="none" stroke="var(--ink)" strokeWidth="1.5" />
    </svg>
  );
}
