import Link from 'next/link';
import { buttonClass } from '@/components/ui/button-class';
import type { OwnWorkshop } from '@/lib/schemas/account';
import { SignOutButton } from './sign-out-button';

const ID = 'account-menu';

/** Who is signed in, and where; opens their workshops and account. Works without any script. */
export function AccountMenu({
  person,
  workshop,
  workshops,
}: {
  person: string;
  /** The one that they are in, if any. */
  workshop: Pick<OwnWorkshop, 'id' | 'name'> | null;
  workshops: readonly OwnWorkshop[];
}) {
  const others = workshops.filter(({ id }) => id !== workshop?.id);
  return (
    <>
      <button
        type="button"
        popoverTarget={ID}
        className={`${buttonClass('quiet')} ml-auto max-w-[50vw] text-ink-2`}
      >
        <span className="truncate">
          {workshop === null ? person : `${workshop.name}, ${person}`}
        </span>
        <span aria-hidden="true">▾</span>
      </button>
      <div
        id={ID}
        popover="auto"
        role="group"
        aria-label="Workshops and account"
        className="inset-auto top-12 right-3 w-75 max-w-[calc(100vw-1.5rem)] rounded-[4px] border border-line bg-panel p-3 text-ink shadow-lg"
      >
        <div className="flex flex-col gap-2">
          {others.length > 0 && workshop && (
            <form method="post" action="/api/account/workshop" className="flex flex-col gap-1">
              <p className="text-small text-ink-2">You are in {workshop.name}. Change to</p>
              {others.map(({ id, name }) => (
                <button
                  key={id}
                  name="workshop"
                  value={id}
                  className={`${buttonClass('plain')} w-full`}
                >
                  <span className="truncate">{name}</span>
                </button>
              ))}
            </form>
          )}
          <Link href="/account" className={buttonClass('quiet')}>
            Your account
          </Link>
          <SignOutButton />
        </div>
      </div>
    </>
  );
}
