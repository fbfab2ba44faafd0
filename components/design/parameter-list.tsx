import { applies, formatQuantity, type Design } from '@/geometry';
import { Figures } from './figures';
import { sectionGroups, sharedGroups, type Group, type GroupEntry } from './parameter-groups';

function written({ key, parameter }: GroupEntry, values: Record<string, unknown>): string {
  const value = values[key];
  if (parameter.kind === 'choice') {
    return parameter.options.find((option) => option.value === value)?.label ?? String(value);
  }
  if (parameter.kind === 'points') return `${(value as unknown[]).length} rows`;
  if (parameter.kind === 'text') return String(value);
  return typeof value === 'number'
    ? formatQuantity(value, parameter.quantity)
    : 'left to the kernel';
}

function GroupFigures({ group, values }: { group: Group; values: Record<string, unknown> }) {
  const rows = group.entries
    .filter(({ parameter }) => applies(parameter, values))
    .map((entry) => [entry.parameter.label, written(entry, values)] as const);
  return (
    <section className="flex flex-col gap-1.5">
      <h2 className="wide-letter text-body font-semibold">{group.title}</h2>
      <Figures rows={rows} />
    </section>
  );
}

/** All values of a design, to read. */
export function ParameterList({ design, section }: { design: Design; section: number }) {
  const values = design.sections[section];
  return (
    <>
      {values &&
        sectionGroups.map((group) => (
          <GroupFigures key={group.group} group={group} values={values} />
        ))}
      {sharedGroups.map((group) => (
        <GroupFigures key={group.group} group={group} values={{ ...design }} />
      ))}
    </>
  );
}
