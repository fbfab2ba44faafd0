import { zipSync, type Zippable } from 'fflate';

/** ZIP has no time before 1980; every file gets this one, so that equal files give equal bytes. */
const NO_TIME = new Date(Date.UTC(1980, 0, 1, 12));

/** Files in one folder of one ZIP. The same files give the same bytes. */
export function zipOf(
  folder: string,
  files: readonly { readonly name: string; readonly body: Uint8Array }[],
): Buffer {
  const entries: Zippable = {};
  for (const { name, body } of files) entries[`${folder}/${name}`] = body;
  return Buffer.from(zipSync(entries, { mtime: NO_TIME, level: 6 }));
}
