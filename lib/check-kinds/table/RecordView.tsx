import type { RecordViewProps } from "../kind";
import type { Entry, Spec } from "./schema";

export function RecordView({ spec, record }: RecordViewProps<Spec, Entry>) {
  return (
    <table>
      <thead>
        <tr>
          <td />
          {spec.columns.map((column) => (
            <th key={column} scope="col">
              {column}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {spec.rows.map((row, r) => (
          <tr key={row.label}>
            <th scope="row">{row.label}</th>
            {spec.columns.map((column, c) => (
              <td key={column}>{record?.cells[r]?.[c] ?? ""}</td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
