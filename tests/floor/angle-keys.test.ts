import { describe, expect, it } from 'vitest';
import { angleAfterKey, readDegrees } from '@/components/floor/angle-keys';
import { toDegrees, toRadians } from '@/components/floor/degrees';
import { ruleNumbers } from '@/components/floor/rule-scale';

describe('keys of the angle rule', () => {
  it('steps by whole degrees from where a drag ended', () => {
    expect(angleAfterKey('ArrowRight', false, 45.3, 180)).toBe(46);
    expect(angleAfterKey('ArrowLeft', false, 45.3, 180)).toBe(45);
    expect(angleAfterKey('ArrowUp', false, 45, 180)).toBe(46);
    expect(angleAfterKey('ArrowDown', false, 45, 180)).toBe(44);
  });

  it('steps by whole tens with Shift and with the page keys', () => {
    expect(angleAfterKey('ArrowRight', true, 45, 180)).toBe(50);
    expect(angleAfterKey('PageUp', false, 50, 180)).toBe(60);
    expect(angleAfterKey('PageDown', false, 45, 180)).toBe(40);
  });

  it('goes to the ends, and leaves other keys alone', () => {
    expect(angleAfterKey('Home', false, 45, 170)).toBe(0);
    expect(angleAfterKey('End', false, 45, 170)).toBe(170);
    expect(angleAfterKey('Tab', false, 45, 170)).toBeNull();
  });

  it('meets every degree on the way up and down, through radians', () => {
    let up = 0;
    for (let degree = 1; degree <= 180; degree++) {
      up = toRadians(angleAfterKey('ArrowRight', false, toDegrees(up), 180)!);
      expect(toDegrees(up)).toBeCloseTo(degree, 9);
    }
    let down = up;
    for (let degree = 179; degree >= 0; degree--) {
      down = toRadians(angleAfterKey('ArrowLeft', false, toDegrees(down), 180)!);
      expect(toDegrees(down)).toBeCloseTo(degree, 9);
    }
  });
});

describe('a typed angle', () => {
  it.each([
    ['115', 115],
    [' 115.5° ', 115.5],
    ['115,5 deg', 115.5],
    ['.5', 0.5],
    ['180', 180],
    ['0', 0],
  ])('reads %s', (text, degrees) => {
    expect(readDegrees(text, 180)).toEqual({ degrees });
  });

  it.each([
    ['', '0 to 180'],
    ['half', '“half” is no angle'],
    ['12 mm', '“12 mm” is no angle'],
    ['181', '181° is outside the travel. Type 0 to 180.'],
    ['-1', '-1° is outside the travel'],
  ])('refuses %j and says what would work', (text, problem) => {
    expect(readDegrees(text, 180)).toEqual({ problem: expect.stringContaining(problem) });
  });
});

describe('numbers of the angle rule', () => {
  it('stand every 30° and at the end where there is room', () => {
    expect(ruleNumbers(180)).toEqual([0, 30, 60, 90, 120, 150, 180]);
    expect(ruleNumbers(140)).toEqual([0, 30, 60, 90, 120, 140]);
    expect(ruleNumbers(95)).toEqual([0, 30, 60, 95]);
  });
});
