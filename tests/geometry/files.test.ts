/**
 * Files as a machinist's software meets them: read again by readers of others' making.
 * DXF group codes: DXF reference ($INSUNITS 4 = millimetres, LWPOLYLINE 70 bit 1 = closed,
 * 42 = bulge), published.
 */
import DxfParser, { type ICircleEntity, type ILwpolylineEntity } from 'dxf-parser';
import { describe, expect, test } from 'vitest';
import {
  defaultDesign,
  defaultSection,
  derive,
  type Derived,
  type Path,
  type Plate,
} from '../../geometry';
import { cutFiles, slugOf, type CutFile } from '../../geometry/files';
import { contourArea, contourBounds } from '../../geometry/measure';
import { auditDxf, hasEzdxf } from '../support/ezdxf';

function derivedOf(sections = 1): Derived {
  const design = defaultDesign();
  design.largestDepth = 200;
  design.sections = Array.from({ length: sections }, () => defaultSection());
  const derivation = derive(design);
  if (!derivation.ok) throw new Error('no plates');
  return derivation.derived;
}

const derived = derivedOf();
const files = cutFiles('Bench try', derived);
const { rotor, stator } = derived.sections[0]!;
const only = (part: string, kind: string): CutFile =>
  files.find((file) => file.name.includes(part) && file.kind === kind)!;

/** Area inside a closed LWPOLYLINE: chords and the segments that the bulges add. */
function areaOf(polyline: ILwpolylineEntity): number {
  return polyline.vertices.reduce((area, a, i) => {
    const b = polyline.vertices[(i + 1) % polyline.vertices.length]!;
    const included = 4 * Math.atan(a.bulge ?? 0);
    const chord = Math.hypot(b.x - a.x, b.y - a.y);
    const radius = included === 0 ? 0 : chord / 2 / Math.sin(included / 2);
    const segment = (radius * radius * (included - Math.sin(included))) / 2;
    return area + (a.x * b.y - b.x * a.y) / 2 + segment;
  }, 0);
}

describe.each<[string, Plate]>([
  ['rotor', rotor],
  ['stator', stator],
])('%s.dxf', (role, plate) => {
  const dxf = new DxfParser().parseSync(only(`s1-${role}`, 'dxf').text)!;
  const outer = dxf.entities.filter((e) => e.type === 'LWPOLYLINE') as ILwpolylineEntity[];
  const circles = dxf.entities.filter((e) => e.type === 'CIRCLE') as ICircleEntity[];

  test('is in millimetres', () => {
    expect(dxf.header.$INSUNITS).toBe(4);
    expect(dxf.header.$MEASUREMENT).toBe(1);
  });

  test('holds one closed outline and its holes as circles, nothing else to cut', () => {
    expect(outer).toHaveLength(1);
    expect(outer[0]!.shape).toBe(true);
    expect(circles).toHaveLength(plate.holes.length);
    const cut = dxf.entities.filter(({ layer }) => layer.endsWith('-CUT'));
    expect(cut).toHaveLength(1 + plate.holes.length);
    // Beside it words that no machine cuts.
    expect(
      dxf.entities.filter((entity) => !cut.includes(entity)).map(({ layer }) => layer),
    ).toEqual(['NOTES']);
  });

  test('keeps outer and inner cuts on layers of their own', () => {
    const part = `S1-${role.toUpperCase()}`;
    expect(outer[0]!.layer).toBe(`${part}-OUTER-CUT`);
    for (const circle of circles) expect(circle.layer).toBe(`${part}-INNER-CUT`);
  });

  test("has the plate's area", () => {
    const holes = circles.reduce((sum, { radius }) => sum + Math.PI * radius * radius, 0);
    expect((areaOf(outer[0]!) - holes) / plate.area).toBeCloseTo(1, 7);
  });

  test('has no point twice in a row', () => {
    const { vertices } = outer[0]!;
    vertices.forEach((a, i) => {
      const b = vertices[(i + 1) % vertices.length]!;
      expect(Math.hypot(b.x - a.x, b.y - a.y)).toBeGreaterThan(0.01);
    });
  });
});

test('the file of one of each part of a sheet holds each once, apart from one another', () => {
  const all = derivedOf(2);
  const file = cutFiles('Pair', all).find(
    (f) => f.name.includes('one-of-each_brass') && f.kind === 'dxf',
  )!;
  const dxf = new DxfParser().parseSync(file.text)!;
  const boxes = (
    dxf.entities.filter((e) => e.type === 'LWPOLYLINE') as ILwpolylineEntity[]
  ).map((e) =>
    contourBounds({
      kind: 'path',
      vertices: e.vertices.map((v) => ({ x: v.x, y: v.y, bulge: v.bulge ?? 0 })),
    } satisfies Path),
  );
  expect(boxes).toHaveLength(4);
  boxes.slice(1).forEach((box, i) => expect(box.minX).toBeGreaterThan(boxes[i]!.maxX + 5));
});

test('names carry design, part, material, thickness and quantity', () => {
  expect(only('s1-rotor', 'dxf').name).toBe(
    'bench-try_s1-rotor_brass-cuzn37_0.80mm_14off_nominal.dxf',
  );
  expect(only('s1-stator', 'svg').name).toBe(
    'bench-try_s1-stator_brass-cuzn37_0.80mm_15off_nominal.svg',
  );
  expect(new Set(files.map((file) => file.name)).size).toBe(files.length);
});

test.each([
  ['Gang Nº 2 / “left”', 'gang-no-2-left'],
  ['../../etc', 'etc'],
  ['Überlagerer', 'uberlagerer'],
  ['銅', 'design'],
])('the name %s becomes %s in file names', (name, slug) => {
  expect(slugOf(name)).toBe(slug);
});

test('the same design gives the same bytes, whatever was written before', () => {
  cutFiles('Something else', derivedOf(3));
  expect(cutFiles('Bench try', derivedOf())).toEqual(files);
});

describe('SVG', () => {
  const svg = only('s1-rotor', 'svg').text;

  test('is true to scale in millimetres', () => {
    const [, width, height] = /width="([\d.]+)mm" height="([\d.]+)mm"/.exec(svg)!;
    const box = contourBounds(rotor.outside);
    expect(Number(width)).toBeCloseTo(box.maxX - box.minX, 4);
    expect(Number(height)).toBeCloseTo(box.maxY - box.minY, 4);
    expect(svg).toContain(`viewBox="0 0 ${width} ${height}"`);
  });

  test('keeps arcs as arcs and closes every contour', () => {
    const paths = [...svg.matchAll(/ d="([^"]+)"/g)].map((match) => match[1]!);
    expect(paths).toHaveLength(2);
    for (const path of paths) {
      expect(path.match(/z/gi)).toHaveLength(1);
      expect(path).toMatch(/ a /i);
    }
  });
});

test('the law table has target, achieved and error at every step', () => {
  const rows = only('s1-law', 'csv')
    .text.trim()
    .split('\r\n')
    .map((row) => row.split(','));
  const { law } = derived.sections[0]!;
  const names = rows[0]!;
  const column = (name: string, row: number): string => rows[row + 1]![names.indexOf(name)]!;
  expect(rows).toHaveLength(law.angle.length + 1);
  const end = law.angle.indexOf(law.to);
  const error = Number(column('achieved_pF', end)) - Number(column('target_pF', end));
  expect(Number(column('error_pF', end))).toBeCloseTo(error, 3);
  expect(Number(column('target_kHz', end))).toBeCloseTo(530, 2);
  expect(Number(column('shaft_angle_deg', law.angle.length - 1))).toBe(180);
  // In the rest before the law nothing is asked.
  expect(column('target_pF', 0)).toBe('');
  expect(column('error_pF', 0)).toBe('');
  expect(Number(column('achieved_pF', 0))).toBeGreaterThan(0);
});

test('the design file derives to the same plates', () => {
  const stored = JSON.parse(only('design', 'json').text) as {
    design: Parameters<typeof derive>[0];
  };
  expect(derive(stored.design)).toEqual({ ok: true, derived });
});

test.runIf(hasEzdxf)('ezdxf audits every DXF without a message', () => {
  const drawings = files.filter(({ kind }) => kind === 'dxf');
  expect(drawings.length).toBeGreaterThan(4);
  expect(auditDxf(drawings)).toEqual(drawings.map(() => '0 0 4 True'));
});

test('areas agree with the kernel whichever way they are summed', () => {
  const holes = stator.holes.reduce((sum, hole) => sum + contourArea(hole), 0);
  expect(contourArea(stator.outside) - holes).toBeCloseTo(stator.area, 9);
});
