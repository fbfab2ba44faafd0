/** The law that an old plate makes with a stator, through the kernel's field model. */

import type { Blade } from '../blade';
import { checkDesign } from '../check';
import type { Design } from '../design';
import { stackCapacitance, type EdgeCache } from '../field/cell-field';
import { lawBetween, type NamedLaw } from '../law';
import type { LawPoint } from '../law-points';
import { overlapAt } from '../overlap';
import { outlinesOf, platesOf, settingOf, shareOf } from '../setting';
import { turnOf } from '../turn';
import { DrawingError } from './pieces';

/** The stack that the old plates stood in; angles in rad, lengths in mm. */
export interface OldStack {
  readonly rotorPlates: number;
  readonly statorPlates: number;
  readonly airGap: number;
  readonly rotorThickness: number;
  readonly statorThickness: number;
  readonly cutoutRadius: number;
  readonly statorSector: number;
  readonly overhang: number;
  readonly travel: number;
}

export interface PlateLaw {
  /** Shaft angle from the open stop, rad. */
  readonly angle: readonly number[];
  /** Capacitance of the plates alone, F. */
  readonly capacitance: readonly number[];
  /** Where it begins to rise and where it ends. */
  readonly from: number;
  readonly to: number;
  /** How far each named law between the same ends lies off, of the range, nearest first. */
  readonly named: readonly { readonly law: NamedLaw; readonly deviation: number }[];
}

const STEPS = 90;

/** Of the range; less than this in a step is no rise. */
const RISES = 2e-4;

/** The design in whose terms the old stack is reckoned. */
function designOf(base: Design, index: number, blade: Blade, stack: OldStack): Design {
  const section = {
    ...base.sections[index]!,
    law: 'capacitance' as const,
    statorForm: 'even' as const,
    dielectric: 'air' as const,
    rotorPlates: stack.rotorPlates,
    statorPlates: stack.statorPlates,
    airGap: stack.airGap,
    rotorThickness: stack.rotorThickness,
    statorThickness: stack.statorThickness,
  };
  return checkDesign({
    ...base,
    arrangement: 'single',
    sense: 'anticlockwise',
    frame: 'none',
    statorEdgeOffset: 0,
    openRest: 0,
    meshedRest: 0,
    rotorSector: blade.sector,
    statorSector: stack.statorSector,
    cutoutRadius: stack.cutoutRadius,
    overhang: stack.overhang,
    travel: stack.travel,
    sections: [section],
  });
}

/** @throws DrawingError where the stack can't be; KernelError for a value out of bounds */
export function lawOfPlate(
  base: Design,
  index: number,
  blade: Blade,
  stack: OldStack,
  cache: EdgeCache,
): PlateLaw {
  const design = designOf(base, index, blade, stack);
  const [section] = design.sections;
  if (Math.abs(stack.rotorPlates - stack.statorPlates) > 1) {
    throw new DrawingError(
      'Rotor and stator plates alternate: their counts differ by one at most.',
    );
  }
  if (stack.cutoutRadius <= design.hubRadius) {
    throw new DrawingError(
      `The cut-out must be larger than the hub of the design, ${design.hubRadius} mm.`,
    );
  }
  const turn = turnOf(design);
  const setting = settingOf(design, turn, section!, cache);
  const outlines = outlinesOf(setting, blade);
  if ('code' in outlines) throw new DrawingError(`${outlines.label}: ${outlines.change}`);
  const share = shareOf(setting, blade, outlines, null);
  const plates = platesOf(setting, blade);
  const angle = Array.from({ length: STEPS + 1 }, (_, i) => (turn.travel * i) / STEPS);
  const mesh = angle.map((shaft) => shaft + turn.meshAtOpen);
  const curves = { cutoutRadius: design.cutoutRadius, blade };
  const capacitance = overlapAt(outlines.rotor, outlines.stator, mesh, curves).map(
    (overlap, i) =>
      setting.permittivity *
      stackCapacitance(setting.gaps, setting.edges, plates, share, overlap, mesh[i]!),
  );
  // Outside of what the kernel would call the law itself, passing edges disturb it.
  const { lawFrom, lawTo } = turnOf({ ...design, openRest: null, meshedRest: null });
  return { angle, capacitance, ...read(angle, capacitance, [lawFrom, lawTo]) };
}

function read(
  angle: readonly number[],
  capacitance: readonly number[],
  [earliest, latest]: readonly [number, number],
): Pick<PlateLaw, 'from' | 'to' | 'named'> {
  const range = Math.max(...capacitance) - Math.min(...capacitance);
  const rises = capacitance.map(
    (value, i) =>
      i > 0 &&
      angle[i - 1]! >= earliest &&
      angle[i]! <= latest &&
      value - capacitance[i - 1]! > RISES * range,
  );
  const end = rises.lastIndexOf(true);
  // Back from the end as long as it rises.
  let begin = end;
  while (begin > 0 && rises[begin]) begin -= 1;
  const [low, high] = [capacitance[begin]!, capacitance[end]!];
  const names: NamedLaw[] = ['capacitance', 'wavelength', 'frequency', 'logarithmic'];
  const named = names.map((law) => {
    const { total } = lawBetween(law, low, high);
    let deviation = 0;
    for (let i = begin; i <= end; i++) {
      const x = (angle[i]! - angle[begin]!) / (angle[end]! - angle[begin]!);
      deviation = Math.max(deviation, Math.abs(capacitance[i]! - total(x)) / (high - low));
    }
    return { law, deviation };
  });
  return {
    from: angle[begin]!,
    to: angle[end]!,
    named: named.sort((a, b) => a.deviation - b.deviation),
  };
}

/** The law as a table for a new design; `besides` is what stands beside the plates, F. */
export function pointsOf(
  { angle, capacitance, from, to }: PlateLaw,
  besides: number,
): LawPoint[] {
  return angle.flatMap((at, i): LawPoint[] =>
    at >= from - 1e-12 && at <= to + 1e-12 ? [[at - from, capacitance[i]! + besides]] : [],
  );
}
