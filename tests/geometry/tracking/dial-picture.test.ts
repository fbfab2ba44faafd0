/** Marks of an existing dial, from a picture to the law's table. */
import { describe, expect, it } from 'vitest';
import type { LawPoint } from '../../../geometry';
import {
  dialReading,
  rowsOfDial,
  rowsOfPicture,
  type DialPicture,
  type PicturePoint,
} from '../../../geometry/tracking/dial-picture';

const DEGREE = Math.PI / 180;
const centre = { x: 412, y: 305 };

/** Where a bearing, clockwise from the right, lies on the picture. */
const at = (degrees: number, radius = 180): PicturePoint => ({
  x: centre.x + radius * Math.cos(degrees * DEGREE),
  y: centre.y + radius * Math.sin(degrees * DEGREE),
});

const pictureOf = (first: [number, number], second: [number, number]): DialPicture => ({
  centre,
  references: [
    { ...at(first[0]), angle: first[1] * DEGREE },
    { ...at(second[0]), angle: second[1] * DEGREE },
  ],
});

describe('a reading', () => {
  it.each<[string, [number, number], [number, number], [number, number][]]>([
    [
      'clockwise over the top',
      [180, 0],
      [360, 180],
      [
        [270, 90],
        [200, 20],
        [170, -10],
        [5, 185],
      ],
    ],
    [
      'the other way',
      [0, 0],
      [180, 180],
      [
        [90, 90],
        [350, -10],
      ],
    ],
    [
      'against the clock',
      [-20, 10],
      [-140, 130],
      [
        [-80, 70],
        [-150, 140],
        [0, -10],
      ],
    ],
    ['from the meshed end', [300, 170], [130, 0], [[210, 80]]],
    [
      'over more than half a turn',
      [130, 0],
      [40, 270],
      [
        [265, 135],
        [120, -10],
      ],
    ],
  ])('goes %s', (_, first, second, wanted) => {
    const { angleAt, seenApart } = dialReading(pictureOf(first, second));
    expect(seenApart / DEGREE).toBeCloseTo(Math.abs(second[1] - first[1]), 6);
    for (const [bearing, angle] of wanted) {
      expect(angleAt(at(bearing, 90)) / DEGREE).toBeCloseTo(angle, 6);
    }
  });

  it('spreads a drive evenly', () => {
    const { angleAt, seenApart } = dialReading(pictureOf([180, 0], [300, 180]));
    expect(seenApart / DEGREE).toBeCloseTo(120, 6);
    expect(angleAt(at(240)) / DEGREE).toBeCloseTo(90, 6);
  });

  it('refuses marks that lie together or on the centre', () => {
    expect(() => dialReading(pictureOf([180, 0], [181, 180]))).toThrow(/at least 5°/);
    expect(() => dialReading(pictureOf([180, 0], [270, 1]))).toThrow(/at least 5°/);
    expect(() => dialReading({ ...pictureOf([180, 0], [270, 90]), centre: at(180) })).toThrow(
      /^Mark on the centre/,
    );
  });
});

describe('rows of a dial', () => {
  const falling: LawPoint[] = [
    [0.2, 1600e3],
    [1.2, 900e3],
    [2.2, 600e3],
    [3, 530e3],
  ];

  it('begin at nothing, in the order of their angles', () => {
    const rows = rowsOfDial([...falling].reverse());
    expect(rows.map(([, frequency]) => frequency)).toEqual([1600e3, 900e3, 600e3, 530e3]);
    rows.forEach(([angle], i) => expect(angle).toBeCloseTo(falling[i]![0] - 0.2, 12));
  });

  it('are counted from the other end where the frequency rises', () => {
    const rising = falling.map(([angle, frequency]): LawPoint => [3 - angle, frequency]);
    rowsOfDial(rising).forEach(([angle, frequency], i) => {
      expect(frequency).toBe(falling[i]![1]);
      expect(angle).toBeCloseTo(falling[i]![0] - 0.2, 12);
    });
  });

  it('are refused where the frequency turns, or two lie at one angle', () => {
    expect(() => rowsOfDial([...falling, [1.7, 950e3]])).toThrow(/^Rows of the dial: 950 kHz/);
    expect(() => rowsOfDial([...falling, [1.2, 880e3]])).toThrow(/does not lie between/);
    expect(() => rowsOfDial(falling.slice(0, 2))).toThrow(/2 are too few; give at least 3/);
  });

  it('come from marks on a picture', () => {
    const picture = pictureOf([180, 0], [360, 180]);
    const marks = [
      [185, 1600e3],
      [240, 1000e3],
      [350, 540e3],
    ] as const;
    const rows = rowsOfPicture(
      picture,
      marks.map(([bearing, frequency]) => ({ ...at(bearing), frequency })),
    );
    expect(rows.map(([angle]) => Math.round(angle / DEGREE))).toEqual([0, 55, 165]);
  });
});
