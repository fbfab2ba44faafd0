/** A dial as PDF: its strokes read out of the page and measured on paper. */
import { inflateSync } from 'node:zlib';
import { beforeAll, describe, expect, test } from 'vitest';
import { GET } from '@/app/api/designs/[id]/dial/route';
import { defaultDesign, derive } from '@/geometry';
import { dialOf } from '@/geometry/dial/dial';
import { sketchSvg } from '@/geometry/sketch/svg';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';
import { readDial, strokesOf } from '../support/printed-dial';

const settings = {
  quantity: 'frequency',
  form: 'round',
  moves: 'pointer',
  sense: 'clockwise',
  radius: 50,
  place: 'upper',
  open: 0,
  ratio: 1,
  drum: 100,
  hole: 6,
  title: 'Ω ≤ 50 <µ>',
} as const;
const query = {
  ...Object.fromEntries(Object.entries(settings).map(([key, value]) => [key, String(value)])),
  section: '0',
};

let cast: Cast;
let id: string;
beforeAll(async () => {
  cast = await Cast.gather();
  id = await cast.design();
  cast.ask('builder');
});

async function pdf(change: Record<string, string> = {}): Promise<Buffer> {
  const made = await call(GET, { id }, { query: { ...query, ...change } });
  expect(made.status).toBe(200);
  return Buffer.from(await made.arrayBuffer());
}

interface Stroke {
  readonly from: readonly [number, number];
  readonly to: readonly [number, number];
}

/** Straight strokes of the first page in mm of paper, y downwards, and the page's size. */
function measured(bytes: Buffer): { width: number; height: number; strokes: Stroke[] } {
  const text = bytes.toString('latin1');
  const millimetres = 25.4 / 72;
  const [, width, height] = /MediaBox \[0 0 ([\d.]+) ([\d.]+)\]/.exec(text)!.map(Number);
  const stream = /stream\r?\n/.exec(text)!;
  const begin = stream.index + stream[0].length;
  const page = inflateSync(bytes.subarray(begin, text.indexOf('endstream', begin))).toString();
  // What turns points into the sheet's units: pdfkit's flip of y, then the scale.
  const [flip, scale] = [
    ...page.matchAll(/^([-\d.]+) 0 0 ([-\d.]+) [-\d.]+ ([-\d.]+) cm$/gm),
  ].map((found) => found.slice(1).map(Number) as [number, number, number]);
  const across = flip![0] * scale![0] * millimetres;
  const down = -flip![1] * scale![1] * millimetres;
  const strokes = [
    ...page.matchAll(/^([-\d.]+) ([-\d.]+) m\n([-\d.]+) ([-\d.]+) l\n(?!\[0)/gm),
  ].map((found) => {
    const [x1, y1, x2, y2] = found.slice(1).map(Number) as [number, number, number, number];
    return {
      from: [x1 * across, y1 * down] as const,
      to: [x2 * across, y2 * down] as const,
    };
  });
  return { width: width! * millimetres, height: height! * millimetres, strokes };
}

describe('the page', () => {
  test('is as large on paper as the SVG, its check bar 50 mm long', async () => {
    const made = measured(await pdf());
    const derivation = derive(defaultDesign());
    if (!derivation.ok) throw new Error('no plates');
    const { sections, turn } = derivation.derived;
    const svg = readDial(sketchSvg(dialOf(sections[0]!, turn, settings)));
    expect(made.width).toBeCloseTo(svg.width, 2);
    expect(made.height).toBeCloseTo(svg.height, 2);
    const bars = made.strokes.filter(
      ({ from, to }) => Math.abs(Math.hypot(to[0] - from[0], to[1] - from[1]) - 50) < 1e-3,
    );
    // The bar, and the pointer's line of 50 mm.
    expect(bars).toHaveLength(2);

    // Every mark of the SVG is there in the same place.
    for (const { from, to } of strokesOf(svg)) {
      const same = made.strokes.some(
        (stroke) =>
          Math.hypot(stroke.from[0] - from.x, stroke.from[1] - from.y) < 1e-3 &&
          Math.hypot(stroke.to[0] - to.x, stroke.to[1] - to.y) < 1e-3,
      );
      expect(same, `${from.x} ${from.y}`).toBe(true);
    }
  });

  test('is the same bytes for the same version', async () => {
    expect((await pdf()).equals(await pdf())).toBe(true);
  });
});

test.each([
  [{ ratio: '9' }, /turn more than once/],
  [{ radius: '5' }, /Radius: 5 mm/],
  [{ section: '2' }, /no section 3/],
  [{ form: 'oval' }, /./],
  [{ hole: 'wide' }, /./],
])('%o is told what would work', async (change, message) => {
  const refused = await call(GET, { id }, { query: { ...query, ...change } });
  expect(refused.status).toBe(422);
  expect((await refusal(refused)).message).toMatch(message);
});
