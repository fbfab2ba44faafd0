import { expect, test } from 'vitest';
import { createEdgeCache, defaultDesign, derive, type Design } from '../../../geometry';
import { airPath } from '../../../geometry/electrical/gap';
import { faceResistance, sectionLoss, skinDepth } from '../../../geometry/electrical/loss';

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
  // High enough for a sheet to be many skin depths thick.
  const low = sectionLoss(plates, 0, 25e6, 300e-12);
  const high = sectionLoss(plates, 0, 100e6, 300e-12);
  expect(high.plates / low.plates).toBeCloseTo(2, 6);
  expect(low.q / high.q).toBeCloseTo(8, 5);
  expect(low.q).toBeCloseTo(1 / (2 * Math.PI * 25e6 * 300e-12 * (low.plates + low.rods)), 6);
});

test('a face of a thick sheet has ρ/δ, of a thin one 2ρ/t; never less than either', () => {
  const [resistivity, thickness] = [6.6e-5, 0.8];
  for (let frequency = 10; frequency < 1e9; frequency *= 1.7) {
    const depth = skinDepth('brass', frequency);
    const face = faceResistance('brass', thickness, frequency);
    if (thickness > 20 * depth) expect(face / (resistivity / depth)).toBeCloseTo(1, 7);
    if (thickness < depth / 20)
      expect(face / ((2 * resistivity) / thickness)).toBeCloseTo(1, 6);
    expect(face).toBeGreaterThan((2 * resistivity) / thickness - 1e-12);
    // The standing wave in a sheet of some π/2 depths takes off 8 % at most (computed).
    expect(face).toBeGreaterThan((0.91 * resistivity) / depth);
  }
});

test('contacts add to the resistance that Q goes by', () => {
  const plates = derived();
  const [bare, worn] = [0, 0.02].map((ohms) => sectionLoss(plates, 0, 1e6, 300e-12, ohms));
  expect(bare!.qWithContacts).toBe(bare!.q);
  expect(1 / worn!.qWithContacts - 1 / worn!.q).toBeCloseTo(
    2 * Math.PI * 1e6 * 300e-12 * 0.02,
    12,
  );
});

test('steel holds the current in a thinner skin; spacers go by their own metal', () => {
  const brass = sectionLoss(derived(), 0, 10e6, 300e-12);
  const steel = sectionLoss(
    derived((design) => (design.material = 'steel')),
    0,
    10e6,
    300e-12,
  );
  expect(steel.plates).toBeGreaterThan(10 * brass.plates);
  const onSteel = sectionLoss(
    derived((design) => {
      design.spacerMaterial = 'steel';
      design.finish = 'silver';
    }),
    0,
    10e6,
    300e-12,
  );
  expect(onSteel.plates).toBeLessThan(brass.plates);
  expect(onSteel.rods).toBeCloseTo(steel.rods, 12);
});

test('silver loses as the root of the resistivities less', () => {
  const bare = sectionLoss(derived(), 0, 50e6, 300e-12);
  const plated = sectionLoss(
    derived((design) => (design.finish = 'silver')),
    0,
    50e6,
    300e-12,
  );
  expect(plated.plates / bare.plates).toBeCloseTo(Math.sqrt(1.59 / 6.6), 6);
});

test('half discs of even current: both radial integrals against fine sums', () => {
  const plates = derived((design) => {
    design.sections[0]!.law = 'capacitance';
  });
  const { design, sections } = plates;
  const section = design.sections[0]!;
  const [inner, outer] = [design.cutoutRadius, sections[0]!.sweepRadius];
  const square = outer ** 2 - inner ** 2;
  // Rings of a sector in series, each with the current that has gathered up to it.
  let [inwards, outwards] = [0, 0];
  const steps = 20000;
  for (let i = 0; i < steps; i++) {
    const r = inner + ((i + 0.5) / steps) * (outer - inner);
    const ring = (outer - inner) / steps / (2 * r);
    inwards += (((outer ** 2 - r ** 2) / square) ** 2 * ring) / design.rotorSector;
    outwards += (((r ** 2 - inner ** 2) / square) ** 2 * ring) / design.statorSector;
  }
  const neck = Math.log(inner / design.spacerRadius) / (4 * Math.PI);
  const reach = (design.statorSector * outer) / design.postCount / 2;
  const posts = Math.log(reach / design.postSpacerRadius) / (2 * Math.PI * design.postCount);
  const face = faceResistance('brass', 0.8, 1e6);
  const expected =
    face * ((inwards + neck) / section.rotorPlates + (outwards + posts) / section.statorPlates);
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
