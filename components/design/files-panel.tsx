'use client';

import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';
import { byStem, FileSet } from './file-set';
import { useFiles } from './use-files';

/** The files of the saved version, for whoever designs: one entry for each part. */
export function FilesPanel({
  record,
  first,
  dirty,
}: {
  record: DesignRecord;
  /** The list as the page came with it. */
  first: DesignFiles | null;
  dirty: boolean;
}) {
  const { id, version } = record;
  const query = useFiles(record, first);
  return (
    <div className="flex flex-col gap-1">
      <p className="text-small text-ink-2">
        {dirty
          ? `Of saved version ${version}. The screen has unsaved changes that are not in these files.`
          : `Of version ${version}, in millimetres, at nominal size: no kerf is allowed for.`}
      </p>
      <p>
        <a href={`/designs/${id}/parts`}>All parts, with spacers and frame</a>
      </p>
      {query.isPending && <p>Making the list of files</p>}
      {query.isError && <p className="text-bad">{query.error.message}</p>}
      <ul className="flex flex-col">
        {byStem(query.data?.files ?? []).map((files) => (
          <FileSet key={files[0]?.name} href={`/api/designs/${id}/files`} files={files} />
        ))}
      </ul>
    </div>
  );
}
