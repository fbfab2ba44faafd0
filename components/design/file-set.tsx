import { FileLink, type ListedFile } from './file-link';

export const stemOf = ({ name }: ListedFile): string => name.slice(0, name.lastIndexOf('.'));

/** The same thing in several formats stands together. */
export function byStem(files: readonly ListedFile[]): ListedFile[][] {
  const sets = new Map<string, ListedFile[]>();
  for (const file of files) {
    const stem = stemOf(file);
    sets.set(stem, [...(sets.get(stem) ?? []), file]);
  }
  return [...sets.values()];
}

/** One thing in all its formats. @param href address of the folder of files */
export function FileSet({ href, files }: { href: string; files: readonly ListedFile[] }) {
  const [first] = files;
  if (!first) return null;
  return (
    <li className="flex flex-col gap-1.5 border-b border-line py-2.5 last:border-0">
      <p className="leading-tight font-medium">
        {first.label}
        {/* Names break where their parts do. */}
        <span className="dense block pt-0.5 text-small font-normal wrap-anywhere text-ink-2">
          {stemOf(first)
            .split(/(?<=[_-])/)
            .flatMap((piece, index) => [<wbr key={index} />, piece])}
        </span>
      </p>
      <p className="flex flex-wrap gap-1.5">
        {files.map((file) => (
          <FileLink key={file.name} href={href} file={file} />
        ))}
      </p>
    </li>
  );
}
