'use client';

import { useEffect, useState } from 'react';
import { LocalTime } from '@/components/ui/local-time';
import { StatusBadge } from '@/components/ui/status-badge';
import type { Derivation } from '@/geometry';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';
import { CutList } from './cut-list';
import { ParameterList } from './parameter-list';
import { PlatesColumn } from './plates-column';
import { SectionPicker } from './section-picker';
import { SidePanel } from './side-panel';
import { useAngleStore } from './use-angle-store';
import { useDerivation } from './use-derivation';
import { useNews } from './use-news';

/** The design for somebody who cuts it: the files first, nothing to change. */
export function ReadScreen({
  record: first,
  derivation,
  files,
}: {
  record: DesignRecord;
  derivation: Derivation;
  files: DesignFiles | null;
}) {
  const [plates, request] = useDerivation(derivation);
  const { later, gone } = useNews(first);
  const record = later ?? first;
  const [section, setSection] = useState(0);
  const store = useAngleStore(plates.derived);

  useEffect(() => {
    if (later) request(later.design);
  }, [later, request]);

  const count = plates.derived?.sections.length ?? 1;
  const shown = Math.min(section, count - 1);

  return (
    <main id="main" className="flex flex-col bench:h-[calc(100dvh-3rem-1px)] bench:min-h-150">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-line px-5 py-2.5">
        <h1 className="wide-letter text-title font-semibold">{record.name}</h1>
        <StatusBadge status={record.status} />
        <p role="status" className="text-ink-2">
          {gone ? (
            <strong className="text-bad">deleted meanwhile; do not cut it</strong>
          ) : (
            <>
              version {record.version}, saved <LocalTime iso={record.updatedAt} /> by{' '}
              {record.updatedBy.name}
            </>
          )}
        </p>
      </div>
      <div className="grid min-h-0 grow bench:grid-cols-[19.5rem_minmax(0,1fr)_20.5rem] bench:grid-rows-[minmax(0,1fr)]">
        <div className="contents bench:flex bench:flex-col bench:gap-5 bench:overflow-y-auto bench:px-5 bench:py-4">
          <div className="flex min-w-0 flex-col gap-5 max-bench:px-5 max-bench:py-4">
            <CutList
              record={record}
              first={files}
              derived={plates.current ? plates.derived : null}
              section={shown}
            />
          </div>
          <div className="flex flex-col gap-5 max-bench:order-last max-bench:px-5 max-bench:py-4">
            {count > 1 && <SectionPicker count={count} section={shown} onChange={setSection} />}
            <ParameterList design={record.design} section={shown} />
          </div>
        </div>
        <div className="min-w-0 bench:flex bench:min-h-0 bench:flex-col">
          <PlatesColumn
            derived={plates.derived}
            section={shown}
            store={store}
            note={plates.current ? null : 'This version gives no plates; the checks say why.'}
          />
        </div>
        <div className="min-w-0 bench:flex bench:min-h-0 bench:flex-col">
          <SidePanel plates={plates} section={shown} store={store} />
        </div>
      </div>
    </main>
  );
}
