import Image from 'next/image';
import { fileSize } from '@/components/design/file-link';
import { LocalTime } from '@/components/ui/local-time';
import type { Attached, OrderMessage } from '@/lib/schemas/order';

const kinds: Readonly<Record<OrderMessage['kind'], string>> = {
  remark: '',
  question: 'Question',
  answer: 'Answer',
};

function AttachedFile({ file }: { file: Attached }) {
  const href = `/api/attachments/${file.id}`;
  if (file.shown) {
    return (
      <a
        href={href}
        target="_blank"
        rel="noreferrer"
        className="relative block h-60 w-full border border-line bg-white"
      >
        {/* As it is: for members alone, so nothing in between may keep or resize it. */}
        <Image src={href} alt={file.name} fill unoptimized className="object-contain" />
      </a>
    );
  }
  return (
    <a
      href={href}
      download={file.name}
      className="flex min-h-11 items-center gap-2 wrap-anywhere"
    >
      {file.name} <span className="whitespace-nowrap text-ink-2">{fileSize(file.bytes)}</span>
    </a>
  );
}

/** What was written under an order, oldest first. */
export function Thread({ messages }: { messages: readonly OrderMessage[] }) {
  if (messages.length === 0) return <p className="text-ink-2">Nothing written yet.</p>;
  return (
    <ol className="flex flex-col">
      {messages.map(({ id, kind, text, at, author, attachments }) => (
        <li
          key={id}
          className="flex flex-col gap-1.5 border-b border-line py-3 first:pt-0 last:border-0"
        >
          <p className="flex flex-wrap gap-x-2 text-small text-ink-2">
            {kinds[kind] && (
              <strong className={kind === 'question' ? 'text-warn' : 'text-ok'}>
                {kinds[kind]}
              </strong>
            )}
            <span className="font-semibold text-ink">{author.name}</span>
            <LocalTime iso={at} />
          </p>
          {text && <p className="wrap-anywhere whitespace-pre-wrap">{text}</p>}
          {attachments.map((file) => (
            <AttachedFile key={file.id} file={file} />
          ))}
        </li>
      ))}
    </ol>
  );
}
