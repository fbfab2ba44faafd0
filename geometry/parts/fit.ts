/** Checks on the parts round the plates: what stands in the way of putting them together. */

import { arrangementOf } from '../arrangement';
import type { Derived } from '../derived';
import type { Finding } from '../finding';
import { contourReach } from '../measure';
import { formatQuantity } from '../quantity';
import { assemblyOf } from './assembly';
import { frameLayout, postPlaces } from './frame';
import type { CutPart } from './part';
import { slottedRotor } from './plates';

const mm = (value: number): string => formatQuantity(value, 'length', 4);

type Checked = Pick<Derived, 'design' | 'turn' | 'sections' | 'stack'>;

function slotFindings({ design, sections, turn }: Checked): Finding[] {
  if (design.endSlots === 0) return [];
  return sections.flatMap(({ rotor }, section): Finding[] => {
    const { lobes } = arrangementOf(design);
    const asked = design.endSlots * lobes;
    const got = slottedRotor(design, turn.direction, rotor)?.slots ?? 0;
    const finding: Finding = {
      code: 'slots',
      severity: got === asked ? 'ok' : 'warn',
      section,
      label: 'Slots that the end rotor plates have room for',
      value: got,
      limit: asked,
      quantity: 'count',
      change:
        got === asked
          ? ''
          : 'Where the blade is narrow a slot has no depth: take fewer slots, narrower ones or a smaller cut-out.',
      parameters: ['endSlots', 'endSlotWidth', 'cutoutRadius'],
    };
    return [finding];
  });
}

/** Least metal between round holes, mm. */
function smallestWeb(holes: CutPart['holes']): number {
  const round = holes.filter((hole) => hole.kind === 'circle');
  return Math.min(
    ...round.flatMap((a, i) =>
      round.slice(i + 1).map((b) => Math.hypot(a.x - b.x, a.y - b.y) - a.radius - b.radius),
    ),
  );
}

/** @param derived without its findings yet */
export function fitFindings(derived: Derived): Finding[] {
  const { design, sections } = derived;
  const findings = slotFindings(derived);
  const layout = frameLayout(derived);
  if (!layout) return findings;
  // Which plate lies outermost decides: a rotor in front leaves the posts more room.
  const room = design.frameClearance - design.bushFlange;
  findings.push({
    code: 'frame',
    severity: room >= 0 ? 'ok' : 'fail',
    section: null,
    label: 'Room for the bush flange before the outermost plate',
    value: design.frameClearance,
    limit: design.bushFlange,
    quantity: 'length',
    change:
      room >= 0 ? '' : `Make the way from plates to frame at least ${mm(design.bushFlange)}.`,
    parameters: ['frameClearance', 'bushFlange'],
  });
  const places = postPlaces(derived).length;
  const each = sections[0]!.posts.length;
  if (sections.length > 1) {
    findings.push({
      code: 'frame',
      severity: places === each ? 'ok' : 'fail',
      section: null,
      label: 'Posts of all sections in line',
      value: places,
      limit: each,
      quantity: 'count',
      change:
        places === each
          ? ''
          : `Set one post circle radius for all sections: ${mm(Math.max(...sections.flatMap(({ posts }) => posts.map(({ x, y }) => Math.hypot(x, y)))))} clears them all.`,
      parameters: ['postCircleRadius'],
    });
  }
  const { parts } = assemblyOf(derived);
  const back = parts.find(({ key }) => key === 'frame-back');
  const web = back?.kind === 'cut' ? smallestWeb(back.holes) : Infinity;
  findings.push({
    code: 'frame',
    severity: web >= design.frameThickness ? 'ok' : 'warn',
    section: null,
    label: 'Web between the holes of the back plate',
    value: web,
    limit: design.frameThickness,
    quantity: 'length',
    change:
      web >= design.frameThickness
        ? ''
        : 'One sheet thickness is safe: take a smaller bearing, posts further out, or no frame.',
    parameters: ['frameThickness', 'bearingDiameter', 'postCircleRadius'],
  });
  const plate = parts.find(({ key }) => key === 'frame-front');
  const reach = plate?.kind === 'cut' ? contourReach(plate.outside) : 0;
  const holds = reach <= design.largestRadius;
  findings.push({
    code: 'frame',
    severity: holds ? 'ok' : 'warn',
    section: null,
    label: 'Furthest point of the end plates',
    value: reach,
    limit: design.largestRadius,
    quantity: 'length',
    change: holds
      ? ''
      : 'The pillars stand outside the sweep: take thinner pillars, less clearance round the rotor, or more room.',
    parameters: ['largestRadius', 'pillarDiameter', 'postClearance'],
  });
  return findings;
}
