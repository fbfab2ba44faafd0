import Link from 'next/link';
import { buttonClass } from '@/components/ui/button-class';
import { PageMessage } from '@/components/ui/page-message';

export default function NotFound() {
  return (
    <PageMessage title="Nothing here">
      <p>
        There is no such page, or it belongs to another workshop, or it was deleted by somebody
        of yours.
      </p>
      <Link href="/designs" className={buttonClass('plain')}>
        To the designs
      </Link>
    </PageMessage>
  );
}
