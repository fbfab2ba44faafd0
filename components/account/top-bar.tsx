import Link from 'next/link';
import { Mark } from '@/components/ui/mark';
import { PlaceLink } from './place-link';
import { SignOutButton } from './sign-out-button';

const places = [
  ['/designs', 'Designs'],
  ['/workshop', 'Machines and sheet'],
] as const;

/** The bar over every screen of the workshop. */
export function TopBar({ workshop, person }: { workshop: string; person: string }) {
  return (
    <header className="flex min-h-12 flex-wrap items-center gap-x-7 border-b border-line bg-panel px-5">
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:m-1 focus:bg-white focus:p-2"
      >
        Skip to the content
      </a>
      <Link
        href="/designs"
        className="wide-letter flex min-h-11 items-center gap-2.5 text-[1.0625rem] font-bold text-ink no-underline"
      >
        <Mark />
        Vaneloft
      </Link>
      <nav aria-label="Main" className="flex gap-5 self-stretch">
        {places.map(([href, name]) => (
          <PlaceLink key={href} href={href} name={name} />
        ))}
      </nav>
      <p className="ml-auto flex items-center gap-3 text-ink-2">
        <span className="max-wide:hidden">
          {workshop}, {person}
        </span>
        <SignOutButton />
      </p>
    </header>
  );
}
