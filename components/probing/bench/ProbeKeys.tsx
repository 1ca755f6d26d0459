import { BottomSheet } from "@/components/bench/BottomSheet";

const KEYS = [
  { keys: "Space, Enter", does: "it beeps" },
  { keys: "x", does: "it stays silent" },
  { keys: "0 … 9", does: "begins a resistance; Enter records it, Escape leaves it" },
  { keys: "←", does: "back to the last answer, to correct it" },
  { keys: "n, →", does: "on to the next pair, without an answer" },
  { keys: "?", does: "show or hide the keys" },
] as const;

export function ProbeKeys({ onClose }: { onClose: () => void }) {
  return (
    <BottomSheet title="Keys while probing" onClose={onClose}>
      <table className="w-full">
        <tbody>
          {KEYS.map(({ keys, does }) => (
            <tr key={keys} className="border-b border-rule">
              <th scope="row" className="mono w-32 py-2.5 pr-4 text-left font-semibold">
                {keys}
              </th>
              <td className="py-2.5">{does}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-3 text-sm text-ink-soft">A foot pedal that sends one of these keys works as the key.</p>
    </BottomSheet>
  );
}
