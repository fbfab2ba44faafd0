import { valueAt } from '@/components/floor/interpolate';
import { resonantFrequency, type Derived } from '@/geometry';
import { sectionLoss, type Loss } from '@/geometry/electrical/loss';

export interface LawPoint {
  /** rad, F, Hz. Capacitance is what the section has between its terminals. */
  readonly angle: number;
  readonly capacitance: number;
  readonly frequency: number;
  readonly loss: Loss;
}

/** Is there a frequency to reckon with: one to work at, or the band's? */
export function hasFrequency({ design, sections }: Derived, section: number): boolean {
  return (
    design.sections[section]!.workingFrequency !== null ||
    sections[section]!.inductance !== null
  );
}

/** Loss at a fraction of the law, with contacts of so many Ω, at the working frequency or where the band's coil resonates. */
export function lawPoint(
  derived: Derived,
  section: number,
  fraction: number,
  contacts: number,
): LawPoint {
  const { law, inductance, stray } = derived.sections[section]!;
  const angle = law.from + fraction * (law.to - law.from);
  const total = valueAt(law.angle, law.achieved, angle);
  const frequency =
    derived.design.sections[section]!.workingFrequency ?? resonantFrequency(total, inductance!);
  const capacitance = total - stray;
  return {
    angle,
    capacitance,
    frequency,
    loss: sectionLoss(derived, section, frequency, capacitance, contacts),
  };
}
