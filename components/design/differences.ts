import {
  formatQuantity,
  sectionParameters,
  sharedParameters,
  type Design,
  type Parameter,
} from '@/geometry';

const sectionTable: Record<string, Parameter> = sectionParameters;
const sharedTable: Record<string, Parameter> = sharedParameters;

export interface Difference {
  readonly label: string;
  readonly mine: string;
  readonly theirs: string;
}

function written(parameter: Parameter, value: unknown): string {
  if (parameter.kind === 'choice') {
    return parameter.options.find((option) => option.value === value)?.label ?? String(value);
  }
  if (parameter.kind === 'points') return `${(value as unknown[]).length} rows`;
  if (parameter.kind === 'text') return String(value);
  return typeof value === 'number' ? formatQuantity(value, parameter.quantity) : 'empty';
}

/** What two designs differ in, for a person to choose between them. */
export function differences(mine: Design, theirs: Design): Difference[] {
  const found: Difference[] = [];
  const compare = (
    table: Record<string, Parameter>,
    a: Record<string, unknown>,
    b: Record<string, unknown>,
    where: string,
  ) => {
    for (const [key, parameter] of Object.entries(table)) {
      if (JSON.stringify(a[key]) === JSON.stringify(b[key])) continue;
      found.push({
        label: parameter.label + where,
        mine: written(parameter, a[key]),
        theirs: written(parameter, b[key]),
      });
    }
  };
  const count = Math.max(mine.sections.length, theirs.sections.length);
  for (let index = 0; index < count; index++) {
    const where = count > 1 ? `, section ${index + 1}` : '';
    const a = mine.sections[index];
    const b = theirs.sections[index];
    if (a && b) compare(sectionTable, a, b, where);
    else {
      found.push({
        label: `Section ${index + 1}`,
        mine: a ? 'there' : 'not there',
        theirs: b ? 'there' : 'not there',
      });
    }
  }
  compare(sharedTable, { ...mine }, { ...theirs }, '');
  return found;
}
