import { describe, expect, it, vi } from 'vitest';
import { createAngleStore } from '@/components/floor/angle-store';

describe('angle store', () => {
  it('holds the angle between 0 and the travel', () => {
    const store = createAngleStore(Math.PI);
    store.set(4);
    expect(store.get()).toBe(Math.PI);
    store.set(-1);
    expect(store.get()).toBe(0);
    store.set(1.25);
    expect(store.get()).toBe(1.25);
  });

  it('tells every listener before set returns, and only when the angle moves', () => {
    const store = createAngleStore(Math.PI);
    const floor = vi.fn();
    const chart = vi.fn();
    store.subscribe(floor);
    store.subscribe(chart);
    store.set(2);
    expect(floor.mock.calls).toEqual([[2]]);
    expect(chart.mock.calls).toEqual([[2]]);
    store.set(2);
    expect(floor).toHaveBeenCalledTimes(1);
    store.set(9);
    store.set(10);
    expect(floor.mock.calls).toEqual([[2], [Math.PI]]);
  });

  it('stops telling a listener that left, also when it leaves while being told', () => {
    const store = createAngleStore(Math.PI);
    const heard: number[] = [];
    const second = vi.fn();
    const leave = store.subscribe((angle) => {
      heard.push(angle);
      leave();
    });
    store.subscribe(second);
    store.set(1);
    store.set(2);
    expect(heard).toEqual([1]);
    expect(second.mock.calls).toEqual([[1], [2]]);
  });

  it('brings the angle into a shorter travel and says so', () => {
    const store = createAngleStore(Math.PI);
    const listener = vi.fn();
    store.set(3);
    store.subscribe(listener);
    store.setTravel(2);
    expect(store.get()).toBe(2);
    expect(listener.mock.calls).toEqual([[2]]);
    store.setTravel(3);
    expect(store.get()).toBe(2);
    expect(listener).toHaveBeenCalledTimes(1);
  });

  it('refuses what is not an angle, with the value', () => {
    const store = createAngleStore(Math.PI);
    expect(() => store.set(Number.NaN)).toThrow('invalid shaft angle: NaN rad');
    expect(() => store.setTravel(0)).toThrow('invalid travel: 0 rad');
    expect(() => createAngleStore(Number.POSITIVE_INFINITY)).toThrow('invalid travel');
    expect(store.get()).toBe(0);
  });
});
