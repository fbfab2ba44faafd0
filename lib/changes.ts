/** One value that differs, by its path: `design.sections.0.airGap`. */
export interface Change {
  readonly path: string;
  readonly from: unknown;
  readonly to: unknown;
}

function isBranch(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

/** Every leaf that differs between two plain values; what one side lacks is null there. */
export function changesBetween(from: unknown, to: unknown, path = ''): Change[] {
  if (!isBranch(from) || !isBranch(to)) {
    return Object.is(from, to) ? [] : [{ path, from: from ?? null, to: to ?? null }];
  }
  const keys = new Set([...Object.keys(from), ...Object.keys(to)]);
  return [...keys].flatMap((key) =>
    changesBetween(from[key], to[key], path === '' ? key : `${path}.${key}`),
  );
}
