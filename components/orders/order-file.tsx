import { fileSize } from '@/components/design/file-link';
import type { Order } from '@/lib/schemas/order';

type ListedFile = Order['otherFiles'][number];

/** One file of exactly the revision that was ordered, large enough for a glove. */
export function OrderFile({
  revision,
  file,
  words = file.kind.toUpperCase(),
}: {
  /** Its id. */
  revision: string;
  file: ListedFile;
  words?: string;
}) {
  return (
    <a
      href={`/api/revisions/${revision}/files/${encodeURIComponent(file.name)}`}
      download={file.name}
      aria-label={`${file.kind.toUpperCase()}, ${file.label}`}
      className="flex min-h-11 grow items-center justify-center gap-2 rounded-[3px] border border-edge bg-white px-3 text-ink no-underline hover:border-action"
    >
      <span className="font-semibold text-action">{words}</span>
      <span className="text-small whitespace-nowrap text-ink-2">{fileSize(file.bytes)}</span>
    </a>
  );
}
