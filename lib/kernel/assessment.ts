import type { CheckCounts } from '@/entities';
import { KERNEL_VERSION, type Derivation, type Finding } from '@/geometry';

/** What the kernel says of a design today, for storing with it. */
export interface Assessment {
  readonly kernel: string;
  readonly checks: CheckCounts;
}

/** Every finding, of plates that there are or of why there are none. */
export const findingsOf = (derivation: Derivation): readonly Finding[] =>
  derivation.ok ? derivation.derived.findings : derivation.findings;

export function assessmentOf(derivation: Derivation): Assessment {
  const checks: CheckCounts = { ok: 0, warn: 0, fail: 0 };
  for (const { severity } of findingsOf(derivation)) checks[severity] += 1;
  return { kernel: KERNEL_VERSION, checks };
}

/** A finding in one sentence: what it is and what would put it right. */
export function describeFailure({ label, change, section }: Finding): string {
  const where = section === null ? '' : `Section ${section + 1}, `;
  return `${where}${label}${change ? `: ${change}` : ''}`;
}
