/**
 * Stands in for a mail server: takes every message on loopback, delivers none, and keeps each as
 * JSON in a folder for people to read. `node scripts/smtp-fake.mjs PORT FOLDER`.
 */

import { randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

/** Messages kept; the oldest go first. */
const KEPT = 500;

/** Bytes of one message taken. */
const LARGEST = 1_000_000;

function keep(folder, { messageId, from, to, subject, text, html }) {
  const at = new Date();
  const id = randomUUID();
  const addresses = (found) =>
    [found ?? []].flat().flatMap(({ value }) => value.map(({ address }) => address ?? ''));
  const message = {
    id,
    at: at.toISOString(),
    from: addresses(from)[0] ?? '',
    to: addresses(to),
    subject: subject ?? '',
    text: text ?? '',
    html: html || '',
    messageId: messageId ?? '',
  };
  // Named by its moment, so that names sort as the messages came; whole or not there at all.
  const file = join(folder, `${at.getTime()}-${id}.json`);
  writeFileSync(`${file}.new`, JSON.stringify(message), { mode: 0o600 });
  renameSync(`${file}.new`, file);
  const kept = readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .sort();
  for (const name of kept.slice(0, -KEPT)) rmSync(join(folder, name), { force: true });
}

const [port, folder] = process.argv.slice(2);
if (!Number(port) || !folder) throw new Error('smtp-fake: give a port and a folder');
mkdirSync(folder, { recursive: true, mode: 0o700 });

const server = new SMTPServer({
  // Nobody to hide from on loopback, and nobody to tell apart.
  disabledCommands: ['AUTH', 'STARTTLS'],
  disableReverseLookup: true,
  size: LARGEST,
  onData(stream, _session, done) {
    simpleParser(stream).then(
      (message) => {
        keep(folder, message);
        done();
      },
      (error) => done(error),
    );
  },
});
server.on('error', (error) => console.error(`Mail stand-in: ${error.message}`));
server.listen(Number(port), '127.0.0.1');

for (const event of ['SIGTERM', 'SIGINT', 'disconnect']) {
  process.on(event, () => server.close(() => process.exit()));
}
