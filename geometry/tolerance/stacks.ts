/** Stacks built by chance within their tolerances, and what they are worth. */

import { drawWith, randomFrom } from './random';
import type { Response } from './response';
import { toleranceNames, type ToleranceName, type Tolerances } from './tolerances';

/** Sum over all gaps of 1/gap, tilt counted, and of the gaps' changes: one set of plates. */
interface Gaps {
  readonly inverse: number;
  readonly change: number;
}

/** A gap is never less than this share of its nominal: there plates would touch. */
const LEAST_GAP = 0.05;

/**
 * C of a tilted plate over that of an even one: atanh(x)/x, x the tilt at the rim over the gap
 * (exact for a gap that goes evenly from one side to the other).
 */
export function tiltFactor(x: number): number {
  const size = Math.min(Math.abs(x), 0.95);
  return size < 1e-4 ? 1 + (size * size) / 3 : Math.atanh(size) / size;
}

type Draw = ReturnType<typeof drawWith>;

function gapsBy(
  { gap, rotorPlates, statorPlates }: Response,
  tolerances: Tolerances,
  draw: Draw,
): Gaps {
  const { thickness, spacer } = tolerances;
  const off = (name: ToleranceName): number =>
    draw(tolerances[name].amount, tolerances[name].spread);
  // Errors of both stacks add up along shaft and posts; each starts at its middle.
  const faces = (count: number): { low: number[]; high: number[] } => {
    const low: number[] = [];
    const high: number[] = [];
    let at = 0;
    for (let i = 0; i < count; i++) {
      low.push(at);
      at += draw(thickness.amount, thickness.spread);
      high.push(at);
      at += draw(spacer.amount, spacer.spread);
    }
    const middle = (low[0]! + high[count - 1]!) / 2;
    return { low: low.map((z) => z - middle), high: high.map((z) => z - middle) };
  };
  const rotor = faces(rotorPlates);
  const stator = faces(statorPlates);
  const shift = off('centring');
  const lean = off('tilt');
  const statorFirst = statorPlates >= rotorPlates;
  let inverse = 0;
  let change = 0;
  for (let i = 0; i < rotorPlates + statorPlates - 1; i++) {
    const k = i >> 1;
    const even = i % 2 === 0;
    // Faces that look at each other: the first plate of the stack's kind, and the next one.
    const [before, after] = statorFirst ? [stator, rotor] : [rotor, stator];
    const lower = even ? before.high[k]! : after.high[k]!;
    const upper = even ? after.low[k]! : before.low[k + 1]!;
    const rotorAbove = even === statorFirst;
    const moved = upper - lower + (rotorAbove ? shift : -shift);
    const width = Math.max(LEAST_GAP * gap, gap + moved);
    inverse += tiltFactor(lean / width) / width;
    change += width - gap;
  }
  return { inverse, change };
}

/** Capacitance of one stack at the response's angles, F. */
export function stackByChance(
  response: Response,
  tolerances: Tolerances,
  draw: Draw,
): number[] {
  const { area, areaPerAngle, outline, cutout, restPerGap, nominal, gap, gaps, packs } =
    response;
  const off = (name: ToleranceName): number =>
    draw(tolerances[name].amount, tolerances[name].spread);
  let inverse = 0;
  let change = 0;
  for (let pack = 0; pack < packs; pack++) {
    const own = gapsBy(response, tolerances, draw);
    inverse += own.inverse / packs;
    change += own.change / packs;
  }
  const edge = off('outline');
  const hole = off('cutout');
  let turned = 0;
  for (let i = 0; i < response.rotorPlates; i++) turned += off('angle') / response.rotorPlates;
  return nominal.map(
    (value, i) =>
      value +
      (area[i]! + areaPerAngle[i]! * turned + outline[i]! * edge - cutout[i]! * hole) *
        inverse -
      (area[i]! * gaps) / gap +
      restPerGap[i]! * change,
  );
}

export interface Band {
  /** rad */
  readonly angle: readonly number[];
  /** Error against the target, F, of 5, 50 and 95 of 100 stacks. */
  readonly low: readonly number[];
  readonly middle: readonly number[];
  readonly high: readonly number[];
}

export interface Outcome {
  readonly stacks: number;
  /** As built, and with a trimmer set where the law begins. */
  readonly asBuilt: Band;
  readonly aligned: Band;
  /** Share of stacks whose largest aligned error stays within the limit. */
  readonly yield: number;
  /** Root mean square of the aligned error at each tolerance alone, of the range, largest first. */
  readonly alone: readonly { readonly name: ToleranceName; readonly spread: number }[];
}

/** Stacks by which each tolerance is tried alone. */
const ALONE = 300;

function bandOf(angle: readonly number[], errors: readonly (readonly number[])[]): Band {
  const at = (share: number): number[] =>
    angle.map((_, i) => {
      const sorted = Float64Array.from(errors, (error) => error[i]!).sort();
      return sorted[Math.round(share * (sorted.length - 1))]!;
    });
  return { angle, low: at(0.05), middle: at(0.5), high: at(0.95) };
}

const aligned = (errors: readonly number[]): number[] =>
  errors.map((error) => error - errors[0]!);

function aloneSpread(
  response: Response,
  tolerances: Tolerances,
  name: ToleranceName,
  seed: number,
): number {
  const only = Object.fromEntries(
    toleranceNames.map((other) => [
      other,
      other === name ? tolerances[other] : { ...tolerances[other], amount: 0 },
    ]),
  ) as unknown as Tolerances;
  const draw = drawWith(randomFrom(seed));
  let sum = 0;
  for (let i = 0; i < ALONE; i++) {
    const stack = stackByChance(response, only, draw);
    const change = aligned(stack.map((value, k) => value - response.nominal[k]!));
    sum += change.reduce((square, value) => square + value * value, 0) / change.length;
  }
  return Math.sqrt(sum / ALONE) / response.range;
}

/**
 * Builds stacks and tells of them; a generator, so that whoever runs it can show how far it is.
 * @param limit largest aligned error a stack may have, of the range
 */
export function* stacksByChance(
  response: Response,
  tolerances: Tolerances,
  { stacks, seed, limit }: { stacks: number; seed: number; limit: number },
): Generator<number, Outcome> {
  const draw = drawWith(randomFrom(seed));
  const errors: number[][] = [];
  const alignedErrors: number[][] = [];
  let good = 0;
  for (let i = 0; i < stacks; i++) {
    const error = stackByChance(response, tolerances, draw).map(
      (value, k) => value - response.target[k]!,
    );
    const after = aligned(error);
    errors.push(error);
    alignedErrors.push(after);
    if (after.every((value) => Math.abs(value) <= limit * response.range)) good += 1;
    if (i % 100 === 99) yield i + 1;
  }
  const alone = toleranceNames
    .map((name) => ({ name, spread: aloneSpread(response, tolerances, name, seed) }))
    .sort((a, b) => b.spread - a.spread);
  return {
    stacks,
    asBuilt: bandOf(response.angle, errors),
    aligned: bandOf(response.angle, alignedErrors),
    yield: good / stacks,
    alone,
  };
}
