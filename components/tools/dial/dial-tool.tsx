'use client';

import { useParams } from 'next/navigation';
import { useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { dialOf } from '@/geometry/dial/dial';
import { DialError, type DialSettings } from '@/geometry/dial/settings';
import type { Sketch } from '@/geometry/sketch/sketch';
import { sketchSvg } from '@/geometry/sketch/svg';
import type { ToolProps } from '../tool-props';
import { DialFields } from './dial-fields';
import { saveSvg } from './save-svg';

type Made =
  | { readonly sketch: Sketch; readonly trouble: null }
  | { readonly sketch: null; readonly trouble: string };

const texts = (settings: DialSettings): Record<string, string> =>
  Object.fromEntries(Object.entries(settings).map(([key, value]) => [key, String(value)]));

/** ISO 216 sheets that printers take, by what they print with 10 mm of border all round. */
const papers = [
  { name: 'A4', short: 190, long: 277 },
  { name: 'A3', short: 277, long: 400 },
] as const;

function paperWords({ width, height }: Sketch): string {
  const [short, long] = width < height ? [width, height] : [height, width];
  const paper = papers.find((one) => short <= one.short && long <= one.long);
  const size = `${Math.ceil(width)} × ${Math.ceil(height)} mm`;
  return paper
    ? `${size}: prints on ${paper.name}.`
    : `${size}: larger than A3, so print it on a roll or in tiles.`;
}

/** A dial to print, with its marks where the finished plates have their values. */
export default function DialTool({ derived, section }: ToolProps) {
  const { id } = useParams<{ id: string }>();
  const result = derived?.sections[section] ?? null;
  const [settings, setSettings] = useState<DialSettings>({
    quantity: result?.inductance === null ? 'capacitance' : 'frequency',
    form: 'round',
    moves: 'pointer',
    sense: 'clockwise',
    radius: 55,
    place: 'upper',
    open: 0,
    ratio: 1,
    drum: 150,
    hole: derived ? derived.design.shaftDiameter + 0.5 : 6.5,
    title: '',
  });

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
      <DialFields
        settings={settings}
        onChange={(change) => setSettings((before) => ({ ...before, ...change }))}
      />
      {made.trouble !== null && (
        <p role="alert" className="text-bad">
          {made.trouble}
        </p>
      )}
      {made.sketch && svg && (
        <>
          <div
            role="img"
            aria-label="The dial as it will be printed"
            className="border border-line bg-white [&_svg]:h-auto [&_svg]:w-full"
            dangerouslySetInnerHTML={{ __html: svg }}
          />
          <p>{paperWords(made.sketch)}</p>
          <p className="flex flex-wrap gap-2">
            <Button look="action" onPress={() => saveSvg(svg, 'dial_true-size.svg')}>
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
        what you measure, and print it again. A pair of gears turns the sense round: give the
        sense of what you see move. Check the printed size at the bar.
      </p>
    </>
  );
}
