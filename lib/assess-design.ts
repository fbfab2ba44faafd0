import type { CheckCounts } from '@/entities';
import { KERNEL_VERSION, type Design, type Finding } from '@/geometry';
import { deriveDesign } from './derive-design';

/** What the kernel says of a design today, for storing with it. */
export interface Assessment {
  readonly kernel: string;
  readonly checks: CheckCounts;
  /** The first finding that fails, if any does. */
  readonly failing: Finding | undefined;
}

export function assessDesign(design: Design): Assessment {
  const derivation = deriveDesign(design);
  const findings = derivation.ok ? derivation.derived.findings : derivation.findings;
  const checks: CheckCounts = { ok: 0, warn: 0, fail: 0 };
  for (const { severity } of findings) checks[severity] += 1;
  return {
    kernel: KERNEL_VERSION,
    checks,
    failing: findings.find(({ severity }) => severity === 'fail'),
  };
}

/** A finding in one sentence: what it is and what would put it right. */
export function describeFailure({ label, change, section }: Finding): string {
  const where = section === null ? '' : `Section ${section + 1}, `;
  return `${where}${label}${change ? `: ${change}` : ''}`;
}
