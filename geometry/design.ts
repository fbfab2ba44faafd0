import {
  sectionParameters,
  sharedParameters,
  type Parameter,
  type ValuesOf,
} from './parameters';

export const MAX_SECTIONS = 4;

/** One section: a set of rotor and stator plates with a law of its own. Kernel units. */
export type Section = ValuesOf<typeof sectionParameters>;

export type SharedValues = ValuesOf<typeof sharedParameters>;

/** One capacitor: one to four sections on one shaft, and what they share. Kernel units. */
export interface Design extends SharedValues {
  sections: Section[];
}

function defaultsOf<T extends Record<string, Parameter>>(table: T): ValuesOf<T> {
  return Object.fromEntries(
    Object.entries(table).map(([key, parameter]) => [key, parameter.default]),
  ) as ValuesOf<T>;
}

/** A section with every parameter at its default. */
export function defaultSection(): Section {
  return defaultsOf(sectionParameters);
}

/** A one-section design with every parameter at its default: it can be cut as it stands. */
export function defaultDesign(): Design {
  return { ...defaultsOf(sharedParameters), sections: [defaultSection()] };
}
