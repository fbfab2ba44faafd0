'use client';

import { useParams } from 'next/navigation';
import { useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { DialError, dialOf, type DialSettings } from '@/geometry/dial/dial';
import type { Sketch } from '@/geometry/sketch/sketch';
import { sketchSvg } from '@/geometry/sketch/svg';
import { NumberField } from '../number-field';
import type { ToolProps } from '../tool-props';

type Made =
  | { readonly sketch: Sketch; readonly trouble: null }
  | { readonly sketch: null; readonly trouble: string };

function save(svg: string): void {
  const address = URL.createObjectURL(new Blob([svg], { type: 'image/svg+xml' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = 'dial_true-size.svg';
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}

const texts = (settings: DialSettings): Record<string, string> =>
  Object.fromEntries(Object.entries(settings).map(([key, value]) => [key, String(value)]));

/** A dial to print, with its marks where the finished plates have their values. */
export default function DialTool({ derived, section }: ToolProps) {
  const { id } = useParams<{ id: string }>();
  const result = derived?.sections[section] ?? null;
  const [settings, setSettings] = useState<DialSettings>({
    quantity: result?.inductance === null ? 'capacitance' : 'frequency',
    form: 'round',
    radius: 55,
    ratio: 1,
    drum: 150,
    sense: 'clockwise',
    hole: derived ? derived.design.shaftDiameter + 0.5 : 6.5,
    title: '',
  });
  const set = (change: Partial<DialSettings>) =>
    setSettings((before) => ({ ...before, ...change }));

  const made = useMemo((): Made | null => {
    if (!derived || !result) return null;
    try {
      return { sketch: dialOf(result, derived.turn, settings), trouble: null };
    } catch (error) {
      if (!(error instanceof DialError)) throw error;
      return { sketch: null, trouble: error.message };
    }
  }, [derived, result, settings]);

  if (!made) return <p>There are no plates to make a dial from.</p>;
  const svg = made.sketch && sketchSvg(made.sketch);
  return (
    <>
      <div className="grid grid-cols-2 gap-3">
        <SelectField
          label="Marks"
          value={settings.quantity}
          options={[
            { value: 'frequency', label: 'frequency' },
            { value: 'wavelength', label: 'wavelength' },
            { value: 'capacitance', label: 'capacitance' },
          ]}
          onChange={(quantity) => set({ quantity })}
        />
        <SelectField
          label="Scale"
          value={settings.form}
          options={[
            { value: 'round', label: 'round' },
            { value: 'straight', label: 'straight, by a cord' },
          ]}
          onChange={(form) => set({ form })}
        />
        {settings.form === 'round' ? (
          <>
            <NumberField
              label="Radius, mm"
              value={settings.radius}
              min={15}
              max={200}
              onChange={(radius) => set({ radius })}
            />
            <NumberField
              label="Hole, mm"
              value={settings.hole}
              min={0}
              max={60}
              onChange={(hole) => set({ hole })}
            />
          </>
        ) : (
          <NumberField
            label="Drum, mm round"
            value={settings.drum}
            min={10}
            max={2000}
            onChange={(drum) => set({ drum })}
          />
        )}
        <NumberField
          label="Turns for one of the shaft"
          value={settings.ratio}
          min={0.01}
          max={100}
          onChange={(ratio) => set({ ratio })}
        />
        <SelectField
          label="With the shaft meshing it goes"
          value={settings.sense}
          options={
            settings.form === 'round'
              ? [
                  { value: 'clockwise', label: 'clockwise' },
                  { value: 'anticlockwise', label: 'anticlockwise' },
                ]
              : [
                  { value: 'clockwise', label: 'to the right' },
                  { value: 'anticlockwise', label: 'to the left' },
                ]
          }
          onChange={(sense) => set({ sense })}
        />
        <TextField
          label="Lettering"
          value={settings.title}
          maxLength={40}
          autoComplete="off"
          onChange={(title) => set({ title })}
        />
      </div>
      {made.trouble !== null && (
        <p role="alert" className="text-bad">
          {made.trouble}
        </p>
      )}
      {svg && (
        <>
          <div
            role="img"
            aria-label="The dial as it will be printed"
            className="border border-line bg-white [&_svg]:h-auto [&_svg]:w-full"
            dangerouslySetInnerHTML={{ __html: svg }}
          />
          <p className="flex flex-wrap gap-2">
            <Button look="action" onPress={() => save(svg)}>
              Save as SVG, true size
            </Button>
            <a
              href={`/api/designs/${id}/dial?${new URLSearchParams({ ...texts(settings), section: String(section) })}`}
              download
              className={buttonClass('plain')}
            >
              Save as PDF, of the saved version
            </a>
          </p>
        </>
      )}
      <p className="text-small text-ink-2">
        Marks follow the finished plates with their trimmer set. The built one differs by its
        tolerances and by what is in the circuit: correct the stray or the frame’s allowance by
        what you measure, and print it again. Check the printed size at the bar.
      </p>
    </>
  );
}
