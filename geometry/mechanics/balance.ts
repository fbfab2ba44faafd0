/** The rotor out of balance: the torque of its weight, and what cancels it. */

import type { Derived } from '../derived';
import { sheetMaterials } from '../material';
import { assemblyOf } from '../parts/assembly';
import { INSULATOR_DENSITY } from '../parts/collection';
import { rotorTurn } from '../rotor-turn';
import { contourMoment } from './moment';

/** m/s². Standard acceleration of free fall (CGPM 1901). */
const GRAVITY = 9.80665;

export interface Balance {
  /** Mass times distance of the centre of mass from the shaft, g·mm. */
  readonly unbalance: number;
  /** Where the centre of mass lies, rad from +x on the rotor as drawn, at mesh angle 0. */
  readonly bearing: number;
  /** Share of each section in it, g·mm. */
  readonly sections: readonly number[];
  /** Largest torque on a level shaft, whichever way it is mounted, N·m. */
  readonly worst: number;
  /** Shaft angle, rad, and torque, N·m, with the stator's first edge level and to the right. */
  readonly turn: readonly { readonly angle: number; readonly torque: number }[];
  /** What cancels it: mass times radius, g·mm, and its bearing on the rotor as drawn, rad. */
  readonly counterweight: { readonly moment: number; readonly bearing: number };
}

const STEPS = 60;

/** From g·mm to kg·m. */
const KILOGRAM_METRE = 1e-6;

/** Of every flat part that turns with the shaft, slots included; turned parts are round. */
export function balanceOf(derived: Derived): Balance {
  const { parts, placed } = assemblyOf(derived);
  const { turn } = derived;
  const sections = derived.sections.map(() => ({ x: 0, y: 0 }));
  for (const part of parts) {
    if (part.kind !== 'cut' || part.section === null) continue;
    const density =
      part.material === 'insulator' ? INSULATOR_DENSITY : sheetMaterials[part.material].density;
    const moments = [contourMoment(part.outside)];
    for (const hole of part.holes) {
      const { x, y } = contourMoment(hole);
      moments.push({ x: -x, y: -y });
    }
    const sum = sections[part.section]!;
    for (const place of placed) {
      if (place.part !== part.key || !place.turns) continue;
      const [cos, sin] = [Math.cos(place.angle), Math.sin(place.angle)];
      for (const { x, y } of moments) {
        sum.x += density * part.thickness * (x * cos - y * sin);
        sum.y += density * part.thickness * (x * sin + y * cos);
      }
    }
  }
  const x = sections.reduce((total, own) => total + own.x, 0);
  const y = sections.reduce((total, own) => total + own.y, 0);
  const unbalance = Math.hypot(x, y);
  const bearing = Math.atan2(y, x);
  const worst = unbalance * KILOGRAM_METRE * GRAVITY;
  return {
    unbalance,
    bearing,
    sections: sections.map((own) => Math.hypot(own.x, own.y)),
    worst,
    turn: Array.from({ length: STEPS + 1 }, (_, i) => {
      const angle = (turn.travel * i) / STEPS;
      return { angle, torque: -worst * Math.cos(bearing + rotorTurn(turn, angle)) };
    }),
    counterweight: {
      moment: unbalance,
      bearing: bearing > 0 ? bearing - Math.PI : bearing + Math.PI,
    },
  };
}
