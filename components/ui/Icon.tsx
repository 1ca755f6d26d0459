import clsx from "clsx";

/** Own line drawings on a 16 grid; one weight, square ends, like a drafting pen. */
const PATHS = {
  search: "M7 2.25a4.75 4.75 0 1 0 0 9.5 4.75 4.75 0 0 0 0-9.5M10.5 10.5 14.25 14.25",
  close: "M3.5 3.5l9 9M12.5 3.5l-9 9",
  check: "M2.75 8.5 6.25 12 13.25 4",
  minus: "M3 8h10",
  plus: "M3 8h10M8 3v10",
  "chevron-down": "M3.5 6 8 10.5 12.5 6",
  "chevron-up": "M3.5 10 8 5.5 12.5 10",
  "chevron-left": "M10 3.5 5.5 8 10 12.5",
  "chevron-right": "M6 3.5 10.5 8 6 12.5",
  sort: "M5 3v10M2.5 5.5 5 3l2.5 2.5M11 13V3M8.5 10.5 11 13l2.5-2.5",
  ascending: "M8 13V3M4.25 6.75 8 3l3.75 3.75",
  descending: "M8 3v10M4.25 9.25 8 13l3.75-3.75",
  more: "M2.5 8h1M7.5 8h1M12.5 8h1",
  grip: "M6 3.5h.01M10 3.5h.01M6 8h.01M10 8h.01M6 12.5h.01M10 12.5h.01",
  eye: "M1.5 8C3.5 4.75 5.6 3.25 8 3.25S12.5 4.75 14.5 8C12.5 11.25 10.4 12.75 8 12.75S3.5 11.25 1.5 8M8 5.75a2.25 2.25 0 1 0 0 4.5 2.25 2.25 0 0 0 0-4.5",
  "eye-shut": "M1.5 7c2 3 4.1 4.5 6.5 4.5S12.5 10 14.5 7M3.75 9.75 2.5 11.75M8 11.5V14M12.25 9.75l1.25 2",
  camera: "M1.75 4.75h3l1.25-2h4l1.25 2h3v8.5H1.75zM8 6.5a2.25 2.25 0 1 0 0 4.5 2.25 2.25 0 0 0 0-4.5",
  file: "M3.25 1.75h6l3.5 3.5v9h-9.5zM9.25 1.75v3.5h3.5",
  paste: "M5.25 2.75h-2.5v11.5h10.5V2.75h-2.5M5.75 1.5h4.5v2.75h-4.5zM5.5 7.75h5M5.5 10.75h5",
  lamp: "M8 1.5v2M8 12.5v2M1.5 8h2M12.5 8h2M3.4 3.4l1.4 1.4M11.2 11.2l1.4 1.4M12.6 3.4l-1.4 1.4M4.8 11.2l-1.4 1.4M8 5.5a2.5 2.5 0 1 0 0 5 2.5 2.5 0 0 0 0-5",
  night: "M13.25 9.75A5.75 5.75 0 0 1 6.25 2.75a5.75 5.75 0 1 0 7 7z",
  screen: "M1.75 2.75h12.5v8.5H1.75zM5.5 14.25h5M8 11.25v3",
  caution: "M8 2 14.75 13.75H1.25zM8 6.25v3.5M8 11.5v.5",
  info: "M8 1.75a6.25 6.25 0 1 0 0 12.5 6.25 6.25 0 0 0 0-12.5M8 7.25v4M8 4.75v.5",
  undo: "M6 3 2.5 6.5 6 10M2.75 6.5h6.5a4 4 0 0 1 0 8H6.5",
  upload: "M8 10.5V2.25M4.5 5.5 8 2l3.5 3.5M2 10.5v3.25h12V10.5",
  print: "M4.25 5.5V1.75h7.5V5.5M4.25 11.5h-2.5v-6h12.5v6h-2.5M4.25 9.25h7.5v5h-7.5z",
} as const;

export type IconName = keyof typeof PATHS;

export function Icon({ name, size = 16, className }: { name: IconName; size?: number; className?: string }) {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 16 16"
      width={size}
      height={size}
      className={clsx("shrink-0", className)}
      fill="none"
      stroke="currentColor"
      strokeWidth={name === "more" || name === "grip" ? 2 : 1.5}
      strokeLinecap={name === "grip" ? "round" : "square"}
      strokeLinejoin="miter"
    >
      <path d={PATHS[name]} />
    </svg>
  );
}
