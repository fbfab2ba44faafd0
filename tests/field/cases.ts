import type { StackShape } from './stack-shape';

/** Mesh angles of every case, as fractions of the travel. */
export const fractions = [0, 0.03, 0.08, 0.2, 0.4, 0.6, 0.8, 0.95, 1];

const semicircle50: StackShape = {
  gap: 1,
  rotorThickness: 1,
  statorThickness: 1,
  shaftRadius: 8,
  hubRadius: 9,
  cutoutRadius: 12,
  travel: Math.PI,
  rotor: { form: 'arc', radius: 50 },
  stator: { form: 'arc', radius: 54 },
  edgeOffset: 0,
};

const frequency: StackShape = {
  ...semicircle50,
  rotor: { form: 'frequency', radius: 60, ratio: 10 },
  stator: { form: 'arc', radius: 64 },
};

export interface Case {
  name: string;
  title: string;
  shape: StackShape;
}

/** In the order of the table in README.md. */
export const cases: Case[] = [
  {
    name: 'semicircle-20',
    title: 'Semicircle, R/g 20',
    shape: {
      ...semicircle50,
      shaftRadius: 3.5,
      hubRadius: 4,
      cutoutRadius: 6,
      rotor: { form: 'arc', radius: 20 },
      stator: { form: 'arc', radius: 24 },
    },
  },
  { name: 'semicircle-50', title: 'Semicircle, R/g 50', shape: semicircle50 },
  {
    name: 'frequency-half-disc',
    title: 'Straight-line frequency 1 : 10, half-disc stator, R/g 60',
    shape: frequency,
  },
  {
    name: 'frequency-following',
    title: 'Straight-line frequency 1 : 10, stator following the rotor, R/g 60',
    shape: { ...frequency, stator: { form: 'follows', overhang: 4 } },
  },
  {
    name: 'unequal-thickness',
    title: 'Semicircle, R/g 50, rotor 0.5 thick, stator 2 thick',
    shape: { ...semicircle50, rotorThickness: 0.5, statorThickness: 2 },
  },
  {
    name: 'offset-edges',
    title: 'Semicircle, R/g 50, stator edges 3 into the stator',
    shape: { ...semicircle50, edgeOffset: 3 },
  },
  {
    name: 'travel-150',
    title: 'Straight-line capacitance, travel 150°, R/g 50',
    shape: { ...semicircle50, travel: (150 * Math.PI) / 180 },
  },
];
