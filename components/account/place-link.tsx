'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

/** A place in the main navigation; the one where one is says so. */
export function PlaceLink({ href, name }: { href: string; name: string }) {
  const here = usePathname().startsWith(href);
  return (
    <Link
      href={href}
      aria-current={here ? 'page' : undefined}
      className={`flex min-h-11 items-center border-b-2 whitespace-nowrap font-medium text-ink no-underline hover:border-action ${here ? 'border-action' : 'border-transparent'}`}
    >
      {name}
    </Link>
  );
}
