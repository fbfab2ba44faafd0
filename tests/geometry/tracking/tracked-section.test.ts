/** A tracked oscillator section: what it refuses, and how it tracks when it is finished. */
import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  checkDesign,
  createEdgeCache,
  defaultDesign,
  defaultSection,
  derive,
  type Derived,
  type Design,
  type Finding,
  type Section,
} from '../../../geometry';
import { bandOf, type BandCircuits } from '../../../geometry/tracking/bands';
import { trackingOf } from '../../../geometry/tracking/tracking-error';

const cache = createEdgeCache();

const pairOf = (first: Partial<Section>, second: Partial<Section>): Design => ({
  ...defaultDesign(),
  sections: [
    { ...defaultSection(), ...first },
    { ...defaultSection(), law: 'tracked', ...second },
  ],
});

function refusals(design: Design): readonly Finding[] {
  const result = derive(design, { model: 'edges', cache });
  return result.ok ? [] : result.findings;
}

describe('what can not be followed', () => {
  it('section 1 can not follow itself, and who follows it is told', () => {
    const findings = refusals(pairOf({ law: 'tracked' }, {}));
    expect(findings.map(({ section, parameters }) => [section, parameters[0]])).toEqual([
      [0, 'law'],
      [1, 'law'],
    ]);
    expect(findings[0]!.change).toMatch(/give it a law of its own/);
  });

  it('section 1 needs a coil', () => {
    const [finding, ...others] = refusals(pairOf({ targetKind: 'terminals' }, {}));
    expect(others).toEqual([]);
    expect(finding).toMatchObject({ section: 0, parameters: ['targetKind'] });
    expect(finding!.change).toMatch(/Section 2 follows the frequency of section 1/);
  });

  it('an oscillator below the signal needs a band above the intermediate frequency', () => {
    const [finding] = refusals(
      pairOf({}, { oscillatorSide: 'below', intermediateFrequency: 600e3 }),
    );
    expect(finding).toMatchObject({ code: 'tracking', section: 1, value: 600e3 });
    expect(finding!.limit).toBeCloseTo(530e3, 3);
    expect(finding!.change).toMatch(/under 530 kHz/);
  });

  it('a stray that is too large is named with the coil that would do', () => {
    const [finding] = refusals(pairOf({}, { oscillatorCoil: 2e-3 }));
    expect(finding).toMatchObject({ section: 1, value: 15e-12, quantity: 'capacitance' });
    expect(finding!.parameters).toEqual(['oscillatorCoil', 'oscillatorStray']);
    const coil = Number(/under ([\d.]+) µH/.exec(finding!.change)![1]) * 1e-6;
    expect(refusals(pairOf({}, { oscillatorCoil: 0.5 * coil }))).toEqual([]);
  });
});

it('a design stored before oscillator sections came still loads', () => {
  const stored: Record<string, unknown> = { ...defaultSection() };
  for (const key of [
    'intermediateFrequency',
    'oscillatorSide',
    'oscillatorCoil',
    'oscillatorStray',
  ]) {
    delete stored[key];
  }
  const design = checkDesign({ ...defaultDesign(), sections: [stored] });
  expect(design.sections[0]).toEqual(defaultSection());
});

describe('the worked pair', () => {
  let derived: Derived;
  beforeAll(() => {
    const url = new URL('../../../public/examples/tracked-pair.json', import.meta.url);
    const { design } = JSON.parse(readFileSync(url, 'utf8')) as { design: unknown };
    const result = derive(checkDesign(design), { cache });
    if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
    derived = result.derived;
  });

  it('tracks within 0.2 kHz over the whole band from the finished outlines', () => {
    const tracking = trackingOf(derived, 1)!;
    expect(tracking.places).toHaveLength(81);
    expect(tracking.places[0]!.signal).toBeCloseTo(1700e3, -3);
    expect(tracking.places.at(-1)!.signal).toBeCloseTo(530e3, -3);
    expect(Math.abs(tracking.worst.error)).toBeLessThan(0.2e3);
    expect(trackingOf(derived, 0)).toBeNull();
  });

  const medium: BandCircuits = {
    name: 'medium wave',
    signalCoil: 240e-6,
    signalStray: 0,
    oscillatorStray: 0,
    intermediate: 455e3,
    side: 'above',
    padder: 'none',
  };

  it('serves its own band as one of several, and another one much worse', () => {
    const [first, second] = derived.sections;
    const own = bandOf(derived, 1, {
      ...medium,
      signalCoil: first!.inductance!,
      signalStray: first!.stray + first!.trimmer,
      oscillatorStray: second!.stray,
    });
    expect(own.low).toBeCloseTo(530e3, -3);
    expect(own.high).toBeCloseTo(1700e3, -3);
    expect(own.setting.coil / second!.inductance!).toBeCloseTo(1, 2);
    const alone = Math.abs(trackingOf(derived, 1)!.worst.error);
    expect(own.setting.peak).toBeLessThan(alone * 1.01);

    const short = { ...medium, signalCoil: 3e-6, signalStray: 20e-12, oscillatorStray: 20e-12 };
    const other = bandOf(derived, 1, short);
    expect(other.setting.peak / other.high).toBeGreaterThan((20 * own.setting.peak) / own.high);
    expect(other.low).toBeGreaterThan(3e6);
  });

  it('says so when no oscillator can work below a band', () => {
    expect(() =>
      bandOf(derived, 1, {
        ...medium,
        signalStray: 40e-12,
        side: 'below',
        intermediate: 700e3,
      }),
    ).toThrow(
      /^Intermediate frequency: 700 kHz is not below the band “medium wave”; give less/,
    );
  });
});
