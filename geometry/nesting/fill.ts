/** One way of filling sheets: parts in a given order, each as far to the left as it goes. */

import { barredBy, type Barred } from './barred';
import type { Cover } from './cover';
import { Room } from './room';

/** A part in one of its rotations, as the grid sees it. */
export interface Pose {
  /** Which part, and which of its rotations. */
  readonly part: number;
  readonly turn: number;
  readonly cover: Cover;
}

/** Grid of one kind of sheet. Cells. */
export interface Grid {
  readonly width: number;
  readonly height: number;
}

/** Barred places of pairs of poses, worked out once. */
export type BarredOf = (placed: Pose, coming: Pose) => Barred;

export function keepBarred(): BarredOf {
  const kept = new Map<Pose, Map<Pose, Barred>>();
  return (placed, coming) => {
    let row = kept.get(placed);
    if (!row) kept.set(placed, (row = new Map()));
    let barred = row.get(coming);
    if (!barred) row.set(coming, (barred = barredBy(placed.cover, coming.cover)));
    return barred;
  };
}

/** What decides between rotations: where the right edge, the weight or the left edge comes. */
export type Measure = 'edge' | 'weight' | 'middle';

export interface Way {
  /** Poses tried for each part. */
  readonly poses: readonly (readonly Pose[])[];
  /** Parts in the order in which they are placed. */
  readonly order: readonly number[];
  readonly measure: Measure;
}

export interface Lying {
  readonly pose: Pose;
  readonly sheet: number;
  /** Cell of its cover's first corner. */
  readonly x: number;
  readonly y: number;
}

export interface Filling {
  readonly lying: readonly Lying[];
  /** Parts that no sheet had room for. */
  readonly left: readonly number[];
}

function score({ cover }: Pose, x: number, measure: Measure): number {
  if (measure === 'edge') return x + cover.width;
  return measure === 'weight' ? x + cover.middle : x + cover.width / 2;
}

/** @param step called for each part that has been placed; false stops the filling */
export function fill(
  way: Way,
  grids: readonly Grid[],
  barredOf: BarredOf,
  step: () => boolean,
): Filling | null {
  const lying: Lying[] = [];
  let left = [...way.order];
  for (const [sheet, grid] of grids.entries()) {
    if (left.length === 0) break;
    const rooms = new Map<Pose, Room>();
    const onSheet: Lying[] = [];
    const roomOf = (pose: Pose): Room => {
      let room = rooms.get(pose);
      if (!room) {
        rooms.set(pose, (room = new Room(pose.cover, grid.width, grid.height)));
        for (const other of onSheet) room.bar(barredOf(other.pose, pose), other.x, other.y);
      }
      return room;
    };
    const full = new Set<number>();
    const next: number[] = [];
    for (const part of left) {
      let best: { pose: Pose; x: number; y: number; score: number } | null = null;
      if (!full.has(part)) {
        for (const pose of way.poses[part]!) {
          const at = roomOf(pose).first();
          if (!at) continue;
          const points = score(pose, at.x, way.measure);
          if (!best || points < best.score || (points === best.score && at.y < best.y)) {
            best = { pose, ...at, score: points };
          }
        }
      }
      if (!best) {
        full.add(part);
        next.push(part);
        continue;
      }
      const { pose, x, y } = best;
      onSheet.push({ pose, sheet, x, y });
      for (const [other, room] of rooms) room.bar(barredOf(pose, other), x, y);
      if (!step()) return null;
    }
    lying.push(...onSheet);
    left = next;
  }
  return { lying, left };
}
