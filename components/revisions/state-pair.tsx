import { SelectField } from '@/components/ui/select-field';
import type { History } from '@/lib/schemas/revision';

/** States of a design that can be compared, as an address names them: `draft`, `v3`, `r2`. */
export interface Pair {
  readonly a: string;
  readonly b: string;
}

export const compareHref = (designId: string, { a, b }: Pair): string =>
  `/designs/${designId}/compare?${new URLSearchParams({ a, b })}`;

/** As `Revision 2`. */
export function titleOfState(which: string): string {
  if (which === 'draft') return 'As saved';
  return `${which.startsWith('r') ? 'Revision' : 'Version'} ${which.slice(1)}`;
}

/** What one looks for most: what has changed since the last revision, or else the last save. */
export function likelyPair({ revisions, versions }: History): Pair {
  const [revision] = revisions;
  if (revision) return { a: `r${revision.number}`, b: 'draft' };
  const before = versions[1];
  return { a: before ? `v${before.version}` : 'draft', b: 'draft' };
}

function optionsOf({ revisions, versions }: History) {
  const [saved, ...earlier] = versions;
  return [
    { value: 'draft', label: saved ? `As saved, version ${saved.version}` : 'As saved' },
    ...revisions.map(({ number, name }) => ({
      value: `r${number}`,
      label: `Revision ${number}: ${name}`,
    })),
    ...earlier.map(({ version }) => ({ value: `v${version}`, label: `Version ${version}` })),
  ];
}

/** Chooses the two states of a design to lay beside each other. */
export function StatePair({
  history,
  pair,
  onChange,
}: {
  history: History;
  pair: Pair;
  onChange: (pair: Pair) => void;
}) {
  const options = optionsOf(history);
  return (
    <>
      <SelectField
        label="First"
        value={pair.a}
        options={options}
        onChange={(a) => onChange({ ...pair, a })}
        className="min-w-0 basis-64 grow"
      />
      <SelectField
        label="Second"
        value={pair.b}
        options={options}
        onChange={(b) => onChange({ ...pair, b })}
        className="min-w-0 basis-64 grow"
      />
    </>
  );
}
