import type { ShopItem } from '@/lib/schemas/shop-item';
import type { Orderable } from '@/lib/schemas/order';

type Wanted = Orderable['wants'][number];

/** mm. Sheet thicknesses that differ by less are the same, as on the server. */
const SAME_THICKNESS = 1e-6;

const fits = ({ values }: ShopItem, { material, thickness }: Wanted): boolean =>
  values.material === material &&
  Math.abs(Number(values.thickness) - thickness) < SAME_THICKNESS;

/** What a revision wants of the kind that a sheet is of. */
export const wantedOf = (
  wants: readonly Wanted[],
  sheet: ShopItem | undefined,
): Wanted | undefined => sheet && wants.find((wanted) => fits(sheet, wanted));

/** The sheets of the store that some part of a revision is cut from. */
export const fittingSheets = (
  wants: readonly Wanted[],
  sheets: readonly ShopItem[],
): ShopItem[] => sheets.filter((sheet) => wantedOf(wants, sheet) !== undefined);

/** Kinds of sheet that the store has nothing of. */
export const missingKinds = (wants: readonly Wanted[], sheets: readonly ShopItem[]): Wanted[] =>
  wants.filter((wanted) => !sheets.some((sheet) => fits(sheet, wanted)));
