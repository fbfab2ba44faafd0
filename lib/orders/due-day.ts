import 'server-only';
import { RequestError } from '../errors';

const DAY = 24 * 3600 * 1000;

/** A day has passed everywhere once it has where days end last, twelve hours behind UTC. */
const LAST_ZONE = 12 * 3600 * 1000;

/** @param dueOn as 2026-03-31 @throws RequestError bad-input when that day is over everywhere */
export function refusePastDay(dueOn: string): void {
  if (Date.parse(dueOn) + DAY + LAST_ZONE > Date.now()) return;
  throw new RequestError('bad-input', `Due date: ${dueOn} has passed; give today or later.`, {
    field: 'dueOn',
  });
}

const written = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });

/** `31 Mar 2026` */
export const dayWords = (day: string): string => written.format(new Date(day));
