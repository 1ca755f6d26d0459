import { BottomSheet } from "./BottomSheet";
import { KEYS_FOR_PEOPLE } from "./key-map";

export function KeysSheet({ onClose }: { onClose: () => void }) {
  return (
    <BottomSheet title="Keys at the bench" onClose={onClose}>
      <table className="w-full">
        <tbody>
          {KEYS_FOR_PEOPLE.map(({ keys, does }) => (
            <tr key={keys} className="border-rule border-b">
              <th scope="row" className="mono w-32 py-2.5 pr-4 text-left font-semibold">
                {keys}
              </th>
              <td className="py-2.5">{does}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="text-ink-soft mt-3 text-sm">
        A foot pedal that sends one of these keys works as the key. Typing a figure begins the reading. While you type
        in a field the keys are letters again; Escape leaves the field.
      </p>
    </BottomSheet>
  );
}
