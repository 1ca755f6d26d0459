import type { BenchInstrument } from "./bench-props";

type Props = {
  fitting: readonly BenchInstrument[];
  chosen: BenchInstrument | undefined;
  onChoose: (id: string) => void;
  settingsHref: string;
};

/** With which instrument; its accuracy goes into the verdict. The native list is what a phone does best. */
export function InstrumentPicker({ fitting, chosen, onChoose, settingsHref }: Props) {
  if (fitting.length === 0) {
    return (
      <p className="text-ink-soft text-sm">
        No instrument of yours fits this unit.{" "}
        <a href={settingsHref} className="link">
          Add one
        </a>{" "}
        and its accuracy counts.
      </p>
    );
  }
  return (
    <label className="flex min-h-12 items-center gap-3">
      <span className="text-ink-soft text-sm">With</span>
      <select
        value={chosen?.id ?? ""}
        onChange={(event) => onChoose(event.currentTarget.value)}
        className="border-edge bg-raised min-h-12 min-w-0 flex-1 rounded-md border px-3 text-base font-semibold"
      >
        <option value="">no instrument named</option>
        {fitting.map((instrument) => (
          <option key={instrument.id} value={instrument.id}>
            {instrument.name}
          </option>
        ))}
      </select>
    </label>
  );
}
