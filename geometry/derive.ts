import { checkDesign } from './check';
import type { Derivation, Derived, FieldModel, SectionResult } from './derived';
import type { Design } from './design';
import { turnFindings } from './feasibility';
import { createEdgeCache, type EdgeCache } from './field/cell-field';
import type { Finding } from './finding';
import { findingsOf } from './findings';
import { fitFindings } from './parts/fit';
import { deriveSection } from './section';
import { stackOf } from './stack';
import { turnOf } from './turn';
import { KERNEL_VERSION } from './version';

export interface DeriveOptions {
  /** `edges` is quick and leaves the plan view out; files are always made with `field`. */
  readonly model?: FieldModel;
  /** Keeps solved edges from one design to the next; without one they are solved again. */
  readonly cache?: EdgeCache;
}

/**
 * From a design to plates: derived once, read by every view and file.
 *
 * @returns the plates with what was checked on them, or the findings that say why there are none
 *   and what to change.
 * @throws KernelError when a value lies outside the parameter table.
 */
export function derive(
  input: Design,
  { model = 'field', cache = createEdgeCache() }: DeriveOptions = {},
): Derivation {
  const design = checkDesign(input);
  const turn = turnOf(design);
  const sections: SectionResult[] = [];
  const blocking: Finding[] = turnFindings(design, turn);
  design.sections.forEach((_, index) => {
    if (blocking.some((finding) => finding.section === null)) return;
    const outcome = deriveSection(design, turn, index, model, cache);
    if (outcome.ok) sections.push(outcome.result);
    else blocking.push(...outcome.findings);
  });
  if (blocking.length > 0) return { ok: false, findings: blocking };
  const stack = stackOf(design, sections);
  const plates: Derived = {
    kernel: KERNEL_VERSION,
    design,
    turn,
    sections,
    stack,
    findings: findingsOf(design, sections, stack),
  };
  return {
    ok: true,
    derived: { ...plates, findings: [...plates.findings, ...fitFindings(plates)] },
  };
}
