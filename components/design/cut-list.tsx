'use client';

import type { UseQueryResult } from '@tanstack/react-query';
import dynamic from 'next/dynamic';
import { useState } from 'react';
import { FileHashes } from '@/components/revisions/file-hashes';
import { Button } from '@/components/ui/button';
import type { Derived } from '@/geometry';
import type { DesignFiles } from '@/lib/schemas/api';
import type { Revision } from '@/lib/schemas/revision';
import { Cautions } from './cautions';
import { CutPart } from './cut-part';
import { byStem, FileSet, stemOf } from './file-set';
import { PanelSection } from './panel-section';

const ToolSheet = dynamic(() => import('@/components/tools/tool-sheet'), { ssr: false });

/** What is read at the machine comes before what is read at a desk. */
const rank = { pdf: 0, zip: 1, dxf: 2, svg: 2, csv: 3, json: 4 } as const;

/** The files of a revision for whoever cuts: each part with its sheet, kerf and pieces. */
export function CutList({
  revision,
  list,
  derived,
  section,
}: {
  revision: Revision;
  /** Null where none is given out. */
  list: UseQueryResult<DesignFiles> | null;
  /** What sheets are laid out from; null where none are. */
  derived: Derived | null;
  section: number;
}) {
  const [laying, setLaying] = useState(false);
  const { id, designId, number, version } = revision;
  if (!list) {
    return (
      <>
        <PanelSection title="Files to cut from">
          <p>No file is given out: revision {number} must not be cut.</p>
        </PanelSection>
        <Cautions />
      </>
    );
  }
  const { files = [], parts = [] } = list.data ?? {};
  const href = `/api/revisions/${id}/files`;
  const stems = new Set(parts.map(({ stem }) => stem));
  const others = files
    .filter((file) => !stems.has(stemOf(file)))
    .sort((a, b) => rank[a.kind] - rank[b.kind]);
  return (
    <>
      <PanelSection title="Files to cut from">
        <p>Of revision {number}, in millimetres, at nominal size: no kerf is allowed for.</p>
        {list.isPending && <p>Making the list of files</p>}
        {list.isError && <p className="text-bad">{list.error.message}</p>}
        <ul className="flex flex-col">
          {parts.map((part) => (
            <CutPart
              key={part.stem}
              href={href}
              part={part}
              files={files.filter((file) => stemOf(file) === part.stem)}
            />
          ))}
        </ul>
      </PanelSection>
      {derived && (
        <PanelSection title="Sheets for your machine">
          <p>
            All pieces laid out on sheets, compensated for the kerf of your machine or nominal:
            see every sheet, then save it or all files in one.
          </p>
          <Button className="min-h-12 self-stretch" onPress={() => setLaying(true)}>
            Lay out on sheets
          </Button>
        </PanelSection>
      )}
      <Cautions />
      <PanelSection title="Drawing, lists and all in one">
        <p>
          <a
            href={`/designs/${designId}/revisions/${number}/parts`}
            className="inline-flex min-h-11 items-center"
          >
            All parts, with spacers and frame
          </a>
        </p>
        <ul className="flex flex-col">
          {byStem(others).map((set) => (
            <FileSet key={set[0]?.name} href={href} files={set} />
          ))}
        </ul>
        <FileHashes files={files} />
      </PanelSection>
      {laying && derived && (
        <ToolSheet
          tool="sheets"
          design={derived.design}
          section={section}
          derived={derived}
          saved={{ id: designId, version, changed: false }}
          // Whoever only reads has nothing to put the answer into.
          apply={() => undefined}
          close={() => setLaying(false)}
          notice={null}
        />
      )}
    </>
  );
}
