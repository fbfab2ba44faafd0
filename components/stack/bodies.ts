import { palette } from '@/components/floor/palette';
import type { Derived } from '@/geometry';
import { assemblyOf } from '@/geometry/parts/assembly';
import type { Placed } from '@/geometry/parts/collection';
import type { Part } from '@/geometry/parts/part';
import { planOf, type Plan } from '@/geometry/parts/solid';

/** What a body is for the eye: the capacitor itself, its frame, or a plate of it that hides the rest. */
export type BodyKind = 'stack' | 'frame' | 'end-plate';

/** One part of one thickness in all its places. mm */
export interface Body {
  readonly part: Part;
  readonly plan: Plan;
  readonly thickness: number;
  readonly places: readonly Placed[];
  /** Does it turn with the shaft? */
  readonly turns: boolean;
  readonly kind: BodyKind;
  readonly colour: string;
}

const END_PLATES = ['frame-front', 'frame-back', 'panel-plate'];
const FRAME = [...END_PLATES, 'pillar', 'post-bush', 'stop-arm', 'stop-pin', 'screen'];

/** Turned steel of shaft and posts: between the two metals of the plates. */
const TURNED = '#b9c0c4';
const colours: Readonly<Record<string, string>> = { insulator: '#d9cfb4', steel: TURNED };

function colourOf(part: Part): string {
  if (part.kind === 'bought') return TURNED;
  if (part.key.includes('rotor')) return palette.brass;
  if (part.key.includes('stator')) return palette.steel;
  return colours[part.material] ?? '#c9d0d2';
}

const kindOf = ({ key }: Part): BodyKind =>
  END_PLATES.includes(key) ? 'end-plate' : FRAME.includes(key) ? 'frame' : 'stack';

/** Every part that has a place, shaft along z. */
export function bodiesOf(derived: Derived): Body[] {
  const { parts, placed } = assemblyOf(derived);
  return parts.flatMap((part) => {
    const plan = planOf(part, derived.design);
    if (!plan) return [];
    const thick = new Map<string, Placed[]>();
    for (const place of placed.filter(({ part: key }) => key === part.key)) {
      const key = (place.to - place.from).toFixed(6);
      thick.set(key, [...(thick.get(key) ?? []), place]);
    }
    return [...thick.values()].map((places) => ({
      part,
      plan,
      thickness: places[0]!.to - places[0]!.from,
      places,
      turns: places[0]!.turns,
      kind: kindOf(part),
      colour: colourOf(part),
    }));
  });
}
