/** The worked pair in its files: the laws of both sections from the DXF as it is read again. */
import { readFileSync } from 'node:fs';
import DxfParser, { type ICircleEntity, type ILwpolylineEntity } from 'dxf-parser';
import { expect, it } from 'vitest';
import { checkDesign, createEdgeCache, derive, type Path } from '../../../geometry';
import { cutFiles } from '../../../geometry/files';
import { overlapAt } from '../../../geometry/overlap';
import { layOutEars } from '../../../geometry/post';
import { resonantFrequency } from '../../../geometry/resonance';
import { bladeOf } from '../../../geometry/rotor';
import { platesOf, settingOf, shareOf } from '../../../geometry/setting';
import { stackCapacitance } from '../../../geometry/field/cell-field';
import { BLADE_STEPS } from '../../../geometry/solve-blade';
import { trackingOf } from '../../../geometry/tracking/tracking-error';

const cache = createEdgeCache();
const url = new URL('../../../public/examples/tracked-pair.json', import.meta.url);
const design = checkDesign(
  (JSON.parse(readFileSync(url, 'utf8')) as { design: unknown }).design,
);
const derivation = derive(design, { cache });
if (!derivation.ok) throw new Error('no plates');
const { derived } = derivation;
const { turn } = derived;
const files = cutFiles('Pair', derived);

function plateOf(part: string) {
  const file = files.find(({ name, kind }) => name.includes(part) && kind === 'dxf');
  const { entities } = new DxfParser().parseSync(file!.text)!;
  const outline = entities.find(({ type }) => type === 'LWPOLYLINE') as ILwpolylineEntity;
  const circles = entities.filter(({ type }) => type === 'CIRCLE') as ICircleEntity[];
  const outside: Path = {
    kind: 'path',
    vertices: outline.vertices.map(({ x, y, bulge }) => ({ x, y, bulge: bulge ?? 0 })),
  };
  const holes = circles.map(({ center, radius }) => ({
    kind: 'circle' as const,
    x: center.x,
    y: center.y,
    radius,
  }));
  return { outside, holes, fitDeviation: 0 };
}

/** Frequencies over the law with the plates of the files, Hz. */
function tunedByFiles(index: number): number[] {
  const result = derived.sections[index]!;
  const rotor = plateOf(`s${index + 1}-rotor`);
  const stator = plateOf(`s${index + 1}-stator`);
  const blade = bladeOf(rotor.outside, design.rotorSector, BLADE_STEPS);
  const setting = settingOf(design, turn, design.sections[index]!, cache);
  const ears = layOutEars(design, turn, blade, setting.form);
  const share = shareOf(setting, blade, { rotor, stator, ears }, null);
  const angles = result.law.angle.filter((_, i) => result.law.target[i] !== null);
  const mesh = angles.map((angle) => angle + turn.meshAtOpen);
  const plates = platesOf(setting, blade);
  const curves = { cutoutRadius: design.cutoutRadius, blade };
  return overlapAt(rotor, stator, mesh, curves).map((overlap, i) => {
    const own = stackCapacitance(setting.gaps, setting.edges, plates, share, overlap, mesh[i]!);
    const besides = result.stray + result.frame + result.trimmer;
    return resonantFrequency(setting.permittivity * own + besides, result.inductance!);
  });
}

it('the pair tracks with the plates of its files as on the screen, within 0.1 %', () => {
  const { places } = trackingOf(derived, 1)!;
  const [signal, oscillator] = [tunedByFiles(0), tunedByFiles(1)];
  places.forEach((place, i) => {
    expect(Math.abs(signal[i]! / place.signal - 1)).toBeLessThan(1e-3);
    expect(Math.abs(oscillator[i]! / place.oscillator - 1)).toBeLessThan(1e-3);
    // The difference that is tracked, of the intermediate frequency.
    const between = oscillator[i]! - signal[i]!;
    expect(Math.abs(between - (place.oscillator - place.signal)) / 455e3).toBeLessThan(1e-3);
  });
});
