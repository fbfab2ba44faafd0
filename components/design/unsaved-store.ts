import { z } from 'zod';
import type { Draft } from './draft';

const valueSchema = z.union([z.number(), z.string(), z.null()]);
const sectionSchema = z.record(z.string(), valueSchema);

const unsavedSchema = z.object({
  /** The stored version the work began from. */
  version: z.number().int().positive(),
  at: z.iso.datetime(),
  name: z.string(),
  shared: sectionSchema,
  sections: z.array(sectionSchema).min(1),
});

export interface Unsaved {
  readonly version: number;
  readonly at: string;
  readonly draft: Draft;
}

const keyOf = (userId: string, designId: string) => `vaneloft.unsaved.${userId}.${designId}`;

/** Work of this person on this design that this browser keeps, or null. */
export function readUnsaved(userId: string, designId: string): Unsaved | null {
  try {
    const text = localStorage.getItem(keyOf(userId, designId));
    const parsed = unsavedSchema.safeParse(text === null ? null : JSON.parse(text));
    if (!parsed.success) return null;
    const { version, at, name, shared, sections } = parsed.data;
    return {
      version,
      at,
      draft: { name, design: Object.assign(shared, { sections }) as Draft['design'] },
    };
  } catch {
    return null;
  }
}

/** Keeps the work; false when the browser has no room or forbids it. */
export function keepUnsaved(
  userId: string,
  designId: string,
  version: number,
  { name, design }: Draft,
): boolean {
  const { sections, ...shared } = design;
  const at = new Date().toISOString();
  try {
    localStorage.setItem(
      keyOf(userId, designId),
      JSON.stringify({ version, at, name, shared, sections }),
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
