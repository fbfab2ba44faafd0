/**
 * Lays parts out on sheets by their true shapes. Several ways of filling are tried on a grid and
 * the best one is improved by exchanges in its order; the same input gives the same layout.
 */

import { contourArea, contourBounds } from '../measure';
import { clearanceOf } from './clearance';
import { coverOf, grownPolygon } from './cover';
import { fill, keepBarred, type Filling, type Grid, type Pose, type Way } from './fill';
import type { Layout, LayoutSettings, Piece, Stock } from './layout';
import { waysOf } from './ways';

/** Cells across a part of middling size, and the bounds of a cell, mm. */
const CELLS_ACROSS = 220;
const FINEST = 0.1;
const COARSEST = 1;

/** Poses of all parts together: each pair of them costs the same again. */
const MOST_POSES = 48;

/** Orders tried beyond the first ways. */
const EXCHANGES = 24;

/** mm. Rounding that must not cost a row of cells. */
const ROUNDING = 1e-6;

function cellFor(pieces: readonly Piece[]): number {
  const boxes = pieces.map(({ outside }) => {
    const { minX, minY, maxX, maxY } = contourBounds(outside);
    return (maxX - minX) * (maxY - minY);
  });
  const middling = Math.sqrt(boxes.reduce((sum, box) => sum + box, 0) / boxes.length);
  return Math.min(COARSEST, Math.max(FINEST, middling / CELLS_ACROSS));
}

/**
 * Rotations that are tried for each piece, rad: fewer where there are many kinds of parts, but a
 * part's twin turned half round where that is asked for. A round part needs none.
 */
function turnsOf(pieces: readonly Piece[], rotations: number): number[][] {
  const shaped = pieces.filter(({ outside }) => outside.kind !== 'circle').length;
  const even = [4, 2, 1].find((step) => rotations % step === 0)!;
  let each = rotations;
  for (let k = 2; each * shaped > MOST_POSES && rotations / k >= even; k++) {
    if (rotations % (k * even) === 0) each = rotations / k;
  }
  return pieces.map(({ outside }) =>
    outside.kind === 'circle'
      ? [0]
      : Array.from({ length: each }, (_, k) => (2 * Math.PI * k) / each),
  );
}

/** Repeatable numbers from 0 to 1 (Lehmer's generator, Park and Miller 1988, from memory). */
function numbers(): () => number {
  let state = 20261201;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

/** Sheets one by one, at most as many as there are parts. */
function singles(stocks: readonly Stock[], most: number): { stock: number; sheet: Stock }[] {
  return stocks.flatMap((sheet, stock) =>
    Array.from({ length: Math.min(sheet.count, most) }, () => ({ stock, sheet })),
  );
}

interface Worth {
  readonly left: number;
  readonly sheets: number;
  /** Cells taken on the last sheet. */
  readonly edge: number;
}

function worthOf({ lying, left }: Filling): Worth {
  const last = lying.reduce((most, { sheet }) => Math.max(most, sheet), -1);
  const edge = lying.reduce(
    (most, { sheet, x, pose }) =>
      sheet === last ? Math.max(most, x + pose.cover.width) : most,
    0,
  );
  return { left: left.length, sheets: last + 1, edge };
}

function better(a: Worth, b: Worth): boolean {
  if (a.left !== b.left) return a.left < b.left;
  return a.sheets !== b.sheets ? a.sheets < b.sheets : a.edge < b.edge;
}

function exchanged(order: readonly number[], random: () => number): number[] {
  const next = [...order];
  const swaps = 1 + Math.floor(random() * 3);
  for (let k = 0; k < swaps; k++) {
    const i = Math.floor(random() * next.length);
    const j = Math.floor(random() * next.length);
    [next[i], next[j]] = [next[j]!, next[i]!];
  }
  return next;
}

/**
 * @param stocks sheets in the order in which they are to be used
 * @param progress told how much is done; answering false stops it
 * @returns null when stopped
 */
export function nest(
  pieces: readonly Piece[],
  stocks: readonly Stock[],
  { gap, margin, rotations }: LayoutSettings,
  progress: (done: number, of: number) => boolean = () => true,
): Layout | null {
  const wanted = pieces.filter(({ quantity }) => quantity > 0);
  const count = wanted.reduce((sum, { quantity }) => sum + quantity, 0);
  if (count === 0) {
    return { placements: [], sheets: [], left: [], nearest: null, nearestEdge: null };
  }
  const cell = cellFor(wanted);
  const turns = turnsOf(wanted, rotations);
  const poses = wanted.map(({ outside }, part): Pose[] => {
    const polygon = grownPolygon(outside, gap / 2);
    return turns[part]!.map((angle, turn) => ({
      part,
      turn,
      cover: coverOf(polygon, angle, cell),
    }));
  });
  // Half a gap of each part may lie in the margin.
  const single = singles(stocks, count);
  const inset = margin - gap / 2;
  const cells = (size: number): number => Math.floor((size - 2 * inset + ROUNDING) / cell);
  const grids = single.map(({ sheet }): Grid => ({
    width: cells(sheet.width),
    height: cells(sheet.height),
  }));
  const ways = waysOf(
    poses,
    wanted.map(({ outside, quantity }) => ({ area: Math.abs(contourArea(outside)), quantity })),
  );
  const barredOf = keepBarred();
  const exchanges = wanted.length > 1 ? EXCHANGES : 0;
  const of = (ways.length + exchanges) * count;
  let done = 0;
  let best: { filling: Filling; way: Way; worth: Worth } | null = null;
  const attempt = (way: Way, number: number): boolean => {
    done = number * count;
    const filling = fill(way, grids, barredOf, () => progress(++done, of));
    if (!filling) return false;
    const worth = worthOf(filling);
    if (!best || better(worth, best.worth)) best = { filling, way, worth };
    return true;
  };
  const bestSoFar = (): NonNullable<typeof best> => best!;
  for (const [number, way] of ways.entries()) if (!attempt(way, number)) return null;
  const random = numbers();
  for (let k = 0; k < exchanges; k++) {
    const { way } = bestSoFar();
    const order = exchanged(way.order, random);
    if (!attempt({ ...way, order }, ways.length + k)) return null;
  }
  if (!progress(of, of)) return null;

  const { lying, left } = bestSoFar().filling;
  const placements = lying.map(({ pose, sheet, x, y }) => ({
    key: wanted[pose.part]!.key,
    sheet,
    x: inset + x * cell - pose.cover.minX,
    y: inset + y * cell - pose.cover.minY,
    angle: turns[pose.part]![pose.turn]!,
  }));
  const sheets = single.slice(0, bestSoFar().worth.sheets).map(({ stock, sheet }, index) => {
    const edge = lying.reduce(
      (most, one) =>
        one.sheet === index ? Math.max(most, one.x + one.pose.cover.width) : most,
      0,
    );
    const { width, height } = sheet;
    const used = Math.min(width, 2 * inset + edge * cell);
    return { stock, width, height, used };
  });
  const outlines = new Map(wanted.map(({ key, outside }) => [key, outside]));
  return {
    placements,
    sheets,
    left: wanted.flatMap(({ key }, part) => {
      const quantity = left.filter((p) => p === part).length;
      return quantity > 0 ? [{ key, quantity }] : [];
    }),
    ...clearanceOf(outlines, placements, sheets),
  };
}
