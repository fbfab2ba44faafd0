/**
 * Tuning laws. The law acts on the total capacitance: section, circuit stray and trimmer.
 * E. A. Kolster, Bulletin of the Bureau of Standards 11 (1914); L. Boyadzhiev, "Calculus, radio
 * dials and the straight-line frequency variable capacitor", Int. J. Math. Educ. Sci. Technol.
 * 41(5), 2010.
 */

/** A law as a function of the swept fraction x, 0 open to 1 meshed. Capacitance in F. */
export interface Law {
  readonly total: (x: number) => number;
  /** d(total)/dx, F. */
  readonly slope: (x: number) => number;
}

type LawMaker = (min: number, max: number) => Law;

/** Equal steps of the shaft give equal steps of capacitance. */
const capacitance: LawMaker = (min, max) => ({
  total: (x) => min + (max - min) * x,
  slope: () => max - min,
});

/** Equal steps of wavelength, which goes as √C: C = (a + b·x)². */
const wavelength: LawMaker = (min, max) => {
  const a = Math.sqrt(min);
  const b = Math.sqrt(max) - a;
  return {
    total: (x) => (a + b * x) ** 2,
    slope: (x) => 2 * b * (a + b * x),
  };
};

/** Equal steps of frequency, which goes as 1/√C: C = (a − b·x)⁻². */
const frequency: LawMaker = (min, max) => {
  const a = 1 / Math.sqrt(min);
  const b = a - 1 / Math.sqrt(max);
  return {
    total: (x) => (a - b * x) ** -2,
    slope: (x) => 2 * b * (a - b * x) ** -3,
  };
};

/** Equal steps give equal ratios: C = min·e^(k·x). */
const logarithmic: LawMaker = (min, max) => {
  const k = Math.log(max / min);
  const total = (x: number): number => min * Math.exp(k * x);
  return { total, slope: (x) => k * total(x) };
};

const makers = { capacitance, wavelength, frequency, logarithmic };

/** Laws that have a name of their own. */
export type NamedLaw = keyof typeof makers;

/** The law between two total capacitances, F; 0 < min < max. */
export function lawBetween(name: NamedLaw, min: number, max: number): Law {
  return makers[name](min, max);
}
