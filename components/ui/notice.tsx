import type { ReactNode } from 'react';

const looks = {
  plain: 'border-line bg-panel text-ink',
  warn: 'border-warn bg-warn-tint text-ink',
  bad: 'border-bad bg-bad-tint text-ink',
} as const;

/** A message that concerns the whole screen; `bad` is read out at once. */
export function Notice({
  look = 'plain',
  children,
}: {
  look?: keyof typeof looks;
  children: ReactNode;
}) {
  return (
    <div
      role={look === 'bad' ? 'alert' : 'status'}
      className={`rounded-[3px] border-l-4 px-3.5 py-2.5 ${looks[look]}`}
    >
      {children}
    </div>
  );
}
