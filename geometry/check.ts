import { MAX_SECTIONS, type Design, type Section } from './design';
import { KernelError } from './error';
import {
  sectionParameters,
  sharedParameters,
  type NumberParameter,
  type OptionalNumberParameter,
  type Parameter,
  type PointsParameter,
  type Quantity,
  type TextParameter,
} from './parameters';
import { faultIn, MOST_POINTS, rowFaults } from './law-points';
import { formatQuantity } from './quantity';

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function show(value: unknown, quantity: Quantity): string {
  if (typeof value === 'number') return formatQuantity(value, quantity);
  return value === undefined ? 'nothing' : JSON.stringify(value).slice(0, 40);
}

function checkNumber(
  parameter: NumberParameter | OptionalNumberParameter,
  path: string,
  value: unknown,
): number | null {
  const { label, quantity, min, max } = parameter;
  const range = `${formatQuantity(min, quantity)} to ${formatQuantity(max, quantity)}`;
  if (value === null && parameter.kind === 'optional-number') return null;
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new KernelError(
      'not-a-number',
      path,
      value,
      `${label}: ${show(value, quantity)} is not a number; give ${range}`,
    );
  }
  if (value < min || value > max) {
    throw new KernelError(
      'out-of-bounds',
      path,
      value,
      `${label}: ${show(value, quantity)} is out of range; give ${range}`,
    );
  }
  if (quantity === 'count' && !Number.isInteger(value)) {
    throw new KernelError(
      'not-a-number',
      path,
      value,
      `${label}: ${value} is not a whole number; give ${range}`,
    );
  }
  return value;
}

function checkPoints({ label }: PointsParameter, path: string, value: unknown): unknown {
  if (!Array.isArray(value)) {
    throw new KernelError(
      'not-a-number',
      path,
      value,
      `${label}: give rows of an angle and a value`,
    );
  }
  if (value.length > MOST_POINTS) {
    throw new KernelError(
      'out-of-bounds',
      path,
      value.length,
      `${label}: ${value.length} rows are too many; give at most ${MOST_POINTS}`,
    );
  }
  const fault = faultIn(value);
  if (fault) {
    throw new KernelError(
      'not-a-number',
      path,
      value,
      `${label}, row ${fault.row}: ${rowFaults[fault.fault]}`,
    );
  }
  return value.map(([angle, at]: [number, number]) => [angle, at]);
}

function checkText({ label, longest }: TextParameter, path: string, value: unknown): unknown {
  if (typeof value === 'string' && value.length <= longest) return value;
  throw new KernelError(
    'out-of-bounds',
    path,
    value,
    `${label}: give a text of at most ${longest} characters`,
  );
}

/** Checks one value against its parameter. @throws KernelError naming field, value and range. */
export function checkParameter(parameter: Parameter, path: string, value: unknown): unknown {
  if (parameter.kind === 'points') return checkPoints(parameter, path, value);
  if (parameter.kind === 'text') return checkText(parameter, path, value);
  if (parameter.kind !== 'choice') return checkNumber(parameter, path, value);
  if (parameter.options.some((option) => option.value === value)) return value;
  const known = parameter.options.map((option) => option.value).join(', ');
  throw new KernelError(
    'unknown-choice',
    path,
    value,
    `${parameter.label}: ${JSON.stringify(value)?.slice(0, 40) ?? 'nothing'} is not known; choose one of ${known}`,
  );
}

/** All values of a table, later ones at their default where they are missing. */
export function checkTable(
  table: Record<string, Parameter>,
  input: Record<string, unknown>,
  prefix: string,
): Record<string, unknown> {
  const checked: Record<string, unknown> = {};
  for (const [key, parameter] of Object.entries(table)) {
    const missing = input[key] === undefined && parameter.cameLater;
    checked[key] = checkParameter(
      parameter,
      prefix + key,
      missing ? parameter.default : input[key],
    );
  }
  return checked;
}

function refuseUnknown(input: Record<string, unknown>, known: string[], prefix: string): void {
  for (const key of Object.keys(input)) {
    if (!known.includes(key)) {
      throw new KernelError(
        'unknown-parameter',
        prefix + key,
        input[key],
        `${prefix + key}: not a parameter of a design; take it out`,
      );
    }
  }
}

/**
 * Takes anything and gives a design, every value inside the parameter table's bounds.
 * @throws KernelError at the first value that is missing, unknown or out of bounds.
 */
export function checkDesign(input: unknown): Design {
  if (!isRecord(input)) {
    throw new KernelError('not-a-number', '', input, 'Design: not an object of parameters');
  }
  refuseUnknown(input, [...Object.keys(sharedParameters), 'sections'], '');
  const { sections } = input;
  if (!Array.isArray(sections) || sections.length < 1 || sections.length > MAX_SECTIONS) {
    const count = Array.isArray(sections) ? sections.length : 0;
    throw new KernelError(
      'section-count',
      'sections',
      count,
      `Sections: ${count} given; a design has 1 to ${MAX_SECTIONS}`,
    );
  }
  return {
    ...checkTable(sharedParameters, input, ''),
    sections: sections.map((section: unknown, index) => {
      const prefix = `sections.${index}.`;
      if (!isRecord(section)) {
        throw new KernelError(
          'not-a-number',
          `sections.${index}`,
          section,
          `Section ${index + 1}: not an object of parameters`,
        );
      }
      refuseUnknown(section, Object.keys(sectionParameters), prefix);
      return checkTable(sectionParameters, section, prefix) as unknown as Section;
    }),
  } as Design;
}
