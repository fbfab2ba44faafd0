'use client';

import { useId, useState } from 'react';
import { PanelSection } from '@/components/design/panel-section';
import { readPoints, writePoints } from '@/components/design/points-text';
import { Button } from '@/components/ui/button';
import { inputClass } from '@/components/ui/input-class';
import { SelectField } from '@/components/ui/select-field';
import type { Design, LawPoint } from '@/geometry';
import { rowsOfDial } from '@/geometry/tracking/dial-picture';
import type { ToolProps } from '../tool-props';
import { rowsOfMarks, rowsOr, type PictureMarks, type Rows } from './picture-marks';
import { PictureSource } from './picture-source';

type Source = 'typed' | 'picture';

function rowsOfText(text: string): Rows {
  if (text.trim() === '') return { ok: false, message: 'Give at least 3 rows.' };
  const read = readPoints(text, 'frequency');
  return read.ok ? rowsOr(() => rowsOfDial(read.points)) : read;
}

/** Section 1 with the dial's table as its law; its coil and stray stay. */
function following(design: Design, rows: readonly LawPoint[]): Design {
  const [first, ...others] = design.sections;
  const law = { law: 'points', targetKind: 'band', lawPoints: [...rows] } as const;
  return { ...design, sections: [{ ...first!, ...law }, ...others] };
}

/** A dial that is already there: its frequencies over the angle become the law of section 1. */
export default function PrintedDial({ design, apply }: ToolProps) {
  const id = useId();
  const [source, setSource] = useState<Source>('typed');
  const [text, setText] = useState('');
  const [marks, setMarks] = useState<PictureMarks>({
    centre: null,
    references: [null, null],
    angles: [0, design.travel],
    frequencies: [],
  });
  const read = source === 'typed' ? rowsOfText(text) : rowsOfMarks(marks);

  return (
    <>
      <PanelSection title="The dial">
        <p className="text-ink-2">
          Frequencies printed on a dial, with the angle of the shaft at each, become the law of
          section 1; an oscillator section follows it. The coil of section 1 stays as it is.
        </p>
        <SelectField
          label="Given by"
          value={source}
          options={[
            { value: 'typed', label: 'rows, typed or pasted' },
            { value: 'picture', label: 'a picture of it' },
          ]}
          onChange={setSource}
        />
        {source === 'typed' ? (
          <div className="flex flex-col gap-1">
            <label htmlFor={id} className="font-medium">
              Shaft angle and frequency: degrees, kHz
            </label>
            <textarea
              id={id}
              rows={8}
              spellCheck={false}
              value={text}
              placeholder={'0\t1600\n60\t1150\n120\t800\n170\t540'}
              onChange={(event) => setText(event.target.value)}
              className={`${inputClass} min-h-32 tabular-nums`}
            />
          </div>
        ) : (
          <PictureSource marks={marks} onChange={setMarks} />
        )}
      </PanelSection>
      <PanelSection title="Its rows">
        <p role="status" className={read.ok ? 'text-ink-2' : 'text-small'}>
          {read.ok
            ? `${read.rows.length} rows, counted from the highest frequency`
            : read.message}
        </p>
        {read.ok && (
          <pre className="text-small tabular-nums">{writePoints(read.rows, 'frequency')}</pre>
        )}
        <p>
          <Button
            look="action"
            isDisabled={!read.ok}
            onPress={() =>
              read.ok &&
              apply(
                (before) => following(before, read.rows),
                `Section 1 follows the printed dial, ${read.rows.length} rows`,
              )
            }
          >
            Follow it in section 1
          </Button>
        </p>
        <p className="text-small text-ink-2">
          The checks say when the rows cover another angle than the law does, and how to set the
          travel for them.
        </p>
      </PanelSection>
    </>
  );
}
