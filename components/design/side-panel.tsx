'use client';

import dynamic from 'next/dynamic';
import type { ReactNode } from 'react';
import type { AngleStore } from '@/components/floor/angle-store';
import type { Finding } from '@/geometry';
import { ToolLinks } from '@/components/tools/tool-links';
import { StackFigures } from './figures';
import { FindingsList } from './findings-list';
import { PanelSection } from './panel-section';
import { LawFigures } from './law-figures';
import type { Plates } from './use-derivation';

// three stays out of the first script; the room it will take is kept free.
const StackView = dynamic(
  () => import('@/components/stack/stack-view').then(({ StackView }) => StackView),
  { ssr: false, loading: () => <p className="p-4 text-ink-2">Loading the 3D view</p> },
);

/** Meshed stack, checks, law and figures; what else there is to show comes as children. */
export function SidePanel({
  plates,
  section,
  store,
  onPick,
  children,
}: {
  plates: Plates;
  section: number;
  store: AngleStore;
  onPick?: (finding: Finding) => void;
  children?: ReactNode;
}) {
  const { derived, findings, broken } = plates;
  const result = derived?.sections[section];
  return (
    <div className="relative flex flex-col gap-5 px-5 py-4 bench:overflow-y-auto">
      {derived && (
        <div className="h-80 shrink-0">
          <StackView derived={derived} store={store} />
        </div>
      )}
      <PanelSection title="Checks">
        {broken && (
          <p role="alert" className="text-bad">
            The kernel could not work this design out, which is a fault of ours. Change back the
            last field.
          </p>
        )}
        <FindingsList
          findings={findings}
          sections={derived?.sections.length ?? 1}
          {...(onPick && { onPick })}
        />
        <ToolLinks place="checks" />
      </PanelSection>
      {derived && result && (
        <>
          <PanelSection title="Law held by the cut plates">
            <LawFigures section={result} />
            <ToolLinks place="held" />
          </PanelSection>
          <PanelSection title="Built stack">
            <StackFigures derived={derived} section={section} />
          </PanelSection>
        </>
      )}
      {children}
    </div>
  );
}
