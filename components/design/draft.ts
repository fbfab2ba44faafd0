import {
  applies,
  checkDesign,
  checkParameter,
  formatQuantity,
  KernelError,
  sectionParameters,
  sharedParameters,
  type Design,
  type LawPoint,
  type NumberParameter,
  type OptionalNumberParameter,
  type Parameter,
} from '@/geometry';

/** A kernel value, null for one left empty on purpose, or text that is no value (yet). */
export type DraftValue = number | string | null | readonly LawPoint[];

export type DraftSection = Record<string, DraftValue>;

/** A design as it stands in the form, finished or not. */
export interface Draft {
  name: string;
  design: Record<string, DraftValue> & { sections: DraftSection[] };
}

export type QuantityParameter = NumberParameter | OptionalNumberParameter;

const sectionTable: Record<string, Parameter> = sectionParameters;
const sharedTable: Record<string, Parameter> = sharedParameters;

export function draftOf(name: string, design: Design): Draft {
  return structuredClone({ name, design }) as unknown as Draft;
}

const inOrder = (_key: string, value: unknown) =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
    ? Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)))
    : value;

/** Whatever order their keys came in from the database, the form or this browser's store. */
export function sameDraft(a: Draft, b: Draft): boolean {
  return JSON.stringify(a, inOrder) === JSON.stringify(b, inOrder);
}

/** The parameter a path of the design stands for: `sections.0.airGap`, `travel`. */
export function parameterAt(path: string): Parameter | undefined {
  const parts = path.split('.');
  const key = parts[parts.length - 1] ?? '';
  return parts.length === 1 ? sharedTable[key] : sectionTable[key];
}

const quantityWords: Record<NumberParameter['quantity'], string> = {
  length: 'a length',
  altitude: 'an altitude',
  angle: 'an angle',
  capacitance: 'a capacitance',
  inductance: 'an inductance',
  frequency: 'a frequency',
  voltage: 'a voltage',
  count: 'a whole number',
  ratio: 'a number',
};

/** What is wrong with a value in the form, or undefined. */
export function messageFor(parameter: Parameter, path: string, value: DraftValue) {
  if (typeof value === 'string' && parameter.kind === 'points') {
    return `${parameter.label}: rows of an angle and a value are needed`;
  }
  if (typeof value === 'string' && 'quantity' in parameter) {
    const { label, quantity, min, max } = parameter;
    const range = `${formatQuantity(min, quantity)} to ${formatQuantity(max, quantity)}`;
    return value.trim() === ''
      ? `${label}: empty; give ${range}`
      : `${label}: “${value}” is not ${quantityWords[quantity]}; give ${range}`;
  }
  try {
    checkParameter(parameter, path, value);
    return undefined;
  } catch (error) {
    if (error instanceof KernelError) return error.message;
    throw error;
  }
}

/** Fields that don't apply may hold anything; an unusable one goes back to its default. */
function settle(section: DraftSection, index: number): DraftSection {
  return Object.fromEntries(
    Object.entries(section).map(([key, value]) => {
      const parameter = sectionTable[key];
      const dormant = parameter && !applies(parameter, section);
      return dormant && messageFor(parameter, `sections.${index}.${key}`, value)
        ? [key, parameter.default]
        : [key, value];
    }),
  );
}

/** The design in the form, or what is wrong with it and where. */
export function designOf(
  draft: Draft,
): { ok: true; design: Design } | { ok: false; path: string; message: string } {
  try {
    const sections = draft.design.sections.map(settle);
    return { ok: true, design: checkDesign({ ...draft.design, sections }) };
  } catch (error) {
    if (!(error instanceof KernelError)) throw error;
    // Text that is no value has its own words here; the kernel knows numbers only.
    const parameter = parameterAt(error.path);
    const own =
      parameter && typeof error.value === 'string'
        ? messageFor(parameter, error.path, error.value)
        : undefined;
    return { ok: false, path: error.path, message: own ?? error.message };
  }
}
