import 'server-only';
import { cookies } from 'next/headers';
import { env } from './env';
import { idSchema } from './schemas/id';

/** The cookie that says which of their workshops a person is in. It opens nothing by itself. */
export const WORKSHOP_COOKIE = 'vaneloft-workshop';

/** Id of the workshop last chosen in this browser, or null. */
export async function chosenWorkshop(): Promise<string | null> {
  const jar = await cookies();
  const chosen = jar.getAll().find(({ name }) => name === WORKSHOP_COOKIE)?.value;
  return idSchema.safeParse(chosen).data ?? null;
}

/** Seconds that a browser keeps the choice. */
const KEPT = 365 * 24 * 3600;

/** The value of Set-Cookie that puts this browser into a workshop of the person's. */
export function workshopCookie(workshopId: string): string {
  const secure = env().NEXTAUTH_URL.startsWith('https:') ? '; Secure' : '';
  return `${WORKSHOP_COOKIE}=${workshopId}; Path=/; Max-Age=${KEPT}; HttpOnly; SameSite=Lax${secure}`;
}
