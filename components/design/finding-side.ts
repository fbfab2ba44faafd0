import type { Finding, FindingCode } from '@/geometry';

/**
 * On which side of its limit each check holds. It is not to be told from value and limit: a law
 * that rises to its very end has both alike, and so has a blade on its least radius.
 */
const sides: Record<
  Exclude<FindingCode, 'range-infeasible'>,
  'at most' | 'at least' | 'law over'
> = {
  'outline-infeasible': 'at least',
  'plate-counts': 'at most',
  turn: 'at least',
  'own-law': 'at least',
  tracking: 'at most',
  'table-span': 'law over',
  'table-rough': 'at most',
  'law-held': 'at most',
  'law-rises': 'at least',
  'open-capacitance': 'at most',
  'blade-narrow': 'at least',
  radius: 'at most',
  depth: 'at most',
  'gap-voltage': 'at most',
  'post-clearance': 'at least',
  'ears-crowded': 'at most',
  'overhang-short': 'at least',
  'cutout-clearance': 'at least',
  'spacer-proud': 'at least',
  'hole-small': 'at least',
  'web-thin': 'at least',
  slots: 'at least',
  frame: 'at least',
};

/** How the limit of a finding is to be read. */
export function findingSide({ code, value, limit, parameters }: Finding): string {
  if (code === 'frame' && !parameters[0]?.startsWith('frame')) return 'at most';
  if (code !== 'range-infeasible') return sides[code];
  // Only listed when it fails: what is too large must come below, what is too small above.
  return value > limit ? 'below' : 'above';
}
