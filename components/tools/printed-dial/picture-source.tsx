'use client';

import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { formatQuantity } from '@/geometry';
import type { PicturePoint } from '@/geometry/tracking/dial-picture';
import { toDegrees, toRadians } from '@/components/floor/degrees';
import { NumberField } from '../number-field';
import { DialPictureView, type OpenPicture } from './dial-picture-view';
import type { PictureMarks } from './picture-marks';

type Picked = 'centre' | 'first' | 'second' | 'frequency';

const LARGEST_FILE = 30_000_000;

async function opened(file: File): Promise<OpenPicture> {
  const url = URL.createObjectURL(file);
  const image = new Image();
  image.src = url;
  try {
    await image.decode();
  } catch {
    URL.revokeObjectURL(url);
    throw new Error(`${file.name} is no picture that can be shown: give a PNG or JPEG`);
  }
  return { url, name: file.name, width: image.naturalWidth, height: image.naturalHeight };
}

/** A picture of the dial, its centre, two marks of known angle, and the frequencies on it. */
export function PictureSource({
  marks,
  onChange,
}: {
  marks: PictureMarks;
  onChange: (marks: PictureMarks) => void;
}) {
  const picker = useRef<HTMLInputElement>(null);
  const [picture, setPicture] = useState<OpenPicture | null>(null);
  const [trouble, setTrouble] = useState<string | null>(null);
  const [picked, setPicked] = useState<Picked>('centre');
  const [frequency, setFrequency] = useState(1000e3);
  const url = picture?.url;
  useEffect(() => (url === undefined ? undefined : () => URL.revokeObjectURL(url)), [url]);

  async function open(file: File | undefined) {
    if (!file) return;
    setTrouble(null);
    if (file.size > LARGEST_FILE) {
      setTrouble(`${file.name} is larger than 30 MB: give a smaller picture`);
      return;
    }
    try {
      setPicture(await opened(file));
      setPicked('centre');
      onChange({ ...marks, centre: null, references: [null, null], frequencies: [] });
    } catch (error) {
      setTrouble(error instanceof Error ? error.message : String(error));
    }
  }

  function press(at: PicturePoint) {
    const [first, second] = marks.references;
    if (picked === 'centre') {
      onChange({ ...marks, centre: at });
      if (!first) setPicked('first');
    } else if (picked === 'first') {
      onChange({ ...marks, references: [at, second] });
      if (!second) setPicked('second');
    } else if (picked === 'second') {
      onChange({ ...marks, references: [first, at] });
      if (marks.frequencies.length === 0) setPicked('frequency');
    } else {
      onChange({ ...marks, frequencies: [...marks.frequencies, { ...at, frequency }] });
    }
  }

  return (
    <>
      <p className="text-small text-ink-2">
        Taken square on, so that its circles are round. It is read here in the browser and goes
        nowhere.
      </p>
      <input
        ref={picker}
        type="file"
        aria-label="Picture of the dial"
        accept="image/*"
        className="sr-only"
        tabIndex={-1}
        onChange={(event) => {
          void open(event.target.files?.[0]);
          event.target.value = '';
        }}
      />
      <p className="flex flex-wrap items-center gap-3">
        <Button onPress={() => picker.current?.click()}>Choose a picture</Button>
        {picture && <span className="wrap-anywhere text-ink-2">{picture.name}</span>}
      </p>
      {trouble && (
        <p role="alert" className="text-bad">
          {trouble}
        </p>
      )}
      {picture && (
        <>
          <div className="grid grid-cols-2 gap-3">
            <SelectField
              label="A press sets"
              value={picked}
              options={[
                { value: 'centre', label: 'the centre' },
                { value: 'first', label: 'the first mark of known angle' },
                { value: 'second', label: 'the second one' },
                { value: 'frequency', label: 'a frequency' },
              ]}
              onChange={setPicked}
            />
            {picked === 'frequency' && (
              <NumberField
                label="Frequency printed there, kHz"
                value={frequency / 1e3}
                min={1}
                max={1e6}
                onChange={(value) => setFrequency(value * 1e3)}
              />
            )}
            {marks.angles.map((angle, i) => (
              <NumberField
                key={i}
                label={`${i === 0 ? 'First' : 'Second'} mark, shaft angle, °`}
                value={toDegrees(angle)}
                min={-360}
                max={360}
                onChange={(degrees) =>
                  onChange({
                    ...marks,
                    angles: marks.angles.map((one, k) =>
                      k === i ? toRadians(degrees) : one,
                    ) as [number, number],
                  })
                }
              />
            ))}
          </div>
          <DialPictureView picture={picture} marks={marks} onPress={press} />
          {marks.frequencies.length > 0 && (
            <p className="flex flex-wrap items-center gap-3">
              <span>
                Picked:{' '}
                {marks.frequencies
                  .map((mark) => formatQuantity(mark.frequency, 'frequency', 5))
                  .join(', ')}
              </span>
              <Button
                look="quiet"
                onPress={() =>
                  onChange({ ...marks, frequencies: marks.frequencies.slice(0, -1) })
                }
              >
                Take the last one back
              </Button>
            </p>
          )}
        </>
      )}
    </>
  );
}
