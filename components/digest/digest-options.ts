/** ISO 8601 numbers the days from Monday. */
export const WEEKDAYS = ["Monday", "Tuesday", "Wednesday", "Thursday", "Friday", "Saturday", "Sunday"].map(
  (label, index) => ({ id: String(index + 1), label }),
);

export const HOURS = Array.from({ length: 24 }, (_, hour) => ({
  id: String(hour),
  label: `${String(hour).padStart(2, "0")}:00`,
}));

export const QUIET_WEEKS = [
  { id: "line", label: "One short line", description: "So that you know the mail works." },
  { id: "nothing", label: "No mail" },
];
