import { expect, test } from 'vitest';
import { sectionParameters, sharedParameters } from '../../geometry';
import { parameterHelp } from '../../geometry/parameter-help';

test('every parameter says what it means, and nothing else is said', () => {
  const keys = [...Object.keys(sectionParameters), ...Object.keys(sharedParameters)].sort();
  expect(Object.keys(parameterHelp).sort()).toEqual(keys);
  for (const help of Object.values(parameterHelp)) expect(help).toMatch(/^[A-Z].{10,}[.]$/s);
});
