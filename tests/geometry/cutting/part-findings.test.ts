import { describe, expect, test } from 'vitest';
import type { Circle, Contour, Path, Vertex } from '../../../geometry';
import type { Machine } from '../../../geometry/cutting/machine';
import {
  narrowestOpening,
  narrowestWeb,
  partFindings,
} from '../../../geometry/cutting/part-findings';
import { reachable, sizeFinding } from '../../../geometry/cutting/room';
import type { CutPart } from '../../../geometry/parts/part';
import { examplePlates } from '../../support/example-plates';

const at = (x: number, y: number, bulge = 0): Vertex => ({ x, y, bulge });
const path = (...vertices: Vertex[]): Path => ({ kind: 'path', vertices });
const hole = (x: number, y: number, radius: number): Circle => ({
  kind: 'circle',
  x,
  y,
  radius,
});

const machine: Machine = {
  name: 'Laser',
  process: 'laser',
  kerf: 0.15,
  smallestHole: 1,
  smallestWeb: 1,
  bedWidth: 600,
  bedHeight: 400,
  reflective: true,
  leadIn: 1,
  bridges: 0,
  bridgeWidth: 0.5,
  feed: 50,
  pierceTime: 0.4,
};

function part(
  outside: Contour,
  holes: CutPart['holes'],
  change: Partial<CutPart> = {},
): CutPart {
  return {
    kind: 'cut',
    key: 'p',
    label: 'Plate',
    section: null,
    quantity: 1,
    note: '',
    material: 'brass',
    thickness: 1,
    area: 1,
    cutLength: 1,
    mass: 1,
    outside,
    holes,
    ...change,
  };
}

const plate = path(at(0, 0), at(60, 0), at(60, 40), at(0, 40));
const codes = (p: CutPart, on: Partial<Machine> = {}): string[] =>
  partFindings(p, { ...machine, ...on })
    .filter(({ severity }) => severity !== 'ok')
    .map(({ code, severity }) => `${code} ${severity}`);

/** Two slots open to the right, 2 mm wide, 3 mm of metal between them. */
const comb = path(
  at(0, 0),
  at(60, 0),
  at(60, 16.5),
  at(30, 16.5),
  at(30, 18.5),
  at(60, 18.5),
  at(60, 21.5),
  at(30, 21.5),
  at(30, 23.5),
  at(60, 23.5),
  at(60, 40),
  at(0, 40),
);

describe('widths', () => {
  test('of a plate with holes', () => {
    const p = {
      outside: plate,
      holes: [hole(10, 20, 2), hole(15.2, 20, 1.5), hole(50, 38, 1)],
    };
    expect(narrowestOpening(p)).toEqual({ what: 'Smallest hole', value: 2 });
    const web = narrowestWeb(p)!;
    expect(web.what).toBe('Web from hole to edge');
    expect(web.value).toBeCloseTo(1, 9);
    const between = narrowestWeb({ outside: plate, holes: p.holes.slice(0, 2) })!;
    expect(between.what).toBe('Web between holes');
    expect(between.value).toBeCloseTo(1.7, 9);
  });

  test('of slots and of the metal between them', () => {
    expect(narrowestOpening({ outside: comb, holes: [] })!.value).toBeCloseTo(2, 9);
    expect(narrowestWeb({ outside: comb, holes: [] })!.value).toBeCloseTo(3, 9);
  });

  test('of a slot-shaped hole', () => {
    const slot = path(at(20, 19), at(40, 19, 1), at(40, 21), at(20, 21, 1));
    expect(narrowestOpening({ outside: plate, holes: [slot] })!.value).toBeCloseTo(2, 9);
    expect(narrowestWeb({ outside: plate, holes: [slot] })!.value).toBeCloseTo(19, 9);
  });

  test('of a mouth between two corners', () => {
    const mouth = path(
      at(0, 0),
      at(30, 0),
      at(25, 9),
      at(18, 5),
      at(10, 10),
      at(18, 15),
      at(25, 11),
      at(30, 20),
      at(0, 20),
    );
    expect(narrowestOpening({ outside: mouth, holes: [] })!.value).toBeCloseTo(2, 9);
  });

  test('of a ring', () => {
    const ring: Circle = { kind: 'circle', x: 0, y: 0, radius: 6 };
    expect(narrowestWeb({ outside: ring, holes: [hole(0.5, 0, 3)] })!.value).toBeCloseTo(
      2.5,
      9,
    );
  });
});

describe('limits', () => {
  test('hole and web at the limit pass, under it fail', () => {
    expect(codes(part(plate, [hole(10, 20, 0.5)]))).toEqual([]);
    expect(codes(part(plate, [hole(10, 20, 0.49)]))).toEqual(['hole-small fail']);
    expect(codes(part(plate, [hole(2.99, 20, 2)]))).toEqual(['web-thin fail']);
    expect(codes(part(comb, [], { thickness: 2.1 }))).toEqual(['hole-small fail']);
    expect(codes(part(comb, [], { thickness: 3.2 }), { smallestHole: 0.5 })).toEqual([
      'web-thin fail',
    ]);
  });

  test('a finding carries value, limit and what would work', () => {
    const finding = partFindings(
      part(plate, [hole(10, 20, 0.4)], { thickness: 1.5 }),
      machine,
    )[0]!;
    expect(finding).toMatchObject({ code: 'hole-small', value: 0.8, limit: 1.5, part: 'p' });
    expect(finding.change).toContain('1.5 mm');
  });

  test('a slot under the kerf closes up', () => {
    const wide = { kerf: 2.2, smallestHole: 0, smallestWeb: 0 };
    expect(codes(part(comb, []), wide)).toEqual(['kerf-closes fail']);
    expect(codes(part(plate, [hole(10, 20, 1)]), wide)).toEqual(['kerf-closes fail']);
    expect(codes(part(comb, []), { ...wide, kerf: 1.9 })).toEqual([]);
  });

  test('an outline that crosses itself', () => {
    const bow = path(at(0, 0), at(30, 20), at(30, 0), at(0, 20), at(-10, 10));
    const found = partFindings(part(bow, []), machine);
    const crossing = found.find(({ code }) => code === 'contour-crosses')!;
    expect(crossing.severity).toBe('fail');
    expect(crossing.change).toContain('15 mm, 10 mm');
    const touching = path(at(0, 0), at(20, 0), at(20, 20), at(10, 0), at(0, 20));
    expect(codes(part(touching, []))).toContain('contour-crosses fail');
  });

  test('bright metal wants a laser that is rated for it, or none', () => {
    const bright = part(plate, []);
    expect(codes(bright, { reflective: false })).toEqual(['reflective fail']);
    expect(codes(bright, { reflective: false, process: 'waterjet' })).toEqual([]);
    expect(codes(part(plate, [], { material: 'steel' }), { reflective: false })).toEqual([]);
  });

  test('an insulator under a laser is warned of', () => {
    const pad = part(plate, [], { material: 'insulator' });
    expect(codes(pad)).toEqual(['fumes warn']);
    expect(codes(pad, { process: 'milling' })).toEqual([]);
  });
});

describe('bed and sheet', () => {
  test('the smaller of the two counts, whichever way the sheet lies', () => {
    expect(reachable({ width: 500, height: 300 }, machine)).toEqual({
      width: 500,
      height: 300,
    });
    expect(reachable({ width: 300, height: 2000 }, machine)).toEqual({
      width: 300,
      height: 600,
    });
  });

  test('a part may lie askew', () => {
    const bar = part(path(at(0, 0), at(110, 0), at(110, 2), at(0, 2)), []);
    const fits = sizeFinding(bar, { width: 82, height: 82 }, 5);
    expect(fits.severity).toBe('ok');
    const large = sizeFinding(bar, { width: 75, height: 75 }, 5);
    expect(large).toMatchObject({ severity: 'fail', limit: 75 });
    expect(large.value).toBeGreaterThan(75);
  });
});

test('the worked plates can be cut on an ordinary laser', () => {
  for (const { plate: p } of examplePlates()) {
    const cut = part(p.outside, p.holes, { thickness: p.thickness });
    expect(codes(cut)).toEqual([]);
    // The hub round the shaft or the boss round a post, as the design has them.
    expect(narrowestWeb(cut)!.value).toBeGreaterThan(p.thickness);
  }
});
