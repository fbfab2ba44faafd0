/**
 * The parts are put together as a fitter would, and must close: gaps, depth, and no part in
 * another's way at any angle of the shaft.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { Clipper64, ClipType, FillRule, type Path64, type Paths64 } from 'clipper2-ts';
import { describe, expect, test } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  derive,
  type Derived,
  type Design,
} from '../../../geometry';
import { flatten } from '../../../geometry/flatten';
import { assemblyOf, type Assembly } from '../../../geometry/parts/assembly';
import type { Placed } from '../../../geometry/parts/collection';
import type { Part } from '../../../geometry/parts/part';
import { planOf } from '../../../geometry/parts/solid';
import { rotorTurn } from '../../../geometry/rotor-turn';

const MICROMETRE = 1e-3;
const cache = createEdgeCache();

function derived(design: Design): Derived {
  const derivation = derive(design, { cache });
  if (!derivation.ok) throw new Error(JSON.stringify(derivation.findings));
  return derivation.derived;
}

const examples = readdirSync('public/examples')
  .filter((file) => file !== 'index.json')
  .map((file): [string, Design] => [
    file,
    (JSON.parse(readFileSync(`public/examples/${file}`, 'utf8')) as { design: Design }).design,
  ]);

const slotted = defaultDesign();
slotted.endSlots = 6;
slotted.bracket = 'panel';
const gang = defaultDesign();
gang.sections.push({ ...gang.sections[0]! });
gang.largestDepth = 120;
const screened = defaultDesign();
screened.sections = [0.4, 0.5, 0.6].map((airGap, i) => ({
  ...screened.sections[0]!,
  airGap,
  rotorPlates: 10 + i,
  statorPlates: 10 + 1 - (i % 2),
}));
screened.largestDepth = 200;
screened.largestRadius = 90;
screened.postCircleRadius = 60;
screened.screens = 'between';
const clockwise = defaultDesign();
clockwise.sense = 'clockwise';

const designs: [string, Design][] = [
  ...examples,
  ['slotted end plates and a panel plate', slotted],
  ['two equal sections', gang],
  ['three unlike sections with screens', screened],
  ['clockwise', clockwise],
];

const partBy = ({ parts }: Assembly, key: string): Part =>
  parts.find((part) => part.key === key)!;

const UNIT = 1e-5;

function pathsOf(part: Part, at: Placed, design: Design, turn: number): Paths64 {
  const angle = at.angle + (at.turns ? turn : 0);
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const { outside, holes } = planOf(part, design)!;
  return [outside, ...holes].map((contour): Path64 => {
    const flat = flatten(contour, 1e-3);
    const path: Path64 = [];
    for (let i = 0; i < flat.length; i += 2) {
      const [x, y] = [flat[i]!, flat[i + 1]!];
      path.push({
        x: Math.round((at.x + x * cos - y * sin) / UNIT),
        y: Math.round((at.y + x * sin + y * cos) / UNIT),
        z: 0,
      });
    }
    return path;
  });
}

function commonArea(a: Paths64, b: Paths64): number {
  const clipper = new Clipper64();
  clipper.addSubject(a);
  clipper.addClip(b);
  const solution: Paths64 = [];
  clipper.execute(ClipType.Intersection, FillRule.EvenOdd, solution);
  return solution.reduce((sum, path) => {
    let area = 0;
    path.forEach((p, i) => {
      const q = path[(i + 1) % path.length]!;
      area += ((p.x * q.y - q.x * p.y) * UNIT * UNIT) / 2;
    });
    return sum + Math.abs(area);
  }, 0);
}

describe.each(designs)('%s', (_name, design) => {
  const result = derived(design);
  const assembly = assemblyOf(result);
  const { parts, placed } = assembly;

  test('quantities are those of the places, keys are unique', () => {
    expect(new Set(parts.map(({ key }) => key)).size).toBe(parts.length);
    for (const part of parts) {
      const places = placed.filter((at) => at.part === part.key).length;
      if (places > 0) expect(part.quantity).toBe(places);
      else expect(part.kind).toBe('bought');
    }
  });

  test('every rotor plate has its air gap on either side, to the micrometre', () => {
    for (const [index, section] of result.design.sections.entries()) {
      const own = placed
        .filter(({ part }) => new RegExp(`^s${index + 1}-(rotor|rotor-end|stator)$`).test(part))
        .sort((a, b) => a.from - b.from);
      const faces = own.filter(
        (at, i) => i === 0 || Math.abs(at.from - own[i - 1]!.from) > MICROMETRE,
      );
      let gaps = 0;
      for (let i = 1; i < faces.length; i++) {
        const [before, after] = [faces[i - 1]!, faces[i]!];
        if (before.turns === after.turns) continue;
        expect(Math.abs(after.from - before.to - section.airGap)).toBeLessThan(MICROMETRE);
        gaps += 1;
      }
      const packs = new Set(
        result.stack.plates.filter((p) => p.section === index).map((p) => p.pack),
      ).size;
      expect(gaps).toBe(packs * (section.rotorPlates + section.statorPlates - 1));
    }
  });

  test('on the shaft and on each post parts lie face to face without a gap', () => {
    const column = (turns: boolean, x: number, y: number): Placed[] =>
      placed
        .filter((at) => at.turns === turns && partBy(assembly, at.part).kind !== 'bought')
        .filter((at) => {
          const part = partBy(assembly, at.part);
          const plate =
            part.kind === 'cut' &&
            (part.key.includes('rotor') ||
              part.key.includes('stator') ||
              part.key === 'screen') &&
            !part.key.includes('spacer');
          return plate || Math.hypot(at.x - x, at.y - y) < MICROMETRE;
        })
        .filter(
          ({ part }) =>
            turns !== part.startsWith('frame') && part !== 'stop-arm' && part !== 'panel-plate',
        )
        .sort((a, b) => a.from - b.from);
    const closes = (column: Placed[]): void => {
      for (let i = 1; i < column.length; i++) {
        const [before, after] = [column[i - 1]!, column[i]!];
        if (Math.abs(before.from - after.from) < MICROMETRE) continue;
        expect(Math.abs(after.from - before.to)).toBeLessThan(MICROMETRE);
      }
    };
    closes(column(true, 0, 0));
    for (const post of result.sections[0]!.posts) {
      const inside = column(false, post.x, post.y).filter(
        ({ part, from, to }) =>
          part !== 'post-bush' ||
          (from >= -design.frameClearance - MICROMETRE &&
            to <= result.stack.depth + design.frameClearance + MICROMETRE),
      );
      closes(inside);
    }
  });

  test('nothing that turns meets anything that stands, from stop to stop', () => {
    const turning = placed.filter(({ turns }) => turns);
    const standing = placed.filter(({ turns }) => !turns);
    const { travel } = result.turn;
    // Pairs of the same parts at other heights are the same pair in plan.
    const seen = new Map<string, [Placed, Placed]>();
    for (const a of turning) {
      for (const b of standing) {
        const common = Math.min(a.to, b.to) - Math.max(a.from, b.from);
        if (common <= MICROMETRE) continue;
        const where = `${a.part} ${b.part} ${b.x.toFixed(3)} ${b.y.toFixed(3)} ${b.angle.toFixed(3)}`;
        if (!seen.has(where)) seen.set(where, [a, b]);
      }
    }
    expect(seen.size).toBeGreaterThan(0);
    const steps = 45;
    for (const [a, b] of seen.values()) {
      const fixed = pathsOf(partBy(assembly, b.part), b, design, 0);
      for (let i = 0; i <= steps; i++) {
        const turn = rotorTurn(result.turn, (travel * i) / steps);
        const moving = pathsOf(partBy(assembly, a.part), a, design, turn);
        const area = commonArea(moving, fixed);
        if (area > 1e-3)
          throw new Error(`${a.part} meets ${b.part} at ${(travel * i) / steps}`);
      }
    }
  });
});
