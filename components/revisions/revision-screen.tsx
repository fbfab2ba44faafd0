'use client';

import Link from 'next/link';
import { lazy, Suspense, useState } from 'react';
import { I18nProvider } from 'react-aria-components/I18nProvider';
import { CutList } from '@/components/design/cut-list';
import { ParameterList } from '@/components/design/parameter-list';
import { PlatesColumn } from '@/components/design/plates-column';
import { SectionPicker } from '@/components/design/section-picker';
import { SidePanel } from '@/components/design/side-panel';
import { useAngleStore } from '@/components/design/use-angle-store';
import { LocalTime } from '@/components/ui/local-time';
import { Notice } from '@/components/ui/notice';
import { KERNEL_VERSION, type Derivation, type Design } from '@/geometry';
import type { DesignFiles } from '@/lib/schemas/api';
import type { Revision } from '@/lib/schemas/revision';
import { KeptAs } from './kept-as';
import type { May } from './may';
import { RevisionActions } from './revision-actions';
import { RevisionBadge } from './revision-badge';
import { RevisionNotice } from './revision-notice';
import { useRevision, useRevisionFiles } from './use-revision';

const TodayKernel = lazy(() => import('./today-kernel'));

/** Who released it last, or who named it. */
function Word({ revision }: { revision: Revision }) {
  const { number, name, createdAt, createdBy, releasedAt, releasedBy } = revision;
  return (
    <p role="status" className="min-w-0 wrap-anywhere text-ink-2">
      Revision {number}, {name}, {releasedAt ? 'released' : 'named'}{' '}
      <LocalTime iso={releasedAt ?? createdAt} />
      {releasedAt ? releasedBy && ` by ${releasedBy.name}` : ` by ${createdBy.name}`}
    </p>
  );
}

/** A revision as it was frozen: the files first for whoever cuts, and nothing to change. */
export function RevisionScreen({
  revision: first,
  design,
  derivation,
  files,
  may,
}: {
  revision: Revision;
  design: Design;
  derivation: Derivation;
  /** As the page came with them; null where there are none to cut from. */
  files: DesignFiles | null;
  may: May;
}) {
  const { revision, gone, trouble } = useRevision(first);
  const [section, setSection] = useState(0);
  const derived = derivation.ok ? derivation.derived : null;
  const findings = derivation.ok ? derivation.derived.findings : derivation.findings;
  const store = useAngleStore(derived);
  const { state, kernel } = revision;
  const inUse = !gone && state !== 'withdrawn' && (state !== 'superseded' || may.edit);
  const list = useRevisionFiles(revision, first.updatedAt, files, inUse);
  const count = derived?.sections.length ?? 1;

  return (
    <I18nProvider locale="en-GB">
      <main id="main" className="flex flex-col bench:h-[calc(100dvh-3rem-1px)] bench:min-h-150">
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-b border-line px-5 py-2.5">
          <h1 className="wide-letter min-w-0 text-title font-semibold wrap-anywhere">
            {revision.designName}
          </h1>
          <RevisionBadge state={state} />
          <Word revision={revision} />
          <div className="ml-auto flex flex-wrap items-center gap-x-4 gap-y-2">
            {may.edit && (
              <Link
                href={`/designs/${revision.designId}/revisions`}
                className="inline-flex min-h-11 items-center"
              >
                All revisions
              </Link>
            )}
            {!gone && <RevisionActions revision={revision} findings={findings} may={may} />}
          </div>
        </div>
        <RevisionNotice revision={revision} gone={gone} mayEdit={may.edit} />
        {trouble && <Notice look="warn">{trouble} This page may be out of date.</Notice>}
        <div className="grid min-h-0 grow bench:grid-cols-[19.5rem_minmax(0,1fr)_20.5rem] bench:grid-rows-[minmax(0,1fr)]">
          <div className="contents bench:flex bench:flex-col bench:gap-5 bench:overflow-y-auto bench:px-5 bench:py-4">
            <div className="flex min-w-0 flex-col gap-5 max-bench:px-5 max-bench:py-4">
              <CutList
                revision={revision}
                list={inUse ? list : null}
                // The server lays out what is released for those who cut, else what is saved.
                derived={state === 'released' && !may.edit ? derived : null}
                section={section}
              />
            </div>
            <div className="flex flex-col gap-5 max-bench:order-last max-bench:px-5 max-bench:py-4">
              <KeptAs revision={revision} />
              {derived && kernel !== KERNEL_VERSION && (
                <Suspense>
                  <TodayKernel derived={derived} />
                </Suspense>
              )}
              {count > 1 && (
                <SectionPicker count={count} section={section} onChange={setSection} />
              )}
              <ParameterList design={design} section={section} />
            </div>
          </div>
          <div className="min-w-0 bench:flex bench:min-h-0 bench:flex-col">
            <PlatesColumn derived={derived} section={section} store={store} note={null} />
          </div>
          <div className="min-w-0 bench:flex bench:min-h-0 bench:flex-col">
            <SidePanel
              plates={{ derived, findings, current: true, broken: false }}
              section={section}
              store={store}
            />
          </div>
        </div>
      </main>
    </I18nProvider>
  );
}
