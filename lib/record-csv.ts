import 'server-only';
import { csvCell } from '@/geometry/files/bill-table';
import type { Viewer } from './access';
import { recordRows } from './record-queries';
import type { RecordQuery, RecordRow } from './schemas/record';

const HEAD = ['Row', 'At (UTC)', 'Who', 'Did', 'To', 'Revision', 'Detail'];

const lineOf = (cells: readonly (string | number)[]): string =>
  `${cells.map(csvCell).join(',')}\r\n`;

const cellsOf = ({ id, at, who, did, subject, revision, facts }: RecordRow) => [
  Number(id),
  at,
  who.name,
  did,
  subject.name,
  revision ?? '',
  facts.map(([name, value]) => `${name}: ${value}`).join('; '),
];

/** The record as CSV, read from the database as it is sent. */
export function recordCsv(viewer: Viewer, query: RecordQuery): ReadableStream {
  const encoder = new TextEncoder();
  const chunks = recordRows(viewer, query);
  let begun = false;
  return new ReadableStream<Uint8Array>({
    async pull(controller) {
      if (!begun) {
        begun = true;
        controller.enqueue(encoder.encode(lineOf(HEAD)));
        return;
      }
      const { value, done } = await chunks.next();
      if (done) controller.close();
      else
        controller.enqueue(encoder.encode(value.map((row) => lineOf(cellsOf(row))).join('')));
    },
  });
}
