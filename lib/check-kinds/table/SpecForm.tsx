"use client";

import { Button } from "@/components/ui/Button";
import { IconButton } from "@/components/ui/IconButton";
import { Icon } from "@/components/ui/Icon";
import { TextField } from "@/components/ui/TextField";
import type { SpecFormProps } from "../kind";
import { LimitsField } from "../LimitsField";
import { UnitField } from "../UnitField";
import { addColumn, addRow, dropColumn, dropRow, renameColumn, withCellLimits, withRow } from "./edit-typed";
import { MOST_COLUMNS, MOST_ROWS, type Typed } from "./schema";

type Props = SpecFormProps<Typed>;

/** Columns are where or under what one measures; rows are what. Limits of a row, and of single cells where they differ. */
export function SpecForm(props: Props) {
  const { value, onChange, errors } = props;
  return (
    <div className="grid gap-5">
      <fieldset className="grid gap-2">
        <legend className="mb-2 font-semibold">Columns: where, or under what, one measures</legend>
        <div className="grid gap-2 sm:grid-cols-2 lg:grid-cols-3">
          {value.columns.map((column, c) => (
            <div key={c} className="flex items-start gap-1">
              <TextField
                label={`Column ${c + 1}`}
                isLabelHidden
                className="flex-1"
                placeholder="no load"
                maxLength={60}
                value={column}
                error={errors[`columns.${c}`]}
                onChange={(name) => onChange(renameColumn(value, c, name))}
              />
              {value.columns.length > 1 && (
                <IconButton
                  icon="close"
                  label={`Remove column ${column || c + 1}`}
                  onPress={() => onChange(dropColumn(value, c))}
                />
              )}
            </div>
          ))}
        </div>
        <Button
          size="sm"
          className="justify-self-start"
          isDisabled={value.columns.length >= MOST_COLUMNS}
          onPress={() => onChange(addColumn(value))}
        >
          <Icon name="plus" /> Add a column
        </Button>
        {errors.columns && <p className="text-failed text-sm font-medium">{errors.columns}</p>}
      </fieldset>
      <fieldset className="grid gap-3">
        <legend className="mb-2 font-semibold">Rows: what one measures</legend>
        {value.rows.map((_, r) => (
          <RowFields key={r} {...props} r={r} />
        ))}
        <Button
          size="sm"
          className="justify-self-start"
          isDisabled={value.rows.length >= MOST_ROWS}
          onPress={() => onChange(addRow(value))}
        >
          <Icon name="plus" /> Add a row
        </Button>
        {errors.rows && <p className="text-failed text-sm font-medium">{errors.rows}</p>}
      </fieldset>
    </div>
  );
}

function RowFields({ value, onChange, errors, r }: Props & { r: number }) {
  const row = value.rows[r];
  if (!row) return null;
  const own = row.cells.filter((cell) => cell.trim() !== "").length;
  return (
    <div className="border-rule bg-raised grid gap-3 rounded-md border p-3">
      <div className="grid items-start gap-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_minmax(0,1.4fr)_auto]">
        <TextField
          label={`Row ${r + 1}`}
          placeholder="+5 V"
          maxLength={60}
          value={row.label}
          error={errors[`rows.${r}.label`]}
          onChange={(label) => onChange(withRow(value, r, { label }))}
        />
        <UnitField
          label="Unit"
          unit={row.unit}
          error={errors[`rows.${r}.unit`]}
          onUnit={(unit) => onChange(withRow(value, r, { unit }))}
        />
        <LimitsField
          label="Limits"
          unit={row.unit}
          typed={row.limits}
          error={errors[`rows.${r}.limits`]}
          onTyped={(limits) => onChange(withRow(value, r, { limits }))}
        />
        {value.rows.length > 1 && (
          <IconButton
            icon="close"
            label={`Remove row ${row.label || r + 1}`}
            onPress={() => onChange(dropRow(value, r))}
            className="sm:mt-7"
          />
        )}
      </div>
      <details open={own > 0 || value.columns.some((_, c) => errors[`rows.${r}.cells.${c}`])}>
        <summary className="text-ink-soft min-h-8 py-1 text-sm">
          Other limits in single columns{own > 0 ? ` (${own})` : ""}
        </summary>
        <div className="mt-2 grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
          {value.columns.map((column, c) => (
            <LimitsField
              key={c}
              label={column || `Column ${c + 1}`}
              unit={row.unit}
              typed={row.cells[c] ?? ""}
              whenEmpty="as the row"
              error={errors[`rows.${r}.cells.${c}`]}
              onTyped={(limits) => onChange(withCellLimits(value, { row: r, column: c }, limits))}
            />
          ))}
        </div>
      </details>
    </div>
  );
}
