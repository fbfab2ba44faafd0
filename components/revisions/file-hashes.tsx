import type { DesignFiles } from '@/lib/schemas/api';

/** By what a copy of a file can be told from another. */
export function FileHashes({ files }: { files: DesignFiles['files'] }) {
  if (files.length === 0) return null;
  return (
    <details>
      <summary className="cursor-pointer py-1 max-bench:py-3">SHA-256 of each file</summary>
      <dl className="flex flex-col gap-2 pt-1 text-small">
        {files.map(({ name, sha256 }) => (
          <div key={name}>
            <dt className="wrap-anywhere">{name}</dt>
            <dd className="font-mono wrap-anywhere text-ink-2">{sha256}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
