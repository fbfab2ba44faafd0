'use client';

import { useQuery } from '@tanstack/react-query';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';

type File = DesignFiles['files'][number];

const kinds = {
  dxf: 'DXF',
  svg: 'SVG',
  csv: 'CSV',
  json: 'JSON',
  pdf: 'PDF',
  zip: 'ZIP',
} as const;

function size(bytes: number): string {
  return bytes < 1000 ? `${bytes} B` : `${Number((bytes / 1000).toPrecision(2))} kB`;
}

const stemOf = (name: string) => name.slice(0, name.lastIndexOf('.'));

/** The same part in several formats stands together. */
function byPart(files: readonly File[]): File[][] {
  const parts = new Map<string, File[]>();
  for (const file of files) {
    const stem = stemOf(file.name);
    parts.set(stem, [...(parts.get(stem) ?? []), file]);
  }
  return [...parts.values()];
}

function Part({ id, files }: { id: string; files: readonly File[] }) {
  const [first] = files;
  if (!first) return null;
  return (
    <li className="flex flex-col gap-1.5 border-b border-line py-2.5 last:border-0">
      <p className="leading-tight font-medium">
        {first.label}
        {/* Names break where their parts do. */}
        <span className="dense block pt-0.5 text-small font-normal wrap-anywhere text-ink-2">
          {stemOf(first.name)
            .split(/(?<=[_-])/)
            .flatMap((piece, index) => [<wbr key={index} />, piece])}
        </span>
      </p>
      <p className="flex flex-wrap gap-1.5">
        {files.map((file) => (
          <a
            key={file.name}
            href={`/api/designs/${id}/files/${encodeURIComponent(file.name)}`}
            download={file.name}
            aria-label={`${kinds[file.kind]}, ${file.label}`}
            className="flex min-h-11 grow items-center justify-center gap-2 rounded-[3px] border border-edge bg-white px-3 text-ink no-underline hover:border-action"
          >
            <span className="font-semibold text-action">{kinds[file.kind]}</span>
            <span className="text-small text-ink-2">{size(file.bytes)}</span>
          </a>
        ))}
      </p>
    </li>
  );
}

/** The files of the saved version: one entry for each part, one link for each format. */
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
        {byPart(query.data?.files ?? []).map((files) => (
          <Part key={stemOf(files[0]?.name ?? '')} id={id} files={files} />
        ))}
      </ul>
    </div>
  );
}
