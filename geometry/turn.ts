/** Where the shaft stands: from the stops to the law, and from shaft angle to mesh angle. */

import { arrangementOf, gapsOf } from './arrangement';
import { EPSILON_0 } from './constants';
import type { Turn } from './derived';
import type { Design, Section } from './design';
import { electricalGap } from './dielectric';
import { lawOf } from './own-law';
import { targetOf } from './target';

/**
 * Air gaps that passing edges lie apart, half way along them, where the law begins: nearer, the
 * blade would need a horn to make up for what they lose; further, the open capacitance grows.
 */
const GAPS_BEFORE = 1;

/** The same where the law ends and edges come to lie on one another: room costs little there. */
const GAPS_AFTER = 2.5;

/** rad. More than this is not rested unless the design says so. */
const LONGEST_CHOSEN = (15 * Math.PI) / 180;

/** rad. A rotor wider than its stator by less than this leaves it at the end of the turn. */
const LEAVES_AT_END = (30 * Math.PI) / 180;

/** Rotor radius by area alone at the beginning (x = 0) or the end (x = 1) of a law, mm. */
function radiusByArea(design: Design, section: Section, x: 0 | 1): number {
  const [first] = design.sections;
  const index = design.sections.indexOf(section);
  const target = targetOf(section, index, first!);
  const rc = design.cutoutRadius;
  if ('code' in target) return rc;
  const law = lawOf(section, index, target, first!);
  if ('code' in law) return rc;
  const slope = law.slope(x) / design.travel;
  const gaps = arrangementOf(design).share * Math.max(1, gapsOf(section));
  return Math.sqrt(
    rc * rc + (2 * electricalGap(section) * slope) / (EPSILON_0 * section.permittivity * gaps),
  );
}

/** Angle at which edges are clear of each other at the middle of their length, for any section. */
function angleToClear(design: Design, x: 0 | 1): number {
  const angles = design.sections.map((section) => {
    const middle = (design.cutoutRadius + radiusByArea(design, section, x)) / 2;
    return ((x === 0 ? GAPS_BEFORE : GAPS_AFTER) * section.airGap) / middle;
  });
  return Math.min(LONGEST_CHOSEN, Math.max(...angles));
}

/** How the shaft turns; rests that the design leaves empty are chosen here. */
export function turnOf(design: Design): Turn {
  const { travel, rotorSector, statorSector, statorEdgeOffset, sense } = design;
  const meshAtOpen = rotorSector - travel;
  // An edge that is set in is passed later where the law begins, and earlier where it ends.
  const later = Math.max(0, statorEdgeOffset) / design.cutoutRadius;
  const before = Math.max(0, -meshAtOpen) + later + angleToClear(design, 0);
  // Where the leading edge leaves the stator just before the stop, the law ends before it; with
  // a stator much narrower than the rotor it goes on through that.
  const leaves = rotorSector - statorSector;
  const after =
    (leaves > 0 && leaves < LEAVES_AT_END ? leaves : 0) + later + angleToClear(design, 1);
  return {
    travel,
    lawFrom: design.openRest ?? before,
    lawTo: travel - (design.meshedRest ?? after),
    meshAtOpen,
    direction: sense === 'anticlockwise' ? 1 : -1,
  };
}
