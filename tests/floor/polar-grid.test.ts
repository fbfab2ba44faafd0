import { describe, expect, it } from 'vitest';
import { floorGrid, polarGrid } from '@/components/floor/polar-grid';

describe('polar grid', () => {
  it.each([0.07, 4, 9.99, 12, 20, 45.3, 60, 99, 100, 300])(
    'holds a reach of %d mm in four to ten rings',
    (reach) => {
      const { rings, radius, step } = polarGrid(reach);
      expect(radius).toBeGreaterThanOrEqual(reach - 1e-9);
      expect(radius).toBeLessThan(reach + step);
      expect(rings.length).toBeGreaterThanOrEqual(4);
      expect(rings.length).toBeLessThanOrEqual(10);
      expect(rings.at(-1)).toBe(radius);
    },
  );

  it('leaves a far limit out of view so that the plates stay readable', () => {
    expect(floorGrid(50, 60)).toMatchObject({ limitShown: true, radius: 60 });
    expect(floorGrid(20, 300)).toMatchObject({ limitShown: false, radius: 20 });
    expect(floorGrid(70, 60)).toMatchObject({ limitShown: true, radius: 70 });
  });

  it('refuses a reach that is not a length', () => {
    expect(() => polarGrid(Number.NaN)).toThrow('NaN mm');
    expect(() => polarGrid(0)).toThrow('0 mm');
  });
});
