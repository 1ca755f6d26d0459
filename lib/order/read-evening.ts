const UNITS: readonly { names: readonly string[]; seconds: number }[] = [
  { names: ["h", "hr", "hrs", "hour", "hours"], seconds: 3600 },
  { names: ["", "m", "min", "mins", "minute", "minutes"], seconds: 60 },
];
const SHORTEST_S = 60;
const LONGEST_S = 16 * 3600;

type Evening = { ok: true; seconds: number } | { ok: false; message: string };

const HOW = "Write it such as 45 minutes, 1 h, 1 h 30 or 1:30.";

/** The time one has, as people write it: "45 minutes", "1 h", "1.5 h", "1 h 30", "1:30"; a bare number is minutes. */
export function readEvening(typed: string): Evening {
  const text = typed.trim().toLowerCase().replaceAll(",", ".");
  if (text === "") return { ok: false, message: `Say how long you have. ${HOW}` };
  const seconds = readClock(text) ?? readParts(text);
  if (seconds === undefined)
    return { ok: false, message: `“${typed.trim().slice(0, 40)}” is no length of time. ${HOW}` };
  if (seconds < SHORTEST_S) return { ok: false, message: "Less than a minute is not enough for a check." };
  if (seconds > LONGEST_S)
    return { ok: false, message: "More than 16 hours is no evening. Get some sleep in between." };
  return { ok: true, seconds };
}

function readClock(text: string): number | undefined {
  const [, hours, minutes] = /^(\d{1,2}):([0-5]\d)(?:\s*h)?$/.exec(text) ?? [];
  return hours === undefined ? undefined : Number(hours) * 3600 + Number(minutes) * 60;
}

/** Each unit once, the larger first. */
function readParts(text: string): number | undefined {
  const parts = [...text.matchAll(/(\d+(?:\.\d+)?)\s*([a-z]*)\s*/g)];
  if (parts.map(([whole]) => whole).join("") !== text || parts.length === 0 || parts.length > 2) return undefined;
  const found = parts.map(([, figure, name]) => {
    const unit = UNITS.find(({ names }) => names.includes(name ?? ""));
    return unit && { amount: Number(figure) * unit.seconds, size: unit.seconds };
  });
  const [first, second] = found;
  if (!first || (found.length === 2 && (!second || second.size >= first.size))) return undefined;
  return first.amount + (second?.amount ?? 0);
}
