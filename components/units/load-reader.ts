type Reader = typeof import('./quantity-reader').readQuantity;

let loaded: Reader | null = null;

/** The reader if it is there already. */
export const readerNow = (): Reader | null => loaded;

/** Fetches the reader, once; it stays out of a page until somebody edits a quantity. */
export async function loadReader(): Promise<Reader> {
  loaded ??= (await import('./quantity-reader')).readQuantity;
  return loaded;
}
