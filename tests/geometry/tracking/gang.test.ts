/** A gang of four sections, two of them followed by an oscillator: everything is made for each. */
import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  checkDesign,
  createEdgeCache,
  derive,
  type Derived,
  type Design,
} from '../../../geometry';
import { dialOf } from '../../../geometry/dial/dial';
import { drawingOf } from '../../../geometry/drawing/drawing';
import { couplingsOf } from '../../../geometry/electrical/coupling';
import { cutFiles } from '../../../geometry/files';
import { balanceOf } from '../../../geometry/mechanics/balance';
import { partsOf } from '../../../geometry/parts/assembly';
import { responseOf } from '../../../geometry/tolerance/response';
import { alignmentOf } from '../../../geometry/tracking/alignment';
import { trackingOf } from '../../../geometry/tracking/tracking-error';

const SECTIONS = [0, 1, 2, 3];
let derived: Derived;

beforeAll(() => {
  const url = new URL('../../../public/examples/tracked-pair.json', import.meta.url);
  const { design } = JSON.parse(readFileSync(url, 'utf8')) as { design: Design };
  const [signal, oscillator] = design.sections;
  const gang = {
    ...design,
    largestDepth: 200,
    postCircleRadius: 40,
    screens: 'between',
    // The second oscillator works on another intermediate frequency, and with a coil of its own.
    sections: [
      signal,
      oscillator,
      signal,
      {
        ...oscillator,
        intermediateFrequency: 110e3,
        oscillatorCoil: 200e-6,
        rotorPlates: 10,
        statorPlates: 11,
      },
    ],
  };
  const result = derive(checkDesign(gang), { model: 'edges', cache: createEdgeCache() });
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  ({ derived } = result);
});

describe('four sections', () => {
  it('leave nothing that can not be built', () => {
    expect(derived.findings.filter(({ severity }) => severity === 'fail')).toEqual([]);
  });

  it('have two oscillators that track, each with its own intermediate frequency', () => {
    const apart = [1, 3].map((index) => {
      const { worst } = trackingOf(derived, index)!;
      expect(Math.abs(worst.error)).toBeLessThan(2e3);
      return worst.oscillator - worst.signal;
    });
    expect(apart[0]! / 455e3).toBeCloseTo(1, 2);
    expect(apart[1]! / 110e3).toBeCloseTo(1, 1);
    expect(derived.sections[3]!.inductance).toBe(200e-6);
  });

  it('are all in files, parts and drawing', () => {
    const names = cutFiles('Gang', derived).map(({ name }) => name);
    const keys = partsOf(derived).map(({ key }) => key);
    const sheets = drawingOf(derived, {
      name: 'Gang',
      owner: 'Workshop',
      number: 'G1',
      revision: '1',
      issued: '2026-12-01',
      creator: 'A. Person',
      approved: '',
      status: 'Draft',
      waivers: [],
      materialOf: (material) => material,
    });
    const lettered = JSON.stringify(sheets);
    for (const section of SECTIONS) {
      for (const role of ['rotor', 'stator']) {
        expect(names.some((name) => name.includes(`s${section + 1}-${role}`))).toBe(true);
        expect(keys).toContain(`s${section + 1}-${role}`);
      }
      expect(lettered).toContain(`section ${section + 1}`);
    }
    expect(keys).toContain('screen');
  });

  it('each have a dial, tolerances, an unbalance and steps of alignment', () => {
    const balance = balanceOf(derived);
    expect(balance.sections).toHaveLength(4);
    expect(couplingsOf(derived).map(({ section }) => section)).toEqual([0, 1, 2]);
    const aligned = new Set(alignmentOf(derived)!.map(({ section }) => section));
    for (const section of SECTIONS) {
      expect(aligned).toContain(section);
      expect(balance.sections[section]).toBeGreaterThan(0);
      expect(responseOf(derived, section).range).toBeGreaterThan(50e-12);
      const dial = dialOf(derived.sections[section]!, derived.turn, {
        quantity: 'frequency',
        form: 'round',
        moves: 'pointer',
        sense: 'clockwise',
        radius: 60,
        place: 'upper',
        open: 0,
        ratio: 1,
        drum: 150,
        hole: 6,
        title: '',
      });
      expect(dial.marks.length).toBeGreaterThan(30);
    }
  });
});
