import { SeverityShape } from '@/components/ui/severity';
import type { DesignSummary } from '@/lib/schemas/api';

type Checks = DesignSummary['checks'];

/** Sorts the design with most to put right first or last. */
export function checksRank({ warn, fail }: Checks): number {
  return fail * 1000 + warn;
}

/** What the checks said at the last save, in shape, number and word. */
export function ChecksCell({ checks }: { checks: Checks }) {
  const { fail, warn } = checks;
  return (
    <span className="flex flex-wrap gap-x-3 whitespace-nowrap">
      {fail > 0 && (
        <span className="flex items-center gap-1.5 text-bad">
          <SeverityShape severity="fail" />
          {fail} {fail === 1 ? 'fails' : 'fail'}
        </span>
      )}
      {warn > 0 && (
        <span className="flex items-center gap-1.5 text-warn">
          <SeverityShape severity="warn" />
          {warn} to look at
        </span>
      )}
      {fail + warn === 0 && (
        <span className="flex items-center gap-1.5 text-ok">
          <SeverityShape severity="ok" />
          all hold
        </span>
      )}
    </span>
  );
}
