import Link from 'next/link';
import { Mark } from '@/components/ui/mark';
import type { OwnWorkshop } from '@/lib/schemas/account';
import { AccountMenu } from './account-menu';
import { PlaceLink } from './place-link';

const places = [
  ['/designs', 'Designs'],
  ['/orders', 'Cut orders'],
  ['/workshop', 'Machines and sheet'],
  ['/people', 'People'],
] as const;

const record = ['/record', 'Record'] as const;

/** The bar over every screen of somebody who is signed in. */
export function TopBar({
  person,
  workshop,
  workshops,
  readsRecord,
}: {
  person: string;
  /** The one that they are in; without one there is nowhere to go. */
  workshop: Pick<OwnWorkshop, 'id' | 'name'> | null;
  workshops: readonly OwnWorkshop[];
  readsRecord: boolean;
}) {
  const shown = workshop === null ? [] : readsRecord ? [...places, record] : places;
  return (
    <header className="flex min-h-12 flex-wrap items-center gap-x-7 border-b border-line max-bench:gap-x-2 bg-panel px-5">
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:m-1 focus:bg-white focus:p-2"
      >
        Skip to the content
      </a>
      <Link
        href={workshop === null ? '/account' : '/designs'}
        className="wide-letter flex min-h-11 items-center gap-2.5 text-[1.0625rem] font-bold text-ink no-underline"
      >
        <Mark />
        Vaneloft
      </Link>
      {shown.length > 0 && (
        <nav
          aria-label="Main"
          className="flex gap-5 self-stretch max-bench:order-last max-bench:-mx-5 max-bench:basis-[calc(100%+2.5rem)] max-bench:overflow-x-auto max-bench:border-t max-bench:border-line max-bench:px-5"
        >
          {shown.map(([href, name]) => (
            <PlaceLink key={href} href={href} name={name} />
          ))}
        </nav>
      )}
      <AccountMenu person={person} workshop={workshop} workshops={workshops} />
    </header>
  );
}
