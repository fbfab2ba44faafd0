/** Designs drawn from the whole parameter table, for fast-check. */
import fc from 'fast-check';
import {
  MAX_SECTIONS,
  sectionParameters,
  sharedParameters,
  type Design,
  type Parameter,
} from '../../geometry';

/** Rows with rising angles; values rise, fall or jump about. */
const anyPoints = fc
  .array(
    fc.tuple(
      fc.double({ min: 0.01, max: 1, noNaN: true }),
      fc.double({ min: 1e-12, max: 1e-9, noNaN: true }),
    ),
    { maxLength: 12 },
  )
  .map((rows) => {
    let angle = 0;
    return rows.map(([step, value]) => [(angle += step), value]);
  });

function anyValue(parameter: Parameter): fc.Arbitrary<unknown> {
  if (parameter.kind === 'choice')
    return fc.constantFrom(...parameter.options.map((o) => o.value));
  if (parameter.kind === 'text')
    return fc.constantFrom('x^2', 'x', 'sqrt(x) + x', '1 - x', 'y');
  if (parameter.kind === 'points') return anyPoints;
  const { min, max } = parameter;
  if (parameter.quantity === 'count') return fc.integer({ min, max });
  const even = fc.double({ min, max, noNaN: true });
  // Bounds span decades: most draws spread by ratio, the rest evenly, ends included.
  const low = min > 0 ? min : max * 1e-9;
  const byRatio = fc
    .double({ min: Math.log(low), max: Math.log(max), noNaN: true })
    .map((value) => Math.min(max, Math.max(min, Math.exp(value))));
  const number = fc.oneof(
    { weight: 6, arbitrary: byRatio },
    { weight: 2, arbitrary: even },
    { weight: 1, arbitrary: fc.constantFrom(min, max) },
  );
  return parameter.kind === 'optional-number' ? fc.option(number, { nil: null }) : number;
}

function anyOf(table: Record<string, Parameter>): fc.Arbitrary<Record<string, unknown>> {
  return fc.record(
    Object.fromEntries(Object.entries(table).map(([key, p]) => [key, anyValue(p)])),
  );
}

/** Any design that passes the parameter table, sensible or not. */
export const anyDesign = fc
  .tuple(
    anyOf(sharedParameters),
    fc.array(anyOf(sectionParameters), { minLength: 1, maxLength: MAX_SECTIONS }),
  )
  .map(([shared, sections]) => ({ ...shared, sections }) as unknown as Design);

/** Choices that need other sectors, counts or films beside them. */
const DECIDING = ['arrangement', 'dielectric'];

const NAMED_LAWS = ['capacitance', 'wavelength', 'frequency', 'logarithmic'];

/** A design near a given one: each number within a fifth of it, so that most give plates. */
export function designNear(base: Design): fc.Arbitrary<Design> {
  const near = (table: Record<string, Parameter>, values: Record<string, unknown>) =>
    fc.record(
      Object.fromEntries(
        Object.entries(table).map(([key, parameter]) => {
          const value = values[key];
          if (DECIDING.includes(key)) return [key, fc.constant(value)];
          if (key === 'law') return [key, fc.constantFrom(...NAMED_LAWS)];
          if (parameter.kind === 'choice') return [key, anyValue(parameter)];
          if (!('quantity' in parameter)) return [key, fc.constant(value)];
          if (typeof value !== 'number' || parameter.quantity === 'count') {
            return [key, fc.constant(value)];
          }
          const clamp = (v: number): number =>
            Math.min(parameter.max, Math.max(parameter.min, v));
          return [
            key,
            fc.double({ min: 0.8, max: 1.2, noNaN: true }).map((k) => clamp(value * k)),
          ];
        }),
      ),
    );
  return fc
    .tuple(
      near(sharedParameters, { ...base }),
      fc.tuple(...base.sections.map((section) => near(sectionParameters, { ...section }))),
    )
    .map(([shared, sections]) => ({ ...shared, sections }) as unknown as Design);
}

/**
 * Any design, then put right where a builder would have: plates alternate, shaft, hub and cut-out
 * lie inside one another, the range runs upwards. Most of these give plates, of every shape.
 */
export const buildableDesign = fc
  .tuple(
    anyDesign,
    fc.record({
      shaft: fc.double({ min: 2, max: 12, noNaN: true }),
      web: fc.double({ min: 0.5, max: 4, noNaN: true }),
      clear: fc.double({ min: 0.1, max: 3, noNaN: true }),
      gap: fc.double({ min: 0.2, max: 2, noNaN: true }),
      open: fc.double({ min: 5e-12, max: 100e-12, noNaN: true }),
      ratio: fc.double({ min: 1.3, max: 12, noNaN: true }),
      rotors: fc.integer({ min: 1, max: 30 }),
      more: fc.integer({ min: 0, max: 1 }),
      travel: fc.double({ min: 2, max: Math.PI, noNaN: true }),
      short: fc.double({ min: 0, max: 0.3, noNaN: true }),
    }),
  )
  .map(([design, fix]): Design => {
    const hubRadius = fix.shaft / 2 + fix.web;
    const travel =
      design.arrangement === 'butterfly' ? Math.max(1.1, fix.travel / 2) : fix.travel;
    const sector = Math.min(travel - fix.short, (170 * Math.PI) / 180);
    return {
      ...design,
      shaftDiameter: fix.shaft,
      spacerRadius: hubRadius,
      hubRadius,
      cutoutRadius: Math.max(1.5, hubRadius + fix.clear),
      travel,
      rotorSector: sector,
      statorSector: sector,
      openRest: null,
      meshedRest: null,
      statorEdgeOffset: 0,
      postCount: 2,
      postHoleDiameter: Math.min(design.postHoleDiameter, 4),
      postWeb: Math.min(design.postWeb, 3),
      postCircleRadius: null,
      sections: design.sections.map((section) => ({
        ...section,
        targetKind: 'terminals',
        minCapacitance: fix.open,
        maxCapacitance: fix.open * fix.ratio,
        lawFormula: 'x + x^2',
        lawPoints: [0, 0.5, 1].map((x) => [x, fix.open * (1 + (fix.ratio - 1) * x)] as const),
        permittivity: Math.min(section.permittivity, 3),
        airGap: fix.gap,
        filmThickness: Math.min(section.filmThickness, fix.gap / 2),
        filmPermittivity: Math.min(section.filmPermittivity, 10),
        rotorPlates: section.dielectric === 'disc' ? 1 : fix.rotors,
        statorPlates: section.dielectric === 'disc' ? 1 : fix.rotors + fix.more,
      })),
    };
  });
