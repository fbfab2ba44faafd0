/** Marks of an existing dial: picture to angles, angles to the table of a law. */
import { describe, expect, it } from 'vitest';
import { defaultSection, type LawPoint } from '../../../geometry';
import { lawOf } from '../../../geometry/own-law';
import { resonantFrequency } from '../../../geometry/resonance';
import { targetOf } from '../../../geometry/target';
import {
  dialReading,
  rowsOfDial,
  rowsOfPicture,
  type DialPicture,
} from '../../../geometry/tracking/dial-picture';

const DEGREE = Math.PI / 180;
const centre = { x: 320, y: 410 };

/** A place on the picture at a bearing, y down. */
const at = (bearing: number, radius = 200) => ({
  x: centre.x + radius * Math.cos(bearing),
  y: centre.y + radius * Math.sin(bearing),
});

/** A picture on which the shaft's angle 0 lies at a bearing, turning one way or the other. */
const pictureOf = (from: number, way: 1 | -1, marks = [0, 170 * DEGREE]): DialPicture => ({
  centre,
  references: [
    { ...at(from + way * marks[0]!), angle: marks[0]! },
    { ...at(from + way * marks[1]!, 90), angle: marks[1]! },
  ],
});

describe('a picture of a dial', () => {
  it.each([
    [0.3, 1],
    [2.9, -1],
    [-3, 1],
    [-1.2, -1],
  ] as const)('read from %f, way %i, gives the angles as they were', (from, way) => {
    const { angleAt, seenApart } = dialReading(pictureOf(from, way));
    expect(seenApart).toBeCloseTo(170 * DEGREE, 12);
    for (const angle of [-20, 0, 35, 90, 169, 185].map((degrees) => degrees * DEGREE)) {
      for (const radius of [50, 240]) {
        expect(angleAt(at(from + way * angle, radius))).toBeCloseTo(angle, 10);
      }
    }
  });

  it('spreads what a drive leaves between picture and shaft', () => {
    const { angleAt } = dialReading({
      centre,
      references: [
        { ...at(0), angle: 0 },
        { ...at(150 * DEGREE), angle: 180 * DEGREE },
      ],
    });
    expect(angleAt(at(75 * DEGREE))).toBeCloseTo(90 * DEGREE, 10);
  });

  it('refuses marks that lie together or on the centre', () => {
    expect(() => dialReading(pictureOf(0, 1, [0.5, 0.5 + DEGREE]))).toThrow(
      /^Second reference mark: .* pick two at least 5°/,
    );
    const [first, second] = pictureOf(0, 1).references;
    expect(() =>
      dialReading({ centre, references: [{ ...first, ...centre }, second] }),
    ).toThrow(/^Mark on the centre/);
  });
});

describe('rows of a dial', () => {
  const rows: LawPoint[] = [
    [0.2, 1600e3],
    [1.2, 1100e3],
    [2.2, 700e3],
    [3.2, 540e3],
  ];

  it('are counted from the highest frequency, whichever way the dial runs', () => {
    const counted = rowsOfDial(rows);
    expect(counted.map(([, frequency]) => frequency)).toEqual([1600e3, 1100e3, 700e3, 540e3]);
    counted.forEach(([angle], i) => expect(angle).toBeCloseTo(i, 12));
    const other = rowsOfDial(
      rows.map(([angle, frequency]): LawPoint => [4 - angle, frequency]),
    );
    other.forEach(([angle, frequency], i) => {
      expect(angle).toBeCloseTo(i, 12);
      expect(frequency).toBe(counted[i]![1]);
    });
  });

  it('that turn back or are too few are refused by name', () => {
    expect(() => rowsOfDial(rows.slice(0, 2))).toThrow(/give at least 3$/);
    expect(() => rowsOfDial([...rows, [1.7, 1200e3]])).toThrow(
      /^Rows of the dial: 1200 kHz does not lie between its neighbours/,
    );
  });

  it('picked on a picture become the law of the signal section, and the oscillator follows', () => {
    const frequencies = [1700e3, 1400e3, 1100e3, 900e3, 700e3, 600e3, 530e3];
    const angles = frequencies.map((_, i) => i * 28 * DEGREE);
    const marks = frequencies.map((frequency, i) => ({
      ...at(2 + angles[i]!, 150),
      frequency,
    }));
    const lawPoints = rowsOfPicture(pictureOf(2, 1), marks);
    const first = { ...defaultSection(), law: 'points' as const, lawPoints };
    const second = { ...defaultSection(), law: 'tracked' as const, oscillatorCoil: 120e-6 };
    const target = targetOf(first, 0, first);
    const follows = targetOf(second, 1, first);
    if ('code' in target || 'code' in follows) throw new Error('no target');
    const law = lawOf(first, 0, target, first);
    const tracked = lawOf(second, 1, follows, first);
    if ('code' in law || 'code' in tracked) throw new Error('no law');
    frequencies.forEach((frequency, i) => {
      const x = i / (frequencies.length - 1);
      expect(resonantFrequency(law.total(x), first.inductance) / frequency).toBeCloseTo(1, 9);
      const oscillator = resonantFrequency(tracked.total(x), 120e-6);
      expect((oscillator - frequency) / 455e3).toBeCloseTo(1, 8);
    });
  });
});
