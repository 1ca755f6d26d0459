import clsx from "clsx";
import { parseQuantity, type Unit } from "@/lib/calc/units";
import { press, prefixOf, type PadKey } from "./pad-typing";

type Props = { unit: Unit; typed: string; onTyped: (typed: string) => void; disabled: boolean };

type Key = { key: PadKey; shows: string; says?: string; quiet?: boolean; isOff?: boolean };

/** Five columns: digits where a thumb knows them, then what changes the figure, then the prefixes, large to small. */
function keys(unit: Unit): Key[] {
  const prefix = (key: PadKey): Key => ({
    key,
    shows: `${key}${unit}`,
    quiet: true,
    isOff: !parseQuantity(`1${key}`, unit).ok,
  });
  const digit = (key: PadKey): Key => ({ key, shows: key });
  return [
    ...[digit("7"), digit("8"), digit("9")],
    { key: "backspace", shows: "⌫", says: "Delete the last character", quiet: true },
    prefix("M"),
    ...[digit("4"), digit("5"), digit("6")],
    { key: "sign", shows: "±", says: "Change the sign", quiet: true },
    prefix("k"),
    ...[digit("1"), digit("2"), digit("3")],
    { key: "OL", shows: "OL", says: "Overload: the meter shows OL", quiet: true },
    prefix("m"),
    digit("0"),
    { key: ".", shows: ".", says: "Decimal point" },
    { key: "clear", shows: "C", says: "Clear the reading", quiet: true },
    { key: "plain", shows: unit, says: `${unit}, without prefix`, quiet: true },
    prefix("µ"),
  ];
}

/** 64 px keys for a thumb with flux on it. The field above stays a field: a keyboard or a meter's cable types as well. */
export function NumericPad({ unit, typed, onTyped, disabled }: Props) {
  const active = prefixOf(typed);
  return (
    <div role="group" aria-label="Numeric pad" className="grid grid-cols-5 gap-1.5">
      {keys(unit).map(({ key, shows, says, quiet, isOff }) => {
        const pressed = key === active || (key === "plain" && !active);
        const isPrefix = key === "plain" || (quiet && shows.length > 1 && key !== "OL");
        return (
          <button
            key={key}
            type="button"
            disabled={disabled || isOff}
            aria-label={says}
            aria-pressed={isPrefix ? pressed : undefined}
            // The field keeps the focus, so that keyboard and pad can be mixed.
            onPointerDown={(event) => event.preventDefault()}
            onClick={() => onTyped(press(typed, key))}
            className={clsx(
              "mono grid min-h-16 [@media(max-height:700px)]:min-h-12 touch-manipulation place-items-center rounded-md border font-semibold select-none active:translate-y-px disabled:opacity-35",
              quiet ? "text-lg" : "text-2xl",
              isPrefix && pressed
                ? "border-copper bg-copper-ground text-copper"
                : quiet
                  ? "border-rule-strong bg-sheet text-ink-soft"
                  : "border-edge bg-raised text-ink",
            )}
          >
            {key === "backspace" ? <Backspace /> : shows}
          </button>
        );
      })}
    </div>
  );
}

function Backspace() {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 24 16"
      width="30"
      height="20"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.75"
    >
      <path d="M8 1.5h14v13H8L1.5 8zM11.500 5l6 6M17.500 5l-6 6" />
    </svg>
  );
}
