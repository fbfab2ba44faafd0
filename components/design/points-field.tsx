'use client';

import { useId, useRef, useState } from 'react';
import { useController, useFormContext, useWatch } from 'react-hook-form';
import { MOST_POINTS, type LawPoint, type PointsParameter } from '@/geometry';
import { messageFor, type Draft, type DraftValue } from './draft';
import { fieldId } from './focus-field';
import { useHelp } from './parameter-help';
import { areOtherValue, asOtherValue } from './points-value';
import { pointUnits, readPoints, writePoints, type PointValue } from './points-text';

const linkClass =
  'min-h-8 self-start text-left text-small font-medium text-action underline underline-offset-2 max-bench:min-h-11';

/** Larger files are no table of this kind. */
const LARGEST_FILE = 100_000;

function textOf(value: DraftValue, column: PointValue): string {
  return typeof value === 'string' ? value : writePoints((value ?? []) as LawPoint[], column);
}

/** The builder's own law as a table, typed, pasted or read from a CSV file. */
export default function PointsField({
  path,
  parameter,
}: {
  path: string;
  parameter: PointsParameter;
}) {
  const id = useId();
  const help = useHelp(path);
  const { control } = useFormContext<Draft>();
  const { field } = useController({ control, name: `design.${path}` });
  const [targetKind, inductance] = useWatch({
    control,
    name: ['targetKind', 'inductance'].map(
      (key) => `design.${path.replace(/[^.]+$/, key)}` as 'design.travel',
    ),
  }) as [unknown, unknown];
  const column: PointValue = targetKind === 'band' ? 'frequency' : 'capacitance';
  const value = field.value as DraftValue;
  const [editing, setEditing] = useState<string | null>(null);
  const [trouble, setTrouble] = useState<string | null>(null);
  const picker = useRef<HTMLInputElement>(null);
  // After the choice between capacitance and band was changed.
  const other = areOtherValue(value, column);
  const text = editing ?? (other ? '' : textOf(value, column));
  const read = readPoints(text, column);
  const message =
    trouble ??
    (other ? `These rows are no ${column} yet` : null) ??
    (read.ok ? messageFor(parameter, path, read.points) : read.message);

  function take(typed: string) {
    setTrouble(null);
    const now = readPoints(typed, column);
    field.onChange(now.ok ? now.points : typed);
  }

  async function open(file: File | undefined) {
    if (!file) return;
    if (file.size > LARGEST_FILE) {
      setTrouble(
        `${file.name} has ${file.size} bytes; a table of at most ${MOST_POINTS} rows has fewer than ${LARGEST_FILE}`,
      );
      return;
    }
    take(await file.text());
  }

  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={fieldId(path)} className="text-ink-2">
        {parameter.label}: degrees, {pointUnits[column]}
      </label>
      <textarea
        id={fieldId(path)}
        value={text}
        rows={8}
        spellCheck={false}
        aria-invalid={message !== undefined}
        aria-describedby={`${id}-help ${id}-message`}
        placeholder={
          column === 'frequency' ? '0\t1600\n90\t900\n180\t530' : '0\t40\n90\t210\n180\t400'
        }
        onChange={(event) => {
          setEditing(event.target.value);
          take(event.target.value);
        }}
        onBlur={() => {
          setEditing(null);
          field.onBlur();
        }}
        className="min-h-32 w-full rounded-[3px] border border-edge bg-white px-2 py-1 tabular-nums aria-invalid:border-2 aria-invalid:border-bad"
      />
      <p id={`${id}-help`} className="sr-only">
        {help}
      </p>
      <p
        id={`${id}-message`}
        role="status"
        className={message ? 'text-small text-bad' : 'text-small text-ink-2'}
      >
        {message ?? (read.ok ? `${read.points.length} rows, joined without overshoot` : '')}
      </p>
      {other && typeof inductance === 'number' && (
        <button
          type="button"
          onClick={() => field.onChange(asOtherValue(other, column, inductance))}
          className={linkClass}
        >
          Turn the rows into {column === 'frequency' ? 'frequencies' : 'capacitances'} with this
          coil
        </button>
      )}
      <input
        ref={picker}
        type="file"
        accept=".csv,.tsv,.txt,text/csv,text/plain"
        className="sr-only"
        tabIndex={-1}
        aria-hidden="true"
        onChange={(event) => {
          void open(event.target.files?.[0]);
          event.target.value = '';
        }}
      />
      <button type="button" onClick={() => picker.current?.click()} className={linkClass}>
        Read it from a CSV file
      </button>
    </div>
  );
}
