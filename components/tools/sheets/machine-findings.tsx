import { SeverityShape, severityWords } from '@/components/ui/severity';
import { formatQuantity } from '@/geometry';
import type { CuttingFinding } from '@/geometry/cutting/cutting-finding';

const rank = { fail: 0, warn: 1, ok: 2 } as const;

/** Upper limits; the others are least values. */
const AT_MOST: readonly CuttingFinding['code'][] = ['part-large', 'sheets-short'];

function Row({ finding }: { finding: CuttingFinding }) {
  const { code, severity, label, value, limit, quantity, change } = finding;
  return (
    <li className="grid grid-cols-[0.875rem_1fr_auto] items-start gap-x-2.5 gap-y-0.5 border-b border-line py-1.5 last:border-0">
      <span className="pt-0.5">
        <SeverityShape severity={severity} />
      </span>
      <span className="leading-snug">
        {label} <span className="text-small font-semibold">{severityWords[severity]}</span>
      </span>
      <span className="text-right whitespace-nowrap">
        {value !== null && formatQuantity(value, quantity, 3)}
        {limit !== null && (
          <span className="block text-small text-ink-2">
            {AT_MOST.includes(code) ? 'at most' : 'at least'}{' '}
            {formatQuantity(limit, quantity, 3)}
          </span>
        )}
      </span>
      {change && <span className="col-span-2 col-start-2 text-small">{change}</span>}
    </li>
  );
}

/** What the machine can't cut comes first and open; what holds is folded away. */
export function MachineFindings({ findings }: { findings: readonly CuttingFinding[] }) {
  const open = findings
    .filter(({ severity }) => severity !== 'ok')
    .sort((a, b) => rank[a.severity] - rank[b.severity]);
  const held = findings.filter(({ severity }) => severity === 'ok');
  const list = (rows: readonly CuttingFinding[]) => (
    <ul className="dense flex flex-col">
      {rows.map((finding) => (
        <Row key={`${finding.code} ${finding.part} ${finding.label}`} finding={finding} />
      ))}
    </ul>
  );
  return (
    <>
      {open.length > 0 ? list(open) : <p>This machine can cut every contour.</p>}
      {held.length > 0 && (
        <details>
          <summary className="min-h-8 cursor-pointer text-action max-bench:min-h-11">
            {held.length} checks that hold
          </summary>
          {list(held)}
        </details>
      )}
    </>
  );
}
