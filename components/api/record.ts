import { recordPageSchema, type RecordPage, type RecordQuery } from '@/lib/schemas/record';
import { request } from './request';

/** The filter as a route takes it. */
export const recordSearch = (query: RecordQuery): string =>
  new URLSearchParams(
    Object.entries(query).filter((pair): pair is [string, string] => Boolean(pair[1])),
  ).toString();

export const fetchRecord = (query: RecordQuery): Promise<RecordPage> =>
  request(recordPageSchema, `/api/record?${recordSearch(query)}`);
