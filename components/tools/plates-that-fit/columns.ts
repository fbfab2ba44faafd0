import type { Candidate } from '@/geometry/advice/advise';

export type SortKey = keyof Candidate;

interface Column {
  readonly key: SortKey;
  readonly title: string;
  readonly write: (candidate: Candidate) => string;
}

const plain = (value: number): string => String(Number(value.toPrecision(3)));

export const columns: readonly Column[] = [
  { key: 'airGap', title: 'Gap, mm', write: ({ airGap }) => plain(airGap) },
  {
    key: 'rotorPlates',
    title: 'Plates',
    write: ({ rotorPlates, statorPlates }) => `${rotorPlates} + ${statorPlates}`,
  },
  { key: 'outerRadius', title: 'Radius', write: ({ outerRadius }) => plain(outerRadius) },
  { key: 'depth', title: 'Depth', write: ({ depth }) => plain(depth) },
  {
    key: 'narrowestBlade',
    title: 'Blade',
    write: ({ narrowestBlade }) => plain(narrowestBlade),
  },
  {
    key: 'voltage',
    title: 'Volts',
    write: ({ voltage }) => (voltage === 0 ? '–' : plain(voltage)),
  },
  { key: 'mass', title: 'Weight, g', write: ({ mass }) => String(Number(mass.toPrecision(2))) },
];
