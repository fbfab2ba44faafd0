import type { Severity } from '@/geometry';

export const severityWords: Record<Severity, string> = {
  ok: 'holds',
  warn: 'look at',
  fail: 'fails',
};

const colours: Record<Severity, string> = {
  ok: 'text-ok',
  warn: 'text-warn',
  fail: 'text-bad',
};

/** A shape for each severity, so that colour is never the only sign. */
export function SeverityShape({ severity }: { severity: Severity }) {
  return (
    <svg
      width="14"
      height="14"
      viewBox="0 0 14 14"
      aria-hidden="true"
      className={`shrink-0 ${colours[severity]}`}
    >
      {severity === 'ok' && <circle cx="7" cy="7" r="5" fill="currentColor" />}
      {severity === 'warn' && <path d="M7 1 13.5 12.5H.5z" fill="currentColor" />}
      {severity === 'fail' && <path d="M2 2h10v10H2z" fill="currentColor" />}
    </svg>
  );
}
