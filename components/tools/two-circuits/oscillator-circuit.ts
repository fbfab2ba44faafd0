import type { Design, Section } from '@/geometry';

/** What is asked of the oscillator's section. */
export type OscillatorValues = Pick<
  Section,
  | 'intermediateFrequency'
  | 'oscillatorSide'
  | 'oscillatorCoil'
  | 'oscillatorStray'
  | 'rotorPlates'
  | 'statorPlates'
>;

/** The section that follows section 1, or null. */
export function oscillatorIn({ sections }: Design): number | null {
  const index = sections.findIndex(({ law }, i) => i > 0 && law === 'tracked');
  return index < 0 ? null : index;
}

/** To begin with: as the section stands, or a copy of section 1 with fewer plates. */
export function startingValues(design: Design): OscillatorValues {
  const index = oscillatorIn(design);
  const own = design.sections[index ?? 0]!;
  if (index !== null) return own;
  // An oscillator's capacitance swings less: with as many plates its blade would be narrow.
  const rotorPlates = Math.max(1, Math.round(0.45 * own.rotorPlates));
  const more = Math.sign(own.statorPlates - own.rotorPlates);
  return { ...own, rotorPlates, statorPlates: Math.max(1, rotorPlates + more) };
}

/** The design with an oscillator section of these values: the one that follows, or a new one. */
export function withOscillator(design: Design, values: OscillatorValues): Design {
  const index = oscillatorIn(design) ?? design.sections.length;
  const base = design.sections[index] ?? design.sections[0]!;
  const sections = [...design.sections];
  sections[index] = { ...base, ...values, law: 'tracked' };
  return { ...design, sections };
}
