import 'server-only';
import { cookies } from 'next/headers';
import { idSchema } from './schemas/id';

/** The cookie that says which of their workshops a person is in. It opens nothing by itself. */
export const WORKSHOP_COOKIE = 'vaneloft-workshop';

/** Id of the workshop last chosen in this browser, or null. */
export async function chosenWorkshop(): Promise<string | null> {
  const jar = await cookies();
  const chosen = jar.getAll().find(({ name }) => name === WORKSHOP_COOKIE)?.value;
  return idSchema.safeParse(chosen).data ?? null;
}
