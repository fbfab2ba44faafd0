/** End plates, what they carry, the stop of the turn and the panel plate. */

import { arrangementOf } from '../arrangement';
import type { Derived } from '../derived';
import { sheetMaterials } from '../material';
import { mirrorPoint } from '../mirror';
import type { Point } from '../outline';
import { polar } from '../polar';
import { addBought, addCut, addTurned, INSULATOR_DENSITY, type Collection } from './collection';
import { armOutline, circle, roundedHull, roundedRectangle } from './contours';
import { clearanceHole } from './thread';

/** mm. Metal left round what an end plate carries. */
export const RIM = 3;

/** mm. Wall of the bush's shoulder between post and frame. */
const SHOULDER = 1.5;

/** Thread of the pillars' screws, and the core hole in the pillar (ISO metric coarse). */
const PILLAR_THREAD = 3;
const PILLAR_CORE = 2.5;

/** The stop: arm on the shaft's back end and two pins in the back plate, mm. */
export const STOP_PIN = 3;
const ARM_WIDTH = 6;
const ARM_BEHIND = 0.5;
const ARM_THICKNESS = 2;

/** mm. More than the shaft, where the design leaves the bearing to the kernel. */
const BEARING_OVER_SHAFT = 4;

export interface FrameLayout {
  /** Diameter of the bearing holes, mm. */
  readonly bearing: number;
  /** Face of the stop's arm that is turned to the back plate, along the shaft, mm. */
  readonly armFace: number;
  /** Inner faces of the end plates along the shaft, mm. */
  readonly back: number;
  readonly front: number;
  readonly thickness: number;
  readonly pillars: readonly Point[];
  /** Pins of the stop, and the bearing of its arm on the rotor as drawn. */
  readonly pins: readonly Point[];
  readonly armAngle: number;
  readonly pinRadius: number;
  /** Radius of the discs round which the end plates' outline runs. */
  readonly corner: number;
  readonly posts: readonly Point[];
}

/** mm. Nut and washer on a post (ISO 4032 nuts are about 0.8 diameters high; from memory). */
export function nutHeight(diameter: number): number {
  return 0.8 * diameter + 1;
}

/** Every place at which posts stand, each once. */
export function postPlaces({ sections }: Derived): Point[] {
  const places: Point[] = [];
  for (const { posts } of sections) {
    for (const { x, y } of posts) {
      if (!places.some((p) => Math.hypot(p.x - x, p.y - y) < 1e-3)) places.push({ x, y });
    }
  }
  return places;
}

function pillarPlaces({ design, stack, turn }: Derived): Point[] {
  const { statorSector, postClearance, pillarDiameter } = design;
  const { stators } = arrangementOf(design);
  const radius = stack.sweepRadius + postClearance + pillarDiameter / 2;
  const open = (stators.length === 2 ? Math.PI : 2 * Math.PI) - statorSector;
  const angles =
    stators.length === 2
      ? stators.map((standsAt) => standsAt + statorSector + open / 2)
      : [0.25, 0.75].map((share) => statorSector + share * open);
  return angles
    .map((angle) => polar(radius, angle))
    .map((point) => (turn.direction < 0 ? mirrorPoint(point) : point));
}

/** Where everything of the frame stands; null where the design has none. */
export function frameLayout(derived: Derived): FrameLayout | null {
  const { design, stack, turn } = derived;
  if (design.frame === 'none') return null;
  const bearing = design.bearingDiameter ?? design.shaftDiameter + BEARING_OVER_SHAFT;
  const pinRadius = bearing / 2 + STOP_PIN + RIM;
  // An arm's middle stays this far from a pin it touches.
  const short = Math.asin((ARM_WIDTH + STOP_PIN) / 2 / pinRadius);
  const pitch = (2 * Math.PI) / arrangementOf(design).lobes;
  const armAngle = turn.direction * ((pitch - design.rotorSector) / 2);
  const pinAt = (mesh: number, beyond: number): Point =>
    polar(pinRadius, armAngle + turn.direction * (mesh + beyond));
  const posts = postPlaces(derived);
  // Where bushes and nuts are in the arm's way it stands behind them.
  const nearest = Math.min(...posts.map(({ x, y }) => Math.hypot(x, y)));
  const onPost = design.postSpacerRadius + design.postHoleDiameter;
  const clear = pinRadius + STOP_PIN + onPost < nearest;
  const behind = clear ? 0 : design.bushFlange + nutHeight(design.postHoleDiameter);
  return {
    bearing,
    armFace: -design.frameClearance - design.frameThickness - behind - ARM_BEHIND,
    back: -design.frameClearance,
    front: stack.depth + design.frameClearance,
    thickness: design.frameThickness,
    pillars: pillarPlaces(derived),
    pins: [pinAt(turn.meshAtOpen, -short), pinAt(turn.meshAtOpen + turn.travel, short)],
    armAngle,
    pinRadius,
    corner:
      RIM +
      Math.max(design.postSpacerRadius, design.pillarDiameter / 2, STOP_PIN / 2 + RIM / 2),
    posts,
  };
}

function addEndPlates(collection: Collection, derived: Derived, layout: FrameLayout): void {
  const { design } = derived;
  const { bearing, back, front, thickness, pillars, pins, posts, corner } = layout;
  const bearingRim = bearing / 2 + RIM - corner;
  // The bearing asks for more room than a corner: a square of corners stands for it.
  const aboutShaft = [45, 135, 225, 315].map((degrees) =>
    polar(Math.max(bearingRim, 0) * Math.SQRT2, (degrees * Math.PI) / 180),
  );
  const outside = roundedHull([...posts, ...pillars, ...pins, ...aboutShaft], corner);
  const holes = [
    circle(bearing / 2),
    ...posts.map((post) => circle(design.postHoleDiameter / 2 + SHOULDER, post)),
    ...pillars.map((pillar) => circle(clearanceHole(PILLAR_THREAD) / 2, pillar)),
  ];
  const common = { section: null, material: design.frameMaterial, thickness, outside };
  const place = (from: number) => [
    { x: 0, y: 0, from, to: from + thickness, angle: 0, turns: false },
  ];
  addCut(
    collection,
    {
      ...common,
      key: 'frame-front',
      label: 'Front plate',
      note: 'Bearing hole to suit the bush, H7',
      holes,
    },
    place(front),
  );
  addCut(
    collection,
    {
      ...common,
      key: 'frame-back',
      label: 'Back plate',
      note: `Bearing hole to suit the bush, H7; two holes Ø ${STOP_PIN} for the pins of the stop, pressed in`,
      holes: [...holes, ...pins.map((pin) => circle(STOP_PIN / 2, pin))],
    },
    place(back - thickness),
  );
}

function addStop(collection: Collection, derived: Derived, layout: FrameLayout): void {
  const { design } = derived;
  const { armFace: to, back, pins, pinRadius, armAngle } = layout;
  addCut(
    collection,
    {
      key: 'stop-arm',
      label: 'Arm of the stop',
      section: null,
      material: 'steel',
      thickness: ARM_THICKNESS,
      note: 'Fixed on the shaft so that it meets the pins at both ends of the travel',
      outside: armOutline(
        Math.max(design.shaftDiameter / 2 + RIM, ARM_WIDTH / 2 + 1),
        pinRadius + STOP_PIN / 2,
        ARM_WIDTH,
      ),
      holes: [circle(design.shaftDiameter / 2)],
    },
    [{ x: 0, y: 0, from: to - ARM_THICKNESS, to, angle: armAngle, turns: true }],
  );
  const length = back - to + ARM_THICKNESS;
  addBought(
    collection,
    {
      key: 'stop-pin',
      label: 'Pin of the stop',
      section: null,
      size: `Ø ${STOP_PIN} × ${Math.ceil(length)}`,
      note: 'Parallel pin, pressed into the back plate',
    },
    pins.map(({ x, y }) => ({
      x,
      y,
      from: to - ARM_THICKNESS,
      to: back,
      angle: 0,
      turns: false,
    })),
  );
}

export function addFrame(collection: Collection, derived: Derived, layout: FrameLayout): void {
  const { design } = derived;
  const { bearing, back, front, thickness, pillars, posts } = layout;
  const upright = { angle: 0, turns: false };
  addEndPlates(collection, derived, layout);
  addStop(collection, derived, layout);
  addTurned(
    collection,
    {
      key: 'pillar',
      label: 'Frame pillar',
      section: null,
      material: design.frameMaterial === 'insulator' ? 'brass' : design.frameMaterial,
      outerDiameter: design.pillarDiameter,
      boreDiameter: PILLAR_CORE,
      length: front - back,
      note: `Both ends M${PILLAR_THREAD}, faces square`,
    },
    sheetMaterials[design.frameMaterial === 'insulator' ? 'brass' : design.frameMaterial]
      .density,
    pillars.map(({ x, y }) => ({ x, y, from: back, to: front, ...upright })),
  );
  const flange = design.bushFlange;
  const shoulder = design.postHoleDiameter + 2 * SHOULDER;
  addTurned(
    collection,
    {
      key: 'post-bush',
      label: 'Insulating bush',
      section: null,
      material: 'insulator',
      outerDiameter: 2 * design.postSpacerRadius,
      boreDiameter: design.postHoleDiameter,
      length: flange,
      note: `One on either face of the end plate; shoulder Ø ${shoulder} reaching ${thickness / 2} into it`,
    },
    INSULATOR_DENSITY,
    posts.flatMap(({ x, y }) =>
      [back - thickness - flange, back, front - flange, front + thickness].map((from) => ({
        x,
        y,
        from,
        to: from + flange,
        ...upright,
      })),
    ),
  );
  addBought(
    collection,
    {
      key: 'pillar-screw',
      label: 'Screw for a pillar',
      section: null,
      size: `M${PILLAR_THREAD} × ${Math.ceil(thickness + 2 * PILLAR_THREAD)}`,
      note: '',
    },
    2 * pillars.length,
  );
  addBought(
    collection,
    {
      key: 'shaft-bush',
      label: 'Bush or bearing for the shaft',
      section: null,
      size: `bore ${design.shaftDiameter}, outside ${bearing}`,
      note: 'Rotor earthed through it or through a wiper, as the circuit asks',
    },
    2,
  );
  if (design.bracket === 'panel') addPanelPlate(collection, derived, layout);
}

function addPanelPlate(collection: Collection, derived: Derived, layout: FrameLayout): void {
  const { design } = derived;
  const { bearing, front, thickness, pillars, posts, corner } = layout;
  const all = [...pillars, ...posts];
  const [xs, ys] = [all.map(({ x }) => x), all.map(({ y }) => y)];
  const middle = {
    x: (Math.min(...xs) + Math.max(...xs)) / 2,
    y: (Math.min(...ys) + Math.max(...ys)) / 2,
  };
  const screw = clearanceHole(4);
  const room = 2 * (corner + screw + 2 * RIM);
  const width = Math.max(...xs) - Math.min(...xs) + room;
  const height = Math.max(...ys) - Math.min(...ys) + room;
  const inset = screw / 2 + RIM;
  const corners = [-1, 1].flatMap((sx) =>
    [-1, 1].map((sy) => ({
      x: middle.x + sx * (width / 2 - inset),
      y: middle.y + sy * (height / 2 - inset),
    })),
  );
  // In front of the posts' outer bushes and nuts.
  const from = front + thickness + design.bushFlange + nutHeight(design.postHoleDiameter) + 1;
  addCut(
    collection,
    {
      key: 'panel-plate',
      label: 'Panel plate',
      section: null,
      material: design.frameMaterial,
      thickness,
      note: `Stands ${(from - front - thickness).toFixed(1)} before the front plate on longer pillar screws with tubes`,
      outside: roundedRectangle(middle, width, height, RIM),
      holes: [
        circle(bearing / 2 + 1),
        ...pillars.map((pillar) => circle(clearanceHole(PILLAR_THREAD) / 2, pillar)),
        ...corners.map((at) => circle(screw / 2, at)),
      ],
    },
    [{ x: 0, y: 0, from, to: from + thickness, angle: 0, turns: false }],
  );
}

/** Where the shaft ends behind the arm of the stop, mm. */
export function shaftBack({ armFace }: FrameLayout): number {
  return armFace - ARM_THICKNESS - 3;
}
