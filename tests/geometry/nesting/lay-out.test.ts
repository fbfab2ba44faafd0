import { describe, expect, test } from 'vitest';
import type { Machine } from '../../../geometry/cutting/machine';
import { sheetsFor, startingMachines } from '../../../geometry/cutting/starting-values';
import { layOut, type LayoutJob } from '../../../geometry/nesting/lay-out';
import { partsOf } from '../../../geometry/parts/assembly';
import type { CutPart } from '../../../geometry/parts/part';
import { examplesDerived } from '../../support/example-plates';

const machine: Machine = {
  name: 'Laser',
  process: 'laser',
  kerf: 0.2,
  smallestHole: 1,
  smallestWeb: 1,
  bedWidth: 400,
  bedHeight: 300,
  reflective: true,
  leadIn: 1,
  bridges: 0,
  bridgeWidth: 0.5,
  feed: 20,
  pierceTime: 0.5,
};

/** A square of 20 mm with a hole of 6 mm. */
const square: CutPart = {
  kind: 'cut',
  key: 'square',
  label: 'Square',
  section: null,
  quantity: 2,
  note: '',
  material: 'brass',
  thickness: 1,
  outside: {
    kind: 'path',
    vertices: [
      { x: 0, y: 0, bulge: 0 },
      { x: 20, y: 0, bulge: 0 },
      { x: 20, y: 20, bulge: 0 },
      { x: 0, y: 20, bulge: 0 },
    ],
  },
  holes: [{ kind: 'circle', x: 10, y: 10, radius: 3 }],
  area: 400 - 9 * Math.PI,
  cutLength: 80 + 6 * Math.PI,
  mass: 3,
};

const job: LayoutJob = {
  parts: [square],
  copies: 3,
  machine,
  sheets: sheetsFor([square], { width: 150, height: 100, count: 2 }),
  settings: { gap: 2, margin: 5, rotations: 4 },
  kerf: 'nominal',
};

const failing = (change: Partial<LayoutJob>): string[] =>
  layOut({ ...job, ...change })!
    .findings.filter(({ severity }) => severity !== 'ok')
    .map(({ code }) => code);

describe('what a layout takes', () => {
  test('at nominal size, by hand', () => {
    const { tally, layout } = layOut(job)!.groups[0]!;
    expect(layout.placements).toHaveLength(6);
    expect(tally.pierces).toBe(12);
    // Each contour has a lead-in of 1 mm.
    const length = 6 * (80 + 6 * Math.PI + 2);
    expect(tally.cutLength).toBeCloseTo(length, 9);
    expect(tally.time).toBeCloseTo(length / 20 + 12 * 0.5, 9);
    expect(tally.yieldOfSheets).toBeCloseTo((6 * square.area) / (150 * 100), 9);
    // Two columns of four rows at most: 5 + 20 + 2 + 20 + 5, and the grid's own cells.
    expect(layout.sheets[0]!.used).toBeGreaterThanOrEqual(52);
    expect(layout.sheets[0]!.used).toBeLessThan(53);
    expect(tally.yieldOfUsed).toBeCloseTo(
      (6 * square.area) / (layout.sheets[0]!.used * 100),
      9,
    );
  });

  test('moved by half the kerf: round outside corners, smaller holes', () => {
    const { tally } = layOut({ ...job, kerf: 'compensated' })!.groups[0]!;
    const length = 6 * (80 + 2 * Math.PI * 0.1 + 2 * Math.PI * 2.9 + 2);
    expect(tally.cutLength).toBeCloseTo(length, 9);
  });

  test('bridges take from the cut and add piercings', () => {
    const bridged = { ...machine, bridges: 2, leadIn: 0 };
    const { tally } = layOut({ ...job, machine: bridged })!.groups[0]!;
    expect(tally.pierces).toBe(18);
    expect(tally.cutLength).toBeCloseTo(6 * (80 - 2 * 0.7 + 6 * Math.PI), 9);
  });

  test('etching takes no time that the cut would tell', () => {
    const etching = { ...machine, process: 'etching' } as const;
    expect(layOut({ ...job, machine: etching })!.groups[0]!.tally.time).toBeNull();
  });
});

describe('findings of a layout', () => {
  test('none where all is well', () => {
    expect(failing({ settings: { ...job.settings, gap: 3 } })).toEqual([]);
  });

  test('gap under the kerf, and under lead-in and kerf', () => {
    expect(failing({ settings: { ...job.settings, gap: 0.1 } })).toEqual([
      'gap-small',
      'lead-in-long',
    ]);
    expect(failing({ settings: { ...job.settings, gap: 1 } })).toEqual(['lead-in-long']);
    expect(failing({ settings: { ...job.settings, margin: 0 } })).toEqual(['lead-in-long']);
  });

  test('no sheet of the kind in store', () => {
    const thicker = sheetsFor([{ material: 'brass', thickness: 1.5 }], {
      width: 150,
      height: 100,
      count: 2,
    });
    expect(failing({ sheets: thicker })).toEqual(['no-sheet']);
    expect(failing({ sheets: [] })).toEqual(['no-sheet']);
    expect(failing({ sheets: job.sheets.map((s) => ({ ...s, count: 0 })) })).toEqual([
      'no-sheet',
    ]);
  });

  test('too few sheets, too small a sheet', () => {
    const short = layOut({ ...job, copies: 30 })!;
    expect(short.findings.find(({ code }) => code === 'sheets-short')!.value).toBe(
      60 - short.groups[0]!.layout.placements.length,
    );
    const small = sheetsFor([square], { width: 29, height: 100, count: 2 });
    expect(failing({ sheets: small })).toEqual(['part-large', 'sheets-short']);
  });

  test('a bed smaller than the sheet limits it', () => {
    const small = layOut({ ...job, machine: { ...machine, bedWidth: 60, bedHeight: 60 } })!;
    const { sheets } = small.groups[0]!.layout;
    expect(sheets.every(({ width, height }) => width === 60 && height === 60)).toBe(true);
  });
});

test('each kind of sheet by itself', () => {
  const parts = [square, { ...square, key: 'thick', thickness: 2 }];
  const sheets = sheetsFor(parts, { width: 150, height: 100, count: 2 });
  const shares: number[] = [];
  const { groups } = layOut({ ...job, parts, sheets }, (done, of) => {
    shares.push(done / of);
    return true;
  })!;
  expect(groups.map(({ thickness }) => thickness)).toEqual([1, 2]);
  expect(shares.at(-1)).toBe(1);
  expect(layOut({ ...job, parts, sheets }, (done) => done < 900)).toBeNull();
});

test('the starting machines cut the worked designs, but bright metal under the wrong laser', () => {
  const { derived } = examplesDerived()[0]!;
  const parts = partsOf(derived).filter((part) => part.kind === 'cut');
  const sheets = sheetsFor(parts, { width: 500, height: 300, count: 5 });
  for (const one of startingMachines) {
    const settings = { gap: one.leadIn + one.kerf + 1, margin: 5, rotations: 2 };
    const found = failing({ parts, copies: 1, machine: one, sheets, settings });
    const bright = parts.filter(({ material }) => material !== 'steel').map(() => 'reflective');
    expect(found).toEqual(one.process === 'laser' && !one.reflective ? bright : []);
  }
});
