/** Spacers on the shaft and on the posts, between plates, between sections and to the frame. */

import type { Derived, Post, StackPlate } from '../derived';
import { sheetMaterials, spacerMaterialOf } from '../material';
import {
  addCut,
  addTurned,
  INSULATOR_DENSITY,
  type Collection,
  type Place,
} from './collection';
import { circle } from './contours';
import { screenRooms } from './screens';

/** mm. Lengths nearer than this are one part. */
const SAME_LENGTH = 1e-6;

/** mm. The rotor's end play: what the front end spacer is short of its room. */
export const END_PLAY = 0.1;

interface Ring {
  readonly key: string;
  readonly label: string;
  readonly section: number | null;
  readonly outer: number;
  readonly bore: number;
  readonly insulating: boolean;
  readonly note: string;
}

/** Room along the shaft that a spacer fills. */
interface Room {
  readonly from: number;
  readonly to: number;
}

function addRings(
  collection: Collection,
  derived: Derived,
  ring: Ring,
  places: readonly Place[],
): void {
  const lengths: number[] = [];
  for (const { from, to } of places) {
    if (!lengths.some((length) => Math.abs(length - (to - from)) < SAME_LENGTH)) {
      lengths.push(to - from);
    }
  }
  const { design } = derived;
  const metal = spacerMaterialOf(design);
  lengths.forEach((length, i) => {
    const own = places.filter(({ from, to }) => Math.abs(to - from - length) < SAME_LENGTH);
    const key = lengths.length > 1 ? `${ring.key}-${i + 1}` : ring.key;
    const common = { key, label: ring.label, section: ring.section, note: ring.note };
    if (design.spacerMake === 'cut' && !ring.insulating) {
      addCut(
        collection,
        {
          ...common,
          material: metal,
          thickness: length,
          outside: circle(ring.outer / 2),
          holes: [circle(ring.bore / 2)],
        },
        own,
      );
      return;
    }
    addTurned(
      collection,
      {
        ...common,
        material: ring.insulating ? 'insulator' : metal,
        outerDiameter: ring.outer,
        boreDiameter: ring.bore,
        length,
      },
      ring.insulating ? INSULATOR_DENSITY : sheetMaterials[metal].density,
      own,
    );
  });
}

/** Rooms between neighbouring plates along the shaft. */
function between(
  plates: readonly StackPlate[],
): (Room & { before: StackPlate; after: StackPlate })[] {
  const sorted = [...plates].sort((a, b) => a.z - b.z);
  return sorted.slice(1).map((after, i) => {
    const before = sorted[i]!;
    return {
      before,
      after,
      from: before.z + before.thickness / 2,
      to: after.z - after.thickness / 2,
    };
  });
}

const samePack = ({ before, after }: { before: StackPlate; after: StackPlate }): boolean =>
  before.section === after.section && before.pack === after.pack;

/** @param frame inner faces of the end plates; null without a frame */
export function addRotorSpacers(
  collection: Collection,
  derived: Derived,
  frame: Room | null,
): void {
  const { design, stack, sections } = derived;
  const rotors = stack.plates.filter(({ role }) => role === 'rotor');
  const rooms = between(rotors);
  const onShaft = ({ from, to }: Room): Place => ({
    x: 0,
    y: 0,
    from,
    to,
    angle: 0,
    turns: true,
  });
  const ring = {
    outer: 2 * design.spacerRadius,
    bore: design.shaftDiameter,
    insulating: false,
    note: 'Faces square to the bore; length ± 0.01',
  };
  sections.forEach((_, section) =>
    addRings(
      collection,
      derived,
      {
        ...ring,
        key: `s${section + 1}-rotor-spacer`,
        label: `Rotor spacer, section ${section + 1}`,
        section,
      },
      rooms.filter((room) => samePack(room) && room.before.section === section).map(onShaft),
    ),
  );
  addRings(
    collection,
    derived,
    { ...ring, key: 'rotor-spacer-between', label: 'Rotor spacer between sets', section: null },
    rooms.filter((room) => !samePack(room)).map(onShaft),
  );
  if (!frame) return;
  const faces = rotors.flatMap(({ z, thickness }) => [z - thickness / 2, z + thickness / 2]);
  addRings(
    collection,
    derived,
    {
      ...ring,
      key: 'rotor-end-spacer',
      label: 'Rotor end spacer',
      section: null,
      note: `Leaves ${END_PLAY} of end play at the front`,
    },
    [
      { from: frame.from, to: Math.min(...faces) },
      { from: Math.max(...faces), to: frame.to - END_PLAY },
    ].map(onShaft),
  );
}

/** What a screen leaves of a room along a post. */
function withoutScreen({ from, to }: Room, screens: readonly Room[]): Room[] {
  const screen = screens.find((one) => one.from > from && one.to < to);
  if (!screen) return [{ from, to }];
  return [
    { from, to: screen.from },
    { from: screen.to, to },
  ];
}

const onPost = ({ x, y }: Post, { from, to }: Room): Place => ({
  x,
  y,
  from,
  to,
  angle: 0,
  turns: false,
});

/** @param frame inner faces of the bush flanges on the posts; null without a frame */
export function addStatorSpacers(
  collection: Collection,
  derived: Derived,
  frame: Room | null,
): void {
  const { design, stack, sections } = derived;
  const stators = stack.plates.filter(({ role, angle }) => role === 'stator' && angle === 0);
  const rooms = between(stators);
  const screens = screenRooms(derived);
  const ring = {
    outer: 2 * design.postSpacerRadius,
    bore: design.postHoleDiameter,
    insulating: false,
    note: 'Faces square to the bore; length ± 0.01',
  };
  sections.forEach(({ posts }, section) =>
    addRings(
      collection,
      derived,
      {
        ...ring,
        key: `s${section + 1}-stator-spacer`,
        label: `Stator spacer, section ${section + 1}`,
        section,
      },
      rooms
        .filter((room) => samePack(room) && room.before.section === section)
        .flatMap((room) => posts.map((post) => onPost(post, room))),
    ),
  );
  // Sets of plates have terminals of their own: what holds them apart must insulate.
  addRings(
    collection,
    derived,
    {
      ...ring,
      insulating: true,
      key: 'stator-spacer-between',
      label: 'Insulating spacer between stators',
      section: null,
    },
    rooms
      .filter((room) => !samePack(room))
      .flatMap((room) =>
        withoutScreen(room, screens).flatMap((part) =>
          sections[room.after.section]!.posts.map((post) => onPost(post, part)),
        ),
      ),
  );
  if (!frame) return;
  const [first, last] = [sections[0]!, sections.at(-1)!];
  const faces = stators.flatMap(({ z, thickness }) => [z - thickness / 2, z + thickness / 2]);
  const ends = [
    ...first.posts.map((post) => onPost(post, { from: frame.from, to: Math.min(...faces) })),
    ...last.posts.map((post) => onPost(post, { from: Math.max(...faces), to: frame.to })),
  ];
  addRings(
    collection,
    derived,
    { ...ring, key: 'stator-end-spacer', label: 'Stator end spacer', section: null },
    ends.filter(({ from, to }) => to - from > SAME_LENGTH),
  );
}
