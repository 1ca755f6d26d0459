/** Own drawings of the places, each the thing one looks at there. On a 20 grid. */
const MARKS = {
  rack: "M3.5 2v16M6 4.5h11v3H6zM6 12.5h8v3H6z",
  bench: "M2 12.5h16M4.5 12.5v5M15.5 12.5v5M4 9.5h6.5v3M4 9.5v3M17 2.5l-3.75 6.75",
  wiring:
    "M3 4.5h3.5M3 10h3.5M3 15.5h3.5M13.5 4.5H17M13.5 10H17M13.5 15.5H17M6.5 4.5 13.5 10M6.5 10l7 5.5M6.5 15.5l7-11",
  parts: "M5 4h10v12H5zM2 6.5h3M2 10h3M2 13.5h3M15 6.5h3M15 10h3M15 13.5h3M8.5 4v1.5h3V4",
  captures: "M2 14.5h3.5v-9H10v9h4.5v-9H18",
  faults: "M2.5 10h5l1.5-3M11 13l1.5-3h5M11.5 4.5l-3 11",
  boards: "M2.5 4.5h15v11h-15zM5.5 15.5v2M8.5 15.5v2M11.5 15.5v2M14.5 15.5v2M6 8h3.5v4H6zM13 8v4",
  settings: "M3 5.5h7M14 5.5h3M10 3.5v4h4v-4zM3 14.5h2M9 14.5h8M5 12.5v4h4v-4z",
  log: "M4 2.5h12v15H4zM7 6.5h6M7 10h6M7 13.5h3.5",
  people:
    "M7 3.5a2.75 2.75 0 1 0 0 5.5 2.75 2.75 0 0 0 0-5.5M2 16.5c0-3 2-5 5-5s5 2 5 5M13 4a2.5 2.5 0 0 1 0 5M14.5 11.75c2.2.5 3.5 2.25 3.5 4.75",
  more: "M4 10h.5M9.75 10h.5M15.5 10h.5",
} as const;

export type PlaceMarkName = keyof typeof MARKS;

export function PlaceMark({ name }: { name: PlaceMarkName }) {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 20 20"
      width="20"
      height="20"
      fill="none"
      stroke="currentColor"
      strokeWidth={name === "more" ? 2.25 : 1.5}
      strokeLinecap="square"
      className="shrink-0"
    >
      <path d={MARKS[name]} />
    </svg>
  );
}
