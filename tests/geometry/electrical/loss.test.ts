import { expect, test } from 'vitest';
import { createEdgeCache, defaultDesign, derive, type Design } from '../../../geometry';
import { airPath } from '../../../geometry/electrical/gap';
import { sectionLoss } from '../../../geometry/electrical/loss';

const cache = createEdgeCache();

function derived(edit: (design: Design) => void = () => undefined) {
  const design = defaultDesign();
  design.largestRadius = 150;
  edit(design);
  const derivation = derive(design, { cache, model: 'edges' });
  if (!derivation.ok) throw new Error(JSON.stringify(derivation.findings));
  return derivation.derived;
}

test('resistance goes with the root of frequency, Q as 1/(ω·C·R)', () => {
  const plates = derived();
  const low = sectionLoss(plates, 0, 1e6, 300e-12);
  const high = sectionLoss(plates, 0, 4e6, 300e-12);
  expect(high.plates / low.plates).toBeCloseTo(2, 9);
  expect(low.q / high.q).toBeCloseTo(8, 9);
  expect(low.q).toBeCloseTo(1 / (2 * Math.PI * 1e6 * 300e-12 * (low.plates + low.rods)), 6);
});

test('silver loses as the root of the resistivities less', () => {
  const bare = sectionLoss(derived(), 0, 1e6, 300e-12);
  const plated = sectionLoss(
    derived((design) => (design.finish = 'silver')),
    0,
    1e6,
    300e-12,
  );
  expect(plated.plates / bare.plates).toBeCloseTo(Math.sqrt(1.59 / 6.6), 9);
});

test('one half disc of even current: the radial integral against a fine sum', () => {
  // Rings of the sector in series, each with the current of what lies outside it.
  const plates = derived((design) => {
    design.sections[0]!.law = 'capacitance';
  });
  const { design, sections } = plates;
  const [inner, outer] = [design.cutoutRadius, sections[0]!.sweepRadius];
  const { skinDepth } = sectionLoss(plates, 0, 1e6, 1e-10);
  const surface = 6.6e-5 / skinDepth;
  let path = 0;
  const steps = 20000;
  for (let i = 0; i < steps; i++) {
    const r = inner + ((i + 0.5) / steps) * (outer - inner);
    const current = (outer ** 2 - r ** 2) / (outer ** 2 - inner ** 2);
    path += (current ** 2 * (outer - inner)) / steps / (2 * design.rotorSector * r);
  }
  const neck = Math.log(inner / design.spacerRadius) / (4 * Math.PI);
  const expected = surface * ((path + neck) / 14 + path / 15);
  expect(sectionLoss(plates, 0, 1e6, 1e-10).plates / expected).toBeCloseTo(1, 5);
});

test('the air path: shared in series, more than its way beside a film, none with a disc', () => {
  const design = defaultDesign();
  const section = design.sections[0]!;
  expect(airPath(design, section)).toEqual({ length: 0.5, share: 1 });
  expect(airPath({ ...design, arrangement: 'split-stator' }, section).share).toBe(0.5);
  const film = {
    ...section,
    dielectric: 'film' as const,
    filmThickness: 0.2,
    filmPermittivity: 2,
    permittivity: 1,
  };
  expect(airPath(design, film).length).toBeCloseTo(0.3, 12);
  expect(airPath(design, film).share).toBeCloseTo(0.3 / 0.4, 12);
  expect(airPath(design, { ...film, dielectric: 'disc' }).length).toBe(0);
});

test('a working voltage in thin air asks for more gap', () => {
  const finding = (altitude: number) =>
    derived((design) => {
      design.altitude = altitude;
      design.sections[0]!.workingVoltage = 450;
    }).findings.find(({ code }) => code === 'gap-voltage')!;
  expect(finding(0).severity).toBe('ok');
  expect(finding(5e6).severity).toBe('warn');
  expect(finding(5e6).limit).toBeLessThan(finding(0).limit);
});
