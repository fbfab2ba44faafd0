import type { SectionResult } from '@/geometry';
import { resonantFrequency } from '@/geometry/resonance';
import { toDegrees } from './degrees';
import { fixedUnit, type FixedUnit } from './fixed-unit';
import { valueAt } from './interpolate';

/** A section's law in the units of the chart. All arrays have the same length. */
export interface LawSeries {
  /** Degrees. */
  readonly angle: number[];
  /** In the unit of `capacitance`. */
  readonly target: (number | null)[];
  readonly achieved: number[];
  /** What the area of the overlap alone would give. */
  readonly areaOnly: number[];
  /** To the second stator, where there is one. */
  readonly other: number[] | null;
  /** Achieved less target, percent of the capacitance range. */
  readonly error: (number | null)[];
  /** Where the error is largest, degrees, and its value there. */
  readonly largest: { readonly angle: number; readonly error: number };
  /** In the unit of `frequency`; null without a coil. */
  readonly tuned: number[] | null;
  readonly capacitance: FixedUnit;
  readonly frequency: FixedUnit | null;
}

function unitsOf({ totalMin, totalMax, inductance }: SectionResult) {
  return {
    capacitance: fixedUnit(totalMax, 'capacitance'),
    frequency:
      inductance === null
        ? null
        : fixedUnit(resonantFrequency(totalMin, inductance), 'frequency'),
  };
}

export function lawSeries(section: SectionResult): LawSeries {
  const { law, inductance } = section;
  const range = section.totalMax - section.totalMin;
  const { capacitance, frequency } = unitsOf(section);
  const { angle } = law.largestError;
  return {
    angle: law.angle.map(toDegrees),
    target: law.target.map((total) => (total === null ? null : capacitance.scale(total))),
    achieved: law.achieved.map(capacitance.scale),
    areaOnly: law.areaOnly.map(capacitance.scale),
    other: law.other && law.other.map(capacitance.scale),
    error: law.error.map((error) => (error === null ? null : (100 * error) / range)),
    largest: {
      angle: toDegrees(angle),
      error: (100 * law.largestError.capacitance) / range,
    },
    tuned:
      frequency &&
      law.achieved.map((total) => frequency.scale(resonantFrequency(total, inductance!))),
    capacitance,
    frequency,
  };
}

/** What a section gives at one shaft angle, written with the units of its chart. */
export interface LawReading {
  readonly capacitance: string;
  readonly frequency: string | null;
}

/** @returns a function of the shaft angle, rad; the achieved total and what it tunes to. */
export function lawReader(section: SectionResult): (angle: number) => LawReading {
  const { law, inductance } = section;
  const { capacitance, frequency } = unitsOf(section);
  return (angle) => {
    const total = valueAt(law.angle, law.achieved, angle);
    return {
      capacitance: `${capacitance.write(total)} ${capacitance.unit}`,
      frequency:
        frequency &&
        `${frequency.write(resonantFrequency(total, inductance!))} ${frequency.unit}`,
    };
  };
}
