import { describe, expect, test } from 'vitest';
import {
  checkDesign,
  defaultDesign,
  KernelError,
  sectionParameters,
  sharedParameters,
  type Parameter,
} from '../../geometry';

function refusal(input: unknown): KernelError {
  try {
    checkDesign(input);
  } catch (error) {
    if (error instanceof KernelError) return error;
    throw error;
  }
  throw new Error('accepted');
}

const withShared = (key: string, value: unknown): unknown => ({
  ...defaultDesign(),
  [key]: value,
});
const withSection = (key: string, value: unknown): unknown => {
  const design = defaultDesign();
  return { ...design, sections: [{ ...design.sections[0]!, [key]: value }] };
};

const all: [string, Parameter, (value: unknown) => unknown, string][] = [
  ...Object.entries(sharedParameters).map(
    ([key, p]): [string, Parameter, (value: unknown) => unknown, string] => [
      key,
      p,
      (value) => withShared(key, value),
      key,
    ],
  ),
  ...Object.entries(sectionParameters).map(
    ([key, p]): [string, Parameter, (value: unknown) => unknown, string] => [
      key,
      p,
      (value) => withSection(key, value),
      `sections.0.${key}`,
    ],
  ),
];

describe.each(all)('%s', (_key, parameter, build, path) => {
  test('nonsense is refused by name', () => {
    const missing = parameter.cameLater ? [] : [undefined];
    const text = parameter.kind === 'text' ? ['x'.repeat(parameter.longest + 1)] : ['x'];
    const rows =
      parameter.kind === 'points'
        ? [
            ['x'],
            [[0, 1, 2]],
            [
              [1, 1],
              [0, 1],
            ],
          ]
        : [[]];
    for (const nonsense of [...text, ...missing, ...rows, {}, NaN, Infinity, true]) {
      const error = refusal(build(nonsense));
      expect(error.path).toBe(path);
      expect(error.message).toContain(parameter.label);
    }
  });

  test('bounds are inclusive and the message says what would work', () => {
    if (parameter.kind === 'choice') {
      for (const option of parameter.options)
        expect(() => checkDesign(build(option.value))).not.toThrow();
      return;
    }
    if (parameter.kind === 'points' || parameter.kind === 'text') return;
    expect(() => checkDesign(build(parameter.min))).not.toThrow();
    expect(() => checkDesign(build(parameter.max))).not.toThrow();
    const error = refusal(build(parameter.max * 2));
    expect(error.code).toBe('out-of-bounds');
    expect(error.value).toBe(parameter.max * 2);
    expect(error.message).toMatch(/give .+ to .+/);
  });

  test('its default lies inside its bounds', () => {
    expect(() => checkDesign(build(parameter.default))).not.toThrow();
  });
});

test('the message names field, value and range', () => {
  expect(refusal(withSection('airGap', -0.2)).message).toBe(
    'Air gap: -0.2 mm is out of range; give 0.1 mm to 15 mm',
  );
  expect(refusal(withSection('rotorPlates', 2.5)).message).toContain(
    '2.5 is not a whole number',
  );
});

test('unknown parameters and wrong section counts are refused', () => {
  expect(refusal(withShared('colour', 'red')).path).toBe('colour');
  expect(refusal(withSection('colour', 'red')).path).toBe('sections.0.colour');
  expect(refusal(withShared('sections', [])).code).toBe('section-count');
  const five = Array(5).fill(defaultDesign().sections[0]);
  expect(refusal(withShared('sections', five)).value).toBe(5);
  for (const input of [null, 3, 'design', []])
    expect(refusal(input)).toBeInstanceOf(KernelError);
});
