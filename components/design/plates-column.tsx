'use client';

import { AngleRule } from '@/components/floor/angle-rule';
import type { AngleStore } from '@/components/floor/angle-store';
import { Floor } from '@/components/floor/floor';
import { LawChart } from '@/components/floor/law-chart';
import type { Derived } from '@/geometry';

/**
 * Floor, angle rule and chart in one column with the same insets, so that the rule's line runs on
 * through the chart. `note` says why these plates may not be those of the form.
 */
export function PlatesColumn({
  derived,
  section,
  store,
  note,
}: {
  derived: Derived | null;
  section: number;
  store: AngleStore;
  note: string | null;
}) {
  const result = derived?.sections[section];
  return (
    <section
      aria-label="Plates and law"
      className="flex min-w-0 flex-col border-line bg-panel max-bench:border-y bench:min-h-0 bench:grow bench:overflow-y-auto bench:border-x"
    >
      {note && (
        <p role="status" className="border-b border-warn bg-warn-tint px-4 py-2 text-small">
          {note}
        </p>
      )}
      {derived && result ? (
        <>
          <div className="h-[min(92vw,30rem)] shrink-0 bench:h-auto bench:min-h-104 bench:grow bench:*:h-full">
            <Floor derived={derived} section={section} store={store} />
          </div>
          <AngleRule store={store} travel={derived.design.travel} section={result} />
          <LawChart section={result} store={store} />
        </>
      ) : (
        <p className="flex min-h-80 grow items-center justify-center bg-floor p-8 text-center text-lead text-scribe">
          No plates yet. The checks say which number to change.
        </p>
      )}
    </section>
  );
}
