type PinProps = {
  x: number;
  y: number;
  /** The pitch: how much room a pin has to itself. */
  room: number;
  isLit: boolean;
  isMarked: boolean;
  isLying: boolean;
  onPoint?: () => void;
};

export function ConnectorPin({ x, y, room, isLit, isMarked, isLying, onPoint }: PinProps) {
  const [width, height] = isLying ? [5, 7] : [7, 5];
  if (!isLit) {
    return (
      <rect
        x={x - width / 2}
        y={y - height / 2}
        width={width}
        height={height}
        rx="0.75"
        className="fill-sheet stroke-edge"
        strokeWidth="0.75"
      />
    );
  }
  const ring = isMarked ? 3.5 : 2;
  return (
    <g className="fill-copper stroke-copper" onPointerEnter={onPoint} onPointerDown={onPoint}>
      <rect x={x - width / 2 - 0.5} y={y - height / 2 - 0.5} width={width + 1} height={height + 1} rx="1" />
      <rect
        x={x - width / 2 - ring}
        y={y - height / 2 - ring}
        width={width + 2 * ring}
        height={height + 2 * ring}
        rx={ring}
        fill="none"
        strokeWidth={isMarked ? 1.75 : 0.75}
      />
      {/* The whole pitch is sensitive: a pin is small under a finger. */}
      {onPoint && (
        <rect x={x - room / 2} y={y - room / 2} width={room} height={room} fill="transparent" stroke="none" />
      )}
    </g>
  );
}
