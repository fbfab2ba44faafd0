/** The drawing: everything on its paper, views at a standard scale, mandatory fields filled. */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { createEdgeCache, defaultDesign, derive, type Design } from '../../../geometry';
import { drawingOf } from '../../../geometry/drawing/drawing';
import { scaleFor } from '../../../geometry/drawing/paper';
import { contourBounds } from '../../../geometry/measure';
import { partsOf } from '../../../geometry/parts/assembly';
import type { CutPart } from '../../../geometry/parts/part';
import { widthOf, type Sketch } from '../../../geometry/sketch/sketch';

const cache = createEdgeCache();
const slotted = defaultDesign();
slotted.endSlots = 6;
slotted.bracket = 'panel';
const designs: [string, Design][] = [
  ['slots and a panel plate', slotted],
  ...readdirSync('public/examples')
    .filter((file) => file !== 'index.json')
    .map((file): [string, Design] => [
      file,
      (JSON.parse(readFileSync(`public/examples/${file}`, 'utf8')) as { design: Design })
        .design,
    ]),
];

const facts = {
  name: 'A section with a rather long name, for a receiver of the nineteen-thirties',
  owner: 'A workshop with a name that is long as well',
  number: 'ABCD1234',
  revision: '12',
  issued: '2026-12-01',
  creator: 'A. Person',
  approved: '',
  status: 'Draft, not released',
  waivers: Array.from({ length: 6 }, (_, i) => `Check ${i + 1}: ${'a long reason '.repeat(9)}`),
  materialOf: (material: string) => material,
};

/** All end points of a path's commands with absolute coordinates. */
const points = (path: string): [number, number][] =>
  [...path.matchAll(/[ML]\s*(-?[\d.]+)[ ,](-?[\d.]+)/g)].map(([, x, y]) => [
    Number(x),
    Number(y),
  ]);

function expectOnPaper({ width, height, marks }: Sketch): void {
  for (const mark of marks) {
    if (mark.kind === 'text') {
      const w = widthOf(mark.text, mark.height);
      const left =
        mark.anchor === 'start'
          ? mark.x
          : mark.anchor === 'middle'
            ? mark.x - w / 2
            : mark.x - w;
      if (!mark.turn) {
        expect(left, mark.text).toBeGreaterThan(-1);
        expect(left + w, mark.text).toBeLessThan(width + 1);
      }
      expect(mark.y, mark.text).toBeLessThan(height);
      expect(mark.y, mark.text).toBeGreaterThan(0);
      continue;
    }
    for (const [x, y] of points(mark.path)) {
      expect(x).toBeGreaterThanOrEqual(-0.01);
      expect(x).toBeLessThanOrEqual(width + 0.01);
      expect(y).toBeGreaterThanOrEqual(-0.01);
      expect(y).toBeLessThanOrEqual(height + 0.01);
    }
  }
}

describe.each(designs)('%s', (_name, design) => {
  const derivation = derive(design, { cache, model: 'edges' });
  if (!derivation.ok) throw new Error('no plates');
  const sheets = drawingOf(derivation.derived, facts);
  const cut = partsOf(derivation.derived).filter((p): p is CutPart => p.kind === 'cut');

  test('an assembly and a sheet for each cut part, numbered', () => {
    expect(sheets).toHaveLength(cut.length + 1);
    sheets.forEach(({ marks }, i) => {
      const texts = marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []));
      expect(texts).toContain(`${i + 1} / ${sheets.length}`);
    });
  });

  test('nothing leaves the paper', () => sheets.forEach(expectOnPaper));

  // ISO 7200's mandatory fields (published).
  test('every title block names owner, number, date, title, creator and type', () => {
    for (const { marks } of sheets) {
      const texts = marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []));
      for (const label of [
        'Legal owner',
        'Identification number',
        'Date of issue',
        'Sheet',
        'Title',
        'Approved by',
        'Created by',
        'Document type',
      ]) {
        expect(texts).toContain(label);
      }
      expect(texts).toEqual(expect.arrayContaining(['ABCD1234', '2026-12-01', 'A. Person']));
    }
  });

  test('each plan view is as large as its scale says', () => {
    cut.forEach((part, i) => {
      const { marks } = sheets[i + 1]!;
      const written = marks.flatMap((mark) =>
        mark.kind === 'text' && /^\d+ : \d+$/.test(mark.text) ? [mark.text] : [],
      );
      const [over, under] = written[0]!.split(' : ').map(Number);
      const scale = over! / under!;
      const { minX, maxX, minY, maxY } = contourBounds(part.outside);
      expect(scale).toBe(scaleFor({ w: maxX - minX, h: maxY - minY }, { w: 125, h: 112 }));
      // The dimension line across is drawn as long as the part is wide at this scale.
      const long = marks.flatMap((mark) => {
        if (mark.kind !== 'stroke' || mark.dash) return [];
        const at = points(mark.path);
        return at.length === 2 && at[0]![1] === at[1]![1] ? [at[1]![0] - at[0]![0]] : [];
      });
      expect(long.some((w) => Math.abs(w - (maxX - minX) * scale) < 0.01)).toBe(true);
    });
  });
});

test.each([
  [{ w: 10, h: 10 }, 10],
  [{ w: 30, h: 20 }, 2],
  [{ w: 100, h: 100 }, 1],
  [{ w: 300, h: 100 }, 1 / 5],
])('%o in 125 × 112: scale %f of ISO 5455', (size, scale) => {
  expect(scaleFor(size, { w: 125, h: 112 })).toBe(scale);
});
