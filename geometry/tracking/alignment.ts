/**
 * How the circuits on one shaft are aligned: at which marks, what is turned, in which order and
 * what is seen. Order by common practice of the trade: oscillator before signal circuits, coils at
 * the low end and trimmers at the high end, in turn until neither asks for more.
 */

import type { Derived } from '../derived';
import { formatQuantity } from '../quantity';
import { resonantFrequency } from '../resonance';
import { chebyshevPoints } from './least-peak';
import { oscillatorFrequency } from './tracked-law';
import { trackingOf } from './tracking-error';

export type Adjusted = 'pointer' | 'coil' | 'trimmer' | 'none';

export interface AlignmentStep {
  /** From 1. */
  readonly order: number;
  /** Index of the section whose circuit is worked on; null for the whole set. */
  readonly section: number | null;
  readonly adjust: Adjusted;
  /** Where the shaft stands, rad from the open stop. */
  readonly angle: number;
  /** What the dial shows and the generator gives, Hz; null where nothing is measured. */
  readonly signal: number | null;
  /** Where the circuit worked on oscillates or resonates there, Hz. */
  readonly circuit: number | null;
  /** What is still off there with plates as drawn, Hz; null where that isn't known. */
  readonly left: number | null;
  /** In words: what to do and what to see. */
  readonly words: string;
}

/** A frequency to read on a dial: of three figures at most, and round against the band. */
function rounded(frequency: number, width: number): number {
  const step = 10 ** Math.floor(Math.log10(width / 10));
  return Math.round(frequency / step) * step;
}

const hertz = (value: number): string => formatQuantity(value, 'frequency', 5);
const degrees = (value: number): string => formatQuantity(value, 'angle', 4);

interface Marks {
  readonly high: number;
  readonly middle: number;
  readonly low: number;
  /** Shaft angle at which section 1 is tuned to a frequency, rad. */
  readonly angleAt: (frequency: number) => number;
}

/** The marks of section 1: where two free settings leave least, and the middle to try. */
function marksOf({ sections }: Derived): Marks | null {
  const { law, inductance } = sections[0]!;
  if (inductance === null) return null;
  const inside = law.angle.flatMap((angle, i) =>
    law.target[i] === null
      ? []
      : [{ angle, frequency: resonantFrequency(law.achieved[i]!, inductance) }],
  );
  const band = { low: inside.at(-1)!.frequency, high: inside[0]!.frequency };
  if (inside.some(({ frequency }, i) => i > 0 && frequency >= inside[i - 1]!.frequency)) {
    return null;
  }
  const [low, high] = chebyshevPoints(band, 2) as [number, number];
  const width = band.high - band.low;
  return {
    high: rounded(high, width),
    middle: rounded((low + high) / 2, width),
    low: rounded(low, width),
    angleAt: (frequency) => {
      const after = Math.max(
        1,
        inside.findIndex((place) => place.frequency <= frequency),
      );
      const [a, b] = [inside[after - 1]!, inside[after]!];
      const share = (frequency - a.frequency) / (b.frequency - a.frequency);
      return a.angle + share * (b.angle - a.angle);
    },
  };
}

/** What a finished oscillator section is off at an angle of the shaft, Hz. */
function errorAt(derived: Derived, index: number, angle: number): number | null {
  const places = trackingOf(derived, index)?.places;
  if (!places) return null;
  const after = Math.max(
    1,
    places.findIndex((place) => place.angle >= angle),
  );
  const [a, b] = [places[after - 1]!, places[after]!];
  return a.error + ((angle - a.angle) / (b.angle - a.angle)) * (b.error - a.error);
}

/**
 * The alignment of this design, step by step. A design without an oscillator section that follows
 * has its circuits set one after the other.
 * @returns null where section 1 has no coil or its frequency does not fall all the way: then no
 *   mark says where the shaft stands
 */
export function alignmentOf(derived: Derived): readonly AlignmentStep[] | null {
  const marks = marksOf(derived);
  if (!marks) return null;
  const { design, sections } = derived;
  const steps: AlignmentStep[] = [];
  const add = (step: Omit<AlignmentStep, 'order'>): void => {
    steps.push({ order: steps.length + 1, ...step });
  };
  add({
    section: null,
    adjust: 'pointer',
    angle: 0,
    signal: null,
    circuit: null,
    left: null,
    words:
      'Turn the shaft to the open stop and fix the pointer on the first line of the dial; at the meshed stop it must stand on the last.',
  });
  const all = sections.map((_, index) => index);
  const follows = (index: number): boolean => design.sections[index]!.law === 'tracked';
  // What decides where a station stands on the dial comes first.
  const ordered = [
    ...all.filter(follows),
    ...all.filter((index) => !follows(index) && sections[index]!.inductance !== null),
  ];
  for (const index of ordered) {
    const oscillator = follows(index);
    const name = `section ${index + 1}`;
    const see = oscillator
      ? 'until the generator is heard at its loudest'
      : 'for the largest output';
    const ends = [
      { adjust: 'coil', signal: marks.low },
      { adjust: 'trimmer', signal: marks.high },
    ] as const;
    for (const { adjust, signal } of ends) {
      const angle = marks.angleAt(signal);
      const circuit = oscillator
        ? oscillatorFrequency(design.sections[index]!, signal)
        : signal;
      const works = oscillator ? `; the oscillator then works at ${hertz(circuit)}` : '';
      add({
        section: index,
        adjust,
        angle,
        signal,
        circuit,
        left: null,
        words: `Dial and generator at ${hertz(signal)} (${degrees(angle)} from the open stop): turn the ${adjust} of ${name} ${see}${works}.`,
      });
    }
    add({
      section: index,
      adjust: 'none',
      angle: marks.angleAt(marks.low),
      signal: marks.low,
      circuit: null,
      left: null,
      words: `Go back to ${hertz(marks.low)} and repeat both of ${name} until neither asks for more.`,
    });
  }
  const angle = marks.angleAt(marks.middle);
  const lefts = all.filter(follows).map((index) => errorAt(derived, index, angle));
  const left = lefts.reduce<number | null>(
    (most, own) => (own !== null && Math.abs(own) >= Math.abs(most ?? 0) ? own : most),
    null,
  );
  add({
    section: null,
    adjust: 'none',
    angle,
    signal: marks.middle,
    circuit: null,
    left,
    words:
      left === null
        ? `Try ${hertz(marks.middle)} (${degrees(angle)}): turning a trimmer a little either way must not raise the output.`
        : `Try ${hertz(marks.middle)} (${degrees(angle)}): with plates as drawn the oscillator is ${formatQuantity(Math.abs(left), 'frequency', 2)} ${left < 0 ? 'low' : 'high'} here; turning the signal circuit's trimmer a little either way must not raise the output noticeably.`,
  });
  return steps;
}
