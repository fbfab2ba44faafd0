import { expect, test } from 'vitest';
import { chosenIn } from '@/components/design/chosen-values';
import { defaultDesign, derive, type Design } from '@/geometry';

function chosen(change: (design: Design) => void) {
  const design = defaultDesign();
  change(design);
  const derivation = derive(design, { model: 'edges' });
  if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join(' '));
  return chosenIn(derivation.derived, 0);
}

test('typing in what was chosen changes nothing', () => {
  const first = chosen(() => undefined);
  const { openRest, meshedRest } = first;
  expect(openRest).toBeGreaterThan(0);
  expect(meshedRest).toBeGreaterThan(0);
  const again = chosen((design) => Object.assign(design, { openRest, meshedRest }));
  expect(again.openRest).toBeCloseTo(openRest!, 12);
  expect(again.meshedRest).toBeCloseTo(meshedRest!, 12);
});

test('posts have one circle round an even stator and none round one that follows', () => {
  const even = chosen((design) => void (design.sections[0]!.statorForm = 'even'));
  expect(even.postCircleRadius).toBeGreaterThan(0);
  const following = chosen((design) => void (design.sections[0]!.statorForm = 'following'));
  expect(following.postCircleRadius).toBeUndefined();
});
