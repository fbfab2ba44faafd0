import type { DesignFiles } from '@/lib/schemas/api';

export type ListedFile = DesignFiles['files'][number];

const kinds = {
  dxf: 'DXF',
  svg: 'SVG',
  csv: 'CSV',
  json: 'JSON',
  pdf: 'PDF',
  zip: 'ZIP',
} as const;

export function fileSize(bytes: number): string {
  return bytes < 1000 ? `${bytes} B` : `${Number((bytes / 1000).toPrecision(2))} kB`;
}

/** One format to download, large enough for a glove. @param href address of the folder of files */
export function FileLink({ href, file }: { href: string; file: ListedFile }) {
  return (
    <a
      href={`${href}/${encodeURIComponent(file.name)}`}
      download={file.name}
      aria-label={`${kinds[file.kind]}, ${file.label}`}
      className="flex min-h-11 grow items-center justify-center gap-2 rounded-[3px] border border-edge bg-white px-3 text-ink no-underline hover:border-action"
    >
      <span className="font-semibold text-action">{kinds[file.kind]}</span>
      <span className="text-small text-ink-2">{fileSize(file.bytes)}</span>
    </a>
  );
}
