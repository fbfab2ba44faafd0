'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Derived } from '@/geometry';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';
import { Cautions } from './cautions';
import { CutPart } from './cut-part';
import { byStem, FileSet, stemOf } from './file-set';
import { PanelSection } from './panel-section';
import { useFiles } from './use-files';

const ToolSheet = dynamic(() => import('@/components/tools/tool-sheet'), { ssr: false });

/** What is read at the machine comes before what is read at a desk. */
const rank = { pdf: 0, zip: 1, dxf: 2, svg: 2, csv: 3, json: 4 } as const;

/** The files of the saved version for whoever cuts: each part with its sheet, kerf and pieces. */
export function CutList({
  record,
  first,
  derived,
  section,
}: {
  record: DesignRecord;
  /** The list as the page came with it. */
  first: DesignFiles | null;
  /** What sheets are laid out from; null where these are not the plates of the record. */
  derived: Derived | null;
  section: number;
}) {
  const [laying, setLaying] = useState(false);
  const { id, version } = record;
  const query = useFiles(record, first);
  const { files = [], parts = [] } = query.data ?? {};
  const stems = new Set(parts.map(({ stem }) => stem));
  const others = files
    .filter((file) => !stems.has(stemOf(file)))
    .sort((a, b) => rank[a.kind] - rank[b.kind]);
  return (
    <>
      <PanelSection title="Files to cut from">
        {record.status === 'draft' && (
          <p className="border-l-4 border-warn bg-warn-tint px-3 py-2">
            A draft: ask the builder before cutting from it.
          </p>
        )}
        <p>Version {version}, in millimetres, at nominal size: no kerf is allowed for.</p>
        {query.isPending && <p>Making the list of files</p>}
        {query.isError && <p className="text-bad">{query.error.message}</p>}
        <ul className="flex flex-col">
          {parts.map((part) => (
            <CutPart
              key={part.stem}
              id={id}
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
          <a href={`/designs/${id}/parts`} className="inline-flex min-h-11 items-center">
            All parts, with spacers and frame
          </a>
        </p>
        <ul className="flex flex-col">
          {byStem(others).map((set) => (
            <FileSet key={set[0]?.name} id={id} files={set} />
          ))}
        </ul>
      </PanelSection>
      {laying && derived && (
        <ToolSheet
          tool="sheets"
          design={derived.design}
          section={section}
          derived={derived}
          saved={{ id, version, changed: false }}
          // Whoever only reads has nothing to put the answer into.
          apply={() => undefined}
          close={() => setLaying(false)}
          notice={null}
        />
      )}
    </>
  );
}
