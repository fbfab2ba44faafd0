/** Electric constant, F/mm. CODATA 2022: 8.8541878188e-12 F/m. */
export const EPSILON_0 = 8.8541878188e-15;

export const TWO_PI = 2 * Math.PI;
