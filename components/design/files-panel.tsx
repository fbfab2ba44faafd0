'use client';

import { useQuery } from '@tanstack/react-query';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';

const kinds = { dxf: 'DXF', svg: 'SVG', csv: 'CSV', json: 'JSON' } as const;

function size(bytes: number): string {
  return bytes < 1000 ? `${bytes} B` : `${(bytes / 1000).toPrecision(2)} kB`;
}

/** The files of the saved version, each one link. */
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
  const query = useQuery({
    queryKey: designKeys.files(id, version),
    queryFn: async () => (await loadApi()).fetchFiles(id),
    ...(first?.version === version && { initialData: first }),
    staleTime: Infinity,
  });
  return (
    <div className="flex flex-col gap-2">
      <p className="text-small text-ink-2">
        {dirty
          ? `Of saved version ${version}. The screen has unsaved changes that are not in these files.`
          : `Of version ${version}, in millimetres, drawn at nominal size without kerf.`}
      </p>
      {query.isPending && <p>Making the list of files</p>}
      {query.isError && <p className="text-bad">{query.error.message}</p>}
      <ul className="flex flex-col gap-1.5">
        {query.data?.files.map((file) => (
          <li key={file.name}>
            <a
              href={`/api/designs/${id}/files/${encodeURIComponent(file.name)}`}
              download={file.name}
              className="grid min-h-11 grid-cols-[2.75rem_1fr_auto] items-center gap-x-2 rounded-[3px] border border-edge bg-white px-2.5 py-1.5 text-ink no-underline hover:border-action"
            >
              <span className="font-mono text-small font-semibold text-action">
                {kinds[file.kind]}
              </span>
              <span className="leading-tight">
                {file.label}
                <span className="dense block text-small break-all text-ink-2">{file.name}</span>
              </span>
              <span className="text-small text-ink-2">{size(file.bytes)}</span>
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}
