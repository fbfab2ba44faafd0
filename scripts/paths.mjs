import { mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The clone this script stands in. */
export const root = dirname(dirname(fileURLToPath(import.meta.url)));

/** What a running Vaneloft keeps: cluster, secret, demo sign-ins, process ids. */
export const data = process.env.VANELOFT_DATA ?? join(root, '.data');

export function makeData() {
  mkdirSync(data, { recursive: true });
}
