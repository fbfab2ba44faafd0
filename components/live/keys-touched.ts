/** What was recorded, as the server tells it. */
export interface Change {
  readonly what: string;
  readonly subject: string;
  readonly revision: string | null;
}

/** What react-query takes to find them: those that begin so, or that one alone. */
interface Touched {
  readonly queryKey: readonly unknown[];
  readonly exact?: boolean;
}

const from = (...queryKey: readonly unknown[]): Touched => ({ queryKey });

/** Under which keys the client may hold something that a change has made old. */
export function keysTouched({ what, subject, revision }: Change): Touched[] {
  const seen = [from('record')];
  const list = { queryKey: ['designs'], exact: true };
  const [noun] = what.split('-');
  switch (noun) {
    case 'design':
      return [...seen, list, from('designs', subject), from('revisions', subject)];
    case 'revision':
    case 'review':
      return [
        ...seen,
        list,
        from('designs', subject),
        from('revisions', subject),
        from('revision', revision),
        from('orders'),
        from('order'),
        from('mails'),
      ];
    case 'order':
      return [...seen, from('orders'), from('order', subject), from('mails')];
    case 'item':
    case 'stock':
      return [...seen, from('shop'), from('order')];
    case 'member':
    case 'invitation':
    case 'workshop':
      return [...seen, from('people'), from('mails')];
    default:
      return seen;
  }
}
