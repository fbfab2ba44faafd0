/**
 * The worked pair goes through files, sheets and bill like a single section, and its DXFs, read by
 * a reader of another's making, track as the screen says.
 */
import { readFileSync } from 'node:fs';
import DxfParser, { type ICircleEntity, type ILwpolylineEntity } from 'dxf-parser';
import { beforeAll, expect, it } from 'vitest';
import {
  checkDesign,
  createEdgeCache,
  derive,
  type Derived,
  type Path,
  type PlateRole,
  type SectionResult,
} from '../../../geometry';
import { cutFiles, type CutFile } from '../../../geometry/files';
import { checkLaw } from '../../../geometry/law-check';
import { lawOf } from '../../../geometry/own-law';
import { bladeOf } from '../../../geometry/rotor';
import { outlinesOf, platesOf, settingOf, shareOf } from '../../../geometry/setting';
import { BLADE_STEPS } from '../../../geometry/solve-blade';
import { targetOf } from '../../../geometry/target';
import { trackingOf } from '../../../geometry/tracking/tracking-error';

const cache = createEdgeCache();
let derived: Derived;
let files: CutFile[];
beforeAll(() => {
  const url = new URL('../../../public/examples/tracked-pair.json', import.meta.url);
  const { design } = JSON.parse(readFileSync(url, 'utf8')) as { design: unknown };
  const result = derive(checkDesign(design), { cache });
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  derived = result.derived;
  files = cutFiles('Bench pair', derived);
});

/** The outline that a machine would cut, from the file alone. */
function outlineOf(index: number, role: PlateRole): Path {
  const { text } = files.find(
    ({ name, kind }) => kind === 'dxf' && name.includes(`_s${index + 1}-${role}_`),
  )!;
  const { entities } = new DxfParser().parseSync(text)!;
  const [outline] = entities.filter(({ type }) => type === 'LWPOLYLINE') as ILwpolylineEntity[];
  if (role === 'rotor') {
    const circles = entities.filter(({ type }) => type === 'CIRCLE') as ICircleEntity[];
    expect(circles.map(({ center }) => [center.x, center.y])).toContainEqual([0, 0]);
  }
  return {
    kind: 'path',
    vertices: outline!.vertices.map(({ x, y, bulge }) => ({ x, y, bulge: bulge ?? 0 })),
  };
}

/** A section's law anew, from the outlines of its files through the field model. */
function readBack(index: number): SectionResult {
  const { design, turn, sections } = derived;
  const section = design.sections[index]!;
  const first = design.sections[0]!;
  const target = targetOf(section, index, first);
  if ('code' in target) throw new Error(target.change);
  const law = lawOf(section, index, target, first);
  if ('code' in law) throw new Error(law.change);
  const [rotor, stator] = (['rotor', 'stator'] as const).map((role) => outlineOf(index, role));
  const blade = bladeOf(rotor!, design.rotorSector, BLADE_STEPS);
  const setting = settingOf(design, turn, section, cache);
  const drawn = outlinesOf(setting, blade);
  if ('code' in drawn) throw new Error(drawn.change);
  const outlines = {
    ...drawn,
    rotor: { ...drawn.rotor, outside: rotor! },
    stator: { ...drawn.stator, outside: stator! },
  };
  const checked = checkLaw({
    law,
    turn,
    totalMin: target.totalMin,
    totalMax: target.totalMax,
    fixed: target.stray + section.frameAllowance,
    rotor: outlines.rotor,
    stator: outlines.stator,
    blade,
    permittivity: setting.permittivity,
    gaps: setting.gaps,
    edges: setting.edges,
    plates: platesOf(setting, blade),
    share: shareOf(setting, blade, outlines, null),
    frame: section.frameAllowance,
    farSide: null,
  });
  return { ...sections[index]!, law: checked.law, trimmer: checked.trimmer };
}

it('tracks from its DXFs within 0.1 % of the intermediate frequency as on the screen', () => {
  const screen = trackingOf(derived, 1)!;
  const read = trackingOf({ ...derived, sections: [readBack(0), readBack(1)] }, 1)!;
  expect(read.places).toHaveLength(screen.places.length);
  const { intermediateFrequency } = derived.design.sections[1]!;
  read.places.forEach((place, i) => {
    const shown = screen.places[i]!;
    expect(place.angle).toBe(shown.angle);
    expect(Math.abs(place.signal / shown.signal - 1)).toBeLessThan(1e-3);
    expect(Math.abs(place.oscillator / shown.oscillator - 1)).toBeLessThan(1e-3);
    expect(Math.abs(place.error - shown.error)).toBeLessThan(1e-3 * intermediateFrequency);
  });
});

it('has plates, a law and places in the bill for either section', () => {
  const names = files.map(({ name }) => name);
  for (const section of ['s1', 's2']) {
    for (const what of [`_${section}-rotor_`, `_${section}-stator_`, `_${section}-law.csv`]) {
      expect(names.some((name) => name.includes(what))).toBe(true);
    }
  }
  const bill = files.find(({ name }) => name.endsWith('_parts.csv'))!.text;
  expect(bill).toContain('section 1');
  expect(bill).toContain('section 2');
  const law = files.find(({ name }) => name.endsWith('_s2-law.csv'))!.text.split('\r\n');
  const column = law[0]!.split(',').indexOf('target_kHz');
  const targets = law.slice(1).flatMap((row) => Number(row.split(',')[column]) || []);
  expect(Math.max(...targets)).toBeCloseTo(1700 + 455, 2);
  expect(Math.min(...targets)).toBeCloseTo(530 + 455, 2);
});
