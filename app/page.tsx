import { redirect } from 'next/navigation';

/** The designs page sends whoever is not signed in on to the sign-in page. */
export default function HomePage() {
  redirect('/designs');
}
