'use client';

import { useHydrated } from '@/components/ui/local-time';

const written = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});

const two = (value: number): string => String(value).padStart(2, '0');

/**
 * Today where the reader is, as 2026-03-31. Empty until the page is hydrated, before which nothing
 * is overdue: the server doesn't know the zone.
 */
export function useToday(): string {
  const hydrated = useHydrated();
  const now = new Date();
  if (!hydrated) return '';
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** A due date; one that has passed says so in words as well. */
export function DueDay({ day, overdue }: { day: string; overdue: boolean }) {
  return (
    <span className={overdue ? 'font-semibold text-bad' : ''}>
      <time dateTime={day} className="whitespace-nowrap">
        {written.format(new Date(day))}
      </time>
      {overdue && ', overdue'}
    </span>
  );
}

/** By whose day something is overdue. */
export function TodayWords({ today }: { today: string }) {
  if (today === '') return null;
  const { timeZone } = new Intl.DateTimeFormat().resolvedOptions();
  return (
    <p className="text-small text-ink-2">
      Overdue is what was due before today, {written.format(new Date(today))} in your time zone,{' '}
      {timeZone}.
    </p>
  );
}
