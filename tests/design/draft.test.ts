import { expect, test } from 'vitest';
import { differences } from '@/components/design/differences';
import { designOf, draftOf, sameDraft } from '@/components/design/draft';
import { defaultDesign } from '@/geometry';

test('a draft of a design is that design again', () => {
  const design = defaultDesign();
  expect(designOf(draftOf('Any', design))).toEqual({ ok: true, design });
});

test('text that is no value is named with its field and its range', () => {
  const draft = draftOf('Any', defaultDesign());
  draft.design.sections[0]!.airGap = '5 kHz';
  expect(designOf(draft)).toEqual({
    ok: false,
    path: 'sections.0.airGap',
    message: 'Air gap: “5 kHz” is not a length; give 0.1 mm to 15 mm',
  });
});

test('a field that the kind of target hides cannot block the design', () => {
  const draft = draftOf('Any', defaultDesign());
  Object.assign(draft.design.sections[0]!, { targetKind: 'terminals', inductance: 'coil' });
  const read = designOf(draft);
  expect(read.ok && read.design.sections[0]!.inductance).toBe(
    defaultDesign().sections[0]!.inductance,
  );
});

test('drafts are the same whatever order their keys came in', () => {
  const design = defaultDesign();
  const turned = Object.fromEntries(Object.entries(design).reverse()) as typeof design;
  expect(sameDraft(draftOf('Any', design), draftOf('Any', turned))).toBe(true);
  expect(sameDraft(draftOf('Any', design), draftOf('Other', turned))).toBe(false);
});

test('what two people changed is listed with both values', () => {
  const mine = defaultDesign();
  const theirs = defaultDesign();
  theirs.sections[0]!.airGap = 0.6;
  theirs.material = 'copper';
  theirs.sections.push({ ...theirs.sections[0]! });
  expect(differences(mine, theirs)).toEqual([
    { label: 'Air gap, section 1', mine: '0.5 mm', theirs: '0.6 mm' },
    { label: 'Section 2', mine: 'not there', theirs: 'there' },
    { label: 'Sheet', mine: 'Brass CuZn37', theirs: 'Copper Cu-ETP' },
  ]);
});
