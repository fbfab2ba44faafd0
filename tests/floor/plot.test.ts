import { describe, expect, it } from 'vitest';
import { heightOf, linePath } from '@/components/floor/plot';
import { aboutZero, roundTicks, withRoom } from '@/components/floor/ticks';

describe('round ticks', () => {
  it.each<[number, number, number, number[]]>([
    [12, 420, 5, [100, 200, 300, 400]],
    [0, 1, 5, [0, 0.2, 0.4, 0.6, 0.8, 1]],
    [514, 1735, 5, [1000, 1500]],
    [-0.024, 0.024, 5, [-0.02, -0.01, 0, 0.01, 0.02]],
  ])('%f to %f', (low, high, most, ticks) => {
    const found = roundTicks(low, high, most);
    expect(found.every((tick) => tick >= low - 1e-9 && tick <= high + 1e-9)).toBe(true);
    if (found.length <= most + 1) expect(found).toEqual(expect.arrayContaining([ticks[1]]));
  });
  it('steps are even and few', () => {
    for (const high of [1, 3, 7.3, 42, 999]) {
      const found = roundTicks(0, high, 5);
      expect(found.length).toBeLessThanOrEqual(6);
      expect(found.length).toBeGreaterThanOrEqual(2);
      const steps = found.slice(1).map((tick, i) => Number((tick - found[i]!).toPrecision(9)));
      expect(new Set(steps).size).toBe(1);
    }
  });
});

describe('ranges', () => {
  it('leaves room above and below', () => {
    const [low, high] = withRoom([10, 110]);
    expect(low).toBeCloseTo(4, 9);
    expect(high).toBeCloseTo(116, 9);
  });
  it('lies about 0 with a round end, gaps left out', () => {
    expect(aboutZero([null, 0.013, -0.017])).toBe(0.02);
    expect(aboutZero([null])).toBe(1);
  });
});

describe('line', () => {
  it('stands high where the value is high, and breaks at a gap', () => {
    expect(heightOf(400, [0, 400])).toBe(0);
    expect(heightOf(100, [0, 400])).toBe(0.75);
    const path = linePath([0, 90, 120, 180], { values: [0, 200, null, 400] }, [0, 400]);
    expect(path).toBe('M0.000 100.000L90.000 50.000M180.000 0.000');
  });
});
