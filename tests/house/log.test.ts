import { Writable } from 'node:stream';
import pino from 'pino';
import { expect, test } from 'vitest';
import { logOptions } from '@/lib/log';
import { loggedPath } from '@/lib/logged-path';

/** What a logger with our options writes. */
function written(write: (log: pino.Logger) => void): string {
  let text = '';
  const sink = new Writable({
    write(chunk: Buffer, _encoding, done) {
      text += chunk.toString();
      done();
    },
  });
  write(pino({ ...logOptions, level: 'debug' }, sink));
  return text;
}

test.each([
  { password: 'HIDE' },
  { user: { passwordHash: 'HIDE', email: 'a' } },
  { headers: { cookie: 'HIDE', authorization: 'HIDE' } },
  { request: { headers: { cookie: 'HIDE' } } },
  { env: { NEXTAUTH_SECRET: 'HIDE', DATABASE_URL: 'HIDE' } },
])('%j is written without what is secret', (fields) => {
  const line = written((log) => log.info(fields, 'event'));
  expect(line).not.toContain('HIDE');
  expect(line).toContain('[redacted]');
});

test('an error is written with its causes and its code, without the values of a statement', () => {
  const driver = Object.assign(new Error("insert into users values ('HIDE') - duplicate key"), {
    code: '23505',
  });
  const line = written((log) => log.error({ err: new Error('failed', { cause: driver }) }));
  const entry = JSON.parse(line) as { err: { message: string; cause: Record<string, string> } };
  expect(entry.err.message).toBe('failed');
  expect(entry.err.cause).toMatchObject({ message: 'duplicate key', code: '23505' });
  expect(line).not.toContain('HIDE');
});

test.each([
  ['/join/HIDE', '/join/…'],
  ['/reset/HIDE/more', '/reset/…'],
  ['/sign-in?callbackUrl=%2Fjoin%2FHIDE', '/sign-in'],
  ['/designs/1', '/designs/1'],
])('the path %s is written as %s', (path, expected) => {
  expect(loggedPath(path)).toBe(expected);
});
