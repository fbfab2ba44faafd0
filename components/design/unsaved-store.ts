import { draftOf, type Draft, type DraftSection } from './draft';
import { defaultDesign } from '@/geometry';

export interface Unsaved {
  /** The stored version the work began from. */
  readonly version: number;
  readonly at: string;
  readonly draft: Draft;
}

const keyOf = (userId: string, designId: string) => `vaneloft.unsaved.${userId}.${designId}`;

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** The known parameters of what was kept, the rest at their defaults: other code wrote it perhaps. */
function values(kept: unknown, defaults: DraftSection): DraftSection {
  const found = isRecord(kept) ? kept : {};
  return Object.fromEntries(
    Object.entries(defaults).map(([key, fallback]) => {
      const value = found[key];
      const usable = value === null || typeof value === 'number' || typeof value === 'string';
      return [key, usable ? value : fallback];
    }),
  );
}

function readDraft({ name, design }: Record<string, unknown>): Draft | null {
  if (typeof name !== 'string' || !isRecord(design) || !Array.isArray(design.sections))
    return null;
  const { sections: defaults, ...shared } = draftOf('', defaultDesign()).design;
  const [section] = defaults;
  if (!section || design.sections.length === 0) return null;
  const sections = design.sections.map((kept) => values(kept, section));
  return {
    name,
    design: Object.assign(values(design, shared), { sections }) as Draft['design'],
  };
}

/** Work of this person on this design that this browser keeps, or null. */
export function readUnsaved(userId: string, designId: string): Unsaved | null {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(keyOf(userId, designId)) ?? 'null');
    if (!isRecord(kept) || typeof kept.version !== 'number' || typeof kept.at !== 'string') {
      return null;
    }
    const draft = readDraft(kept);
    return draft && { version: kept.version, at: kept.at, draft };
  } catch {
    return null;
  }
}

/** Keeps the work; false when the browser has no room or forbids it. */
export function keepUnsaved(
  userId: string,
  designId: string,
  version: number,
  draft: Draft,
): boolean {
  try {
    localStorage.setItem(
      keyOf(userId, designId),
      JSON.stringify({ version, at: new Date().toISOString(), ...draft }),
    );
    return true;
  } catch {
    return false;
  }
}

export function dropUnsaved(userId: string, designId: string): void {
  try {
    localStorage.removeItem(keyOf(userId, designId));
  } catch {
    // Without storage there is nothing to drop.
  }
}
