'use client';

import { useSyncExternalStore } from 'react';

const never = () => () => {};

/** False on the server and while hydrating, true afterwards. */
export function useHydrated(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}

const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const day = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
});

function write(date: Date, today: Date): string {
  const sameDay = date.toDateString() === today.toDateString();
  return sameDay ? clock.format(date) : `${day.format(date)}, ${clock.format(date)}`;
}

/**
 * A moment in the reader's own time zone; today's without the day. The server doesn't know the
 * zone, so until the page is hydrated the moment stands in UTC.
 */
export function LocalTime({ iso }: { iso: string }) {
  const hydrated = useHydrated();
  return (
    <time dateTime={iso} className="whitespace-nowrap">
      {hydrated
        ? write(new Date(iso), new Date())
        : `${iso.slice(0, 16).replace('T', ' ')} UTC`}
    </time>
  );
}
