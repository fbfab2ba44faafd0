import type { Derivation, SectionResult } from './derived';
import type { Design } from './design';
import { checkDesign } from './check';
import type { Finding } from './finding';
import { findingsOf } from './findings';
import { deriveSection } from './section';
import { stackOf } from './stack';
import { KERNEL_VERSION } from './version';

/**
 * From a design to plates: derived once, read by every view and file.
 *
 * @returns the plates with what was checked on them, or the findings that say why there are none
 *   and what to change.
 * @throws KernelError when a value lies outside the parameter table.
 */
export function derive(input: Design): Derivation {
  const design = checkDesign(input);
  const sections: SectionResult[] = [];
  const blocking: Finding[] = [];
  design.sections.forEach((section, index) => {
    const outcome = deriveSection(design, section, index);
    if (outcome.ok) sections.push(outcome.result);
    else blocking.push(...outcome.findings);
  });
  if (blocking.length > 0) return { ok: false, findings: blocking };
  const stack = stackOf(design, sections);
  return {
    ok: true,
    derived: {
      kernel: KERNEL_VERSION,
      design,
      sections,
      stack,
      findings: findingsOf(design, sections, stack),
    },
  };
}
