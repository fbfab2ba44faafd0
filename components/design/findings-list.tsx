'use client';

import { SeverityShape, severityWords } from '@/components/ui/severity';
import { formatQuantity, type Finding } from '@/geometry';
import { findingSide } from './finding-side';

const colours = { ok: 'text-ok', warn: 'text-warn', fail: 'text-bad' } as const;
const rank = { fail: 0, warn: 1, ok: 2 } as const;

/** The law error is a fraction of the range; people read it in per cent. */
function written({ code, quantity }: Finding, value: number): string {
  return code === 'law-held'
    ? `${Number((value * 100).toPrecision(2))} %`
    : formatQuantity(value, quantity, 3);
}

function FindingBody({ finding, sections }: { finding: Finding; sections: number }) {
  const { severity, label, value, limit, change, section } = finding;
  return (
    <span className="grid w-full grid-cols-[0.875rem_1fr_auto] items-start gap-x-2.5 gap-y-0.5 text-left">
      <span className="pt-0.5">
        <SeverityShape severity={severity} />
      </span>
      <span className="leading-snug">
        {label}
        {section !== null && sections > 1 && `, section ${section + 1}`}
        <span className={`ml-2 text-small font-semibold ${colours[severity]}`}>
          {severityWords[severity]}
        </span>
      </span>
      {/* A law that can't be read has no number. */}
      {finding.code !== 'own-law' && (
        <span className="text-right whitespace-nowrap">
          {written(finding, value)}
          <span className="block text-small text-ink-2">
            {findingSide(finding)} {written(finding, limit)}
          </span>
        </span>
      )}
      {change !== '' && (
        <span className="col-span-2 col-start-2 text-small text-ink">{change}</span>
      )}
    </span>
  );
}

/** What the checks found, the worst first. With `onPick`, each leads to the field to change. */
export function FindingsList({
  findings,
  sections,
  onPick,
}: {
  findings: readonly Finding[];
  sections: number;
  onPick?: (finding: Finding) => void;
}) {
  const sorted = [...findings].sort((a, b) => rank[a.severity] - rank[b.severity]);
  return (
    <ul className="dense flex flex-col">
      {sorted.map((finding) => (
        <li
          key={`${finding.code}-${finding.section}-${finding.label}`}
          className="border-b border-line last:border-0"
        >
          {onPick && finding.parameters.length > 0 ? (
            <button
              type="button"
              onClick={() => onPick(finding)}
              className="flex w-full py-1.5 hover:bg-white max-bench:min-h-11"
            >
              <FindingBody finding={finding} sections={sections} />
            </button>
          ) : (
            <div className="py-1.5">
              <FindingBody finding={finding} sections={sections} />
            </div>
          )}
        </li>
      ))}
    </ul>
  );
}
