type Key = { keys: string; does: string };

/** Keys and what they do, as a table to be read at arm's length. */
export function KeyTable({ keys }: { keys: readonly Key[] }) {
  return (
    <table className="w-full">
      <tbody>
        {keys.map((one) => (
          <tr key={one.keys} className="border-b border-rule">
            <th scope="row" className="mono w-32 py-2.5 pr-4 text-left font-semibold">
              {one.keys}
            </th>
            <td className="py-2.5">{one.does}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
