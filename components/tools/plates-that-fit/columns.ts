import { formatQuantity } from '@/geometry';
import type { Candidate } from '@/geometry/advice/advise';

export type SortKey = keyof Candidate;

interface Column {
  readonly key: SortKey;
  readonly title: string;
  readonly write: (candidate: Candidate) => string;
}

const mm = (value: number): string => formatQuantity(value, 'length', 3);

export const columns: readonly Column[] = [
  { key: 'airGap', title: 'Gap', write: ({ airGap }) => mm(airGap) },
  {
    key: 'rotorPlates',
    title: 'Plates',
    write: ({ rotorPlates, statorPlates }) => `${rotorPlates} + ${statorPlates}`,
  },
  { key: 'outerRadius', title: 'Radius, about', write: ({ outerRadius }) => mm(outerRadius) },
  { key: 'depth', title: 'Depth', write: ({ depth }) => mm(depth) },
  {
    key: 'narrowestBlade',
    title: 'Narrowest blade',
    write: ({ narrowestBlade }) => mm(narrowestBlade),
  },
  {
    key: 'voltage',
    title: 'Voltage',
    write: ({ voltage }) => (voltage === 0 ? '–' : formatQuantity(voltage, 'voltage', 3)),
  },
  {
    key: 'mass',
    title: 'Plates weigh',
    write: ({ mass }) => `${Number(mass.toPrecision(2))} g`,
  },
];
