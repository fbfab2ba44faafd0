/** Old plates: from a file of unknown making to the law that they make. */
import { describe, expect, test } from 'vitest';
import { createEdgeCache, defaultDesign, derive } from '../../../geometry';
import { cutFiles } from '../../../geometry/files';
import { readDxf } from '../../../geometry/old-plate/dxf';
import { DrawingError, outlinesIn, type Drawing } from '../../../geometry/old-plate/pieces';
import { lawOfPlate, pointsOf, type OldStack } from '../../../geometry/old-plate/plate-law';
import { readSvg } from '../../../geometry/old-plate/svg';
import { plateAmong, vaneOf } from '../../../geometry/old-plate/vane';

const cache = createEdgeCache();
const design = defaultDesign();
design.sections[0]!.law = 'capacitance';
const derivation = derive(design, { cache });
if (!derivation.ok) throw new Error('no plates');
const { derived } = derivation;
const original = derived.sections[0]!;
const files = cutFiles('Original', derived);
const rotorFile = (kind: 'dxf' | 'svg'): string =>
  files.find((file) => file.kind === kind && file.label.startsWith('Rotor plate'))!.text;

const stack: OldStack = {
  rotorPlates: 14,
  statorPlates: 15,
  airGap: 0.5,
  rotorThickness: 0.8,
  statorThickness: 0.8,
  cutoutRadius: design.cutoutRadius,
  statorSector: design.statorSector,
  overhang: design.overhang,
  travel: design.travel,
};

function lawFrom(drawing: Drawing, direction: 1 | -1 = 1) {
  const { paths, circles } = outlinesIn(drawing);
  const { blade } = vaneOf(plateAmong(paths), circles[0]!, design.cutoutRadius, direction);
  return { blade, law: lawOfPlate(design, 0, blade, stack, cache) };
}

function at(angle: readonly number[], values: readonly number[], wanted: number): number {
  const after = Math.max(
    1,
    angle.findIndex((a) => a >= wanted - 1e-12),
  );
  const [a, b] = [angle[after - 1]!, angle[after]!];
  const t = (wanted - a) / (b - a);
  return values[after - 1]! + t * (values[after]! - values[after - 1]!);
}

describe.each([
  ['dxf', () => readDxf(rotorFile('dxf'))],
  ['svg', () => readSvg(rotorFile('svg'))],
] as const)('the product’s own %s, read back', (_kind, read) => {
  const { blade, law } = lawFrom(read());

  test('has the blade that was cut, within 0.02 mm and its sector within 0.1°', () => {
    expect(Math.abs(blade.sector - design.rotorSector)).toBeLessThan((0.1 * Math.PI) / 180);
    expect(Math.abs(Math.max(...blade.radius) - original.sweepRadius)).toBeLessThan(0.02);
  });

  test('makes the law of the design within 0.02 % of the range', () => {
    const { angle, achieved, from, to } = original.law;
    const range = original.totalMax - original.totalMin;
    const offset = at(law.angle, law.capacitance, from) - at(angle, achieved, from);
    for (let i = 0; i <= 20; i++) {
      const shaft = from + ((to - from) * i) / 20;
      const difference = at(law.angle, law.capacitance, shaft) - at(angle, achieved, shaft);
      expect(Math.abs(difference - offset) / range).toBeLessThan(2e-4);
    }
  });

  test('is told to be nearest to equal steps of capacitance', () => {
    expect(law.named[0]!.law).toBe('capacitance');
  });

  test('gives a new design with another gap the same law', () => {
    const copy = structuredClone(design);
    const section = copy.sections[0]!;
    Object.assign(section, {
      law: 'points',
      targetKind: 'terminals',
      // Frame, and room for a trimmer: other plates have another open capacitance.
      lawPoints: pointsOf(law, section.frameAllowance + 3e-12),
      airGap: 0.6,
      rotorPlates: 16,
      statorPlates: 17,
    });
    const result = derive(copy, { cache });
    if (!result.ok) throw new Error(JSON.stringify(result.findings));
    expect(result.derived.sections[0]!.law.largestInner.fraction).toBeLessThan(1e-3);
  });
});

test('a half disc drawn by hand: what the area formula gives, and some per cent of edges', () => {
  // R 20, hole Ø 6 at 50, 30: SVG in mm, y downwards, flat side through the centre.
  const { law } = lawFrom(
    readSvg(
      '<svg xmlns="http://www.w3.org/2000/svg" width="100mm" height="100mm" viewBox="0 0 100 100">' +
        '<path d="M30 30 A20 20 0 0 1 70 30 L58 30 A8 8 0 0 1 42 30 Z"/><circle cx="50" cy="30" r="3"/></svg>',
    ),
  );
  // C = ε·n·(π/2)·(R² − rc²)/g (textbook).
  const area = (8.8541878188e-15 * 1.000537 * 28 * (Math.PI / 2) * (20 ** 2 - 9 ** 2)) / 0.5;
  const range = Math.max(...law.capacitance) - Math.min(...law.capacitance);
  expect(range / area).toBeGreaterThan(0.9);
  expect(range / area).toBeLessThan(1.1);
});

test('drawn the other way round it meshes the other way: the same law', () => {
  const mirrored = readDxf(rotorFile('dxf'));
  const flip = {
    circles: mirrored.circles.map((circle) => ({ ...circle, y: -circle.y })),
    pieces: mirrored.pieces.map(({ vertices, closed }) => ({
      closed,
      vertices: vertices.map(({ x, y, bulge }) => ({ x, y: -y, bulge: -bulge })),
    })),
  };
  const there = lawFrom(mirrored).law.capacitance;
  const back = lawFrom(flip, -1).law.capacitance;
  back.forEach((value, i) => expect(value / there[i]!).toBeCloseTo(1, 3));
});

const svg = (body: string, rest = ''): string =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="50mm" viewBox="0 0 50 50" ${rest}>${body}</svg>`;
const dxf = (entities: string): string =>
  `0\nSECTION\n2\nENTITIES\n${entities}0\nENDSEC\n0\nEOF\n`;
const line = (a: string, b: string, c: string, d: string): string =>
  `0\nLINE\n8\n0\n10\n${a}\n20\n${b}\n11\n${c}\n21\n${d}\n`;

describe('files that can’t be read say why, at once', () => {
  test.each([
    ['no DXF', () => readDxf('hello'), /no DXF/],
    ['bytes', () => readDxf(String.fromCharCode(0, 1, 2, 255).repeat(1000)), /no DXF/],
    ['a spline', () => readDxf(dxf('0\nSPLINE\n8\n0\n')), /SPLINE is not read/],
    [
      'a block',
      () => readDxf(dxf('0\nINSERT\n8\n0\n2\nX\n10\n0\n20\n0\n')),
      /INSERT is not read/,
    ],
    ['open ends', () => outlinesIn(readDxf(dxf(line('0', '0', '10', '0')))), /open at/],
    ['no number', () => readDxf(dxf(line('nan', '0', '10', '0'))), /no numbers|can't be read/],
    [
      'too many lines',
      () => readDxf(dxf(line('0', '0', '1', '0').repeat(6000))),
      /at most 5000/,
    ],
    ['no SVG', () => readSvg('<html></html>'), /no SVG/],
    [
      'entities',
      () => readSvg(`<!DOCTYPE svg [<!ENTITY a "b">]>${svg('<path d="M0 0"/>')}`),
      /entities/,
    ],
    ['a script', () => readSvg(svg('<script>alert(1)</script>')), /<script> is not read/],
    ['a picture', () => readSvg(svg('<image href="http://x/y.png"/>')), /<image> is not read/],
    ['a reference', () => readSvg(svg('<use href="#a"/>')), /<use> is not read/],
    ['nesting', () => readSvg(svg('<g>'.repeat(60))), /nested/],
    ['many elements', () => readSvg(svg('<circle r="1"/>'.repeat(6000))), /more than 5000/],
    ['shear', () => readSvg(svg('<path d="M0 0h1v1z" transform="skewX(20)"/>')), /transform/],
    [
      'stretch',
      () => readSvg(svg('<path d="M0 0h1v1z" transform="scale(1 2)"/>')),
      /stretched/,
    ],
    ['nothing', () => plateAmong(outlinesIn(readSvg(svg(''))).paths), /no closed outline/],
    [
      'no blade',
      () =>
        vaneOf(
          plateAmong(outlinesIn(readSvg(svg('<path d="M0 0h2v2z"/>'))).paths),
          { x: 1, y: -1 },
          9,
          1,
        ),
      /reaches over the cut-out/,
    ],
    [
      'all round',
      () =>
        vaneOf(
          plateAmong(outlinesIn(readSvg(svg('<rect width="40" height="40"/>'))).paths),
          { x: 20, y: -20 },
          9,
          1,
        ),
      /all round/,
    ],
  ] as const)('%s', (_name, read, message) => {
    expect(read).toThrow(DrawingError);
    expect(read).toThrow(message);
  });

  test('a million nested tags do not hang', () => {
    const start = performance.now();
    expect(() => readSvg(svg('<g'.repeat(300_000)))).not.toThrow(RangeError);
    expect(performance.now() - start).toBeLessThan(20_000);
  });
});

test('units: an inch drawing is 25.4 times as large, transforms and viewBox are followed', () => {
  const inches = readDxf(
    `0\nSECTION\n2\nHEADER\n9\n$INSUNITS\n70\n1\n0\nENDSEC\n${dxf('0\nCIRCLE\n8\n0\n10\n1\n20\n0\n40\n0.5\n')}`,
  );
  expect(inches.unitKnown).toBe(true);
  expect(inches.circles[0]).toMatchObject({ x: 25.4, radius: 12.7 });
  expect(readDxf(dxf('0\nCIRCLE\n8\n0\n10\n1\n20\n0\n40\n0.5\n')).unitKnown).toBe(false);
  const { circles } = readSvg(
    '<svg width="100mm" viewBox="0 0 200 200"><g transform="translate(20 40) rotate(90)"><circle cx="10" cy="0" r="4"/></g></svg>',
  );
  expect(circles[0]!.x).toBeCloseTo(10, 9);
  expect(circles[0]!.y).toBeCloseTo(-25, 9);
  expect(circles[0]!.radius).toBeCloseTo(2, 9);
});
