/** What lies between the plates. */

import type { Section } from './design';

/**
 * The air gap, mm, in which the section's air has the capacitance of the gap as it is, with film
 * or disc: the layers in series (textbook; exact where the field goes straight from plate to
 * plate). The edges are reckoned with it too, which is approximate: there the field leaves the
 * film.
 */
export function electricalGap(section: Section): number {
  const { airGap, dielectric, permittivity, filmPermittivity } = section;
  if (dielectric === 'air') return airGap;
  const solid = dielectric === 'disc' ? airGap : section.filmThickness;
  return airGap - solid + (solid * permittivity) / filmPermittivity;
}
